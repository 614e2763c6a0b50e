package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.KeyFigures;

/**
 * What a report is written of, as far as it is found.
 *
 * @param figures one for each output of {@code derived}, in their order
 * @param courses the outputs over steps, those of a like size together, where they can be drawn
 * @param answers in the order of the report
 * @param since   the same of an earlier model, where what has changed is to be said
 */
public record Report(DerivedModel derived, List<KeyFigures> figures, List<Chart.Course> courses,
        List<ReportSection> answers, Provenance provenance, Optional<Report> since) {

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

    /** Compared with nothing earlier. */
    public Report(DerivedModel derived, List<KeyFigures> figures, List<Chart.Course> courses,
            List<ReportSection> answers, Provenance provenance) {
        this(derived, figures, courses, answers, provenance, Optional.empty());
    }

    /** Compared with an earlier one. */
    public Report since(Report earlier) {
        return new Report(derived, figures, courses, answers, provenance, Optional.of(earlier));
    }

    /** The same, compared with nothing. */
    Report alone() {
        return new Report(derived, figures, courses, answers, provenance);
    }

    /** The same, as if its model had been read from another's file, and it had been made as the other was. */
    Report asMadeLike(Report other) {
        DerivedModel renamed = new DerivedModel(derived.model().readFrom(other.derived.model().origin()),
                derived.structure(), derived.outputs(), derived.state(), derived.wanted());
        return new Report(renamed, figures, courses, answers, other.provenance, since);
    }
}
