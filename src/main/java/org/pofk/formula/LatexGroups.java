package org.pofk.formula;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/** Parentheses, braces and exponents in LaTeX. */
final class LatexGroups {
    private static final Map<String, String> CLOSING = Map.of("(", ")", "[", "]", "\\{", "\\}", "\\lbrace", "\\rbrace",
            "\\lbrack", "\\rbrack");

    private final LatexScanner scanner;
    private final LatexTokens items;

    LatexGroups(LatexScanner scanner, LatexTokens items) {
        this.scanner = scanner;
        this.items = items;
    }

    /** True where a parenthesis of any shape opens. */
    boolean seesParenthesis() {
        return scanner.sees("(") || scanner.sees("[") || List.of("{", "lbrace", "lbrack", "left")
                .contains(scanner.command());
    }

    /** {@code ( … )}, {@code \left[ … \right]}, {@code \{ … \}}: closed by its own kind. */
    void parenthesis() throws RefusedException {
        int start = scanner.offset();
        boolean isSized = scanner.takes("\\left");
        scanner.skipBlanks();
        String opening = delimiter(start);
        scanner.add(Kind.OPEN, start);
        items.items();
        close(start, isSized, opening);
    }

    private String delimiter(int start) throws RefusedException {
        for (String each : CLOSING.keySet()) {
            if (scanner.takes(each)) {
                return each;
            }
        }
        throw scanner.refused(start, "delimiter", "behind \\left stands one of ( [ \\{");
    }

    private void close(int start, boolean isSized, String opening) throws RefusedException {
        int end = scanner.offset();
        String expected = (isSized ? "\\right" : "") + CLOSING.get(opening);
        if (scanner.atEnd()) {
            throw scanner.refused(start, "parenthesis-open", "the parenthesis that opens here isn't closed");
        }
        boolean isRight = !isSized || scanner.takes("\\right");
        scanner.skipBlanks();
        if (!isRight || !scanner.takes(CLOSING.get(opening))) {
            throw scanner.refused(end, "parenthesis-shape", "the parenthesis opened with "
                    + (isSized ? "\\left" : "") + opening + " is closed by " + expected);
        }
        scanner.add(Kind.CLOSE, end);
    }

    /**
     * Braces around something, which print nothing. What is in them stands as it is, where that has one reading: a
     * single thing, or a product that nothing is raised behind.
     */
    void braces() throws RefusedException {
        int start = scanner.offset();
        int first = scanner.tokens().size();
        inBraces(start);
        List<Token> inside = scanner.tokens().subList(first, scanner.tokens().size());
        int end = scanner.offset();
        scanner.skipSpaces();
        boolean isRaised = scanner.next() == '^';
        scanner.backTo(end);
        boolean isPlain = inside.isEmpty() || inside.size() == 1 && inside.get(0).beginsOperand()
                || isOneParenthesis(inside)
                || !isRaised && inside.get(0).beginsOperand() && inside.stream().noneMatch(LatexGroups::mayChange);
        if (!isPlain) {
            throw scanner.refused(start, "braces",
                    "braces print nothing, so this has two readings: write ( and ) where they are meant");
        }
    }

    private static boolean mayChange(Token token) {
        return switch (token.kind()) {
            case PLUS, MINUS, DIVIDE, RELATION, COMMA, FOR -> true;
            default -> false;
        };
    }

    /** True for a parenthesis, a fraction, or a function with its argument, from the first token to the last. */
    private static boolean isOneParenthesis(List<Token> tokens) {
        int depth = 0;
        int from = tokens.get(0).is(Kind.NAME) && Words.function(tokens.get(0).text()).isPresent() ? 1 : 0;
        if (from == tokens.size() || !tokens.get(from).is(Kind.OPEN)) {
            return false;
        }
        for (int i = from; i < tokens.size(); i++) {
            depth += tokens.get(i).is(Kind.OPEN) ? 1 : tokens.get(i).is(Kind.CLOSE) ? -1 : 0;
            if (depth == 0) {
                return i == tokens.size() - 1;
            }
        }
        return false;
    }

    private void inBraces(int start) throws RefusedException {
        scanner.takes("{");
        items.items();
        requireBrace(start);
    }

    private void requireBrace(int start) throws RefusedException {
        if (scanner.atEnd()) {
            throw scanner.refused(start, "brace-open", "the brace that opens here isn't closed");
        }
        if (!scanner.takes("}")) {
            throw scanner.refused(scanner.offset(), "parenthesis-shape", "before this the brace { is to be closed");
        }
    }

    /** An argument of a command in parentheses: what stands in braces, or one digit, letter or Greek letter. */
    void argument(String of, int start) throws RefusedException {
        scanner.skipBlanks();
        int from = scanner.offset();
        if (scanner.sees("{")) {
            scanner.takes("{");
            scanner.add(Kind.OPEN, from);
            items.items();
            requireBrace(from);
            scanner.tokens().add(new Token(Kind.CLOSE, "}", scanner.offset() - 1, scanner.offset()));
            return;
        }
        scanner.add(Kind.OPEN, from);
        single(of, start);
        scanner.add(Kind.CLOSE, scanner.offset());
    }

    private void single(String of, int start) throws RefusedException {
        int from = scanner.offset();
        String command = scanner.command();
        Optional<String> letter = command.isEmpty() ? LatexLetters.greek(scanner.next()) : LatexLetters.greek(command);
        if (scanner.isDigitAt(from)) {
            scanner.skip();
            scanner.add(Kind.NUMBER, from);
        } else if (LatexScanner.isAsciiLetter(scanner.next()) && scanner.next() != 'e') {
            scanner.skip();
            scanner.add(Kind.NAME, from);
        } else if (letter.isPresent()) {
            if (command.isEmpty()) {
                scanner.skip();
            } else {
                scanner.skipCommand(command);
            }
            scanner.add(Kind.NAME, letter.get().equals("π") ? "pi" : letter.get(), from);
        } else {
            if (LookAlikes.meant(scanner.next()).isPresent()) {
                throw LatexWords.meaningless(scanner, scanner.next(), from);
            }
            throw scanner.refused(scanner.atEnd() ? start : from, "brace-missing", of.equals("^")
                    ? "what is raised goes in braces: ^{…}" : "what " + of + " works on goes in braces: " + of + "{…}");
        }
    }

    /** Refuses digits that go on behind an argument of one digit. */
    void requireNoDigit(String of) throws RefusedException {
        int at = scanner.offset();
        boolean isSingle = at > 0 && scanner.isDigitAt(at - 1);
        if (isSingle && (scanner.isDigitAt(at) || scanner.next() == '.' && scanner.isDigitAt(at + 1))) {
            throw scanner.refused(at, "brace-missing", of + " takes only the digit before this: use braces");
        }
    }

    /** What is raised behind what was read last: a power, or degrees. */
    void script() throws RefusedException {
        int start = scanner.offset();
        if (isDegree()) {
            scanner.add(Kind.DEGREE, start);
        } else {
            scanner.takes("^");
            scanner.add(Kind.POWER, start);
            exponent(start);
        }
        requireNoScript();
    }

    /** What is raised, in parentheses. */
    void exponent(int start) throws RefusedException {
        scanner.skipBlanks();
        argument("^", start);
        requireNoDigit("^");
    }

    /** Refuses a second exponent. */
    void requireNoScript() throws RefusedException {
        int at = scanner.offset();
        scanner.skipSpaces();
        if (scanner.next() == '^' || scanner.next() == '_') {
            throw scanner.refused(scanner.offset(), "script-twice",
                    "what is raised already can't carry this too: use parentheses, and an index before the exponent");
        }
        scanner.backTo(at);
    }

    private boolean isDegree() {
        int start = scanner.offset();
        scanner.takes("^");
        scanner.skipBlanks();
        boolean isBraced = scanner.takes("{");
        scanner.skipBlanks();
        boolean isCircle = scanner.command().equals("circ") && scanner.takes("\\circ");
        if (isBraced) {
            scanner.skipBlanks();
            isCircle = isCircle && scanner.takes("}");
        }
        if (!isCircle) {
            scanner.backTo(start);
        }
        return isCircle;
    }
}
