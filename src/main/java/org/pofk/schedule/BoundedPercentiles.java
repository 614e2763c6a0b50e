package org.pofk.schedule;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.answer.Percentile;
import org.pofk.answer.Percentile.Reason;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.schedule.ScheduledWait.Ever;
import org.pofk.steps.FixedPointColumn;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StateArithmetic;

/**
 * Percentiles of a first passage under a schedule whose cycles are too long for formulas: the cycle by powers of S from
 * below, the step by taking it step by step. Certified; "not decided" where the bounds hold the share asked for.
 */
final class BoundedPercentiles {
    private static final int BITS = 128;
    private static final int EXACT_UP_TO = 20_000;

    private final StoppedSchedule stopped;
    private final ScheduledWait wait;
    private final Timetable timetable;
    private final StateArithmetic.Fixed arithmetic;
    private final FixedPointState begin;
    /** S^(2^q). */
    private final List<List<FixedPointColumn>> powers = new ArrayList<>();

    BoundedPercentiles(StoppedSchedule stopped, ScheduledWait wait) {
        this.stopped = stopped;
        this.wait = wait;
        this.timetable = stopped.chain().timetable();
        this.arithmetic = StateArithmetic.Fixed.of(timetable);
        this.begin = arithmetic.walked(timetable, arithmetic.start(stopped.chain().chain().start()), 0,
                timetable.before());
        this.powers.add(CycleMatrices.below(timetable, arithmetic));
    }

    Percentile of(Rational p) {
        if (p.isOne() && wait.ever() == Ever.CERTAIN) {
            return byMovesAlone(p);
        }
        Ball most = wait.probability().enclosure().enclose(BITS).minus(Ball.of(p, BITS));
        if (most.isNegative()) {
            return Percentile.Finder.none(p, Reason.NEVER);
        }
        return most.isPositive() ? bySteps(p) : Percentile.Finder.none(p, Reason.NOT_DECIDED);
    }

    /** The step after which nothing is left that waits: where it is, no number decides. */
    private Percentile byMovesAlone(Rational p) {
        BitSet start = waiting(CycleGraph.support(stopped.chain().chain().start()));
        BitSet waiting = waiting(CycleGraph.through(timetable, timetable.preamble(), start));
        if (waiting.isEmpty()) {
            return byMovesAlone(p, start, 0, timetable.before());
        }
        for (int m = 0; m < stopped.chain().chain().size(); m++) {
            BitSet left = waiting(CycleGraph.through(timetable, timetable.cycle(), waiting));
            if (left.isEmpty()) {
                return byMovesAlone(p, waiting, timetable.before() + m * timetable.period(), timetable.period());
            }
            waiting = left;
        }
        return Percentile.Finder.none(p, Reason.NEVER);
    }

    /** @param steps after which nothing waits */
    private Percentile byMovesAlone(Rational p, BitSet begin, int from, int steps) {
        BitSet waiting = begin;
        for (int k = from; k < from + steps; k++) {
            if (waiting.isEmpty()) {
                return at(p, k);
            }
            waiting = waiting(CycleGraph.through(timetable, List.of(timetable.at(k + 1)), waiting));
        }
        return at(p, from + steps);
    }

    private BitSet waiting(BitSet states) {
        BitSet waiting = (BitSet) states.clone();
        stopped.into().forEach(waiting::clear);
        return waiting;
    }

    private Percentile bySteps(Rational p) {
        Optional<Boolean> isBefore = isReached(begin, p, timetable.before());
        if (isBefore.isEmpty()) {
            return Percentile.Finder.none(p, Reason.NOT_DECIDED);
        }
        if (isBefore.get()) {
            return within(p, arithmetic.start(stopped.chain().chain().start()), 0, timetable.before());
        }
        long cycles = 0;
        FixedPointState state = begin;
        int q = 0;
        // up to the first power of two of cycles by which it is reached, and down from there
        while (true) {
            Optional<Boolean> is = isReached(after(q, begin), p, step(1L << q));
            if (is.isEmpty()) {
                return Percentile.Finder.none(p, Reason.NOT_DECIDED);
            }
            if (is.get()) {
                break;
            }
            q++;
            if ((long) timetable.period() << q > 2L * Integer.MAX_VALUE) {
                return Percentile.Finder.none(p, Reason.BEYOND_TWO_BILLION_STEPS);
            }
        }
        for (q--; q >= 0; q--) {
            FixedPointState later = after(q, state);
            Optional<Boolean> is = isReached(later, p, step(cycles + (1L << q)));
            if (is.isEmpty()) {
                return Percentile.Finder.none(p, Reason.NOT_DECIDED);
            }
            state = is.get() ? state : later;
            cycles += is.get() ? 0 : 1L << q;
        }
        long from = step(cycles);
        return from + timetable.period() > Integer.MAX_VALUE
                ? Percentile.Finder.none(p, Reason.BEYOND_TWO_BILLION_STEPS)
                : within(p, state, (int) from, timetable.period());
    }

    private FixedPointState after(int q, FixedPointState state) {
        while (powers.size() <= q) {
            powers.add(FixedPointColumn.squared(powers.get(powers.size() - 1)));
        }
        return FixedPointState.combination(powers.get(q), state.components());
    }

    /** The first of these steps by whose end it is reached; by the last of them it is. */
    private Percentile within(Rational p, FixedPointState first, int from, int steps) {
        FixedPointState state = first;
        for (int k = from; k <= from + steps; k++) {
            Optional<Boolean> is = isReached(state, p, k);
            if (is.isEmpty()) {
                return Percentile.Finder.none(p, Reason.NOT_DECIDED);
            }
            if (is.get()) {
                return at(p, k);
            }
            state = arithmetic.walked(timetable, state, k, 1);
        }
        throw new AssertionError(p + " is reached by step " + (from + steps) + " and isn't: " + stopped);
    }

    private long step(long cycles) {
        return timetable.before() + cycles * timetable.period();
    }

    /** Where the bounds hold the share, by the value itself, if that is known. */
    private Optional<Boolean> isReached(FixedPointState state, Rational p, long k) {
        Ball difference = state.reading(stopped.distribution()).minus(Ball.of(p, FixedPointState.BITS));
        if (!difference.containsZero()) {
            return Optional.of(difference.isPositive());
        }
        return k > EXACT_UP_TO ? Optional.empty()
                : stopped.chain().after(stopped.distribution(), List.of((int) k)).get(0).flatMap(KnownValue::exact)
                        .map(value -> value.compareTo(p) >= 0);
    }

    private static Percentile at(Rational p, int k) {
        return new Percentile(p, OptionalInt.of(k), Optional.empty());
    }
}
