package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.formula.PlainText;

/** What is hard to judge: many pairs, near poles in the same digits, poles on the unit circle, repeated eigenvalues. */
class JudgedCasesTest {
    private static final Path FOLDER = Path.of("src/test/resources/models");

    private static Judgement judged(String model, String claim) {
        Claims claims = Judged.read(FOLDER, model, "", List.of(claim));
        return Judging.of(claims.claims().get(0), Truth.of(claims.model().chain()));
    }

    @Test
    void formulasOfTwelveStatesWithThreePairsAreRoundedInEveryNotation() {
        Truth truth = Truth.of(Models.pattern("tunnel-ventilation"));
        int count = 0;
        for (Output output : truth.chain().outputs()) {
            assertEquals(3, truth.about(output).poles().stream().filter(pole -> !pole.isReal()).count());
            for (WrittenFormulas.Notation notation : WrittenFormulas.Notation.values()) {
                String text = WrittenFormulas.of(truth.about(output), notation, 5);
                assertEquals(Verdict.ROUNDED, JudgedFormulaTest.judged(truth, output, text).verdict(), text);
                count++;
            }
        }
        assertEquals(10, count);
    }

    @Test
    void formulasInCubeRootsWithDoublePairsAreExact() {
        Truth truth = Truth.of(Models.pattern("tandem-presses"));
        int count = 0;
        for (Output output : Outputs.states(truth.chain())) {
            String text = truth.about(output).closedForm().exactFormula().map(PlainText.ASCII::write).orElse("");
            if (text.contains("^(1/3)")) {
                assertEquals(Verdict.EXACT, JudgedFormulaTest.judged(truth, output, text).verdict(), text);
                count++;
            }
        }
        assertTrue(count >= 6, count + " formulas");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "press B | POLAR", "press B | DEGREES", "second stage | COSINE_AND_SINE", "press B | POWERS_OF_K"})
    void shiftedPairsOfDoublePolesAreRounded(String name, WrittenFormulas.Notation notation) {
        Truth truth = Truth.of(Models.pattern("tandem-presses"));
        Output output = Stream.concat(truth.chain().outputs().stream(),
                Outputs.states(truth.chain()).stream()).filter(each -> each.name().equals(name))
                .findFirst().orElseThrow();
        String text = WrittenFormulas.of(truth.about(output), notation, 3);
        assertEquals(Verdict.ROUNDED, JudgedFormulaTest.judged(truth, output, text).verdict(), text);
    }

    /** Poles 0.301 with coefficient 1 and 0.298 with coefficient 2, or −1. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "{formula: sum, is: '1 + 0.30^k + 2*0.30^k'} | ROUNDED", "{formula: sum, is: '1 + 2*0.3^k + 0.3^k'} | ROUNDED",
        "{formula: sum, is: '1 + 0.30^k + 2.1*0.30^k'} | WRONG", "{formula: sum, is: '1 + 3*0.30^k'} | WRONG",
        "{formula: difference, is: '1 + 0.30^k - 2*0.30^k'} | ROUNDED",
        "{formula: difference, is: '1 - 0.30^k'} | WRONG",
        "{transform: sum, is: 'z/(z-1) + z/(z-0.30) + 2*z/(z-0.30)'} | ROUNDED",
        "{poles: sum, are: [1, 0.30, 0.30]} | ROUNDED", "{residues: sum, are: {1: 1, 0.30: 1}} | ROUNDED",
        "{residues: sum, are: {1: 1, 0.30: 2}} | ROUNDED", "{residues: sum, are: {1: 1, 0.30: 3}} | WRONG"
    })
    void nearPolesInTheSameDigitsAreTwo(String claim, Verdict verdict) {
        assertEquals(verdict, judged("near-poles", claim).verdict(), claim);
    }

    /** cos(k arctan 4/3) beside a half and a seventh. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "{formula: turning, is: 'cos(0.9273*k)'} | ROUNDED",
        "{formula: turning, is: '1.000^k*cos(53.13 deg*k)'} | ROUNDED",
        "{formula: both, is: 'cos(0.9273*k) + 0.5^k'} | ROUNDED",
        "{formula: both, is: 'cos(0.9274*k) + 0.5^k'} | WRONG",
        "{formula: turning, is: 'cos(0.9273*k)', within: 0.1} | WRONG",
        "{formula: turning, is: 'cos(0.9273*k)', within: 0.1, for: k <= 100} | APPROXIMATE",
        "{pair: turning, radius: 1, angle: 0.9273, amplitude: 1, phase: 0} | ROUNDED",
        "{pair: turning, radius: 1, angle: 0.9373} | WRONG"
    })
    void angleInDecimalsOnTheUnitCircleIsRoundedAndNoApproximationForEver(String claim, Verdict verdict) {
        assertEquals(verdict, judged("turning", claim).verdict(), claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "z*(z-1/7)/((z-0.5)*(z-1/7)) | EXACT", "(z^2-0.143z)/(z^2-0.643z+0.0714) | ROUNDED",
        "(z^2-0.14286z)/(z^2-0.64286z+0.071429) | ROUNDED", "(z^2-0.14286z)/(z^2-0.64296z+0.071429) | WRONG",
        "(z^3-1.2z^2+z)/(z^3-1.7z^2+1.6z-0.5) | EXACT", "z*(z-0.143)/((z-0.5)*(z-0.144)) | WRONG"
    })
    void aCommonFactorLeftInIsNoFault(String transform, Verdict verdict) {
        assertEquals(verdict, judged("turning", "{transform: half, is: '" + transform + "'}").verdict(), transform);
    }

    /** The eigenvalue 1/3 has two eigenvectors; beside it a pair ± i/2. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "{characteristic polynomial: all, is: '(z-1/3)^2*(z^2+1/4)'} | EXACT",
        "{characteristic polynomial: all, is: '(z-1/3)*(z^2+1/4)'} | WRONG",
        "{minimal polynomial: all, is: '(z-1/3)*(z^2+1/4)'} | EXACT",
        "{minimal polynomial: all, is: '(z-1/3)^2*(z^2+1/4)'} | WRONG",
        "{characteristic polynomial: all, is: '(z-0.33)*(z-0.333)*(z^2+0.25)'} | ROUNDED",
        "{characteristic polynomial: all, is: '(z-0.34)*(z-0.333)*(z^2+0.25)'} | WRONG",
        "{characteristic polynomial: all, is: 'z^4 - 0.667z^3 + 0.361z^2 - 0.167z + 0.0278'} | ROUNDED",
        "{characteristic polynomial: all, is: 'z^4 - 0.667z^3 + 0.361z^2 - 0.176z + 0.0278'} | WRONG",
        "{poles: sum, are: [0.333, '0 ± 0.5 i']} | ROUNDED", "{poles: sum, are: [0.333 (twice), '± 0.5 i']} | WRONG",
        "{eigenvector: all, at: 1/3, is: {a: 1, b: 7}} | EXACT",
        "{eigenvector: all, at: 0.333, is: {a: 1, b: 0.7, c: 0.1}} | WRONG",
        "{eigenvector: all, at: 0.5i, is: {c: 1, d: -2i}} | EXACT",
        "{eigenvector: all, at: -0.5i, is: {c: 1, d: -2i}} | WRONG",
        "{eigenvector: all, at: 0.5i, is: {c: 0.354i, d: 0.71}} | ROUNDED",
        "{value: sum, at: 3, is: 0.200, within: 1%} | APPROXIMATE",
        "{value: sum, at: 3, is: 0.200, within: 1%, safe side: above} | APPROXIMATE",
        "{value: sum, at: 3, is: 0.2, within: 1%, safe side: below} | WRONG",
        "{value: sum, at: 3, is: 0.21, within: 1%} | WRONG"
    })
    void repeatedEigenvaluesAndComplexVectors(String claim, Verdict verdict) {
        assertEquals(verdict, judged("repeated", claim).verdict(), claim);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "[1, 0, 0] | EXACT", "[1.0, 0, 0, 1, 0, 0] | EXACT", "[0, 1, 0] | WRONG", "[1, 0] | WRONG", "1/3 | WRONG",
        "none | EXACT"})
    void cyclesOfALongRun(String values, Verdict verdict) {
        assertEquals(verdict, judged("cycle", "{long run: first, is: " + values + "}").verdict(), values);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "is: [0.99, 0, 0], within: 2% | APPROXIMATE", "is: [0.99, 0, 0], within: 2%, safe side: above | WRONG",
        "is: [0.99, 0, 0], within: 2%, safe side: below | APPROXIMATE", "is: [0.97, 0, 0], within: 2% | WRONG"})
    void approximateCycles(String rest, Verdict verdict) {
        assertEquals(verdict, judged("cycle", "{long run: first, " + rest + "}").verdict(), rest);
    }

    @Test
    void theRightTextIsTheNumberAloneInTheAuthorsNotation() {
        assertEquals("0.199", judged("repeated", "{value: sum, at: 3, is: 0.074}").right());
        assertEquals("\\frac{0.3333}{2}", judged("repeated",
                "{value: third, at: 1, is-latex: '\\frac{0.3343}{2}'}").right());
        assertEquals("1 + 1*0.301^k + 2*0.298^k", judged("near-poles",
                "{formula: sum, is: '1 + 1*0.301^k + 2*0.288^k'}").right());
    }
}
