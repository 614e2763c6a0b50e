package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.exact.Rational;
import org.pofk.meaning.Fit;

/** Formulas with every decimal right to its digits are rounded in whatever form they are written; what rounding costs. */
class RoundedFormsTest {
    private static final Path FOLDER = Path.of("test-data/published");

    private static Judgement judged(String model, String claim) {
        Claims claims = Judged.read(FOLDER, model, "", List.of("{" + claim + "}"));
        return Judging.of(claims.claims().get(0), Truth.of(claims.model().chain()));
    }

    private static void assertRounded(String model, String claim) {
        Judgement judgement = judged(model, claim);
        assertEquals(Verdict.ROUNDED, judgement.verdict(), judgement::toString);
        assertTrue(judgement.numbers().stream().allMatch(number -> number.fit() == Fit.RIGHT), judgement::toString);
    }

    private static void assertWrong(String model, String claim) {
        assertEquals(Verdict.WRONG, judged(model, claim).verdict(), claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "fibonacci | formula: 'y(k+1)', is: '0.143*1.618^k + 0.581*1.618^k + 0.143*(-0.618)^k + 0.134*(-0.618)^k'",
        "availability-1oo2 | formula: '1up', is: '0.01960400 + 0.1428571*0.9085125^k - 0.1521501*0.9085125^k"
                + " + 0.1428571*0.8884875^k - 0.1531682*0.8884875^k'",
        "inbreeding-full-sib | formula: 'h', is: '0.14285714*0.80901699^k + 1.0279633*0.80901699^k"
                + " + 0.14285714*(-0.30901699)^k - 0.31367754*(-0.30901699)^k'",
        "fibonacci | formula: 'y(k+1)', is: '0.143*1.618^k + 0.286*1.618^k + 0.295*1.618^k + 0.2764*(-0.618)^k'"
    })
    void aCoefficientInPartsIsRightWhenItsSumMayBe(String model, String claim) {
        assertRounded(model, claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "fibonacci | formula: 'y(k+1)', is: '0.143*1.618^k + 0.582*1.618^k + 0.143*(-0.618)^k + 0.134*(-0.618)^k'",
        "fibonacci | formula: 'y(k+1)', is: '0.143*1.618^k + 0.581*1.618^k + 0.143*(-0.618)^k + 0.143*(-0.618)^k'",
        "inbreeding-full-sib | formula: 'h', is: '0.14285714*0.80901699^k + 1.0279634*0.80901699^k"
                + " + 0.14285714*(-0.30901699)^k - 0.31367754*(-0.30901699)^k'"
    })
    void aCoefficientInPartsIsWrongWhereNoSumOfWhatItsPartsStandForIsRight(String model, String claim) {
        assertWrong(model, claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "bernardelli-waves | formula: 'age1', is: '16.6667 + 33.3333*cos(2.09440*(k-1))'",
        "chebyshev-T | formula: 'y(k+1)', is: '1*cos(0.9273*(k+1))'",
        "gaussian-one-plus-i | formula: 'y(k+1)', is: '2*1.41421^(k-1)*cos(0.785398*(k-1))'"
    })
    void anAngleInDecimalsThatIsThePhaseTooIsRounded(String model, String claim) {
        assertRounded(model, claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "bernardelli-waves | formula: 'age1', is: '16.6667 + 33.3333*cos(2.09450*(k-1))'",
        "chebyshev-T | formula: 'y(k+1)', is: '1*cos(0.9273*(k-1))'",
        "gaussian-one-plus-i | formula: 'y(k+1)', is: '2*1.41421^(k-1)*cos(0.785398*(k+1))'"
    })
    void anAngleThatIsThePhaseTooIsWrongWithAnotherDigitOrStep(String model, String claim) {
        assertWrong(model, claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "bernardelli-waves | formula: 'age1', is: '16.666667 + 16.666667*exp(-2.0943951*i)*exp(2.0943951*i*k)"
                + " + 16.666667*exp(2.0943951*i)*exp(-2.0943951*i*k)', carried: 8 significant",
        "inventory-policy | formula: '0', is: '0.2856541136"
                + " + 0.4184932100*exp(1.596670737*i)*0.2602152955^k*exp(1.209429203*i*k)"
                + " + 0.4184932100*exp(-1.596670737*i)*0.2602152955^k*exp(-1.209429203*i*k) - 0.2640000000*delta(k)'",
        "gaussian-one-plus-i | formula: 'y(k+1)', is-latex: '0.7071 \\cdot \\exp\\left(-0.7854 \\mathrm{i}\\right) \\cdot"
                + " 1.414^{k} \\cdot \\exp\\left(0.7854 \\mathrm{i} k\\right) + 0.7071 \\cdot"
                + " \\exp\\left(0.7854 \\mathrm{i}\\right) \\cdot 1.414^{k} \\cdot \\exp\\left(-0.7854 \\mathrm{i}"
                + " k\\right)'",
        "gaussian-one-plus-i | formula: 'y(k+1)', is: '0.7071*exp(-0.7854 i)*(1.414*exp(0.7854 i))^k"
                + " + 0.7071*exp(0.7854 i)*(1.414*exp(-0.7854 i))^k'"
    })
    void conjugateExponentialsAreRoundedInEveryDecimal(String model, String claim) {
        assertRounded(model, claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "inventory-policy | formula: '0', is: '0.2856541136"
                + " + 0.4184932100*exp(1.596670737*i)*0.2602152955^k*exp(1.209429203*i*k)"
                + " + 0.4184932100*exp(1.596670737*i)*0.2602152955^k*exp(-1.209429203*i*k) - 0.2640000000*delta(k)'",
        "inventory-policy | formula: '0', is: '0.2856541136"
                + " + 0.4184932100*exp(1.596670737*i)*0.2602152955^k*exp(1.209429203*i*k)"
                + " + 0.4184932100*exp(-1.596670773*i)*0.2602152955^k*exp(-1.209429203*i*k) - 0.2640000000*delta(k)'"
    })
    void conjugateExponentialsAreWrongInOneSignOrDigit(String model, String claim) {
        assertWrong(model, claim);
    }

    @Test
    void complexPartialFractionsBesideAConstantAreRoundedInEveryDecimal() {
        String text = "expansion: '0', is: '0.2857*z/(z - 1) + (-0.01083 + 0.4184*i)*z/(z - (0.09200 + 0.2434*i))"
                + " + (-0.01083 - 0.4184*i)*z/(z - (0.09200 - 0.2434*i)) - 0.2640'";
        assertRounded("inventory-policy", text);
        assertWrong("inventory-policy", text.replace("-0.01083 - 0.4184", "-0.01083 - 0.4148"));
    }

    @Test
    void aSlowPoleBesideAFastOneOfNearlyNoWeightIsBoundedClosely() {
        Claims claims = Judged.read(Path.of("test-data/models"), "storage-cavern", "", List.of("{formula: 'thinned', is:"
                + " '0.333326667 + 0.142857143*0.999999400^k - 0.476183810*0.999999400^k + 0.142857143*0.995000000^k"
                + " - 0.142857143*0.995000000^k'}"));
        Judgement judgement = Judging.of(claims.claims().get(0), Truth.of(claims.model().chain()));
        assertEquals(Verdict.ROUNDED, judgement.verdict(), judgement::toString);
        assertTrue(judgement.difference().orElseThrow().size().value().compareTo(Rational.parse("1e-5")) < 0,
                judgement::toString);
    }

    @Test
    void theSafeSideIsLostWhereARoundedPoleOvertakes() {
        String text = "formula: 'fixed', is: '1 + 0.39720*0.25000^k - 1.3612*POLE^k - 0.028888*(-0.30902)^k',"
                + " within: 0.0089, safe side: above";
        Judgement larger = judged("full-sib-mating", text.replace("POLE", "0.80902"));
        assertEquals(Verdict.WRONG, larger.verdict(), larger::toString);
        // 1.3612 * 0.80902^k is more than 1.37082 * 0.8090169944^k where k > log(1.37082/1.3612)/log(0.80902/0.80901…)
        assertEquals(1896, larger.firstWrongStep().getAsLong());
        Judgement smaller = judged("full-sib-mating", text.replace("POLE", "0.80901"));
        assertEquals(Verdict.APPROXIMATE, smaller.verdict(), smaller::toString);
    }
}
