package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
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
    @ValueSource(strings = {
        "0", "1/3", "k", "0.5^k", "0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k",
        "0.2*(1 - 0.3^k)*(1 + 0.5^k)", "(0.2 + 0.3k)*0.4^k", "(0.2 + 0.3^k)^2", "(1 - 0.5^k)^5", "3(1 - 0.5^k)/7",
        "0.4^(k-1)", "2^(3-k)", "(1/2)^(2k+1)", "1/2^k", "3^k/4^(k+1)", "0.4^(-k)", "0.25^(k/2)", "0.3^((k+1)/2)",
        "(-0.4)^k", "-0.4^k", "(-1)^k/3", "cos(pi k)", "0.5^k sin(0.3k)", "0.5^k cos(0.3k + 1)", "cos(2pi/7)^k",
        "0.66*0.52^k*cos(k*39.66 deg - 119 deg)", "cos(39.66° k - 119°)", "exp(i*0.7*k)", "exp(-0.1k)", "e^(-0.1k + 1)",
        "exp((-0.1 + 0.2i)k + i)", "(0.3 + 0.2i)^k", "(0.5-0.1i)*(0.3+0.2i)^k + (0.5+0.1i)*(0.3-0.2i)^k", "i^k",
        "(-i)^(k+1)", "binomial(k, 3)", "binomial(k-1, 2)*0.4^(k-3)", "binomial(k-2, 0)", "binomial(k+2, 2)",
        "binomial(2k-3, 3)*0.5^k", "k(k-1)/2", "k(k-1)/2*0.3^(k-2)", "delta(k)", "delta(k-1)", "delta(2k-6)",
        "delta(3k-4)", "delta(k+1)", "0.3 delta(k-2)*0.5^k*k", "0^k", "0^(k+1)", "cos(pi/2)^k", "(0.5^k)^2", "(2*0.5^k)^(-2)",
        "(cos(0.3k))^2", "cos(0.3k)*sin(0.5k)*cos(0.2k+1)", "cos(0.3k)*cos(0.3k+1)", "sin(0.3k)^3",
        "0.5^k*(0.3 cos(0.2k) + 0.4 sin(0.2k))", "(delta(k) + 0.5^k)^2", "(1 - delta(k))*0.3^k", "delta(k)*delta(k-1)",
        "delta(k-1)/0.5^k", "sqrt(2)*0.5^k/sqrt(3)", "(1+sqrt(2))^k/(1 + sqrt(5))^k", "cos(i*0.2*k)", "sin((1+0.1i)*k)",
        "(-0.25)^(k/2)", "{0.3 for k = 0; 0.2*0.5^k for k >= 1}", "{1 for k <= 2; delta(k-3) + 0.1k for k >= 3}",
        "2*({0.3 for k = 0; k for k >= 1} + 0.5^k)", "1/(1/2^k)", "2^2^k/4^k*2^(-2)", "(-2)^(-k)", "--0.5^k", "1 - (1 - 0.5^k)"
    })
    void meansAtEachStepWhatTheTextGives(String text) throws RefusedException {
        ParsedFormula formula = parsed(text.equals("2^2^k/4^k*2^(-2)") ? "2^(2k)/4^k*2^(-2)" : text);
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
