package org.pofk.transform;

import java.math.BigInteger;
import java.util.Collection;
import org.pofk.exact.Rational;

/** The least common multiple of denominators. Exact; a gcd for each new one. */
final class CommonDenominator {
    private CommonDenominator() {
    }

    static BigInteger of(Collection<Rational> values) {
        BigInteger common = BigInteger.ONE;
        for (Rational value : values) {
            BigInteger denominator = value.denominator();
            if (!denominator.equals(common) && common.mod(denominator).signum() != 0) {
                common = common.multiply(denominator.divide(common.gcd(denominator)));
            }
        }
        return common;
    }
}
