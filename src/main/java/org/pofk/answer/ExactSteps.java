package org.pofk.answer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * y(0) … y(last) of outputs, from A^k x(0) stepped exactly: x(k) = v(k) / (s · L^k) with L the least common multiple
 * of A's denominators, so that a step needs whole numbers only. k steps cost k times the entries of A, on numbers of
 * k · log L bits.
 *
 * @param values one list for each output, in their order
 */
record ExactSteps(List<List<Rational>> values) {
    ExactSteps {
        values = values.stream().map(List::copyOf).toList();
    }

    static ExactSteps of(Chain chain, List<Output> outputs, int last) {
        BigInteger scale = commonDenominator(chain.matrix());
        BigInteger divisor = chain.start().stream().map(Rational::denominator)
                .reduce(BigInteger.ONE, ExactSteps::leastCommonMultiple);
        BigInteger[] state = new BigInteger[chain.size()];
        for (int i = 0; i < state.length; i++) {
            state[i] = times(chain.start().get(i), divisor);
        }
        List<List<Rational>> values = new ArrayList<>();
        outputs.forEach(output -> values.add(new ArrayList<>()));
        for (int k = 0; k <= last; k++) {
            for (int i = 0; i < outputs.size(); i++) {
                values.get(i).add(reading(outputs.get(i), state, divisor));
            }
            state = k < last ? step(chain.matrix(), scale, state) : state;
            divisor = divisor.multiply(scale);
        }
        return new ExactSteps(values);
    }

    /** L, of all entries of a matrix. */
    static BigInteger commonDenominator(SparseMatrix matrix) {
        return matrix.columns().stream().flatMap(List::stream)
                .map(entry -> entry.value().denominator()).reduce(BigInteger.ONE, ExactSteps::leastCommonMultiple);
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
        Rational sum = Rational.ZERO;
        for (int i = 0; i < state.length; i++) {
            Rational weight = output.coefficients().get(i);
            if (!weight.isZero()) {
                sum = sum.plus(weight.times(Rational.of(state[i])));
            }
        }
        return sum.dividedBy(Rational.of(divisor)).plus(output.constant());
    }

    private static BigInteger times(Rational value, BigInteger multiple) {
        return value.numerator().multiply(multiple.divide(value.denominator()));
    }

    private static BigInteger leastCommonMultiple(BigInteger a, BigInteger b) {
        return a.divide(a.gcd(b)).multiply(b);
    }
}
