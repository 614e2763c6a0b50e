package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;
import org.pofk.report.Document;
import org.pofk.report.HtmlWriter;
import org.pofk.report.LatexWriter;
import org.pofk.report.TextWriter;
import org.pofk.text.Alphabet;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** How and where the answer is written. */
final class WritingOptions {
    @Option(names = "--as", paramLabel = "FORMAT",
            description = "${COMPLETION-CANDIDATES}; otherwise from the name of the file, or text")
    private Optional<Format> as = Optional.empty();

    @Option(names = "--plain", description = "text in ASCII characters only")
    private boolean plain;

    @Option(names = "--fragment", description = "LaTeX to be put into a document of yours by \\input, not a whole one")
    private boolean fragment;

    @Mixin
    private SaveOptions save = new SaveOptions();

    /** The format asked for where a notebook is none. */
    Format formatOfDocument() throws UsageException {
        Format format = format();
        if (format == Format.NOTEBOOK) {
            throw new UsageException("a notebook is written by derive alone");
        }
        return format;
    }

    /** The format asked for; a file's name and {@code --as} may not contradict each other. */
    Format format() throws UsageException {
        Optional<Path> file = save.file();
        Optional<Format> named = file.flatMap(Format::of);
        if (file.isPresent() && named.isEmpty() && as.isEmpty()) {
            throw new UsageException("what is '" + file.get() + "' to hold? Name it with an ending of "
                    + String.join(", ", Format.endings()) + ", or say with --as");
        }
        if (as.isPresent() && named.isPresent() && as.get() != named.get()) {
            throw new UsageException("--as " + as.get() + " and the name '" + file.orElseThrow()
                    + "' ask for two different formats");
        }
        Format format = as.or(() -> named).orElse(Format.TEXT);
        if (fragment && format != Format.LATEX) {
            throw new UsageException("--fragment is a part of a LaTeX document; there is no --as latex");
        }
        return format;
    }

    /** A document in a format that shows one. */
    String written(Document document, Format format) throws RefusedException {
        return switch (format) {
            case TEXT -> (plain ? TextWriter.of(Alphabet.ASCII, StandardCharsets.UTF_8)
                    : TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8)).write(document);
            case HTML -> HtmlWriter.write(document);
            case LATEX -> fragment ? LatexWriter.fragment(document) : LatexWriter.article(document);
            case JSON, NOTEBOOK -> throw new AssertionError(format + " is written from results, not from a document");
        };
    }

    SaveOptions save() {
        return save;
    }
}
