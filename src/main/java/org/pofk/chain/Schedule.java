package org.pofk.chain;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;

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

        private Recurring after(int step) {
            int next = step < first ? first - step : every - (step - first) % every;
            return new Recurring(action, every, next, when);
        }

        private Recurring with(UnaryOperator<SparseMatrix> changed) {
            return new Recurring(new Action(action.name, changed.apply(action.matrix)), every, first, when);
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

        /** The phase a step lies in is cut in two; what has gone by comes last where phases repeat. */
        private Phases after(int step) {
            int left = repeat == Repeat.YES ? step % steps() : Math.min(step, steps() - 1);
            List<Phase> goneBy = new ArrayList<>();
            List<Phase> ahead = new ArrayList<>();
            for (Phase phase : list) {
                int gone = Math.min(left, phase.steps);
                left -= gone;
                if (gone > 0) {
                    goneBy.add(new Phase(gone, phase.use, phase.matrix));
                }
                if (gone < phase.steps) {
                    ahead.add(new Phase(phase.steps - gone, phase.use, phase.matrix));
                }
            }
            if (repeat == Repeat.YES) {
                ahead.addAll(goneBy);
            }
            return new Phases(ahead, repeat);
        }

        private Phases with(UnaryOperator<SparseMatrix> changed) {
            return new Phases(list.stream().map(each ->
                    new Phase(each.steps, each.use, changed.apply(each.matrix))).toList(), repeat);
        }
    }

    public Schedule {
        recurring = List.copyOf(recurring);
    }

    /** The same as seen from the end of a step, 0 or later: its step k is the step {@code step} + k of this. */
    public Schedule after(int step) {
        return new Schedule(recurring.stream().map(each -> each.after(step)).toList(),
                phases.map(each -> each.after(step)));
    }

    /** The same with each of its matrices changed. */
    public Schedule with(UnaryOperator<SparseMatrix> changed) {
        return new Schedule(recurring.stream().map(each -> each.with(changed)).toList(),
                phases.map(each -> each.with(changed)));
    }

    private static void requirePositive(int count) {
        if (count < 1) {
            throw new IllegalArgumentException("not at least one: " + count);
        }
    }
}
