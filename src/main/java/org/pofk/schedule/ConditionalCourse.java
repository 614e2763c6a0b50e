package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.stream.IntStream;
import org.pofk.schedule.CycleCourse.Extreme;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.steps.KnownValue;

/**
 * What one output reads in steps running given what is known at the same moment, with mean and extremes of the values
 * there are. As in {@link CycleCourse} what is before the actions of step 0 is no value of its own.
 *
 * @param readings at j = 0 … n
 * @param average  mean of the values after at j = 0 … n − 1, each given what is known at its own step; empty where
 *                 there is none, or some aren't decided
 * @param highest  over the values before at j = 1 … n and after at j = 0 … n − 1; empty likewise
 */
public record ConditionalCourse(List<Reading> readings, Optional<KnownValue> average, Optional<Extreme> highest,
        Optional<Extreme> lowest) {

    /** A value, or why there is none: what is known has probability zero then, or that isn't decided. */
    public record Value(Kind kind, Optional<KnownValue> value) {
        static final Value IMPOSSIBLE = new Value(Kind.IMPOSSIBLE, Optional.empty());
        static final Value NOT_DECIDED = new Value(Kind.NOT_DECIDED, Optional.empty());

        /** What there may be. */
        public enum Kind { VALUE, IMPOSSIBLE, NOT_DECIDED }

        static Value of(KnownValue value) {
            return new Value(Kind.VALUE, Optional.of(value));
        }
    }

    /** The values j steps on. */
    public record Reading(int j, Value before, Value after) {
        public Value at(Side side) {
            return side == Side.BEFORE ? before : after;
        }
    }

    public ConditionalCourse {
        readings = List.copyOf(readings);
    }

    /** How many steps it covers. */
    public int steps() {
        return readings.size() - 1;
    }

    /** Whether no value is left undecided. */
    public boolean isDecided() {
        return isDecided(readings);
    }

    private static boolean isDecided(List<Reading> readings) {
        return readings.stream().noneMatch(each -> each.before.kind == Value.Kind.NOT_DECIDED
                || each.after.kind == Value.Kind.NOT_DECIDED);
    }

    /** @param value of j = 0 … {@code steps} and a side; before at j = 0 it isn't asked for */
    static ConditionalCourse of(int steps, BiFunction<Integer, Side, Value> value) {
        List<Reading> readings = IntStream.rangeClosed(0, steps).mapToObj(j -> {
            Value after = value.apply(j, Side.AFTER);
            return new Reading(j, j == 0 ? after : value.apply(j, Side.BEFORE), after);
        }).toList();
        List<Reading> begun = readings.subList(0, steps);
        List<KnownValue> after = begun.stream().flatMap(each -> each.after.value.stream()).toList();
        boolean isMean = !after.isEmpty()
                && begun.stream().noneMatch(each -> each.after.kind == Value.Kind.NOT_DECIDED);
        return new ConditionalCourse(readings, isMean ? Optional.of(KnownValue.mean(after)) : Optional.empty(),
                extreme(readings, 1), extreme(readings, -1));
    }

    /** @param sign 1 for the largest, −1 for the smallest */
    private static Optional<Extreme> extreme(List<Reading> readings, int sign) {
        if (!isDecided(readings)) {
            return Optional.empty();
        }
        List<Extreme> all = new ArrayList<>();
        readings.subList(0, readings.size() - 1).forEach(each -> add(all, each, Side.AFTER));
        readings.subList(1, readings.size()).forEach(each -> add(all, each, Side.BEFORE));
        List<KnownValue> values = all.stream().map(Extreme::value).toList();
        return all.stream().reduce((best, next) ->
                sign * next.value().compareMiddle(best.value()) > 0 ? next : best).map(best ->
                new Extreme(best.j(), best.side(), best.value().among(values)));
    }

    private static void add(List<Extreme> all, Reading reading, Side side) {
        reading.at(side).value.ifPresent(value -> all.add(new Extreme(reading.j, side, value)));
    }
}
