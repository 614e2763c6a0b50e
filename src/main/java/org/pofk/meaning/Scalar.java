package org.pofk.meaning;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * A number of a formula while it is read. Two are written alike when {@code factor} and {@code rest} agree: then they
 * are the same number at face value, with decimals to the same last place; that they don't says nothing.
 *
 * @param quantity the number
 * @param factor   a rational factor, 0 only for zero itself
 * @param rest     what the factor stands before, as numbered by {@link Scalars}
 * @param face     the value at face value where it is seen to be a rational of some length
 * @param real     true when it is seen to be real
 * @param weight   at least the number of its parts, and of 64-bit words of its value
 */
record Scalar(Quantity quantity, Rational factor, int rest, Optional<Rational> face, boolean real, int weight) {
    private static final int MOST_BITS = 29;

    boolean isAlike(Scalar other) {
        return rest == other.rest && factor.equals(other.factor);
    }

    /** True when this is written as zero, or cancels as it is written. */
    boolean isPlainZero() {
        return factor.isZero();
    }

    boolean isPlainOne() {
        return rest == Scalars.NO_REST && factor.isOne();
    }

    /** The value at face value where it is a whole number; more than nine digits are too large. */
    Optional<Integer> whole() {
        Optional<BigInteger> number = face.filter(Rational::isInteger).map(Rational::numerator);
        number.ifPresent(value -> Work.within(value.bitLength(), MOST_BITS));
        return number.map(BigInteger::intValueExact);
    }
}
