package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.pofk.exact.Rational;

class QuantityZeroTest {
    private static Quantity root(long radicand) {
        return Quantity.of(radicand).squareRoot();
    }

    private static Quantity fraction(long p, long q) {
        return Quantity.of(Rational.of(p, q));
    }

    private static void equal(Quantity a, Quantity b) {
        assertEquals(Decision.YES, a.minus(b).isZero(), () -> a + " = " + b);
        Quantity offBy = Quantity.of(Rational.of(10).pow(-40));
        assertEquals(Decision.NO, a.minus(b).plus(offBy).isZero(), () -> a + " = " + b + " + 1e-40");
    }

    @Test
    void radicalsMultiply() {
        equal(root(2).times(root(3)), root(6));
        equal(root(12), root(3).times(Quantity.of(2)));
        equal(root(2).plus(root(3)).pow(2), Quantity.of(5).plus(root(24)));
        equal(Quantity.of(3).plus(root(8)).squareRoot(), Quantity.ONE.plus(root(2)));
        equal(Quantity.of(-4).squareRoot(), Quantity.i().times(Quantity.of(2)));
    }

    @Test
    void goldenPowersAreFibonacciNumbers() {
        Quantity golden = Quantity.ONE.plus(root(5)).times(Rational.HALF);
        Quantity other = Quantity.ONE.minus(root(5)).times(Rational.HALF);
        equal(golden.pow(30).minus(other.pow(30)).dividedBy(root(5)), Quantity.of(832040));
    }

    @Test
    void cosinesOfSevenths() {
        Quantity sum = Quantity.ZERO;
        for (int i = 1; i <= 3; i++) {
            sum = sum.plus(Quantity.pi().times(Rational.of(2L * i, 7)).cosine());
        }
        equal(sum, fraction(-1, 2));
    }

    @Test
    void anglesAddUp() {
        Quantity x = fraction(1, 3).arccosine();
        equal(x.times(Rational.TWO).cosine(), fraction(-7, 9));
        Quantity y = fraction(3, 4).arctangent();
        equal(y.cosine(), fraction(4, 5));
        equal(y.sine(), fraction(3, 5));
    }
}
