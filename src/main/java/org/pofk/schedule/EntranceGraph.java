package org.pofk.schedule;

import java.util.BitSet;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.FirstEntrance;
import org.pofk.chain.Reach;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.schedule.ScheduledWait.Ever;

/**
 * Whether a set is entered at all under a schedule, by the moves there are: certainly where no state is reached from
 * which it can't be. Exact.
 *
 * @param open states at the beginning of a cycle, outside the set and those to be avoided, from which it can be reached
 * @param sure states at the beginning of a cycle from which it is entered with certainty
 */
record EntranceGraph(StoppedSchedule stopped, List<Integer> open, BitSet sure) {

    static EntranceGraph of(StoppedSchedule stopped) {
        int size = stopped.chain().chain().size();
        SparseMatrix cycle = CycleGraph.matrix(stopped.chain().timetable(), size);
        List<Integer> open = FirstEntrance.open(cycle, stopped.into(), stopped.avoiding());
        List<Integer> hopeless = IntStream.range(0, size).filter(state -> !stopped.into().contains(state)
                && !open.contains(state)).boxed().toList();
        BitSet sure = new BitSet();
        sure.set(0, size);
        Reach.into(cycle, hopeless).forEach(sure::clear);
        return new EntranceGraph(stopped, open, sure);
    }

    /** From these states at the end of step 0. */
    Ever from(BitSet states) {
        Timetable timetable = stopped.chain().timetable();
        return atCycle(CycleGraph.through(timetable, timetable.preamble(), states));
    }

    /** From these states at the end of step 1. */
    Ever afterOneStep(BitSet states) {
        Timetable timetable = stopped.chain().timetable();
        List<Timetable.Moment> first = timetable.before() > 0 ? timetable.preamble() : timetable.cycle();
        return atCycle(CycleGraph.through(timetable, first.subList(1, first.size()), states));
    }

    private Ever atCycle(BitSet states) {
        boolean isSure = states.stream().allMatch(sure::get);
        boolean isHopeful = states.stream().anyMatch(state -> open.contains(state) || stopped.into().contains(state));
        return isSure ? Ever.CERTAIN : isHopeful ? Ever.PERHAPS : Ever.NEVER;
    }
}
