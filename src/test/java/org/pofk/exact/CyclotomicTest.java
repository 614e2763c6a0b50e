package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class CyclotomicTest {
    @Test
    void smallOnesAreThoseOfTheTextbook() {
        assertEquals(Polynomial.ofIntegers(-1, 1), Cyclotomic.polynomial(1));
        assertEquals(Polynomial.ofIntegers(1, 1), Cyclotomic.polynomial(2));
        assertEquals(Polynomial.ofIntegers(1, 0, 0, 0, 1), Cyclotomic.polynomial(8));
        assertEquals(Polynomial.ofIntegers(1, -1, 1, -1, 1), Cyclotomic.polynomial(10));
        assertEquals(Polynomial.ofIntegers(1, 0, -1, 0, 1), Cyclotomic.polynomial(12));
        assertEquals(Polynomial.ofIntegers(1, -1, 0, 1, -1, 1, 0, -1, 1), Cyclotomic.polynomial(15));
    }

    /** 105 = 3·5·7 is the first order with a coefficient other than 0 and ±1: −2 at z^7 and z^41 (Migotti 1883). */
    @Test
    void orderOneHundredAndFiveHasCoefficientMinusTwo() {
        Polynomial<Rational> polynomial = Cyclotomic.polynomial(105);
        assertEquals(48, polynomial.degree());
        assertEquals(List.of(7, 41), IntStream.rangeClosed(0, 48).filter(
                i -> polynomial.coefficient(i).equals(Rational.of(-2))).boxed().toList());
    }

    @Test
    void degreesAreEulersTotients() {
        for (int n = 1; n <= 120; n++) {
            assertEquals(Cyclotomic.totient(n), Cyclotomic.polynomial(n).degree());
        }
    }

    @Test
    void productOverTheDivisorsIsUnityMinusOne() {
        for (int n : new int[] {1, 6, 36, 60, 105}) {
            Polynomial<Rational> product = Polynomial.one(RationalField.Q);
            for (int divisor = 1; divisor <= n; divisor++) {
                product = n % divisor == 0 ? product.times(Cyclotomic.polynomial(divisor)) : product;
            }
            assertEquals(Polynomial.monomial(RationalField.Q, Rational.ONE, n).minus(Polynomial.one(RationalField.Q)),
                    product);
        }
    }

    /** Totient 8 belongs to 15, 16, 20, 24 and 30; nothing has totient 3. */
    @Test
    void ordersUpToADegreeAreAllWithSuchATotient() {
        assertEquals(List.of(1, 2), Cyclotomic.ordersUpToDegree(1));
        assertEquals(List.of(1, 2, 3, 4, 6), Cyclotomic.ordersUpToDegree(3));
        assertEquals(List.of(15, 16, 20, 24, 30), Cyclotomic.ordersUpToDegree(8).stream()
                .filter(n -> Cyclotomic.totient(n) == 8).toList());
        assertEquals(IntStream.rangeClosed(1, 20_000).filter(n -> Cyclotomic.totient(n) <= 100).boxed().toList(),
                Cyclotomic.ordersUpToDegree(100));
        assertEquals(List.of(), Cyclotomic.ordersUpToDegree(0));
    }

    @Test
    void ordersThatDivideAreFoundAmongCandidatesAndAmongAll() {
        Polynomial<Rational> polynomial = Cyclotomic.polynomial(5).times(Cyclotomic.polynomial(12).pow(2))
                .times(Polynomial.ofIntegers(3, 1, 0, 7)).times(Rational.of(2, 3));
        assertEquals(List.of(5, 12), Cyclotomic.ordersDividing(polynomial));
        assertEquals(List.of(12), Cyclotomic.ordersDividing(polynomial, List.of(4, 12, 24, 12)));
        assertTrue(Cyclotomic.ordersDividing(Polynomial.ofIntegers(2, 1)).isEmpty());
        assertTrue(Cyclotomic.ordersDividing(Polynomial.ofIntegers()).isEmpty());
        assertThrows(ArithmeticException.class, () -> Cyclotomic.polynomial(0));
    }
}
