package org.pofk.cli;

import java.util.List;
import java.util.function.Supplier;
import org.pofk.chain.Model;
import org.pofk.report.Prose;
import org.pofk.report.ReportSection;

/**
 * A section that the options of a report ask for.
 *
 * @param place where it stands
 * @param title what stands in its place when a budget leaves no time for it
 * @param files what was read for it besides the model
 * @param work  finds what it says
 */
record AskedSection(ReportSection.Place place, Prose title, List<Model.Origin> files, Supplier<ReportSection> work) {
    AskedSection {
        files = List.copyOf(files);
    }

    /** A result, which only the model is read for. */
    AskedSection(Prose title, Supplier<ReportSection> work) {
        this(ReportSection.Place.RESULTS, title, List.of(), work);
    }
}
