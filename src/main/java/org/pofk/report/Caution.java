package org.pofk.report;

import org.pofk.chain.Model;
import org.pofk.report.Document.Paragraph;

/** What every answer about failure ends with. */
final class Caution {
    static final String TEXT = "Exact for the model as entered. Whether the model fits the plant, and what may be done"
            + " on the strength of it, is for the governing standard or local code and a competent, where required"
            + " licensed, person.";

    private static final String PROTECTIVE_FUNCTION = "Not a safety integrity claim: architecture limits, systematic failures"
            + " and common cause are judged by the governing functional-safety standard.";

    private Caution() {
    }

    /** With what is to be added about what the model says it concerns. */
    static Paragraph of(Model model) {
        return new Paragraph(TEXT + model.about().concerns().map(concern -> " " + switch (concern) {
            case PROTECTIVE_FUNCTION -> PROTECTIVE_FUNCTION;
            case STRUCTURE -> "Doesn't replace an inspection or load rating by a licensed engineer.";
        }).orElse(""));
    }

    /** Where something is inspected, it may be a protective function although the model doesn't say so. */
    static Paragraph ofInspections(Model model) {
        return model.about().concerns().isPresent() || model.schedule().filter(each -> !each.recurring().isEmpty())
                .isEmpty() ? of(model) : new Paragraph(TEXT + " " + PROTECTIVE_FUNCTION);
    }

    /** Whether a paragraph is one of these. */
    static boolean isOne(Paragraph paragraph) {
        return paragraph.text().parts().stream().findFirst()
                .filter(part -> part instanceof Prose.Words words && words.text().startsWith(TEXT)).isPresent();
    }
}
