package org.pofk.steps;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * Outputs at some steps, from A^k x(0) stepped exactly: x(k) = v(k) / (s · L^k) with L the least common multiple of
 * A's denominators, so that a step needs whole numbers only. k steps cost k times the entries of A, on numbers of
 * k · log L bits; a common factor is taken out once for each value.
 *
 * @param values one list for each output, in their order; each by ascending step
 */
public record ExactSteps(List<List<Rational>> values) {
    /** Steps that are never too many. */
    public static final int FEW = 1_000;

    public ExactSteps {
        values = values.stream().map(List::copyOf).toList();
    }

    /** y(0) … y(last). */
    public static ExactSteps of(Chain chain, List<Output> outputs, int last) {
        return at(chain, outputs, IntStream.rangeClosed(0, last).boxed().toList());
    }

    /** The values at steps in ascending order. */
    public static ExactSteps at(Chain chain, List<Output> outputs, List<Integer> steps) {
        BigInteger scale = commonDenominator(chain.matrix());
        BigInteger divisor = commonDenominator(chain.start());
        BigInteger[] state = new BigInteger[chain.size()];
        for (int i = 0; i < state.length; i++) {
            state[i] = times(chain.start().get(i), divisor);
        }
        List<List<Rational>> values = new ArrayList<>();
        outputs.forEach(output -> values.add(new ArrayList<>()));
        int k = 0;
        for (int wanted : steps) {
            for (; k < wanted; k++) {
                state = step(chain.matrix(), scale, state);
                divisor = divisor.multiply(scale);
            }
            for (int i = 0; i < outputs.size(); i++) {
                values.get(i).add(reading(outputs.get(i), state, divisor));
            }
        }
        return new ExactSteps(values);
    }

    /** By how many bits the numbers grow in one step at most: L, or L times the largest sum of a column of |A|. */
    public static int bitsPerStep(SparseMatrix matrix) {
        BigInteger scale = commonDenominator(matrix);
        return matrix.columns().stream().map(column -> column.stream()
                .map(entry -> times(entry.value(), scale).abs()).reduce(BigInteger.ZERO, BigInteger::add))
                .reduce(scale, BigInteger::max).bitLength();
    }

    /** L, of all entries of a matrix. */
    private static BigInteger commonDenominator(SparseMatrix matrix) {
        return commonDenominator(matrix.columns().stream().flatMap(List::stream).map(SparseMatrix.Entry::value)
                .toList());
    }

    private static BigInteger commonDenominator(List<Rational> values) {
        return values.stream().map(Rational::denominator).distinct()
                .reduce(BigInteger.ONE, ExactSteps::leastCommonMultiple);
    }

    private static BigInteger[] step(SparseMatrix matrix, BigInteger scale, BigInteger[] state) {
        BigInteger[] next = new BigInteger[state.length];
        Arrays.fill(next, BigInteger.ZERO);
        for (int j = 0; j < state.length; j++) {
            if (state[j].signum() != 0) {
                for (SparseMatrix.Entry entry : matrix.columns().get(j)) {
                    next[entry.row()] = next[entry.row()].add(times(entry.value(), scale).multiply(state[j]));
                }
            }
        }
        return next;
    }

    private static Rational reading(Output output, BigInteger[] state, BigInteger divisor) {
        BigInteger common = commonDenominator(output.coefficients());
        BigInteger sum = BigInteger.ZERO;
        for (int i = 0; i < state.length; i++) {
            Rational weight = output.coefficients().get(i);
            if (!weight.isZero()) {
                sum = sum.add(times(weight, common).multiply(state[i]));
            }
        }
        return new Rational(sum, divisor.multiply(common)).plus(output.constant());
    }

    private static BigInteger times(Rational value, BigInteger multiple) {
        return value.numerator().multiply(multiple.divide(value.denominator()));
    }

    private static BigInteger leastCommonMultiple(BigInteger a, BigInteger b) {
        return a.divide(a.gcd(b)).multiply(b);
    }
}
