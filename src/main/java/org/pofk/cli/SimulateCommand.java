package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.Simulation;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.SimulationDocument;
import org.pofk.report.SimulationJson;
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
    private ModelOptions model;

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
        if (runs < 1 || runs > MOST_RUNS) {
            throw new UsageException("--runs " + runs + " is not possible; 1 to " + MOST_RUNS + " are");
        }
        Model read = model.read();
        if (read.chain().kind() == Chain.Kind.RECURSION) {
            throw new UsageException("'" + read.origin().file() + "' is a recursion: only a chain, whose entries are"
                    + " probabilities, can be run at random; pofk derive takes it");
        }
        List<Output> outputs = AskedOutputs.of(read.chain(), of);
        Worker.Outcome<Simulation> outcome = Worker.within(budget.limit(streams), streams.notes(), published ->
                published.accept(Simulation.of(read.chain(), outputs, at.steps(), runs, seed)));
        if (outcome.published().isEmpty()) {
            streams.notes().println("pofk: the runs didn't end within the budget; fewer will, with --runs");
            return ExitCode.NOT_DECIDED;
        }
        Simulation simulation = outcome.published().get();
        writing.save().write(format == Format.JSON
                ? SimulationJson.write(read, simulation, style.digits())
                : writing.written(SimulationDocument.of(read, simulation, style), format), streams);
        return ExitCode.ANSWERED;
    }
}
