package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Random;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.pofk.exact.UnitCircle.Counts;

class UnitCircleTest {
    /** z^10 + z^9 − z^7 − z^6 − z^5 − z^4 − z^3 + z + 1 (Lehmer 1933, from memory): one root 1.176…, one inside. */
    @Test
    void lehmersPolynomialHasEightRootsOnTheCircle() {
        assertEquals(new Counts(1, 8, 1), UnitCircle.count(
                Polynomial.ofIntegers(1, 1, 0, -1, -1, -1, -1, -1, 0, 1, 1)));
    }

    @Test
    void cyclotomicPolynomialsLieOnTheCircleWholly() {
        for (int n = 1; n <= 60; n++) {
            Polynomial<Rational> polynomial = Cyclotomic.polynomial(n);
            assertEquals(polynomial.degree(), UnitCircle.rootsOn(polynomial));
            assertEquals(new Counts(0, polynomial.degree(), 0), UnitCircle.count(polynomial));
        }
    }

    /** (3 + 4i)/5 lies on the circle and is no root of unity. */
    @Test
    void irrationalAngleOnTheCircleIsFound() {
        Polynomial<Rational> polynomial = Polynomial.ofIntegers(5, -6, 5);
        assertEquals(2, UnitCircle.rootsOn(polynomial));
        assertEquals(polynomial.monic(), UnitCircle.selfReciprocalPart(polynomial));
    }

    @Test
    void reciprocalRealPairLiesOnEitherSide() {
        assertEquals(new Counts(1, 0, 1), UnitCircle.count(Polynomial.ofIntegers(1, -3, 1)));
    }

    @Test
    void constantsHaveNoRootsAndRepeatedRootsAreRefused() {
        assertEquals(new Counts(0, 0, 0), UnitCircle.count(Polynomial.ofIntegers(3)));
        assertThrows(ArithmeticException.class, () -> UnitCircle.count(Polynomial.ofIntegers(1, 2, 1)));
    }

    /** Modulus exceeds or stays below one by as little as 10^−30, where a disc would have to be very small. */
    @Test
    void rootsThatAlmostTouchTheCircleAreTold() {
        Rational tiny = Rational.of(10).pow(-30);
        Polynomial<Rational> outside = Polynomial.linear(RationalField.Q, Rational.ONE.plus(tiny));
        Polynomial<Rational> inside = Polynomial.linear(RationalField.Q, tiny.minus(Rational.ONE));
        Polynomial<Rational> pair = Polynomial.ofRationals(List.of(Rational.ONE.plus(tiny), Rational.ONE,
                Rational.ONE));
        assertEquals(new Counts(1, 0, 3), UnitCircle.count(outside.times(inside).times(pair)));
    }

    /** Products of factors whose side is plain: z − r, and z² + b z + c with b² < 4c, both of modulus √c. */
    @Test
    void randomProductsAreCountedByTheirFactors() {
        Random random = new Random(3);
        int cases = 0;
        for (int run = 0; run < 400; run++) {
            TreeSet<Polynomial<Rational>> factors = new TreeSet<>(Factoring.CANONICAL_ORDER);
            for (int i = 1 + random.nextInt(5); i > 0; i--) {
                factors.add(random.nextBoolean() ? linear(random) : pair(random));
            }
            Polynomial<Rational> product = factors.stream().reduce(Polynomial.one(RationalField.Q), Polynomial::times);
            int inside = 0;
            int on = 0;
            for (Polynomial<Rational> factor : factors) {
                int side = factor.coefficient(0).abs().compareTo(Rational.ONE);
                inside += side < 0 ? factor.degree() : 0;
                on += side == 0 ? factor.degree() : 0;
            }
            assertEquals(new Counts(inside, on, product.degree() - inside - on), UnitCircle.count(product));
            assertEquals(on, UnitCircle.rootsOn(product));
            cases += on > 0 && inside > 0 ? 1 : 0;
        }
        assertEquals(111, cases);
    }

    private static Polynomial<Rational> linear(Random random) {
        return Polynomial.linear(RationalField.Q, Rational.of(random.nextInt(9) - 4, 1 + random.nextInt(4)));
    }

    private static Polynomial<Rational> pair(Random random) {
        Rational square = Rational.of(1 + random.nextInt(8), 1 + random.nextInt(4) * 2);
        Rational bound = Rational.min(square, Rational.ONE).times(Rational.of(2));
        Rational middle = bound.times(Rational.of(random.nextInt(19) - 9, 10));
        return Polynomial.ofRationals(List.of(square, middle, Rational.ONE));
    }
}
