package org.pofk.claim;

import java.util.OptionalLong;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Quantity;

/**
 * The first step at which a formula can't be p(k) whatever numbers its decimals stand for. Certified; only a few
 * steps are looked at, so none found proves nothing.
 */
final class Refutation {
    private Refutation() {
    }

    /** Among the first {@code count} steps claimed. */
    static OptionalLong of(ExponentialSum claimed, OutputTruth truth, ClaimedSteps steps, int count) {
        long k = steps.from();
        for (int i = 0; i < count; k++) {
            if (steps.to().isPresent() && k > steps.to().getAsLong()) {
                return OptionalLong.empty();
            }
            if (steps.includes(k)) {
                if (!Spread.mayBe(claimed.valueAt(k), Quantity.of(truth.valueAt(k)))) {
                    return OptionalLong.of(k);
                }
                i++;
            }
        }
        return OptionalLong.empty();
    }
}
