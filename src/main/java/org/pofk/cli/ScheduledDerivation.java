package org.pofk.cli;

import java.util.List;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.CsvWriter;
import org.pofk.report.ScheduledDocument;
import org.pofk.report.ScheduledJson;
import org.pofk.report.ScheduledNotebook;
import org.pofk.report.ScheduledTable;
import org.pofk.report.Style;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.Scheduling;
import org.pofk.text.RefusedException;

/** What {@code derive} does with a model that has inspections or phases. */
final class ScheduledDerivation {
    private ScheduledDerivation() {
    }

    static ExitCode write(AnswerOptions options, Model read, List<Output> outputs, List<Integer> at,
            Scheduling.Formulas formulas, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Worker.Outcome<ScheduledModel> outcome = options.within(streams, published ->
                Scheduling.of(read, outputs, at, formulas, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ScheduledModel found = outcome.published().get();
        destination.write(Answer.of(() -> ScheduledDocument.of(found, style))
                .with(Format.JSON, () -> ScheduledJson.write(found, style.digits()))
                .with(Format.NOTEBOOK, () -> ScheduledNotebook.write(found, style))
                .with(Format.CSV, () -> CsvWriter.write(ScheduledTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
