package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * A chain with two more components, so that what a step adds and what was added up to it are outputs of one linear
 * recursion: y(k) = v^k x(k), now(k+1) = v m y(k) from now(0) = atStart, and before(k+1) = before(k) + g(k) from 0.
 * A constant is carried by one more component. Exact.
 *
 * @param recursion the n states of the original and what is added behind them
 * @param step      g(k) = v^k times the {@link Increment}: c y(k) + now(k)
 * @param total     G(k) = g(0) + … + g(k) = before(k) + g(k)
 */
public record SummedChain(Chain recursion, Output step, Output total) {

    /** @param factor v, with which each later step counts less: 1, or 1/(1 + d) for a discount d */
    static SummedChain of(Chain chain, Increment increment, Rational factor) {
        int now = chain.size();
        int before = now + 1;
        int one = now + 2;
        List<List<Entry>> columns = new ArrayList<>();
        for (int state = 0; state < chain.size(); state++) {
            List<Entry> column = new ArrayList<>();
            chain.matrix().columns().get(state)
                    .forEach(entry -> column.add(new Entry(entry.row(), entry.value().times(factor))));
            column.add(new Entry(now, increment.byMove().get(state).times(factor)));
            column.add(new Entry(before, increment.atState().get(state)));
            columns.add(column);
        }
        columns.add(List.of(new Entry(before, Rational.ONE)));
        columns.add(List.of(new Entry(before, Rational.ONE)));
        columns.add(List.of(new Entry(before, increment.constant()), new Entry(one, factor)));
        List<Rational> step = new ArrayList<>(increment.atState());
        step.addAll(List.of(Rational.ONE, Rational.ZERO, increment.constant()));
        List<Rational> total = new ArrayList<>(step);
        total.set(before, Rational.ONE);
        List<Rational> start = new ArrayList<>(chain.start());
        start.addAll(List.of(increment.atStart(), Rational.ZERO,
                increment.constant().isZero() ? Rational.ZERO : Rational.ONE));
        Chain recursion = new Chain(Chain.Kind.RECURSION, names(chain), new SparseMatrix(columns), start, chain.sets(),
                List.of());
        SummedName names = SummedName.of(increment, factor);
        return new SummedChain(recursion, new Output(names.step(), step, Rational.ZERO, names.ofStep()),
                new Output(names.total(), total, Rational.ZERO, names.ofTotal()));
    }

    private static List<String> names(Chain chain) {
        List<String> names = new ArrayList<>(chain.states());
        for (String wanted : List.of("added by moves", "added before", "constant")) {
            String name = wanted;
            while (names.contains(name)) {
                name += "'";
            }
            names.add(name);
        }
        return names;
    }
}
