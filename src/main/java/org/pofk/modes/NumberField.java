package org.pofk.modes;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Polynomial;
import org.pofk.exact.QuadraticScreen;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.exact.ResidueField;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;

/**
 * Q[λ]/(q) with the places where λ can stand: the roots of q. An identity modulo q holds at every root, also where q
 * isn't proved irreducible. Exact.
 */
final class NumberField {
    /** Degree up to which every test for a short exact form is made; above it only where q has a structure for it. */
    static final int SEARCHED_UP_TO = 30;

    private final ResidueField<Rational> residues;
    private final Roots roots;
    private final int step;
    private Optional<Roots> stepRoots = Optional.empty();

    NumberField(Polynomial<Rational> q, Roots roots) {
        this.residues = new ResidueField<>(q);
        this.roots = roots;
        this.step = exponentStep(q);
    }

    Polynomial<Rational> modulus() {
        return residues.modulus();
    }

    int degree() {
        return modulus().degree();
    }

    /** λ. */
    Polynomial<Rational> root() {
        return residues.generator();
    }

    /** The largest m with q(z) = g(z^m). */
    int step() {
        return step;
    }

    private static int exponentStep(Polynomial<Rational> q) {
        int step = 0;
        for (int power = 1; power <= q.degree(); power++) {
            if (!q.coefficient(power).isZero()) {
                step = BigInteger.valueOf(step).gcd(BigInteger.valueOf(power)).intValue();
            }
        }
        return step;
    }

    Polynomial<Rational> one() {
        return residues.one();
    }

    Polynomial<Rational> multiply(Polynomial<Rational> a, Polynomial<Rational> b) {
        return residues.multiply(a, b);
    }

    Polynomial<Rational> divide(Polynomial<Rational> a, Polynomial<Rational> b) {
        return residues.divide(a, b);
    }

    Polynomial<Rational> power(Polynomial<Rational> base, int exponent) {
        return BinaryPowering.of(residues.one(), base, exponent, this::multiply);
    }

    /** Whether h^exponent is proved to be no root of a quadratic over Q; false says nothing. */
    boolean provesHigherDegree(Polynomial<Rational> h, int exponent) {
        return degree() > 2 && QuadraticScreen.provesHigherDegree(modulus(), h, exponent);
    }

    /** Decides whether λ^m is real, m = {@link #step}: it is a root of g, and there it is known. Finds those once. */
    boolean hasRealStepPower(Root root) {
        if (step == 1) {
            return root.isReal();
        }
        return located(rootsOfStepPolynomial(), bits -> root.enclose(bits).pow(step)).isReal();
    }

    private synchronized Roots rootsOfStepPolynomial() {
        if (stepRoots.isEmpty()) {
            List<Rational> coefficients = new ArrayList<>();
            for (int power = 0; power <= degree(); power += step) {
                coefficients.add(modulus().coefficient(power));
            }
            stepRoots = Optional.of(Roots.of(Polynomial.ofRationals(coefficients)));
        }
        return stepRoots.get();
    }

    /**
     * The rational s with |λ|² = s that z^d q(s/z) = constant · q(z) allows: s/λ is then a root too, for every root
     * λ, though not always its conjugate. Only for even degree, where s is |q(0)|^(2/d). Linear in d.
     */
    Optional<Rational> squaredModulusCandidate() {
        Polynomial<Rational> q = modulus();
        if (q.degree() % 2 != 0) {
            return Optional.empty();
        }
        return SquarePart.root(q.coefficient(0).abs(), q.degree() / 2).filter(this::turnsOverTo);
    }

    private boolean turnsOverTo(Rational s) {
        Polynomial<Rational> q = modulus();
        Rational power = Rational.ONE;
        for (int i = 0; i <= q.degree(); i++) {
            if (!q.coefficient(i).times(power).equals(q.coefficient(0).times(q.coefficient(q.degree() - i)))) {
                return false;
            }
            power = power.times(s);
        }
        return true;
    }

    /** h(s/λ) as a polynomial in λ; d² operations, for dividing by λ is a shift. */
    Polynomial<Rational> turnedOver(Polynomial<Rational> h, Rational s) {
        Polynomial<Rational> q = modulus();
        Polynomial<Rational> power = residues.one();
        Polynomial<Rational> sum = Polynomial.zero(RationalField.Q);
        for (int i = 0; i <= h.degree(); i++) {
            sum = sum.plus(power.times(h.coefficient(i)));
            Rational multiple = power.coefficient(0).dividedBy(q.coefficient(0));
            power = power.minus(q.times(multiple)).shiftedDown(1).times(s);
        }
        return sum;
    }

    /** Which root of q the number is that {@code at} encloses; it is known to be one. */
    static Root located(Roots roots, IntFunction<ComplexBall> at) {
        List<Root> left = new ArrayList<>(roots.all());
        for (int bits = 32; left.size() > 1; bits *= 2) {
            int precision = bits;
            ComplexBall number = at.apply(bits);
            left.removeIf(root -> !root.enclose(precision).overlaps(number));
        }
        if (left.isEmpty()) {
            throw new AssertionError("no root of " + roots);
        }
        return left.get(0);
    }

    Roots roots() {
        return roots;
    }

    /** The monic polynomial of least degree that vanishes at h; d products modulo q. */
    Polynomial<Rational> minimalPolynomial(Polynomial<Rational> h) {
        return residues.minimalPolynomial(h);
    }
}
