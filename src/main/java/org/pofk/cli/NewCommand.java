package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.report.Document;
import org.pofk.report.TextWriter;
import org.pofk.text.Alphabet;
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
        save.check();
        if (save.file().isPresent()) {
            throw new UsageException("which pattern is to be saved? The patterns:  pofk new");
        }
        List<Document.Block> blocks = new ArrayList<>();
        Patterns.names().forEach(name -> blocks.add(new Document.Labelled(name,
                Patterns.summary(Patterns.model(name).orElseThrow()))));
        blocks.add(new Document.Paragraph("pofk new PATTERN shows one; with --save FILE it becomes a model of yours."));
        streams.answer().print(TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8).write(new Document(blocks)));
        return ExitCode.ANSWERED;
    }

    private static UsageException unknown(String name) {
        return new UsageException("there is no pattern '" + name + "'"
                + Meant.didYouMean(Patterns.names(), name) + "\nThe patterns:  pofk new");
    }
}
