package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.formula.Formulas;

import org.pofk.meaning.Quantity;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion;
import org.pofk.modes.Mode;
import org.pofk.modes.RealValue;

/**
 * A pole λ of Y(z) other than zero, with what it adds to p(k): Σ R_p · binomial(k, p) · λ^(k−p), and the conjugate of
 * that where λ isn't real. Exact.
 *
 * @param root         the pole; for a conjugate pair the one in the upper half-plane
 * @param multiplicity the length of {@code coefficients}
 * @param value        λ
 * @param coefficients R_0, R_1, …; the last one isn't zero
 * @param modes        of a pair, the terms of the closed form it has, which know angles that are fractions of π
 */
public record TruePole(Root root, int multiplicity, Quantity value, List<Quantity> coefficients,
        List<Mode.Oscillating> modes) {
    public TruePole {
        coefficients = List.copyOf(coefficients);
        modes = List.copyOf(modes);
    }

    /** Those of a closed form, in the order of the factors and of their roots. */
    static List<TruePole> allOf(ClosedForm form) {
        List<Factor<Rational>> factors = form.transform().factors().factors();
        List<TruePole> poles = new ArrayList<>();
        for (Expansion.Part<Rational> part : form.expansion().parts()) {
            int factor = factors.indexOf(part.factor());
            for (Root root : form.roots().get(factor).all()) {
                if (root.index() <= root.conjugateIndex()) {
                    poles.add(of(root, part, form.modes().stream()
                            .filter(mode -> mode.pole().equals(List.of(factor, root.index())))
                            .filter(Mode.Oscillating.class::isInstance).map(Mode.Oscillating.class::cast).toList()));
                }
            }
        }
        return poles;
    }

    private static TruePole of(Root root, Expansion.Part<Rational> part, List<Mode.Oscillating> modes) {
        Polynomial<Rational> q = part.factor().polynomial();
        Quantity value = Quantity.of(root);
        return new TruePole(root, part.factor().multiplicity(), value, part.coefficients().stream()
                .map(each -> at(value, q, each)).toList(), modes);
    }

    private static Quantity at(Quantity root, Polynomial<Rational> q, Expansion.Coefficient<Rational> coefficient) {
        Quantity numerator = valueAt(root, coefficient.numerator().remainder(q));
        return coefficient.isReduced() ? numerator
                : numerator.times(valueAt(root, coefficient.denominator().remainder(q)).inverse());
    }

    private static Quantity valueAt(Quantity point, Polynomial<Rational> polynomial) {
        Quantity value = Quantity.of(polynomial.coefficient(Math.max(polynomial.degree(), 0)));
        for (int power = polynomial.degree() - 1; power >= 0; power--) {
            value = value.times(point).plus(Quantity.of(polynomial.coefficient(power)));
        }
        return value;
    }

    public boolean isReal() {
        return root.isReal();
    }

    /** |λ|. */
    public Quantity modulus() {
        return modulus(value);
    }

    /** The angle of λ, in (0, π), or 0 and π for a real one. */
    public Quantity angle() {
        return modes.stream().map(Mode.Oscillating::angle).flatMap(angle -> partOfTurn(angle).stream()).findFirst()
                .orElseGet(() -> angle(value));
    }

    /** 2 |R_p|, what the pair comes to together. */
    public Quantity amplitude(int power) {
        return modulus(coefficients.get(power)).times(Rational.TWO);
    }

    /** The angle of R_p, which isn't zero, in (−π, π]. */
    public Quantity phase(int power) {
        return modes.stream().filter(mode -> mode.power() == power).map(Mode.Oscillating::phase)
                .flatMap(phase -> partOfTurn(phase).stream()).findFirst().orElseGet(() -> angle(coefficients.get(power)));
    }

    /** A fraction of π, or zero, where the angle is known to be one. */
    private static Optional<Quantity> partOfTurn(RealValue angle) {
        return angle.rational().map(Quantity::of).or(() -> angle.exact().flatMap(Formulas::multipleOfPi)
                .map(fraction -> Quantity.pi().times(fraction)));
    }

    private static Quantity modulus(Quantity number) {
        return number.times(number.conjugate()).squareRoot();
    }

    /** By its cosine and its side of the real axis; for a number whose side can't be told, that of a real one. */
    private static Quantity angle(Quantity number) {
        int side = number.imaginaryPart().sign().orElse(0);
        if (side == 0) {
            return number.realPart().sign().orElse(1) < 0 ? Quantity.pi() : Quantity.ZERO;
        }
        Quantity angle = number.realPart().dividedBy(modulus(number)).arccosine();
        return side < 0 ? angle.negate() : angle;
    }
}
