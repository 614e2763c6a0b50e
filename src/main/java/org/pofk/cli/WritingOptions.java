package org.pofk.cli;

import java.nio.file.Path;
import java.util.Optional;
import picocli.CommandLine.Option;

/** How and where the answer is written. */
final class WritingOptions {
    @Option(names = "--as", paramLabel = "FORMAT",
            description = "${COMPLETION-CANDIDATES}; otherwise from the name of the file, or text")
    private Optional<Format> as = Optional.empty();

    @Option(names = "--plain", description = "text in ASCII characters only")
    private boolean plain;

    @picocli.CommandLine.Mixin
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

    boolean plain() {
        return plain;
    }

    SaveOptions save() {
        return save;
    }
}
