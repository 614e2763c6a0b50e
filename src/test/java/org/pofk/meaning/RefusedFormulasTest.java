package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.IntFunction;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class RefusedFormulasTest {
    private static ParsedFormula parsed(String text) throws RefusedException {
        return FormulaParser.parse(text, new Position("claims.yaml", 1, 1));
    }

    private static List<Fault> refusedInK(String text) {
        return assertThrows(RefusedException.class, () -> ExponentialSum.of(parsed(text), Precision.AS_WRITTEN), text)
                .faults();
    }

    private static String told(List<Fault> faults) {
        return faults.stream().map(fault -> fault.code() + " " + fault.position().column())
                .collect(Collectors.joining(", "));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "1/k | divisor-not-a-power 3", "0.2 + 1/(0.3^k + 0.5^k) | divisor-not-a-power 9",
        "0.5^k/cos(0.3k) | divisor-not-a-power 7", "0.5^k/(1 - 1) | division-by-zero 7",
        "0.5^k/(sqrt(2) + sqrt(3) - sqrt(5 + 2sqrt(6))) | division-by-zero 7", "1/delta(k) | divisor-not-a-power 3",
        "2 + k^k | power-of-k 5", "2^(k^2) | argument-not-linear 3", "2^3^k | argument-not-linear 3",
        "cos(k^2) | argument-not-linear 5", "exp(0.5^k) | argument-not-linear 5", "sqrt(k) | function-of-k 1",
        "sqrt(0.5^k) | function-of-k 1", "arctan(k) | function-of-k 1", "k^0.5 | exponent-not-whole 3",
        "(-0.5)^(k/3) | exponent-not-whole 1", "2^(sqrt(2)*k) | exponent-not-whole 3", "2^pi*k | exponent-not-whole 3",
        "binomial(k, k) | binomial-argument 13", "binomial(k, -1) | binomial-argument 13",
        "binomial(5-k, 2) | binomial-argument 10", "binomial(k/2, 2) | argument-not-whole 10",
        "binomial(k^2, 2) | argument-not-linear 10", "delta(k/2) | argument-not-whole 7",
        "delta(k-10^7) | step-too-late 7", "0^(k-1) | division-by-zero 1", "0^(-k) | division-by-zero 1",
        "0.2*0.5^n | name-unknown 9", "z/(z-1) | 'name-unknown 1, name-unknown 4'", "arccos(1.2)^k | no-cosine 8",
        "arccos(i)^k | number-not-real 8", "n + k^k + 1/k | 'name-unknown 1, power-of-k 5, divisor-not-a-power 13'",
        "k^400 | formula-too-large 1", "(1 + 0.5^k)^400 | formula-too-large 1",
        "2 + 0.5^(10^9*k) | formula-too-large 5",
        "2^(10^10) | formula-too-large 1", "{1 for k <= 5000; 0.5^k for k > 5000} | formula-too-large 1"
    })
    void whatIsNoExponentialSumIsRefusedAtItsPlace(String text, String expected) {
        assertEquals(expected, told(refusedInK(text)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "z^k | name-unknown 3", "Z/(z-1) | name-unknown 1", "2^z | exponent-not-whole 3",
        "z^(1/2) | exponent-not-whole 3",
        "cos(z) | not-rational 1", "delta(z) | not-rational 1", "z/(z - z) | division-by-zero 3",
        "1/(1/(z-1) - 1/(z-1)) | division-by-zero 3", "{z for k = 0} | not-rational 1",
        "(z^2 + 1)^300 + 1 | formula-too-large 1", "z^401 + 1 | formula-too-large 1"
    })
    void whatIsNotRationalIsRefusedAtItsPlace(String text, String expected) throws RefusedException {
        ParsedFormula formula = parsed(text);
        List<Fault> faults = assertThrows(RefusedException.class,
                () -> RationalForm.of(formula, "z", Precision.AS_WRITTEN), text).faults();
        assertEquals(expected, told(faults));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "0.25 | variable-missing 1", "x*(y - 1) | name-unknown 4", "1/(x - 1) | not-polynomial 1",
        "(s-1)^300*(s-2)^300 | formula-too-large 1"
    })
    void whatIsNoPolynomialInOneVariableIsRefused(String text, String expected) throws RefusedException {
        ParsedFormula formula = parsed(text);
        List<Fault> faults = assertThrows(RefusedException.class,
                () -> WrittenPolynomial.of(formula, Precision.AS_WRITTEN), text).faults();
        assertEquals(expected, told(faults));
    }

    @Test
    void whatIsMeantIsAskedFor() {
        assertTrue(refusedInK("0.5^K").get(0).message().endsWith("did you mean 'k'?"));
        assertTrue(refusedInK("k!").size() == 1 && refusedInK("log(k)").size() == 1);
    }

    private static Stream<String> hostile() {
        return Stream.of("-".repeat(198) + "k", "(".repeat(190) + "k" + ")".repeat(190), "((((1+0.5^k)^9)^9)^9)^9",
                "2^2^2^2^2^2^k", "9^9^9^9", "0.5^9^9^9", "cos(".repeat(150) + "1" + ")".repeat(150),
                "exp(".repeat(150) + "1" + ")".repeat(150), "sqrt(i+".repeat(90) + "2" + ")".repeat(90),
                "sqrt(".repeat(150) + "2" + ")".repeat(150) + "^k", "(k+1)^100*(k+1)^100", "(1+k+0.5^k+cos(k))^50",
                "(1-delta(k)-delta(k-1))^90*0.5^k", "1e400^k*1e400^k*1e-400^k", "((1e400)^1000)^k",
                joined(3_000, i -> "0." + (i + 1000) + "^k", "+"), joined(60, i -> "(1+0." + (i + 10) + "^k)", "*"),
                joined(100, i -> "cos(0." + (i + 100) + "k)", "*"), joined(900, i -> "delta(k-" + i + ")",
                "+") + "+k^9",
                "(" + joined(900, i -> "delta(k-" + i + ")", "+") + ")^20", "binomial(k-900, 90)",
                "binomial(2000, 999)^k",
                "((((((((3^9)^9)^9)^9)^9)^9)^9)^9)*k",
                "1" + "/3".repeat(150), "1/(" + "1+1/(".repeat(80) + "k" + ")".repeat(81));
    }

    private static String joined(int count, IntFunction<String> part, String sign) {
        return IntStream.range(0, count).mapToObj(part).collect(Collectors.joining(sign));
    }

    @ParameterizedTest
    @MethodSource("hostile")
    void hostileTextEndsWithinTheBoundOnTheWork(String text) throws RefusedException {
        ParsedFormula formula = parsed(text);
        Work work = new Work();
        try {
            ExponentialSum sum = ExponentialSum.of(formula, Precision.AS_WRITTEN, work);
            assertTrue(sum.terms().size() <= PolarArithmetic.MOST_TERMS);
        } catch (RefusedException refused) {
            assertTrue(refused.faults().size() <= 2, refused.getMessage());
        }
        assertTrue(work.spent() <= Work.MOST + Scalars.MOST_WEIGHT, work.spent() + " steps");
    }

    @ParameterizedTest
    @MethodSource("hostile")
    void hostileTextInZEndsWithinTheBoundOnTheWork(String text) throws RefusedException {
        ParsedFormula formula = parsed(text.replace('k', 'z'));
        Work work = new Work();
        try {
            assertTrue(RationalForm.of(formula, "z", Precision.AS_WRITTEN, work).summands().size() >= 0);
        } catch (RefusedException refused) {
            assertTrue(!refused.faults().isEmpty());
        }
        assertTrue(work.spent() <= Work.MOST + Scalars.MOST_WEIGHT, work.spent() + " steps");
    }
}
