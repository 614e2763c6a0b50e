package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class RationalFormTest {
    private static final Position START = new Position("claims.yaml", 1, 1);
    private static final Rational CLOSE = Rational.of(10).pow(-50);

    private static ParsedFormula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, START);
    }

    private static RationalForm form(String text) throws RefusedException {
        return RationalForm.of(parsed(text), "z", Precision.AS_WRITTEN);
    }

    /** One line: front, factors with exponents; decimals at face value. */
    private static String shown(RationalForm form) {
        return String.join(" + ", form.summands().stream().map(summand -> face(summand.front())
                + String.join("", summand.factors().stream().map(factor -> " " + factor.coefficients().stream()
                        .map(RationalFormTest::face).toList() + "^" + factor.exponent()).toList())).toList());
    }

    private static String face(Quantity quantity) {
        return Rational.of(new BigDecimal(quantity.enclose(80).real().middle().approximate())
                .setScale(9, java.math.RoundingMode.HALF_EVEN)).toString();
    }

    @ParameterizedTest
    @MethodSource("org.pofk.meaning.Notations#inZ")
    void meansAtEachPointWhatTheTextGives(String text) throws RefusedException {
        ParsedFormula formula = parsed(text);
        RationalForm form = RationalForm.of(formula, "z", Precision.AS_WRITTEN);
        for (String point : List.of("1.5", "-2.25", "0.125", "7")) {
            NaiveValue.Complex expected = NaiveValue.of(formula.formula(), new BigDecimal(point));
            ComplexBall ball = form.valueAt(Quantity.of(Rational.parse(point))).enclose(180);
            assertTrue(ball.real().middle().minus(Rational.of(expected.re())).abs().compareTo(CLOSE) < 0,
                    () -> expected + " " + ball);
            assertTrue(ball.imaginary().middle().minus(Rational.of(expected.im())).abs().compareTo(CLOSE) < 0,
                    () -> expected + " " + ball);
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', quoteCharacter = '"', value = {
        "z*(0.5z + 2)/((z-1)*(z-0.25)); 1 [0, 1]^1 [2, 1/2]^1 [-1, 1]^-1 [-1/4, 1]^-1",
        "1/(1 - 0.4 z^(-1)); 1 [-2/5, 1]^-1 [0, 1]^1",
        "3z/(z-1) + 2/(z-0.5)^2; 3 [0, 1]^1 [-1, 1]^-1 + 2 [-1/2, 1]^-2",
        "z(1/(z-1) + 2/(z-3)); 1 [0, 1]^1 [-1, 1]^-1 + 2 [0, 1]^1 [-3, 1]^-1",
        "1/(1/(z-1) + 2/(z-1)^2); 1 [1, 1]^-1 [-1, 1]^2"
    })
    void whatIsFactoredStaysFactored(String text, String expected) throws RefusedException {
        assertEquals(expected, shown(form(text)));
    }
}
