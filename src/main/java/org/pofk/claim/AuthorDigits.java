package org.pofk.claim;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Optional;
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
    private static final Rational HUNDRED = Rational.of(100);
    /** A number that is a decimal of so many digits is written out whatever the author's digits. */
    private static final int SHORT = 4;
    private static final int LONGEST_PLAIN = 15;
    private static final int MAGNITUDE_BITS = 64;

    private AuthorDigits() {
    }

    /** The number as he would have written it. */
    static String like(Written written, Quantity right) {
        if (written.text().endsWith("%")) {
            Written whole = new Written(written.text().substring(0, written.text().length() - 1),
                    written.value().times(HUNDRED), written.lastPlace().times(HUNDRED), written.span());
            return decimal(whole, right.times(HUNDRED)).text() + "%";
        }
        return decimal(written, right).text();
    }

    /** To so many significant digits; zero where it is known to be. */
    static String significant(Quantity right, int digits) {
        return isZero(right) ? Decimal.ZERO.text() : right.rational().map(value -> Decimals.of(value, digits))
                .orElseGet(() -> Decimals.of(real(right), digits)).text();
    }

    /** How many significant digits a decimal has. */
    static int significant(Written written) {
        return written.value().isZero() ? 1
                : Math.max(1, magnitude(written.value()) - exponent(written.lastPlace()) + 1);
    }

    private static Decimal decimal(Written written, Quantity right) {
        if (isZero(right)) {
            return Decimal.ZERO;
        }
        int last = exponent(written.lastPlace());
        int digits = significant(written);
        Optional<Decimal> whole = right.rational().map(value -> Decimals.of(value, Math.max(digits + 2, SHORT)))
                .filter(Decimal::exact);
        if (whole.isPresent()) {
            return whole.get();
        }
        int size = magnitude(right.rational().orElseGet(() -> right.enclose(MAGNITUDE_BITS).real().middle()));
        int shown = Math.min(Math.max(size - last + 1, Math.max(1, digits - 1)), digits + 2);
        int places = Math.max(0, shown - 1 - size);
        boolean isPlain = written.text().indexOf('e') < 0 && written.text().indexOf('E') < 0;
        return isPlain && places <= LONGEST_PLAIN ? fixed(right, places) : significantly(right, shown);
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
