package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
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

    private static void assertSame(Quantity expected, Quantity found, String about) {
        ComplexBall difference = expected.minus(found).enclose(150);
        assertTrue(difference.containsZero() && difference.isWithin(100), () -> about + ": " + difference);
    }

    /** For two formulas at random, fifty times: the sum and the product of texts are those of the values. */
    @Test
    void sumAndProductOfTextsAreThoseOfTheirValuesAtEachStep() throws RefusedException {
        Random random = new Random(20_261_201);
        List<String> texts = Notations.inK();
        int checked = 0;
        for (int pair = 0; pair < 50; pair++) {
            String left = texts.get(random.nextInt(texts.size()));
            String right = texts.get(random.nextInt(texts.size()));
            ExponentialSum a = sum(left);
            ExponentialSum b = sum(right);
            ExponentialSum plus = sum("(" + left + ") + (" + right + ")");
            ExponentialSum times = sum("(" + left + ") * (" + right + ")");
            for (long k : new long[] {0, 1, 2, 5}) {
                String about = left + " and " + right + " at " + k;
                assertSame(a.valueAt(k).plus(b.valueAt(k)), plus.valueAt(k), about);
                assertSame(a.valueAt(k).times(b.valueAt(k)), times.valueAt(k), about);
                checked++;
            }
        }
        assertEquals(200, checked);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "0.3*0.5^k + 0.2*0.5^k | 2 | 2", "(0.3 + 0.2)*0.5^k | 1 | 1",
        "0.3*0.5^k + 0.2*0.50^k | 2 | 2", "(0.2 + 0.3k + k^2)*0.4^k | 3 | 3",
        "0.5^k cos(0.3k) + 0.5^k sin(0.3k) | 2 | 4", "0.5^k*(cos(0.3k) + sin(0.3k)) | 2 | 4",
        "0.3*(1/2)^k + 0.2*(1/2)^k | 1 | 1",
        "(1 - 0.5^k)*(1 + 0.5^k) | 2 | 2", "(0.3^k*0.5^k - 0.5^k*0.3^k) + 1 | 3 | 3", "(1+sqrt(2))*0.5^k | 1 | 1",
        "cos(0.3k)^2 | 2 | 3", "binomial(k, 4) | 4 | 5", "delta(k) + delta(k-3) | 0 | 0", "(-0.4)^k | 1 | 1",
        "0.2*(1 - 0.3^k)*(1 + 0.5^k) | 4 | 4", "exp(0.3i*k) + exp(-0.3i*k) | 2 | 2"
    })
    void termsWrittenAlikeAreOneAndTheOrderIsSmall(String text, int terms, int order) throws RefusedException {
        assertEquals(terms, sum(text).terms().size());
        assertEquals(order, sum(text).order());
    }

    @Test
    void aTermHasThePlaceOfTheTextThatMeansItAlone() throws RefusedException {
        assertEquals(List.of("1-4", "5-16", "19-34"), places("0.2 - 0.3*0.4^k + k*(0.1*0.5^k)/2"));
        assertEquals(List.of("6-7", "8-15"), places("0.2*(1 - 0.3^k)"));
        assertEquals(List.of("1-18"), places("0.2*3^k + 0.1*3^k"));
        assertEquals(List.of("1-26"), places("0.5^k*cos(39 deg*k-7 deg)"));
    }

    private static List<String> places(String text) throws RefusedException {
        return sum(text).terms().stream().map(term -> term.span().start().column() + "-"
                + term.span().end().column()).toList();
    }

    @Test
    void aFormulaInCasesSaysNothingWhereNoBranchIs() throws RefusedException {
        ExponentialSum fromOne = sum("{0.5^k for k >= 1}");
        assertTrue(!fromOne.scope().includes(0) && fromOne.scope().includes(1) && fromOne.impulses().isEmpty());
        ExponentialSum ending = sum("0.1 + {0.5 for k = 0; 0.25 for k = 2}");
        assertEquals(List.of(0L, 2L), LongStream.range(0, 9).filter(ending.scope()::includes).boxed().toList());
    }

    /** Four decimals of a probability are no four decimals of a degree. */
    @Test
    void decimalsAreNotCarriedForDegrees() throws RefusedException {
        Precision decimals = new Precision(Optional.of(new Carried(4, Carried.Unit.DECIMALS)));
        Precision significant = new Precision(Optional.of(new Carried(6, Carried.Unit.SIGNIFICANT)));
        ParsedFormula formula = FormulaParser.parse("0.5*0.3^k*cos(32.95 deg*k)", new Position("test", 1, 1));
        assertEquals(Rational.of(1, 100), lastPlaceOfTheAngle(formula, decimals));
        assertEquals(Rational.of(1, 10_000), lastPlaceOfTheAngle(formula, significant));
        assertTrue(StepEvaluation.spread(formula, decimals, 1, 128).orElseThrow().real().radius().compareTo(
                StepEvaluation.spread(formula, significant, 1, 128).orElseThrow().real().radius()) > 0);
    }

    private static Rational lastPlaceOfTheAngle(ParsedFormula formula, Precision precision) throws RefusedException {
        return ExponentialSum.of(formula, precision).terms().get(0).angle().decimals().get(0).lastPlace();
    }

    @Test
    void carriedDigitsMakeDecimalsFiner() throws RefusedException {
        Precision four = new Precision(Optional.of(new Carried(4, Carried.Unit.DECIMALS)));
        ExponentialSum carried = ExponentialSum.of(parsed("0.25*0.123456^k"), four);
        assertEquals(Rational.of(1, 10_000), carried.terms().get(0).coefficient().decimals().get(0).lastPlace());
        assertEquals(Rational.of(1, 1_000_000), carried.terms().get(0).base().decimals().get(0).lastPlace());
    }
}
