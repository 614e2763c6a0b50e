package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import org.pofk.claim.Claim;
import org.pofk.claim.Claims;
import org.pofk.claim.Verdict;

/**
 * A derivation with what is said of each of its steps.
 *
 * @param findings  in the order of the claims; fewer than these where the work was stopped
 * @param notStated what the file doesn't state and was therefore not checked, one entry each
 */
public record ReviewedClaims(Claims claims, List<Finding> findings, List<String> notStated) {
    public ReviewedClaims {
        findings = List.copyOf(findings);
        notStated = List.copyOf(notStated);
    }

    /** The first step that is wrong and follows from no earlier one. */
    public Optional<Finding> firstWrong() {
        return findings.stream().filter(finding -> finding.verdict() == Verdict.WRONG).findFirst();
    }

    /** The steps that were not reached before the work was stopped. */
    public List<Claim> notReached() {
        return claims.claims().subList(findings.size(), claims.claims().size());
    }
}
