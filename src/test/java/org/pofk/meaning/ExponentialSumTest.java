package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class ExponentialSumTest {
    private static final Position START = new Position("claims.yaml", 1, 1);
    private static final Rational CLOSE = Rational.of(10).pow(-50);

    private static ParsedFormula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, START);
    }

    private static ExponentialSum sum(String text) throws RefusedException {
        return ExponentialSum.of(parsed(text), Precision.AS_WRITTEN);
    }

    private static void assertClose(NaiveValue.Complex expected, Quantity value, String about) {
        ComplexBall ball = value.enclose(180);
        assertTrue(ball.real().middle().minus(Rational.of(expected.re())).abs().compareTo(CLOSE) < 0,
                () -> about + ": " + expected + " " + ball);
        assertTrue(ball.imaginary().middle().minus(Rational.of(expected.im())).abs().compareTo(CLOSE) < 0,
                () -> about + ": " + expected + " " + ball);
    }

    /** At each step the sum read from the text is what the text gives when it is simply worked out. */
    @ParameterizedTest
    @MethodSource("org.pofk.meaning.Notations#inK")
    void meansAtEachStepWhatTheTextGives(String text) throws RefusedException {
        ParsedFormula formula = parsed(text);
        ExponentialSum sum = ExponentialSum.of(formula, Precision.AS_WRITTEN);
        for (int k = 0; k <= 9; k++) {
            assertClose(NaiveValue.of(formula.formula(), BigDecimal.valueOf(k)), sum.valueAt(k), text + " at " + k);
        }
    }

    @Test
    void aPairStaysOneTermWithItsNumbersAsWritten() throws RefusedException {
        ExponentialSum pair = sum("0.66*0.52^k*cos(k*39.66 deg - 119 deg)");
        assertEquals(1, pair.terms().size());
        assertEquals("0.66", pair.terms().get(0).coefficient().decimals().get(0).text());
        assertEquals("0.52", pair.terms().get(0).base().decimals().get(0).text());
        assertEquals("39.66", pair.terms().get(0).angle().decimals().get(0).text());
    }
}
