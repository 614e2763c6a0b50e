package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Ball;
import org.pofk.steps.KnownValue;

class KnownTextTest {
    private static final int SCALE = 120;

    @Test
    void whatIsWithinItsErrorOfZeroOrOneIsToldByABound() {
        BigInteger radius = BigInteger.TWO.pow(20);
        BigInteger one = BigInteger.ONE.shiftLeft(SCALE);
        // 2^-99 is 1.58e-30, a tenth more 1.7e-30
        assertEquals("below 1.7e-30", KnownText.of(KnownValue.within(new Ball(radius, radius, SCALE)), 6));
        assertEquals("above 1 − 1.7e-30",
                KnownText.of(KnownValue.within(new Ball(one.subtract(radius), radius, SCALE)), 6));
    }
}
