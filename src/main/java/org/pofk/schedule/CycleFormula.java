package org.pofk.schedule;

import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.schedule.CycleCourse.Side;

/**
 * A sequence over the cycles of a schedule as a formula in m = 0, 1, …: an output at step P + m T + j, or its mean over
 * cycle m. Exact, proved for every m as any formula of the matrix S of a whole cycle.
 *
 * @param place empty for the mean
 * @param chain the one that moves once a cycle, by S from x(P), whose output it is
 */
public record CycleFormula(Optional<Place> place, Chain chain, ClosedForm closedForm, LongRun longRun) {

    /** Where in a cycle. */
    public record Place(int j, Side side) {
    }
}
