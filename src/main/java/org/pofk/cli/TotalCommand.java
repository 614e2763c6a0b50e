package org.pofk.cli;

import java.util.List;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.report.CsvWriter;
import org.pofk.report.NotebookWriter;
import org.pofk.report.Style;
import org.pofk.report.TotalDocument;
import org.pofk.report.TotalJson;
import org.pofk.report.TotalTable;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** {@code pofk total MODEL}: what is spent in states, entered and paid over steps. */
@Command(description = {"Adds up over the steps 0 … k what is expected: steps spent in a state or a set,",
    "entries into it, costs. Formulas that hold for every k, and how they grow."})
final class TotalCommand implements Work {
    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.TOTAL, Format.JSON, Format.CSV, Format.NOTEBOOK);

    @Mixin
    private TotalOptions total = new TotalOptions();

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        Model read = options.modelWithSchedule();
        if (read.schedule().isPresent()) {
            return ScheduledAnswers.total(options, read, total.ofAnyMatrix(read), destination.steps(total.to()),
                    destination, streams);
        }
        List<TotalModel.Asked> asked = total.asked(read);
        List<Integer> steps = destination.steps(total.to());
        Worker.Outcome<TotalModel> outcome = options.within(streams, partly ->
                partly.totals().size() + " of " + asked.size() + " totals found", published ->
                TotalModel.of(read, asked, steps, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        TotalModel found = outcome.published().get();
        destination.write(Answer.of(() -> TotalDocument.of(found, style))
                .with(Format.JSON, () -> TotalJson.write(found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(TotalTable.of(found, style.digits())))
                .with(Format.NOTEBOOK, () -> NotebookWriter.write(found, style, options.convention(read))), streams);
        return found.isComplete() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
