package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import org.pofk.report.Document;
import org.pofk.report.HtmlWriter;
import org.pofk.report.LatexLayout;
import org.pofk.report.LatexWriter;
import org.pofk.report.TextWriter;
import org.pofk.text.Alphabet;
import org.pofk.text.RefusedException;

/** How a document is written as text and as LaTeX, where there is more than one way. */
record DocumentForms(Alphabet alphabet, LatexPart part, LatexLayout layout) {

    /** How much of a LaTeX document is written. */
    enum LatexPart { ARTICLE, FRAGMENT }

    String text(Document document) {
        return TextWriter.of(alphabet, StandardCharsets.UTF_8).write(document);
    }

    String html(Document document) {
        return HtmlWriter.write(document);
    }

    String latex(Document document) throws RefusedException {
        return part == LatexPart.FRAGMENT ? LatexWriter.fragment(document, layout)
                : LatexWriter.article(document, layout);
    }

    /** To be made a PDF: with its figures inside. */
    String article(Document document) throws RefusedException {
        return LatexWriter.article(document, new LatexLayout(layout.name(), LatexLayout.Figures.INSIDE));
    }
}
