package org.pofk.steps;

import java.math.BigInteger;
import java.util.List;
import org.pofk.chain.Output;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Rational;

/**
 * A vector in whole numbers over one divisor, common factors left in. Exact.
 *
 * @param divisor above zero
 */
public record WholeState(List<BigInteger> numerators, BigInteger divisor) {
    public WholeState {
        numerators = List.copyOf(numerators);
    }

    public static WholeState of(List<Rational> vector) {
        BigInteger common = CommonDenominator.of(vector);
        return new WholeState(vector.stream().map(value -> WholeMatrix.whole(value, common)).toList(), common);
    }

    /** The components in lowest terms. */
    public List<Rational> reduced() {
        return numerators.stream().map(numerator -> new Rational(numerator, divisor)).toList();
    }

    /** Unless that takes out next to nothing, the same with the factor common to all components and the divisor gone. */
    public WholeState shortened() {
        BigInteger common = divisor;
        for (BigInteger numerator : numerators) {
            common = common.gcd(numerator);
            if (common.bitLength() < Integer.SIZE) {
                return this;
            }
        }
        BigInteger factor = common;
        return new WholeState(numerators.stream().map(each -> each.divide(factor)).toList(), divisor.divide(factor));
    }

    Fraction reading(Output output) {
        WholeState weights = of(output.coefficients());
        BigInteger sum = BigInteger.ZERO;
        for (int i = 0; i < numerators.size(); i++) {
            if (weights.numerators.get(i).signum() != 0) {
                sum = sum.add(weights.numerators.get(i).multiply(numerators.get(i)));
            }
        }
        Fraction read = new Fraction(sum, divisor.multiply(weights.divisor));
        return output.constant().isZero() ? read : read.plus(Fraction.of(output.constant()));
    }
}
