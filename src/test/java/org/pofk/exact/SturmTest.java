package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Random;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

class SturmTest {
    /** Chebyshev's T_8 has its eight roots in (−1, 1), four on either side of zero. */
    @Test
    void chebyshevPolynomialHasAllRootsBetweenMinusOneAndOne() {
        Sturm sturm = Sturm.of(Polynomial.ofIntegers(1, 0, -32, 0, 160, 0, -256, 0, 128));
        assertEquals(8, sturm.count());
        assertEquals(8, sturm.count(Rational.of(-1), Rational.ONE));
        assertEquals(4, sturm.count(Rational.ZERO, Rational.TWO));
        assertEquals(0, sturm.count(Rational.ONE, Rational.TWO));
    }

    @Test
    void bothEndsOfTheIntervalBelongToIt() {
        Sturm sturm = Sturm.of(Polynomial.ofIntegers(-1, 0, 1));
        assertEquals(2, sturm.count(Rational.of(-1), Rational.ONE));
        assertEquals(1, sturm.count(Rational.ONE, Rational.ONE));
        assertEquals(0, sturm.count(Rational.ZERO, Rational.ZERO));
        assertEquals(0, sturm.count(Rational.ONE, Rational.of(-1)));
    }

    @Test
    void zeroAndRepeatedRootsAreRefusedAndConstantsHaveNoRoots() {
        assertThrows(ArithmeticException.class, () -> Sturm.of(Polynomial.ofIntegers()));
        assertThrows(ArithmeticException.class, () -> Sturm.of(Polynomial.ofIntegers(4, 4, 1)));
        assertEquals(0, Sturm.of(Polynomial.ofIntegers(5)).count());
    }

    /** Known rational roots times a positive quadratic: counting by comparison and by sign changes agree. */
    @Test
    void knownRootsAreCounted() {
        Random random = new Random(17);
        int inside = 0;
        for (int run = 0; run < 500; run++) {
            TreeSet<Rational> roots = new TreeSet<>();
            for (int i = random.nextInt(7); i > 0; i--) {
                roots.add(Rational.of(random.nextInt(41) - 20, 1 + random.nextInt(6)));
            }
            Polynomial<Rational> polynomial = roots.stream().map(root -> Polynomial.linear(RationalField.Q, root))
                    .reduce(Polynomial.ofIntegers(-1, -1, -1), Polynomial::times);
            Rational from = Rational.of(random.nextInt(11) - 8);
            Rational to = from.plus(Rational.of(random.nextInt(9)));
            Sturm sturm = Sturm.of(polynomial);
            int expected = (int) roots.stream().filter(r -> r.compareTo(from) >= 0 && r.compareTo(to) <= 0).count();
            assertEquals(expected, sturm.count(from, to));
            assertEquals(roots.size(), sturm.count());
            inside += expected;
        }
        assertEquals(412, inside);
    }
}
