package org.pofk.exact;

import java.math.BigInteger;
import java.util.Collection;

/** The least common multiple of denominators; one where there are none. Exact; a gcd for each new one. */
public final class CommonDenominator {
    private CommonDenominator() {
    }

    public static BigInteger of(Collection<Rational> values) {
        BigInteger common = BigInteger.ONE;
        for (Rational value : values) {
            BigInteger denominator = value.denominator();
            if (!denominator.equals(common) && common.mod(denominator).signum() != 0) {
                common = LeastCommonMultiple.of(common, denominator);
            }
        }
        return common;
    }
}
