package org.pofk.steps;

import java.math.BigInteger;
import java.util.ArrayList;
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
        WholeMatrix matrix = WholeMatrix.of(chain.matrix());
        WholeState state = WholeState.of(chain.start());
        List<List<Rational>> values = new ArrayList<>();
        outputs.forEach(output -> values.add(new ArrayList<>()));
        int k = 0;
        for (int wanted : steps) {
            for (; k < wanted; k++) {
                state = matrix.times(state);
            }
            for (int i = 0; i < outputs.size(); i++) {
                values.get(i).add(state.reading(outputs.get(i)).reduced());
            }
        }
        return new ExactSteps(values);
    }

    /** By how many bits the numbers grow in one step at most: L, or L times the largest sum of a column of |A|. */
    public static int bitsPerStep(SparseMatrix matrix) {
        BigInteger scale = matrix.commonDenominator();
        return matrix.columns().stream().map(column -> column.stream()
                .map(entry -> WholeMatrix.whole(entry.value(), scale).abs()).reduce(BigInteger.ZERO, BigInteger::add))
                .reduce(scale, BigInteger::max).bitLength();
    }
}
