package org.pofk.slip;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.claim.AuthorText;
import org.pofk.claim.FormulaText;
import org.pofk.claim.OutputTruth;
import org.pofk.claim.Statement;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm;
import org.pofk.meaning.WrittenPolynomial;
import org.pofk.text.RefusedException;
import org.pofk.transform.TransferFunction;

/**
 * The recursion that a statement about one output implies when its numbers are taken at face value: its first
 * component is p(k). What isn't rational is taken to 2^−400.
 */
final class FaceValue {
    private static final int BITS = 400;
    private static final int MOST_ORDER = 60;
    private static final Polynomial<Rational> Z = polynomial(List.of(Rational.ZERO, Rational.ONE));

    private FaceValue() {
    }

    /** The rational a number is, or one that is as good as it. */
    static Rational of(Quantity number) {
        return number.rational().orElseGet(() -> SimplestFraction.in(number.enclose(BITS).real()));
    }

    static Optional<Rational> number(FormulaText text) {
        try {
            return ConstantText.value(text, Precision.AS_WRITTEN).map(FaceValue::of);
        } catch (ArithmeticException unusable) {
            return Optional.empty();
        }
    }

    /** That of a transform. */
    static Optional<Chain> of(Statement.TransformOf stated) {
        try {
            RationalForm form = RationalForm.of(stated.is().parsed(), "z", Precision.AS_WRITTEN);
            Polynomial<Rational> numerator = Polynomial.zero(RationalField.Q);
            Polynomial<Rational> denominator = Polynomial.one(RationalField.Q);
            for (RationalForm.Summand summand : form.summands()) {
                Polynomial<Rational> above = Polynomial.constant(RationalField.Q, of(summand.front()));
                Polynomial<Rational> below = Polynomial.one(RationalField.Q);
                for (RationalForm.Factor factor : summand.factors()) {
                    Polynomial<Rational> power = polynomial(factor.coefficients().stream().map(FaceValue::of).toList())
                            .pow(Math.abs(factor.exponent()));
                    above = factor.exponent() > 0 ? above.times(power) : above;
                    below = factor.exponent() > 0 ? below : below.times(power);
                }
                numerator = numerator.times(below).plus(above.times(denominator));
                denominator = denominator.times(below);
            }
            boolean overZ = stated.form() == Statement.TransformOf.Form.TRANSFORM_OVER_Z;
            return realized(overZ ? numerator.times(Z) : numerator, denominator);
        } catch (RefusedException | ArithmeticException unusable) {
            return Optional.empty();
        }
    }

    /** That of the right numerator over the poles stated. */
    static Optional<Chain> of(Statement.Poles stated, OutputTruth truth) {
        Polynomial<Rational> denominator = Polynomial.one(RationalField.Q);
        for (Statement.Poles.Pole pole : stated.poles()) {
            Optional<ComplexBall> value = ConstantText.value(pole.value(), Precision.AS_WRITTEN)
                    .map(number -> number.enclose(BITS));
            if (value.isEmpty()) {
                return Optional.empty();
            }
            Rational real = middle(value.get().real());
            Rational imaginary = middle(value.get().imaginary());
            if (imaginary.signum() >= 0) {
                Polynomial<Rational> factor = imaginary.isZero() ? polynomial(List.of(real.negate(), Rational.ONE))
                        : polynomial(List.of(real.times(real).plus(imaginary.times(imaginary)),
                                real.times(Rational.TWO).negate(), Rational.ONE));
                denominator = denominator.times(factor.pow(pole.multiplicity()));
            }
        }
        return realized(truth.y().numerator(), denominator);
    }

    /**
     * That of the right numerator over what a stated polynomial of the matrix leaves of itself when what cancels for the
     * output is taken away: the right polynomial divided by the output's denominator. Nothing where that is no factor.
     */
    static Optional<Chain> of(Statement.MatrixPolynomial stated, Polynomial<Rational> right, OutputTruth truth) {
        try {
            Polynomial<Rational> written = polynomial(WrittenPolynomial.of(stated.is().parsed(), Precision.AS_WRITTEN)
                    .coefficients().stream().map(FaceValue::of).toList());
            Polynomial<Rational> cancelled = right.dividedExactlyBy(truth.y().denominator());
            return realized(truth.y().numerator(), written.dividedExactlyBy(cancelled));
        } catch (RefusedException | ArithmeticException unusable) {
            return Optional.empty();
        }
    }

    /** That of the coefficients stated at the poles stated, where all of them are. */
    static Optional<Chain> of(Statement.Residues stated) {
        StringBuilder sum = new StringBuilder("0");
        for (Statement.Residues.AtPole pole : stated.coefficients()) {
            for (int power = 0; power < pole.coefficients().size(); power++) {
                if (pole.pole().notation() != FormulaText.Notation.PLAIN || pole.pole().text().contains("i")) {
                    return Optional.empty();
                }
                sum.append(" + (").append(pole.coefficients().get(power).text()).append(")*binomial(k, ").append(power)
                        .append(")*(").append(pole.pole().text()).append(")^(k - ").append(power).append(")");
            }
        }
        return AuthorText.of(stated.coefficients().get(0).pole()).flatMap(text -> text.read(sum.toString()))
                .flatMap(FaceValue::formula);
    }

    /** z² − 2 r cos θ z + r². */
    private static Polynomial<Rational> quadratic(Rational radius, Rational cosine) {
        return polynomial(List.of(radius.times(radius), radius.times(cosine).times(Rational.TWO).negate(),
                Rational.ONE));
    }

    private static Rational middle(Ball ball) {
        return SimplestFraction.in(ball);
    }

    private static Polynomial<Rational> polynomial(List<Rational> coefficients) {
        return new Polynomial<>(RationalField.Q, coefficients);
    }

    /** N/D where the degree of N is at most that of D. */
    private static Optional<Chain> realized(Polynomial<Rational> numerator, Polynomial<Rational> denominator) {
        if (denominator.isZero() || numerator.degree() > denominator.degree()) {
            return Optional.empty();
        }
        TransferFunction<Rational> y = new TransferFunction<>(numerator, denominator);
        Polynomial<Rational> recurrence =
                y.numerator().coefficient(0).isZero() ? y.denominator() : y.denominator().times(Z);
        OutputTruth values = OutputTruth.of(output("p", 1), y);
        return chain(recurrence, IntStream.range(0, recurrence.degree()).mapToObj(values::valueAt).toList());
    }

    /** That of a formula in k: each term's recurrence, and its first values. */
    static Optional<Chain> formula(FormulaText formula) {
        try {
            ExponentialSum sum = ExponentialSum.of(formula.parsed(), Precision.AS_WRITTEN);
            Map<String, Polynomial<Rational>> factors = new TreeMap<>();
            Map<String, Integer> powers = new TreeMap<>();
            for (ExponentialSum.Term term : sum.terms()) {
                Polynomial<Rational> factor = factor(term);
                factors.put(factor.toString(), factor);
                powers.merge(factor.toString(), term.power() + 1, Math::max);
            }
            Polynomial<Rational> recurrence = Polynomial.one(RationalField.Q);
            for (Map.Entry<String, Polynomial<Rational>> each : factors.entrySet()) {
                recurrence = recurrence.times(each.getValue().pow(powers.get(each.getKey())));
            }
            long impulses = sum.impulses().isEmpty() ? 0 : sum.impulses().lastKey() + 1;
            if (impulses + recurrence.degree() > MOST_ORDER) {
                return Optional.empty();
            }
            recurrence = recurrence.shiftedUp((int) impulses);
            return chain(recurrence, IntStream.range(0, recurrence.degree())
                    .mapToObj(k -> of(sum.valueAt(k))).toList());
        } catch (RefusedException | ArithmeticException unusable) {
            return Optional.empty();
        }
    }

    private static Polynomial<Rational> factor(ExponentialSum.Term term) {
        Rational base = of(term.base());
        if (!term.oscillates()) {
            return polynomial(List.of(base.negate(), Rational.ONE));
        }
        Rational cosine = of(term.angle().cosine());
        return quadratic(base, cosine);
    }

    /** y(k+d) by the recurrence from y(0) … y(d−1), which are the states. */
    private static Optional<Chain> chain(Polynomial<Rational> recurrence, List<Rational> values) {
        int d = recurrence.degree();
        if (d < 1) {
            return Optional.of(OtherTruths.constant(List.of(values.isEmpty() ? Rational.ZERO : values.get(0))));
        }
        Polynomial<Rational> monic = recurrence.monic();
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < d; i++) {
            List<Rational> row = new ArrayList<>(Collections.nCopies(d, Rational.ZERO));
            if (i + 1 < d) {
                row.set(i + 1, Rational.ONE);
            } else {
                IntStream.range(0, d).forEach(j -> row.set(j, monic.coefficient(j).negate()));
            }
            rows.add(row);
        }
        return Optional.of(new Chain(Chain.Kind.RECURSION, IntStream.range(0, d).mapToObj(i -> "y" + i).toList(),
                SparseMatrix.ofRows(rows), values, Map.of(), List.of()));
    }

    /** The first component of so many. */
    static Output output(String name, int size) {
        return new Output(name, OtherChain.unit(size, 0), Rational.ZERO, name);
    }
}
