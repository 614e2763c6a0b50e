package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.report.Chart;
import org.pofk.report.ScheduledCourse;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.Scheduling;

/** What {@code draw} does with a model that has inspections or phases. */
final class ScheduledDrawing {
    private ScheduledDrawing() {
    }

    /** Its outputs over steps; empty where they were not found within the budget. */
    static Optional<Chart> course(RunOptions run, Model read, List<Output> outputs, Optional<StepList> at,
            Streams streams) throws UsageException {
        List<Integer> steps = at.map(StepList::steps).orElseGet(() ->
                ScheduledCourse.steps(Timetable.of(read.chain(), read.schedule().orElseThrow())));
        Worker.Outcome<ScheduledModel> outcome = run.within(streams, published ->
                Scheduling.of(read, outputs, steps, Scheduling.Formulas.WITHIN_REACH, published));
        return outcome.published().flatMap(found -> ScheduledCourse.of(found, steps));
    }

    static UsageException withoutPoles(Model read) {
        return new UsageException("'" + read.origin().file() + "' has a schedule: its outputs have no poles in k;\n"
                + "pofk derive MODEL  gives the formulas over the cycles,  --what course  draws the outputs");
    }
}
