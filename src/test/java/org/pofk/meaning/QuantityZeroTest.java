package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;

/** True identities are proved, and what differs from one by 1e-40 is told from it. */
class QuantityZeroTest {
    private static final Quantity NEARLY_NOTHING = Quantity.of(Rational.of(10).pow(-40));
    private int identities;

    private static Quantity root(long radicand) {
        return Quantity.of(radicand).squareRoot();
    }

    private static Quantity fraction(long p, long q) {
        return Quantity.of(Rational.of(p, q));
    }

    private static Quantity turns(long p, long q) {
        return Quantity.pi().times(Rational.of(2 * p, q));
    }

    private void equal(Quantity a, Quantity b) {
        assertEquals(Decision.YES, a.minus(b).isZero(), () -> a + " = " + b);
        assertEquals(Decision.NO, a.minus(b).plus(NEARLY_NOTHING).isZero(), () -> a + " = " + b + " + 1e-40");
        identities++;
    }

    @Test
    void productsOfSquareRoots() {
        for (int a = 2; a <= 12; a++) {
            for (int b = a; b <= 12; b++) {
                equal(root(a).times(root(b)), root((long) a * b));
                equal(root(a).plus(root(b)).pow(2), Quantity.of(a + b).plus(root(4L * a * b)));
            }
        }
        equal(Quantity.of(-4).squareRoot(), Quantity.i().times(Quantity.of(2)));
        assertEquals(133, identities);
    }

    @Test
    void nestedSquareRoots() {
        for (int a = 1; a <= 6; a++) {
            for (int b = 2; b <= 7; b++) {
                Quantity inner = root(b).plus(Quantity.of(a));
                equal(inner.pow(2).squareRoot(), inner);
                equal(Quantity.of(a * a + b).plus(root(4L * a * a * b)).squareRoot(), inner);
                Quantity outer = inner.squareRoot();
                equal(outer.pow(3).times(outer), inner.pow(2));
                equal(outer.inverse().plus(outer), inner.plus(Quantity.ONE).dividedBy(inner.squareRoot()));
            }
        }
        Quantity negative = Quantity.ONE.minus(root(2)).times(Quantity.ONE.plus(Quantity.i().minus(Quantity.i())));
        equal(negative.squareRoot(), Quantity.i().times(negative.negate().squareRoot()));
        equal(negative.squareRoot().conjugate(), negative.squareRoot().negate());
        Quantity complex = Quantity.of(3).plus(Quantity.i().times(Quantity.of(4)));
        equal(complex.squareRoot(), Quantity.of(2).plus(Quantity.i()));
        equal(complex.conjugate().squareRoot(), Quantity.of(2).minus(Quantity.i()));
        equal(complex.squareRoot().realPart(), Quantity.of(2));
        assertEquals(149, identities);
    }

    @Test
    void goldenPowersAreFibonacciNumbers() {
        Quantity golden = Quantity.ONE.plus(root(5)).times(Rational.HALF);
        Quantity other = Quantity.ONE.minus(root(5)).times(Rational.HALF);
        BigInteger before = BigInteger.ZERO;
        BigInteger number = BigInteger.ONE;
        for (int k = 1; k <= 120; k++) {
            equal(golden.pow(k).minus(other.pow(k)).dividedBy(root(5)), Quantity.of(Rational.of(number)));
            BigInteger next = number.add(before);
            before = number;
            number = next;
        }
        assertEquals(120, identities);
    }

    @Test
    void cosinesOfRationalTurns() {
        for (int n = 2; n <= 24; n++) {
            Quantity sum = Quantity.ZERO;
            Quantity squares = Quantity.ZERO;
            for (int j = 0; j < n; j++) {
                sum = sum.plus(turns(j, n).cosine());
                squares = squares.plus(turns(j, n).sine().pow(2));
            }
            equal(sum, Quantity.ZERO);
            equal(squares, n == 2 ? Quantity.ZERO : fraction(n, 2));
        }
        for (int k = 1; k <= 50; k++) {
            equal(turns(k, 7).cosine().plus(turns(2L * k, 7).cosine()).plus(turns(3L * k, 7).cosine()),
                    k % 7 == 0 ? Quantity.of(3) : fraction(-1, 2));
        }
        equal(turns(1, 5).cosine(), root(5).minus(Quantity.ONE).times(Rational.of(1, 4)));
        equal(turns(1, 8).sine(), root(2).times(Rational.HALF));
        equal(turns(1, 12).sine(), fraction(1, 2));
        equal(turns(1, 24).cosine(), root(6).plus(root(2)).times(Rational.of(1, 4)));
        equal(turns(1, 7).sine().times(turns(2, 7).sine()).times(turns(3, 7).sine()), root(7).times(Rational.of(1, 8)));
        equal(turns(397, 3600).cosine().pow(2).times(Rational.TWO).minus(Quantity.ONE), turns(397, 1800).cosine());
        assertEquals(102, identities);
    }

    @Test
    void anglesAddUp() {
        for (int p = 1; p <= 6; p++) {
            for (int q = p + 1; q <= 8; q++) {
                Quantity tangent = fraction(p, q);
                Quantity sum = tangent.arctangent().plus(fraction(q - p, q + p).arctangent());
                equal(sum.cosine(), root(2).times(Rational.HALF));
                equal(sum.sine(), sum.cosine());
                Quantity cosine = tangent.arccosine();
                equal(cosine.cosine(), tangent);
                equal(cosine.sine().pow(2), Quantity.ONE.minus(tangent.pow(2)));
                equal(cosine.times(Rational.of(5)).cosine(), tangent.pow(5).times(Rational.of(16))
                        .minus(tangent.pow(3).times(Rational.of(20))).plus(tangent.times(Rational.of(5))));
                equal(cosine.times(Rational.HALF).cosine(),
                        tangent.plus(Quantity.ONE).times(Rational.HALF).squareRoot());
            }
        }
        Quantity machin = fraction(1, 5).arctangent().times(Rational.of(4)).minus(fraction(1, 239).arctangent());
        equal(Quantity.i().times(machin).exponential(),
                Quantity.ONE.plus(Quantity.i()).times(root(2)).times(Rational.HALF));
        assertEquals(163, identities);
    }

    /** Amplitude and angle of a conjugate pair against its powers, as authors write them. */
    @Test
    void pairsInPolarFormAreTheirPowers() {
        for (int k = 0; k <= 60; k += 3) {
            for (long n : List.of(2L, 3L, 7L)) {
                Quantity pole = Quantity.ONE.plus(Quantity.i().times(root(n))).times(Rational.of(1, 4));
                Quantity modulus = Quantity.of(Rational.of(n + 1, 16)).squareRoot();
                Quantity angle = root(n).arctangent();
                Quantity amplitude = Quantity.of(2).minus(Quantity.i());
                Quantity phase = fraction(1, 2).arctangent();
                equal(root(5).times(modulus.pow(k)).times(Quantity.of(k).times(angle).minus(phase).cosine()),
                        amplitude.times(pole.pow(k)).realPart());
            }
        }
        assertEquals(63, identities);
    }

    @Test
    void powerSumsOfRootsAreNewtons() {
        List<Polynomial<Rational>> polynomials = List.of(polynomial(-1, -1, 0, 1), polynomial(3, 1, 0, 2, 5),
                polynomial(-1, 3, 1), polynomial(2, 0, 7), polynomial(1, 1, 1, 1, 1));
        for (Polynomial<Rational> polynomial : polynomials) {
            List<Root> roots = Roots.of(polynomial).all();
            for (int k = 1; k <= 20; k++) {
                Quantity sum = Quantity.ZERO;
                for (Root each : roots) {
                    sum = sum.plus(Quantity.of(each).pow(k));
                }
                equal(sum, Quantity.of(powerSums(polynomial.monic(), k).get(k)));
            }
        }
        assertEquals(100, identities);
    }

    private static Polynomial<Rational> polynomial(long... ascending) {
        List<Rational> coefficients = new ArrayList<>();
        for (long each : ascending) {
            coefficients.add(Rational.of(each));
        }
        return Polynomial.ofRationals(coefficients);
    }

    private static List<Rational> powerSums(Polynomial<Rational> monic, int upTo) {
        int d = monic.degree();
        List<Rational> sums = new ArrayList<>(List.of(Rational.of(d)));
        for (int m = 1; m <= upTo; m++) {
            Rational sum = m <= d ? monic.coefficient(d - m).times(Rational.of(-m)) : Rational.ZERO;
            for (int j = 1; j <= Math.min(m - 1, d); j++) {
                sum = sum.minus(monic.coefficient(d - j).times(sums.get(m - j)));
            }
            sums.add(sum);
        }
        return sums;
    }

    @Test
    void rootOfDegree24AgainstItsResidues() {
        List<Rational> coefficients = new ArrayList<>();
        for (int i = 0; i < 24; i++) {
            coefficients.add(Rational.of(i * 37 % 11 - 5, 17));
        }
        coefficients.add(Rational.ONE);
        Polynomial<Rational> q = Polynomial.ofRationals(coefficients);
        Polynomial<Rational> generator = Polynomial.ofRationals(List.of(Rational.ZERO, Rational.ONE));
        Quantity root = Quantity.of(Roots.of(q).all().get(3));
        for (int k = 20; k <= 100; k += 20) {
            Polynomial<Rational> residue = generator.pow(k).remainder(q);
            List<Quantity> terms = new ArrayList<>();
            for (int i = 0; i <= residue.degree(); i++) {
                terms.add(root.pow(i).times(residue.coefficient(i)));
            }
            equal(root.pow(k), Quantity.sum(terms));
        }
        assertEquals(5, identities);
    }

    /** Both ways are taken where both can be: heights alone prove the same zeros. */
    @Test
    void heightsAloneAgree() {
        List<Quantity> zeros = List.of(root(2).times(root(3)).minus(root(6)),
                Quantity.of(3).plus(root(8)).squareRoot().minus(Quantity.ONE).minus(root(2)),
                turns(1, 7).cosine().plus(turns(2, 7).cosine()).plus(turns(3, 7).cosine()).plus(fraction(1, 2)),
                fraction(1, 3).arccosine().times(Rational.TWO).cosine().plus(fraction(7, 9)),
                fraction(3, 4).arctangent().cosine().minus(fraction(4, 5)),
                fraction(1, 3).arccosine().times(Rational.HALF).cosine().minus(fraction(2, 3).squareRoot()));
        for (Quantity zero : zeros) {
            int bits = Heights.separation(zero).orElseThrow().intValue() + 3;
            assertEquals(true, zero.enclose(bits).containsZero());
        }
        for (Quantity zero : zeros) {
            Quantity other = zero.plus(NEARLY_NOTHING);
            int bits = Heights.separation(other).orElseThrow().intValue() + 3;
            assertEquals(false, other.enclose(bits).containsZero());
        }
    }

    @Test
    void whatIsNotAlgebraicIsToldFromZeroOrUndecided() {
        Quantity pi = Quantity.pi();
        assertEquals(Decision.NO, pi.minus(Quantity.of(Rational.parse("3.14159265358979323846264338327950288")))
                .isZero());
        assertEquals(Decision.UNDECIDED, pi.times(pi).squareRoot().minus(pi).isZero());
        assertEquals(Decision.NO, fraction(-1, 5).exponential().minus(Quantity.of(Rational.parse("0.8187"))).isZero());
    }

    @Test
    void whatIsNoNumberIsUndecided() {
        Quantity nothing = root(2).times(root(3)).minus(root(6));
        assertEquals(Decision.UNDECIDED, nothing.inverse().minus(Quantity.ONE).isZero());
        assertEquals(Decision.UNDECIDED, Quantity.of(2).arccosine().isZero());
    }

    @Test
    void modulusOfAComplexRootIsReal() {
        Quantity root = Quantity.of(Roots.of(polynomial(1, 3, 0, 0, 0, 2, 0, 1, 0, 0, 0, 0, 0, 1)).all().get(4));
        Quantity modulus = root.times(root.conjugate()).squareRoot();
        assertEquals(Decision.YES, modulus.isReal());
        assertEquals(Decision.YES, root.pow(2).plus(root.conjugate().pow(2)).isReal());
        assertEquals(Decision.NO, root.isReal());
    }
}
