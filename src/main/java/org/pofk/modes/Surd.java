package org.pofk.modes;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/**
 * u + v√d, a real number of degree at most two. Canonical form: d a positive integer with its cheap square part taken
 * out ({@link SquarePart}); v = 0 exactly when d = 1. Exact.
 */
record Surd(Rational u, Rational v, BigInteger d) {

    /** u + v√radicand for a rational radicand ≥ 0. */
    static Surd of(Rational u, Rational v, Rational radicand) {
        if (v.isZero() || radicand.isZero()) {
            return of(u);
        }
        SquarePart part = SquarePart.of(radicand.numerator().multiply(radicand.denominator()));
        Rational scale = v.times(new Rational(part.root(), radicand.denominator()));
        return part.free().equals(BigInteger.ONE)
                ? of(u.plus(scale))
                : new Surd(u, scale, part.free());
    }

    static Surd of(Rational value) {
        return new Surd(value, Rational.ZERO, BigInteger.ONE);
    }

    boolean isRational() {
        return v.isZero();
    }

    Surd times(Rational factor) {
        return factor.isZero() ? of(Rational.ZERO) : new Surd(u.times(factor), v.times(factor), d);
    }

    /** −1, 0 or 1, decided on u² and v²d. */
    int signum() {
        int first = u.signum();
        int second = v.signum();
        if (first == 0 || second == 0 || first == second) {
            return first != 0 ? first : second;
        }
        return first * u.times(u).compareTo(v.times(v).times(Rational.of(d)));
    }

    /** √(u + v√d) where it has the form a + b√e again; this surd is positive. */
    Optional<Surd> squareRoot() {
        return isRational() ? Optional.of(of(Rational.ZERO, Rational.ONE, u)) : denested();
    }

    /** a² + b²d = u and 2ab = v have a rational solution when √(u² − v²d) =: t and one of √((u ± t)/2) are rational. */
    private Optional<Surd> denested() {
        Optional<Rational> t = SquarePart.root(u.times(u).minus(v.times(v).times(Rational.of(d))));
        if (t.isEmpty()) {
            return Optional.empty();
        }
        for (Rational signed : List.of(t.get(), t.get().negate())) {
            Optional<Rational> a = SquarePart.root(u.plus(signed).times(Rational.HALF));
            if (a.isPresent() && !a.get().isZero()) {
                Surd root = new Surd(a.get(), v.dividedBy(a.get()).times(Rational.HALF), d);
                return Optional.of(root.signum() < 0 ? root.times(Rational.of(-1)) : root);
            }
        }
        return Optional.empty();
    }

    /** 1/5 + √2/10: the rational part first, each radical over its own denominator. */
    Formula formula() {
        List<Formula> terms = new ArrayList<>();
        if (!u.isZero() || v.isZero()) {
            terms.add(Formulas.number(u));
        }
        if (!v.isZero()) {
            terms.add(Formulas.fraction(v, Formulas.squareRoot(Formulas.number(Rational.of(d)))));
        }
        return Formulas.sum(terms);
    }
}
