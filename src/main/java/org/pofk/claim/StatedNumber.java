package org.pofk.claim;

import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/** A number of a claim: as its author wrote it, and what that means. */
record StatedNumber(FormulaText text, Quantity value) {

    /** Refused, with the place, where it means nothing, as 1/0. */
    static StatedNumber of(FormulaText text, Claim claim) throws RefusedException {
        return new StatedNumber(text, ExponentialSum.of(text.parsed(), new Precision(claim.carried())).valueAt(0));
    }

}
