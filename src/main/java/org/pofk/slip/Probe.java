package org.pofk.slip;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.pofk.chain.Output;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.OutputTruth;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm;
import org.pofk.text.RefusedException;

/**
 * A formula at a few points: p(k) at its first steps, Y(z) at some rational z; a number alone is seen at one. What differs from the truth at one of
 * them, by certified balls, is refuted without being judged.
 */
sealed interface Probe {
    /** The number of points. */
    int points();

    /** The formula's values at the points; nothing where it has no meaning. */
    Optional<IntFunction<Quantity>> read(FormulaText text);

    /** The right value there. */
    Rational truth(Truth truth, int point);

    /** The probe of a part of a claim; nothing where the right value isn't told by the part's place. */
    static Optional<Probe> of(Claim claim, int part, Truth truth) {
        Precision precision = new Precision(claim.carried());
        if (claim.statement() instanceof Statement.PofK formula) {
            return Optional.of(new OfSteps(formula.parts().get(part).output(), claim.steps(), precision));
        }
        if (claim.statement() instanceof Statement.TransformOf transform) {
            return Optional.of(new OfTransform(transform.output(), transform.form(), precision));
        }
        boolean placed = claim.statement() instanceof Statement.Start || claim.statement() instanceof Statement.Matrix
                || claim.statement() instanceof Statement.LongRunOf || claim.statement() instanceof Statement.Value;
        List<TrueNumber> right = placed
                ? TrueNumbers.of(claim.statement(), part, FormulaSurvey.Role.COEFFICIENT, truth) : List.of();
        return right.size() == 1
                ? right.get(0).rational().map(number -> new OfNumber(number, precision)) : Optional.empty();
    }

    /** A formula in k at the first steps it is claimed for. */
    record OfSteps(Output output, Claim.Steps steps, Precision precision) implements Probe {
        private static final int[] OFFSETS = {0, 1, 2, 3, 4, 7};

        @Override
        public int points() {
            return (int) Arrays.stream(OFFSETS)
                    .filter(offset -> steps.to().isEmpty() || steps.from() + offset <= steps.to().getAsLong()).count();
        }

        @Override
        public Optional<IntFunction<Quantity>> read(FormulaText text) {
            try {
                ExponentialSum sum = ExponentialSum.of(text.parsed(), precision);
                return Optional.of(point -> sum.valueAt(steps.from() + OFFSETS[point]));
            } catch (RefusedException | ArithmeticException unusable) {
                return Optional.empty();
            }
        }

        @Override
        public Rational truth(Truth truth, int point) {
            return truth.about(output).valueAt(steps.from() + OFFSETS[point]);
        }
    }

    /** A formula in z at a few points outside the unit circle. */
    record OfTransform(Output output, Statement.TransformOf.Form form, Precision precision) implements Probe {
        private static final int POLE_BITS = 96;
        private static final List<Rational> POINTS =
                List.of(Rational.of(37, 11), Rational.of(-31, 13), Rational.of(23, 17),
                        Rational.of(141, 13), Rational.of(-29, 23));

        @Override
        public int points() {
            return POINTS.size();
        }

        @Override
        public Optional<IntFunction<Quantity>> read(FormulaText text) {
            try {
                RationalForm form = RationalForm.of(text.parsed(), "z", precision);
                return Optional.of(point -> valueAt(form, Quantity.of(POINTS.get(point))));
            } catch (RefusedException | ArithmeticException unusable) {
                return Optional.empty();
            }
        }

        @Override
        public Rational truth(Truth truth, int point) {
            OutputTruth about = truth.about(output);
            Rational z = POINTS.get(point);
            Rational value = about.y().numerator().valueAt(z).dividedBy(about.y().denominator().valueAt(z));
            return form == Statement.TransformOf.Form.TRANSFORM_OVER_Z ? value.dividedBy(z) : value;
        }

        /** An {@link ArithmeticException} where the point may be a pole. */
        private static Quantity valueAt(RationalForm form, Quantity z) {
            form.summands().stream().flatMap(summand -> summand.factors().stream())
                    .filter(factor -> factor.exponent() < 0).forEach(factor -> {
                        Quantity below = Quantity.ZERO;
                        for (int power = factor.coefficients().size() - 1; power >= 0; power--) {
                            below = below.times(z).plus(factor.coefficients().get(power));
                        }
                        if (below.enclose(POLE_BITS).containsZero()) {
                            throw new ArithmeticException("a pole at the point");
                        }
                    });
            return form.valueAt(z);
        }
    }

    /** A number. */
    record OfNumber(Rational right, Precision precision) implements Probe {
        @Override
        public int points() {
            return 1;
        }

        @Override
        public Optional<IntFunction<Quantity>> read(FormulaText text) {
            return ConstantText.value(text, precision).map(value -> point -> value);
        }

        @Override
        public Rational truth(Truth truth, int point) {
            return right;
        }
    }
}
