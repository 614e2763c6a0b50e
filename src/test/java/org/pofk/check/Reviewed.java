package org.pofk.check;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.Claims;
import org.pofk.input.ClaimsReader;
import org.pofk.input.ModelVariants;
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
        Subject subject = claims.get(0).subject();
        String text = Claimed.file(claims, subject.file().getFileName().toString());
        try {
            return Reviewing.of(read(text, subject.file().getParent()), subject.known(), ignored -> { }).findings();
        } catch (RefusedException e) {
            throw new AssertionError("refused: " + e.getMessage() + "\n" + text, e);
        }
    }

    static List<Finding> findings(Claims claims) {
        return Reviewing.of(claims, ModelVariants.of(claims, Overrides.NONE)).findings();
    }
}
