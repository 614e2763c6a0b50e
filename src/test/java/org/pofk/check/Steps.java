package org.pofk.check;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

/**
 * The state of a chain after each of so many steps, by multiplying out in whole numbers over one denominator: exact,
 * and naive on purpose.
 */
final class Steps {
    static final int LAST = 200;

    private final List<BigInteger[]> numerators = new ArrayList<>();
    private final List<BigInteger> denominators = new ArrayList<>();

    private Steps() {
    }

    static Steps of(Chain chain) {
        int n = chain.size();
        BigInteger entries = BigInteger.ONE;
        BigInteger[][] matrix = new BigInteger[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                entries = commonMultiple(entries, chain.matrix().at(i, j));
            }
        }
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                matrix[i][j] = over(chain.matrix().at(i, j), entries);
            }
        }
        BigInteger start = chain.start().stream().reduce(BigInteger.ONE, Steps::commonMultiple, BigInteger::max);
        Steps steps = new Steps();
        steps.numerators.add(chain.start().stream().map(x -> over(x, start)).toArray(BigInteger[]::new));
        steps.denominators.add(start);
        for (int k = 0; k < LAST; k++) {
            steps.numerators.add(product(matrix, steps.numerators.get(k)));
            steps.denominators.add(steps.denominators.get(k).multiply(entries));
        }
        return steps;
    }

    private static BigInteger commonMultiple(BigInteger so, Rational value) {
        return so.divide(so.gcd(value.denominator())).multiply(value.denominator());
    }

    private static BigInteger over(Rational value, BigInteger denominator) {
        return value.numerator().multiply(denominator.divide(value.denominator()));
    }

    private static BigInteger[] product(BigInteger[][] matrix, BigInteger[] vector) {
        BigInteger[] product = new BigInteger[vector.length];
        for (int i = 0; i < vector.length; i++) {
            BigInteger sum = BigInteger.ZERO;
            for (int j = 0; j < vector.length; j++) {
                if (matrix[i][j].signum() != 0 && vector[j].signum() != 0) {
                    sum = sum.add(matrix[i][j].multiply(vector[j]));
                }
            }
            product[i] = sum;
        }
        return product;
    }

    /** p(k) of an output. */
    Rational value(Output output, int k) {
        Rational sum = output.constant();
        for (int i = 0; i < output.coefficients().size(); i++) {
            if (!output.coefficients().get(i).isZero()) {
                sum = sum.plus(output.coefficients().get(i)
                        .times(new Rational(numerators.get(k)[i], denominators.get(k))));
            }
        }
        return sum;
    }

    /** p(0) … p({@value #LAST}) as numbers of seventy digits. */
    List<Near> values(Output output) {
        List<Near> values = new ArrayList<>();
        for (int k = 0; k <= LAST; k++) {
            values.add(Near.of(value(output, k)));
        }
        return values;
    }
}
