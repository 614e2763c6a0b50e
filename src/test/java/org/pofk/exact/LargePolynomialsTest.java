package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** The fast ways over the rationals against the plain ones, on either side of the degree where the library starts. */
class LargePolynomialsTest {
    private static final int LARGE = IntegerPolynomial.RINGS_DEGREE + 6;

    static Polynomial<Rational> random(Random random, int degree, int bits) {
        List<Rational> all = new ArrayList<>();
        for (int i = 0; i < degree; i++) {
            all.add(new Rational(new BigInteger(bits, random).subtract(BigInteger.ONE.shiftLeft(bits - 1)),
                    BigInteger.valueOf(1 + random.nextInt(9))));
        }
        all.add(Rational.of(1 + random.nextInt(5), 1 + random.nextInt(5)));
        return Polynomial.ofRationals(all);
    }

    @Test
    void productsAreTheSchoolbooks() {
        Random random = new Random(1);
        for (int degree : new int[] {0, 1, 5, 20, LARGE, LARGE + 7}) {
            Polynomial<Rational> a = random(random, degree, 90);
            Polynomial<Rational> b = random(random, LARGE, 90);
            assertEquals(Polynomial.schoolbookProduct(RationalField.Q, a, b), a.times(b));
            assertTrue(a.times(Polynomial.zero(RationalField.Q)).isZero());
        }
    }

    @Test
    void divisionsAreTheLongOnes() {
        Random random = new Random(2);
        for (int degree : new int[] {0, 1, 3, 11}) {
            Polynomial<Rational> divisor = random(random, degree, 20);
            Polynomial<Rational> dividend = random(random, 16, 20);
            assertEquals(Polynomial.longDivision(RationalField.Q, dividend, divisor), dividend.dividedBy(divisor));
            assertEquals(dividend, dividend.times(divisor).dividedExactlyBy(divisor));
            assertEquals(new Polynomial.Division<>(Polynomial.zero(RationalField.Q), divisor),
                    divisor.dividedBy(dividend));
        }
    }

    @Test
    void greatestCommonDivisorsAreEuclids() {
        Random random = new Random(3);
        int common = 0;
        for (int run = 0; run < 300; run++) {
            Polynomial<Rational> shared = random(random, random.nextInt(4), 6);
            Polynomial<Rational> a = random(random, random.nextInt(6), 6).times(shared);
            Polynomial<Rational> b = random(random, random.nextInt(6), 6).times(shared);
            Polynomial<Rational> found = a.greatestCommonDivisor(b);
            assertEquals(Polynomial.euclid(RationalField.Q, a, b), found);
            common += found.isConstant() ? 0 : 1;
        }
        assertEquals(218, common);
    }

    @Test
    void greatestCommonDivisorsWithZeroAndOfLargeDegree() {
        Random random = new Random(4);
        Polynomial<Rational> zero = Polynomial.zero(RationalField.Q);
        Polynomial<Rational> shared = random(random, LARGE, 50);
        Polynomial<Rational> a = random(random, 12, 50).times(shared);
        Polynomial<Rational> b = random(random, 15, 50).times(shared);
        assertEquals(shared.monic(), a.greatestCommonDivisor(b));
        assertEquals(shared.monic(), shared.greatestCommonDivisor(zero));
        assertEquals(zero, zero.greatestCommonDivisor(zero));
    }

    @Test
    void inversesModuloAPolynomialAreEuclids() {
        Random random = new Random(5);
        for (int degree : new int[] {1, 2, 5, 9}) {
            Polynomial<Rational> modulus = random(random, degree, 12);
            Polynomial<Rational> a = random(random, degree - 1, 12);
            Polynomial<Rational> inverse = RationalField.Q.inverseModulo(a, modulus);
            assertEquals(Polynomial.inverseByEuclid(RationalField.Q, a, modulus), inverse);
            assertEquals(Polynomial.one(RationalField.Q), a.times(inverse).remainder(modulus));
            Polynomial<Rational> sharing = modulus.times(Polynomial.ofIntegers(-1, 1));
            assertThrows(ArithmeticException.class, () -> RationalField.Q.inverseModulo(modulus, sharing));
        }
    }

    /** The degrees of factors modulo a prime, found here and by the library. */
    @Test
    void degreesModuloPrimesAreTheLibrarys() {
        Random random = new Random(6);
        int compared = 0;
        for (int prime : new int[] {13, 17, 19, 101, 997}) {
            for (int degree = 1; degree < 40; degree++) {
                long[] ascending = random.longs(degree + 1, 0, prime).toArray();
                ascending[degree] = 1;
                ModularPolynomial polynomial = new ModularPolynomial(prime, ascending);
                if (polynomial.isSquareFree()) {
                    assertEquals(RingsAlgebra.factorDegrees(prime, ascending).stream().sorted().toList(),
                            polynomial.factorDegrees().stream().sorted().toList());
                    compared++;
                }
            }
        }
        assertEquals(184, compared);
    }

    /** Known rational roots, some large, among factors without any. */
    @Test
    void rationalRootsAreFoundAllAndOnly() {
        Random random = new Random(8);
        int found = 0;
        for (int run = 0; run < 200; run++) {
            List<Rational> roots = random.ints(random.nextInt(5), 0, 1 << 30).distinct()
                    .mapToObj(number -> Rational.of(number - (1 << 29), 1 + number % 1_000)).distinct().sorted()
                    .toList();
            Polynomial<Rational> product = Polynomial.ofIntegers(1 + random.nextInt(50), 0, 1);
            for (Rational root : roots) {
                product = product.times(Polynomial.linear(RationalField.Q, root));
            }
            List<Rational> all = RationalRoots.of(PrimitiveForm.partOf(product)).stream().sorted().toList();
            assertEquals(roots, all);
            found += all.size();
        }
        assertEquals(402, found);
    }

    @Test
    void multiplicitiesComeApartOverAnyField() {
        ResidueField<Rational> field = new ResidueField<>(Polynomial.ofIntegers(-2, 0, 1));
        Polynomial<Polynomial<Rational>> root = Polynomial.linear(field, field.generator());
        Polynomial<Polynomial<Rational>> other = Polynomial.linear(field, field.of(3));
        assertEquals(Map.of(1, other, 3, root),
                SquareFree.byMultiplicity(root.pow(3).times(other).times(field.of(5))));
        assertEquals(other.times(root), SquareFree.part(root.pow(3).times(other)));
        assertTrue(SquareFree.byMultiplicity(Polynomial.ofIntegers(4)).isEmpty());
    }
}
