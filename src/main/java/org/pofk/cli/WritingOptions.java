package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;
import org.pofk.report.Document;
import org.pofk.report.TextWriter;
import org.pofk.text.Alphabet;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** How and where the answer is written. */
final class WritingOptions {
    @Option(names = "--as", paramLabel = "FORMAT",
            description = "${COMPLETION-CANDIDATES}; otherwise from the name of the file, or text")
    private Optional<Format> as = Optional.empty();

    @Option(names = "--plain", description = "text in ASCII characters only")
    private boolean plain;

    @Mixin
    private SaveOptions save = new SaveOptions();

    /** The format asked for; a file's name and {@code --as} may not contradict each other. */
    Format format() throws UsageException {
        Optional<Path> file = save.file();
        Optional<Format> named = file.flatMap(Format::of);
        if (file.isPresent() && named.isEmpty() && as.isEmpty()) {
            throw new UsageException("what is '" + file.get() + "' to hold? Name it with an ending of "
                    + String.join(", ", Format.endings()) + ", or say --as text or --as json");
        }
        if (as.isPresent() && named.isPresent() && as.get() != named.get()) {
            throw new UsageException("--as " + as.get() + " and the name '" + file.orElseThrow()
                    + "' ask for two different formats");
        }
        return as.or(() -> named).orElse(Format.TEXT);
    }

    /** A document as text for eighty columns. */
    String text(Document document) {
        return (plain ? TextWriter.of(Alphabet.ASCII, StandardCharsets.UTF_8)
                : TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8)).write(document);
    }

    SaveOptions save() {
        return save;
    }
}
