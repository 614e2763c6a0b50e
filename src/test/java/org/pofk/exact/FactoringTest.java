package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Factorization.Irreducible;

class FactoringTest {
    private static final Polynomial<Rational> Z_MINUS_ONE = Polynomial.ofIntegers(-1, 1);

    private static List<Polynomial<Rational>> factorsOf(Polynomial<Rational> polynomial) {
        return Factoring.of(polynomial).factors().stream().map(Factor::polynomial).toList();
    }

    private static void assertProvedIrreducible(Polynomial<Rational> monic) {
        assertEquals(List.of(new Factor<>(monic, 1, Irreducible.PROVED)), Factoring.of(monic).factors());
    }

    private static Polynomial<Rational> random(Random random, int degree, int bits) {
        List<Rational> all = new ArrayList<>();
        for (int i = 0; i < degree; i++) {
            BigInteger numerator = new BigInteger(bits + 1, random).subtract(BigInteger.ONE.shiftLeft(bits));
            all.add(new Rational(numerator, BigInteger.valueOf(1 + random.nextInt(6))));
        }
        all.add(Rational.of(1 + random.nextInt(4)));
        return Polynomial.ofRationals(all);
    }

    @Test
    void zeroHasNoFactorizationAndConstantsHaveNoFactors() {
        assertThrows(ArithmeticException.class, () -> Factoring.of(Polynomial.ofIntegers()));
        assertEquals(new Factorization<>(Rational.of(7), List.of()), Factoring.of(Polynomial.ofIntegers(7)));
    }

    /** Factors are monic, in order and square-free, and every one of the known factors is a product of some of them. */
    @Test
    void randomProductsComeApartIntoProvedFactorsThatRefineTheKnownOnes() {
        Random random = new Random(20_261_201);
        int products = 0;
        int proved = 0;
        for (; products < 2_000; products++) {
            List<Polynomial<Rational>> known = new ArrayList<>();
            Polynomial<Rational> product = Polynomial.one(RationalField.Q);
            for (int count = 1 + random.nextInt(4); count > 0; count--) {
                Polynomial<Rational> factor = random(random, 1 + random.nextInt(4), 3);
                known.add(factor);
                product = product.times(factor.pow(1 + random.nextInt(2)));
            }
            Factorization<Rational> found = Factoring.of(product);
            assertEquals(product, found.expand(RationalField.Q));
            assertCanonical(found);
            for (Polynomial<Rational> factor : known) {
                assertEquals(factor.degree(), found.factors().stream().mapToInt(piece -> piece.polynomial()
                        .greatestCommonDivisor(SquareFree.part(factor)).degree()
                        * multiplicity(piece.polynomial(), factor)).sum());
            }
            proved += found.factors().stream().allMatch(factor -> factor.irreducible() == Irreducible.PROVED) ? 1 : 0;
        }
        assertEquals(2_000, products);
        assertEquals(2_000, proved);
    }

    private static int multiplicity(Polynomial<Rational> irreducible, Polynomial<Rational> polynomial) {
        int multiplicity = 0;
        Polynomial<Rational> rest = polynomial;
        while (rest.remainder(irreducible).isZero()) {
            rest = rest.dividedExactlyBy(irreducible);
            multiplicity++;
        }
        return multiplicity;
    }

    private static void assertCanonical(Factorization<Rational> found) {
        List<Factor<Rational>> factors = found.factors();
        for (int i = 0; i < factors.size(); i++) {
            Polynomial<Rational> polynomial = factors.get(i).polynomial();
            assertEquals(Rational.ONE, polynomial.leading());
            assertTrue(SquareFree.is(polynomial));
            assertTrue(i == 0 || Factoring.CANONICAL_ORDER.compare(factors.get(i - 1).polynomial(), polynomial) < 0);
        }
    }

    /** z^n − 1 is the product of the cyclotomic polynomials of the divisors of n. */
    @Test
    void unityMinusOneComesApartIntoCyclotomicPolynomials() {
        for (int n : new int[] {1, 2, 12, 30, 105, 210}) {
            List<Polynomial<Rational>> expected = IntStream.rangeClosed(1, n).filter(divisor -> n % divisor == 0)
                    .mapToObj(Cyclotomic::polynomial).sorted(Factoring.CANONICAL_ORDER).toList();
            Polynomial<Rational> polynomial = Polynomial.monomial(RationalField.Q, Rational.ONE, n)
                    .minus(Polynomial.one(RationalField.Q));
            assertEquals(expected, factorsOf(polynomial));
        }
    }

    /** z^4 + 1 and the Swinnerton-Dyer polynomials split modulo every prime (Knuth, volume 2, 4.6.2, from memory). */
    @Test
    void polynomialsThatSplitModuloEveryPrimeAreStillProvedIrreducible() {
        assertProvedIrreducible(Polynomial.ofIntegers(1, 0, 0, 0, 1));
        assertProvedIrreducible(Polynomial.ofIntegers(1, 0, -10, 0, 1));
        assertProvedIrreducible(Polynomial.ofIntegers(576, 0, -960, 0, 352, 0, -40, 0, 1));
    }

    /** z^4 + 4b^4 = (z² − 2bz + 2b²)(z² + 2bz + 2b²), Sophie Germain's identity. */
    @Test
    void fourthPowerPlusFourIsTheReducibleCaseOfCapelli() {
        assertEquals(List.of(Polynomial.ofIntegers(2, -2, 1), Polynomial.ofIntegers(2, 2, 1)),
                factorsOf(Polynomial.ofIntegers(4, 0, 0, 0, 1)));
        assertEquals(List.of(Polynomial.ofIntegers(162, -18, 1), Polynomial.ofIntegers(162, 18, 1)),
                factorsOf(Polynomial.ofIntegers(4 * 81 * 81, 0, 0, 0, 1)));
    }

    /** z^n − a is reducible exactly when a is a p-th power for some p | n, or −4 times a fourth power and 4 | n. */
    @Test
    void binomialsFollowCapelli() {
        int reducible = 0;
        for (int n = 2; n <= 12; n++) {
            for (int a = -70; a <= 70; a++) {
                if (a != 0) {
                    Polynomial<Rational> binomial = Polynomial.monomial(RationalField.Q, Rational.ONE, n)
                            .minus(Polynomial.ofIntegers(a));
                    Factorization<Rational> found = Factoring.of(binomial);
                    boolean splits = binomialSplits(n, a);
                    assertEquals(splits, found.factors().size() > 1, n + " " + a);
                    assertTrue(found.factors().stream().allMatch(f -> f.irreducible() == Irreducible.PROVED));
                    reducible += splits ? 1 : 0;
                }
            }
        }
        assertEquals(92, reducible);
    }

    private static boolean binomialSplits(int n, int a) {
        for (int root = -9; root <= 9; root++) {
            for (int p : new int[] {2, 3, 5, 7, 11}) {
                if (n % p == 0 && BigInteger.valueOf(root).pow(p).equals(BigInteger.valueOf(a))) {
                    return true;
                }
            }
            if (n % 4 == 0 && a == -4 * root * root * root * root) {
                return true;
            }
        }
        return false;
    }

    @Test
    void hintsChangeNothingBelowTheDegreeOfFullFactorization() {
        Polynomial<Rational> closedClass = Z_MINUS_ONE.times(Polynomial.ofIntegers(1, -3, 0, 5, 9));
        Polynomial<Rational> polynomial = closedClass.pow(2).times(Polynomial.ofIntegers(1, 1, 1, 3, 0, 8));
        Factoring.Hints hints = new Factoring.Hints(List.of(1, 2, 3), List.of(closedClass));
        assertEquals(Factoring.of(polynomial), Factoring.of(polynomial, hints));
    }

    @Test
    void knownDivisorsSplitWhatIsTooLargeToFactor() {
        Random random = new Random(7);
        Polynomial<Rational> first = random(random, 110, 8).monic();
        Polynomial<Rational> second = random(random, 120, 8).monic();
        assertEquals(List.of(Irreducible.NOT_PROVED), Factoring.of(first.times(second)).factors().stream()
                .map(Factor::irreducible).toList());
        Factoring.Hints hints = new Factoring.Hints(List.of(), List.of(first));
        assertEquals(List.of(new Factor<>(first, 1, Irreducible.PROVED), new Factor<>(second, 1, Irreducible.PROVED)),
                Factoring.of(first.times(second), hints).factors());
    }

    /** Below the degree of full factorization, too, what would take long stays whole, proved square-free at most. */
    @Test
    void longNumbersLeaveAProductWholeUntilADivisorIsKnown() {
        Random random = new Random(13);
        Polynomial<Rational> first = random(random, 40, 1_500).monic();
        Polynomial<Rational> second = random(random, 41, 1_500).monic();
        assertEquals(List.of(new Factor<>(first.times(second), 1, Irreducible.NOT_PROVED)),
                Factoring.of(first.times(second)).factors());
        Factoring.Hints hints = new Factoring.Hints(List.of(), List.of(second));
        assertEquals(List.of(new Factor<>(first, 1, Irreducible.PROVED), new Factor<>(second, 1, Irreducible.PROVED)),
                Factoring.of(first.times(second), hints).factors());
    }

    /** Coprime by one prime, a common divisor by the library, both as they were made. */
    @Test
    void greatestCommonDivisorOfLargePolynomialsIsWhatWasPutIn() {
        Random random = new Random(17);
        for (int degree = 30; degree <= 60; degree += 10) {
            IntegerPolynomial first = PrimitiveForm.partOf(random(random, degree, 60));
            IntegerPolynomial second = PrimitiveForm.partOf(random(random, degree + 3, 60));
            IntegerPolynomial common = PrimitiveForm.partOf(random(random, 5, 20));
            assertEquals(IntegerPolynomial.ofIntegers(1), first.greatestCommonDivisor(second));
            assertEquals(common, first.times(common).greatestCommonDivisor(second.times(common)));
        }
    }

    @Test
    void zeroRootsRepeatedFactorsAndUnitAreKept() {
        Polynomial<Rational> polynomial = Polynomial.ofIntegers(0, 0, 0, 6).times(Polynomial.ofIntegers(-1, 2).pow(4))
                .times(Polynomial.ofIntegers(2, 0, 1).pow(2));
        assertEquals(new Factorization<>(Rational.of(96), List.of(
                new Factor<>(Polynomial.linear(RationalField.Q, Rational.HALF), 4, Irreducible.PROVED),
                new Factor<>(Polynomial.ofIntegers(0, 1), 3, Irreducible.PROVED),
                new Factor<>(Polynomial.ofIntegers(2, 0, 1), 2, Irreducible.PROVED))), Factoring.of(polynomial));
    }

    @Test
    void characteristicPolynomialOfALargeChainIsProvedWithoutFactoring() {
        Polynomial<Rational> cofactor = random(new Random(11), 99, 100).monic();
        Factorization<Rational> found = Factoring.of(cofactor.times(Z_MINUS_ONE));
        assertEquals(List.of(new Factor<>(Z_MINUS_ONE, 1, Irreducible.PROVED),
                new Factor<>(cofactor, 1, Irreducible.PROVED)), found.factors());
    }
}
