package org.pofk.transform;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.Deque;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * A chain cut down to what takes part in the asked outputs: states that the start reaches and that reach an output.
 * The readings' sequences stay the same, exactly. Cost linear in the number of entries.
 *
 * @param kept    the states that take part, ascending; the place after the last state is the constant one
 * @param reduced the system that is left
 */
public record Reduction(List<Integer> kept, LinearSystem reduced) {
    public Reduction {
        kept = List.copyOf(kept);
    }

    /** What is left of the chain for these outputs. */
    public static Reduction of(Chain chain, List<Output> outputs) {
        LinearSystem whole = LinearSystem.of(chain, outputs);
        List<Integer> kept = taking(whole);
        return new Reduction(kept, whole.restrictedTo(kept));
    }

    /** What is left of the chain when every state is asked for: the states that the start reaches. */
    static Reduction ofState(Chain chain) {
        LinearSystem whole = new LinearSystem(chain.matrix(), chain.start(),
                List.of(Collections.nCopies(chain.size(), Rational.ONE)));
        List<Integer> kept = taking(whole);
        return new Reduction(kept, whole.restrictedTo(kept));
    }

    private static List<Integer> taking(LinearSystem system) {
        BitSet started = new BitSet();
        BitSet read = new BitSet();
        for (int state = 0; state < system.size(); state++) {
            int place = state;
            started.set(state, !system.start().get(state).isZero());
            read.set(state, system.readings().stream().anyMatch(reading -> !reading.get(place).isZero()));
        }
        BitSet both = reachedAlong(forward(system.matrix()), started);
        both.and(reachedAlong(backward(system.matrix()), read));
        return both.stream().boxed().toList();
    }

    private static List<List<Integer>> forward(SparseMatrix matrix) {
        return matrix.columns().stream().map(column -> column.stream().map(Entry::row).toList()).toList();
    }

    private static List<List<Integer>> backward(SparseMatrix matrix) {
        List<List<Integer>> sources = new ArrayList<>();
        for (int i = 0; i < matrix.size(); i++) {
            sources.add(new ArrayList<>());
        }
        for (int j = 0; j < matrix.size(); j++) {
            for (Entry entry : matrix.columns().get(j)) {
                sources.get(entry.row()).add(j);
            }
        }
        return sources;
    }

    private static BitSet reachedAlong(List<List<Integer>> moves, BitSet from) {
        BitSet reached = (BitSet) from.clone();
        Deque<Integer> open = new ArrayDeque<>(from.stream().boxed().toList());
        while (!open.isEmpty()) {
            for (int next : moves.get(open.pop())) {
                if (!reached.get(next)) {
                    reached.set(next);
                    open.push(next);
                }
            }
        }
        return reached;
    }
}
