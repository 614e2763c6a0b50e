package org.pofk.slip;

import org.pofk.claim.Claims;

/** Judges a derivation step by step, names the slips and what follows from them. */
public final class Reviewing {
    private Reviewing() {
    }

    public static ReviewedClaims of(Claims claims, Variants variants) {
        throw new AssertionError("to come");
    }
}
