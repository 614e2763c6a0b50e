package org.pofk.bench;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/** Chains with ten moves out of every state, always the same for the same size. */
final class SparseChains {
    private static final int MOVES = 10;

    private SparseChains() {
    }

    /**
     * From every state to the next and to nine others; the chances are whole multiples of 1/{@code denominator} that
     * differ as far as it allows. The start is the first state, the output the last.
     */
    static Chain of(int size, int denominator) {
        Random random = new Random(size);
        List<List<Entry>> columns = new ArrayList<>();
        List<String> names = new ArrayList<>();
        for (int state = 0; state < size; state++) {
            Set<Integer> targets = new TreeSet<>(Set.of((state + 1) % size));
            while (targets.size() < MOVES) {
                targets.add(random.nextInt(size));
            }
            columns.add(column(targets, denominator, random));
            names.add("s" + state);
        }
        List<Rational> start = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        start.set(0, Rational.ONE);
        List<Rational> last = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        last.set(size - 1, Rational.ONE);
        return new Chain(Chain.Kind.CHAIN, names, new SparseMatrix(columns), start, Map.of(),
                List.of(new Output("last", last, Rational.ZERO, "last")));
    }

    private static List<Entry> column(Set<Integer> targets, int denominator, Random random) {
        int[] weights = new int[MOVES];
        Arrays.fill(weights, denominator / MOVES);
        for (int i = 1; i < MOVES; i += 2) {
            int moved = random.nextInt(denominator / MOVES);
            weights[i] += moved;
            weights[i - 1] -= moved;
        }
        List<Entry> column = new ArrayList<>();
        int place = 0;
        for (int target : targets) {
            column.add(new Entry(target, Rational.of(weights[place++], denominator)));
        }
        return column;
    }
}
