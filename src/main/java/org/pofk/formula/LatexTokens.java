package org.pofk.formula;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.formula.FormulaReading.PlusMinus;
import org.pofk.formula.Token.Kind;
import org.pofk.text.Places;
import org.pofk.text.RefusedException;

/**
 * Translates LaTeX to the tokens of the ordinary notation, each with its place in the LaTeX: a fraction is a quotient
 * in parentheses, an exponent stands in parentheses, a function's argument too.
 */
final class LatexTokens {
    private static final Set<String> TIMES = Set.of("cdot", "times", "ast");
    private static final Set<String> FRACTIONS = Set.of("frac", "dfrac", "tfrac", "cfrac");
    private static final Set<String> BINOMIALS = Set.of("binom", "dbinom", "tbinom");

    private final LatexScanner scanner;
    private final LatexLetters letters;
    private final LatexGroups groups;
    private final LatexFunctions functions;
    private final LatexCases cases;
    private final FormulaReading reading;
    private int depth;
    /** Where something that can carry an exponent has ended, or −1. */
    private int nucleus = -1;

    private LatexTokens(String text, Places places, FormulaReading reading) {
        this.scanner = new LatexScanner(text, places);
        this.letters = new LatexLetters(scanner, reading.unit());
        this.groups = new LatexGroups(scanner, this);
        this.functions = new LatexFunctions(scanner, groups, this);
        this.cases = new LatexCases(scanner, this);
        this.reading = reading;
    }

    /** The tokens, ending with one {@link Kind#END}. */
    static List<Token> read(String text, Places places, FormulaReading reading) throws RefusedException {
        LatexTokens translation = new LatexTokens(text, places, reading);
        translation.items();
        LatexScanner scanner = translation.scanner;
        if (!scanner.atEnd()) {
            int start = scanner.offset();
            translation.skipCloser();
            throw scanner.refusedShowing(start, "parenthesis-extra", "closes or parts nothing that is open");
        }
        scanner.add(Kind.END, scanner.offset());
        return scanner.tokens();
    }

    private void skipCloser() {
        String command = scanner.command();
        if (command.isEmpty()) {
            scanner.skip();
        } else {
            scanner.skipCommand(command);
        }
    }

    /** Reads up to what closes something, parts the cells of cases, or the end. */
    void items() throws RefusedException {
        if (++depth > Limits.CLAIM.deepest()) {
            throw scanner.refused(scanner.offset(), "formula-too-deep",
                    "the formula is nested more than " + Limits.CLAIM.deepest() + " deep");
        }
        nucleus = -1;
        scanner.skipSpaces();
        while (!seesCloser()) {
            item();
            scanner.skipSpaces();
        }
        depth--;
    }

    /** True at the end and where what is open is closed or parted. */
    boolean seesCloser() {
        return scanner.atEnd() || ")]}&".indexOf(scanner.next()) >= 0
                || Set.of("}", "rbrace", "rbrack", "right", "\\", "end").contains(scanner.command());
    }

    /** One character, or one command with its arguments. */
    void item() throws RefusedException {
        int before = scanner.tokens().size();
        single();
        nucleus = scanner.tokens().size() > before ? scanner.offset() : -1;
    }

    private void single() throws RefusedException {
        int start = scanner.offset();
        int c = scanner.next();
        if (c == '\\') {
            command(scanner.command(), start);
        } else if (scanner.isDigitAt(start) || c == '.' && scanner.isDigitAt(start + 1)) {
            LatexNumbers.read(scanner);
        } else if (LatexScanner.isAsciiLetter(c)) {
            letter(start);
        } else if (c == 'π') {
            scanner.skip();
            scanner.add(Kind.NAME, "pi", start);
        } else if (LatexLetters.greek(c).isPresent()) {
            scanner.skip();
            letters.letter(LatexLetters.greek(c).get(), start);
        } else if (c == '{') {
            groups.braces();
        } else if (c == '(' || c == '[') {
            groups.parenthesis();
        } else if (c == '^') {
            requireNucleus(start);
            groups.script();
        } else {
            scanner.skip();
            sign(c, start);
        }
    }

    /** Refuses an exponent behind nothing, or behind a blank that is printed. */
    private void requireNucleus(int start) throws RefusedException {
        scanner.backTo(Math.max(0, nucleus));
        scanner.skipBlanks();
        boolean isRightBehind = nucleus >= 0 && scanner.offset() == start;
        scanner.backTo(start);
        if (!isRightBehind) {
            throw scanner.refused(start, "operand-missing",
                    "a number, a name or a parenthesis is missing before '^'");
        }
    }

    private void letter(int start) throws RefusedException {
        LatexWords.requireLetters(scanner);
        scanner.skip();
        String letter = scanner.since(start);
        if (letter.equals("e")) {
            functions.euler(start, false);
        } else {
            letters.letter(letter, start);
        }
    }

    private void command(String command, int start) throws RefusedException {
        if (command.equals("{") || command.equals("lbrace") || command.equals("lbrack") || command.equals("left")) {
            groups.parenthesis();
        } else if (LatexLetters.WORD_COMMANDS.contains(command)) {
            word(command, start);
        } else if (command.equals("begin")) {
            cases.read();
        } else {
            scanner.skipCommand(command);
            namedCommand(command, start);
        }
    }

    private void word(String command, int start) throws RefusedException {
        if (letters.takesEuler(command)) {
            functions.euler(start, true);
        } else {
            letters.word(command);
        }
    }

    private void namedCommand(String command, int start) throws RefusedException {
        Optional<String> relation = command.length() > 1
                ? LatexWords.relation(command) : Optional.empty();
        if (TIMES.contains(command)) {
            scanner.add(Kind.TIMES, start);
        } else if (command.equals("div")) {
            scanner.add(Kind.DIVIDE, start);
        } else if (FRACTIONS.contains(command)) {
            functions.fraction(start);
        } else if (BINOMIALS.contains(command)) {
            functions.binomial(start);
        } else if (command.equals("sqrt")) {
            functions.root(start);
        } else if (command.equals("delta")) {
            functions.delta(start, letters);
        } else if (command.equals("operatorname")) {
            functions.operator(start);
        } else if (LatexWords.function(command).isPresent()) {
            functions.call(LatexWords.function(command).get(), start);
        } else if (command.equals("pi")) {
            scanner.add(Kind.NAME, "pi", start);
        } else if (LatexLetters.greek(command).isPresent()) {
            letters.letter(LatexLetters.greek(command).get(), start);
        } else if (command.equals("degree") || command.equals("deg")) {
            scanner.add(Kind.DEGREE, start);
        } else if (command.equals("pm") || command.equals("mp")) {
            plusMinus(command.equals("pm"), start);
        } else if (relation.isPresent()) {
            scanner.add(Kind.RELATION, relation.get(), start);
        } else {
            throw LatexWords.unknown(scanner, command, start);
        }
    }

    private void plusMinus(boolean isUpperPlus, int start) throws RefusedException {
        if (reading.plusMinus() == PlusMinus.REFUSED) {
            throw scanner.refusedShowing(start, "plus-minus", "stands for two formulas: write the one that is meant");
        }
        scanner.add(isUpperPlus == (reading.plusMinus() == PlusMinus.PLUS) ? Kind.PLUS : Kind.MINUS, start);
    }

    private void sign(int c, int start) throws RefusedException {
        switch (c) {
            case '+' -> scanner.add(Kind.PLUS, start);
            case '-', '−', '–' -> scanner.add(Kind.MINUS, start);
            case '±', '∓' -> plusMinus(c == '±', start);
            case '*', '·', '×', '⋅' -> scanner.add(Kind.TIMES, start);
            case '/', '÷' -> scanner.add(Kind.DIVIDE, start);
            case '°' -> scanner.add(Kind.DEGREE, start);
            case '=', '<', '>', '≤', '≥', '≠', '≈' -> scanner.add(Kind.RELATION,
                    LatexWords.relation(scanner.since(start)).orElseThrow(), start);
            case ',', ';', '.' -> stop(c, start);
            default -> throw LatexWords.meaningless(scanner, c, start);
        }
    }

    /** A stop or comma that ends the formula or a cell says nothing. */
    private void stop(int c, int start) throws RefusedException {
        scanner.skipSpaces();
        boolean endsCell = scanner.atEnd() || scanner.next() == '&' || scanner.sees("\\\\") || scanner.sees("\\end");
        if (!endsCell && c == ',') {
            scanner.tokens().add(new Token(Kind.COMMA, ",", start, start + 1));
        } else if (!endsCell) {
            throw LatexWords.meaningless(scanner, c, start);
        }
    }
}
