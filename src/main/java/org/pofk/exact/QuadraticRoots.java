package org.pofk.exact;

import java.util.List;

/** The roots of z² + bz + c with c not zero, straight from the formula. Certified. */
final class QuadraticRoots {
    private QuadraticRoots() {
    }

    /** −b/2 ± √(b²/4 − c). */
    static RealAndAbove of(Polynomial<Rational> monic) {
        Rational half = monic.coefficient(1).negate().times(Rational.HALF);
        Rational radicand = half.times(half).minus(monic.coefficient(0));
        if (radicand.isZero()) {
            throw new IllegalArgumentException("not square-free: " + monic);
        }
        Enclosed center = Enclosed.of(half);
        Enclosed distance = root(radicand.abs());
        return radicand.signum() > 0
                ? new RealAndAbove(List.of(EnclosedComplex.of(center.plus(distance)),
                        EnclosedComplex.of(center.plus(distance.negate()))), List.of())
                : new RealAndAbove(List.of(), List.of(EnclosedComplex.raising(bits ->
                        new ComplexBall(center.enclose(bits), distance.enclose(bits)))));
    }

    /** Exact where numerator and denominator are squares; then the ball is as close as a rational number's. */
    private static Enclosed root(Rational square) {
        return Enclosed.raising(bits -> Ball.of(square, 2 * bits).sqrt().roundedTo(bits));
    }
}
