package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.InspectedModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.Style;
import org.pofk.report.StructureDocument;
import org.pofk.report.StructureJson;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk inspect MODEL}: structure and long run, before any formula. */
@Command(description = {"Shows the structure of a model: classes, periods, what is never reached, absorbing states;",
    "the long run in three ways, with warnings where a habit misleads; what a reviewer would ask."})
final class InspectCommand implements Work {
    @Mixin
    private ModelOptions model;

    @Option(names = "--of", paramLabel = "NAME",
            description = "an output, a set or a state whose long run is wanted; repeatable")
    private List<String> of = new ArrayList<>();

    @Mixin
    private ShowingOptions showing;

    @Mixin
    private WritingOptions writing;

    @Mixin
    private BudgetOptions budget;

    @Mixin
    private CommonOptions common;

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = showing.style();
        Format format = writing.formatOfDocument();
        writing.save().check();
        Model read = model.read();
        List<Output> outputs = of.isEmpty() ? read.chain().outputs() : AskedOutputs.of(read.chain(), of);
        Worker.Outcome<InspectedModel> outcome = Worker.within(budget.limit(streams), streams.notes(), published -> {
            published.accept(InspectedModel.of(read, List.of()));
            published.accept(InspectedModel.of(read, outputs));
        });
        if (outcome.published().isEmpty()) {
            streams.notes().println("pofk: nothing was decided within the budget");
            return ExitCode.NOT_DECIDED;
        }
        InspectedModel inspected = outcome.published().get();
        writing.save().write(format == Format.JSON
                ? StructureJson.write(CommandName.INSPECT.word(), inspected, style.digits())
                : writing.written(StructureDocument.of(inspected, style), format), streams);
        return outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
