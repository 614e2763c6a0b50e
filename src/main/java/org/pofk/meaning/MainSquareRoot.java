package org.pofk.meaning;

import java.math.BigInteger;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;

/**
 * √(x + iy) of a rectangle: √((|z| + x)/2) ± i √((|z| − x)/2), of the sign of y; where one of the two is known to be
 * positive the other is |y| over twice it. Certified. A rectangle that reaches over the negative axis gives both sides.
 */
final class MainSquareRoot {
    private MainSquareRoot() {
    }

    static ComplexBall of(ComplexBall z) {
        Ball x = z.real();
        Ball y = z.imaginary();
        if (y.isExact() && y.center().signum() == 0) {
            return ofReal(x);
        }
        if (x.isPositive()) {
            Ball across = half(z.modulus().plus(x)).sqrt();
            return new ComplexBall(across, y.dividedBy(across.times(2)));
        }
        Ball up = half(z.modulus().minus(x)).sqrt();
        if (y.containsZero() || up.containsZero()) {
            return new ComplexBall(half(z.modulus().plus(x)).sqrt(), upTo(up.center().add(up.radius()), up.scale()));
        }
        Ball across = y.abs().dividedBy(up.times(2));
        return new ComplexBall(across, y.isNegative() ? up.negate() : up);
    }

    /** Of a rectangle over the negative axis around a number known to lie on it, or not; or not known. */
    static ComplexBall besideCut(ComplexBall z, Decision real) {
        return switch (real) {
            case YES -> ofReal(z.real());
            case NO -> of(z);
            case UNDECIDED -> throw new UndecidedException("on which side of its cut a square root is taken");
        };
    }

    private static ComplexBall ofReal(Ball x) {
        Ball zero = Ball.of(0, x.scale());
        if (x.isNegative()) {
            return new ComplexBall(zero, x.negate().sqrt());
        }
        return x.containsZero() && !x.isExact()
                ? new ComplexBall(x.sqrt(), x.negate().sqrt())
                : ComplexBall.of(x.sqrt());
    }

    private static Ball half(Ball x) {
        return x.timesPowerOfTwo(-1).roundedTo(x.scale());
    }

    private static Ball upTo(BigInteger bound, int scale) {
        return new Ball(BigInteger.ZERO, bound, scale);
    }
}
