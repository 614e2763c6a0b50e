package org.pofk.claim;

import java.math.BigInteger;
import org.pofk.exact.Ball;
import org.pofk.exact.BinaryPowering;

/** Real numbers in balls, seen as intervals. Certified; everything at one scale. */
final class Intervals {
    private Intervals() {
    }

    /** Everything between the two, and themselves. */
    static Ball hull(Ball a, Ball b) {
        int scale = Math.max(a.scale(), b.scale());
        Ball x = a.roundedTo(scale);
        Ball y = b.roundedTo(scale);
        return Ball.between(low(x).min(low(y)), high(x).max(high(y)), scale);
    }

    /** From −|x| to |x|. */
    static Ball symmetric(Ball x) {
        return new Ball(BigInteger.ZERO, x.center().abs().add(x.radius()), x.scale());
    }

    private static BigInteger low(Ball x) {
        return x.center().subtract(x.radius());
    }

    private static BigInteger high(Ball x) {
        return x.center().add(x.radius());
    }

    /** x^exponent for an exponent of any size, at the scale of x. */
    static Ball power(Ball x, long exponent) {
        return BinaryPowering.of(Ball.of(1, x.scale()), x, exponent, Ball::times);
    }
}
