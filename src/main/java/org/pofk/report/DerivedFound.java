package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.KeyFigures;
import org.pofk.modes.FormulaShape;
import org.pofk.report.Document.Labelled;
import org.pofk.steps.StepValue;
import org.pofk.transform.Transform;

/** An output with its formula p(k); Y(z) decides all that is said of it. */
record DerivedFound(DerivedOutput output, KeyFigures figures) implements FoundOutput {
    static List<FoundOutput> in(Report report) {
        return IntStream.range(0, report.figures().size()).<FoundOutput>mapToObj(i ->
                new DerivedFound(report.derived().outputs().get(i), report.figures().get(i))).toList();
    }

    @Override
    public String name() {
        return output.output().name();
    }

    @Override
    public Optional<Prose> shape() {
        return output.closedForm().map(form -> Prose.of(ShapeProse.of(FormulaShape.of(form))));
    }

    @Override
    public String withoutShape() {
        return "the formula is " + MissingBlocks.NOT_DECIDED;
    }

    @Override
    public List<Labelled> facts(Style style) {
        return ReportSummary.facts(output, figures, style);
    }

    @Override
    public Prose longRun(Style style) {
        return Prose.of(output.longRun().map(checks -> new LongRunProse(style.digits()).of(checks.byPoles()))
                .orElse(MissingBlocks.NOT_DECIDED));
    }

    @Override
    public Prose reading() {
        return Prose.EMPTY;
    }

    @Override
    public List<StepValue> values() {
        return output.values();
    }

    @Override
    public Optional<Object> identity() {
        return output.isDecided() ? output.transform().map(Transform::y) : Optional.empty();
    }
}
