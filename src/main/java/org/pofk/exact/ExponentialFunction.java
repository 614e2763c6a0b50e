package org.pofk.exact;

import java.math.BigInteger;

/**
 * e^x of balls. Certified: taken at both ends of the ball, in ball arithmetic with guard bits. O(bits) operations on
 * numbers of that length.
 */
final class ExponentialFunction {
    /** Times the argument is halved beyond what brings it below one. */
    private static final int HALVINGS = 8;
    private static final int LARGEST_ARGUMENT_BITS = 19;

    private ExponentialFunction() {
    }

    static Ball of(Ball x) {
        if (x.scale() < 0) {
            return of(x.roundedTo(0));
        }
        Ball low = ofExact(x.center().subtract(x.radius()), x.scale());
        if (x.isExact()) {
            return low;
        }
        Ball high = ofExact(x.center().add(x.radius()), x.scale());
        return Ball.between(low.center().subtract(low.radius()).max(BigInteger.ZERO),
                high.center().add(high.radius()), x.scale());
    }

    /** e^|x| by halving, a series and squaring; its inverse for a negative x. */
    private static Ball ofExact(BigInteger center, int scale) {
        int length = Math.max(0, center.abs().bitLength() - scale);
        if (length > LARGEST_ARGUMENT_BITS) {
            throw new ArithmeticException("e to the power of a number with " + length + " bits before the point");
        }
        // e^x < 2^(3x/2 + 1); squaring doubles the relative error, and the number itself has that many bits in front
        int inFront = center.abs().shiftRight(scale).intValueExact() * 3 / 2 + 3;
        int halvings = length + HALVINGS;
        int fine = scale + inFront + halvings + 16;
        Ball power = series(Ball.exact(center.abs(), scale).roundedTo(fine).timesPowerOfTwo(-halvings).roundedTo(fine));
        for (int i = 0; i < halvings; i++) {
            power = power.times(power);
        }
        return (center.signum() < 0 ? Ball.of(1, fine).dividedBy(power) : power).roundedTo(scale);
    }

    /** Σ x^i / i! for 0 ≤ x < 1/2: what is left out is below the last term taken. */
    private static Ball series(Ball x) {
        Ball term = Ball.of(1, x.scale());
        Ball sum = term;
        for (int i = 1; term.center().add(term.radius()).compareTo(BigInteger.TWO) > 0; i++) {
            term = term.times(x).dividedBy(i);
            sum = sum.plus(term);
        }
        return sum.widened(term.center().abs().add(term.radius()));
    }
}
