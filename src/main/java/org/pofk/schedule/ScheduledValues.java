package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.steps.FixedPointColumn;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeMatrix;

/**
 * Outputs at given steps under a schedule, just before and just after what is done there: whole cycles by S, the steps
 * beyond one by one. Exact as far as numbers stay within reach, certified beyond.
 */
final class ScheduledValues {
    /** Bits of a number times what there is of them in a matrix, times the cycles: a second or two. */
    private static final double EXACT_AT_MOST = 3e8;

    private ScheduledValues() {
    }

    /** One list for each output, in their order, each by ascending step; {@code j} of a reading is the step. */
    static List<List<Reading>> of(Chain chain, Timetable timetable, StateArithmetic.Whole whole, List<Output> outputs,
            List<Integer> at) {
        long bits = CycleMatrices.bits(timetable, whole);
        List<Integer> exactly = at.stream().filter(k -> chain.kind() == Chain.Kind.RECURSION
                || isWithinReach(chain.size(), timetable, bits, k)).toList();
        List<Integer> beyond = at.subList(exactly.size(), at.size());
        List<List<Reading>> values = new ArrayList<>();
        outputs.forEach(output -> values.add(new ArrayList<>()));
        if (!exactly.isEmpty()) {
            WholeMatrix cycle = CycleMatrices.exact(timetable, whole);
            add(values, walked(timetable, whole, whole.start(chain.start()), cycle::times, outputs, exactly));
        }
        if (!beyond.isEmpty()) {
            StateArithmetic.Fixed fixed = StateArithmetic.Fixed.of(timetable);
            List<FixedPointColumn> cycle = CycleMatrices.below(timetable, fixed);
            add(values, walked(timetable, fixed, fixed.start(chain.start()),
                    state -> FixedPointState.combination(cycle, state.components()), outputs, beyond));
        }
        return values;
    }

    static boolean isWithinReach(int size, Timetable timetable, long bits, int k) {
        double cycles = (double) k / timetable.period() + 1;
        double words = bits / (double) Long.SIZE + 1;
        return cycles * cycles * words * words * size * size <= EXACT_AT_MOST;
    }

    private static void add(List<List<Reading>> values, List<List<Reading>> more) {
        for (int i = 0; i < values.size(); i++) {
            values.get(i).addAll(more.get(i));
        }
    }

    private static <V, R> List<List<Reading>> walked(Timetable timetable, StateArithmetic<V, R> arithmetic, V start,
            UnaryOperator<V> cycle, List<Output> outputs, List<Integer> at) {
        List<List<Reading>> values = outputs.stream().map(output -> new ArrayList<Reading>())
                .collect(Collectors.toList());
        V begun = start;
        int reached = 0;
        for (int k : at) {
            if (k > timetable.before() && reached < timetable.before()) {
                begun = arithmetic.walked(timetable, begun, reached, timetable.before() - reached);
                reached = timetable.before();
            }
            for (; reached >= timetable.before() && reached + timetable.period() < k; reached += timetable.period()) {
                begun = cycle.apply(begun);
            }
            List<CycleCourse> courses = k == reached ? List.of()
                    : CycleCourse.of(timetable, arithmetic, begun, reached, k - reached, outputs).courses();
            for (int i = 0; i < outputs.size(); i++) {
                KnownValue here = arithmetic.known(arithmetic.reading(outputs.get(i), begun));
                Reading last = k == reached ? new Reading(k, here, here) : courses.get(i).readings().get(k - reached);
                values.get(i).add(new Reading(k, last.before(), last.after()));
            }
        }
        return values;
    }
}
