package org.pofk.answer;

import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.Supplier;
import org.pofk.chain.Chain;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.ModeValues;
import org.pofk.transform.Sequence;

/**
 * The least k with F(k) ≥ p, for a distribution function F. Certified by enclosures of F from its modes, and by exact
 * values where these can't tell F(k) from p.
 *
 * @param k      empty where F never reaches p, or where that isn't decided
 * @param reason why there is no k
 */
public record Percentile(Rational p, OptionalInt k, Optional<Reason> reason) {

    /** Why there is none; the last one: F and p agree to many digits at a step too far for exact values. */
    public enum Reason { NEVER, BEYOND_TWO_BILLION_STEPS, NOT_DECIDED }

    /** Finds percentiles of one distribution. */
    public static final class Finder {
        private static final int[] BITS = {64, 512, 4096};
        private static final int EXACT_UP_TO = 20_000;

        private final ModeValues modes;
        private final Rational limit;
        private final boolean reachesLimit;
        private final Supplier<Sequence> exact;

        /**
         * @param limit what F tends to. Since F never falls, it reaches that at some step only where it stays constant
         *              from there on: when Y(z) has no poles but zero and one
         */
        public Finder(Chain chain, ClosedForm distribution, Rational limit) {
            this.modes = ModeValues.of(distribution);
            this.limit = limit;
            this.reachesLimit = distribution.transform().factors().factors().stream().allMatch(factor ->
                    factor.polynomial().equals(Polynomial.ofIntegers(0, 1))
                            || factor.polynomial().equals(Polynomial.ofIntegers(-1, 1)));
            this.exact = () -> Sequence.of(chain, distribution.transform());
        }

        public Percentile of(Rational p) {
            int against = p.compareTo(limit);
            if (against > 0 || against == 0 && !reachesLimit) {
                return none(p, Reason.NEVER);
            }
            long low = -1;
            long high = 0;
            while (true) {
                Optional<Boolean> reached = isReached(p, (int) high);
                if (reached.isEmpty()) {
                    return none(p, Reason.NOT_DECIDED);
                }
                if (reached.get()) {
                    return between(p, low, high);
                }
                if (high == Integer.MAX_VALUE) {
                    return none(p, Reason.BEYOND_TWO_BILLION_STEPS);
                }
                low = high;
                high = Math.min(2 * high + 1, Integer.MAX_VALUE);
            }
        }

        /** F(low) is below p, F(high) is not. */
        private Percentile between(Rational p, long low, long high) {
            long below = low;
            long reached = high;
            while (reached - below > 1) {
                long middle = (below + reached) / 2;
                Optional<Boolean> is = isReached(p, (int) middle);
                if (is.isEmpty()) {
                    return none(p, Reason.NOT_DECIDED);
                }
                if (is.get()) {
                    reached = middle;
                } else {
                    below = middle;
                }
            }
            return new Percentile(p, OptionalInt.of((int) reached), Optional.empty());
        }

        /** Whether F(k) ≥ p. */
        public Optional<Boolean> isReached(Rational p, int k) {
            Enclosed value = modes.at(k);
            for (int bits : BITS) {
                Ball difference = value.enclose(bits).minus(Ball.of(p, bits));
                if (!difference.containsZero()) {
                    return Optional.of(difference.isPositive());
                }
            }
            return k <= EXACT_UP_TO ? Optional.of(exact.get().at(k).compareTo(p) >= 0) : Optional.empty();
        }

        public static Percentile none(Rational p, Reason reason) {
            return new Percentile(p, OptionalInt.empty(), Optional.of(reason));
        }
    }
}
