package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.FirstEntrance;
import org.pofk.answer.Increment;
import org.pofk.answer.PassageMoments;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;
import org.pofk.longrun.LinearEquations;
import org.pofk.longrun.StationaryDistribution;

/**
 * From each state at a step of a schedule: h, the probability of ever entering a set, u and w, the means of T and of
 * T² where it is entered and zero where it isn't, T counted from there. First-step analysis step by step: before a
 * step that does M, h = Mᵀ h, u = Mᵀ (u + h), w = Mᵀ (w + 2 u + h); over a whole cycle each solves one system with
 * I − Sᵀ on the states from which the set can be reached. Exact.
 */
record ScheduledEntrance(List<Rational> h, List<Rational> u, List<Rational> w) {

    /** From the start of the chain, step 0. */
    static ScheduledEntrance of(StoppedSchedule stopped) {
        Backwards backwards = new Backwards(stopped);
        return backwards.through(stopped.chain().timetable().preamble(), backwards.atCycles());
    }

    /** Of the chain's own start. */
    PassageMoments moments(List<Rational> start) {
        Rational probability = sum(start, h);
        if (probability.isZero()) {
            return new PassageMoments(probability, Optional.empty(), Optional.empty());
        }
        Rational mean = sum(start, u).dividedBy(probability);
        return new PassageMoments(probability, Optional.of(mean),
                Optional.of(sum(start, w).dividedBy(probability).minus(mean.times(mean))));
    }

    /** From each state. */
    FirstEntrance fromEach() {
        return new FirstEntrance(h, IntStream.range(0, h.size()).mapToObj(i -> h.get(i).isZero()
                ? Optional.<Rational>empty()
                : Optional.of(u.get(i).dividedBy(h.get(i)))).toList());
    }

    private static Rational sum(List<Rational> weights, List<Rational> values) {
        return IntStream.range(0, weights.size()).mapToObj(i -> weights.get(i).times(values.get(i)))
                .reduce(Rational.ZERO, Rational::plus);
    }

    /** One stopped chain, from later steps to earlier ones. */
    private static final class Backwards {
        private final StoppedSchedule stopped;
        private final List<Integer> open;
        private final SparseMatrix system;
        private final List<Rational> probabilities;

        Backwards(StoppedSchedule stopped) {
            this.stopped = stopped;
            Chain cycles = stopped.chain().cycles().chain();
            this.open = FirstEntrance.open(cycles.matrix(), stopped.into(), stopped.avoiding());
            Map<Integer, Integer> place = StationaryDistribution.placeOf(open);
            this.system = FirstEntrance.identityMinusTransposed(cycles.matrix(), open, place);
            this.probabilities = FirstEntrance.of(cycles, stopped.into(), stopped.avoiding()).probabilities();
        }

        /** At the beginning of any cycle. */
        ScheduledEntrance atCycles() {
            List<Moment> cycle = stopped.chain().timetable().cycle();
            List<Rational> zeros = Increment.zeros(probabilities.size());
            List<Rational> steps = solved(through(cycle, new ScheduledEntrance(probabilities, zeros, zeros)).u);
            List<Rational> squares = solved(through(cycle, new ScheduledEntrance(probabilities, steps, zeros)).w);
            return new ScheduledEntrance(probabilities, steps, squares);
        }

        /** x with x = Sᵀ x + what one cycle adds. */
        private List<Rational> solved(List<Rational> added) {
            List<Rational> solution = LinearEquations.solve(system, open.stream().map(added::get).toList());
            List<Rational> all = Increment.zeros(added.size());
            for (int i = 0; i < open.size(); i++) {
                all.set(open.get(i), solution.get(i));
            }
            return all;
        }

        ScheduledEntrance through(List<Moment> moments, ScheduledEntrance end) {
            ScheduledEntrance now = end;
            for (int i = moments.size() - 1; i >= 0; i--) {
                now = before(moments.get(i), now);
            }
            return now;
        }

        private ScheduledEntrance before(Moment moment, ScheduledEntrance after) {
            List<Rational> later = plus(after.u, after.h);
            return new ScheduledEntrance(through(moment, after.h), ended(through(moment, later)),
                    ended(through(moment, plus(plus(after.w, after.u), later))));
        }

        /** Zero where nothing is waited for any more. */
        private List<Rational> ended(List<Rational> values) {
            return IntStream.range(0, values.size()).mapToObj(state -> stopped.into().contains(state)
                    || stopped.avoiding().contains(state) ? Rational.ZERO : values.get(state)).toList();
        }

        private List<Rational> through(Moment moment, List<Rational> row) {
            List<Rational> result = row;
            for (int i = moment.actions().size() - 1; i >= 0; i--) {
                result = fromLeft(stopped.chain().timetable().actions().get(moment.actions().get(i)).matrix(), result);
            }
            return moment.move().isPresent()
                    ? fromLeft(stopped.chain().timetable().moves().get(moment.move().getAsInt()), result) : result;
        }

        private static List<Rational> fromLeft(SparseMatrix matrix, List<Rational> row) {
            return matrix.columns().stream().map(column -> column.stream()
                    .map(entry -> entry.value().times(row.get(entry.row())))
                    .reduce(Rational.ZERO, Rational::plus)).toList();
        }

        private static List<Rational> plus(List<Rational> a, List<Rational> b) {
            List<Rational> sum = new ArrayList<>();
            for (int i = 0; i < a.size(); i++) {
                sum.add(a.get(i).plus(b.get(i)));
            }
            return sum;
        }
    }
}
