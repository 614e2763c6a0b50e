package org.pofk.claim;

import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Quantity;

/**
 * Whether a formula at face value is p(k) at every step claimed: its difference to p satisfies, beyond the impulses of
 * both, a recurrence of order m + n, so that it vanishes for ever when it does so m + n times in a row. Exact.
 */
final class ExactSequence {
    private ExactSequence() {
    }

    static Decision of(ExponentialSum claimed, OutputTruth truth, ClaimedSteps steps) {
        long impulses = Math.max(claimed.impulses().isEmpty() ? 0 : claimed.impulses().lastKey() + 1,
                truth.poleAtZero() + 1);
        long silent = steps.scope().silent().isEmpty() ? 0 : steps.scope().silent().last() + 1;
        long beyond = Math.max(steps.from(), Math.max(impulses, silent));
        long end = beyond + claimed.order() + truth.order();
        boolean isDecided = true;
        for (long k = steps.from(); k < end; k++) {
            if (steps.includes(k)) {
                Decision same = claimed.valueAt(k).minus(Quantity.of(truth.valueAt(k))).isZero();
                if (same == Decision.NO) {
                    return same;
                }
                isDecided &= same == Decision.YES;
            }
        }
        return isDecided ? Decision.YES : Decision.UNDECIDED;
    }
}
