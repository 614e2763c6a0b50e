package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.exact.ResidueField;
import org.pofk.transform.TransferFunction;

class PartialFractionsTest {

    @Test
    void simplePoleHasTheValueOfTheRestAsCoefficient() {
        // z/(z−1)(z−1/2) ↔ 2 − 2·(1/2)^k
        Expansion<Rational> expansion = expand(Polynomial.ofIntegers(0, 1), factor("-1 1", 1), factor("-1/2 1", 1));
        assertEquals(List.of(), expansion.impulses());
        assertEquals(Polynomial.ofIntegers(2), coefficient(expansion, 0, 0));
        assertEquals(Polynomial.ofIntegers(-2), coefficient(expansion, 1, 0));
    }

    @Test
    void repeatedQuadraticHasTaylorCoefficientsNotAdicDigits() {
        // 1/(z² + 1/4)² at λ = ±i/2, by hand: R_1 = 1/(2λ)² = −1, R_0 = −2/(2λ)³ = −1/(4λ³) = −4λ as λ⁴ = 1/16
        Expansion<Rational> expansion = expand(Polynomial.ofIntegers(0, 1), factor("1/4 0 1", 2));
        assertEquals(Polynomial.ofIntegers(0, -4), coefficient(expansion, 0, 0));
        assertEquals(Polynomial.ofIntegers(-1), coefficient(expansion, 0, 1));
    }

    @Test
    void poleAtZeroGivesImpulsesUpToItsOrder() {
        // (z² + 3)/(z²) = 1 + 3/z²
        Expansion<Rational> expansion = expand(Polynomial.ofIntegers(3, 0, 1), factor("0 1", 2));
        assertEquals(List.of(Rational.ONE, Rational.ZERO, Rational.of(3)), expansion.impulses());
        assertTrue(expansion.parts().isEmpty());
    }

    @Test
    void impulseAtZeroNeedsNoPole() {
        // (z − 1/2 + 1)/(z − 1/2): y(0) = 1, y(k) = (1/2)^(k−1) = 2·(1/2)^k from k = 1 on
        Expansion<Rational> expansion = expand(parse("1/2 1"), factor("-1/2 1", 1));
        assertEquals(List.of(Rational.of(-1)), expansion.impulses());
        assertEquals(Polynomial.ofIntegers(2), coefficient(expansion, 0, 0));
        assertEquals(Rational.ONE, expansion.valueAt(0));
        assertEquals(Rational.HALF, expansion.valueAt(2));
    }

    /** N ≡ R · D′ modulo each simple factor. */
    @Test
    void unreducedQuotientsAreTheSameCoefficients() {
        Random random = new Random(77);
        int compared = 0;
        for (int run = 0; run < 180; run++) {
            RandomTransform sample = RandomTransform.of(random);
            Expansion.Coefficient<Rational> unreduced = PartialFractions.unreduced(sample.y());
            for (Expansion.Part<Rational> part : PartialFractions.of(sample.y(), sample.factors()).parts()) {
                if (part.factor().multiplicity() == 1) {
                    Polynomial<Rational> q = part.factor().polynomial();
                    Expansion.Coefficient<Rational> own = part.coefficients().get(0);
                    assertEquals(unreduced.numerator().times(own.denominator()).remainder(q),
                            unreduced.denominator().times(own.numerator()).remainder(q), sample.y()::toString);
                    compared++;
                }
            }
        }
        assertTrue(compared > 60, "compared " + compared);
    }

    @Test
    void zeroHasNothing() {
        TransferFunction<Rational> zero =
                new TransferFunction<>(Polynomial.ofIntegers(), Polynomial.ofIntegers(1));
        Expansion<Rational> expansion = PartialFractions.of(zero, new Factorization<>(Rational.ONE, List.of()));
        assertTrue(expansion.impulses().isEmpty() && expansion.parts().isEmpty());
        assertEquals(Rational.ZERO, expansion.valueAt(5));
        assertEquals(zero, expansion.recombined());
    }

    @Test
    void sequenceThatStartsEarlyIsRefused() {
        assertThrows(AssertionError.class, () -> expand(Polynomial.ofIntegers(1, 0, 1), factor("-1 1", 1)));
    }

    @Test
    void simpleFactorOfHighDegreeKeepsItsQuotient() {
        Polynomial<Rational> q = Polynomial.ofIntegers(-1, -1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 1);
        Expansion<Rational> expansion = PartialFractions.of(
                new TransferFunction<>(Polynomial.ofIntegers(0, 0, 1), q),
                new Factorization<>(Rational.ONE, List.of(new Factorization.Factor<>(q, 1,
                        Factorization.Irreducible.NOT_PROVED))));
        assertFalse(expansion.parts().get(0).coefficients().get(0).isReduced());
        assertEquals(Rational.ZERO, expansion.valueAt(11));
        assertEquals(Rational.ONE, expansion.valueAt(12));
        assertEquals(expansion.recombined(), new TransferFunction<>(Polynomial.ofIntegers(0, 0, 1), q));
    }

    /** The power series of N/D against traces, and the expansion brought back to N/D, on 300 random products. */
    @Test
    void expansionOfRandomProductsRecombinesAndGivesTheSeries() {
        Random random = new Random(20240917);
        int repeated = 0;
        int poleAtZero = 0;
        int simpleQuadratics = 0;
        for (int run = 0; run < 300; run++) {
            RandomTransform sample = RandomTransform.of(random);
            repeated += sample.hasRepeatedQuadratic() ? 1 : 0;
            poleAtZero += sample.y().denominator().lowestPower() > 0 ? 1 : 0;
            simpleQuadratics += sample.hasRepeatedQuadratic() ? 0 : 1;
            Expansion<Rational> expansion = PartialFractions.of(sample.y(), sample.factors());
            assertEquals(sample.y(), expansion.recombined(), () -> sample.toString());
            List<Rational> series = series(sample.y(), 12);
            for (int k = 0; k < series.size(); k++) {
                assertEquals(series.get(k), expansion.valueAt(k), sample + " at " + k);
            }
        }
        assertTrue(repeated > 50, "repeated quadratics: " + repeated);
        assertTrue(poleAtZero > 60, "poles at zero: " + poleAtZero);
        assertTrue(simpleQuadratics > 60, "others: " + simpleQuadratics);
    }

    /** Over Q(√2) the same code splits z² − 1/2, which is irreducible over Q. */
    @Test
    void anotherCoefficientFieldNeedsNoSecondCopy() {
        ResidueField<Rational> field = new ResidueField<>(Polynomial.ofIntegers(-2, 0, 1));
        Polynomial<Rational> halfRootTwo = parse("0 1/2");
        Polynomial<Polynomial<Rational>> plus = Polynomial.linear(field, halfRootTwo);
        Polynomial<Polynomial<Rational>> minus = Polynomial.linear(field, field.negate(halfRootTwo));
        TransferFunction<Polynomial<Rational>> y = new TransferFunction<>(
                Polynomial.monomial(field, field.one(), 1), plus.times(plus).times(minus));
        Expansion<Polynomial<Rational>> expansion = PartialFractions.of(y, new Factorization<>(field.one(), List.of(
                new Factorization.Factor<>(plus, 2, Factorization.Irreducible.PROVED),
                new Factorization.Factor<>(minus, 1, Factorization.Irreducible.PROVED))));
        assertEquals(y, expansion.recombined());
        // by hand: R_1 = 1/(2a) = √2/2, R_0 = −1/(2a)² = −1/2, the other 1/(−2a)² = 1/2 with a = √2/2
        assertEquals(parse("0 1/2"), coefficient(expansion, 0, 1).coefficient(0));
        assertEquals(parse("-1/2"), coefficient(expansion, 0, 0).coefficient(0));
        assertEquals(parse("1/2"), coefficient(expansion, 1, 0).coefficient(0));
    }

    static List<Rational> series(TransferFunction<Rational> y, int length) {
        int order = y.denominator().degree();
        List<Rational> values = new ArrayList<>();
        for (int k = 0; k < length; k++) {
            Rational rest = order - k >= 0 ? y.numerator().coefficient(order - k) : Rational.ZERO;
            for (int j = 1; j <= Math.min(k, order); j++) {
                rest = rest.minus(y.denominator().coefficient(order - j).times(values.get(k - j)));
            }
            values.add(rest);
        }
        return values;
    }

    private static <E> Polynomial<E> coefficient(Expansion<E> expansion, int part, int power) {
        return expansion.parts().get(part).coefficients().get(power).numerator();
    }

    private static Polynomial<Rational> parse(String ascending) {
        return RandomTransform.parse(ascending);
    }

    private static Factorization.Factor<Rational> factor(String ascending, int multiplicity) {
        return new Factorization.Factor<>(parse(ascending), multiplicity, Factorization.Irreducible.PROVED);
    }

    @SafeVarargs
    private static Expansion<Rational> expand(Polynomial<Rational> numerator,
            Factorization.Factor<Rational>... factors) {
        Factorization<Rational> all = new Factorization<>(Rational.ONE, List.of(factors));
        return PartialFractions.of(new TransferFunction<>(numerator, all.expand(RationalField.Q)), all);
    }
}
