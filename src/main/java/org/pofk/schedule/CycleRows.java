package org.pofk.schedule;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.StateArithmetic;

/**
 * What an output reads at step j of a cycle, j = 1 … T, as a row on the state at its beginning: entry i is what it reads
 * there when the cycle begins in state i. Certified, for a chain. T · n products of a matrix and a vector.
 */
final class CycleRows {
    private static final double WORK_AT_MOST = 2e7;

    private final List<Integer> reached;
    private final List<List<Reading>> readings;
    private final Map<Place, Row> rows = new HashMap<>();

    /**
     * In units of 2^−{@value FixedPointState#BITS}.
     *
     * @param entries one for each state that is reached
     * @param most    none is farther from zero
     * @param spread  no two are farther apart than twice this
     */
    private record Row(List<Ball> entries, BigInteger most, BigInteger spread) {
        static Row of(List<Ball> entries) {
            BigInteger high = entries.stream().map(each -> each.center().add(each.radius())).reduce(BigInteger::max)
                    .orElseThrow();
            BigInteger low = entries.stream().map(each -> each.center().subtract(each.radius()))
                    .reduce(BigInteger::min).orElseThrow();
            return new Row(entries, high.abs().max(low.abs()),
                    high.subtract(low).add(BigInteger.ONE).shiftRight(1));
        }
    }

    private CycleRows(List<Integer> reached, List<List<Reading>> readings) {
        this.reached = reached;
        this.readings = readings;
    }

    static boolean isWithinReach(Chain chain, Timetable timetable) {
        return Math.pow(chain.size(), 2) * timetable.period() <= WORK_AT_MOST;
    }

    static CycleRows of(Chain chain, Timetable timetable, Output output) {
        StateArithmetic.Fixed fixed = StateArithmetic.Fixed.of(timetable);
        List<Integer> unreached = CycleGraph.of(timetable, chain.start()).unreached();
        List<Integer> reached = IntStream.range(0, chain.size()).boxed().filter(i -> !unreached.contains(i)).toList();
        List<List<Reading>> readings = new ArrayList<>();
        for (int state : reached) {
            readings.add(CycleCourse.of(timetable, fixed, FixedPointState.in(state, chain.size()), timetable.before(),
                    timetable.period(), List.of(output)).courses().get(0).readings());
        }
        return new CycleRows(reached, readings);
    }

    private Row row(Place place) {
        return rows.computeIfAbsent(place, at -> Row.of(readings.stream()
                .map(each -> each.get(at.j()).at(at.side()).enclosure().enclose(FixedPointState.BITS)).toList()));
    }

    /** What is read at a place of the cycle that begins in a state. */
    Ball of(Place place, FixedPointState begin) {
        Row row = row(place);
        BigInteger center = BigInteger.ZERO;
        BigInteger radius = row.most.multiply(begin.missing());
        for (int i = 0; i < reached.size(); i++) {
            BigInteger weight = begin.components().get(reached.get(i));
            center = center.add(row.entries.get(i).center().multiply(weight));
            radius = radius.add(row.entries.get(i).radius().multiply(weight));
        }
        // one unit each for cutting off the center and the radius
        return new Ball(center.shiftRight(FixedPointState.BITS), radius.shiftRight(FixedPointState.BITS)
                .add(BigInteger.TWO), FixedPointState.BITS);
    }

    /** Two readings are no farther apart than this where the states the cycles begin in are {@code distance} apart. */
    BigInteger apart(Place place, BigInteger distance) {
        return row(place).spread.multiply(distance).shiftRight(FixedPointState.BITS).add(BigInteger.ONE);
    }
}
