package org.pofk.steps;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.TransferFunction;

/**
 * Y(z) = Σ y(k) z^(−k), by long division. Exact; the degree of the denominator times the number of terms, in products of
 * whole numbers: all values so far are kept over one denominator, and a common factor is taken out once for each value.
 */
public final class PowerSeries {
    private PowerSeries() {
    }

    /** y(0) … y(last). */
    public static List<Rational> of(TransferFunction<Rational> y, int last) {
        Polynomial<Rational> denominator = y.denominator();
        int degree = denominator.degree();
        BigInteger scale = IntStream.range(0, degree).mapToObj(i -> denominator.coefficient(i).denominator())
                .reduce(BigInteger.ONE, (a, b) -> a.multiply(cofactor(b, a)));
        List<BigInteger> weights = IntStream.rangeClosed(1, degree)
                .mapToObj(i -> times(denominator.coefficient(degree - i), scale)).toList();
        List<Rational> values = new ArrayList<>();
        List<BigInteger> over = new ArrayList<>();
        BigInteger common = BigInteger.ONE;
        for (int k = 0; k <= last; k++) {
            BigInteger sum = BigInteger.ZERO;
            for (int i = 1; i <= Math.min(k, degree); i++) {
                sum = sum.add(weights.get(i - 1).multiply(over.get(k - i)));
            }
            Rational first = k <= degree ? y.numerator().coefficient(degree - k) : Rational.ZERO;
            Rational value = first.minus(new Rational(sum, scale.multiply(common)));
            values.add(value);
            BigInteger more = cofactor(value.denominator(), common);
            if (!more.equals(BigInteger.ONE)) {
                common = common.multiply(more);
                for (int j = Math.max(0, k - degree); j < k; j++) {
                    over.set(j, over.get(j).multiply(more));
                }
            }
            over.add(times(value, common));
        }
        return values;
    }

    private static BigInteger times(Rational value, BigInteger multiple) {
        return value.numerator().multiply(multiple.divide(value.denominator()));
    }

    /** What {@code known} lacks to be a multiple of {@code denominator}. */
    private static BigInteger cofactor(BigInteger denominator, BigInteger known) {
        return denominator.divide(denominator.gcd(known));
    }
}
