package org.pofk.modes;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.exact.Root;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/**
 * All roots of q as center + scale √radicand cos(turn · 2πj/order), j coprime to the order: the poles of walks to and
 * fro, on a ring (turn 1, radicand 1) or between ends (turn 1/2; Feller, An Introduction to Probability Theory and Its
 * Applications I, XIV.5, from memory). Proved: with z = center + f (w + 1/w) the polynomial w^m q(z) is a multiple of
 * the cyclotomic one. Exact; m² operations for each of a few orders.
 */
record CosineForm(Rational center, Rational scale, Rational radicand, Rational turn, int order) {
    /** n/φ(n) is below this for every n that is searched (largest at 210: 4.375). */
    private static final int ORDER_TO_TOTIENT = 5;

    /** Empty where q has degree below 3 (a surd says it better), above the degree searched, or no such form. */
    static Optional<CosineForm> of(Polynomial<Rational> q) {
        if (q.degree() < 3 || q.degree() > NumberField.SEARCHED_UP_TO) {
            return Optional.empty();
        }
        Optional<CosineForm> ring = Line.through(q).map(line -> new CosineForm(line.center,
                line.factor.times(Rational.TWO), Rational.ONE, Rational.ONE, line.order));
        return ring.isPresent() ? ring : betweenEnds(q);
    }

    /** With the roots' mean m: (λ − m)² = 2c + c · 2cos(2πj/N) is 4c cos²(πj/N). */
    private static Optional<CosineForm> betweenEnds(Polynomial<Rational> q) {
        Rational mean = q.coefficient(q.degree() - 1).negate().dividedBy(Rational.of(q.degree()));
        Polynomial<Rational> centered = composed(q, mean);
        List<Rational> squares = new ArrayList<>();
        for (int power = 0; power <= q.degree(); power++) {
            if (power % 2 == 0) {
                squares.add(centered.coefficient(power));
            } else if (!centered.coefficient(power).isZero()) {
                return Optional.empty();
            }
        }
        return Line.through(Polynomial.ofRationals(squares))
                .filter(line -> line.center.equals(line.factor.times(Rational.TWO)) && line.factor.signum() > 0)
                .map(line -> new CosineForm(mean, Rational.TWO, line.factor, Rational.HALF, line.order));
    }

    /** This root of q written out: 1/2 − 1/2 cos(π/7). */
    Formula formula(Root root) {
        List<Rational> left = new ArrayList<>();
        for (int j = 1; turn.times(Rational.of(2L * j, order)).compareTo(Rational.ONE) < 0; j++) {
            if (BigInteger.valueOf(j).gcd(BigInteger.valueOf(order)).equals(BigInteger.ONE)) {
                left.add(turn.times(Rational.of(2L * j, order)));
            }
        }
        for (int bits = 32; left.size() > 1; bits *= 2) {
            int precision = bits;
            Ball number = root.enclose(bits).real();
            left.removeIf(fraction -> !at(fraction, precision).overlaps(number));
        }
        return written(left.get(0));
    }

    private Ball at(Rational fraction, int bits) {
        Ball angle = Ball.pi(bits).times(Ball.of(fraction, bits));
        Ball amplitude = Ball.of(scale, bits).times(Ball.of(radicand, bits).sqrt());
        return Ball.of(center, bits).plus(amplitude.times(angle.cos()));
    }

    /** With an angle below π/2. */
    private Formula written(Rational fraction) {
        boolean isObtuse = fraction.compareTo(Rational.HALF) > 0;
        Surd amplitude = Surd.of(Rational.ZERO, isObtuse ? scale.negate() : scale, radicand);
        Formula angle = new Angle.PiMultiple(isObtuse ? Rational.ONE.minus(fraction) : fraction).formula();
        Formula cosine = Formulas.product(List.of(amplitude.formula(), Formulas.call(Formula.Function.COS, angle)));
        return center.isZero() ? cosine : Formulas.sum(List.of(Formulas.number(center), cosine));
    }

    /** q(z + shift). */
    private static Polynomial<Rational> composed(Polynomial<Rational> q, Rational shift) {
        Polynomial<Rational> moved = Polynomial.ofRationals(List.of(shift, Rational.ONE));
        Polynomial<Rational> sum = Polynomial.zero(RationalField.Q);
        for (int power = q.degree(); power >= 0; power--) {
            sum = sum.times(moved).plus(Polynomial.constant(RationalField.Q, q.coefficient(power)));
        }
        return sum;
    }

    /** Roots center + factor · 2cos(2πj/order). */
    private record Line(Rational center, Rational factor, int order) {

        /** Mean and spread of the m roots leave two candidates for each order with φ(order) = 2m. */
        static Optional<Line> through(Polynomial<Rational> q) {
            int m = q.degree();
            for (int order = 3; order <= ORDER_TO_TOTIENT * 2 * m; order++) {
                if (Cyclotomic.totient(order) == 2 * m) {
                    Polynomial<Rational> cyclotomic = Cyclotomic.polynomial(order);
                    Moments own = Moments.of(q);
                    Moments cosines = Moments.of(cyclotomic).ofCosines(m);
                    Optional<Rational> factor = SquarePart.root(own.spread(m).dividedBy(cosines.spread(m)));
                    for (Rational signed : factor.map(f -> List.of(f, f.negate())).orElse(List.of())) {
                        Rational center = own.first.minus(signed.times(cosines.first)).dividedBy(Rational.of(m));
                        Line line = new Line(center, signed, order);
                        if (line.holds(q, cyclotomic)) {
                            return Optional.of(line);
                        }
                    }
                }
            }
            return Optional.empty();
        }

        /** w^m q(center + factor (w + 1/w)) against the cyclotomic polynomial. */
        private boolean holds(Polynomial<Rational> q, Polynomial<Rational> cyclotomic) {
            Polynomial<Rational> step = Polynomial.ofRationals(List.of(factor, center, factor));
            Polynomial<Rational> sum = Polynomial.zero(RationalField.Q);
            for (int power = q.degree(); power >= 0; power--) {
                sum = sum.times(step).plus(
                        Polynomial.monomial(RationalField.Q, q.coefficient(power), q.degree() - power));
            }
            return sum.monic().equals(cyclotomic);
        }
    }

    /** Σ λ and Σ λ² over the roots of a polynomial. */
    private record Moments(Rational first, Rational second) {

        /** By Newton's identities, for a monic polynomial of degree at least two. */
        static Moments of(Polynomial<Rational> monic) {
            Rational first = monic.coefficient(monic.degree() - 1).negate();
            return new Moments(first, first.times(first)
                    .minus(monic.coefficient(monic.degree() - 2).times(Rational.TWO)));
        }

        /** From the sums over ζ those over ζ + 1/ζ, one for each of m pairs. */
        Moments ofCosines(int m) {
            return new Moments(first, second.plus(Rational.of(2L * m)));
        }

        /** Σ (λ − mean)² over m roots. */
        Rational spread(int m) {
            return second.minus(first.times(first).dividedBy(Rational.of(m)));
        }
    }
}
