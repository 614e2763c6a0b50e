package org.pofk.longrun;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.PowerSequence;

/**
 * A chain's state at high powers: the third way to a long run, and what common practice, comparing two successive
 * high powers, would have made of it. The states are certified enclosures.
 */
public final class HighPowers {
    /** What common practice takes for "no longer changes": six decimals. */
    public static final Rational HABIT = Rational.of(1, 2_000_000);
    /**
     * An accepted value may be wrong by this much, of the value where that is above one, and by a tenth of what it
     * should be, before a habit misleads.
     */
    private static final Rational RIGHT_WITHIN = Rational.of(1, 100_000);

    private final PowerSequence sequence;

    private HighPowers(PowerSequence sequence) {
        this.sequence = sequence;
    }

    /** The two ways in which successive powers are compared. */
    public enum Way { STEP_BY_STEP, BY_SQUARING }

    /**
     * What became of the value that a habit accepted. By size: the states had settled to within what the habit looks
     * at, the output is much larger or smaller than that, and twice as many steps would have been enough.
     */
    public enum Outcome { RIGHT, MISLED_BY_CYCLE, MISLED_BY_SLOW_POLE, MISLED_BY_SIZE }

    /**
     * Where comparing successive powers would have stopped, because no state changed by more than {@link #HABIT}.
     *
     * @param k       the later of the two powers compared
     * @param value   what the output reads there
     * @param outcome whether that is the long run
     */
    public record Stop(Way way, long k, Ball value, Outcome outcome) {
    }

    /**
     * Powers of two over which no state changes by more than {@link #HABIT} from one to the next although the output
     * is wrong by more than a habit may be: within such a horizon it behaves as {@code value}.
     *
     * @param from first power of two, {@code to} the last
     */
    public record Plateau(long from, long to, Ball value) {
    }

    /**
     * High powers held against a long run.
     *
     * @param k           the highest power, and how many steps from there were looked at: one, or a whole cycle
     * @param within      no value seen there is farther than this from the long run; proved
     * @param habits      where each habit stops; a habit that never stops in what was computed isn't listed
     * @param plateau     where it seems to have settled and hasn't
     */
    public record Verdict(long k, int looked, Rational within, List<Stop> habits, Optional<Plateau> plateau) {
        public Verdict {
            habits = List.copyOf(habits);
        }

        /** True when some habit accepts a value that is not the long run. */
        public boolean habitMisleads() {
            return habits.stream().anyMatch(stop -> stop.outcome != Outcome.RIGHT);
        }
    }

    /**
     * @param period of the cycle to be looked at, 1 for a limit
     */
    public static HighPowers of(Chain chain, int period) {
        return new HighPowers(PowerSequence.of(chain, period, HABIT));
    }

    /** Empty when there is neither a limit nor a listed cycle, or the states computed cover less than its period. */
    public Optional<Verdict> against(LongRun longRun, Output output) {
        List<Rational> values = LongRunValues.of(longRun);
        if (values.isEmpty() || values.size() > sequence.tail().size()) {
            return Optional.empty();
        }
        long highest = 1L << (sequence.doubling().size() - 1);
        Rational within = Rational.ZERO;
        for (int j = 0; j < values.size(); j++) {
            Rational expected = values.get((int) ((highest + j) % values.size()));
            within = Rational.max(within, farthest(sequence.tail().get(j).reading(output), expected));
        }
        List<Stop> habits = new ArrayList<>();
        stopStepByStep(output, values).ifPresent(habits::add);
        stopBySquaring(output, values).ifPresent(habits::add);
        return Optional.of(new Verdict(highest, values.size(), within, habits, plateau(output, values)));
    }

    /** The last of the first powers of two that agree, where the value they agree on is not the long run's. */
    private Optional<Plateau> plateau(Output output, List<Rational> values) {
        Optional<Stop> first = stopBySquaring(output, values)
                .filter(stop -> stop.outcome == Outcome.MISLED_BY_SLOW_POLE);
        return first.map(stop -> {
            int place = Long.numberOfTrailingZeros(stop.k);
            while (place + 1 < sequence.doubling().size() && hardlyChanges(sequence.doubling(), place + 1)) {
                place++;
            }
            return new Plateau(stop.k / 2, 1L << place, stop.value);
        });
    }

    private static boolean hardlyChanges(List<FixedPointState> states, int place) {
        return states.get(place).isWithin(HABIT, states.get(place - 1));
    }

    private Optional<Stop> stopStepByStep(Output output, List<Rational> values) {
        return firstStop(sequence.steps(), PowerSequence.HIGH)
                .map(place -> stop(Way.STEP_BY_STEP, place, sequence.steps().get(place), output, values));
    }

    private Optional<Stop> stopBySquaring(Output output, List<Rational> values) {
        return firstStop(sequence.doubling(), Integer.numberOfTrailingZeros(PowerSequence.HIGH))
                .map(place -> stop(Way.BY_SQUARING, 1L << place, sequence.doubling().get(place), output, values));
    }

    /** The place, from the given one on, of the first state that differs from the one before it by no more than the habit's tolerance. */
    private static Optional<Integer> firstStop(List<FixedPointState> states, int firstPlace) {
        for (int place = firstPlace; place < states.size(); place++) {
            if (hardlyChanges(states, place)) {
                return Optional.of(place);
            }
        }
        return Optional.empty();
    }

    private Stop stop(Way way, long k, FixedPointState state, Output output, List<Rational> values) {
        Ball value = state.reading(output);
        if (values.stream().allMatch(each -> isRight(value, each))) {
            return new Stop(way, k, value, Outcome.RIGHT);
        }
        Rational expected = values.get((int) (k % values.size()));
        Outcome outcome = isRight(value, expected) ? Outcome.MISLED_BY_CYCLE
                : isOnlyBySize(k, farthest(value, expected), output, values) ? Outcome.MISLED_BY_SIZE
                : Outcome.MISLED_BY_SLOW_POLE;
        return new Stop(way, k, value, outcome);
    }

    /** Whether the error is the habit's tolerance times a coefficient, and gone at the second power of two from k on. */
    private boolean isOnlyBySize(long k, Rational distance, Output output, List<Rational> values) {
        Rational largest = output.coefficients().stream().map(Rational::abs).reduce(Rational.ZERO, Rational::max);
        int later = Math.min(sequence.doubling().size() - 1, Long.SIZE - Long.numberOfLeadingZeros(k) + 1);
        Rational expected = values.get((int) ((1L << later) % values.size()));
        return distance.compareTo(RIGHT_WITHIN.times(largest)) <= 0
                && isRight(sequence.doubling().get(later).reading(output), expected);
    }

    /** A small probability has to be right in its own size too, not only in its decimals; so has a large value. */
    private static boolean isRight(Ball value, Rational expected) {
        Rational distance = farthest(value, expected);
        Rational allowed = RIGHT_WITHIN.times(Rational.max(Rational.ONE, expected.abs()));
        return distance.compareTo(allowed) <= 0
                && (expected.isZero() || distance.times(Rational.of(10)).compareTo(expected.abs()) <= 0);
    }

    private static Rational farthest(Ball ball, Rational value) {
        Rational unit = Rational.TWO.pow(-ball.scale());
        return Rational.of(ball.center()).times(unit).minus(value).abs().plus(Rational.of(ball.radius()).times(unit));
    }
}
