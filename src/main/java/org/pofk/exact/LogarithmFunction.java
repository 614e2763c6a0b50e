package org.pofk.exact;

import java.math.BigInteger;

/**
 * The natural logarithm of balls. Certified: taken at both ends of the ball, in ball arithmetic with guard bits. O(bits)
 * operations on numbers of that length.
 */
final class LogarithmFunction {
    /** Square roots taken before a series is summed. */
    private static final int ROOTS = 8;

    private LogarithmFunction() {
    }

    static Ball of(Ball x) {
        if (x.scale() < 0) {
            return of(x.roundedTo(0));
        }
        if (!x.isPositive()) {
            throw new NotSeparatedException("the logarithm's argument may be zero");
        }
        Ball low = ofExact(x.center().subtract(x.radius()), x.scale());
        Ball high = x.isExact() ? low : ofExact(x.center().add(x.radius()), x.scale());
        return Ball.between(low.center().subtract(low.radius()), high.center().add(high.radius()), x.scale());
    }

    /** log (m · 2^e) = log m + e log 2 with 1/2 ≤ m < 1. */
    private static Ball ofExact(BigInteger center, int scale) {
        int exponent = center.bitLength() - scale;
        int fine = scale + ROOTS + 48;
        Ball mantissa = Ball.exact(center, center.bitLength()).roundedTo(fine);
        Ball two = twiceArtanh(Ball.of(1, fine).dividedBy(Ball.of(3, fine)));
        return ofMantissa(mantissa).plus(two.times(exponent)).roundedTo(scale);
    }

    /** log m = 2^n · log of its 2^n-th root r, and log r = 2 artanh((r − 1)/(r + 1)). */
    private static Ball ofMantissa(Ball m) {
        Ball root = m;
        for (int i = 0; i < ROOTS; i++) {
            root = root.sqrt();
        }
        Ball one = Ball.of(1, m.scale());
        return twiceArtanh(root.minus(one).dividedBy(root.plus(one))).timesPowerOfTwo(ROOTS).roundedTo(m.scale());
    }

    /** 2 Σ x^(2i+1)/(2i+1) for |x| ≤ 1/2: what is left out is below the last power taken. */
    private static Ball twiceArtanh(Ball x) {
        Ball square = x.times(x);
        Ball power = x;
        Ball sum = x;
        for (int i = 1; power.center().abs().add(power.radius()).compareTo(BigInteger.TWO) > 0; i++) {
            power = power.times(square);
            sum = sum.plus(power.dividedBy(Ball.of(2L * i + 1, x.scale())));
        }
        return sum.widened(power.center().abs().add(power.radius())).times(2);
    }
}
