package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.Simulation;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.report.CsvWriter;
import org.pofk.report.SimulationDocument;
import org.pofk.report.SimulationJson;
import org.pofk.report.SimulationTable;
import org.pofk.report.Style;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk simulate MODEL}: random runs beside the exact values. */
@Command(description = {"Runs a chain at random, the same way for the same seed, and sets what was seen,",
    "with its interval, beside the exact value of each step."})
final class SimulateCommand implements Work {
    private static final int MOST_RUNS = 100_000_000;

    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.SIMULATE, Format.JSON, Format.CSV);

    @Option(names = "--of", paramLabel = "NAME", description = "an output, a set or a state; repeatable")
    private List<String> of = new ArrayList<>();

    @Option(names = "--at", paramLabel = "STEPS", converter = StepList.Converter.class, defaultValue = "0..10,20,50",
            description = "the steps to look at; ${DEFAULT-VALUE} otherwise")
    private StepList at;

    @Option(names = "--runs", paramLabel = "N", defaultValue = "10000",
            description = "how often the chain is run; ${DEFAULT-VALUE} otherwise")
    private int runs;

    @Option(names = "--seed", paramLabel = "N", defaultValue = "1",
            description = "what the random numbers begin from; ${DEFAULT-VALUE} otherwise")
    private long seed;

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        if (runs < 1 || runs > MOST_RUNS) {
            throw new UsageException("--runs " + runs + " is not possible; 1 to " + MOST_RUNS + " are");
        }
        Model read = options.modelWithSchedule();
        if (read.chain().kind() == Chain.Kind.RECURSION) {
            throw new UsageException("'" + read.origin().file() + "' is a recursion: only a chain, whose entries are"
                    + " probabilities, can be run at random; pofk derive takes it");
        }
        List<Output> outputs = AskedOutputs.of(read.chain(), of);
        Worker.Outcome<Simulation> outcome = options.within(streams, published ->
                published.accept(read.schedule().map(schedule -> Simulation.of(read.chain(),
                        Timetable.of(read.chain(), schedule), outputs, at.steps(), runs, seed))
                        .orElseGet(() -> Simulation.of(read.chain(), outputs, at.steps(), runs, seed))));
        if (outcome.published().isEmpty()) {
            streams.notes().println("pofk: the runs didn't end within the budget; fewer will, with --runs");
            return ExitCode.NOT_DECIDED;
        }
        Simulation simulation = outcome.published().get();
        destination.write(Answer.of(() -> SimulationDocument.of(read, simulation, style))
                .with(Format.JSON, () -> SimulationJson.write(read, simulation, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(SimulationTable.of(read, simulation, style.digits()))),
                streams);
        return ExitCode.ANSWERED;
    }
}
