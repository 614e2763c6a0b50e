package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/**
 * scale · radicand^(1/degree), a real number with a short exact form. Canonical form: degree 1 has scale one (the
 * surd alone, any sign); a higher degree has a positive radicand and a scale that isn't zero, and no smaller degree
 * was found to do. Exact.
 */
record Radical(Rational scale, Surd radicand, int degree) {

    static Radical of(Rational value) {
        return of(Surd.of(value));
    }

    static Radical of(Surd value) {
        return new Radical(Rational.ONE, value, 1);
    }

    /** The positive root radicand^(1/degree) of a positive surd. */
    static Radical root(Surd radicand, int degree) {
        if (radicand.signum() <= 0) {
            throw new AssertionError("a root of what isn't positive: " + radicand);
        }
        if (degree == 1) {
            return of(radicand);
        }
        for (int m = degree; m > 1; m--) {
            Optional<Surd> root = degree % m == 0 ? exactRoot(radicand, m, degree) : Optional.empty();
            if (root.isPresent()) {
                return degree == m ? of(root.get()) : root(root.get(), degree / m);
            }
        }
        return new Radical(Rational.ONE, radicand, degree);
    }

    /** radicand^(1/m) as a surd; the square root of a rational number only where it leaves no further root over it. */
    private static Optional<Surd> exactRoot(Surd radicand, int m, int degree) {
        if (radicand.isRational()) {
            Optional<Surd> rational = SquarePart.root(radicand.u(), m).map(Surd::of);
            return rational.isEmpty() && m == 2 && degree == 2 ? radicand.squareRoot() : rational;
        }
        return m == 2 ? radicand.squareRoot() : Optional.empty();
    }

    Radical times(Rational factor) {
        if (degree == 1 || factor.isZero()) {
            return of(degree == 1 ? radicand.times(factor) : Surd.of(Rational.ZERO));
        }
        return new Radical(scale.times(factor), radicand, degree);
    }

    Radical negate() {
        return times(Rational.of(-1));
    }

    /** The value where it is rational. */
    Optional<Rational> rational() {
        return degree == 1 && radicand.isRational() ? Optional.of(radicand.u()) : Optional.empty();
    }

    int signum() {
        return degree == 1 ? radicand.signum() : scale.signum();
    }

    Formula formula() {
        if (degree == 1) {
            return radicand.formula();
        }
        Formula root = degree == 2
                ? Formulas.squareRoot(radicand.formula())
                : Formulas.power(radicand.formula(), Formulas.number(Rational.of(1, degree)));
        return Formulas.fraction(scale, root);
    }
}
