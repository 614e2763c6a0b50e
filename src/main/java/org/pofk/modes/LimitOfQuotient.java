package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.PolynomialQuotient;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;

/**
 * What a(k)/b(k) tends to where b(k) ≥ 0 has one pole alone on its outermost circle, and |a(k)| ≤ C b(k): the quotient of
 * the coefficients of that pole's highest power in b. Exact where it has a short form, certified elsewhere.
 */
public final class LimitOfQuotient {
    private final ClosedForm a;
    private final ClosedForm b;

    private LimitOfQuotient(ClosedForm a, ClosedForm b) {
        this.a = a;
        this.b = b;
    }

    /** Empty where b is zero from some step on, so that there is nothing to tend to. */
    public static Optional<RealValue> of(ClosedForm a, ClosedForm b) {
        return new LimitOfQuotient(a, b).value();
    }

    private Optional<RealValue> value() {
        return OutermostPole.of(b).map(this::atPole);
    }

    private RealValue atPole(OutermostPole pole) {
        int power = b.transform().factors().factors().get(pole.factor()).multiplicity() - 1;
        for (int i = 0; i < a.roots().size(); i++) {
            Factor<Rational> factor = a.transform().factors().factors().get(i);
            Optional<Root> same = sameRoot(factor.polynomial(), a.roots().get(i), pole.root());
            if (same.isPresent()) {
                if (factor.multiplicity() - 1 > power) {
                    throw new AssertionError("a grows faster than b: " + a.transform() + " over " + b.transform());
                }
                return factor.multiplicity() - 1 < power ? RealValue.of(Rational.ZERO)
                        : quotient(coefficient(a, i, power), same.get(), coefficient(b, pole.factor(), power), pole.root());
            }
        }
        return RealValue.of(Rational.ZERO);
    }

    /** The root of q that is this number, if there is one: decided by the common divisor of the two polynomials. */
    private static Optional<Root> sameRoot(Polynomial<Rational> q, Roots roots, Root number) {
        Polynomial<Rational> other = number.polynomial();
        if (q.equals(other)) {
            return Optional.of(roots.all().get(number.index()));
        }
        Polynomial<Rational> common = q.greatestCommonDivisor(other);
        if (common.isConstant() || !vanishes(common, other.dividedExactlyBy(common), number)) {
            return Optional.empty();
        }
        return Optional.of(NumberField.located(roots, number::enclose));
    }

    /** Whether the number is a root of the first; it is one of exactly one of the two. */
    private static boolean vanishes(Polynomial<Rational> first, Polynomial<Rational> second, Root number) {
        for (int bits = 64; true; bits *= 2) {
            if (!PolynomialQuotient.of(first).at(number).enclose(bits).containsZero()) {
                return false;
            }
            if (!PolynomialQuotient.of(second).at(number).enclose(bits).containsZero()) {
                return true;
            }
        }
    }

    private static Expansion.Coefficient<Rational> coefficient(ClosedForm form, int factor, int power) {
        Factor<Rational> wanted = form.transform().factors().factors().get(factor);
        return form.expansion().parts().stream().filter(part -> part.factor().equals(wanted)).findFirst()
                .orElseThrow().coefficients().get(power);
    }

    /** In Q[λ]/(q) where both are modulo the same small q, so that a short form is found; enclosed elsewhere. */
    private static RealValue quotient(Expansion.Coefficient<Rational> above, Root aboveAt,
            Expansion.Coefficient<Rational> below, Root belowAt) {
        Polynomial<Rational> q = belowAt.polynomial();
        Polynomial<Rational> numerator = above.numerator().times(below.denominator());
        Polynomial<Rational> denominator = above.denominator().times(below.numerator());
        if (!q.equals(aboveAt.polynomial())) {
            return new RealValue(Optional.empty(), enclosed(above, aboveAt).dividedBy(enclosed(below, belowAt)));
        }
        Enclosed enclosed = PolynomialQuotient.of(numerator, denominator).at((Enclosed) bits ->
                belowAt.enclose(bits).real());
        if (q.degree() > Expansion.REDUCED_UP_TO) {
            return constantRatio(numerator.remainder(q), denominator.remainder(q)).map(RealValue::of)
                    .orElseGet(() -> new RealValue(Optional.empty(), enclosed));
        }
        NumberField field = new NumberField(q, Roots.of(q));
        Polynomial<Rational> element = field.divide(numerator.remainder(q), denominator.remainder(q));
        return RealValue.of(ElementAtRoot.of(field, element, belowAt).radical(), enclosed);
    }

    private static Enclosed enclosed(Expansion.Coefficient<Rational> coefficient, Root root) {
        return PolynomialQuotient.of(coefficient.numerator(), coefficient.denominator()).at(root).realPart();
    }

    /** The rational number c with a = c·b. */
    private static Optional<Rational> constantRatio(Polynomial<Rational> a, Polynomial<Rational> b) {
        Rational ratio = a.coefficient(b.degree()).dividedBy(b.leading());
        return a.equals(b.times(ratio)) ? Optional.of(ratio) : Optional.empty();
    }
}
