package org.pofk.report;

import java.util.List;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.KeyFigures;

/**
 * What a report is written of, as far as it is found.
 *
 * @param figures one for each output of {@code derived}, in their order
 * @param courses the outputs over steps, those of a like size together, where they can be drawn
 * @param answers in the order of the report
 */
public record Report(DerivedModel derived, List<KeyFigures> figures, List<Chart.Course> courses,
        List<ReportSection> answers, Provenance provenance) {

    /** How much of the way is shown. */
    public enum Depth { BRIEF, FULL }

    public Report {
        figures = List.copyOf(figures);
        courses = List.copyOf(courses);
        answers = List.copyOf(answers);
        if (figures.size() != derived.outputs().size()) {
            throw new IllegalArgumentException(figures.size() + " figures of " + derived.outputs().size() + " outputs");
        }
    }
}
