package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.Simulation;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.report.Chart;
import org.pofk.report.CsvWriter;
import org.pofk.report.Provenance;
import org.pofk.report.Report;
import org.pofk.report.ScheduledCourse;
import org.pofk.report.ScheduledNotebook;
import org.pofk.report.ScheduledReport;
import org.pofk.report.ScheduledReportDocument;
import org.pofk.report.ScheduledTable;
import org.pofk.report.Style;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.Scheduling;
import org.pofk.text.RefusedException;

/** What {@code report} does with a model that has inspections or phases. */
final class ScheduledReporting {
    private static final int RUNS = 10_000;
    private static final int SEED = 1;
    /** Runs times steps that take a second or two. */
    private static final int LAST_SIMULATED = 1000;

    private ScheduledReporting() {
    }

    static ExitCode write(AnswerOptions options, Model read, List<Output> outputs, List<Integer> listed,
            Report.Depth depth, Provenance provenance, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        List<Integer> drawn = ScheduledCourse.steps(Timetable.of(read.chain(), read.schedule().orElseThrow()));
        Worker.Outcome<ScheduledReport> outcome = options.within(streams, published -> {
            ScheduledModel found = Scheduling.of(read, outputs, listed, Scheduling.Formulas.WITHIN_REACH, partly ->
                    published.accept(new ScheduledReport(partly, Optional.empty(), Optional.empty(), provenance)));
            Optional<Chart.Course> course = ScheduledCourse.of(Scheduling.of(read, outputs, drawn,
                    Scheduling.Formulas.WITHIN_REACH, partly -> { }), drawn);
            published.accept(new ScheduledReport(found, course, depth == Report.Depth.FULL
                    ? simulated(found, outputs, listed) : Optional.empty(), provenance));
        });
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ScheduledReport report = outcome.published().get();
        destination.write(Answer.of(() -> ScheduledReportDocument.of(report, depth, style, options.convention(read)))
                .with(Format.NOTEBOOK, () -> ScheduledNotebook.write(report, depth, style, options.convention(read)))
                .with(Format.CSV, () -> CsvWriter.write(ScheduledTable.of(report.found(), style.digits()))), streams);
        return report.found().isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    /** Only a chain, whose entries are probabilities, can be run at random. */
    private static Optional<Simulation> simulated(ScheduledModel found, List<Output> outputs, List<Integer> listed) {
        List<Integer> steps = listed.stream().filter(k -> k <= LAST_SIMULATED).toList();
        Chain chain = found.model().chain();
        return chain.kind() == Chain.Kind.RECURSION || steps.isEmpty() ? Optional.empty()
                : Optional.of(Simulation.of(chain, found.timetable(), outputs, steps, RUNS, SEED));
    }
}
