package org.pofk.cli;

import java.util.Optional;
import org.pofk.text.Suggestion;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** {@code pofk new}: lists the patterns; {@code pofk new PATTERN}: shows or saves one as a model to start from. */
@Command(description = {"Starts a model from a pattern of the trade.",
    "Without a name it lists the patterns; all of them are invented."})
final class NewCommand implements Work {
    @Parameters(arity = "0..1", paramLabel = "PATTERN", description = "the pattern to start from")
    private Optional<String> pattern = Optional.empty();

    @Mixin
    private SaveOptions save;

    @Mixin
    private CommonOptions common;

    @Override
    public ExitCode run(Streams streams) throws UsageException, WritingException {
        if (pattern.isEmpty()) {
            return list(streams);
        }
        String name = pattern.get();
        String model = Patterns.model(name).orElseThrow(() -> unknown(name));
        save.write(model, streams);
        if (save.file().isPresent()) {
            streams.notes().println("next:  pofk derive " + save.file().get());
        }
        return ExitCode.ANSWERED;
    }

    private ExitCode list(Streams streams) throws UsageException {
        if (save.file().isPresent()) {
            throw new UsageException("which pattern is to be saved? The patterns:  pofk new");
        }
        int width = Patterns.names().stream().mapToInt(String::length).max().orElse(0);
        for (String name : Patterns.names()) {
            String summary = Patterns.summary(Patterns.model(name).orElseThrow());
            streams.answer().println(String.format("%-" + width + "s  %s", name, summary).stripTrailing());
        }
        streams.answer().println("\npofk new PATTERN shows one; with --save FILE it becomes a model of yours.");
        return ExitCode.ANSWERED;
    }

    private static UsageException unknown(String name) {
        return new UsageException("there is no pattern '" + name + "'"
                + Suggestion.didYouMean(Patterns.names(), name) + "\nThe patterns:  pofk new");
    }
}
