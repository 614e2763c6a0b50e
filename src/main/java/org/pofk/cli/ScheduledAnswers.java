package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import org.pofk.answer.ConditionalWhen;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.ConditionalWhenDocument;
import org.pofk.report.CsvWriter;
import org.pofk.report.GivenProse;
import org.pofk.report.PassageTable;
import org.pofk.report.ScheduledPassageDocument;
import org.pofk.report.ScheduledPassageJson;
import org.pofk.report.ScheduledPassageNotebook;
import org.pofk.report.ScheduledTotalDocument;
import org.pofk.report.ScheduledTotalJson;
import org.pofk.report.ScheduledTotalNotebook;
import org.pofk.report.ScheduledWhenDocument;
import org.pofk.report.Style;
import org.pofk.report.TotalTable;
import org.pofk.report.WhenJson;
import org.pofk.report.WhenTable;
import org.pofk.schedule.ScheduledConditionalWhen;
import org.pofk.schedule.ScheduledPassage;
import org.pofk.schedule.ScheduledTotal;
import org.pofk.schedule.ScheduledTotalModel;
import org.pofk.schedule.ScheduledWhen;
import org.pofk.schedule.ScheduledWhen.Sides;
import org.pofk.text.RefusedException;

/** What commands about totals, passages and conditions answer about a model that has inspections or phases. */
final class ScheduledAnswers {
    private ScheduledAnswers() {
    }

    static ExitCode total(AnswerOptions options, Model read, List<ScheduledTotal.Asked> asked, List<Integer> steps,
            Destination destination, Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Worker.Outcome<ScheduledTotalModel> outcome = options.within(streams, partly ->
                partly.totals().size() + " of " + asked.size() + " totals found", published ->
                ScheduledTotalModel.of(read, asked, steps, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ScheduledTotalModel found = outcome.published().get();
        destination.write(Answer.of(() -> ScheduledTotalDocument.of(found, style))
                .with(Format.JSON, () -> ScheduledTotalJson.write(found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(TotalTable.of(found, style.digits())))
                .with(Format.NOTEBOOK, () -> ScheduledTotalNotebook.write(found, style)), streams);
        return found.isDecided() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    /** @param known what the model is seen from, where it isn't its own start */
    static ExitCode passage(AnswerOptions options, Model started, Optional<Known> known,
            Function<Consumer<ScheduledPassage>, ScheduledPassage> work, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Worker.Outcome<ScheduledPassage> outcome = options.within(streams, work::apply);
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ScheduledPassage found = outcome.published().get();
        destination.write(Answer.of(() ->
                        GivenProse.in(ScheduledPassageDocument.of(started, found, style), known, style))
                .with(Format.JSON, () -> ScheduledPassageJson.write(started, known, found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(PassageTable.of(started, found, style.digits())))
                .with(Format.NOTEBOOK, () -> ScheduledPassageNotebook.write(started, found, style)), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    /** @param known what the model is seen from, where it isn't its own start */
    static ExitCode when(AnswerOptions options, Model read, Optional<Known> known, List<Output> outputs,
            WhenModel.Asked asked, Sides sides, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Worker.Outcome<ScheduledWhen> outcome = options.within(streams, partly ->
                partly.answers().size() + " of " + outputs.size() + " outputs answered", published ->
                ScheduledWhen.of(read, outputs, asked, sides, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ScheduledWhen found = outcome.published().get();
        destination.write(Answer.of(() -> GivenProse.in(ScheduledWhenDocument.of(found, style), known, style))
                .with(Format.JSON, () -> WhenJson.write(found, known, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(WhenTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    /** The same given what is known at each step. */
    static ExitCode when(AnswerOptions options, Model read, Given given, List<Output> outputs, WhenModel.Asked asked,
            Destination destination, Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Worker.Outcome<ConditionalWhen> outcome = options.within(streams, published ->
                ScheduledConditionalWhen.of(read, given, outputs, asked, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ConditionalWhen found = outcome.published().get();
        destination.write(Answer.of(() -> ConditionalWhenDocument.of(found, style))
                .with(Format.JSON, () -> WhenJson.write(found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(WhenTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
