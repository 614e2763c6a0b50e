package org.pofk.schedule;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.answer.Percentile;
import org.pofk.answer.Percentile.Reason;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/**
 * Percentiles of a first passage under a schedule: the cycle by whose end it has happened, then the step in it by
 * halving, each place of the cycle by its own formula in m. Certified as {@link Percentile} is.
 */
final class ScheduledPercentiles {
    private static final int BITS = 4096;

    private final StoppedSchedule stopped;
    private final Rational limit;
    private final Map<Integer, Percentile.Finder> finders = new HashMap<>();

    /** @param limit the probability that it ever happens */
    ScheduledPercentiles(StoppedSchedule stopped, Rational limit) {
        this.stopped = stopped;
        this.limit = limit;
    }

    Percentile of(Rational p) {
        Percentile cycle = finder(0).of(p);
        if (cycle.k().isEmpty()) {
            return cycle;
        }
        int cycles = cycle.k().getAsInt();
        return cycles == 0 ? beforeTheCycles(p) : within(p, cycles - 1);
    }

    private Percentile.Finder finder(int place) {
        return finders.computeIfAbsent(place, j -> new Percentile.Finder(stopped.chain().cycles().chain(),
                stopped.chain().cycles().formula(stopped.distribution(), j).closedForm(), limit));
    }

    /** Not yet at the beginning of cycle m, at its end it has. */
    private Percentile within(Rational p, int m) {
        int below = 0;
        int reached = stopped.chain().timetable().period();
        while (reached - below > 1) {
            int middle = (below + reached) / 2;
            Optional<Boolean> is = finder(middle).isReached(p, m);
            if (is.isEmpty()) {
                return Percentile.Finder.none(p, Reason.NOT_DECIDED);
            }
            reached = is.get() ? middle : reached;
            below = is.get() ? below : middle;
        }
        long k = stopped.chain().timetable().before() + (long) m * stopped.chain().timetable().period() + reached;
        return k > Integer.MAX_VALUE ? Percentile.Finder.none(p, Reason.BEYOND_TWO_BILLION_STEPS) : at(p, (int) k);
    }

    private Percentile beforeTheCycles(Rational p) {
        List<KnownValue> values = stopped.chain().before(stopped.distribution()).stream()
                .map(CycleCourse.Reading::after).toList();
        for (int k = 0; k < values.size(); k++) {
            Optional<Boolean> is = isReached(values.get(k), p);
            if (is.isEmpty()) {
                return Percentile.Finder.none(p, Reason.NOT_DECIDED);
            }
            if (is.get()) {
                return at(p, k);
            }
        }
        throw new AssertionError(p + " is reached before the cycles and isn't: " + stopped);
    }

    private static Optional<Boolean> isReached(KnownValue value, Rational p) {
        if (value.exact().isPresent()) {
            return Optional.of(value.exact().get().compareTo(p) >= 0);
        }
        Ball difference = value.enclosure().enclose(BITS).minus(Ball.of(p, BITS));
        return difference.containsZero() ? Optional.empty() : Optional.of(difference.isPositive());
    }

    private static Percentile at(Rational p, int k) {
        return new Percentile(p, OptionalInt.of(k), Optional.empty());
    }
}
