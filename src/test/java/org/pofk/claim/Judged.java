package org.pofk.claim;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.pofk.input.ClaimsReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/** Claims as text, read and judged. */
final class Judged {
    private static final Path FOLDER = Path.of("test-data/models");

    private Judged() {
    }

    /** One claim about a model that comes with the program, {@code {value: lost, at: 5, is: 0.008}}. */
    static Judgement of(String model, String claim) {
        return of(model, "", claim);
    }

    /** The same under what the file says of all claims, {@code {carried: 4 significant}}. */
    static Judgement of(String model, String review, String claim) {
        Claims claims = read(FOLDER, model, review, List.of(claim));
        return Judging.of(claims.claims().get(0), Truth.of(claims.model().chain()));
    }

    static Claims read(Path folder, String model, String review, List<String> claims) {
        String text = "pofk-claims: 1\nmodel: " + model + ".yaml\n" + (review.isEmpty() ? "" : "review: " + review + "\n")
                + "claims:\n" + String.join("", claims.stream().map(claim -> "  - " + claim + "\n").toList());
        try {
            return ClaimsReader.read(Source.ofText("claims.yaml", text), Optional.of(folder), Overrides.NONE);
        } catch (RefusedException e) {
            throw new AssertionError(text, e);
        }
    }
}
