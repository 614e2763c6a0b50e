package org.pofk.check;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.AbstractList;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

/**
 * The state of a chain after each of so many steps, by multiplying out in whole numbers over one denominator: exact,
 * and naive on purpose. A step is taken when it is first asked for, and no fraction is put in lowest terms for it.
 */
final class Steps {
    static final int LAST = 200;

    private final BigInteger[][] matrix;
    private final BigInteger entries;
    private final List<BigInteger[]> numerators = new ArrayList<>();
    private final List<BigInteger> denominators = new ArrayList<>();

    private Steps(BigInteger[][] matrix, BigInteger entries) {
        this.matrix = matrix;
        this.entries = entries;
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
        Steps steps = new Steps(matrix, entries);
        steps.numerators.add(chain.start().stream().map(x -> over(x, start)).toArray(BigInteger[]::new));
        steps.denominators.add(start);
        return steps;
    }

    private static BigInteger commonMultiple(BigInteger so, Rational value) {
        return so.divide(so.gcd(value.denominator())).multiply(value.denominator());
    }

    private static BigInteger over(Rational value, BigInteger denominator) {
        return value.numerator().multiply(denominator.divide(value.denominator()));
    }

    private void stepTo(int k) {
        while (numerators.size() <= k) {
            int last = numerators.size() - 1;
            numerators.add(product(matrix, numerators.get(last)));
            denominators.add(denominators.get(last).multiply(entries));
        }
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

    /** A fraction that need not be in lowest terms. */
    private record Fraction(BigInteger numerator, BigInteger denominator) {
        Rational reduced() {
            return new Rational(numerator, denominator);
        }

        Near near() {
            return Near.exactly(new BigDecimal(numerator)).over(Near.exactly(new BigDecimal(denominator)));
        }
    }

    private Fraction fraction(Output output, int k) {
        stepTo(k);
        BigInteger common = output.coefficients().stream().reduce(output.constant().denominator(),
                Steps::commonMultiple, BigInteger::max);
        BigInteger sum = over(output.constant(), common).multiply(denominators.get(k));
        for (int i = 0; i < output.coefficients().size(); i++) {
            sum = sum.add(over(output.coefficients().get(i), common).multiply(numerators.get(k)[i]));
        }
        return new Fraction(sum, common.multiply(denominators.get(k)));
    }

    /** p(k) of an output. */
    Rational value(Output output, int k) {
        return fraction(output, k).reduced();
    }

    /** p(0) … p({@value #LAST}) as numbers of sixty digits, each worked out when it is first looked at. */
    List<Near> values(Output output) {
        Map<Integer, Near> known = new HashMap<>();
        return new AbstractList<>() {
            @Override
            public Near get(int k) {
                return known.computeIfAbsent(k, asked -> fraction(output, asked).near());
            }

            @Override
            public int size() {
                return LAST + 1;
            }
        };
    }
}
