package org.pofk.claim;

import java.math.BigDecimal;
import java.math.MathContext;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;

/**
 * Real numbers in as many digits as an author wrote in their place: to his last place while that leaves about as many
 * significant digits as he has, else to as many significant digits. Certified, as {@link Decimals}.
 */
final class AuthorDigits {
    private static final int MOST_MORE = 40;
    private static final int LONGEST_PLAIN = 15;
    private static final int MAGNITUDE_BITS = 64;

    private AuthorDigits() {
    }

    /** The number as he would have written it. */
    static String like(Written written, Quantity right) {
        return decimal(written, right, 0).text();
    }

    /** The same with as many more digits as it takes to see that it isn't what he wrote. */
    static String apartFrom(Written written, Quantity right) {
        for (int more = 0; more < MOST_MORE; more++) {
            Decimal decimal = decimal(written, right, more);
            if (decimal.value().compareTo(written.value()) != 0) {
                return decimal.text();
            }
        }
        return like(written, right);
    }

    /** To so many significant digits; zero where it is known to be. */
    static String significant(Quantity right, int digits) {
        return isZero(right) ? Decimal.ZERO.text() : right.rational().map(value -> Decimals.of(value, digits))
                .orElseGet(() -> Decimals.of(real(right), digits)).text();
    }

    private static Decimal decimal(Written written, Quantity right, int more) {
        if (isZero(right)) {
            return Decimal.ZERO;
        }
        int last = exponent(written.lastPlace());
        int digits = written.value().isZero() ? 1 : Math.max(1, magnitude(written.value()) - last + 1);
        int size = magnitude(right.rational().orElseGet(() -> right.enclose(MAGNITUDE_BITS).real().middle()));
        int shown = Math.min(Math.max(size - last + 1, Math.max(1, digits - 1)), digits + 2) + more;
        int places = Math.max(0, shown - 1 - size);
        boolean isPlain = written.text().indexOf('e') < 0 && written.text().indexOf('E') < 0;
        return isPlain && places <= LONGEST_PLAIN + more ? fixed(right, places) : significantly(right, shown);
    }

    private static Decimal fixed(Quantity right, int places) {
        return right.rational().map(value -> Decimals.fixed(value, places))
                .orElseGet(() -> Decimals.fixed(real(right), places));
    }

    private static Decimal significantly(Quantity right, int digits) {
        return right.rational().map(value -> Decimals.of(value, digits))
                .orElseGet(() -> Decimals.of(real(right), digits));
    }

    private static boolean isZero(Quantity right) {
        return right.rational().map(Rational::isZero).orElseGet(() -> right.enclose(MAGNITUDE_BITS).containsZero()
                && right.isZero() == Decision.YES);
    }

    private static Enclosed real(Quantity right) {
        return bits -> right.enclose(bits).real();
    }

    /** e of 10^e. */
    private static int exponent(Rational powerOfTen) {
        return powerOfTen.isInteger() ? powerOfTen.numerator().toString().length() - 1
                : 1 - powerOfTen.denominator().toString().length();
    }

    /** The place of the first digit, 0 for 1 … 9; only the number of digits shown depends on it. */
    private static int magnitude(Rational value) {
        if (value.isZero()) {
            return 0;
        }
        BigDecimal rounded = new BigDecimal(value.numerator())
                .divide(new BigDecimal(value.denominator()), MathContext.DECIMAL32);
        return rounded.precision() - rounded.scale() - 1;
    }
}
