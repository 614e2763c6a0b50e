package org.pofk.exact;

import java.math.BigInteger;

/** n-th roots of whole numbers, rounded down or up. Exact; Newton's iteration from above, O(log n) rounds. */
final class IntegerRoots {
    private IntegerRoots() {
    }

    /** The largest r with r^n ≤ value, value ≥ 0, n ≥ 1. */
    static BigInteger floor(BigInteger value, int n) {
        if (n == 1 || value.signum() == 0) {
            return value;
        }
        if (n == 2) {
            return value.sqrt();
        }
        BigInteger root = BigInteger.ONE.shiftLeft((value.bitLength() + n - 1) / n);
        BigInteger degree = BigInteger.valueOf(n);
        while (true) {
            BigInteger next = root.multiply(BigInteger.valueOf(n - 1L)).add(value.divide(root.pow(n - 1)))
                    .divide(degree);
            if (next.compareTo(root) >= 0) {
                return root;
            }
            root = next;
        }
    }

    /** The smallest r with r^n ≥ value. */
    static BigInteger ceiling(BigInteger value, int n) {
        BigInteger root = floor(value, n);
        return root.pow(n).equals(value) ? root : root.add(BigInteger.ONE);
    }
}
