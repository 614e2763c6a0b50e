package org.pofk.transform;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * A chain cut down to what takes part in the asked outputs: states that the start reaches and that reach an output,
 * those that behave alike taken together. The readings' sequences stay the same, exactly. Cost O(entries · log n).
 *
 * @param kept     the states that take part, ascending; the place after the last state is the constant one
 * @param lumpings the lumpings that took states together, in the order they were made, the first one of the kept states
 * @param reduced  the system that is left
 */
public record Reduction(List<Integer> kept, List<Lumping> lumpings, LinearSystem reduced) {
    public Reduction {
        kept = List.copyOf(kept);
        lumpings = List.copyOf(lumpings);
    }

    /** What is left of the chain for these outputs. */
    public static Reduction of(Chain chain, List<Output> outputs) {
        LinearSystem whole = LinearSystem.of(chain, outputs);
        BitSet taking = reachedAlong(whole.matrix().columns(), starting(whole));
        taking.and(reachedAlong(Transposition.rows(whole.matrix()), read(whole)));
        List<Integer> kept = taking.stream().boxed().toList();
        LinearSystem left = whole.restrictedTo(kept);
        Reduction byStart = lumped(kept, left, List.of(Lumping::exact, Lumping::ordinary));
        Reduction byReadings = lumped(kept, left, List.of(Lumping::ordinary, Lumping::exact));
        return byReadings.reduced.size() < byStart.reduced.size() ? byReadings : byStart;
    }

    /** One way after the other: which one goes first can matter, a block of one needn't fit the blocks of the other. */
    private static Reduction lumped(List<Integer> kept, LinearSystem system,
            List<Function<LinearSystem, Optional<Lumping>>> ways) {
        List<Lumping> lumpings = new ArrayList<>();
        LinearSystem left = system;
        for (Function<LinearSystem, Optional<Lumping>> way : ways) {
            Optional<Lumping> lumping = way.apply(left);
            lumping.ifPresent(lumpings::add);
            left = lumping.map(Lumping::after).orElse(left);
        }
        return new Reduction(kept, lumpings, left);
    }

    /** What is left of the chain when every state is asked for: the states that the start reaches, exactly lumped. */
    public static Reduction ofState(Chain chain) {
        LinearSystem whole = new LinearSystem(chain.matrix(), chain.start(), List.of());
        List<Integer> kept = reachedAlong(whole.matrix().columns(), starting(whole)).stream().boxed().toList();
        return lumped(kept, whole.restrictedTo(kept), List.of(Lumping::exact));
    }

    private static BitSet starting(LinearSystem system) {
        BitSet starting = new BitSet();
        for (int state = 0; state < system.size(); state++) {
            starting.set(state, !system.start().get(state).isZero());
        }
        return starting;
    }

    private static BitSet read(LinearSystem system) {
        BitSet read = new BitSet();
        for (List<Rational> reading : system.readings()) {
            for (int state = 0; state < system.size(); state++) {
                if (!reading.get(state).isZero()) {
                    read.set(state);
                }
            }
        }
        return read;
    }

    private static BitSet reachedAlong(List<List<Entry>> moves, BitSet from) {
        BitSet reached = (BitSet) from.clone();
        Deque<Integer> open = new ArrayDeque<>(from.stream().boxed().toList());
        while (!open.isEmpty()) {
            for (Entry next : moves.get(open.pop())) {
                if (!reached.get(next.row())) {
                    reached.set(next.row());
                    open.push(next.row());
                }
            }
        }
        return reached;
    }
}
