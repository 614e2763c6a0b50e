package org.pofk.formula;

import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import org.pofk.formula.FormulaReading.ImaginaryUnit;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/**
 * Names in LaTeX: single letters, Greek letters, words in {@code \text} and its like, and any of them with an index.
 * {@code p_{B}} is the name {@code p_B}.
 */
final class LatexLetters {
    /** Commands that set a word upright, or at least as a word. */
    static final Set<String> WORD_COMMANDS = Set.of("text", "mathrm", "textrm", "mathit", "textit", "mathsf",
            "textsf", "mathtt", "texttt", "mathbf", "textbf", "mbox", "textnormal");
    /** Those of them that may hold a word between a formula and its steps. */
    private static final Set<String> TEXT_COMMANDS = Set.of("text", "textrm", "textnormal", "mbox", "textit");
    private static final Set<String> FOR = Set.of("for", "if", "when");
    private static final Set<String> OTHERWISE = Set.of("otherwise", "otherwise.", "else");
    private static final Map<String, String> VARIANTS = Map.of("phi", "φ", "epsilon", "ε", "vartheta", "θ",
            "varrho", "ρ", "varsigma", "σ", "varpi", "π");
    private static final Map<String, String> ESCAPES = Map.of("textbackslash", "\\", "textasciicircum", "^",
            "textasciitilde", "~", "textasciigrave", "`", "textunderscore", "_", "_", "_", "%", "%");
    private static final Map<Integer, String> LETTER_FORMS = Map.of((int) 'ϕ', "φ", (int) 'ϵ', "ε", (int) 'ϑ', "θ");

    private final LatexScanner scanner;
    private final ImaginaryUnit unit;

    LatexLetters(LatexScanner scanner, ImaginaryUnit unit) {
        this.scanner = scanner;
        this.unit = unit;
    }

    /** The Greek letter of a command. */
    static Optional<String> greek(String command) {
        return LatexNames.letter(command).or(() -> Optional.ofNullable(VARIANTS.get(command)));
    }

    /** The Greek letter that a character of the text is. */
    static Optional<String> greek(int c) {
        return LETTER_FORMS.containsKey(c) ? Optional.of(LETTER_FORMS.get(c))
                : LatexNames.isGreek(c) ? Optional.of(Character.toString(c)) : Optional.empty();
    }

    /** Adds the name that a letter is, with its index where one follows. */
    void letter(String letter, int start) throws RefusedException {
        Optional<String> index = index();
        if (index.isPresent()) {
            scanner.add(Kind.QUOTED, letter + "_" + index.get(), start);
        } else {
            scanner.add(Kind.NAME, letter, start);
        }
    }

    /** A word command of this name that begins here: a name, a constant, or a word between a formula and its steps. */
    void word(String command) throws RefusedException {
        int start = scanner.offset();
        scanner.skipCommand(command);
        String word = content(start, command);
        if (TEXT_COMMANDS.contains(command) && (FOR.contains(word) || OTHERWISE.contains(word))) {
            scanner.add(Kind.FOR, FOR.contains(word) ? "for" : "otherwise", start);
            return;
        }
        Optional<String> index = index();
        boolean isUpright = !command.equals("mathit") && index.isEmpty();
        if (isUpright && word.equals("j") && unit == ImaginaryUnit.I) {
            throw scanner.refusedShowing(start, "unit-j", "isn't the imaginary unit here: that is \\mathrm{i}");
        } else if (isUpright && (word.equals("i") || word.equals("j"))) {
            scanner.add(Kind.NAME, word, start);
        } else {
            scanner.add(Kind.QUOTED, Words.normalized(word + index.map(each -> "_" + each).orElse("")), start);
        }
    }

    /** Reads an upright e, Euler's number, where it stands here. */
    boolean takesEuler(String command) {
        int start = scanner.offset();
        scanner.skipCommand(command);
        scanner.skipBlanks();
        boolean isBraced = scanner.takes("{");
        scanner.skipBlanks();
        boolean isEuler = !command.equals("mathit") && scanner.takes("e");
        if (isBraced) {
            scanner.skipBlanks();
            isEuler = isEuler && scanner.takes("}");
        }
        if (!isEuler) {
            scanner.backTo(start);
        }
        return isEuler;
    }

    /** What stands in the braces behind a word command, as the characters that are printed. */
    private String content(int start, String command) throws RefusedException {
        scanner.skipBlanks();
        if (LatexScanner.isAsciiLetter(scanner.next())) {
            scanner.skip();
            return scanner.since(scanner.offset() - 1);
        }
        if (!scanner.takes("{")) {
            throw scanner.refusedShowing(start, "brace-missing", "needs its word in braces: \\" + command + "{…}");
        }
        StringBuilder word = new StringBuilder();
        while (!scanner.takes("}")) {
            word.append(character(start));
        }
        if (word.toString().isBlank()) {
            throw scanner.refusedShowing(start, "name-empty", "holds no name");
        }
        OptionalInt disguised = LookAlikes.disguised(word.toString());
        if (disguised.isPresent()) {
            int c = disguised.getAsInt();
            throw scanner.refused(start + scanner.since(start).indexOf(c), "look-alike",
                    LookAlikes.described(c) + " isn't known here" + LookAlikes.wayOut(c));
        }
        return word.toString().strip();
    }

    private String character(int start) throws RefusedException {
        int at = scanner.offset();
        int c = scanner.next();
        if (c == -1) {
            throw scanner.refused(start, "brace-open", "the brace behind this command isn't closed");
        }
        if (c == '\\') {
            return escaped(at);
        }
        if (scanner.takes("{}")) {
            return "";
        }
        if ("{$%#&_^".indexOf(c) >= 0 || Character.isISOControl(c) && c != '\n'
                || Character.getType(c) == Character.FORMAT) {
            throw scanner.refused(at, "character", LookAlikes.described(c) + " can't stand in a name"
                    + (c < 0x80 && !Character.isISOControl(c) ? " as it is: write \\" + (char) c : LookAlikes.wayOut(c)));
        }
        scanner.skip();
        return c == '~' || c == '\n' ? " " : Character.toString(c);
    }

    private String escaped(int at) throws RefusedException {
        String command = scanner.command();
        scanner.skipCommand(command);
        if (command.length() == 1 && "{}$&#%_ ".contains(command)) {
            return command;
        }
        if (command.equals("ensuremath") && scanner.takes("{")) {
            Optional<String> letter = greek(scanner.command());
            letter.ifPresent(each -> scanner.skipCommand(scanner.command()));
            if (letter.isPresent() && scanner.takes("}")) {
                return letter.get();
            }
        }
        Optional<String> letter = greek(command).or(() -> Optional.ofNullable(ESCAPES.get(command)));
        if (letter.isEmpty()) {
            throw scanner.refusedShowing(at, "command-unknown", "can't stand in a name");
        }
        if (!scanner.takes("{}")) {
            scanner.skipBlanks();
        }
        return letter.get();
    }

    /** The index behind a name, without its braces. */
    private Optional<String> index() throws RefusedException {
        int start = scanner.offset();
        scanner.skipBlanks();
        if (!scanner.takes("_")) {
            scanner.backTo(start);
            return Optional.empty();
        }
        scanner.skipBlanks();
        int from = scanner.offset();
        if (scanner.takes("{")) {
            StringBuilder index = new StringBuilder();
            scanner.skipSpaces();
            while (!scanner.takes("}")) {
                index.append(indexPart(from));
                scanner.skipSpaces();
            }
            if (index.isEmpty()) {
                throw scanner.refused(from, "index", "the index is empty");
            }
            return Optional.of(index.toString());
        }
        String single = indexPart(from);
        if (scanner.isDigitAt(scanner.offset()) && Character.isDigit(single.charAt(0))) {
            throw scanner.refused(from, "index", "only the first digit is set as index: write _{…}");
        }
        return Optional.of(single);
    }

    private String indexPart(int from) throws RefusedException {
        int c = scanner.next();
        int at = scanner.offset();
        String command = scanner.command();
        if (c == -1) {
            throw scanner.refused(from, "brace-open", "the index isn't finished");
        }
        if (WORD_COMMANDS.contains(command)) {
            scanner.skipCommand(command);
            return content(at, command);
        }
        if (greek(command).isPresent()) {
            scanner.skipCommand(command);
            return greek(command).get();
        }
        if (LatexScanner.isAsciiLetter(c) || scanner.isDigitAt(at) || c == ',' || greek(c).isPresent()) {
            scanner.skip();
            return Character.toString(c);
        }
        throw scanner.refused(at, "index", c == '+' || c == '-'
                ? "an index that is worked out has no meaning here: the formula is for step k itself"
                : "an index holds letters, digits and commas");
    }
}
