package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class StepEvaluationTest {
    private static final int BITS = 192;

    private static ParsedFormula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, new Position("claims.yaml", 1, 1));
    }

    /** Both hold the number, and the direct one is no coarser than its bits allow at such sizes. */
    private static void assertAgree(Quantity expected, ComplexBall direct, String about) {
        assertTrue(direct.overlaps(expected.enclose(BITS)), about);
        assertTrue(direct.isWithin(BITS - 64), () -> about + ": " + direct);
    }

    private static void assertHolds(ComplexBall spread, ComplexBall atFaceValue, String about) {
        assertTrue(spread.overlaps(atFaceValue), about);
        assertTrue(isPart(atFaceValue.real().roundedTo(BITS / 2), spread.real(), BITS / 2), about);
    }

    private static boolean isPart(Ball inner, Ball outer, int bits) {
        Rational slack = Rational.of(1, 2).pow(bits - 20);
        return inner.lower().compareTo(outer.lower().minus(slack)) >= 0
                && inner.upper().compareTo(outer.upper().plus(slack)) <= 0;
    }

    @ParameterizedTest
    @MethodSource("org.pofk.meaning.Notations#inK")
    void isWhatTheSumIsAtEachStep(String text) throws RefusedException {
        ParsedFormula formula = parsed(text);
        ExponentialSum sum = ExponentialSum.of(formula, Precision.AS_WRITTEN);
        for (long k = 0; k <= 12; k++) {
            ComplexBall face = StepEvaluation.atFaceValue(formula, k, BITS).orElseThrow();
            ComplexBall spread = StepEvaluation.spread(formula, Precision.AS_WRITTEN, k, BITS).orElseThrow();
            assertAgree(sum.valueAt(k), face, text + " at " + k);
            assertHolds(spread, face, text + " at " + k);
            assertTrue(spread.overlaps(sum.valueAt(k).spread(BITS)), text + " at " + k);
        }
    }

    @ParameterizedTest
    @MethodSource("org.pofk.meaning.Notations#inZ")
    void isWhatTheRationalFormIsAtEachPoint(String text) throws RefusedException {
        ParsedFormula formula = parsed(text);
        RationalForm form = RationalForm.of(formula, "z", Precision.AS_WRITTEN);
        for (Rational z : List.of(Rational.of(7, 3), Rational.of(-9, 5), Rational.of(11))) {
            ComplexBall face = StepEvaluation.atFaceValue(formula, "z", z, BITS).orElseThrow();
            assertAgree(form.valueAt(Quantity.of(z)), face, text + " at " + z);
            assertHolds(StepEvaluation.spread(formula, "z", Precision.AS_WRITTEN, z, BITS).orElseThrow(), face, text);
        }
    }

    @Test
    void aDecimalIsAllThatItStandsFor() throws RefusedException {
        ComplexBall spread = StepEvaluation.spread(parsed("0.25 + 0*k"), Precision.AS_WRITTEN, 3, 64).orElseThrow();
        assertTrue(spread.real().contains(Rational.of(245, 1000)) && spread.real().contains(Rational.of(255, 1000)));
        assertTrue(!spread.real().contains(Rational.of(2449, 10000)));
        Precision four = new Precision(Optional.of(new Carried(4, Carried.Unit.SIGNIFICANT)));
        ComplexBall carried = StepEvaluation.spread(parsed("0.25 + 0*k"), four, 3, 64).orElseThrow();
        assertTrue(carried.real().contains(Rational.of(25005, 100000))
                && !carried.real().contains(Rational.of(2501, 10000)));
        ComplexBall large = StepEvaluation.spread(parsed("3e2"), Precision.AS_WRITTEN, 0, 64).orElseThrow();
        assertTrue(large.real().contains(Rational.of(250)) && !large.real().contains(Rational.of(249)));
    }

    /** Without a value there, or beyond all bounds, or not to be told from a division by zero. */
    @ParameterizedTest
    @ValueSource(strings = {"1/k", "0^(k-1)", "1/(0.5 - 0.5)", "n", "2^(10^9)", "2^(k+10^30)", "exp(10^5)", "arccos(2)",
        "arccos(i)", "0.5^((k+1)/3)", "binomial(10^6, 5000)", "{1 for k >= 1}", "2^(sqrt(2)k)", "arctan(i)",
        "(2^16000)^16000", "0.1^(1/0)"})
    void whatHasNoValueGivesNothing(String text) throws RefusedException {
        assertEquals(Optional.empty(), StepEvaluation.atFaceValue(parsed(text), 0, 128));
        assertEquals(Optional.empty(), StepEvaluation.spread(parsed(text), Precision.AS_WRITTEN, 0, 128));
    }

    @Test
    void aPowerOfAWideBallHasThePowersOfItsEndsAsEnds() {
        Rational low = Rational.of(7, 20);
        Rational high = Rational.of(9, 20);
        Rational slack = Rational.HALF.pow(60);
        int checked = 0;
        for (int exponent = -12; exponent <= 12; exponent++) {
            for (int sign = -1; sign <= 1; sign += 2) {
                Rational a = low.times(Rational.of(sign));
                Rational b = high.times(Rational.of(sign));
                Ball base = new Ball(Ball.of(a.plus(b).times(Rational.HALF), 128).center(),
                        Ball.of(high.minus(low).times(Rational.HALF), 128).center().add(BigInteger.TWO), 128);
                Ball power = Powers.of(base, exponent);
                Rational least = Rational.min(a.pow(exponent), b.pow(exponent));
                Rational most = Rational.max(a.pow(exponent), b.pow(exponent));
                assertTrue(power.contains(least) && power.contains(most), base + " ^ " + exponent);
                assertTrue(power.lower().compareTo(least.minus(slack)) > 0
                        && power.upper().compareTo(most.plus(slack)) < 0, base + " ^ " + exponent);
                checked++;
            }
        }
        assertEquals(50, checked);
    }
}
