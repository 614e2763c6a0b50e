package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.claim.Claim;
import org.pofk.claim.Judgement;
import org.pofk.claim.Verdict;

/**
 * What a review says of one claim.
 *
 * @param judgement   the claim held against what is true
 * @param verdict     that of the judgement, or {@link Verdict#CARRIED}
 * @param carriedFrom the number of the earlier wrong step it follows from
 * @param slips       what explains a wrong claim, simplest first: each alone makes it right, or, where
 *                    {@code together} is present, all of them together do
 * @param rest        what is left over where nothing explains it, in one sentence
 */
public record Finding(Claim claim, Judgement judgement, Verdict verdict, OptionalInt carriedFrom, List<Slip> slips,
        boolean together, Optional<String> rest) {
    public Finding {
        slips = List.copyOf(slips);
    }
}
