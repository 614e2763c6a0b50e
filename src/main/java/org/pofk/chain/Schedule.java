package org.pofk.chain;

import java.util.List;
import java.util.Optional;

/**
 * What happens to a chain at fixed steps besides its ordinary move: actions on its state, such as inspections, and
 * phases in which it moves by other matrices. Exact.
 *
 * @param recurring actions in the order in which they are done where several fall on one step
 */
public record Schedule(List<Recurring> recurring, Optional<Phases> phases) {

    /**
     * What is done to the state at one stroke: x ← B x.
     *
     * @param matrix B, n × n, columns as in {@link Chain}
     */
    public record Action(String name, SparseMatrix matrix) {
    }

    /** Whether the chain makes its ordinary move in a step in which an action is done. */
    public enum When { AFTER_THE_STEP, INSTEAD_OF_THE_STEP }

    /** An action at the end of steps {@code first}, {@code first + every}, …; both at least one. */
    public record Recurring(Action action, int every, int first, When when) {
        public Recurring {
            requirePositive(every);
            requirePositive(first);
        }

        /** Whether it is done at the end of step k. */
        boolean isAt(int k) {
            return k >= first && (k - first) % every == 0;
        }
    }

    /**
     * A stretch of steps, at least one, in which the chain moves by one matrix.
     *
     * @param use the name of the matrix in the model
     */
    public record Phase(int steps, String use, SparseMatrix matrix) {
        public Phase {
            requirePositive(steps);
        }
    }

    /** What follows the last phase: the first one again, or the last one for ever. */
    public enum Repeat { YES, ONCE }

    /** Phases one after the other, from step 1 on; at least one. */
    public record Phases(List<Phase> list, Repeat repeat) {
        public Phases {
            list = List.copyOf(list);
            requirePositive(list.size());
        }

        /** How many steps all of them take. */
        public int steps() {
            return (int) Math.min(Integer.MAX_VALUE, list.stream().mapToLong(Phase::steps).sum());
        }
    }

    public Schedule {
        recurring = List.copyOf(recurring);
    }

    private static void requirePositive(int count) {
        if (count < 1) {
            throw new IllegalArgumentException("not at least one: " + count);
        }
    }
}
