package org.pofk.longrun;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

class DecayBoundTest {
    private static final Enclosed ONE = Enclosed.of(Rational.ONE);
    /** z − 1/2. */
    private static final Polynomial<Rational> DECAYS =
            Polynomial.ofRationals(List.of(Rational.of(-1, 2), Rational.ONE));
    /** z² − 6/5 z + 1, whose roots (3 ± 4i)/5 lie on the unit circle and are no roots of unity. */
    private static final Polynomial<Rational> TURNS =
            Polynomial.ofRationals(List.of(Rational.ONE, Rational.of(-6, 5), Rational.ONE));

    private final AtomicInteger mostBits = new AtomicInteger();

    /** As a root is enclosed: on both sides of one, however closely. */
    private final Enclosed aboutOne = bits -> {
        mostBits.accumulateAndGet(bits, Math::max);
        return new Ball(BigInteger.ONE.shiftLeft(bits), BigInteger.ONE, bits);
    };

    @Test
    void aHalfToThePowerOfKIsBelowAMillionthFromTwentyOn() {
        DecayingMode mode = new DecayingMode(ONE, Enclosed.of(Rational.of(1, 2)), 0, DECAYS);
        assertEquals(BigInteger.valueOf(20), DecayBound.of(List.of(mode), 6).settledFrom(BigInteger.ZERO));
    }

    @Test
    void aFactorWithRootsOnTheUnitCircleThatWasNotSplitOffIsRefusedWithoutEverMoreBits() {
        for (Polynomial<Rational> factor : List.of(TURNS, TURNS.times(DECAYS),
                DECAYS.times(Polynomial.ofIntegers(-1, 1)))) {
            DecayingMode mode = new DecayingMode(ONE, aboutOne, 0, factor);
            AssertionError refused = assertThrows(AssertionError.class, () -> DecayBound.of(List.of(mode), 6));
            assertTrue(refused.getMessage().contains("was not split off"), refused.getMessage());
        }
        assertTrue(mostBits.get() < 1000, "bits: " + mostBits);
    }

    @Test
    void aModeThatGrowsIsRefused() {
        DecayingMode mode = new DecayingMode(ONE, Enclosed.of(Rational.of(3, 2)), 0,
                Polynomial.ofRationals(List.of(Rational.of(-3, 2), Rational.ONE)));
        assertThrows(AssertionError.class, () -> DecayBound.of(List.of(mode), 6));
    }
}
