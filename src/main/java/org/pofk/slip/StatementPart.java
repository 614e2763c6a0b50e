package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement;

/**
 * One formula text of a statement.
 *
 * @param name what it is for, where a statement has several: a state, an output, a pole
 * @param with the statement with another text there
 */
record StatementPart(FormulaText text, String name, Function<FormulaText, Statement> with) {

    /** All texts of a statement, in the order of the file. */
    static List<StatementPart> of(Statement statement) {
        return statement.accept(new Parts());
    }

    private static final class Parts implements Statement.Visitor<List<StatementPart>> {
        @Override
        public List<StatementPart> start(Statement.Start start) {
            return components(start.components(), Statement.Start::new);
        }

        private static List<StatementPart> components(List<Statement.Component> components,
                Function<List<Statement.Component>, Statement> with) {
            return each(components, Statement.Component::is, each -> "state " + (each.state() + 1),
                    (each, text) -> new Statement.Component(each.state(), text), with);
        }

        @Override
        public List<StatementPart> matrix(Statement.Matrix matrix) {
            List<StatementPart> parts = new ArrayList<>();
            for (int i = 0; i < matrix.rows().size(); i++) {
                int row = i;
                parts.addAll(each(matrix.rows().get(i), text -> text, text -> "row " + (row + 1),
                        (old, text) -> text, entries -> new Statement.Matrix(matrix.convention(),
                                replaced(matrix.rows(), row, entries))));
            }
            return parts;
        }

        @Override
        public List<StatementPart> polynomial(Statement.MatrixPolynomial polynomial) {
            return List.of(new StatementPart(polynomial.is(), "",
                    text -> new Statement.MatrixPolynomial(polynomial.which(), text)));
        }

        @Override
        public List<StatementPart> transform(Statement.TransformOf transform) {
            return List.of(new StatementPart(transform.is(), "",
                    text -> new Statement.TransformOf(transform.output(), transform.form(), text)));
        }

        @Override
        public List<StatementPart> poles(Statement.Poles poles) {
            return each(poles.poles(), Statement.Poles.Pole::value, each -> "pole",
                    (each, text) -> new Statement.Poles.Pole(text, each.multiplicity()),
                    all -> new Statement.Poles(poles.output(), all));
        }

        @Override
        public List<StatementPart> residues(Statement.Residues residues) {
            List<StatementPart> parts = new ArrayList<>();
            for (int i = 0; i < residues.coefficients().size(); i++) {
                int at = i;
                Statement.Residues.AtPole own = residues.coefficients().get(i);
                parts.add(new StatementPart(own.pole(), "pole", text -> new Statement.Residues(residues.output(),
                        replaced(residues.coefficients(), at,
                                new Statement.Residues.AtPole(text, own.coefficients())))));
                parts.addAll(each(own.coefficients(), text -> text, text -> "at " + own.pole().text(),
                        (old, text) -> text, coefficients -> new Statement.Residues(residues.output(),
                                replaced(residues.coefficients(), at,
                                        new Statement.Residues.AtPole(own.pole(), coefficients)))));
            }
            return parts;
        }

        @Override
        public List<StatementPart> formula(Statement.PofK formula) {
            return each(formula.parts(), Statement.PofK.Part::is, each -> each.output().name(),
                    (each, text) -> new Statement.PofK.Part(each.output(), text), Statement.PofK::new);
        }

        @Override
        public List<StatementPart> pair(Statement.Pair pair) {
            List<StatementPart> parts = new ArrayList<>();
            pair.radius().ifPresent(own -> parts.add(new StatementPart(own, "radius", text -> new Statement.Pair(
                    pair.output(), Optional.of(text), pair.angle(), pair.amplitude(), pair.phase()))));
            pair.angle().ifPresent(own -> parts.add(new StatementPart(own, "angle", text -> new Statement.Pair(
                    pair.output(), pair.radius(), Optional.of(text), pair.amplitude(), pair.phase()))));
            pair.amplitude().ifPresent(own -> parts.add(new StatementPart(own, "amplitude", text ->
                    new Statement.Pair(pair.output(), pair.radius(), pair.angle(), Optional.of(text),
                            pair.phase()))));
            pair.phase().ifPresent(own -> parts.add(new StatementPart(own, "phase", text -> new Statement.Pair(
                    pair.output(), pair.radius(), pair.angle(), pair.amplitude(), Optional.of(text)))));
            return parts;
        }

        @Override
        public List<StatementPart> longRun(Statement.LongRunOf longRun) {
            List<StatementPart> parts = new ArrayList<>();
            for (int i = 0; i < longRun.parts().size(); i++) {
                int at = i;
                Statement.LongRunOf.Part own = longRun.parts().get(i);
                parts.addAll(each(own.values(), text -> text, text -> own.output().name(), (old, text) -> text,
                        values -> new Statement.LongRunOf(replaced(longRun.parts(), at,
                                new Statement.LongRunOf.Part(own.output(), values)))));
            }
            return parts;
        }

        @Override
        public List<StatementPart> eigenvector(Statement.Eigenvector eigenvector) {
            List<StatementPart> parts = new ArrayList<>(components(eigenvector.components(),
                    components -> new Statement.Eigenvector(eigenvector.eigenvalue(), components)));
            parts.add(0, new StatementPart(eigenvector.eigenvalue(), "eigenvalue",
                    text -> new Statement.Eigenvector(text, eigenvector.components())));
            return parts;
        }

        @Override
        public List<StatementPart> value(Statement.Value value) {
            return List.of(new StatementPart(value.is(), "",
                    text -> new Statement.Value(value.output(), value.at(), text)));
        }

        @Override
        public List<StatementPart> bound(Statement.Bound bound) {
            return List.of(new StatementPart(bound.is(), "",
                    text -> new Statement.Bound(bound.output(), bound.direction(), text)));
        }

        @Override
        public List<StatementPart> answer(AnswerOf answer) {
            return List.of(new StatementPart(answer.is(), "", answer::stating));
        }

        @Override
        public List<StatementPart> noNumber(Statement.NoNumber noNumber) {
            return List.of();
        }

        private interface Replacing<T> {
            T with(T old, FormulaText text);
        }

        private static <T> List<StatementPart> each(List<T> items, Function<T, FormulaText> text,
                Function<T, String> name, Replacing<T> replacing, Function<List<T>, Statement> with) {
            List<StatementPart> parts = new ArrayList<>();
            for (int i = 0; i < items.size(); i++) {
                int at = i;
                T own = items.get(i);
                parts.add(new StatementPart(text.apply(own), name.apply(own), changed ->
                        with.apply(replaced(items, at, replacing.with(own, changed)))));
            }
            return parts;
        }

        private static <T> List<T> replaced(List<T> items, int at, T item) {
            List<T> changed = new ArrayList<>(items);
            changed.set(at, item);
            return changed;
        }
    }
}
