package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.CsvWriter;
import org.pofk.report.GivenProse;
import org.pofk.report.ScheduledConditionalDocument;
import org.pofk.report.ScheduledConditionalJson;
import org.pofk.report.ScheduledConditionalTable;
import org.pofk.report.ScheduledDocument;
import org.pofk.report.ScheduledJson;
import org.pofk.report.ScheduledNotebook;
import org.pofk.report.ScheduledTable;
import org.pofk.report.Style;
import org.pofk.schedule.ConditionalSchedule;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.Scheduling;
import org.pofk.text.RefusedException;

/**
 * What {@code derive} does with a model that has inspections or phases.
 *
 * @param at steps, ascending
 */
record ScheduledDerivation(AnswerOptions options, List<Output> outputs, List<Integer> at, Scheduling.Formulas formulas,
        Destination destination, Streams streams) {

    /** @param known what the model is seen from, where it isn't its own start */
    ExitCode of(Model read, Optional<Known> known) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Worker.Outcome<ScheduledModel> outcome = options.within(streams, published ->
                Scheduling.of(read, outputs, at, formulas, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ScheduledModel found = outcome.published().get();
        destination.write(Answer.of(() -> GivenProse.in(ScheduledDocument.of(found, style), known, style))
                .with(Format.JSON, () -> ScheduledJson.write(found, known, style.digits()))
                .with(Format.NOTEBOOK, () -> ScheduledNotebook.write(found, style))
                .with(Format.CSV, () -> CsvWriter.write(ScheduledTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    /** The same given what is known at each step. */
    ExitCode given(Model read, Given given) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Worker.Outcome<ConditionalSchedule> outcome = options.within(streams, published -> published.accept(
                ConditionalSchedule.of(read, given, outputs, at, formulas)));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ConditionalSchedule found = outcome.published().get();
        destination.write(Answer.of(() -> ScheduledConditionalDocument.of(found, style))
                .with(Format.JSON, () -> ScheduledConditionalJson.write(found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(ScheduledConditionalTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
