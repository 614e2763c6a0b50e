package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.InspectedModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.CsvWriter;
import org.pofk.report.StructureDocument;
import org.pofk.report.StructureJson;
import org.pofk.report.StructureTable;
import org.pofk.report.Style;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk inspect MODEL}: structure and long run, before any formula. */
@Command(description = {"Shows the structure of a model: classes, periods, what is never reached, absorbing states;",
    "the long run in three ways, with warnings where a habit misleads; what a reviewer would ask."})
final class InspectCommand implements Work {
    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.INSPECT, Format.JSON, Format.CSV);

    @Option(names = "--of", paramLabel = "NAME",
            description = "an output, a set or a state whose long run is wanted; repeatable")
    private List<String> of = new ArrayList<>();

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        Model read = options.modelWithSchedule();
        List<Output> outputs = of.isEmpty() ? read.chain().outputs() : AskedOutputs.of(read.chain(), of);
        Worker.Outcome<InspectedModel> outcome = options.within(streams, published -> {
            published.accept(InspectedModel.of(read, List.of()));
            published.accept(InspectedModel.of(read, outputs));
        });
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        InspectedModel inspected = outcome.published().get();
        destination.write(Answer.of(() -> StructureDocument.of(inspected, style)).with(Format.JSON,
                () -> StructureJson.write(CommandName.INSPECT.word(), inspected, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(StructureTable.of(inspected, style.digits()))), streams);
        return outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }
}
