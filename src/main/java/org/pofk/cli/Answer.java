package org.pofk.cli;

import java.util.EnumMap;
import java.util.Map;
import java.util.function.Supplier;
import org.pofk.report.Document;
import org.pofk.text.RefusedException;

/** An answer in every form its command can write; each is made only when it is asked for. */
final class Answer {
    private final Supplier<Document> document;
    private final Map<Format, Form> forms = new EnumMap<>(Format.class);

    /** One way to write an answer down. */
    interface Form {
        String text() throws RefusedException;
    }

    private Answer(Supplier<Document> document) {
        this.document = document;
    }

    /** An answer that is shown as a document: as text, LaTeX or a web page. */
    static Answer of(Supplier<Document> document) {
        return new Answer(document);
    }

    /** The same answer, which may be written in this format too. */
    Answer with(Format format, Form form) {
        Answer more = new Answer(document);
        more.forms.putAll(forms);
        more.forms.put(format, form);
        return more;
    }

    /** As text in a format, a document's in the form asked for; what becomes a PDF as LaTeX. */
    String written(Format format, DocumentForms documents) throws RefusedException {
        return switch (format) {
            case TEXT -> documents.text(document.get());
            case HTML -> documents.html(document.get());
            case LATEX -> documents.latex(document.get());
            case PDF -> documents.article(document.get());
            case JSON, CSV, NOTEBOOK -> form(format).text();
        };
    }

    Document document() {
        return document.get();
    }

    private Form form(Format format) {
        if (!forms.containsKey(format)) {
            throw new AssertionError("an answer was offered as " + format + " and can't be written so");
        }
        return forms.get(format);
    }
}
