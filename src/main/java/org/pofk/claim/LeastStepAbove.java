package org.pofk.claim;

import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * The first step at which an error is larger than a bound. Certified: ranges of k in which it is bounded by less are
 * left out whole, the others halved.
 *
 * @param step    the step; empty for none, or where the work allowed wasn't enough
 * @param decided whether an empty step means none
 */
record LeastStepAbove(OptionalLong step, boolean decided) {
    private static final int FIRST_BITS = 192;
    private static final int MOST_BITS = 1_536;
    private static final int MOST_RANGES = 1_000;
    private static final long FARTHEST = 1L << 52;

    static LeastStepAbove of(ErrorCurve curve, Rational bound, Claim.Steps steps) {
        LargestError largest = LargestError.of(curve, steps);
        if (largest.upTo().filter(upTo -> upTo.compareTo(bound) <= 0).isPresent()) {
            return new LeastStepAbove(OptionalLong.empty(), true);
        }
        Search search = new Search(curve, bound);
        long last = largest.at().isPresent() ? largest.at().getAsLong() : steps.to().orElse(FARTHEST);
        for (long first = steps.from(), length = 64; first <= last; first += length, length *= 2) {
            OptionalLong found = search.within(first, Math.min(last, first + length - 1));
            if (found.isPresent() || search.isOver()) {
                return new LeastStepAbove(found, found.isPresent());
            }
        }
        return new LeastStepAbove(OptionalLong.empty(), largest.kind() == LargestError.Kind.REACHED);
    }

    private static final class Search {
        private final ErrorCurve curve;
        private final EnclosedError error;
        private final Rational bound;
        private int ranges;

        Search(ErrorCurve curve, Rational bound) {
            this.curve = curve;
            this.error = curve.enclose(FIRST_BITS);
            this.bound = bound;
        }

        boolean isOver() {
            return ranges > MOST_RANGES;
        }

        OptionalLong within(long first, long last) {
            ranges++;
            if (isOver() || first > last) {
                return OptionalLong.empty();
            }
            if (first == last) {
                return isAbove(first) ? OptionalLong.of(first) : OptionalLong.empty();
            }
            if (first > curve.lastImpulse() && isBounded(first, last)) {
                return OptionalLong.empty();
            }
            long middle = first + (last - first) / 2;
            OptionalLong early = within(first, middle);
            return early.isPresent() || isOver() ? early : within(middle + 1, last);
        }

        private boolean isBounded(long first, long last) {
            for (int residue = 0; residue < error.classes(); residue++) {
                Optional<Ball> all = error.over(residue, first, last);
                if (all.isEmpty() || all.get().upper().compareTo(bound) > 0) {
                    return false;
                }
            }
            return true;
        }

        /** Equal within the most bits counts as not above. */
        private boolean isAbove(long k) {
            for (int bits = FIRST_BITS; bits <= MOST_BITS; bits *= 2) {
                Optional<Ball> size = (bits == FIRST_BITS ? error : curve.enclose(bits)).at(k);
                if (size.isEmpty() && error.isInfiniteAt(k) || size.isPresent() && size.get().lower().compareTo(bound) > 0) {
                    return true;
                }
                if (size.isPresent() && size.get().upper().compareTo(bound) <= 0) {
                    return false;
                }
            }
            return false;
        }
    }
}
