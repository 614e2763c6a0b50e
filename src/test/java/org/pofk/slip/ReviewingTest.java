package org.pofk.slip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.claim.Verdict;

/** A review names the slip, its place and what is right there, says what is carried, and finds nothing in what is right. */
class ReviewingTest {
    private static ReviewedClaims reviewed(String model, String... lines) {
        return Reviewing.of(Slipped.claims(model, lines), Variants.NONE);
    }

    private static Slip first(Finding finding) {
        assertEquals(Verdict.WRONG, finding.verdict(), finding::toString);
        assertFalse(finding.slips().isEmpty(), finding::toString);
        assertFalse(finding.together());
        return finding.slips().get(0);
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#formulas")
    void aSlipInAFormulaIsNamedFirst(Slipped slipped) {
        isNamedFirst(slipped);
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#transforms")
    void aSlipInATransformIsNamedFirst(Slipped slipped) {
        isNamedFirst(slipped);
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#transforms")
    void aRightTransformHasNoSlip(Slipped slipped) {
        hasNoSlip(slipped);
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#lists")
    void aSlipInAListIsNamedFirst(Slipped slipped) {
        isNamedFirst(slipped);
    }

    @Test
    void noneWhereThereIsALimitIsWrongWithoutASlip() {
        Finding finding = reviewed("pump-pair", "{long run: lost, is: none}").findings().get(0);
        assertEquals(Verdict.WRONG, finding.verdict());
        assertTrue(finding.slips().isEmpty());
    }

    private static void isNamedFirst(Slipped slipped) {
        Slip slip = first(Reviewing.of(slipped.claims(), Variants.NONE).findings().get(0));
        assertEquals(slipped.kind(), slip.kind());
        assertEquals(slipped.found(), slip.found());
        assertEquals(slipped.instead(), slip.right());
        assertTrue(slip.corrected().contains(slipped.right()), slip::corrected);
        assertEquals(4, slip.span().start().line());
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#formulas")
    void aRightFormulaHasNoSlip(Slipped slipped) {
        hasNoSlip(slipped);
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#lists")
    void aRightListHasNoSlip(Slipped slipped) {
        hasNoSlip(slipped);
    }

    private static void hasNoSlip(Slipped slipped) {
        Finding finding = Reviewing.of(slipped.rightClaims(), Variants.NONE).findings().get(0);
        assertTrue(finding.judgement().isRight(), finding::toString);
        assertEquals(List.of(), finding.slips());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            pump-pair    | {long run: lost, is: 0.1386}                  | OUTPUT_MISREAD     | one
            pump-pair    | {long run: lost, is: 0.991824}                | COMPLEMENT_QUOTED  | 0.991824
            pump-pair    | {value: lost, at: 2, is: 0.006708}            | INDEX_SHIFTED      | p(3)
            pump-pair    | {start: all, are: {one: 1}}                   | START_MISREAD      | start one
            pump-pair    | {value: lost, at: 1, is: 0.0200}              | START_MISREAD      | start one
            pump-pair    | {matrix: all, are: [[0.9025, 0.095, 0.0025], [0.6, 0.38, 0.02], [0, 0.6, 0.4]]} | MATRIX_TRANSPOSED | the matrix transposed
            valve-rotation | {long run: V1 on duty, is: 1/5}             | LONG_RUN_OF_A_CYCLE | the average over a cycle
            """)
    void aClaimThatIsTrueOfSomethingElseSaysOfWhat(String model, String line, SlipKind kind, String found) {
        Slip slip = first(reviewed(model, line).findings().get(0));
        assertEquals(kind, slip.kind());
        assertEquals(found, slip.found());
    }

    @Test
    void whatFollowsFromAnEarlierWrongStepIsCarriedAndNamesTheFirst() {
        List<Finding> findings = reviewed("pump-pair", "{start: all, are: {one: 1}}",
                "{value: lost, at: 1, is: 0.02}", "{value: one, at: 1, is: 0.38}").findings();
        assertEquals(Verdict.WRONG, findings.get(0).verdict());
        assertEquals(OptionalInt.of(1), findings.get(1).carriedFrom());
        assertEquals(OptionalInt.of(1), findings.get(2).carriedFrom());
        assertEquals(List.of(), findings.get(2).slips());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            0.008176 + 0.01726*0.4580^k + 0.009084*0.2317^k | SIGN_OF_A_TERM    | DIGITS_TRANSPOSED
            0.008176 - 0.01762*0.4508^k + 0.009804*0.2317^k | DIGITS_TRANSPOSED | DIGITS_TRANSPOSED
            0.008176 - 0.1726*0.4508^k - 0.009084*0.2317^k  | SIGN_OF_A_TERM    | DECIMAL_POINT_MOVED
            """)
    void twoSlipsInOneFormulaAreNamedTogether(String formula, SlipKind first, SlipKind second) {
        Finding finding = reviewed("pump-pair", "{formula: lost, is: '" + formula + "'}").findings().get(0);
        assertTrue(finding.together(), finding::toString);
        assertEquals(List.of(first, second), finding.slips().stream().map(Slip::kind).sorted().toList());
        finding.slips().forEach(slip ->
                assertEquals("0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k", slip.corrected()));
    }

    @Test
    void polesFromAWrongPolynomialAreCarriedAndOthersAreNot() {
        String polynomial = "{characteristic polynomial: all, is: '(z-1)*(z^2-0.6825 z+0.11445)'}";
        Finding carried = reviewed("pump-pair", polynomial, "{poles: lost, are: [1, 0.3860, 0.2965]}").findings().get(1);
        assertEquals(OptionalInt.of(1), carried.carriedFrom());
        Finding wrong = reviewed("pump-pair", polynomial, "{poles: lost, are: [1, 0.3890, 0.2965]}").findings().get(1);
        assertEquals(Verdict.WRONG, wrong.verdict());
    }

    @Test
    void otherNumbersInAllPlacesExplainNothing() {
        Finding finding = reviewed("pump-pair", "{long run: all, are: {both: 0.7311, one: 0.2277, none: 0.0412}}")
                .findings().get(0);
        assertEquals(Verdict.WRONG, finding.verdict());
        assertEquals(List.of(), finding.slips());
        assertTrue(finding.rest().isPresent());
    }

    @Test
    void aRightNumberBelowZeroTurnsTheSignBeforeIt() {
        String right = reviewed("pump-pair", "{formula: lost, is: '0.018176 + 0.11726*0.5508^k + 0.209084*0.3317^k'}")
                .findings().get(0).judgement().right();
        assertTrue(right.contains(" - 0.01") && !right.contains("(-"), right);
    }

    @Test
    void aFormulaFromAWrongTransformIsCarriedAndSoIsItsLongRun() {
        List<Finding> findings = reviewed("pump-pair", "{transform: lost, is: 'z*(0.0025 z + 0.0095)/((z-1)*(z^2-0.6825 z+0.10445))'}",
                "{formula: lost, is: '0.02844 - 0.08832*0.4508^k + 0.05988*0.2317^k'}",
                "{long run: lost, is: 0.02844}").findings();
        assertEquals(Verdict.WRONG, findings.get(0).verdict());
        assertEquals(SlipKind.DECIMAL_POINT_MOVED, findings.get(0).slips().get(0).kind());
        assertEquals(OptionalInt.of(1), findings.get(2).carriedFrom());
        assertEquals(OptionalInt.of(1), findings.get(1).carriedFrom());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            60 deg | 1.0583  | -19.107 deg | SIGN_OF_THE_PHASE
            60     | 1.0583  | 19.107 deg  | DEGREES_AS_RADIANS
            60 deg | 0.52915 | 19.107 deg  | PAIR_NOT_DOUBLED
            60 deg | 2.1166  | 19.107 deg  | PAIR_DOUBLED_TWICE
            60 deg | 1.0538  | 19.107 deg  | DIGITS_TRANSPOSED
            66 deg | 1.0583  | 19.107 deg  | WRONG_POLE
            """)
    void aSlipInAPairIsTheOnlyOneNamed(String angle, String amplitude, String phase, SlipKind kind) {
        Finding finding = reviewed("level-controller", "{pair: deviation, radius: 0.8, angle: " + angle
                + ", amplitude: " + amplitude + ", phase: " + phase + "}").findings().get(0);
        assertEquals(kind, first(finding).kind());
        assertEquals(1, finding.slips().size(), finding.slips()::toString);
    }

    @Test
    void whatADerivationLeavesOutIsSaid() {
        List<String> missing = reviewed("pump-pair", "{long run: lost, is: 0.008176}").notStated();
        assertTrue(missing.contains("the start"), missing::toString);
        assertTrue(missing.contains("of lost: the transform, the poles, the partial fractions, the formula"),
                missing::toString);
    }
}
