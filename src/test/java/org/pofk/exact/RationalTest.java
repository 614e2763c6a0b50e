package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** Held against fractions brought to one denominator and reduced in one go. */
class RationalTest {
    private static final Polynomial<Rational> Z = Polynomial.ofIntegers(0, 1);

    private static List<Rational> samples() {
        Random random = new Random(5);
        List<Rational> samples = new ArrayList<>(List.of(Rational.ZERO, Rational.ONE, Rational.HALF, Rational.of(-3)));
        for (int i = 0; i < 60; i++) {
            BigInteger numerator = new BigInteger(1 + i % 9 * 20, random).multiply(BigInteger.valueOf(12));
            BigInteger denominator = i % 3 == 0 ? BigInteger.ONE.shiftLeft(i)
                    : new BigInteger(3 + i % 7 * 15, random).add(BigInteger.ONE).multiply(BigInteger.valueOf(i % 2 + 9));
            samples.add(new Rational(random.nextBoolean() ? numerator : numerator.negate(), denominator));
        }
        return samples;
    }

    @Test
    void sumsProductsAndOrderAreThoseOfFractions() {
        int compared = 0;
        for (Rational a : samples()) {
            for (Rational b : samples()) {
                assertIs(a.numerator().multiply(b.denominator()).add(b.numerator().multiply(a.denominator())),
                        a.denominator().multiply(b.denominator()), a.plus(b));
                assertIs(a.numerator().multiply(b.numerator()), a.denominator().multiply(b.denominator()), a.times(b));
                if (!b.isZero()) {
                    assertIs(a.numerator().multiply(b.denominator()), a.denominator().multiply(b.numerator()),
                            a.dividedBy(b));
                }
                assertEquals(a.minus(b).signum(), a.compareTo(b), a + " and " + b);
                compared++;
            }
        }
        assertEquals(64 * 64, compared);
    }

    @Test
    void powersAndInversesStayInLowestTerms() {
        for (Rational a : samples()) {
            assertEquals(a.times(a).times(a), a.pow(3));
            if (!a.isZero()) {
                assertIs(a.denominator(), a.numerator(), a.inverse());
                assertEquals(Rational.ONE, a.pow(-2).times(a).times(a));
            }
        }
        assertThrows(ArithmeticException.class, Rational.ZERO::inverse);
        assertThrows(ArithmeticException.class, () -> Rational.ONE.dividedBy(Rational.ZERO));
    }

    /** One coprime pair of numbers stands for each value. */
    private static void assertIs(BigInteger numerator, BigInteger denominator, Rational found) {
        BigInteger divisor = numerator.gcd(denominator).multiply(BigInteger.valueOf(denominator.signum()));
        assertEquals(numerator.divide(divisor), found.numerator());
        assertEquals(denominator.divide(divisor), found.denominator());
    }

    @Test
    void greatestCommonDivisorOfPolynomialsKeepsThePowerOfZ() {
        Polynomial<Rational> a = Polynomial.ofIntegers(3, 0, -5, 7, 1);
        Polynomial<Rational> b = Polynomial.ofIntegers(-2, 9, 4);
        Polynomial<Rational> common = Polynomial.ofIntegers(-11, 2, 0, 1);
        for (int power = 0; power < 4; power++) {
            Polynomial<Rational> up = Z.pow(power);
            assertEquals(up, a.times(up).greatestCommonDivisor(b.times(up).times(Z.pow(2))));
            assertEquals(common.times(up),
                    a.times(common).times(up).greatestCommonDivisor(b.times(common).times(up)));
        }
    }
}
