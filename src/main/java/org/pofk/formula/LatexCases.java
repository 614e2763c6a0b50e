package org.pofk.formula;

import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/** {@code \begin{cases} a & k = 0 \\ b & k \ge 1 \end{cases}}. */
final class LatexCases {
    private final LatexScanner scanner;
    private final LatexTokens items;

    LatexCases(LatexScanner scanner, LatexTokens items) {
        this.scanner = scanner;
        this.items = items;
    }

    void read() throws RefusedException {
        int start = scanner.offset();
        String name = takesEnvironment("\\begin", "cases") ? "cases"
                : takesEnvironment("\\begin", "dcases") ? "dcases" : "";
        if (name.isEmpty()) {
            throw scanner.refused(start, "command-unknown", "\\begin stands only before {cases} here");
        }
        scanner.add(Kind.BRACE_OPEN, start);
        row();
        while (scanner.sees("\\\\")) {
            int end = scanner.offset();
            rowEnd();
            scanner.skipSpaces();
            if (!scanner.sees("\\end")) {
                scanner.tokens().add(new Token(Kind.SEMICOLON, "\\\\", end, end + 2));
                row();
            }
        }
        int end = scanner.offset();
        if (scanner.atEnd()) {
            throw scanner.refused(start, "brace-open", "the cases that begin here aren't ended: \\end{" + name + "}");
        }
        if (!takesEnvironment("\\end", name)) {
            throw scanner.refused(end, "parenthesis-shape", "the cases are ended by \\end{" + name + "}");
        }
        scanner.add(Kind.BRACE_CLOSE, end);
    }

    /** A formula, and the steps that it is for behind {@code &}, where words may stand too. */
    private void row() throws RefusedException {
        items.items();
        if (!scanner.sees("&")) {
            return;
        }
        int before = scanner.tokens().size();
        int sign = scanner.offset();
        scanner.takes("&");
        items.items();
        boolean hasWord = scanner.tokens().size() > before && scanner.tokens().get(before).is(Kind.FOR);
        if (!hasWord) {
            scanner.tokens().add(before, new Token(Kind.FOR, "for", sign, sign + 1));
        }
        if (scanner.sees("&")) {
            throw scanner.refused(scanner.offset(), "parenthesis-extra", "a row has one & between formula and steps");
        }
    }

    /** The end of a row, with the room it may ask for below. */
    private void rowEnd() throws RefusedException {
        int start = scanner.offset();
        scanner.takes("\\\\");
        scanner.takes("*");
        int bracket = scanner.offset();
        if (scanner.takes("[")) {
            while (!scanner.atEnd() && scanner.next() != ']') {
                scanner.skip();
            }
            boolean isLength = scanner.takes("]")
                    && scanner.since(bracket).matches("\\[ *-?[0-9.]+ *(pt|ex|em|mm|cm|in|jot|\\\\jot) *\\]");
            if (!isLength) {
                throw scanner.refused(start, "row-end", "behind \\\\ in brackets stands a length, as in \\\\[2pt]");
            }
        }
    }

    private boolean takesEnvironment(String command, String name) {
        int start = scanner.offset();
        boolean isThere = scanner.takes(command);
        scanner.skipBlanks();
        isThere = isThere && scanner.takes("{" + name + "}");
        if (!isThere) {
            scanner.backTo(start);
        }
        return isThere;
    }
}
