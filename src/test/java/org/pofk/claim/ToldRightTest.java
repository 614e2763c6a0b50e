package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.meaning.Fit;

/** What is said to be right in place of what is wrong. The poles of the model are 1 and 0.35 ± 0.1323 i. */
class ToldRightTest {
    private static final Path FOLDER = Path.of("src/test/resources/models");

    private static Judgement judged(String claim) {
        Claims claims = Judged.read(FOLDER, "turning-pair", "", List.of(claim));
        return Judging.of(claims.claims().get(0), Truth.of(claims.model().chain()));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "{residues: slipping, are: {0.35 + 0.1323 i: -0.0455}} | 0.35 + 0.1323 i: -0.04545 + 0.2233 i",
        "{pair: slipping, amplitude: 0.4558, phase: -1.772} | amplitude: 0.4558, phase: 1.772",
        "{pair: slipping, amplitude: 0.4557, phase: 8.054} | amplitude: 0.4558, phase: 8.055",
        "{value: slipping, at: 3, is: 0.07, within: 5%, safe side: below} | 0.068",
        "{value: slipping, at: 3, is: 0.07, safe side: below} | 0.068",
        "{long run: sound, is: 0.72, within: 5%, safe side: above} | sound: 0.73",
        "{long run: sound, is: 0.72, within: 0.3%, safe side: above} | sound: 0.728"
    })
    void theRightNumberIsNoneThatIsWrongItself(String claim, String right) {
        Judgement judgement = judged(claim);
        assertEquals(Verdict.WRONG, judgement.verdict(), claim);
        assertEquals(right, judgement.right());
    }

    @Test
    void whatStandsForAPairWithoutACosineHasNoRightNumberOfItsOwn() {
        Judgement judgement = judged("{formula: slipping, is: '0.09091 + 0.4558 * 0.3742^k'}");
        assertEquals(List.of("0.09091"), judgement.numbers().stream().map(number -> number.written().text()).toList());
        assertEquals(List.of(Fit.RIGHT), judgement.numbers().stream().map(Judgement.JudgedNumber::fit).toList());
        assertTrue(judgement.remarks().stream().anyMatch(remark -> remark.contains("without cosine")));
    }

    @Test
    void aRealNumberInPlaceOfAComplexOneHasNoRightDecimals() {
        Judgement judgement = judged("{residues: slipping, are: {0.35 + 0.1323 i: -0.0456}}");
        assertEquals(List.of("0.35", "0.1323"),
                judgement.numbers().stream().map(number -> number.written().text()).toList());
    }

    @Test
    void anEigenvectorAtNoEigenvalueIsToldTheEigenvalues() {
        Judgement judgement = judged("{eigenvector: all, at: 0.5, are: [1, 1, 1]}");
        assertEquals(Verdict.WRONG, judgement.verdict());
        assertTrue(judgement.numbers().isEmpty());
        assertEquals(List.of("0.5 is no eigenvalue; the eigenvalues are 1, 0.350000 + 0.132288 i,"
                + " 0.350000 - 0.132288 i"), judgement.remarks());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "[1] | false", "[1, 1, '0.35 ± 0.1323 i'] | false", "['1 (twice)', 0.35 + 0.1323 i] | false",
        "[1, '0.35 ± 0.1323 i'] | true"
    })
    void polesThatArentPairedHaveNoLargestError(String poles, boolean paired) {
        Judgement judgement = judged("{poles: slipping, are: " + poles + "}");
        assertEquals(paired, judgement.difference().isPresent(), poles);
        assertEquals(paired, judgement.isRight(), poles);
    }

    @ParameterizedTest
    @CsvSource({"deg", "degree", "degrees"})
    void anglesInDegreesAreNamedInWords(String word) {
        assertFalse(judged("{pair: slipping, radius: 0.3742, angle: 0.3614 " + word + "}").isRight());
        assertTrue(judged("{pair: slipping, radius: 0.3742, angle: 20.70 " + word + "}").isRight());
    }
}
