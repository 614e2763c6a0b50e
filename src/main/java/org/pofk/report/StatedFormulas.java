package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement;

/** Every formula a statement holds, in the order of the file. */
final class StatedFormulas implements Statement.Visitor<Stream<FormulaText>> {
    private StatedFormulas() {
    }

    static List<FormulaText> of(Statement statement) {
        return statement.accept(new StatedFormulas()).toList();
    }

    @Override
    public Stream<FormulaText> start(Statement.Start start) {
        return start.components().stream().map(Statement.Component::is);
    }

    @Override
    public Stream<FormulaText> matrix(Statement.Matrix matrix) {
        return matrix.rows().stream().flatMap(List::stream);
    }

    @Override
    public Stream<FormulaText> polynomial(Statement.MatrixPolynomial polynomial) {
        return Stream.of(polynomial.is());
    }

    @Override
    public Stream<FormulaText> transform(Statement.TransformOf transform) {
        return Stream.of(transform.is());
    }

    @Override
    public Stream<FormulaText> poles(Statement.Poles poles) {
        return poles.poles().stream().map(Statement.Poles.Pole::value);
    }

    @Override
    public Stream<FormulaText> residues(Statement.Residues residues) {
        return residues.coefficients().stream()
                .flatMap(at -> Stream.concat(Stream.of(at.pole()), at.coefficients().stream()));
    }

    @Override
    public Stream<FormulaText> formula(Statement.PofK formula) {
        return formula.parts().stream().map(Statement.PofK.Part::is);
    }

    @Override
    public Stream<FormulaText> pair(Statement.Pair pair) {
        return Stream.of(pair.radius(), pair.angle(), pair.amplitude(), pair.phase()).flatMap(Optional::stream);
    }

    @Override
    public Stream<FormulaText> longRun(Statement.LongRunOf longRun) {
        return longRun.parts().stream().flatMap(part -> part.values().stream());
    }

    @Override
    public Stream<FormulaText> eigenvector(Statement.Eigenvector eigenvector) {
        return Stream.concat(Stream.of(eigenvector.eigenvalue()),
                eigenvector.components().stream().map(Statement.Component::is));
    }

    @Override
    public Stream<FormulaText> value(Statement.Value value) {
        return Stream.of(value.is());
    }

    @Override
    public Stream<FormulaText> bound(Statement.Bound bound) {
        return Stream.of(bound.is());
    }

    @Override
    public Stream<FormulaText> answer(AnswerOf answer) {
        return Stream.of(answer.is());
    }

    @Override
    public Stream<FormulaText> noNumber(Statement.NoNumber noNumber) {
        return Stream.of(noNumber.asked().is());
    }
}
