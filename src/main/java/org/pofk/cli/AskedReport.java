package org.pofk.cli;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.Deriving;
import org.pofk.answer.KeyFigures;
import org.pofk.answer.LaterSteps;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.Chart;
import org.pofk.report.CourseCharts;
import org.pofk.report.Provenance;
import org.pofk.report.Report;
import org.pofk.report.ReportSection;

/**
 * A report that is asked for, before anything is found.
 *
 * @param at     the steps of the table of values
 * @param reach  whether there are more of them where the outputs settle later
 * @param extras what else is derived
 */
record AskedReport(Model model, List<Output> outputs, List<AskedSection> sections, List<Integer> at,
        Reach reach, Set<Deriving.Extra> extras) {

    /** How far the values go. */
    enum Reach { AS_LISTED, UNTIL_SETTLED }

    /** What is read for it: the model, its tables, what its sections are about. */
    Stream<Model.Origin> files() {
        return Stream.of(Stream.of(model.origin()), model.tables().stream(),
                sections.stream().flatMap(section -> section.files().stream())).flatMap(files -> files);
    }

    /** The same at exactly these steps. */
    AskedReport at(List<Integer> steps) {
        return new AskedReport(model, outputs, sections, steps, Reach.AS_LISTED, extras);
    }

    /** Finds what it says, and publishes all that is found by then, again and again. */
    Report find(Provenance provenance, Consumer<Report> published) {
        List<ReportSection> answers = notReached();
        List<KeyFigures> none = Collections.nCopies(outputs.size(), KeyFigures.NONE);
        DerivedModel asListed = Deriving.of(model, outputs, at, extras, partly ->
                published.accept(new Report(partly, none, List.of(), answers, provenance)));
        List<KeyFigures> figures = asListed.outputs().stream().map(each -> KeyFigures.of(model.chain(), each)).toList();
        DerivedModel derived = reach == Reach.AS_LISTED ? asListed : LaterSteps.added(asListed, figures);
        List<Chart.Course> courses = CourseCharts.of(derived, figures);
        published.accept(new Report(derived, figures, courses, answers, provenance));
        return new Report(derived, figures, courses, answered(partly ->
                published.accept(new Report(derived, figures, courses, partly, provenance))), provenance);
    }

    /** What stands in place of each section before it is found. */
    List<ReportSection> notReached() {
        return sections.stream().map(section -> ReportSection.notReached(section.place(), section.title())).toList();
    }

    /** The sections, published again after each that is found. */
    List<ReportSection> answered(Consumer<List<ReportSection>> published) {
        List<ReportSection> answers = new ArrayList<>(notReached());
        for (int i = 0; i < sections.size(); i++) {
            answers.set(i, sections.get(i).work().get());
            published.accept(List.copyOf(answers));
        }
        return answers;
    }
}
