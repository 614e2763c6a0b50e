package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;

/** Right numbers where the author wrote none, in about as many digits as he writes. */
final class RightNumber {
    static final int DIGITS = 6;
    private static final int BITS = 64;
    /** What is longer is read by nobody. */
    private static final int LONGEST_FRACTION = 60;

    private RightNumber() {
    }

    /**
     * A fraction where the number is a short one and the author writes no decimals, else decimals: as the longest of his, or
     * to some digits.
     */
    static String of(Quantity number, List<Written> decimals) {
        Optional<String> fraction = number.rational().map(Rational::toString)
                .filter(text -> decimals.isEmpty() && text.length() <= LONGEST_FRACTION);
        if (fraction.isPresent()) {
            return fraction.get();
        }
        int digits = decimals.stream().mapToInt(AuthorDigits::significant).max().orElse(DIGITS);
        String real = AuthorDigits.significant(number.realPart(), digits);
        if (isReal(number)) {
            return real;
        }
        String imaginary = AuthorDigits.significant(number.imaginaryPart(), digits);
        return (real.equals("0") ? "" : real) + (imaginary.startsWith("-") ? " - " + imaginary.substring(1)
                : real.equals("0") ? imaginary : " + " + imaginary) + " i";
    }

    /** Whether the author gives an angle in degrees. */
    static boolean isInDegrees(FormulaText text) {
        return text.parsed().nodes().anyMatch(node -> node.formula() == Formula.Constant.DEGREE);
    }

    /** An angle in degrees, as the author of a text writes them. */
    static String inDegrees(Quantity angle, FormulaText text, List<Written> decimals) {
        return of(angle.times(Rational.of(180)).dividedBy(Quantity.pi()), decimals)
                + (text.notation() == FormulaText.Notation.LATEX ? "^{\\circ}" : " deg");
    }

    static boolean isReal(Quantity number) {
        return number.realPart() == number || number.enclose(BITS).imaginary().containsZero()
                && number.imaginaryPart().isZero() == Decision.YES;
    }
}
