package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.exact.Ball;
import org.pofk.exact.Factoring;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.PlainText;
import org.pofk.transform.TransferFunction;
import org.pofk.transform.Transforms;

class ClosedFormTest {

    /** Published closed forms, each beside its transform. */
    @Test
    void publishedSequencesHaveTheirPublishedForms() {
        // Fibonacci: F_k = (φ^k − ψ^k)/√5 (Binet 1843; Graham, Knuth, Patashnik, Concrete Mathematics, section 6.6;
        // from memory)
        assertExact("sqrt(5)/5*(1/2 + sqrt(5)/2)^k - sqrt(5)/5*(1/2 - sqrt(5)/2)^k", "0 1", "-1 -1 1");
        // Pell: ((1+√2)^k − (1−√2)^k)/(2√2) (OEIS A000129, formula section; from memory)
        assertExact("sqrt(2)/4*(1 + sqrt(2))^k - sqrt(2)/4*(1 - sqrt(2))^k", "0 1", "-1 -2 1");
        // Jacobsthal: (2^k − (−1)^k)/3 (OEIS A001045; from memory)
        assertExact("1/3*2^k - 1/3*(-1)^k", "0 1", "-2 -1 1");
        // squares: z(z+1)/(z−1)³ ↔ k² = k + 2 binomial(k, 2) (Jury 1964, table of transforms; from memory)
        assertExact("k + 2*binomial(k, 2)", "0 1 1", "-1 3 -3 1");
        // tetrahedral numbers shifted: z⁴/(z−1)⁴ ↔ binomial(k+3, 3) = Σ binomial(3, j) binomial(k, j) (Vandermonde)
        assertExact("1 + 3*k + 3*binomial(k, 2) + binomial(k, 3)", "0 0 0 0 1", "1 -4 6 -4 1");
        // a z/(z−a)² ↔ k a^k, a = 2/3 (Oppenheim and Schafer, Discrete-Time Signal Processing, table 3.1; from memory)
        assertExact("2/3*k*(2/3)^(k - 1)", "0 2/3", "4/9 -4/3 1");
        // Perrin-like period 6: z(z−1/2)/(z²−z+1) ↔ cos(πk/3) (the same table, r = 1, θ = π/3; from memory)
        assertExact("cos(pi*k/3)", "0 -1/2 1", "1 -1 1");
        // z r sin θ/(z² − 2 r z cos θ + r²) ↔ r^k sin θk with r = 1/2, tan θ = 1: written with the phase −π/2
        assertExact("(sqrt(2)/2)^k*cos(pi*k/4 - pi/2)", "0 1/2", "1/2 -1 1");
    }

    /** The walk round five bays, eigenvalues cos(2πj/5) (Lovász 1993, section 3, from memory). */
    @Test
    void walkRoundFiveBaysHasTheGoldenRatio() {
        // 1/5 + 2/5 ((√5−1)/4)^k + 2/5 (−(√5+1)/4)^k
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < 5; i++) {
            List<Rational> row = new ArrayList<>(Collections.nCopies(5, Rational.ZERO));
            row.set((i + 1) % 5, Rational.HALF);
            row.set((i + 4) % 5, Rational.HALF);
            rows.add(row);
        }
        Chain chain = Samples.chain(Chain.Kind.CHAIN, rows, Samples.unit(5, 0));
        ClosedForm home = ClosedForm.of(
                Transforms.of(chain, Samples.states(chain).subList(0, 1)).get(0));
        assertEquals("1/5 + 2/5*(-1/4 + sqrt(5)/4)^k + 2/5*(-1/4 - sqrt(5)/4)^k", text(home));
    }

    @Test
    void cyclesOfAnyLengthHaveExactAnglesAndAmplitudes() {
        int pairs = 0;
        for (int n = 3; n <= 24; n++) {
            TransferFunction<Rational> y = new TransferFunction<>(Polynomial.monomial(RationalField.Q, Rational.ONE, n),
                    Polynomial.monomial(RationalField.Q, Rational.ONE, n).minus(Polynomial.ofIntegers(1)));
            ClosedForm form = Samples.closedForm(y, Factoring.of(y.denominator()));
            assertTrue(form.isExactThroughout(), "length " + n);
            List<String> found = new ArrayList<>();
            for (Mode mode : form.modes()) {
                found.add(PlainText.ASCII.write(ModeFormula.exact(mode)));
            }
            List<String> expected = new ArrayList<>();
            for (int j = 1; 2 * j < n; j++) {
                Rational turn = Rational.of(2L * j, n);
                expected.add(PlainText.ASCII.write(ModeFormula.oscillating(Formulas.number(Rational.of(2, n)), 0,
                        Formulas.number(1), Formulas.fraction(turn, Formula.Constant.PI),
                        Formulas.number(0))));
                pairs++;
            }
            assertTrue(found.containsAll(expected), () -> found + " misses some of " + expected);
            assertEquals(n / 2 + 1, found.size());
        }
        assertEquals(132, pairs);
    }

    @Test
    void leakyCycleHasRadicalModulusAndExactAngles() {
        // 1/(1 − 1/(2 z³)): p(3j) = 2^−j
        assertEquals("1/3*((1/2)^(1/3))^k + 2/3*((1/2)^(1/3))^k*cos(2*pi*k/3)",
                text(Samples.closedForm("0 0 0 1", "-1/2 0 0 1")));
    }

    @Test
    void leakyCyclesOfAnyLengthAreExactInEveryPlace() {
        int places = 0;
        for (int n = 3; n <= 16; n++) {
            Polynomial<Rational> denominator = Polynomial.monomial(RationalField.Q, Rational.ONE, n)
                    .minus(Polynomial.constant(RationalField.Q, Rational.of(2, 3)));
            for (int place = 1; place < n; place += 3) {
                ClosedForm form = Samples.closedForm(new TransferFunction<>(
                        Polynomial.monomial(RationalField.Q, Rational.ONE, place), denominator),
                        Factoring.of(denominator));
                assertTrue(form.isExactThroughout(), "length " + n + ", place " + place);
                assertValues(form, 100);
                places++;
            }
        }
        assertEquals(44, places);
    }

    @Test
    void irrationalAngleIsAnArcCosineInEveryQuadrant() {
        assertEquals("cos(arccos(3/5)*k)", text(Samples.closedForm("0 -3/5 1", "1 -6/5 1")));
        assertEquals("cos(arccos(-3/5)*k)", text(Samples.closedForm("0 3/5 1", "1 6/5 1")));
        // phases above and below the axis, compared in values
        for (String numerator : List.of("0 1 1", "0 -1 1", "0 2 -1", "0 -3 -1")) {
            assertValues(Samples.closedForm(numerator, "1/2 3/5 1"), 140);
            assertValues(Samples.closedForm(numerator, "1/2 -3/5 1"), 140);
        }
    }

    @Test
    void phaseOfHalfATurnIsDecidedNotRounded() {
        ClosedForm form = Samples.closedForm("0 1/2 -1", "1 -1 1");
        Mode.Oscillating mode = (Mode.Oscillating) form.modes().get(0);
        assertEquals("pi", PlainText.ASCII.write(mode.phase().exact().orElseThrow()));
        assertEquals("1", PlainText.ASCII.write(mode.amplitude().exact().orElseThrow()));
        assertEquals("-cos(pi*k/3)", text(form));
    }

    /** z⁵ − … with the pole (1+√2)ζ₅: no polynomial in z⁵, yet its angle is 2π/5 and its modulus 1 + √2 or √2 − 1. */
    @Test
    void hiddenMultipleOfPiIsFoundAndProved() {
        // the resultant in w of z-conjugates: Π (z² − 2(1+√2)cos(2πj/5) z + (1+√2)²) over j = 1, 2 and √2 ↦ −√2
        Polynomial<Rational> q = Samples.polynomial("1 -2 5 -12 29 12 5 2 1");
        ClosedForm form = Samples.closedForm(new TransferFunction<>(Polynomial.ofIntegers(0, 1), q),
                new Factorization<>(Rational.ONE, List.of(
                        new Factorization.Factor<>(q, 1, Factorization.Irreducible.NOT_PROVED))));
        List<String> angles = form.modes().stream().map(mode -> (Mode.Oscillating) mode)
                .map(mode -> mode.angle().exact().map(PlainText.ASCII::write).orElse("none")).toList();
        assertEquals(List.of("pi/5", "2*pi/5", "3*pi/5", "4*pi/5"), angles);
    }

    @Test
    void angleOfAHighPeriodIsExactWhereTheModulusIsNot() {
        // q(z) = g(z³), g(w) = w³ − w/2 + 1/9 with three real roots, none rational
        ClosedForm form = Samples.closedForm("0 1", "1/9 0 0 -1/2 0 0 0 0 0 1");
        List<Mode.Oscillating> pairs = form.modes().stream().filter(Mode.Oscillating.class::isInstance)
                .map(Mode.Oscillating.class::cast).toList();
        assertEquals(3, pairs.size());
        for (Mode.Oscillating pair : pairs) {
            assertTrue(pair.angle().exact().isPresent());
            assertFalse(pair.modulus().exact().isPresent());
        }
    }

    /** Amplitude and phase of repeated pairs, worked out from the printed exact form to 40 digits. */
    @Test
    void repeatedComplexPairsKeepAmplitudeAndPhase() {
        int oscillating = 0;
        for (String numerator : List.of("0 1", "0 0 1", "0 2 -1 3", "0 0 0 0 1", "5 0 1 0 -2")) {
            for (int multiplicity = 2; multiplicity <= 4; multiplicity++) {
                Polynomial<Rational> q = Samples.polynomial("1/3 -1/2 1");
                TransferFunction<Rational> y =
                        new TransferFunction<>(Samples.polynomial(numerator), q.pow(multiplicity));
                ClosedForm form = Samples.closedForm(y, Factoring.of(y.denominator()));
                assertTrue(form.isExactThroughout());
                assertConventions(form);
                assertValues(form, 140);
                oscillating += form.modes().stream().filter(Mode.Oscillating.class::isInstance).count();
            }
        }
        assertTrue(oscillating >= 40, "pairs: " + oscillating);
    }

    @Test
    void modeThatVanishesAtSomeRootsOnlyIsNotListed() {
        // (z−1/2)²(z−1/3)² left unfactored as q²; the numerator chosen so that 1/3 keeps no term of power 0
        Polynomial<Rational> q = Polynomial.linear(RationalField.Q, Rational.HALF)
                .times(Polynomial.linear(RationalField.Q, Rational.of(1, 3)));
        // y = (1/2)^k + k (1/2)^(k−1) + k (1/3)^(k−1)
        Polynomial<Rational> half = Polynomial.linear(RationalField.Q, Rational.HALF);
        Polynomial<Rational> third = Polynomial.linear(RationalField.Q, Rational.of(1, 3));
        Polynomial<Rational> numerator = half.times(third.pow(2)).plus(third.pow(2)).plus(half.pow(2)).shiftedUp(1);
        ClosedForm form = Samples.closedForm(new TransferFunction<>(numerator, q.pow(2)),
                new Factorization<>(Rational.ONE, List.of(
                        new Factorization.Factor<>(q, 2, Factorization.Irreducible.NOT_PROVED))));
        assertEquals("(1/2)^k + k*(1/2)^(k - 1) + k*(1/3)^(k - 1)", text(form));
    }

    @Test
    void formulaOverRootsNamesWhatHasNoShortForm() {
        ClosedForm form = Samples.closedForm("0 0 1", "1/10 1/3 -1 -1/3 1");
        assertTrue(PlainText.ASCII.write(form.formulaOverRoots()).contains("^k"));
        assertFalse(form.isExactThroughout());
        assertTrue(form.exactFormula().isEmpty());
        assertEquals(List.of(4), form.degreesOverRoots());
    }

    /** The exact formula as a reader works it out, against the exact series; 120 random transforms. */
    @Test
    void exactFormulasGiveTheSeries() {
        Random random = new Random(7_301);
        int exact = 0;
        int certified = 0;
        for (int run = 0; run < 120; run++) {
            RandomTransform sample = RandomTransform.of(random);
            ClosedForm form = Samples.closedForm(sample.y(), sample.factors());
            assertConventions(form);
            if (form.isExactThroughout()) {
                assertValues(form, 100);
                exact++;
            } else {
                certified++;
            }
        }
        assertTrue(exact > 40, "exact: " + exact);
        assertTrue(certified > 20, "not exact: " + certified);
    }

    /** Every constant's enclosure agrees with its short form. */
    @Test
    void enclosuresHoldTheirShortForms() {
        Random random = new Random(99);
        int compared = 0;
        for (int run = 0; run < 40; run++) {
            RandomTransform sample = RandomTransform.of(random);
            for (Mode mode : Samples.closedForm(sample.y(), sample.factors()).modes()) {
                for (RealValue value : constants(mode)) {
                    if (value.exact().isPresent()) {
                        Ball worked = FormulaValue.of(value.exact().get(), 0, 200);
                        assertTrue(worked.overlaps(value.enclosure().enclose(100)), value.toString());
                        compared++;
                    }
                }
            }
        }
        assertTrue(compared > 120, "compared: " + compared);
    }

    private static List<RealValue> constants(Mode mode) {
        return PrintedTerm.of(mode).map(term -> {
            List<RealValue> all = new ArrayList<>(term.constants());
            all.add(term.base());
            term.angle().ifPresent(all::add);
            return all;
        }).orElse(new ArrayList<>());
    }

    private static void assertConventions(ClosedForm form) {
        for (Mode mode : form.modes()) {
            if (mode instanceof Mode.Oscillating pair) {
                assertTrue(pair.angle().enclosure().enclose(64).isPositive());
                assertTrue(Ball.pi(64).minus(pair.angle().enclosure().enclose(64)).isPositive());
                assertTrue(pair.amplitude().enclosure().enclose(64).isPositive());
                assertTrue(pair.phase().enclosure().enclose(64).abs().minus(Ball.pi(64)).lower().signum() <= 0);
            }
        }
    }

    private static void assertValues(ClosedForm form, int bits) {
        List<Rational> series = PartialFractionsTest.series(form.transform().y(), 16);
        for (int k = 0; k < series.size(); k++) {
            Ball value = FormulaValue.of(form.exactFormula().orElseThrow(), k, bits + 60);
            Ball off = value.minus(Ball.of(series.get(k), bits + 60)).abs();
            assertTrue(off.upper().compareTo(Rational.TWO.pow(-bits)) < 0,
                    text(form) + " at " + k + " is " + value + ", not " + series.get(k));
        }
    }

    @Test
    void outputThatIsAlwaysZeroIsZero() {
        ClosedForm form = Samples.closedForm("0", "1");
        assertTrue(form.modes().isEmpty() && form.isExactThroughout());
        assertEquals("0", text(form));
        assertEquals("0", PlainText.ASCII.write(form.decimalForm(6).formula().orElseThrow()));
    }

    private static void assertExact(String expected, String numerator, String denominator) {
        assertEquals(expected, text(Samples.closedForm(numerator, denominator)));
    }

    private static String text(ClosedForm form) {
        return PlainText.ASCII.write(form.exactFormula().orElseThrow(() -> new AssertionError("not exact: " + form)));
    }
}
