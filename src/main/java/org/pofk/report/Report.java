package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.KeyFigures;

/**
 * What a report is written of, as far as it is found.
 *
 * @param figures one for each output of {@code derived}, in their order
 * @param course  the outputs over steps, where they can be drawn
 * @param answers in the order of the report
 */
public record Report(DerivedModel derived, List<KeyFigures> figures, Optional<Chart.Course> course,
        List<ReportSection> answers, Provenance provenance) {

    /** How much of the way is shown. */
    public enum Depth { BRIEF, FULL }

    public Report {
        figures = List.copyOf(figures);
        answers = List.copyOf(answers);
        if (figures.size() != derived.outputs().size()) {
            throw new IllegalArgumentException(figures.size() + " figures of " + derived.outputs().size() + " outputs");
        }
    }
}
