package org.pofk.claim;

import java.util.OptionalLong;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;

/**
 * The first step at which a formula can't be p(k) whatever numbers its decimals stand for. Certified; only a few steps
 * are looked at, so none found proves nothing.
 */
final class Refutation {
    private static final int BITS = 96;

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
                if (isRefutedAt(claimed, truth.valueAt(k), k)) {
                    return OptionalLong.of(k);
                }
                i++;
            }
        }
        return OptionalLong.empty();
    }

    private static boolean isRefutedAt(ExponentialSum claimed, Rational right, long k) {
        ComplexBall spread = claimed.valueAt(k).spread(BITS);
        Ball off = spread.real().minus(Ball.of(right, BITS));
        return !off.containsZero() || !spread.imaginary().containsZero();
    }
}
