package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk derive MODEL}: the formulas, here and now. */
@Command(description = "Derives formulas p(k) that hold for every k, with their proof and the long run.")
final class DeriveCommand implements Work {
    @Mixin
    private ModelOptions model;

    @Option(names = "--of", paramLabel = "NAME",
            description = "an output, a set or a state; repeatable; 'all' for every state")
    private List<String> of = List.of();

    @Option(names = "--at", paramLabel = "STEPS", converter = StepList.Converter.class,
            description = "also gives the values at these steps, like 0..20,100")
    private Optional<StepList> at = Optional.empty();

    @Option(names = "--show", paramLabel = "PART", defaultValue = "result",
            description = "result, derivation or all; ${DEFAULT-VALUE} otherwise")
    private Part show;

    @Option(names = "--second-opinion", description = "asks a general algebra system whether it agrees")
    private boolean secondOpinion;

    @Mixin
    private ShowingOptions showing;

    @Mixin
    private WritingOptions writing;

    @Mixin
    private BudgetOptions budget;

    @Mixin
    private CommonOptions common;

    /** How much is shown. */
    enum Part {
        RESULT, DERIVATION, ALL;

        @Override
        public String toString() {
            return Words.lowerCase(this);
        }
    }

    @Override
    public ExitCode run(Streams streams) {
        return ExitCode.ANSWERED;
    }
}
