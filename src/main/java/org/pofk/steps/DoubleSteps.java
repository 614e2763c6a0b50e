package org.pofk.steps;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * y(0), y(1), … as ordinary stepping x(k+1) = A x(k) in double precision gives them: the object of a comparison.
 *
 * @param values the doubles' exact values, one list for each output; shorter than asked for where one overflows
 */
public record DoubleSteps(List<List<Rational>> values) {
    public DoubleSteps {
        values = values.stream().map(List::copyOf).toList();
    }

    public static DoubleSteps of(Chain chain, List<Output> outputs, int last) {
        double[][] entries = chain.matrix().columns().stream()
                .map(column -> column.stream().mapToDouble(entry -> entry.value().approximate()).toArray())
                .toArray(double[][]::new);
        double[][] weights = outputs.stream().map(output -> approximate(output.coefficients()))
                .toArray(double[][]::new);
        double[] state = approximate(chain.start());
        List<List<Rational>> values = new ArrayList<>();
        outputs.forEach(output -> values.add(new ArrayList<>()));
        for (int k = 0; k <= last; k++) {
            for (int i = 0; i < weights.length; i++) {
                double reading = reading(weights[i], state) + outputs.get(i).constant().approximate();
                if (Double.isFinite(reading) && values.get(i).size() == k) {
                    values.get(i).add(Rational.of(new BigDecimal(reading)));
                }
            }
            state = step(chain.matrix(), entries, state);
        }
        return new DoubleSteps(values);
    }

    private static double[] approximate(List<Rational> values) {
        return values.stream().mapToDouble(Rational::approximate).toArray();
    }

    private static double reading(double[] weights, double[] state) {
        double sum = 0;
        for (int i = 0; i < state.length; i++) {
            // a state that isn't read must not spoil the reading by overflowing
            sum += weights[i] == 0 ? 0 : weights[i] * state[i];
        }
        return sum;
    }

    private static double[] step(SparseMatrix matrix, double[][] entries, double[] state) {
        double[] next = new double[state.length];
        for (int j = 0; j < state.length; j++) {
            List<SparseMatrix.Entry> column = matrix.columns().get(j);
            for (int i = 0; i < entries[j].length; i++) {
                next[column.get(i).row()] += entries[j][i] * state[j];
            }
        }
        return next;
    }
}
