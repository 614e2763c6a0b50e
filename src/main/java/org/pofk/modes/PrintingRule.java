package org.pofk.modes;

import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.exact.Rational;

/**
 * How numbers of a formula in decimals are written: with {@code digits} significant digits, or as many more, up to
 * {@code mostDigits}, as the number's share of the error allowed asks for.
 *
 * @param share    what the error of one number may make p(k) be off by
 * @param lastStep the last k the formula is for; empty for every k
 */
record PrintingRule(int digits, int mostDigits, Rational share, OptionalInt lastStep) {
    private static final int SPARE_BITS = 24;
    private static final int MOST_BITS = 512;

    /** Written so that its error is at most {@code error}; empty where that takes too many digits. */
    Optional<PrintedNumber> within(RealValue value, Rational error) {
        if (value.rational().isEmpty()) {
            // As close as the last number of digits tried is likely to ask: the tries before find it known.
            value.enclosure().enclose(Math.min(MOST_BITS, bits(error)));
        }
        for (int tried = digits; tried <= mostDigits; tried++) {
            PrintedNumber printed = PrintedNumber.rounded(value, tried);
            if (printed.error().compareTo(error) <= 0) {
                return Optional.of(printed);
            }
        }
        return Optional.empty();
    }

    private static int bits(Rational error) {
        int places = error.denominator().bitLength() - error.numerator().bitLength();
        return Math.max(0, places) * 5 / 4 + SPARE_BITS;
    }

    /** As {@link #within}, the error allowed being the share over the weight; exactly where the weight is unbounded. */
    Optional<PrintedNumber> weighted(RealValue value, Optional<Rational> weight) {
        if (weight.isEmpty()) {
            return value.exact().map(exact -> PrintedNumber.exactly(value));
        }
        return within(value, weight.get().isZero() ? Rational.ONE : share.dividedBy(weight.get()));
    }
}
