package org.pofk.slip;

import org.pofk.claim.Claim;
import org.pofk.claim.Judgement;
import org.pofk.claim.Truth;

/** What is said of a wrong claim that nothing explains. */
final class Rest {
    private Rest() {
    }

    static String of(Claim claim, Judgement judgement, Truth truth) {
        StringBuilder rest = new StringBuilder("no single slip explains it");
        judgement.firstWrongStep().ifPresent(k -> rest.append("; it is wrong from k = ").append(k).append(" on"));
        judgement.difference().ifPresent(difference -> rest.append("; it is off by ").append(difference.size())
                .append(difference.relative() ? " times the right value" : "").append(" at most"));
        return rest.toString();
    }
}
