package org.pofk.schedule;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.pofk.answer.ConditionalLongRun;
import org.pofk.chain.Timetable;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.schedule.ConditionalCourse.Value;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.KnownValue;
import org.pofk.steps.PossibleSteps;

/**
 * What an output given what is known tends to, by step of the cycle. Where what is known keeps a probability, by the
 * values that numerator and denominator tend to; where that dies out, by the outermost poles of both as sequences over
 * the cycles.
 */
final class ConditionalRegime {
    private static final int CYCLES_AT_MOST = 64;

    private final ScheduledChain chain;
    private final Timetable timetable;

    private ConditionalRegime(ScheduledChain chain) {
        this.chain = chain;
        this.timetable = chain.timetable();
    }

    /** Over as many cycles as it takes until it recurs; empty where it isn't decided. */
    static Optional<ConditionalCourse> of(ScheduledChain chain, Optional<PossibleMoments> possible,
            ScheduledOutput joint, ScheduledOutput event) {
        ConditionalRegime regime = new ConditionalRegime(chain);
        return regime.kept(possible, recurring(joint), recurring(event)).or(() -> regime.byPoles(joint, event));
    }

    private static Optional<PeriodicRegime.Recurring> recurring(ScheduledOutput output) {
        return output.regime().flatMap(regime -> regime.accept(
                new PeriodicRegime.Visitor<Optional<PeriodicRegime.Recurring>>() {
                    @Override
                    public Optional<PeriodicRegime.Recurring> recurring(PeriodicRegime.Recurring recurring) {
                        return Optional.of(recurring);
                    }

                    @Override
                    public Optional<PeriodicRegime.Recurring> none(PeriodicRegime.None none) {
                        return Optional.empty();
                    }
                }));
    }

    /** Empty unless at each place what is known keeps a probability or is impossible for ever. */
    private Optional<ConditionalCourse> kept(Optional<PossibleMoments> possible,
            Optional<PeriodicRegime.Recurring> joint, Optional<PeriodicRegime.Recurring> event) {
        if (possible.isEmpty() || joint.isEmpty() || event.isEmpty()) {
            return Optional.empty();
        }
        CycleCourse above = joint.get().course();
        CycleCourse below = event.get().course();
        ConditionalCourse course = ConditionalCourse.of(below.steps(), (j, side) -> {
            KnownValue value = below.readings().get(j).at(side);
            return value.isPositive() ? Value.of(above.readings().get(j).at(side).over(value))
                    : isNeverMore(possible.get().at(side), j, below.steps()) ? Value.IMPOSSIBLE : Value.NOT_DECIDED;
        });
        return course.isDecided() ? Optional.of(course) : Optional.empty();
    }

    /** Whether none of the late steps P + j + i · {@code every} is possible. */
    private boolean isNeverMore(PossibleSteps possible, int j, int every) {
        long first = timetable.before() + j;
        long late = first + (possible.from() / every + 1L) * every;
        return LongStream.range(0, LeastCommonMultiple.of(possible.period(), every) / every)
                .noneMatch(i -> possible.at(late + i * every));
    }

    private Optional<ConditionalCourse> byPoles(ScheduledOutput joint, ScheduledOutput event) {
        if (!chain.areAllFormulasWithinReach()) {
            return Optional.empty();
        }
        List<Place> places = places();
        List<ConditionalLongRun> found = chain.conditional(joint.output(), event.output(), places).stream()
                .map(each -> each.longRun()).toList();
        long cycles = found.stream().mapToLong(each -> Math.max(1, each.values().size())).reduce(1, (a, b) ->
                a > CYCLES_AT_MOST ? a : LeastCommonMultiple.of(a, b));
        if (cycles > CYCLES_AT_MOST
                || found.stream().anyMatch(each -> each.kind() == ConditionalLongRun.Kind.PERIOD_TOO_LONG)) {
            return Optional.empty();
        }
        Map<Place, ConditionalLongRun> byPlace = new HashMap<>();
        IntStream.range(0, places.size()).forEach(i -> byPlace.put(places.get(i), found.get(i)));
        return Optional.of(ConditionalCourse.of(Math.toIntExact(cycles * timetable.period()),
                (j, side) -> value(byPlace, j, side)));
    }

    /** All steps after what is done there, and before it where something is done. */
    private List<Place> places() {
        List<Place> places = new ArrayList<>();
        for (int j = 0; j < timetable.period(); j++) {
            places.add(new Place(j, Side.AFTER));
            if (isActed(j + 1)) {
                places.add(new Place(j + 1, Side.BEFORE));
            }
        }
        return places;
    }

    private boolean isActed(int j) {
        return !timetable.cycle().get(j - 1).actions().isEmpty();
    }

    /** @param j from the beginning of the first of the cycles until they recur */
    private Value value(Map<Place, ConditionalLongRun> byPlace, int j, Side side) {
        int period = timetable.period();
        boolean isBefore = side == Side.BEFORE && isActed((j - 1) % period + 1);
        Place place = isBefore ? new Place((j - 1) % period + 1, Side.BEFORE) : new Place(j % period, Side.AFTER);
        return byPlace.get(place).at(isBefore ? (j - 1) / period : j / period).map(value -> Value.of(value.rational()
                .map(KnownValue::of).orElseGet(() -> KnownValue.of(value.enclosure())))).orElse(Value.IMPOSSIBLE);
    }
}
