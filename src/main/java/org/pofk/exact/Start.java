package org.pofk.exact;

import java.math.BigInteger;

/**
 * A guess at a root, (x + iy) · 2^−scale, with how far off it probably is: 2^doubtExponent. Approximate: whatever
 * comes of it is proved afterwards.
 */
record Start(BigInteger x, BigInteger y, int scale, int doubtExponent) {
    private static final int MANTISSA_BITS = 53;

    /** A guess in doubles, not zero. */
    static Start of(double re, double im, double doubt) {
        int scale = MANTISSA_BITS - Math.getExponent(Math.max(Math.abs(re), Math.abs(im)));
        return new Start(fixed(re, scale), fixed(im, scale), scale, Math.getExponent(doubt) + 1);
    }

    private static BigInteger fixed(double value, int scale) {
        return BigInteger.valueOf(Math.round(Math.scalb(value, scale)));
    }

    /** As near to the axis as makes no difference. */
    boolean mayBeReal() {
        return y.bitLength() - scale <= doubtExponent;
    }

    boolean isAbove() {
        return y.signum() > 0;
    }

    Start onAxis() {
        return new Start(x, BigInteger.ZERO, scale, doubtExponent);
    }
}
