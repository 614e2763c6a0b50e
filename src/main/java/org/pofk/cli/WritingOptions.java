package org.pofk.cli;

import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.text.Alphabet;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** How and where the answer is written. */
final class WritingOptions {
    private final CommandName command;
    private final Set<Format> offered;

    @Option(names = "--as", paramLabel = "FORMAT",
            description = "${COMPLETION-CANDIDATES}; otherwise from the name of the file, or text")
    private Optional<Format> as = Optional.empty();

    @Option(names = "--plain", description = "text in ASCII characters only")
    private boolean plain;

    @Option(names = "--fragment", description = "LaTeX to be put into a document of yours by \\input, not a whole one")
    private boolean fragment;

    @Mixin
    private SaveOptions save = new SaveOptions();

    /** For a command that writes the formats of any document and some besides. */
    WritingOptions(CommandName command, Format... besides) {
        this.command = command;
        this.offered = EnumSet.copyOf(Format.OF_DOCUMENTS);
        this.offered.addAll(List.of(besides));
    }

    /** The formats this command writes, as they are typed. */
    List<String> offered() {
        return offered.stream().map(Format::toString).toList();
    }

    /**
     * As what and where to the answer is written, about the model or the claims in a file. Refused where that
     * contradicts itself, isn't offered, or where a file isn't to be replaced.
     */
    Destination destination(Path about) throws UsageException {
        Format format = format();
        save.check();
        return new Destination(format, plain ? Alphabet.ASCII : Alphabet.UNICODE,
                fragment ? Destination.LatexPart.FRAGMENT : Destination.LatexPart.ARTICLE, save);
    }

    /** Where a file of YAML goes, which this command writes in place of its answer. */
    SaveOptions destinationOfYaml(String what) throws UsageException {
        if (as.isPresent() || plain || fragment) {
            throw new UsageException(what + " is YAML; --as, --plain and --fragment are for the answer of "
                    + command.word());
        }
        if (save.file().flatMap(Format::of).isPresent()) {
            throw new UsageException(what + " is YAML; give '" + save.file().get() + "' an ending of .yaml");
        }
        save.check();
        return save;
    }

    private Format format() throws UsageException {
        Optional<Path> file = save.file();
        Optional<Format> named = file.flatMap(Format::of);
        if (file.isPresent() && named.isEmpty() && as.isEmpty()) {
            throw new UsageException("what is '" + file.get() + "' to hold? Name it with an ending of "
                    + String.join(", ", Format.endings(offered)) + ", or say with --as");
        }
        if (as.isPresent() && named.isPresent() && as.get() != named.get()) {
            throw new UsageException("--as " + as.get() + " and the name '" + file.orElseThrow()
                    + "' ask for two different formats");
        }
        Format format = as.or(() -> named).orElse(Format.TEXT);
        if (!offered.contains(format)) {
            throw new UsageException(command.word() + " writes no " + format + "; it writes "
                    + Words.listed(offered(), "and"));
        }
        if (fragment && format != Format.LATEX) {
            throw new UsageException("--fragment is a part of a LaTeX document; there is no --as latex");
        }
        return format;
    }
}
