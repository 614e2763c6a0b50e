package org.pofk.slip;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.AuthorText;
import org.pofk.claim.Claim;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Rational;

/**
 * What would be true if an earlier step were: another truth, and what a later claim says in it.
 *
 * @param from the number of the earlier step
 * @param seen the later claim as a claim about that truth; nothing where the step implies nothing about it
 * @param truth that of a later claim of which something is implied
 */
record Implied(int from, Function<Claim, Optional<Claim>> seen, Function<Claim, Truth> truth) {

    /** All that a wrong step implies: by what explains it, and at face value. */
    static List<Implied> of(Claim claim, Explanation explanation, Truth truth) {
        List<Implied> implied = new ArrayList<>();
        for (Candidate model : explanation.models()) {
            implied.add(new Implied(claim.number(), later -> followed(claim, model, later),
                    later -> model.truth().get()));
        }
        claim.statement().accept(new AtFaceValue(truth)).forEach(each ->
                implied.add(new Implied(claim.number(), each.seen(), each.truth())));
        if (claim.statement() instanceof Statement.Pair && !explanation.together()) {
            explanation.slips().stream().limit(1).filter(slip -> Digits.isNumber(slip.found())).forEach(slip ->
                    implied.add(new Implied(claim.number(), later -> mended(claim, slip, later), later -> truth)));
        }
        return implied;
    }

    /** A later formula of the same output with the wrong number of a pair, wherever it stands in it, made right. */
    private static Optional<Claim> mended(Claim pair, Slip slip, Claim later) {
        if (!(later.statement() instanceof Statement.PofK)
                || !Outcomes.of(later.statement()).equals(Outcomes.of(pair.statement()))) {
            return Optional.empty();
        }
        StatementPart part = StatementPart.of(later.statement()).get(0);
        return AuthorText.of(part.text()).flatMap(text -> {
            String right = AuthorNotation.of(text.notation()).enclosed(slip.right());
            List<AuthorText.Replacement> mended = text.tree().nodes()
                    .filter(node -> node.parts().isEmpty() && text.text(node).equals(slip.found()))
                    .map(node -> new AuthorText.Replacement(AuthorText.start(node), AuthorText.end(node), right))
                    .toList();
            return mended.isEmpty() ? Optional.empty() : text.with(mended);
        }).map(part.with()).map(statement -> Candidate.with(later, statement));
    }

    /** A later claim about the output that was misread is about the other one too. */
    private static Optional<Claim> followed(Claim earlier, Candidate model, Claim later) {
        if (model.claim() == earlier) {
            return Optional.of(later);
        }
        Optional<Output> own = Outcomes.only(earlier.statement());
        Optional<Output> other = Outcomes.only(model.claim().statement());
        boolean sameChain = own.isPresent() && other.isPresent()
                && other.get().coefficients().size() == own.get().coefficients().size();
        return sameChain && Outcomes.of(later.statement()).contains(own.get())
                ? Optional.of(Candidate.with(later, Outcomes.mapped(later.statement(),
                        output -> output.equals(own.get()) ? other.get() : output)))
                : Optional.empty();
    }

    private record Step(Function<Claim, Optional<Claim>> seen, Function<Claim, Truth> truth) {
        /** A recursion that stands for one output. */
        static List<Step> of(Output output, Optional<Chain> chain) {
            return chain.stream().map(found -> new Step(later -> Outcomes.only(later.statement())
                    .filter(output::equals).map(own -> Candidate.with(later, Outcomes.mapped(later.statement(),
                            each -> FaceValue.output(own.name(), found.size())))), known(found))).toList();
        }

        private static Function<Claim, Truth> known(Chain chain) {
            Truth truth = Truth.of(chain);
            return later -> truth;
        }
    }

    private record AtFaceValue(Truth truth) implements Statement.Visitor<List<Step>> {
        private List<Step> chain(SparseMatrix matrix, List<Rational> start) {
            return List.of(new Step(Optional::of, Step.known(OtherChain.with(truth.chain(), matrix, start))));
        }

        @Override
        public List<Step> start(Statement.Start start) {
            List<Rational> values = new ArrayList<>(Collections.nCopies(truth.chain().size(), Rational.ZERO));
            for (Statement.Component component : start.components()) {
                Optional<Rational> value = FaceValue.number(component.is());
                if (value.isEmpty()) {
                    return List.of();
                }
                values.set(component.state(), value.get());
            }
            return chain(truth.chain().matrix(), values);
        }

        @Override
        public List<Step> matrix(Statement.Matrix matrix) {
            int n = truth.chain().size();
            List<List<Rational>> rows = new ArrayList<>();
            for (int i = 0; i < n; i++) {
                List<Rational> row = new ArrayList<>();
                for (int j = 0; j < n; j++) {
                    boolean across = matrix.convention() == Model.Convention.COLUMNS;
                    int r = across ? i : j;
                    int c = across ? j : i;
                    if (r >= matrix.rows().size() || c >= matrix.rows().get(r).size()) {
                        return List.of();
                    }
                    Optional<Rational> value = FaceValue.number(matrix.rows().get(r).get(c));
                    if (value.isEmpty()) {
                        return List.of();
                    }
                    row.add(value.get());
                }
                rows.add(row);
            }
            return chain(SparseMatrix.ofRows(rows), truth.chain().start());
        }

        @Override
        public List<Step> polynomial(Statement.MatrixPolynomial polynomial) {
            ImpliedPoles implied = new ImpliedPoles(polynomial, truth);
            return List.of(new Step(implied::seen, implied::truth));
        }

        @Override
        public List<Step> transform(Statement.TransformOf transform) {
            return Step.of(transform.output(), FaceValue.of(transform));
        }

        @Override
        public List<Step> poles(Statement.Poles poles) {
            return Step.of(poles.output(), FaceValue.of(poles, truth.about(poles.output())));
        }

        @Override
        public List<Step> residues(Statement.Residues residues) {
            return Step.of(residues.output(), FaceValue.of(residues));
        }

        @Override
        public List<Step> formula(Statement.PofK formula) {
            List<Step> steps = new ArrayList<>();
            formula.parts().forEach(part -> steps.addAll(Step.of(part.output(), FaceValue.formula(part.is()))));
            return steps;
        }

        @Override
        public List<Step> pair(Statement.Pair pair) {
            // what a formula takes over from it is seen by its numbers
            return List.of();
        }

        @Override
        public List<Step> longRun(Statement.LongRunOf longRun) {
            List<Optional<Rational>> values = new ArrayList<>();
            for (Output state : Outputs.states(truth.chain())) {
                values.add(longRun.parts().stream().filter(part -> part.values().size() == 1
                        && part.output().coefficients().equals(state.coefficients())
                        && part.output().constant().isZero()).findFirst()
                        .flatMap(part -> FaceValue.number(part.values().get(0))));
            }
            return settled(values);
        }

        /** Every output's long run follows from those of all states. */
        private static List<Step> settled(List<Optional<Rational>> values) {
            return values.stream().anyMatch(Optional::isEmpty) ? List.of() : List.of(new Step(later ->
                    Optional.of(later).filter(each -> each.statement() instanceof Statement.LongRunOf),
                    Step.known(OtherTruths.constant(values.stream().flatMap(Optional::stream).toList()))));
        }

        @Override
        public List<Step> eigenvector(Statement.Eigenvector eigenvector) {
            boolean atOne = FaceValue.number(eigenvector.eigenvalue()).filter(Rational::isOne).isPresent();
            List<Optional<Rational>> values = new ArrayList<>(Collections.nCopies(truth.chain().size(),
                    Optional.of(Rational.ZERO)));
            eigenvector.components().forEach(each -> values.set(each.state(), FaceValue.number(each.is())));
            Rational sum = values.stream().flatMap(Optional::stream).reduce(Rational.ZERO, Rational::plus);
            return !atOne || sum.isZero() ? List.of()
                    : settled(values.stream().map(value -> value.map(each -> each.dividedBy(sum))).toList());
        }

        @Override
        public List<Step> value(Statement.Value value) {
            return List.of();
        }

        @Override
        public List<Step> bound(Statement.Bound bound) {
            return List.of();
        }

        @Override
        public List<Step> answer(AnswerOf answer) {
            return List.of();
        }

        @Override
        public List<Step> noNumber(Statement.NoNumber noNumber) {
            return List.of();
        }
    }
}
