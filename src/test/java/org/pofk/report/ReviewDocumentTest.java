package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.claim.Claims;
import org.pofk.slip.ReviewedClaims;
import org.pofk.text.Alphabet;
import org.pofk.text.Columns;

class ReviewDocumentTest {
    private static String text(ReviewedClaims reviewed, Alphabet alphabet) {
        return TextWriter.of(alphabet, StandardCharsets.UTF_8).write(
                ReviewDocument.of(reviewed, ClaimsText.of(MadeUpReview.TEXT), "pofk 1.0"));
    }

    @Test
    void aReviewReadsAsItsFileSays() throws Exception {
        assertEquals(Files.readString(Path.of("src/test/resources/made-up-review.txt")),
                text(MadeUpReview.review(), Alphabet.UNICODE));
    }

    @Test
    void caretsStandBelowWhatIsMeant() throws Exception {
        List<String> lines = text(MadeUpReview.review(), Alphabet.UNICODE).lines().toList();
        List<String> marked = IntStream.range(1, lines.size()).filter(i -> lines.get(i).matches(" +\\^+"))
                .mapToObj(i -> lines.get(i - 1).substring(lines.get(i).indexOf('^'), lines.get(i).length())).toList();
        assertEquals(List.of("+ 0.009084*0.2317^k", "0.4580", "0.66"), marked);
    }

    @Test
    void onlyANameIsLongerThanALine() throws Exception {
        text(MadeUpReview.review(), Alphabet.UNICODE).lines()
                .forEach(line -> assertTrue(Columns.width(line) <= 80, line));
        assertTrue(text(MadeUpReview.review(), Alphabet.ASCII).chars().allMatch(c -> c < 128));
    }

    @Test
    void whatWasNotReachedIsNamed() throws Exception {
        ReviewedClaims all = MadeUpReview.review();
        ReviewedClaims some = new ReviewedClaims(all.claims(), all.findings().subList(0, 6), all.notStated());
        assertTrue(text(some, Alphabet.UNICODE).contains("\nStopped before claims 7, 8: the budget was used up."));
        assertEquals(Set.of(), problems(some));
    }

    @Test
    void aFileWithoutClaimsSaysSo() throws Exception {
        Claims claims = MadeUpReview.review().claims();
        ReviewedClaims none = new ReviewedClaims(
                new Claims(claims.model(), claims.origin(), claims.review(), List.of()), List.of(), List.of());
        assertTrue(text(none, Alphabet.UNICODE).contains("\nNo claims yet: the file states no step of a derivation.\n"));
        assertEquals(Set.of(), problems(none));
    }

    @Test
    void asDataItKeepsItsSchema() throws Exception {
        assertEquals(Set.of(), problems(MadeUpReview.review()));
        JsonNode data = new ObjectMapper().readTree(VerdictsJson.write(MadeUpReview.review()));
        assertEquals(3, data.get("firstWrong").intValue());
        assertEquals("sign of a term", data.at("/claims/2/slips/0/name").textValue());
        assertEquals("2.31e-4", data.at("/claims/2/largestDifference").textValue());
        assertEquals(3, data.at("/claims/3/carriedFrom").intValue());
    }

    private static Set<?> problems(ReviewedClaims reviewed) throws Exception {
        try (InputStream schema = VerdictsJson.class.getResourceAsStream("/org/pofk/schema/verdicts.schema.json")) {
            return JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012).getSchema(schema)
                    .validate(new ObjectMapper().readTree(VerdictsJson.write(reviewed)));
        }
    }
}
