package org.pofk.slip;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.claim.Claim;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Rational;

/**
 * What would be true if an earlier step were: another truth, and what a later claim says in it.
 *
 * @param from the number of the earlier step
 * @param seen the later claim as a claim about that truth; nothing where the step implies nothing about it
 */
record Implied(int from, Function<Claim, Optional<Claim>> seen, Supplier<Truth> truth) {

    /** All that a wrong step implies: by what explains it, and at face value. */
    static List<Implied> of(Claim claim, Explanation explanation, Truth truth) {
        List<Implied> implied = new ArrayList<>();
        for (Candidate model : explanation.models()) {
            implied.add(new Implied(claim.number(), later -> followed(claim, model, later), model.truth()));
        }
        claim.statement().accept(new AtFaceValue(truth)).forEach(each ->
                implied.add(new Implied(claim.number(), each.seen(), each.truth())));
        return implied;
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

    private record Step(Function<Claim, Optional<Claim>> seen, Supplier<Truth> truth) {
        /** A recursion that stands for one output. */
        static List<Step> of(Output output, Optional<Chain> chain) {
            return chain.stream().map(found -> new Step(later -> Outcomes.only(later.statement())
                    .filter(output::equals).map(own -> Candidate.with(later, Outcomes.mapped(later.statement(),
                            each -> FaceValue.output(own.name(), found.size())))), known(found))).toList();
        }

        private static Supplier<Truth> known(Chain chain) {
            Truth truth = Truth.of(chain);
            return () -> truth;
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
            return List.of();
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
            return List.of();
        }

        @Override
        public List<Step> longRun(Statement.LongRunOf longRun) {
            return List.of();
        }

        @Override
        public List<Step> eigenvector(Statement.Eigenvector eigenvector) {
            return List.of();
        }

        @Override
        public List<Step> value(Statement.Value value) {
            return List.of();
        }

        @Override
        public List<Step> bound(Statement.Bound bound) {
            return List.of();
        }
    }
}
