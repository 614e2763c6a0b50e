package org.pofk.exact;

import java.math.BigInteger;

/**
 * A real number known to lie within (center ± radius) · 2^−scale. Certified: every operation returns a ball that
 * holds all results of operands in its balls, rounding outward.
 */
public record Ball(BigInteger center, BigInteger radius, int scale) {

    /** An exact dyadic or a rational to within 2^−scale. */
    public static Ball of(Rational value, int scale) {
        throw new UnsupportedOperationException();
    }
}
