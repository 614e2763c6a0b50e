package org.pofk.check;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.claim.Claims;
import org.pofk.exact.Rational;
import org.pofk.input.ClaimsReader;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.slip.Finding;
import org.pofk.slip.Reviewing;
import org.pofk.text.RefusedException;

/** What the tool says of claims, by the way a claims file takes: read as text, then reviewed. */
final class Reviewed {
    private Reviewed() {
    }

    static Claims read(String text, Path folder) throws RefusedException {
        return ClaimsReader.read(Source.ofText("claims.yaml", text), Optional.of(folder), Overrides.NONE);
    }

    /** A finding for each claim. */
    static List<Finding> findings(List<Claimed> claims) {
        Path model = claims.get(0).subject().file();
        String text = Claimed.file(claims, model.getFileName().toString());
        try {
            return findings(read(text, model.getParent()), model);
        } catch (RefusedException e) {
            throw new AssertionError("refused: " + e.getMessage() + "\n" + text, e);
        }
    }

    static List<Finding> findings(Claims claims, Path model) {
        return Reviewing.of(claims, (parameter, value) -> variant(model, parameter, value)).findings();
    }

    private static Optional<Chain> variant(Path model, String parameter, Rational value) {
        try {
            return Optional.of(ModelReader.read(model,
                    new Overrides(Map.of(parameter, value.toString()), Optional.empty())).chain());
        } catch (RefusedException e) {
            return Optional.empty();
        }
    }
}
