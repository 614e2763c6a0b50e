package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import org.pofk.answer.Increment;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.steps.BoundedMatrix;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StateArithmetic;

/**
 * Totals over the steps of a chain whose cycles are too long for formulas: what is added, and what is taken away, each
 * between bounds, taken backwards from the step asked for by powers of S. Certified.
 */
final class BoundedTotal {
    private final Chain chain;
    private final Timetable timetable;
    private final Part added;
    private final Optional<Part> taken;

    /** One of the two: none of its numbers is negative. */
    private record Part(SummedSchedule summed, BackwardBounded bounds) {
        static Part of(Chain chain, Timetable timetable, ScheduledIncrement increment, Rational factor) {
            SummedSchedule summed = SummedSchedule.of(chain, timetable, increment, factor);
            return new Part(summed, BackwardBounded.of(summed.recursion().timetable()));
        }

        private List<Rational> start() {
            return summed.recursion().chain().start();
        }

        private BoundedMatrix total() {
            return bounds.weights(summed.total().coefficients());
        }

        KnownValue at(int k) {
            Timetable steps = summed.recursion().timetable();
            if (k <= steps.before()) {
                return bounds.expected(start(), bounds.through(steps.preamble().subList(0, k), total()));
            }
            Timetable.Place place = steps.place(k);
            BoundedMatrix atCycle = bounds.through(steps.cycle().subList(0, place.within()), total());
            return bounds.expected(start(), bounds.through(steps.preamble(),
                    bounds.cycle().power(place.cycle().getAsInt()).times(atCycle)));
        }

        /** What some cycles add, for each component of the state in which they begin. */
        List<Ball> addedBy(int cycles) {
            BoundedMatrix end = bounds.cycle().power(cycles).times(total());
            return IntStream.range(0, end.rows()).mapToObj(i -> end.at(i, 0).minus(total().at(i, 0))).toList();
        }

        /** All that is ever added where each later step counts less. */
        Optional<KnownValue> everything() {
            int sum = start().size() - 2;
            List<Integer> others = IntStream.range(0, start().size()).filter(i -> i != sum).boxed().toList();
            List<Rational> already = Increment.zeros(start().size());
            already.set(sum, Rational.ONE);
            BoundedMatrix held = bounds.weights(already);
            Timetable steps = summed.recursion().timetable();
            return bounds.solved(others, bounds.through(steps.cycle(), held)).map(later ->
                    bounds.expected(start(), bounds.through(steps.preamble(), bounds.sum(later, held))));
        }
    }

    private BoundedTotal(Chain chain, Timetable timetable, Part added, Optional<Part> taken) {
        this.chain = chain;
        this.timetable = timetable;
        this.added = added;
        this.taken = taken;
    }

    /** @param factor v, with which each later step counts less */
    static BoundedTotal of(Chain chain, Timetable timetable, ScheduledIncrement increment, Rational factor) {
        ScheduledIncrement less = part(increment, value -> Rational.max(Rational.ZERO, value.negate()));
        boolean isNever = less.amounts().allMatch(Rational::isZero);
        return new BoundedTotal(chain, timetable, Part.of(chain, timetable,
                part(increment, value -> Rational.max(Rational.ZERO, value)), factor),
                isNever ? Optional.empty() : Optional.of(Part.of(chain, timetable, less, factor)));
    }

    private static ScheduledIncrement part(ScheduledIncrement increment, UnaryOperator<Rational> part) {
        Increment own = increment.own();
        return new ScheduledIncrement(new Increment(own.kind(), own.name(), own.definition(),
                own.atState().stream().map(part).toList(), own.byMove().stream().map(part).toList(),
                part.apply(own.atStart()), part.apply(own.constant())),
                increment.byMove().stream().map(each -> each.stream().map(part).toList()).toList(),
                increment.byAction().stream().map(each -> each.stream().map(part).toList()).toList());
    }

    /** The total of the steps 0 … k. */
    KnownValue at(int k) {
        KnownValue sum = added.at(k);
        return taken.map(part -> sum.minus(part.at(k))).orElse(sum);
    }

    /** All that is ever added where each later step counts less. */
    Optional<KnownValue> everything() {
        return added.everything().flatMap(sum -> taken.isEmpty() ? Optional.of(sum)
                : taken.get().everything().map(sum::minus));
    }

    /** What a cycle adds in the long run, on average where they alternate; empty where they take too long to settle. */
    Optional<KnownValue> perCycle() {
        Structure structure = CycleGraph.of(timetable, chain.start());
        StateArithmetic.Fixed fixed = StateArithmetic.Fixed.of(timetable);
        FixedPointState begin = fixed.walked(timetable, fixed.start(chain.start()), 0, timetable.before());
        return CycleLongRun.period(structure).flatMap(period ->
                CycleLongRun.certified(CycleMatrices.below(timetable, fixed), begin, structure, period)).map(longRun -> {
                    Ball sum = expected(longRun.limit(), added.addedBy(longRun.cycles()));
                    return KnownValue.within(taken.map(part ->
                            sum.minus(expected(longRun.limit(), part.addedBy(longRun.cycles())))).orElse(sum)
                            .dividedBy(longRun.cycles()));
                });
    }

    /** Of the components of the true state none is above that from below by more than what all lack to one. */
    private Ball expected(FixedPointState state, List<Ball> weights) {
        int constant = weights.size() - 1;
        Ball sum = weights.get(constant);
        for (int i = 0; i < chain.size(); i++) {
            sum = sum.plus(weights.get(i).times(Ball.between(state.components().get(i),
                    state.components().get(i).add(state.missing()), FixedPointState.BITS)));
        }
        return sum;
    }
}
