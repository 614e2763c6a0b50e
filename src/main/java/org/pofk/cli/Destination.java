package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import org.pofk.report.HtmlWriter;
import org.pofk.report.LatexWriter;
import org.pofk.report.TextWriter;
import org.pofk.text.Alphabet;
import org.pofk.text.RefusedException;

/** As what an answer is written, and where to. */
final class Destination {
    private final Format format;
    private final Alphabet alphabet;
    private final LatexPart latex;
    private final SaveOptions save;

    /** How much of a LaTeX document is written. */
    enum LatexPart { ARTICLE, FRAGMENT }

    Destination(Format format, Alphabet alphabet, LatexPart latex, SaveOptions save) {
        this.format = format;
        this.alphabet = alphabet;
        this.latex = latex;
        this.save = save;
    }

    /** Whether the answer is to be written in this format. */
    boolean takes(Format asked) {
        return format == asked;
    }

    void write(Answer answer, Streams streams) throws RefusedException, UsageException, WritingException {
        save.write(written(answer), streams);
    }

    private String written(Answer answer) throws RefusedException {
        return switch (format) {
            case TEXT -> TextWriter.of(alphabet, StandardCharsets.UTF_8).write(answer.document());
            case HTML -> HtmlWriter.write(answer.document());
            case LATEX -> latex == LatexPart.FRAGMENT ? LatexWriter.fragment(answer.document())
                    : LatexWriter.article(answer.document());
            case JSON, NOTEBOOK -> answer.written(format);
        };
    }
}
