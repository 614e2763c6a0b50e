package org.pofk.meaning;

import java.math.BigInteger;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;

/**
 * Whole powers of balls, no wider than what the ball allows where it is real and isn't around zero: a wide ball, as
 * that of a decimal with few digits, is raised by its two ends. Certified; twice the cost of {@link Ball#pow} there.
 */
final class Powers {
    private static final int ROUNDING = 16;

    private Powers() {
    }

    /** base^exponent; a {@link org.pofk.exact.NotSeparatedException} for a negative power of what may be zero. */
    static ComplexBall of(ComplexBall base, int exponent) {
        boolean isReal = base.imaginary().isExact() && base.imaginary().center().signum() == 0;
        return isReal ? new ComplexBall(of(base.real(), exponent), base.imaginary()) : base.pow(exponent);
    }

    static Ball of(Ball base, int exponent) {
        if (exponent == 0 || exponent == 1 || base.containsZero()) {
            return base.pow(exponent);
        }
        if (base.isNegative()) {
            Ball power = of(base.negate(), exponent);
            return (exponent & 1) == 0 ? power : power.negate();
        }
        return exponent < 0 ? raised(inverse(base), Math.negateExact(exponent)) : raised(base, exponent);
    }

    private static Ball raised(Ball positive, int exponent) {
        return isNarrow(positive) ? positive.pow(exponent)
                : hull(low(positive).pow(exponent), high(positive).pow(exponent));
    }

    /** No wider than what rounding makes it: then by its ends isn't better. */
    private static boolean isNarrow(Ball ball) {
        return ball.radius().bitLength() <= ROUNDING;
    }

    private static Ball inverse(Ball positive) {
        Ball one = Ball.of(1, positive.scale());
        return hull(one.dividedBy(high(positive)), one.dividedBy(low(positive)));
    }

    private static Ball low(Ball ball) {
        return Ball.exact(ball.center().subtract(ball.radius()), ball.scale());
    }

    private static Ball high(Ball ball) {
        return Ball.exact(ball.center().add(ball.radius()), ball.scale());
    }

    /** From the lower end of the lower one to the upper end of the upper one; both at one scale. */
    private static Ball hull(Ball lower, Ball upper) {
        BigInteger bottom = lower.center().subtract(lower.radius());
        BigInteger top = upper.center().add(upper.radius());
        return Ball.between(bottom, top, lower.scale());
    }
}
