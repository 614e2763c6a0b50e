package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;

/**
 * A formula at face value as an approximation of p(k): how far it is off at most over all steps claimed, and whether it
 * stays on the safe side. Certified.
 *
 * @param firstWrongStep a step at which it isn't what is claimed
 */
record Approximation(Decision holds, Optional<Judgement.Difference> difference, OptionalLong firstWrongStep,
        List<String> remarks) {

    /** For a claim that says within what. */
    static Approximation of(ExponentialSum claimed, OutputTruth truth, ClaimedSteps steps, Claim claim) {
        Claim.Within within = claim.within().orElseThrow();
        Measure measure = within.relative() ? Measure.RELATIVE : Measure.ABSOLUTE;
        ErrorCurve curve = within.relative() ? ErrorCurve.relative(claimed, truth)
                : ErrorCurve.absolute(claimed, truth);
        LargestError largest = LargestError.of(curve, steps.range());
        List<String> remarks = new ArrayList<>();
        largest.remark().ifPresent(remarks::add);
        OptionalLong wrong = OptionalLong.empty();
        Decision holds = largest.isAtMost(within.amount());
        if (holds == Decision.NO) {
            wrong = LeastStepAbove.of(curve, within.amount(), steps.range()).step();
        }
        if (claim.safeSide().isPresent()) {
            SafeSide safe = SafeSide.of(claimed, truth, steps.range(), claim.safeSide().get());
            if (safe.holds() == Decision.NO) {
                remarks.add(safe.told(claim.safeSide().get()));
                wrong = wrong.isEmpty() || wrong.getAsLong() > safe.step().getAsLong() ? safe.step() : wrong;
            }
            holds = holds == Decision.NO || safe.holds() == Decision.NO ? Decision.NO
                    : holds == Decision.YES ? safe.holds() : holds;
        }
        return new Approximation(holds, largest.difference(measure), wrong, remarks);
    }
}
