package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.Simulation;
import org.pofk.schedule.ScheduledModel;

/**
 * What a report on a model with a schedule is written of, as far as it is found.
 *
 * @param found      with the values that are listed
 * @param course     its outputs over a few cycles, where they can be drawn
 * @param answers    in the order of the report
 * @param simulation random runs beside it, where it is compared with some
 */
public record ScheduledReport(ScheduledModel found, Optional<Chart.Course> course, List<ReportSection> answers,
        Optional<Simulation> simulation, Provenance provenance) {
    public ScheduledReport {
        answers = List.copyOf(answers);
    }
}
