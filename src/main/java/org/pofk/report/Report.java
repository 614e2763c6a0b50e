package org.pofk.report;

import java.util.List;
import org.pofk.answer.DerivedModel;

/**
 * What a report is written of.
 *
 * @param answers in the order of the report
 */
public record Report(DerivedModel derived, List<ReportSection> answers, Provenance provenance) {

    /** How much of the way is shown. */
    public enum Depth { BRIEF, FULL }

    public Report {
        answers = List.copyOf(answers);
    }
}
