package org.pofk.schedule;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;

/**
 * Which states have a probability above zero at each place of each cycle, from the graphs of the steps alone. As there
 * are finitely many sets, they recur from some cycle on. Exact, for a chain.
 */
final class OccupiedStates {
    private static final long PLACES_AT_MOST = 2_000_000;

    private final List<List<Sets>> cycles;
    private final int recursFrom;

    /** Just before and just after what is done at a step. */
    private record Sets(BitSet before, BitSet after) {
    }

    private OccupiedStates(List<List<Sets>> cycles, int recursFrom) {
        this.cycles = cycles;
        this.recursFrom = recursFrom;
    }

    /** Empty where that is too much to list. */
    static Optional<OccupiedStates> of(Chain chain, Timetable timetable) {
        List<List<BitSet>> moves = timetable.moves().stream().map(CycleGraph::graph).toList();
        List<List<BitSet>> actions = timetable.actions().stream()
                .map(action -> CycleGraph.graph(action.matrix())).toList();
        Map<BitSet, Integer> known = new HashMap<>();
        List<List<Sets>> cycles = new ArrayList<>();
        BitSet now = CycleGraph.through(timetable, timetable.preamble(),
                CycleGraph.support(chain.start()));
        while (!known.containsKey(now)) {
            if ((cycles.size() + 1L) * timetable.period() * chain.size() > PLACES_AT_MOST) {
                return Optional.empty();
            }
            known.put(now, cycles.size());
            List<Sets> sets = new ArrayList<>();
            for (Moment moment : timetable.cycle()) {
                BitSet before = moment.move().isPresent()
                        ? CycleGraph.image(moves.get(moment.move().getAsInt()), now) : now;
                now = before;
                for (int action : moment.actions()) {
                    now = CycleGraph.image(actions.get(action), now);
                }
                sets.add(new Sets(before, now));
            }
            cycles.add(sets);
        }
        return Optional.of(new OccupiedStates(cycles, known.get(now)));
    }

    /** The first of the cycles that recur. */
    int recursFrom() {
        return recursFrom;
    }

    /** How many cycles there are until they recur. */
    int period() {
        return cycles.size() - recursFrom;
    }

    /** At step j ≥ 1 of cycle m. */
    BitSet at(Place place, long m) {
        int cycle = (int) (m < recursFrom ? m : recursFrom + (m - recursFrom) % period());
        Sets sets = cycles.get(cycle).get(place.j() - 1);
        return place.side() == Side.BEFORE ? sets.before : sets.after;
    }
}
