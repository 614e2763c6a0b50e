package org.pofk.cli;

import java.util.List;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.report.Style;
import org.pofk.report.TotalDocument;
import org.pofk.report.TotalJson;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** {@code pofk total MODEL}: what is spent in states, entered and paid over steps. */
@Command(description = {"Adds up over the steps 0 … k what is expected: steps spent in a state or a set,",
    "entries into it, costs. Formulas that hold for every k, and how they grow."})
final class TotalCommand implements Work {
    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.TOTAL, Format.JSON);

    @Mixin
    private TotalOptions total = new TotalOptions();

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        Model read = options.model();
        List<TotalModel.Asked> asked = total.asked(read);
        Worker.Outcome<TotalModel> outcome = options.within(streams, published ->
                TotalModel.of(read, asked, total.steps(), published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        TotalModel found = outcome.published().get();
        destination.write(Answer.of(() -> TotalDocument.of(found, style))
                .with(Format.JSON, () -> TotalJson.write(found, style.digits())), streams);
        return found.isComplete() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
