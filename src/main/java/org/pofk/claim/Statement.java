package org.pofk.claim;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.pofk.chain.Output;

/** What one claim states: one variant for each kind of step of a derivation. */
public sealed interface Statement permits Statement.Start, Statement.Matrix, Statement.MatrixPolynomial,
        Statement.TransformOf, Statement.Poles, Statement.Residues, Statement.PofK, Statement.Pair, Statement.LongRunOf,
        Statement.Eigenvector, Statement.Value, Statement.Bound, Statement.NoNumber, AnswerOf {

    <R> R accept(Visitor<R> visitor);

    /** One method per variant. */
    interface Visitor<R> {
        R start(Start start);

        R matrix(Matrix matrix);

        R polynomial(MatrixPolynomial polynomial);

        R transform(TransformOf transform);

        R poles(Poles poles);

        R residues(Residues residues);

        R formula(PofK formula);

        R pair(Pair pair);

        R longRun(LongRunOf longRun);

        R eigenvector(Eigenvector eigenvector);

        R value(Value value);

        R bound(Bound bound);

        R answer(AnswerOf answer);

        R noNumber(NoNumber noNumber);
    }

    /** A quantity stated for a state: its place in the chain's states. */
    record Component(int state, FormulaText is) {
    }

    /** The start vector; a state that isn't named has zero. */
    record Start(List<Component> components) implements Statement {
        public Start {
            components = List.copyOf(components);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.start(this);
        }
    }

    /** The transition matrix as written, outer list = written rows; {@code convention} says which sum to one. */
    record Matrix(org.pofk.chain.Model.Convention convention, List<List<FormulaText>> rows) implements Statement {
        public Matrix {
            rows = rows.stream().map(List::copyOf).toList();
        }

        /** That of its entries. */
        public FormulaText.Notation notation() {
            return rows.stream().flatMap(List::stream).map(FormulaText::notation).findFirst()
                    .orElse(FormulaText.Notation.PLAIN);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.matrix(this);
        }
    }

    /** The characteristic or minimal polynomial of A in the one variable the author uses; any factor in front. */
    record MatrixPolynomial(Which which, FormulaText is) implements Statement {
        public enum Which { CHARACTERISTIC, MINIMAL }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.polynomial(this);
        }
    }

    /** Y(z), or Y(z)/z, in any form; {@code EXPANSION} is Y(z) and must be a sum of partial fractions. */
    record TransformOf(Output output, Form form, FormulaText is) implements Statement {
        public enum Form { TRANSFORM, TRANSFORM_OVER_Z, EXPANSION }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.transform(this);
        }
    }

    /** The poles of Y(z), all of them, with multiplicities; the pole at zero counts as Y has it. */
    record Poles(Output output, List<Pole> poles) implements Statement {
        /** One pole, or a pair written with ±. */
        public record Pole(FormulaText value, int multiplicity) {
        }

        public Poles {
            poles = List.copyOf(poles);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.poles(this);
        }
    }

    /** Coefficients R of y(k) = Σ R binomial(k, p) λ^(k−p) by pole; for p = 0 the residue of Y(z)/z at a simple pole. */
    record Residues(Output output, List<AtPole> coefficients) implements Statement {
        /** One pole and its coefficients by ascending power p. */
        public record AtPole(FormulaText pole, List<FormulaText> coefficients) {
            public AtPole {
                coefficients = List.copyOf(coefficients);
            }
        }

        public Residues {
            coefficients = List.copyOf(coefficients);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.residues(this);
        }
    }

    /** p(k) of one output, or of every state at once. */
    record PofK(List<Part> parts) implements Statement {
        /** One output and its formula in k. */
        public record Part(Output output, FormulaText is) {
        }

        public PofK {
            parts = List.copyOf(parts);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.formula(this);
        }
    }

    /**
     * One conjugate pair of an output by what is stated of it: amplitude · radius^k · cos(angle · k + phase). Which
     * pair is meant is told by radius and angle, or by there being only one.
     */
    record Pair(Output output, Optional<FormulaText> radius, Optional<FormulaText> angle,
            Optional<FormulaText> amplitude, Optional<FormulaText> phase) implements Statement {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.pair(this);
        }
    }

    /** Long runs: one output with its value, several with one each, one with the values of a cycle, or none. */
    record LongRunOf(List<Part> parts) implements Statement {
        /** {@code values}: one for a limit; those for k ≡ 0, 1, … for a cycle; none for "no long run". */
        public record Part(Output output, List<FormulaText> values) {
            public Part {
                values = List.copyOf(values);
            }
        }

        public LongRunOf {
            parts = List.copyOf(parts);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.longRun(this);
        }
    }

    /** An eigenvector of A (of P from the left where the author writes rows), up to scale. */
    record Eigenvector(FormulaText eigenvalue, List<Component> components) implements Statement {
        public Eigenvector {
            components = List.copyOf(components);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.eigenvector(this);
        }
    }

    /** p(at) of an output. */
    record Value(Output output, long at, FormulaText is) implements Statement {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.value(this);
        }
    }

    /** p(k) of an output never above, or never below, a number for the steps the claim is for. */
    record Bound(Output output, Direction direction, FormulaText is) implements Statement {
        public enum Direction { AT_LEAST, AT_MOST }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.bound(this);
        }
    }

    /**
     * That a question has a word for its answer and no number.
     *
     * @param asked its text is the word as written
     */
    record NoNumber(AnswerOf asked, Word word) implements Statement {
        /** Beyond every number, or not there because what is asked about never happens. */
        public enum Word {
            INFINITE, NEVER;

            public String text() {
                return name().toLowerCase(Locale.ROOT);
            }
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.noNumber(this);
        }
    }
}
