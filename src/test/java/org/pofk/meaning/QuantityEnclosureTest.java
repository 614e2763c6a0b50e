package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Random;
import org.apfloat.Apcomplex;
import org.apfloat.ApcomplexMath;
import org.apfloat.Apfloat;
import org.apfloat.ApfloatMath;
import org.apfloat.Aprational;
import org.apfloat.Apint;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.text.Position;
import org.pofk.text.Span;

/** Enclosures against another library's arithmetic with 50 digits, over expressions drawn at random. */
class QuantityEnclosureTest {
    private static final long SEED = 20261201;
    private static final int DIGITS = 50;
    private static final int BITS = 100;

    /** The same number twice. */
    private record Both(Quantity quantity, Apcomplex other) {
    }

    private final Random random = new Random(SEED);

    private Both leaf() {
        switch (random.nextInt(4)) {
            case 0:
                return new Both(Quantity.pi(), ApfloatMath.pi(DIGITS));
            case 1:
                return new Both(Quantity.i(), new Apcomplex(new Apfloat(0), new Apfloat(1, DIGITS)));
            default:
                int p = 1 + random.nextInt(30);
                int q = 1 + random.nextInt(30);
                int sign = random.nextBoolean() ? 1 : -1;
                return new Both(Quantity.of(Rational.of((long) sign * p, q)),
                        new Aprational(new Apint(sign * p), new Apint(q)).precision(DIGITS));
        }
    }

    private Both drawn(int depth) {
        if (depth == 0) {
            return leaf();
        }
        Both a = drawn(depth - 1);
        Both b = drawn(depth - 1);
        switch (random.nextInt(9)) {
            case 0:
                return new Both(a.quantity.plus(b.quantity), a.other.add(b.other));
            case 1:
                return new Both(a.quantity.minus(b.quantity), a.other.subtract(b.other));
            case 2:
                return new Both(a.quantity.times(b.quantity), a.other.multiply(b.other));
            case 3:
                return isSmall(b) ? a : new Both(a.quantity.dividedBy(b.quantity), a.other.divide(b.other));
            case 4:
                return new Both(a.quantity.pow(3), ApcomplexMath.pow(a.other, 3));
            case 5:
                return isSmall(a) || nearCut(a) ? b : new Both(a.quantity.squareRoot(), ApcomplexMath.sqrt(a.other));
            case 6:
                return ApfloatMath.abs(a.other.real()).compareTo(new Apfloat(40)) > 0
                        || ApfloatMath.abs(a.other.imag()).compareTo(new Apfloat(1000)) > 0
                        ? b
                        : new Both(a.quantity.exponential(), ApcomplexMath.exp(a.other));
            case 7:
                return new Both(a.quantity.realPart().arctangent(), ApfloatMath.atan(a.other.real()));
            default:
                return new Both(a.quantity.conjugate(), a.other.conj());
        }
    }

    private static boolean isSmall(Both number) {
        return ApcomplexMath.abs(number.other).compareTo(new Apfloat("1e-20")) < 0;
    }

    private static boolean nearCut(Both number) {
        return number.other.real().signum() < 0
                && ApfloatMath.abs(number.other.imag()).compareTo(new Apfloat("1e-20")) < 0;
    }

    private static Rational rational(Apfloat value) {
        return value.signum() == 0 ? Rational.ZERO : Rational.parse(value.toString());
    }

    /** Both parts within the ball, widened by 1e-25 of the number for the other library's rounding. */
    private static boolean holds(ComplexBall ball, Apcomplex number) {
        Rational size = Rational.max(Rational.ONE, rational(ApcomplexMath.abs(number)).abs());
        Rational slack = size.times(Rational.of(10).pow(-25));
        return holds(ball.real(), rational(number.real()), slack) && holds(ball.imaginary(), rational(number.imag()), slack);
    }

    private static boolean holds(Ball ball, Rational number, Rational slack) {
        return ball.lower().minus(slack).compareTo(number) <= 0 && number.compareTo(ball.upper().plus(slack)) <= 0;
    }

    @Test
    void enclosuresHoldWhatAnotherLibraryFinds() {
        int compared = 0;
        for (int i = 0; i < 60; i++) {
            Both number = drawn(1 + i % 3);
            if (ApcomplexMath.abs(number.other).compareTo(new Apfloat("1e30")) < 0) {
                ComplexBall ball = number.quantity.enclose(BITS);
                assertTrue(ball.isWithin(BITS), () -> number.quantity + " with seed " + SEED);
                assertTrue(holds(ball, number.other), () -> number.quantity + " is " + ball + " or " + number.other);
                assertTrue(holds(number.quantity.spread(BITS), number.other), () -> number.quantity + " spread");
                compared++;
            }
        }
        assertTrue(compared >= 50, "compared " + compared);
    }

    private static Written written(String text, int column) {
        Position place = new Position("claims", 1, column);
        return Written.of(text, new Span(place, place), Precision.AS_WRITTEN);
    }

    /** Decimals drawn within half a unit give values within the spread one. */
    @Test
    void spreadHoldsEveryValueTheDecimalsAllow() {
        Written a = written("0.45", 1);
        Written b = written("1.3", 2);
        Quantity x = Quantity.of(a);
        Quantity y = Quantity.of(b);
        List<Quantity> expressions = List.of(x.plus(y), x.times(y), x.dividedBy(y), x.pow(5).minus(y), y.squareRoot(),
                x.negate().exponential(), x.plus(y).cosine(), y.sine().times(x), x.arctangent(), x.arccosine(),
                Quantity.i().times(x).plus(y).squareRoot(), y.logarithm(), y.root(3), x.minus(y).squareRoot());
        int held = 0;
        for (Quantity expression : expressions) {
            ComplexBall spread = expression.spread(60);
            assertEquals(2, expression.plus(x.minus(x)).plus(y.minus(y)).decimals().size());
            for (int i = 0; i < 40; i++) {
                Map<Written, Quantity> drawn = Map.of(a, within(a), b, within(b));
                ComplexBall value = expression.with(drawn).enclose(100);
                assertTrue(spread.overlaps(value), () -> expression + " spread " + spread + " misses " + value);
                held++;
            }
        }
        assertEquals(560, held);
        assertTrue(x.times(y).spread(60).real().radius().bitLength() > 0);
    }

    private Quantity within(Written decimal) {
        Rational part = Rational.of(random.nextInt(2001) - 1000L, 1000);
        return Quantity.of(decimal.value().plus(decimal.halfUnit().times(part)));
    }

    @Test
    void logarithmAndExponentialUndoEachOther() {
        int undone = 0;
        for (int p = 1; p <= 40; p++) {
            Quantity x = Quantity.of(Rational.of((long) p * p, 7));
            Quantity difference = x.logarithm().plus(Quantity.ZERO.minus(Quantity.of(0))).times(Rational.HALF)
                    .exponential().minus(x.squareRoot());
            assertTrue(difference.enclose(300).containsZero());
            assertTrue(difference.enclose(300).isWithin(300));
            undone++;
        }
        assertEquals(40, undone);
    }
}
