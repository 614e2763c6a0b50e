package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/** A sequence as a recursion of its own: the state is the next d values, moved on by the companion matrix. Exact. */
final class Companion {
    private Companion() {
    }

    /** @param first the first d values, d the degree of the recurrence */
    static Chain of(Polynomial<Rational> recurrence, List<Rational> first) {
        int order = recurrence.degree();
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < order; i++) {
            int row = i;
            rows.add(IntStream.range(0, order).mapToObj(j -> row + 1 < order
                    ? j == row + 1 ? Rational.ONE : Rational.ZERO : recurrence.coefficient(j).negate()).toList());
        }
        return new Chain(Chain.Kind.RECURSION, IntStream.range(0, order).mapToObj(i -> "k + " + i).toList(),
                SparseMatrix.ofRows(rows), first, Map.of(), List.of());
    }
}
