package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.pofk.answer.When.Condition;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.transform.Sequence;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * (y(k) − b)/Mᵏ for a sequence without a long run, M a power of two above one and above the modulus of every pole
 * (Cauchy's bound 1 + max |coefficient| on the roots of a monic polynomial). It tends to zero and has the sign of
 * y(k) − b, so that y(k) is compared with b as any sequence is with its limit. Exact.
 *
 * @param recursion companion matrix of the recurrence over M, and 1/Mᵏ as one more component
 * @param output    the difference
 */
record ScaledDifference(Chain recursion, Output output) {

    static ScaledDifference of(Transform transform, Rational bound) {
        Polynomial<Rational> recurrence = transform.recurrence();
        int order = recurrence.degree();
        Rational scale = scale(recurrence).inverse();
        List<List<Entry>> columns = new ArrayList<>();
        for (int j = 0; j < order; j++) {
            List<Entry> column = new ArrayList<>();
            if (j > 0) {
                column.add(new Entry(j - 1, scale));
            }
            Rational last = recurrence.coefficient(j).negate().times(scale);
            column.add(new Entry(order - 1, last));
            columns.add(column);
        }
        columns.add(List.of(new Entry(order, scale)));
        Sequence values = Sequence.of(transform);
        List<Rational> start = new ArrayList<>(IntStream.range(0, order).mapToObj(values::at).toList());
        start.add(Rational.ONE);
        List<Rational> reading = new ArrayList<>(IntStream.range(0, order)
                .mapToObj(i -> i == 0 ? Rational.ONE : Rational.ZERO).toList());
        reading.add(bound.negate());
        Chain recursion = new Chain(Chain.Kind.RECURSION, IntStream.rangeClosed(0, order)
                .mapToObj(i -> i < order ? "value " + i + " steps on" : "one").toList(), new SparseMatrix(columns), start,
                Map.of(), List.of());
        return new ScaledDifference(recursion, new Output("difference", reading, Rational.ZERO, "difference"));
    }

    private static Rational scale(Polynomial<Rational> recurrence) {
        Rational largest = recurrence.coefficients().stream().map(Rational::abs).reduce(Rational.ONE, Rational::max);
        Rational two = Rational.of(2);
        Rational scale = two;
        while (scale.compareTo(largest.plus(Rational.ONE)) <= 0) {
            scale = scale.times(two);
        }
        return scale;
    }

    /** When it lies on the side of zero that a condition on y(k) names: at least, or at most. */
    When when(Condition.Kind kind) {
        Transform transform = Transforms.of(recursion, List.of(output)).get(0);
        return When.of(recursion, ClosedForm.of(transform), LongRun.of(recursion, transform),
                new Condition(kind, Rational.ZERO));
    }
}
