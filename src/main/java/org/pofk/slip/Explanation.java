package org.pofk.slip;

import java.util.List;
import java.util.Optional;

/**
 * What explains a wrong claim.
 *
 * @param slips    simplest first; each alone, or all together where {@code together} holds
 * @param models   other truths of which the claim is true, for what follows from it
 * @param rest     what is left where there are none
 */
record Explanation(List<Slip> slips, boolean together, List<Candidate> models, Optional<String> rest) {
    /** Nothing is to be said. */
    static final Explanation NOTHING = new Explanation(List.of(), false, List.of(), Optional.empty());

    Explanation {
        slips = List.copyOf(slips);
        models = List.copyOf(models);
    }
}
