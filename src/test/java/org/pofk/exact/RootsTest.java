package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class RootsTest {
    private static final Polynomial<Rational> Z = Polynomial.ofIntegers(0, 1);

    /** The polynomial of J. H. Wilkinson (1959): a small change of a coefficient moves its roots far. */
    @Test
    void wilkinsonsRootsAreTheWholeNumbersTo20() {
        Polynomial<Rational> product = Polynomial.ofIntegers(1);
        for (int i = 1; i <= 20; i++) {
            product = product.times(Polynomial.ofIntegers(-i, 1));
        }
        Roots roots = Roots.of(product);
        for (int i = 0; i < 20; i++) {
            Root root = roots.all().get(i);
            assertTrue(root.isReal());
            assertTrue(root.enclose(128).real().contains(Rational.of(20 - i)));
        }
        holdsItsContract(product, 128);
    }

    /** cos((2i − 1)π/2n), i = 1 … n. */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 8, 25, 40})
    void chebyshevsRootsAreCosines(int n) {
        Polynomial<Rational> before = Polynomial.ofIntegers(1);
        Polynomial<Rational> chebyshev = Z;
        for (int i = 1; i < n; i++) {
            Polynomial<Rational> next = chebyshev.times(Z).times(Rational.TWO).minus(before);
            before = chebyshev;
            chebyshev = next;
        }
        Roots roots = Roots.of(chebyshev);
        for (int i = 1; i <= n; i++) {
            Ball cosine = Ball.pi(140).times(2L * i - 1).dividedBy(Ball.of(2L * n, 140)).cos();
            assertTrue(roots.all().get(i - 1).enclose(128).real().overlaps(cosine));
            assertTrue(cosine.isWithin(128));
        }
    }

    /** zⁿ = 1: e^(2πik/n). */
    @ParameterizedTest
    @ValueSource(ints = {3, 4, 5, 12, 31, 60})
    void rootsOfUnityLieAtEqualAngles(int n) {
        Polynomial<Rational> polynomial = Polynomial.monomial(RationalField.Q, Rational.ONE, n)
                .minus(Polynomial.ofIntegers(1));
        Roots roots = Roots.of(polynomial);
        int real = n % 2 == 0 ? 2 : 1;
        for (int k = 1; k <= (n - 1) / 2; k++) {
            Root root = roots.all().get(real + k - 1);
            Ball angle = Ball.pi(150).times(2L * k).dividedBy(Ball.of(n, 150));
            assertTrue(root.argument().enclose(128).overlaps(angle));
            assertTrue(root.modulus().enclose(128).contains(Rational.ONE));
        }
        holdsItsContract(polynomial, 100);
    }

    /** zⁿ − 2(az − 1)² has two real roots that differ by about 2 a^(−n/2 − 1) (Mignotte 1982, from memory). */
    @ParameterizedTest
    @ValueSource(ints = {5, 9, 15, 25})
    void mignottesCloseRootsAreToldApart(int n) {
        Polynomial<Rational> line = Polynomial.ofIntegers(-1, 100);
        Polynomial<Rational> polynomial = Polynomial.monomial(RationalField.Q, Rational.ONE, n)
                .minus(line.times(line).times(Rational.TWO));
        Roots roots = Roots.of(polynomial);
        assertEquals(3, roots.all().stream().filter(Root::isReal).count());
        Rational hundredth = Rational.of(1, 100);
        assertTrue(roots.all().get(1).enclose(256).real().lower().compareTo(hundredth) > 0);
        assertTrue(roots.all().get(2).enclose(256).real().upper().compareTo(hundredth) < 0);
        holdsItsContract(polynomial, 128);
    }

    /** Two real roots 10^−e apart and a pair 2·10^−e apart, among others that are far from each other. */
    @ParameterizedTest
    @ValueSource(ints = {20, 45, 120, 300})
    void rootsFarCloserThanDoublesTellAreToldApart(int e) {
        Rational gap = Rational.of(10).pow(-e);
        Rational low = Rational.of(9, 10);
        Rational high = low.plus(gap);
        Polynomial<Rational> pair = Polynomial.ofIntegers(1, 2).pow(2).plus(Polynomial.ofRationals(
                List.of(gap.times(gap).times(Rational.of(4)))));
        Polynomial<Rational> polynomial = Polynomial.linear(RationalField.Q, low)
                .times(Polynomial.linear(RationalField.Q, high)).times(pair)
                .times(Polynomial.ofIntegers(5, 7, 5)).times(Polynomial.ofIntegers(5, -3, 5))
                .times(Polynomial.ofIntegers(-11, 0, 17));
        Roots roots = Roots.of(polynomial);
        assertEquals(List.of(true, true, true, true, false), roots.all().subList(0, 5).stream().map(Root::isReal)
                .toList());
        assertTrue(roots.all().get(0).enclose(4 * e + 8).real().contains(high));
        assertTrue(roots.all().get(1).enclose(4 * e + 8).real().contains(low));
        assertTrue(roots.all().stream().filter(root -> root.enclose(4 * e + 8).imaginary().contains(gap)).count() == 1);
        holdsItsContract(polynomial, 128);
    }

    @Test
    void hugeAndSmallCoefficientsAndSizesOfRoots() {
        Rational huge = Rational.of(BigInteger.TEN.pow(900));
        holdsItsContract(Polynomial.ofIntegers(3).plus(Z.pow(3).times(huge)).plus(Z.pow(7).times(Rational.of(7))), 64);
        holdsItsContract(Polynomial.ofIntegers(3).plus(Z.times(huge)).plus(Z.pow(4)), 64);
        holdsItsContract(Polynomial.ofIntegers(1, 1).times(Polynomial.ofIntegers(1, 1_000_000_007))
                .times(Polynomial.ofIntegers(1_000_000_009, 1)), 64);
    }

    @Test
    void rootZeroIsExactAndInItsPlace() {
        Roots roots = Roots.of(Polynomial.ofIntegers(0, -6, 1, 1).times(Polynomial.ofIntegers(5, 2, 1)));
        assertEquals(List.of("2", "0", "-3"), roots.all().stream().filter(Root::isReal)
                .map(root -> Decimals.fixed(root.realPart(), 0).value().toString()).toList());
        assertTrue(roots.all().get(1).enclose(10).real().isExact());
    }

    @Test
    void smallDegreesAreSolvedByFormula() {
        assertEquals(List.of(), Roots.of(Polynomial.ofIntegers(7)).all());
        assertTrue(Roots.of(Polynomial.ofIntegers(-1, 3)).all().get(0).enclose(50).real().contains(Rational.of(1, 3)));
        // the golden ratio to 50 digits: 1.6180339887498948482045868343656381177203091798057628… (OEIS A001622)
        assertEquals("1.6180339887498948482045868343656381177203091798058",
                Decimals.of(Roots.of(Polynomial.ofIntegers(-1, -1, 1)).all().get(0).realPart(), 50).text());
        Root above = Roots.of(Polynomial.ofIntegers(1, 1, 1)).all().get(0);
        assertFalse(above.isReal());
        assertEquals(1, above.conjugateIndex());
        assertTrue(above.enclose(64).real().contains(Rational.of(-1, 2)));
    }

    @Test
    void equalAnglesAreOrderedByModulus() {
        // ±i, ±2i, ±3i: one angle, three moduli
        Roots roots = Roots.of(Polynomial.ofIntegers(1, 0, 1).times(Polynomial.ofIntegers(4, 0, 1))
                .times(Polynomial.ofIntegers(9, 0, 1)));
        List<String> imaginary = roots.all().stream()
                .map(root -> Decimals.fixed(root.imaginaryPart(), 0).value().toString()).toList();
        assertEquals(List.of("3", "2", "1", "-3", "-2", "-1"), imaginary);
    }

    @Test
    void repeatedRootsAreRefused() {
        Polynomial<Rational> square = Polynomial.ofIntegers(-2, 0, 3, 1).pow(2);
        assertThrows(IllegalArgumentException.class, () -> Roots.of(square));
        assertThrows(IllegalArgumentException.class, () -> Roots.of(Polynomial.ofIntegers(1, 2, 1)));
        assertThrows(IllegalArgumentException.class, () -> Roots.of(Polynomial.ofIntegers(0, 0, 1)));
    }

    @Test
    void randomPolynomialsHoldTheirContract() {
        Random random = new Random(20261201);
        for (int i = 0; i < 60; i++) {
            List<Rational> coefficients = new ArrayList<>();
            int degree = 1 + random.nextInt(24);
            for (int power = 0; power < degree; power++) {
                coefficients.add(Rational.of(random.nextInt(2001) - 1000L, 1 + random.nextInt(1000)));
            }
            coefficients.add(Rational.ONE);
            Polynomial<Rational> polynomial = Polynomial.ofRationals(coefficients);
            if (polynomial.greatestCommonDivisor(polynomial.derivative()).isConstant()) {
                holdsItsContract(polynomial, 90);
            }
        }
    }

    /** As many as the degree, disjoint, paired, ordered, within the radius promised; multiplied out again. */
    static void holdsItsContract(Polynomial<Rational> polynomial, int bits) {
        Roots roots = Roots.of(polynomial);
        int n = polynomial.degree();
        assertEquals(n, roots.all().size());
        List<ComplexBall> enclosures = roots.all().stream().map(root -> root.enclose(bits)).toList();
        for (int i = 0; i < n; i++) {
            Root root = roots.all().get(i);
            assertEquals(i, root.index());
            assertEquals(polynomial.monic(), root.polynomial());
            assertEquals(root.isReal(), root.conjugateIndex() == i);
            assertEquals(i, roots.all().get(root.conjugateIndex()).conjugateIndex());
            assertTrue(enclosures.get(i).isWithin(bits));
            assertEquals(root.isReal(), enclosures.get(i).imaginary().sign().equals(OptionalInt.of(0)));
            assertTrue(enclosures.get(i).overlaps(enclosures.get(root.conjugateIndex()).conjugate()));
        }
        multipliesOut(polynomial.monic(), roots, bits);
    }

    private static void multipliesOut(Polynomial<Rational> monic, Roots roots, int bits) {
        List<ComplexBall> product = List.of(ComplexBall.of(Rational.ONE, bits));
        for (Root root : roots.all()) {
            ComplexBall value = root.enclose(bits);
            List<ComplexBall> next = new ArrayList<>();
            for (int i = 0; i <= product.size(); i++) {
                ComplexBall shifted = i == 0 ? ComplexBall.of(Rational.ZERO, bits) : product.get(i - 1);
                next.add(i == product.size() ? shifted : shifted.minus(product.get(i).times(value)));
            }
            product = next;
        }
        for (int i = 0; i <= monic.degree(); i++) {
            assertTrue(product.get(i).real().contains(monic.coefficient(i)), i + " of " + monic);
            assertTrue(product.get(i).imaginary().contains(Rational.ZERO), i + " of " + monic);
        }
    }
}
