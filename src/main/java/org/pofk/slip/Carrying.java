package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.claim.Claim;
import org.pofk.claim.Judging;
import org.pofk.claim.Truth;

/** Whether a wrong claim is right for what an earlier wrong one implies. */
final class Carrying {
    private Carrying() {
    }

    /** The first earlier step that a claim follows from. */
    static OptionalInt from(Claim claim, Truth truth, List<Implied> implied) {
        for (Implied each : implied) {
            Optional<Claim> seen = each.seen().apply(claim);
            if (seen.isPresent() && Judging.of(seen.get(), each.truth().get()).isRight()) {
                return OptionalInt.of(each.from());
            }
        }
        return OptionalInt.empty();
    }
}
