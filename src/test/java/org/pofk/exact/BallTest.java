package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.OptionalInt;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BallTest {
    /** A number and a ball that holds it somewhere. */
    record Held(Rational number, Ball ball) {
    }

    @Provide
    Arbitrary<Held> held() {
        Arbitrary<Rational> numbers = Combinators.combine(Arbitraries.longs().between(-1_000_000, 1_000_000),
                Arbitraries.longs().between(1, 10_000)).as(Rational::of);
        return Combinators.combine(numbers, Arbitraries.integers().between(-3, 80),
                Arbitraries.longs().between(0, 50), Arbitraries.longs().between(-50, 50))
                .as((number, scale, extra, off) -> {
                    Ball around = Ball.of(number, scale);
                    return new Held(number, new Ball(around.center().add(BigInteger.valueOf(off)),
                            around.radius().add(BigInteger.valueOf(Math.abs(off) + extra)), scale));
                });
    }

    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void arithmeticHoldsTheExactResult(@ForAll("held") Held a, @ForAll("held") Held b) {
        assertTrue(a.ball.contains(a.number));
        assertTrue(a.ball.plus(b.ball).contains(a.number.plus(b.number)));
        assertTrue(a.ball.minus(b.ball).contains(a.number.minus(b.number)));
        assertTrue(a.ball.times(b.ball).contains(a.number.times(b.number)));
        assertTrue(a.ball.times(-7).contains(a.number.times(Rational.of(-7))));
        assertTrue(a.ball.dividedBy(-7).contains(a.number.dividedBy(Rational.of(-7))));
        assertTrue(a.ball.abs().contains(a.number.abs()));
        assertTrue(a.ball.negate().contains(a.number.negate()));
        if (b.ball.containsZero()) {
            assertThrows(NotSeparatedException.class, () -> a.ball.dividedBy(b.ball));
        } else {
            assertTrue(a.ball.dividedBy(b.ball).contains(a.number.dividedBy(b.number)));
        }
    }

    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void roundingAndPowersHoldTheExactResult(@ForAll("held") Held a, @ForAll @IntRange(min = -5, max = 90) int scale,
            @ForAll @IntRange(min = -3, max = 6) int exponent) {
        assertTrue(a.ball.roundedTo(scale).contains(a.number));
        assertEquals(scale, a.ball.roundedTo(scale).scale());
        assertTrue(a.ball.timesPowerOfTwo(scale).contains(a.number.times(Rational.TWO.pow(scale))));
        if (exponent >= 0) {
            assertTrue(a.ball.pow(exponent).contains(a.number.pow(exponent)));
        } else if (a.ball.abs().lower().compareTo(Rational.ONE) > 0) {
            assertTrue(a.ball.pow(exponent).contains(a.number.pow(exponent)));
        }
    }

    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void rootsHoldTheExactResult(@ForAll("held") Held a, @ForAll @IntRange(min = 1, max = 7) int n) {
        Ball positive = a.ball.abs();
        Ball root = positive.root(n);
        assertTrue(Rational.max(Rational.ZERO, root.lower()).pow(n).compareTo(a.number.abs()) <= 0);
        assertTrue(root.upper().pow(n).compareTo(a.number.abs()) >= 0);
    }

    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void signsAndBoundsAreThoseOfEveryNumberInTheBall(@ForAll("held") Held a, @ForAll("held") Held b) {
        OptionalInt sign = a.ball.sign();
        assertEquals(sign.isPresent(), a.ball.lower().signum() == a.ball.upper().signum());
        assertTrue(sign.isEmpty() || sign.getAsInt() == a.number.signum());
        boolean apart = a.ball.upper().compareTo(b.ball.lower()) < 0 || b.ball.upper().compareTo(a.ball.lower()) < 0;
        assertEquals(apart, !a.ball.overlaps(b.ball));
        Rational radius = a.ball.upper().minus(a.ball.lower()).times(Rational.HALF);
        if (a.ball.isWithin(10)) {
            assertTrue(radius.compareTo(Rational.max(Rational.ONE, a.number.abs()).times(Rational.TWO.pow(-10))) <= 0);
        }
    }

    /** The functions are only compared with doubles here; the identities below are exact. */
    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void functionsLieWhereDoublesPutThem(@ForAll("held") Held a) {
        double x = a.number.approximate();
        Ball fine = Ball.of(a.number, 90);
        holds(Math.atan(x), fine.arctan());
        holds(Math.cos(x), fine.cos());
        holds(Math.sin(x), fine.sin());
        assertTrue(a.ball.arctan().overlaps(fine.arctan()));
        assertTrue(a.ball.cos().overlaps(fine.cos()));
        assertTrue(a.ball.sin().overlaps(fine.sin()));
    }

    private static void holds(double expected, Ball found) {
        assertTrue(found.isWithin(80), found.toString());
        assertEquals(expected, found.middle().approximate(), 1e-9);
    }

    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void trigonometricIdentitiesHold(@ForAll("held") Held a, @ForAll("held") Held b) {
        Ball x = Ball.of(a.number, 120);
        Ball y = Ball.of(b.number, 120);
        assertTrue(x.cos().pow(2).plus(x.sin().pow(2)).contains(Rational.ONE));
        assertTrue(x.plus(y).cos().overlaps(x.cos().times(y.cos()).minus(x.sin().times(y.sin()))));
        Rational cosine = a.number.dividedBy(Rational.of(1_500_000));
        Ball angle = Ball.of(cosine, 120).arccos();
        assertTrue(angle.cos().contains(cosine));
        assertTrue(angle.isWithin(110));
        if (!a.number.isZero() || !b.number.isZero()) {
            Ball turn = Ball.argument(y, x);
            Ball modulus = new ComplexBall(x, y).modulus();
            assertTrue(turn.cos().times(modulus).contains(a.number));
            assertTrue(turn.sin().times(modulus).contains(b.number));
            assertTrue(turn.abs().lower().compareTo(Ball.pi(120).upper()) <= 0);
        }
    }

    /** OEIS A000796 (π), A002193 (√2), A001622 (golden ratio): 50 digits. */
    @ParameterizedTest
    @CsvSource({"pi,3.1415926535897932384626433832795028841971693993751",
        "sqrt2,1.4142135623730950488016887242096980785696718753769",
        "golden,1.6180339887498948482045868343656381177203091798058"})
    void knownDigits(String name, String digits) {
        Enclosed value = switch (name) {
            case "pi" -> Enclosed.pi();
            case "sqrt2" -> Enclosed.of(Rational.TWO).map(x -> x.roundedTo(200).sqrt());
            default -> Enclosed.of(Rational.of(5)).map(x ->
                    x.roundedTo(200).sqrt().plus(Ball.of(1, 200)).timesPowerOfTwo(-1));
        };
        assertEquals(digits, Decimals.of(value, 50).text());
    }

    @Test
    void exactAnglesAreHeldAndTheCutIsContinuous() {
        assertTrue(Ball.of(Rational.HALF, 100).arccos().times(3).overlaps(Ball.pi(100)));
        assertTrue(Ball.of(1, 100).arctan().times(4).overlaps(Ball.pi(100)));
        Ball minusOne = Ball.of(-1, 100);
        assertTrue(Ball.argument(Ball.of(0, 100), minusOne).overlaps(Ball.pi(100)));
        Ball around = Ball.argument(Ball.of(0, 100).widened(BigInteger.TEN), minusOne);
        assertTrue(around.overlaps(Ball.pi(100)) && around.isWithin(90));
        assertTrue(Ball.argument(Ball.of(Rational.of(-1, 1000), 100), minusOne).isNegative());
        assertThrows(NotSeparatedException.class,
                () -> Ball.argument(Ball.of(0, 100).widened(BigInteger.ONE), Ball.of(0, 100)));
        assertEquals(OptionalInt.of(0), Ball.of(0, 10).sign());
        assertFalse(Ball.of(0, 10).widened(BigInteger.ONE).sign().isPresent());
    }
}
