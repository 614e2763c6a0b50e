package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.pofk.chain.Output;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Statement;

/** The one output a statement is about, and the same statement about another. */
final class Outcomes {
    private Outcomes() {
    }

    /** Every output a statement speaks of. */
    static List<Output> of(Statement statement) {
        return statement.accept(new Named());
    }

    /** The statement with every output changed. */
    static Statement mapped(Statement statement, UnaryOperator<Output> change) {
        return statement.accept(new Changed(change));
    }

    /** The output, where there is exactly one. */
    static Optional<Output> only(Statement statement) {
        List<Output> outputs = of(statement);
        return outputs.size() == 1 ? Optional.of(outputs.get(0)) : Optional.empty();
    }

    private static final class Named implements Statement.Visitor<List<Output>> {
        @Override
        public List<Output> start(Statement.Start start) {
            return List.of();
        }

        @Override
        public List<Output> matrix(Statement.Matrix matrix) {
            return List.of();
        }

        @Override
        public List<Output> polynomial(Statement.MatrixPolynomial polynomial) {
            return List.of();
        }

        @Override
        public List<Output> transform(Statement.TransformOf transform) {
            return List.of(transform.output());
        }

        @Override
        public List<Output> poles(Statement.Poles poles) {
            return List.of(poles.output());
        }

        @Override
        public List<Output> residues(Statement.Residues residues) {
            return List.of(residues.output());
        }

        @Override
        public List<Output> formula(Statement.PofK formula) {
            return formula.parts().stream().map(Statement.PofK.Part::output).toList();
        }

        @Override
        public List<Output> pair(Statement.Pair pair) {
            return List.of(pair.output());
        }

        @Override
        public List<Output> longRun(Statement.LongRunOf longRun) {
            return longRun.parts().stream().map(Statement.LongRunOf.Part::output).toList();
        }

        @Override
        public List<Output> eigenvector(Statement.Eigenvector eigenvector) {
            return List.of();
        }

        @Override
        public List<Output> value(Statement.Value value) {
            return List.of(value.output());
        }

        @Override
        public List<Output> bound(Statement.Bound bound) {
            return List.of(bound.output());
        }

        @Override
        public List<Output> answer(AnswerOf answer) {
            return answer.asked(new AnswerOutputs.Named());
        }

        @Override
        public List<Output> noNumber(Statement.NoNumber noNumber) {
            return answer(noNumber.asked());
        }
    }

    private record Changed(UnaryOperator<Output> change) implements Statement.Visitor<Statement> {
        @Override
        public Statement start(Statement.Start start) {
            return start;
        }

        @Override
        public Statement matrix(Statement.Matrix matrix) {
            return matrix;
        }

        @Override
        public Statement polynomial(Statement.MatrixPolynomial polynomial) {
            return polynomial;
        }

        @Override
        public Statement transform(Statement.TransformOf transform) {
            return new Statement.TransformOf(change.apply(transform.output()), transform.form(), transform.is());
        }

        @Override
        public Statement poles(Statement.Poles poles) {
            return new Statement.Poles(change.apply(poles.output()), poles.poles());
        }

        @Override
        public Statement residues(Statement.Residues residues) {
            return new Statement.Residues(change.apply(residues.output()), residues.coefficients());
        }

        @Override
        public Statement formula(Statement.PofK formula) {
            return new Statement.PofK(formula.parts().stream()
                    .map(part -> new Statement.PofK.Part(change.apply(part.output()), part.is())).toList());
        }

        @Override
        public Statement pair(Statement.Pair pair) {
            return new Statement.Pair(change.apply(pair.output()), pair.radius(), pair.angle(), pair.amplitude(),
                    pair.phase());
        }

        @Override
        public Statement longRun(Statement.LongRunOf longRun) {
            return new Statement.LongRunOf(longRun.parts().stream()
                    .map(part -> new Statement.LongRunOf.Part(change.apply(part.output()), part.values())).toList());
        }

        @Override
        public Statement eigenvector(Statement.Eigenvector eigenvector) {
            return eigenvector;
        }

        @Override
        public Statement value(Statement.Value value) {
            return new Statement.Value(change.apply(value.output()), value.at(), value.is());
        }

        @Override
        public Statement bound(Statement.Bound bound) {
            return new Statement.Bound(change.apply(bound.output()), bound.direction(), bound.is());
        }

        @Override
        public Statement answer(AnswerOf answer) {
            return answer.asked(new AnswerOutputs.Changed(change));
        }

        @Override
        public Statement noNumber(Statement.NoNumber noNumber) {
            return new Statement.NoNumber(noNumber.asked().asked(new AnswerOutputs.Changed(change)), noNumber.word());
        }
    }
}
