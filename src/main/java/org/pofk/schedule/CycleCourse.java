package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StateArithmetic;

/**
 * What one output reads in steps running of a timetable, each just before and just after the actions of the step, with
 * mean and extremes.
 *
 * @param readings at j = 0 … n: the mean is that of the n values after, j = 0 … n − 1; what is before the actions of
 *                 step 0 is the value after them, its own before standing at the end of the cycle before
 * @param average  mean of the values after at j = 0 … n − 1
 * @param highest  over the values before at j = 1 … n and after at j = 0 … n − 1
 */
public record CycleCourse(List<Reading> readings, KnownValue average, Extreme highest, Extreme lowest) {

    /** Before or after the actions of a step. */
    public enum Side { BEFORE, AFTER }

    /** The output j steps on. */
    public record Reading(int j, KnownValue before, KnownValue after) {
        public KnownValue at(Side side) {
            return side == Side.BEFORE ? before : after;
        }
    }

    /**
     * The largest or smallest value and where it is first taken; where values are certified only, none is beyond it by
     * more than the enclosure says, wherever it is taken.
     */
    public record Extreme(int j, Side side, KnownValue value) {
    }

    public CycleCourse {
        readings = List.copyOf(readings);
    }

    /** How many steps it covers. */
    public int steps() {
        return readings.size() - 1;
    }

    /** One course an output, and the state at the end. */
    record Walked<V>(List<CycleCourse> courses, V end) {
    }

    /**
     * Takes a state through the steps after {@code first}.
     *
     * @param state at the end of step {@code first}
     * @param steps at least one
     */
    static <V, R> Walked<V> of(Timetable timetable, StateArithmetic<V, R> arithmetic, V state, int first, int steps,
            List<Output> outputs) {
        List<Track<V, R>> tracks = outputs.stream().map(output -> new Track<>(arithmetic, output)).toList();
        V now = state;
        for (Track<V, R> track : tracks) {
            track.begin(now);
        }
        for (int j = 1; j <= steps; j++) {
            Moment moment = timetable.at(first + j);
            V before = moment.move().isPresent() ? arithmetic.moved(moment.move().getAsInt(), now) : now;
            now = before;
            for (int action : moment.actions()) {
                now = arithmetic.acted(action, now);
            }
            for (Track<V, R> track : tracks) {
                track.add(before, now, !moment.actions().isEmpty());
            }
        }
        return new Walked<>(tracks.stream().map(Track::course).toList(), now);
    }

    private static final class Track<V, R> {
        private final StateArithmetic<V, R> arithmetic;
        private final Output output;
        private final List<R> before = new ArrayList<>();
        private final List<R> after = new ArrayList<>();

        Track(StateArithmetic<V, R> arithmetic, Output output) {
            this.arithmetic = arithmetic;
            this.output = output;
        }

        void begin(V state) {
            R reading = arithmetic.reading(output, state);
            before.add(reading);
            after.add(reading);
        }

        void add(V stateBefore, V stateAfter, boolean isActed) {
            R reading = arithmetic.reading(output, stateBefore);
            before.add(reading);
            after.add(isActed ? arithmetic.reading(output, stateAfter) : reading);
        }

        CycleCourse course() {
            int steps = after.size() - 1;
            R sum = after.get(0);
            for (int j = 1; j < steps; j++) {
                sum = arithmetic.sum(sum, after.get(j));
            }
            List<Reading> readings = new ArrayList<>();
            for (int j = 0; j <= steps; j++) {
                KnownValue known = arithmetic.known(before.get(j));
                readings.add(new Reading(j, known, before.get(j) == after.get(j) ? known
                        : arithmetic.known(after.get(j))));
            }
            return new CycleCourse(readings, arithmetic.known(arithmetic.over(sum, steps)), extreme(1), extreme(-1));
        }

        /** @param sign 1 for the largest, −1 for the smallest */
        private Extreme extreme(int sign) {
            int steps = after.size() - 1;
            List<R> all = new ArrayList<>(after.subList(0, steps));
            all.addAll(before.subList(1, steps + 1));
            int best = 0;
            for (int i = 1; i < all.size(); i++) {
                boolean isBetter = sign > 0 ? arithmetic.isAbove(all.get(i), all.get(best))
                        : arithmetic.isAbove(all.get(best), all.get(i));
                best = isBetter ? i : best;
            }
            return new Extreme(best < steps ? best : best - steps + 1, best < steps ? Side.AFTER : Side.BEFORE,
                    arithmetic.extreme(all.get(best), all));
        }
    }
}
