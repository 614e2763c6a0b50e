package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Roots;
import org.pofk.text.Position;
import org.pofk.text.Span;

/** Quantities at face value are a field with conjugation: the laws over samples, each difference decided to be zero. */
class QuantityLawsTest {
    private static final Position PLACE = new Position("claims", 1, 1);
    private static final Written DECIMAL = Written.of("0.4508", new Span(PLACE, PLACE), Precision.AS_WRITTEN);

    private static List<Quantity> samples() {
        Quantity two = Quantity.of(2).squareRoot();
        Polynomial<Rational> cubic = Polynomial.ofRationals(
                List.of(Rational.of(-1), Rational.of(1, 2), Rational.ZERO, Rational.ONE));
        return List.of(Quantity.of(Rational.of(-3, 7)), Quantity.of(DECIMAL), two,
                Quantity.ONE.plus(Quantity.of(5).squareRoot()).times(Rational.HALF),
                Quantity.of(2).plus(Quantity.i()),
                Quantity.of(Roots.of(cubic).all().get(0)),
                Quantity.pi().times(Rational.of(2, 7)).cosine(),
                two.plus(Quantity.of(3)).squareRoot(),
                Quantity.of(Rational.of(1, 3)).arccosine().sine());
    }

    private int checked;

    private void equal(Quantity a, Quantity b) {
        assertEquals(Decision.YES, a.minus(b).isZero(), () -> a + " = " + b);
        checked++;
    }

    @Test
    void lawsOfAField() {
        for (Quantity a : samples()) {
            equal(a.plus(a.negate()), Quantity.ZERO);
            equal(a.times(a.inverse()), Quantity.ONE);
            equal(a.pow(3).times(a.pow(-2)), a);
            for (Quantity b : samples()) {
                equal(a.plus(b), b.plus(a));
                equal(a.times(b), b.times(a));
                equal(a.dividedBy(b).times(b), a);
                equal(a.plus(b).pow(2), a.pow(2).plus(a.times(b).times(Rational.TWO)).plus(b.pow(2)));
            }
        }
        assertEquals(9 * 3 + 81 * 4, checked);
    }

    @Test
    void sumsAndProductsAssociateAndDistribute() {
        for (Quantity a : samples()) {
            for (Quantity b : samples()) {
                Quantity c = samples().get((checked / 2) % samples().size());
                equal(a.times(b.plus(c)), a.times(b).plus(a.times(c)));
                equal(a.times(b).times(c), a.times(b.times(c)));
            }
        }
        assertEquals(162, checked);
    }

    @Test
    void conjugationIsAnAutomorphism() {
        List<Quantity> complex = new ArrayList<>(samples());
        complex.add(Quantity.i().plus(Quantity.of(2).squareRoot()).squareRoot());
        complex.add(Quantity.i().times(Quantity.pi()).times(Rational.of(2, 5)).exponential());
        for (Quantity a : complex) {
            equal(a.conjugate().conjugate(), a);
            equal(a.realPart().plus(Quantity.i().times(a.imaginaryPart())), a);
            for (Quantity b : complex) {
                equal(a.plus(b).conjugate(), a.conjugate().plus(b.conjugate()));
                equal(a.times(b).conjugate(), a.conjugate().times(b.conjugate()));
            }
        }
        assertEquals(11 * 2 + 121 * 2, checked);
    }

    @Test
    void signsAreThoseOfEnclosures() {
        assertEquals(0, Quantity.of(2).squareRoot().pow(2).minus(Quantity.of(2)).sign().orElseThrow());
        Quantity tiny = Quantity.of(2).squareRoot().minus(Quantity.ONE).pow(400);
        assertEquals(1, tiny.sign().orElseThrow());
        assertEquals(-1, tiny.negate().sign().orElseThrow());
        assertEquals(Decision.NO, Quantity.i().plus(tiny).isReal());
        assertEquals(Decision.YES, Quantity.i().times(Quantity.i().plus(tiny)).minus(Quantity.i().times(tiny)).isReal());
    }

    @Test
    void whatIsPlainIsMadeSimple() {
        Quantity root = Quantity.of(2).squareRoot();
        assertSame(root, root.times(Quantity.ONE));
        assertSame(root, root.plus(Quantity.ZERO));
        assertSame(root, root.negate().negate());
        assertSame(root, root.conjugate());
        assertEquals(Rational.of(2), root.pow(2).rational().orElseThrow());
        assertEquals(Rational.of(3, 2), Quantity.of(Rational.of(9, 4)).squareRoot().rational().orElseThrow());
        assertEquals(Rational.of(-1), Quantity.i().pow(2).rational().orElseThrow());
        assertEquals(List.of(DECIMAL), Quantity.of(DECIMAL).times(root).plus(Quantity.of(DECIMAL)).decimals());
    }
}
