package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Birth–death chains: all eigenvalues real, their polynomial's roots far more sensitive than doubles can bear. */
class IllConditionedRootsTest {
    private static final long SEED = 5;
    /** Some eigenvalues of a minor lie within 2^−128 of those of the next: modes that live far from its end. */
    private static final int BITS = 600;

    /** Up and down with random hundredths, from {@code lower} up: one leading minor of zI − A after the other. */
    private static List<Polynomial<Rational>> minors(int n) {
        Random random = new Random(SEED);
        List<Rational> up = IntStream.range(0, n)
                .mapToObj(i -> Rational.of(i < n - 1 ? 1 + random.nextInt(40) : 0, 100)).toList();
        List<Rational> down = IntStream.range(0, n)
                .mapToObj(i -> Rational.of(i > 0 ? 1 + random.nextInt(40) : 0, 100)).toList();
        List<Polynomial<Rational>> all = new ArrayList<>(List.of(Polynomial.one(RationalField.Q)));
        for (int i = 0; i < n; i++) {
            Rational stay = Rational.ONE.minus(up.get(i)).minus(down.get(i));
            Polynomial<Rational> next = times(all.get(i), stay);
            all.add(i == 0 ? next : next.minus(all.get(i - 1).times(up.get(i - 1).times(down.get(i)))));
        }
        return all;
    }

    private static Polynomial<Rational> times(Polynomial<Rational> polynomial, Rational root) {
        return polynomial.shiftedUp(1).minus(polynomial.times(root));
    }

    @ParameterizedTest
    @ValueSource(ints = {3, 20, 49, 99})
    void birthDeathRootsAreAllRealAndInterlace(int n) {
        List<Polynomial<Rational>> minors = minors(n);
        Roots roots = Roots.of(minors.get(n));
        Roots inner = Roots.of(minors.get(n - 1));
        assertEquals(n, roots.all().stream().filter(Root::isReal).count());
        assertTrue(roots.all().get(0).enclose(128).real().contains(Rational.ONE));
        for (int i = 0; i < n - 1; i++) {
            Ball between = inner.all().get(i).enclose(BITS).real();
            assertTrue(roots.all().get(i).enclose(BITS).real().minus(between).isPositive());
            assertTrue(between.minus(roots.all().get(i + 1).enclose(BITS).real()).isPositive());
        }
    }

    @Test
    void rootsMultiplyOutToIllConditionedCoefficients() {
        RootsTest.holdsItsContract(minors(30).get(30), 128);
    }

    /** Σ over the roots of N(λ)/D′(λ) is the coefficient of z^(n−1) in N (partial fractions at infinity). */
    @Test
    void coefficientsOfPartialFractionsAddUp() {
        int n = 49;
        List<Polynomial<Rational>> minors = minors(n);
        PolynomialQuotient coefficient = PolynomialQuotient.of(minors.get(n - 1), minors.get(n).derivative());
        Ball sum = Ball.of(0, 100);
        for (Root root : Roots.of(minors.get(n)).all()) {
            Ball value = coefficient.at(root).realPart().enclose(100);
            assertTrue(value.isWithin(100));
            assertTrue(value.isPositive(), "weights of a symmetric matrix are positive");
            sum = sum.plus(value);
        }
        assertTrue(sum.contains(Rational.ONE));
        assertTrue(sum.isWithin(90));
    }

    /** Ill-conditioned real roots among complex ones, where no symmetric matrix helps. */
    @Test
    void realAndComplexIllConditionedRootsTogether() {
        List<Polynomial<Rational>> minors = minors(24);
        Polynomial<Rational> polynomial = minors.get(24)
                .minus(Polynomial.ofIntegers(1).times(Rational.of(1, 1_000_000)));
        RootsTest.holdsItsContract(polynomial, 100);
        Polynomial<Rational> mixed = minors.get(16).times(Polynomial.ofIntegers(1, 1, 1))
                .times(Polynomial.ofIntegers(100, -190, 100).plus(Polynomial.ofIntegers(1)));
        RootsTest.holdsItsContract(mixed, 100);
        assertEquals(16, Roots.of(mixed).all().stream().filter(Root::isReal).count());
    }
}
