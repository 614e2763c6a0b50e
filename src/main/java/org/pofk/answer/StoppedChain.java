package org.pofk.answer;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Set;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * A chain stopped where a set is first entered: from a state of the set everything moves into one more state, "passed",
 * and stays there. So the probability of being in the set at k is that of entering it first at k, and of being in it or
 * passed that of having entered it by then. States to be avoided keep what enters them. Exact.
 *
 * @param chain        the n states of the original and "passed" behind them
 * @param law          f(k) = P(T = k), T = min{k ≥ 0: x(k) in the set}
 * @param distribution F(k) = P(T ≤ k)
 * @param survival     1 − F(k) = P(T > k)
 */
record StoppedChain(Chain chain, Output law, Output distribution, Output survival) {

    static StoppedChain of(Chain chain, Set<Integer> into, Set<Integer> avoiding) {
        int passed = chain.size();
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int state = 0; state < passed; state++) {
            columns.add(into.contains(state) ? certain(passed)
                    : avoiding.contains(state) ? certain(state) : chain.matrix().columns().get(state));
        }
        columns.add(certain(passed));
        List<String> names = new ArrayList<>(chain.states());
        names.add(unused(names, "passed"));
        List<Rational> start = new ArrayList<>(chain.start());
        start.add(Rational.ZERO);
        Chain stopped = new Chain(chain.kind(), names, new SparseMatrix(columns), start, chain.sets(), List.of());
        List<Rational> entering = indicator(passed + 1, into);
        List<Rational> entered = new ArrayList<>(entering);
        entered.set(passed, Rational.ONE);
        List<Rational> not = entered.stream().map(Rational.ONE::minus).toList();
        return new StoppedChain(stopped,
                new Output("law", entering, Rational.ZERO, "P(T = k)"),
                new Output("distribution", entered, Rational.ZERO, "P(T ≤ k)"),
                new Output("survival", not, Rational.ZERO, "P(T > k)"));
    }

    private static List<SparseMatrix.Entry> certain(int state) {
        return List.of(new SparseMatrix.Entry(state, Rational.ONE));
    }

    private static List<Rational> indicator(int size, Set<Integer> states) {
        List<Rational> coefficients = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        states.forEach(state -> coefficients.set(state, Rational.ONE));
        return coefficients;
    }

    private static String unused(List<String> names, String wanted) {
        String name = wanted;
        while (names.contains(name)) {
            name += "'";
        }
        return name;
    }
}
