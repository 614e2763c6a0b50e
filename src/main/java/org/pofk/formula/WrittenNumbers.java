package org.pofk.formula;

import java.math.BigDecimal;
import java.math.BigInteger;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.WrittenDecimal;

/** Numbers as they are written in formulas. */
final class WrittenNumbers {
    private static final Rational HUNDREDTH = Rational.of(1, 100);

    private WrittenNumbers() {
    }

    /**
     * A number token: digits alone are exact, and so are whole per cents; anything with a point or an exponent is a
     * decimal with its text, where {@code 2.5%} becomes {@code 0.025}, which has the same last place.
     */
    static Formula read(String text) {
        boolean isPercent = text.endsWith("%");
        String digits = isPercent ? text.substring(0, text.length() - 1) : text;
        if (digits.chars().allMatch(c -> c >= '0' && c <= '9')) {
            Rational whole = Rational.of(new BigInteger(digits));
            return new Number(isPercent ? whole.times(HUNDREDTH) : whole);
        }
        return new WrittenDecimal(isPercent ? new BigDecimal(digits).movePointLeft(2).toPlainString() : digits);
    }

    /** An integer, a negative one as negation. */
    static Formula integer(String digits) {
        return digits.startsWith("-")
                ? new Negation(integer(digits.substring(1)))
                : new Number(Rational.of(new BigInteger(digits)));
    }
}
