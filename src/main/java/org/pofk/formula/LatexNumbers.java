package org.pofk.formula;

import java.util.Set;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/**
 * Numbers in LaTeX: {@code 0.25}, {@code 0{,}25}, {@code 12\,500} and {@code 0.123\,456} in groups of three,
 * {@code 30\%}, {@code 7.3 \cdot 10^{-4}}. A blank of another kind between digits is refused: it could be a product.
 */
final class LatexNumbers {
    private static final int LARGEST_EXPONENT = 400;
    private static final Set<String> BLANKS = Set.of(",", ";", ":", " ", "thinspace");

    private final LatexScanner scanner;
    private final StringBuilder digits = new StringBuilder();

    private LatexNumbers(LatexScanner scanner) {
        this.scanner = scanner;
    }

    /** Reads the number that begins here and adds its token. */
    static void read(LatexScanner scanner) throws RefusedException {
        new LatexNumbers(scanner).read();
    }

    private void read() throws RefusedException {
        int start = scanner.offset();
        int first = run();
        boolean isGrouped = groups(start, first <= 3 && scanner.charAt(start) != '0');
        if (scanner.next() == '.' && !endsSentence()) {
            scanner.skip();
            digits.append('.');
            groups(start, run() == 3);
        } else if (scanner.sees("{,}") && scanner.isDigitAt(scanner.offset() + 3)) {
            decimalComma(start, first, isGrouped);
        } else if (scanner.next() == ',' && scanner.isDigitAt(scanner.offset() + 1)) {
            throw scanner.refused(scanner.offset(), "decimal-comma",
                    "a decimal comma is written in braces, as in 0{,}25");
        }
        if (scanner.next() == '.' && scanner.isDigitAt(scanner.offset() + 1)) {
            scanner.skip();
            throw scanner.refusedShowing(start, "number-unreadable", "is no number: it has a point too many");
        }
        if (scanner.takes("\\%")) {
            digits.append('%');
        } else if (!scanner.lastIs(Kind.DIVIDE)) {
            powerOfTen();
        }
        scanner.add(Kind.NUMBER, digits.toString(), start);
    }

    /** True for a point behind which the formula or its cell ends. */
    private boolean endsSentence() {
        int start = scanner.offset();
        scanner.skip();
        scanner.skipSpaces();
        boolean isEnd = scanner.atEnd() || scanner.next() == '&' || scanner.sees("\\\\") || scanner.sees("\\end");
        scanner.backTo(start);
        return isEnd;
    }

    private void decimalComma(int start, int first, boolean isGrouped) throws RefusedException {
        int comma = scanner.offset();
        scanner.takes("{,}");
        digits.append('.');
        int decimals = run();
        boolean mayBeThousands = decimals == 3 && first <= 3 && scanner.charAt(start) != '0' && !isGrouped;
        if (mayBeThousands || scanner.sees("{,}")) {
            throw scanner.refused(comma, "decimal-comma", "'" + scanner.since(start) + "' can be read as "
                    + digits.toString().replace(".", "") + " or as " + digits + ": write one of these");
        }
        groups(start, decimals == 3);
    }

    /** Takes digits up to the next other character; how many. */
    private int run() {
        int start = scanner.offset();
        while (scanner.isDigitAt(scanner.offset())) {
            scanner.skip();
        }
        digits.append(scanner.since(start));
        return scanner.offset() - start;
    }

    /** Takes the groups of three digits behind a group, with a narrow blank before each; whether there are any. */
    private boolean groups(int start, boolean mayBeGrouped) throws RefusedException {
        boolean isGrouped = false;
        while (digitsBehindBlank() >= 0) {
            int blank = scanner.offset();
            scanner.backTo(digitsBehindBlank());
            if (run() != 3 || !mayBeGrouped) {
                throw scanner.refused(blank, "digits-apart", "'" + Words.shortened(scanner.since(start))
                        + "' has a blank within a number: digits stand in groups of three, and a product is"
                        + " written with \\cdot");
            }
            isGrouped = true;
        }
        return isGrouped;
    }

    /** Where digits go on behind a narrow blank, or −1. */
    private int digitsBehindBlank() {
        int start = scanner.offset();
        String command = scanner.command();
        int behind = -1;
        if (scanner.next() == '~' || BLANKS.contains(command)) {
            scanner.backTo(start + (scanner.next() == '~' ? 1 : 1 + command.length()));
            scanner.skipBlanks();
            behind = scanner.isDigitAt(scanner.offset()) ? scanner.offset() : -1;
        }
        scanner.backTo(start);
        return behind;
    }

    /** Takes {@code \cdot 10^{-4}} where it stands here, into the number's exponent. */
    private void powerOfTen() throws RefusedException {
        int start = scanner.offset();
        String exponent = exponentOfTen();
        boolean isTaken = exponent.matches("-?0*[0-9]{1,3}")
                && Math.abs(Integer.parseInt(exponent)) <= LARGEST_EXPONENT;
        if (isTaken) {
            int end = scanner.offset();
            scanner.skipBlanks();
            if (scanner.next() == '^' || scanner.next() == '_') {
                throw scanner.refused(scanner.offset(), "script-twice",
                        "what is raised already can't carry this too: use parentheses");
            }
            scanner.backTo(end);
            digits.append('e').append(exponent);
        } else {
            scanner.backTo(start);
        }
    }

    private String exponentOfTen() {
        scanner.skipSpaces();
        boolean isTimes = scanner.takes("\\cdot") || scanner.takes("\\times") || scanner.takes("·")
                || scanner.takes("×") || scanner.takes("*");
        if (!isTimes || LatexScanner.isAsciiLetter(scanner.next())) {
            return "";
        }
        scanner.skipSpaces();
        if (!scanner.takes("10")) {
            return "";
        }
        scanner.skipBlanks();
        if (!scanner.takes("^")) {
            return "";
        }
        scanner.skipBlanks();
        boolean isBraced = scanner.takes("{");
        int start = scanner.offset();
        scanner.skipBlanks();
        String sign = isBraced && (scanner.takes("-") || scanner.takes("−")) ? "-" : "";
        scanner.skipBlanks();
        int from = scanner.offset();
        while (scanner.isDigitAt(scanner.offset()) && (isBraced || scanner.offset() == start)) {
            scanner.skip();
        }
        String power = sign + scanner.since(from);
        scanner.skipBlanks();
        return !isBraced || scanner.takes("}") ? power : "";
    }
}
