package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.util.HexFormat;
import java.util.List;
import org.pofk.text.Alphabet;

/** The first heading of a document as the title that programs show of a PDF: in UTF-16 with its mark, for any text. */
final class PdfTitle {
    private PdfTitle() {
    }

    /** For the preamble; nothing where the document begins with something else. */
    static List<String> lines(Document document) {
        return document.blocks().stream().limit(1).filter(Document.Heading.class::isInstance)
                .map(Document.Heading.class::cast).map(heading -> plain(heading.text()))
                .map(title -> "\\ifdefined\\pdfinfo\\pdfinfo{/Title <" + HexFormat.of().withUpperCase()
                        .formatHex(title.getBytes(StandardCharsets.UTF_16)) + ">}\\fi").toList();
    }

    private static String plain(Prose title) {
        return new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8).of(title).replace(Spelling.NO_BREAK, ' ');
    }
}
