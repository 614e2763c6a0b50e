package org.pofk.exact;

import java.math.BigInteger;

/**
 * A disc around (x + iy) · 2^−scale of radius 2^radiusExponent. Radii are powers of two so that bounds are sums of
 * whole numbers. y = 0 stands for a center on the real axis.
 */
record Disc(BigInteger x, BigInteger y, int scale, int radiusExponent) {

    boolean isOnAxis() {
        return y.signum() == 0;
    }

    /** 2^this is at most |center|; very small for zero. */
    int leastExponent() {
        return leastExponent(x, y) - scale;
    }

    /** 2^this ≤ |a + ib| for whole a and b; very small for zero. */
    static int leastExponent(BigInteger a, BigInteger b) {
        int length = Math.max(a.abs().bitLength(), b.abs().bitLength());
        return length == 0 ? Integer.MIN_VALUE / 4 : length - 1;
    }

    /** 2^this ≤ distance between the centers. */
    int distanceExponent(Disc other) {
        int common = Math.max(scale, other.scale);
        BigInteger across = x.shiftLeft(common - scale).subtract(other.x.shiftLeft(common - other.scale));
        BigInteger up = y.shiftLeft(common - scale).subtract(other.y.shiftLeft(common - other.scale));
        return leastExponent(across, up) - common;
    }

    /** A rectangle that holds the disc, its radii at most 5/4 of the disc's radius. */
    ComplexBall rectangle() {
        int fine = 2 - radiusExponent;
        ComplexBall center = new ComplexBall(Ball.exact(x, scale), Ball.exact(y, scale)).roundedTo(fine);
        BigInteger radius = BigInteger.valueOf(4);
        return new ComplexBall(center.real().widened(radius),
                isOnAxis() ? center.imaginary() : center.imaginary().widened(radius));
    }
}
