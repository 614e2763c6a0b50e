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

    /** Written so that its error is at most {@code error}; empty where that takes too many digits. */
    Optional<PrintedNumber> within(RealValue value, Rational error) {
        for (int tried = digits; tried <= mostDigits; tried++) {
            PrintedNumber printed = PrintedNumber.rounded(value, tried);
            if (printed.error().compareTo(error) <= 0) {
                return Optional.of(printed);
            }
        }
        return Optional.empty();
    }

    /** As {@link #within}, the error allowed being the share over the weight; exactly where the weight is unbounded. */
    Optional<PrintedNumber> weighted(RealValue value, Optional<Rational> weight) {
        if (weight.isEmpty()) {
            return value.exact().map(exact -> PrintedNumber.exactly(value));
        }
        return within(value, weight.get().isZero() ? Rational.ONE : share.dividedBy(weight.get()));
    }
}
