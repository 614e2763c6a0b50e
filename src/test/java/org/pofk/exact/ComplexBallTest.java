package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

class ComplexBallTest {
    private static final int SCALE = 60;

    /** An exact complex number. */
    record Exact(Rational re, Rational im) {
        Exact plus(Exact other) {
            return new Exact(re.plus(other.re), im.plus(other.im));
        }

        Exact times(Exact other) {
            return new Exact(re.times(other.re).minus(im.times(other.im)),
                    re.times(other.im).plus(im.times(other.re)));
        }

        ComplexBall enclosed() {
            return new ComplexBall(Ball.of(re, SCALE), Ball.of(im, SCALE));
        }

        boolean isIn(ComplexBall ball) {
            return ball.real().contains(re) && ball.imaginary().contains(im);
        }
    }

    @Provide
    Arbitrary<Exact> numbers() {
        Arbitrary<Rational> parts = Combinators.combine(Arbitraries.longs().between(-3000, 3000),
                Arbitraries.longs().between(1, 1000)).as(Rational::of);
        return Combinators.combine(parts, parts).as(Exact::new);
    }

    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void arithmeticHoldsTheExactResult(@ForAll("numbers") Exact a, @ForAll("numbers") Exact b) {
        ComplexBall product = a.enclosed().times(b.enclosed());
        assertTrue(a.times(b).isIn(product));
        assertTrue(a.plus(b).isIn(a.enclosed().plus(b.enclosed())));
        assertTrue(a.times(a).times(a).isIn(a.enclosed().pow(3)));
        if (!b.enclosed().containsZero()) {
            assertTrue(a.isIn(product.dividedBy(b.enclosed())));
            assertTrue(b.times(b).isIn(b.enclosed().pow(-2).pow(-1)));
        }
    }

    @Property(seed = "20261201", tries = 500, edgeCases = EdgeCasesMode.NONE)
    void modulusSquaredIsRePlusIm(@ForAll("numbers") Exact a) {
        Ball modulus = a.enclosed().modulus();
        Rational square = a.re.times(a.re).plus(a.im.times(a.im));
        assertTrue(modulus.lower().pow(2).compareTo(square) <= 0 && modulus.upper().pow(2).compareTo(square) >= 0);
        assertTrue(modulus.isWithin(SCALE - 3));
    }

    @Property(seed = "20261201", tries = 200, edgeCases = EdgeCasesMode.NONE)
    void polynomialsAreEnclosedAtExactPoints(@ForAll("numbers") Exact z, @ForAll("numbers") Exact seed) {
        List<Rational> coefficients = new ArrayList<>();
        Exact value = new Exact(Rational.ZERO, Rational.ZERO);
        Exact power = new Exact(Rational.ONE, Rational.ZERO);
        for (int i = 0; i < 9; i++) {
            Rational coefficient = seed.re.times(Rational.of(i + 1)).minus(seed.im.dividedBy(Rational.of(i + 2)));
            coefficients.add(coefficient);
            value = value.plus(power.times(new Exact(coefficient, Rational.ZERO)));
            power = power.times(z);
        }
        Polynomial<Rational> polynomial = Polynomial.ofRationals(coefficients);
        assertTrue(value.isIn(new EnclosedPolynomial(polynomial, SCALE).valueAt(z.enclosed())));
        EnclosedComplex exact = EnclosedComplex.raising(bits ->
                new ComplexBall(Ball.of(z.re, bits), Ball.of(z.im, bits)));
        ComplexBall close = PolynomialQuotient.of(polynomial).at(exact).enclose(100);
        assertTrue(value.isIn(close) && close.isWithin(100));
    }
}
