package org.pofk.claim;

import java.util.OptionalLong;
import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.SameSequence;

/**
 * The steps at which a formula is held against p(k): those it is claimed for, where it says something.
 *
 * @param from the first of them
 */
record ClaimedSteps(long from, OptionalLong to, ExponentialSum.Scope scope) {

    static ClaimedSteps of(Claim.Steps steps, ExponentialSum.Scope scope) {
        long from = steps.from();
        while (scope.silent().contains(from)) {
            from++;
        }
        OptionalLong to = scope.last().isEmpty() || steps.to().isPresent()
                && steps.to().getAsLong() <= scope.last().getAsLong() ? steps.to() : scope.last();
        return new ClaimedSteps(from, to, scope);
    }

    boolean includes(long k) {
        return k >= from && (to.isEmpty() || k <= to.getAsLong()) && scope.includes(k);
    }

    /** Whether a formula at face value is p(k) at every one of them. */
    Decision areExact(ExponentialSum claimed, OutputTruth truth) {
        return SameSequence.decide(claimed, truth::valueAt, truth.order(), from, to).same();
    }

    /** True where the formula is claimed for no step at all. */
    boolean isEmpty() {
        return to.isPresent() && to.getAsLong() < from;
    }

    Claim.Steps range() {
        return new Claim.Steps(from, to);
    }
}
