package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.pofk.answer.Simulation;
import org.pofk.chain.Chain;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Output;
import org.pofk.report.Chart;
import org.pofk.report.CsvWriter;
import org.pofk.report.Provenance;
import org.pofk.report.Report;
import org.pofk.report.ReportSection;
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

    static ExitCode write(AnswerOptions options, AskedReport asked, Optional<AskedReport> earlier, Report.Depth depth,
            Provenance provenance, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Convention convention = options.convention(asked.model());
        Worker.Outcome<ScheduledReport> outcome = options.within(streams, published -> {
            ScheduledReport report = find(asked, depth, provenance, published);
            earlier.ifPresent(each -> find(each, depth, provenance, found -> published.accept(report.since(found))));
        });
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ScheduledReport report = outcome.published().get();
        if (earlier.isPresent() && report.since().isEmpty()) {
            streams.notes().println(ReportCommand.CHANGES_NOT_REACHED);
        }
        destination.write(Answer.of(() -> ScheduledReportDocument.of(report, depth, style, convention))
                .with(Format.NOTEBOOK, () -> ScheduledNotebook.write(report, depth, style, convention))
                .with(Format.CSV, () -> CsvWriter.write(ScheduledTable.of(report.found(), style.digits()))), streams);
        return ReportCommand.code(report.answers(), outcome.finished() && report.found().isDecided());
    }

    /** Finds what the report says, and publishes all that is found by then, again and again. */
    static ScheduledReport find(AskedReport asked, Report.Depth depth, Provenance provenance,
            Consumer<ScheduledReport> published) {
        List<ReportSection> none = asked.notReached();
        ScheduledModel found = Scheduling.of(asked.model(), asked.outputs(), asked.at(),
                Scheduling.Formulas.WITHIN_REACH, partly -> published.accept(new ScheduledReport(partly,
                        Optional.empty(), none, Optional.empty(), provenance)));
        List<Integer> drawn = ScheduledCourse.steps(found.timetable());
        Optional<Chart.Course> course = ScheduledCourse.of(Scheduling.of(asked.model(), asked.outputs(), drawn,
                Scheduling.Formulas.WITHIN_REACH, partly -> { }), drawn);
        List<ReportSection> answers = asked.answered(partly ->
                published.accept(new ScheduledReport(found, course, partly, Optional.empty(), provenance)));
        ScheduledReport report = new ScheduledReport(found, course, answers, depth == Report.Depth.FULL
                ? simulated(found, asked.outputs(), asked.at()) : Optional.empty(), provenance);
        published.accept(report);
        return report;
    }

    /** Only a chain, whose entries are probabilities, can be run at random. */
    private static Optional<Simulation> simulated(ScheduledModel found, List<Output> outputs, List<Integer> listed) {
        List<Integer> steps = listed.stream().filter(k -> k <= LAST_SIMULATED).toList();
        Chain chain = found.model().chain();
        return chain.kind() == Chain.Kind.RECURSION || steps.isEmpty() ? Optional.empty()
                : Optional.of(Simulation.of(chain, found.timetable(), outputs, steps, RUNS, SEED));
    }
}
