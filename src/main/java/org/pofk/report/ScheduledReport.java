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
 * @param since      the same of an earlier model, where what has changed is to be said
 */
public record ScheduledReport(ScheduledModel found, Optional<Chart.Course> course, List<ReportSection> answers,
        Optional<Simulation> simulation, Provenance provenance, Optional<ScheduledReport> since) {
    public ScheduledReport {
        answers = List.copyOf(answers);
    }

    /** Compared with nothing earlier. */
    public ScheduledReport(ScheduledModel found, Optional<Chart.Course> course, List<ReportSection> answers,
            Optional<Simulation> simulation, Provenance provenance) {
        this(found, course, answers, simulation, provenance, Optional.empty());
    }

    /** Compared with an earlier one. */
    public ScheduledReport since(ScheduledReport earlier) {
        return new ScheduledReport(found, course, answers, simulation, provenance, Optional.of(earlier));
    }

    /** The same, as if its model had been read from another's file, and it had been made as the other was. */
    ScheduledReport asMadeLike(ScheduledReport other) {
        return new ScheduledReport(new ScheduledModel(found.model().readFrom(other.found.model().origin()),
                found.timetable(), found.outputs(), found.formulasLeftOut()), course, answers, simulation,
                        other.provenance);
    }
}
