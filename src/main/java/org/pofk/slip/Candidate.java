package org.pofk.slip;

import java.util.function.Supplier;
import org.pofk.claim.Claim;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.text.Span;

/**
 * What a wrong claim may be explained by: the claim that would be made without the slip, or the truth for which the
 * claim as it stands would be right.
 *
 * @param corrected the whole statement without the slip
 */
record Candidate(SlipKind kind, Span span, String found, String right, Supplier<String> corrected, Claim claim,
        Supplier<Truth> truth) {

    Slip slip() {
        return new Slip(kind, span, found, right, corrected.get());
    }

    /** A claim with another statement. */
    static Claim with(Claim claim, Statement statement) {
        return new Claim(claim.number(), claim.kind(), claim.of(), statement, claim.where(), claim.steps(),
                claim.carried(), claim.within(), claim.safeSide(), claim.note(), claim.position());
    }
}
