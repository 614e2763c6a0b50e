package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.OutputTruth;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.meaning.Precision;
import org.pofk.meaning.StepEvaluation;

/**
 * A formula of a claim seen at a few points, with what is right there: p(k) at its first steps, Y(z) at some rational
 * z; a number alone is seen at one.
 *
 * @param points where it is seen, values of {@code variable}
 * @param right  the right value at each point
 */
record Probe(String variable, List<Rational> points, List<Rational> right, Precision precision) {
    private static final long[] STEPS = {0, 1, 2, 3, 4, 7};
    /** Outside the unit circle and of no small denominator, so that no pole is met. */
    private static final List<Rational> IN_Z = List.of(Rational.of(37, 11), Rational.of(-31, 13), Rational.of(23, 17),
            Rational.of(141, 13), Rational.of(-29, 23));

    Probe {
        points = List.copyOf(points);
        right = List.copyOf(right);
    }

    /** The probe of a part of a claim; nothing where the right value isn't told by the part's place. */
    static Optional<Probe> of(Claim claim, int part, Truth truth) {
        Precision precision = new Precision(claim.carried());
        if (claim.statement() instanceof Statement.PofK formula) {
            OutputTruth about = truth.about(formula.parts().get(part).output());
            List<Long> steps = LongStream.of(STEPS).map(step -> step + claim.steps().from()).filter(step ->
                    step <= Math.min(OutputTruth.EXACT, claim.steps().to().orElse(OutputTruth.EXACT))).boxed().toList();
            return steps.isEmpty() ? Optional.empty() : Optional.of(new Probe("k", steps.stream().map(Rational::of).toList(),
                    steps.stream().map(about::valueAt).toList(), precision));
        }
        if (claim.statement() instanceof Statement.TransformOf transform) {
            OutputTruth about = truth.about(transform.output());
            boolean overZ = transform.form() == Statement.TransformOf.Form.TRANSFORM_OVER_Z;
            return Optional.of(new Probe("z", IN_Z, IN_Z.stream().map(z -> about.y().numerator().valueAt(z)
                    .dividedBy(about.y().denominator().valueAt(z)).dividedBy(overZ ? z : Rational.ONE)).toList(),
                    precision));
        }
        boolean placed = claim.statement() instanceof Statement.Start || claim.statement() instanceof Statement.Matrix
                || claim.statement() instanceof Statement.LongRunOf || claim.statement() instanceof Statement.Value
                || claim.statement() instanceof AnswerOf;
        List<TrueNumber> right = placed
                ? TrueNumbers.of(claim.statement(), part, FormulaSurvey.Role.COEFFICIENT, truth) : List.of();
        return right.size() == 1 ? right.get(0).rational().map(number ->
                new Probe("k", List.of(Rational.ZERO), List.of(number), precision)) : Optional.empty();
    }

    /** All that a text may stand for at a point; nothing where it has no value there. */
    Optional<Ball> spread(FormulaText text, int point, int bits) {
        return StepEvaluation.spread(text.parsed(), variable, precision, points.get(point), bits)
                .map(ComplexBall::real);
    }

    /** What a text says at a point when its digits are taken as they stand. */
    Optional<Ball> faceValue(FormulaText text, int point, int bits) {
        return StepEvaluation.atFaceValue(text.parsed(), variable, points.get(point), bits).map(ComplexBall::real);
    }
}
