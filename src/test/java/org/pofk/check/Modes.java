package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion;

/**
 * The exact numbers that right claims about one output are written from: Y(z), its poles and what stands at each.
 *
 * @param impulses values at k = 0, 1, …
 * @param poles    real ones, and of each pair the one above the axis
 */
record Modes(ClosedForm form, List<Rational> impulses, List<Pole> poles) {
    private static final int BITS = 280;

    /** One pole with its coefficients R of R binomial(k, p) λ^(k−p), by ascending p. */
    record Pole(Num lambda, List<Num> coefficients) {
        boolean isReal() {
            return lambda.isReal();
        }

        int multiplicity() {
            return coefficients.size();
        }
    }

    static Modes of(ClosedForm form) {
        List<Pole> poles = new ArrayList<>();
        List<Factor<Rational>> factors = form.transform().factors().factors();
        for (Expansion.Part<Rational> part : form.expansion().parts()) {
            for (Root root : form.roots().get(factors.indexOf(part.factor())).all()) {
                if (root.isReal() || root.index() < root.conjugateIndex()) {
                    poles.add(pole(part, root));
                }
            }
        }
        return new Modes(form, form.expansion().impulses(), poles);
    }

    private static Pole pole(Expansion.Part<Rational> part, Root root) {
        Polynomial<Rational> q = part.factor().polynomial();
        ComplexBall ball = root.enclose(BITS);
        Near place = Near.of(decimal(ball.real().middle()), root.isReal() ? BigDecimal.ZERO
                : decimal(ball.imaginary().middle()), BigDecimal.ZERO);
        Optional<Surd> surd = q.degree() == 2
                ? Optional.of(Surd.root(q.coefficient(1), q.coefficient(0), root.isReal() && root.index() == 1 ? -1 : 1))
                : Optional.empty();
        Optional<Rational> rational = q.degree() == 1 ? Optional.of(q.coefficient(0).negate()) : Optional.empty();
        Num lambda = new Num(place, rational, surd);
        return new Pole(lambda, part.coefficients().stream().map(each -> coefficient(each, lambda)).toList());
    }

    private static Num coefficient(Expansion.Coefficient<Rational> coefficient, Num lambda) {
        Near value = at(coefficient.numerator(), lambda.value()).over(at(coefficient.denominator(), lambda.value()));
        if (!coefficient.isReduced()) {
            return Num.of(new Near(value.real(), value.imaginary(), BigDecimal.ZERO));
        }
        Rational scale = coefficient.denominator().coefficient(0).inverse();
        Rational a = coefficient.numerator().coefficient(0).times(scale);
        Rational b = coefficient.numerator().coefficient(1).times(scale);
        return new Num(new Near(value.real(), value.imaginary(), BigDecimal.ZERO),
                lambda.rational().map(at -> a.plus(b.times(at))),
                lambda.surd().map(surd -> surd.scaled(a, b)));
    }

    private static Near at(Polynomial<Rational> polynomial, Near point) {
        Near sum = Near.ZERO;
        for (int i = polynomial.degree(); i >= 0; i--) {
            sum = sum.times(point).plus(Near.of(polynomial.coefficient(i)));
        }
        return sum;
    }

    static BigDecimal decimal(Rational value) {
        return Near.decimal(value.numerator(), value.denominator());
    }

    boolean isExact() {
        return poles.stream().allMatch(pole -> pole.lambda().isExact()
                && pole.coefficients().stream().allMatch(Num::isExact));
    }

    boolean hasPairs() {
        return poles.stream().anyMatch(pole -> !pole.isReal());
    }

    boolean hasRepeated() {
        return poles.stream().anyMatch(pole -> pole.multiplicity() > 1);
    }
}
