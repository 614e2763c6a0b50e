package org.pofk.modes;

import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Enclosed;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Polynomial;
import org.pofk.exact.PolynomialQuotient;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;

/**
 * The number h(λ) for an element h of Q[λ]/(q) and one root λ of q: exact, and enclosed as closely as asked. Where it
 * has a short real form, that is found by arithmetic modulo q; enclosures only choose between finitely many values
 * that are known to differ.
 */
record ElementAtRoot(NumberField field, Polynomial<Rational> element, Root root, EnclosedComplex enclosed) {

    static ElementAtRoot of(NumberField field, Polynomial<Rational> element, Root root) {
        return new ElementAtRoot(field, element, root, PolynomialQuotient.of(element).at(root));
    }

    /** Another element at the same root. */
    ElementAtRoot with(Polynomial<Rational> other) {
        return of(field, other, root);
    }

    ElementAtRoot power(int exponent) {
        return exponent == 1 ? this : with(field.power(element, exponent));
    }

    /** The value as a surd, where it is real and of degree at most two over Q: h² = s h + t modulo q. */
    Optional<Surd> surd() {
        if (element.isConstant()) {
            return Optional.of(Surd.of(element.coefficient(0)));
        }
        if (field.provesHigherDegree(element, 1)) {
            return Optional.empty();
        }
        Polynomial<Rational> square = field.multiply(element, element);
        Rational s = square.coefficient(element.degree()).dividedBy(element.leading());
        Polynomial<Rational> rest = square.minus(element.times(s));
        Rational middle = s.times(Rational.HALF);
        Rational discriminant = middle.times(middle).plus(rest.coefficient(0));
        return rest.isConstant() && discriminant.signum() > 0
                ? Optional.of(Surd.of(middle, Rational.of(realSide(middle)), discriminant))
                : Optional.empty();
    }

    /** On which side of a rational number, which it isn't, the real part lies. */
    private int realSide(Rational bound) {
        return sign(bits -> enclosed.enclose(bits).real().minus(Ball.of(bound, bits + 8)));
    }

    /** The sign of the real part, which is known not to be zero. */
    int realSign() {
        return realSide(Rational.ZERO);
    }

    /** The sign of the imaginary part, which is known not to be zero. */
    int imaginarySign() {
        return sign(bits -> enclosed.enclose(bits).imaginary());
    }

    private static int sign(Enclosed notZero) {
        int bits = 64;
        Ball ball = notZero.enclose(bits);
        while (ball.containsZero()) {
            bits *= 2;
            if (bits > 1 << 22) {
                throw new AssertionError("a number known not to be zero is below 2^-" + bits / 2);
            }
            ball = notZero.enclose(bits);
        }
        return ball.isPositive() ? 1 : -1;
    }

    /**
     * The value in short form, where λ is real: a surd, or a root of one. Tried are the powers after which the value
     * can fall into a smaller field: 2, and m where q(z) = g(z^m).
     */
    Optional<Radical> radical() {
        Optional<Radical> found = surd().map(Radical::of)
                .or(() -> monomialSize().map(size -> realSign() < 0 ? size.negate() : size));
        for (int exponent : new int[] {2, field.step(), 2 * field.step()}) {
            if (found.isEmpty() && exponent > 1 && !field.provesHigherDegree(element, exponent)) {
                found = power(exponent).surd().flatMap(power -> rootOf(power, exponent));
            }
        }
        return found;
    }

    /** |c λ^i| where q(z) = z^m − a and h is the one term c λ^i: |c| · |a|^(i/m), with i in [−m/2, m/2]. */
    Optional<Radical> monomialSize() {
        int m = field.degree();
        if (field.step() != m || element.lowestPower() != element.degree()) {
            return Optional.empty();
        }
        Rational a = field.modulus().coefficient(0).abs();
        boolean isTurned = 2 * element.degree() > m;
        int exponent = isTurned ? element.degree() - m : element.degree();
        Rational factor = isTurned ? element.leading().abs().times(a) : element.leading().abs();
        return Optional.of(Radical.root(Surd.of(a.pow(exponent)), m).times(factor));
    }

    private Optional<Radical> rootOf(Surd power, int exponent) {
        if (exponent % 2 == 0 && power.signum() <= 0) {
            throw new AssertionError("an even power of a real number that isn't positive: " + this);
        }
        Surd positive = power.signum() < 0 ? power.times(Rational.of(-1)) : power;
        Radical root = Radical.root(positive, exponent);
        return Optional.of(realSign() < 0 ? root.negate() : root);
    }

    /** Decides whether the value is real: it is a root of the minimal polynomial of h, and there it is known. */
    boolean isReal() {
        if (root.isReal() || element.isConstant() || isInStepPower() && field.hasRealStepPower(root)) {
            return true;
        }
        Polynomial<Rational> minimal = field.minimalPolynomial(element);
        return minimal.degree() < field.degree()
                && NumberField.located(Roots.of(minimal), enclosed::enclose).isReal();
    }

    /** True for a polynomial in λ^m, q(z) = g(z^m). */
    private boolean isInStepPower() {
        return IntStream.rangeClosed(0, element.degree())
                .allMatch(power -> power % field.step() == 0 || element.coefficient(power).isZero());
    }

    ComplexBall enclose(int bits) {
        return enclosed.enclose(bits);
    }
}
