package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.meaning.Quantity;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion;

/**
 * A pole λ of Y(z) other than zero, with what it adds to p(k): Σ R_p · binomial(k, p) · λ^(k−p), and the conjugate of
 * that where λ isn't real. Exact.
 *
 * @param root         the pole; for a conjugate pair the one in the upper half-plane
 * @param multiplicity the length of {@code coefficients}
 * @param value        λ
 * @param coefficients R_0, R_1, …; the last one isn't zero
 */
public record TruePole(Root root, int multiplicity, Quantity value, List<Quantity> coefficients) {
    public TruePole {
        coefficients = List.copyOf(coefficients);
    }

    /** Those of a closed form, in the order of the factors and of their roots. */
    static List<TruePole> allOf(ClosedForm form) {
        List<Factor<Rational>> factors = form.transform().factors().factors();
        List<TruePole> poles = new ArrayList<>();
        for (Expansion.Part<Rational> part : form.expansion().parts()) {
            for (Root root : form.roots().get(factors.indexOf(part.factor())).all()) {
                if (root.index() <= root.conjugateIndex()) {
                    poles.add(of(root, part));
                }
            }
        }
        return poles;
    }

    private static TruePole of(Root root, Expansion.Part<Rational> part) {
        Polynomial<Rational> q = part.factor().polynomial();
        Quantity value = Quantity.of(root);
        return new TruePole(root, part.factor().multiplicity(), value, part.coefficients().stream()
                .map(each -> at(value, q, each)).toList());
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
        return angle(value);
    }

    /** 2 |R_p|, what the pair comes to together. */
    public Quantity amplitude(int power) {
        return modulus(coefficients.get(power)).times(Rational.TWO);
    }

    /** The angle of R_p, which isn't zero, in (−π, π]. */
    public Quantity phase(int power) {
        return angle(coefficients.get(power));
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
