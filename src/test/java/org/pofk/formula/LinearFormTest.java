package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.exact.Rational;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class LinearFormTest {
    private static final Map<String, LinearForm> NAMES = Map.of("both", LinearForm.of("both"),
            "one", LinearForm.of("one"), "none", LinearForm.of("none"), "both down", LinearForm.of("both down"),
            "running", LinearForm.of("both").plus(LinearForm.of("one")),
            "f", LinearForm.constant(Rational.of(1, 20)));

    private static LinearForm evaluate(String text) throws RefusedException {
        return LinearForm.evaluate(FormulaParser.parse(text, new Position("pumps.yaml", 7, 11)), NAMES);
    }

    private static List<Fault> faults(String text) {
        return assertThrows(RefusedException.class, () -> evaluate(text)).faults();
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "0.7; 7/10", "30%; 3/10", "2.5%; 1/40", "2.3e-6; 23/10000000", "1/3; 1/3", "-(1/2)^3; -1/8", "f/2; 1/40",
        "(1 - f)^2; 361/400", "2^-3; 1/8", "0^0; 1", "(-1)^1000000000000; 1", "sqrt(9/4); 3/2", "√4; 2",
        "binomial(5, 2); 10", "binomial(2, 5); 0", "delta(0); 1", "delta(f); 0", "cos(0) + exp(0); 2",
        "both - both + 4; 4", "1e400/1e400; 1", "6/2*3; 9", "2 - 3 - 4; -5"
    })
    void constantsAreExact(String text, String value) throws RefusedException {
        assertEquals(LinearForm.constant(Rational.parse(value)), evaluate(text));
    }

    @Test
    void namesKeepTheirCoefficients() throws RefusedException {
        assertEquals(new LinearForm(Rational.ONE, Map.of("both", Rational.of(-2), "none", Rational.of(1, 20))),
                evaluate("1 - 2both + f*none + 0 one"));
        assertEquals(new LinearForm(Rational.ZERO, Map.of("both", Rational.HALF, "one", Rational.of(3, 2))),
                evaluate("running/2 + one"));
        assertEquals(LinearForm.of("both down").times(Rational.of(3)), evaluate("3'both down'"));
        assertEquals(LinearForm.of("both"), evaluate("both^1"), "a power of one is the name itself");
    }

    @Test
    void aNameOfTheModelGoesBeforeAConstantOfMathematics() throws RefusedException {
        ParsedFormula formula = FormulaParser.parse("2i + pi", new Position("a", 1, 1));
        assertEquals(Map.of("i", Rational.TWO, "pi", Rational.ONE), LinearForm.evaluate(formula,
                Map.of("i", LinearForm.of("i"), "pi", LinearForm.of("pi"))).coefficients());
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "both*one; not-linear; 11", "1 + 2/both; not-linear; 15", "both^2; not-linear; 11", "2^both; not-linear; 11",
        "cos(both); not-linear; 11", "1/(f - 1/20); division-by-zero; 13", "0^(0-1); division-by-zero; 11",
        "one + bth; name-unknown; 17", "1 + pi; no-exact-value; 15", "exp(-f); no-exact-value; 11",
        "sqrt(2); no-exact-value; 11", "sqrt(-4); no-exact-value; 11", "2^f; no-exact-value; 11",
        "binomial(f, 2); no-exact-value; 11", "7^9999999; number-too-large; 11", "7^(10^30); number-too-large; 11"
    })
    void whatHasNoLinearValueIsRefusedInItsPlace(String text, String code, int column) {
        List<Fault> faults = faults(text);
        assertEquals(1, faults.size(), faults::toString);
        assertEquals(code, faults.get(0).code());
        assertEquals(new Position("pumps.yaml", 7, column), faults.get(0).position());
    }

    @Test
    void allFaultsOfAFormulaAreShownAtOnceWithASuggestion() {
        assertEquals(List.of("pumps.yaml:7:11: 'bth' isn't known here; did you mean 'both'?",
                "pumps.yaml:7:19: '1/0' divides by zero",
                "pumps.yaml:7:23: 'runing' isn't known here; did you mean 'running'?"),
                faults("bth + 1/0 + runing").stream().map(Fault::toString).toList());
    }

    @Test
    void numbersThatOnlyGrowTogetherAreRefusedToo() {
        assertEquals("number-too-large", faults("(3^9999)".repeat(20)).get(0).code());
        assertEquals("number-too-large", faults("1/7^20000 + 1/11^20000 + 1/13^20000").get(0).code());
        assertEquals("number-too-large", faults("9".repeat(60_000)).get(0).code());
        assertEquals("number-too-large", faults("both/7^20000 + both/11^20000 + both/13^20000").get(0).code());
        assertEquals("number-too-large", faults("1/3^2000 + 1/7^2000 - ".repeat(1000) + "1").get(0).code(),
                "many numbers of which none is too large");
    }

    @Test
    void manyPartsInSeriesHaveTheirExactValue() throws RefusedException {
        assertEquals(Rational.ONE.minus(Rational.of(9999, 10_000).pow(1000)),
                evaluate("1 - (1 - 0.0001)^1000").constant());
    }
}
