package org.pofk.exact;

import java.math.BigInteger;

/** Base-two logarithms in doubles, for choosing units and starts. Approximate: they decide nothing. */
final class Logarithms {
    private Logarithms() {
    }

    /** log₂ |value|, value not zero. */
    static double approximate(BigInteger value) {
        int shift = Math.max(0, value.bitLength() - 62);
        return shift + Math.log(value.shiftRight(shift).abs().doubleValue()) / Math.log(2);
    }
}
