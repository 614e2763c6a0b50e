package org.pofk.meaning;

import java.math.BigDecimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;

/**
 * The digits of the value a written decimal should have: its own where they are right, else as its author writes:
 * plain, with an exponent, or as a percentage. Certified.
 */
final class RightDigits {
    private RightDigits() {
    }

    static String of(Written written, Quantity right, Fit fit) {
        if (right.isReal() == Decision.NO) {
            return text(written, right.realPart(), 0) + " + "
                    + text(written, right.imaginaryPart(), 0) + "i";
        }
        String digits = text(written, right, 0);
        // rounded alike though it is wrong, or rounded the other way in a tie: one place more shows it
        boolean alike = denoted(digits).equals(written.value());
        if (alike && fit == Fit.RIGHT) {
            return written.text();
        }
        return alike || fit == Fit.RIGHT ? text(written, right, 1) : digits;
    }

    private static Rational denoted(String digits) {
        return digits.endsWith("%")
                ? Rational.of(new BigDecimal(digits.substring(0, digits.length() - 1))).times(Rational.of(1, 100))
                : Rational.of(new BigDecimal(digits));
    }

    private static String text(Written written, Quantity right, int morePlaces) {
        if (right.isZero() == Decision.YES) {
            return "0";
        }
        boolean percent = written.text().endsWith("%");
        Quantity shown = percent ? right.times(Rational.of(100)) : right;
        Rational lastPlace = percent ? written.lastPlace().times(Rational.of(100)) : written.lastPlace();
        int places = morePlaces - Carried.magnitude(lastPlace);
        Enclosed value = shown.rational().map(Enclosed::of).orElse(bits -> shown.enclose(bits).real());
        boolean exponent = written.text().indexOf('e') >= 0 || written.text().indexOf('E') >= 0 || places < 0;
        String digits = exponent
                ? Decimals.of(value, significant(value, places)).text()
                : plain(shown, value, places);
        return percent ? digits + "%" : digits;
    }

    private static String plain(Quantity shown, Enclosed value, int places) {
        return shown.rational().map(exact -> Decimals.fixed(exact, places)).orElseGet(() -> Decimals.fixed(value, places))
                .text();
    }

    /** How many significant digits of a number that isn't zero reach the place: at least one. */
    private static int significant(Enclosed value, int places) {
        Rational size = Rational.of(new BigDecimal(Decimals.of(value, 1).text())).abs();
        return Math.max(1, Carried.magnitude(size) + places + 1);
    }
}
