package org.pofk.schedule;

import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.Increment;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/**
 * How many steps k ≥ 0 of a scheduled chain are expected to end in a set, after what is done there: v = Mᵀ (v + one in
 * the set) before a step that does M, and over a whole cycle a system with I − Sᵀ on the states that are left for ever.
 * Exact, or certified where its number says so.
 *
 * @param steps empty where they are infinitely many, because a class that is never left has steps there
 */
public record ScheduledVisits(Optional<KnownValue> steps) {

    /** Empty where bounds tell nothing: it takes too many cycles. */
    static <W> Optional<ScheduledVisits> of(ScheduledChain chain, List<Rational> set,
            BackwardArithmetic<W> arithmetic) {
        Timetable timetable = chain.timetable();
        List<Rational> start = chain.chain().start();
        Structure structure = CycleGraph.of(timetable, start);
        boolean isEndless = structure.closedClasses().stream().filter(CommunicatingClass::reached)
                .anyMatch(each -> isVisited(timetable, each.states(), CycleGraph.support(set)));
        if (isEndless) {
            return Optional.of(new ScheduledVisits(Optional.empty()));
        }
        List<Integer> left = structure.transientClasses().stream().filter(CommunicatingClass::reached)
                .flatMap(each -> each.states().stream()).sorted().toList();
        W inside = arithmetic.weights(set);
        W once = counted(arithmetic, timetable.cycle(), inside, arithmetic.weights(Increment.zeros(set.size())));
        return arithmetic.solved(left, once).map(atCycles -> arithmetic.sum(inside,
                counted(arithmetic, timetable.preamble(), inside, atCycles))).map(visits ->
                new ScheduledVisits(Optional.of(arithmetic.expected(start, visits))));
    }

    private static <W> W counted(BackwardArithmetic<W> arithmetic, List<Moment> moments, W inside, W end) {
        W visits = end;
        for (int i = moments.size() - 1; i >= 0; i--) {
            visits = arithmetic.before(moments.get(i), arithmetic.sum(visits, inside));
        }
        return visits;
    }

    /** Whether some step of a cycle begun in these states ends in the set. */
    private static boolean isVisited(Timetable timetable, List<Integer> states, BitSet set) {
        BitSet now = new BitSet();
        states.forEach(now::set);
        for (Moment moment : timetable.cycle()) {
            now = CycleGraph.through(timetable, List.of(moment), now);
            if (now.intersects(set)) {
                return true;
            }
        }
        return false;
    }
}
