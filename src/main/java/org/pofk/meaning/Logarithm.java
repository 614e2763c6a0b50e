package org.pofk.meaning;

import java.math.BigInteger;

/** Binary logarithms rounded up, in sixteenths of a bit, for bounds that are proved. */
final class Logarithm {
    static final int PER_BIT = 16;
    private static final int LEADING_BITS = 64;

    private Logarithm() {
    }

    /** At least 16·log₂ |n|; for n = 0 zero. */
    static long ofMagnitude(BigInteger n) {
        BigInteger size = n.abs();
        if (size.compareTo(BigInteger.ONE) <= 0) {
            return 0;
        }
        int dropped = size.bitLength() - LEADING_BITS;
        return dropped <= 0
                ? size.pow(PER_BIT).bitLength()
                : (long) PER_BIT * dropped + size.shiftRight(dropped).add(BigInteger.ONE).pow(PER_BIT).bitLength();
    }

    static long ofMagnitude(long n) {
        return ofMagnitude(BigInteger.valueOf(n));
    }

    static long divideUp(long value, long positive) {
        return -Math.floorDiv(-value, positive);
    }
}
