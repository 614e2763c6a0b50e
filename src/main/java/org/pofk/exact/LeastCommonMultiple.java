package org.pofk.exact;

import java.math.BigInteger;

/** The least positive number that both of two positive numbers divide. Exact; a gcd each. */
public final class LeastCommonMultiple {
    private LeastCommonMultiple() {
    }

    public static BigInteger of(BigInteger a, BigInteger b) {
        return a.divide(a.gcd(b)).multiply(b);
    }

    /** Throws an ArithmeticException where it is no long. */
    public static long of(long a, long b) {
        return of(BigInteger.valueOf(a), BigInteger.valueOf(b)).longValueExact();
    }
}
