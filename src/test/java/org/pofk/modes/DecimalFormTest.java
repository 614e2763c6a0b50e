package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.PlainText;
import org.pofk.transform.Transforms;

class DecimalFormTest {
    private static final int SCALE = 256;
    /** What the balls of the evaluation itself may add. */
    private static final Rational SLACK = Rational.TWO.pow(-180);

    /** Eight stages with exit chances 0.30 … 0.37: coefficients of ±3·10⁸, whole numbers, nearly cancel. */
    @Test
    void eightStagesAreRightAtEveryStepAsPrinted() {
        Chain chain = stages(30, 1, 8, 100);
        ClosedForm done = ClosedForm.of(Transforms.of(chain, Samples.states(chain)).get(8));
        for (int digits : new int[] {3, 6, 12}) {
            DecimalForm form = done.decimalForm(digits);
            assertTrue(form.upTo().isEmpty() && form.reason().isEmpty());
            assertTrue(form.errorBound().compareTo(Rational.of(10).pow(-digits)) <= 0);
        }
        DecimalForm form = done.decimalForm(6);
        List<BigInteger> exact = scaledValues(chain, 8, 100, 2_001);
        BigInteger unit = BigInteger.ONE;
        for (int k = 0; k <= 2_000; k++) {
            assertWithin(form, Ball.between(exact.get(k).shiftLeft(SCALE).divide(unit),
                    exact.get(k).shiftLeft(SCALE).divide(unit).add(BigInteger.ONE), SCALE), k);
            unit = unit.multiply(BigInteger.valueOf(100));
        }
    }

    /** The same with numbers that don't end as decimals, so that every one of them is rounded. */
    @Test
    void eightStagesWithRoundedNumbersAreRightAtEveryStepAsPrinted() {
        Chain chain = stages(30_000, 1_000, 8, 100_003);
        DecimalForm form = ClosedForm.of(Transforms.of(chain, Samples.states(chain)).get(8)).decimalForm(6);
        assertTrue(form.upTo().isEmpty() && form.errorBound().signum() > 0);
        List<BigInteger> exact = scaledValues(chain, 8, 100_003, 301);
        BigInteger unit = BigInteger.ONE;
        for (int k = 0; k <= 300; k++) {
            assertWithin(form, new Rational(exact.get(k), unit), k);
            unit = unit.multiply(BigInteger.valueOf(100_003));
        }
    }

    /** Why the digits are raised: each number right to six digits, and the value at k = 0 wrong by more than 100. */
    @Test
    void sixDigitsEverywhereWouldBeUseless() {
        Chain chain = stages(30, 1, 8, 100);
        ClosedForm done = ClosedForm.of(Transforms.of(chain, Samples.states(chain)).get(8));
        Rational sum = Rational.ZERO;
        Rational largest = Rational.ZERO;
        for (Mode mode : done.modes()) {
            Mode.Geometric geometric = (Mode.Geometric) mode;
            sum = sum.plus(geometric.coefficient().decimal(6).value());
            largest = Rational.max(largest, geometric.coefficient().rational().orElseThrow().abs());
        }
        assertTrue(sum.abs().compareTo(Rational.of(100)) > 0, "sum " + sum);
        assertTrue(largest.compareTo(Rational.of(100_000_000)) > 0, "largest " + largest);
    }

    @Test
    void nearlyEqualStagesNeedMoreDigitsThanAnybodyReads() {
        // exit chances 30000/100003, 30001/100003 …: coefficients of 10²⁹ that don't end as decimals
        Chain chain = stages(30_000, 1, 8, 100_003);
        DecimalForm form = ClosedForm.of(Transforms.of(chain, Samples.states(chain)).get(8)).decimalForm(6);
        assertTrue(form.formula().isEmpty());
        assertTrue(form.reason().orElseThrow().contains("30 digits"), form.reason()::get);
    }

    @Test
    void randomDecimalFormsKeepTheirBound() {
        Random random = new Random(41);
        int forEveryStep = 0;
        int limited = 0;
        int oscillating = 0;
        for (int run = 0; run < 80; run++) {
            RandomTransform sample = RandomTransform.of(random);
            ClosedForm closed = Samples.closedForm(sample.y(), sample.factors());
            int digits = 1 + random.nextInt(14);
            DecimalForm form = closed.decimalForm(digits);
            if (form.formula().isPresent()) {
                assertTrue(form.errorBound().compareTo(Rational.of(10).pow(-digits)) <= 0);
                assertEquals(form.upTo().isPresent(), form.reason().isPresent());
                int last = form.upTo().map(k -> (int) Math.min(k, 30)).orElse(30);
                List<Rational> series = PartialFractionsTest.series(sample.y(), last + 1);
                for (int k = 0; k <= last; k++) {
                    assertWithin(form, series.get(k), k);
                }
                forEveryStep += form.upTo().isEmpty() ? 1 : 0;
                limited += form.upTo().isPresent() ? 1 : 0;
                oscillating += PlainText.ASCII.write(form.formula().get()).contains("cos") ? 1 : 0;
            }
        }
        assertTrue(forEveryStep > 30, "for every step: " + forEveryStep);
        assertTrue(limited > 5, "limited: " + limited);
        assertTrue(oscillating > 15, "oscillating: " + oscillating);
    }

    @Test
    void slowPolesHoldOverMillionsOfSteps() {
        // poles 1 − ε ± ε/√2, ε = 10⁻⁶, coefficients irrational
        Rational epsilon = Rational.of(1, 1_000_000);
        Rational middle = Rational.ONE.minus(epsilon);
        Rational product = middle.times(middle).minus(epsilon.times(epsilon).times(Rational.HALF));
        ClosedForm closed = Samples.closedForm("0 0 1",
                product + " " + middle.times(Rational.of(-2)) + " 1");
        DecimalForm form = closed.decimalForm(6);
        assertTrue(form.upTo().isEmpty());
        Formula exact = closed.exactFormula().orElseThrow();
        for (long k : new long[] {0, 1, 2, 1_000, 1_000_000, 3_000_000, 10_000_000}) {
            Ball printed = FormulaValue.of(form.formula().orElseThrow(), k, SCALE);
            Ball off = printed.minus(FormulaValue.of(exact, k, SCALE)).abs();
            assertTrue(off.upper().compareTo(form.errorBound()) <= 0, "k = " + k + ": " + off);
        }
    }

    @Test
    void growingSequencesAreExactOrLimited() {
        DecimalForm fibonacci = Samples.closedForm("0 1", "-1 -1 1").decimalForm(6);
        assertTrue(fibonacci.upTo().isEmpty());
        assertEquals("sqrt(5)/5*(1/2 + sqrt(5)/2)^k - 0.4472136*(-0.618034)^k",
                PlainText.ASCII.write(fibonacci.formula().orElseThrow()));
        ClosedForm closed = Samples.closedForm("0 0 0 1", "-1 -1 -1 1");
        DecimalForm tribonacci = closed.decimalForm(6);
        long last = tribonacci.upTo().orElseThrow();
        assertTrue(last >= 20 && tribonacci.reason().isPresent());
        List<Rational> series = PartialFractionsTest.series(closed.transform().y(), (int) last + 1);
        for (int k = 0; k <= last; k++) {
            assertWithin(tribonacci, series.get(k), k);
        }
    }

    @Test
    void fastGrowthWithoutShortFormHasNoDecimalForm() {
        DecimalForm form = Samples.closedForm("0 1", "-1 0 -1000000 1").decimalForm(6);
        assertTrue(form.formula().isEmpty());
        assertFalse(form.reason().orElseThrow().isEmpty());
    }

    @Test
    void unitCircleHoldsForEveryStepOnlyWithAnExactAngle() {
        DecimalForm exactAngle = Samples.closedForm("0 -3/5 1", "1 -6/5 1").decimalForm(6);
        assertEquals(Optional.empty(), exactAngle.upTo());
        assertEquals("cos(arccos(3/5)*k)", PlainText.ASCII.write(exactAngle.formula().orElseThrow()));
        // z³ t(z + 1/z) with t(w) = w³ − 2w + 1/2, three real roots in (−2, 2): all six poles on the circle
        ClosedForm closed = Samples.closedForm("0 1 0 2", "1 0 1 1/2 1 0 1");
        DecimalForm limited = closed.decimalForm(6);
        assertEquals(Optional.of(1_000L), limited.upTo());
        List<Rational> series = PartialFractionsTest.series(closed.transform().y(), 1_001);
        for (int k = 0; k <= 1_000; k += 37) {
            assertWithin(limited, series.get(k), k);
        }
        assertWithin(limited, series.get(1_000), 1_000);
    }

    @Test
    void tinyModeStaysInTheFormula() {
        // 1/3 (1/2)^k + 10⁻¹² (−1/4)^k
        Rational tiny = Rational.of(1, 1_000_000_000_000L);
        String numerator = "0 " + Rational.of(1, 12).minus(tiny.times(Rational.HALF)) + " "
                + Rational.of(1, 3).plus(tiny);
        assertEquals("0.333333*0.5^k + 1e-12*(-0.25)^k", PlainText.ASCII.write(
                Samples.closedForm(numerator, "-1/8 -1/4 1").decimalForm(6).formula().orElseThrow())
                .replace("0.3333333", "0.333333"));
    }

    @Test
    void fiftyDigitsAreFiftyDigits() {
        DecimalForm form = Samples.closedForm("0 1", "1/3 -1/2 1").decimalForm(50);
        List<Rational> series = PartialFractionsTest.series(
                Samples.closedForm("0 1", "1/3 -1/2 1").transform().y(), 60);
        for (int k = 0; k < 60; k++) {
            assertWithin(form, series.get(k), k);
        }
        assertTrue(form.errorBound().compareTo(Rational.of(10).pow(-50)) <= 0);
    }

    private static void assertWithin(DecimalForm form, Rational value, int k) {
        assertWithin(form, Ball.of(value, SCALE), k);
    }

    private static void assertWithin(DecimalForm form, Ball value, int k) {
        Ball off = FormulaValue.of(form.formula().orElseThrow(), k, SCALE).minus(value).abs();
        assertTrue(off.upper().compareTo(form.errorBound().plus(SLACK)) <= 0, () ->
                PlainText.ASCII.write(form.formula().get()) + " at " + k + " is off by " + off + ", bound "
                        + form.errorBound().approximate());
    }

    /** Stages left one after the other with chances (first + i·step)/unit, the last state is where it ends. */
    private static Chain stages(int first, int step, int count, int unit) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i <= count; i++) {
            rows.add(new ArrayList<>(Collections.nCopies(count + 1, Rational.ZERO)));
        }
        for (int j = 0; j < count; j++) {
            int exit = first + j * step;
            rows.get(j).set(j, Rational.of(unit - exit, unit));
            rows.get(j + 1).set(j, Rational.of(exit, unit));
        }
        rows.get(count).set(count, Rational.ONE);
        return Samples.chain(Chain.Kind.CHAIN, rows, Samples.unit(count + 1, 0));
    }

    /** unit^k p(k) of one state in whole numbers, by stepping the chain. */
    private static List<BigInteger> scaledValues(Chain chain, int state, int unit, int length) {
        int n = chain.size();
        List<BigInteger> vector = new ArrayList<>(Collections.nCopies(n, BigInteger.ZERO));
        vector.set(0, BigInteger.ONE);
        List<BigInteger> values = new ArrayList<>();
        for (int k = 0; k < length; k++) {
            values.add(vector.get(state));
            List<BigInteger> next = new ArrayList<>(Collections.nCopies(n, BigInteger.ZERO));
            for (int j = 0; j < n; j++) {
                for (SparseMatrix.Entry entry : chain.matrix().columns().get(j)) {
                    BigInteger whole = entry.value().times(Rational.of(unit)).numerator();
                    next.set(entry.row(), next.get(entry.row()).add(whole.multiply(vector.get(j))));
                }
            }
            vector = next;
        }
        return values;
    }
}
