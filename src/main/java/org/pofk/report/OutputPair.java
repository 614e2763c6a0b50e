package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.KeyFigures;
import org.pofk.chain.ModelChanges;
import org.pofk.modes.FormulaShape;
import org.pofk.report.Document.Labelled;
import org.pofk.transform.Transform;

/** An output in an earlier report and in a later one, in one of them at least; a renamed state goes by its later name. */
record OutputPair(Optional<Found> before, Optional<Found> now) {

    /** How the two compare. */
    enum Standing { NEW, GONE, AS_BEFORE, MOVED }

    /** An output with what was found of it. */
    record Found(DerivedOutput output, KeyFigures figures) {
        static List<Found> in(Report report) {
            return IntStream.range(0, report.figures().size())
                    .mapToObj(i -> new Found(report.derived().outputs().get(i), report.figures().get(i))).toList();
        }

        String name() {
            return output.output().name();
        }

        Optional<Prose> shape() {
            return output.closedForm().map(form -> Prose.of(ShapeProse.of(FormulaShape.of(form))));
        }

        List<Labelled> facts(Style style) {
            return ReportSummary.facts(output, figures, style);
        }

        /** Y(z) decides: all that is said of an output follows from it. */
        private boolean isSameAs(Found other) {
            return output.isDecided() && other.output.isDecided()
                    && output.transform().map(Transform::y).equals(other.output.transform().map(Transform::y));
        }
    }

    /** In the later order, what is gone last. */
    static List<OutputPair> of(Report before, Report after, ModelChanges changes) {
        List<Found> was = Found.in(before);
        List<Found> is = Found.in(after);
        List<OutputPair> pairs = new ArrayList<>();
        is.forEach(now -> pairs.add(new OutputPair(was.stream().filter(old -> isNamed(old, now, changes)).findFirst(),
                Optional.of(now))));
        was.stream().filter(old -> is.stream().noneMatch(now -> isNamed(old, now, changes)))
                .forEach(gone -> pairs.add(new OutputPair(Optional.of(gone), Optional.empty())));
        return pairs;
    }

    private static boolean isNamed(Found old, Found now, ModelChanges changes) {
        return changes.renamed().getOrDefault(old.name(), old.name()).equals(now.name());
    }

    String name() {
        return now.or(() -> before).orElseThrow().name();
    }

    Standing standing() {
        return before.isEmpty() ? Standing.NEW : now.isEmpty() ? Standing.GONE
                : before.get().isSameAs(now.get()) ? Standing.AS_BEFORE : Standing.MOVED;
    }

    /** Which of the formula's shape and numbers are other ones, where both reports have it. */
    String compared() {
        Optional<Prose> was = before.flatMap(Found::shape);
        Optional<Prose> is = now.flatMap(Found::shape);
        if (was.isEmpty() || is.isEmpty()) {
            return "the formula is " + MissingBlocks.NOT_DECIDED;
        }
        return was.equals(is) ? "the formula has the same shape, with other numbers" : "the formula has another shape";
    }
}
