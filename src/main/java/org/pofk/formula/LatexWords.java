package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;
import org.pofk.text.Suggestion;

/** The commands that are known, and what is said where something isn't. */
final class LatexWords {
    private static final List<String> FUNCTIONS = List.of("cos", "sin", "exp", "arctan", "arccos");
    private static final Map<String, String> RELATIONS = Map.ofEntries(Map.entry("le", "<="), Map.entry("leq", "<="),
            Map.entry("leqslant", "<="), Map.entry("ge", ">="), Map.entry("geq", ">="), Map.entry("geqslant", ">="),
            Map.entry("ne", "!="), Map.entry("neq", "!="), Map.entry("lt", "<"), Map.entry("gt", ">"),
            Map.entry("approx", "≈"), Map.entry("=", "="), Map.entry("<", "<"), Map.entry(">", ">"),
            Map.entry("≤", "<="), Map.entry("≥", ">="), Map.entry("≠", "!="), Map.entry("≈", "≈"));
    private static final Map<Integer, String> SIGNS = Map.of(
            (int) '!', "a factorial has no place in these formulas; a binomial coefficient is \\binom{k}{2}",
            (int) '%', "% begins a comment: a percent sign is \\%",
            (int) '$', "take the dollar signs out",
            (int) '\'', "a prime says nothing here; a name is written as \\text{…}",
            (int) '_', "an index stands behind a name",
            (int) '|', "an absolute value has no place in these formulas",
            (int) '√', "a root is written as \\sqrt{…}",
            (int) '#', "# has no meaning here",
            (int) '"', "a name is written as \\text{…}",
            (int) ':', "a quotient is written with / or \\frac");
    private static final List<String> KNOWN = known();

    private LatexWords() {
    }

    private static List<String> known() {
        List<String> known = new ArrayList<>(FUNCTIONS);
        known.addAll(List.of("frac", "dfrac", "tfrac", "sqrt", "binom", "cdot", "times", "left", "right", "text",
                "mathrm", "circ", "begin", "end", "quad", "le", "ge", "pm", "operatorname"));
        known.addAll(LatexNames.commands());
        return known;
    }

    static Optional<String> function(String command) {
        return FUNCTIONS.contains(command) ? Optional.of(command) : Optional.empty();
    }

    /** The relation of a command or a single character, as tokens have it. */
    static Optional<String> relation(String word) {
        return Optional.ofNullable(RELATIONS.get(word));
    }

    static RefusedException unknown(LatexScanner scanner, String command, int start) {
        if (command.equals("tan") || command.equals("arcsin") || command.equals("ln") || command.equals("log")) {
            return scanner.refused(start, "command-unknown", "'\\" + command + "' isn't among the functions here: there"
                    + " are \\cos, \\sin, \\exp, \\arctan and \\arccos");
        }
        String suggestion = Suggestion.didYouMean(KNOWN.stream().map(each -> "\\" + each).toList(), "\\" + command);
        return scanner.refused(start, "command-unknown", "'\\" + Words.shortened(command)
                + "' has no meaning here" + (!suggestion.isEmpty() && command.length() > 3 ? suggestion
                : ": formulas are made of numbers, names, \\frac, \\sqrt, powers, \\cos, \\sin, \\exp, \\arctan,"
                        + " \\arccos, \\binom, \\delta, \\pi and cases"));
    }

    static RefusedException meaningless(LatexScanner scanner, int c, int start) {
        return scanner.refused(start, "character", Optional.ofNullable(SIGNS.get(c)).orElseGet(() ->
                LookAlikes.described(c) + " has no meaning in a formula" + (Character.isLetter(c)
                        && LookAlikes.meant(c).isEmpty() ? ": a name is written as \\text{…}" : LookAlikes.wayOut(c))));
    }

    /**
     * Refuses a run of letters that was probably meant as a word, where LaTeX prints a product of letters, and a
     * number's exponent written as in programs.
     */
    static void requireLetters(LatexScanner scanner) throws RefusedException {
        int start = scanner.offset();
        boolean continuesRun = start > 0 && LatexScanner.isAsciiLetter(scanner.charAt(start - 1))
                && scanner.isRightBehind(Kind.NAME);
        int end = start;
        while (LatexScanner.isAsciiLetter(scanner.charAt(end))) {
            end++;
        }
        if (isProgramExponent(scanner, start, end)) {
            throw scanner.refused(start, "number-unreadable",
                    "a power of ten is written as in 7.3 \\cdot 10^{-4}");
        }
        scanner.backTo(end);
        String run = scanner.since(start);
        scanner.backTo(start);
        if (continuesRun || run.length() == 1) {
            return;
        }
        if (KNOWN.contains(run)) {
            throw scanner.refused(start, "word", "'" + run + "' is printed as a product of letters: write \\" + run);
        }
        if (run.length() > 2 || Words.function(run).isPresent()) {
            throw scanner.refused(start, "word", "'" + Words.shortened(run) + "' is printed as a product of letters:"
                    + " write \\text{" + Words.shortened(run) + "} for a name");
        }
    }

    private static boolean isProgramExponent(LatexScanner scanner, int start, int end) {
        boolean hasSign = scanner.charAt(end) == '-' || scanner.charAt(end) == '+';
        return end == start + 1 && "eE".indexOf(scanner.next()) >= 0 && scanner.isRightBehind(Kind.NUMBER)
                && scanner.isDigitAt(hasSign ? end + 1 : end);
    }
}
