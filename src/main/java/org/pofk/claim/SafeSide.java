package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.stream.IntStream;
import org.pofk.exact.Ball;
import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Quantity;

/**
 * Whether a formula at face value lies on one side of p(k), or on it, at every step claimed. Certified: step by step,
 * until what is bounded beyond keeps its sign, seen over the power of the largest base of the difference; slow poles by
 * halving ranges of k.
 *
 * @param holds whether it does
 * @param step  a step at which it doesn't
 */
record SafeSide(Decision holds, OptionalLong step) {
    private static final int FIRST_BITS = 192;
    private static final int MOST_BITS = 1_536;
    private static final int STEPS = 256;
    private static final int MOST_RANGES = 2_000;
    private static final long FARTHEST = 1L << 52;

    static SafeSide of(ExponentialSum claimed, OutputTruth truth, Claim.Steps steps, Claim.SafeSide side) {
        return new Search(claimed, truth, steps, side).result();
    }

    /** Where it doesn't hold, in one sentence. */
    String told(Claim.SafeSide side) {
        return "at k = " + step.getAsLong() + " it lies " + (side == Claim.SafeSide.ABOVE ? "below" : "above")
                + " the true value";
    }

    private static final class Search {
        private final ExponentialSum claimed;
        private final OutputTruth truth;
        private final Claim.Steps steps;
        private final Claim.SafeSide side;
        private final ErrorCurve curve;
        private final EnclosedError error;
        private final EnclosedWaves unscaled;
        private final EnclosedWaves scaled;
        private int ranges;
        private boolean undecided;

        Search(ExponentialSum claimed, OutputTruth truth, Claim.Steps steps, Claim.SafeSide side) {
            this.claimed = claimed;
            this.truth = truth;
            this.steps = steps;
            this.side = side;
            this.curve = ErrorCurve.absolute(claimed, truth);
            this.error = curve.enclose(FIRST_BITS);
            this.unscaled = EnclosedWaves.of(curve.difference(), FIRST_BITS);
            this.scaled = scaled();
        }

        SafeSide result() {
            long end = Math.max(curve.lastImpulse() + 1, steps.from() + STEPS);
            long check = Math.max(steps.from() + 4, curve.lastImpulse() + 1);
            for (long k = steps.from(); k < end; k++) {
                if (isPast(k) || k == check && isSettled(k)) {
                    return told();
                }
                if (k == check) {
                    check += 8;
                }
                if (isAcross(k)) {
                    return new SafeSide(Decision.NO, OptionalLong.of(k));
                }
            }
            return halved(end);
        }

        private boolean isPast(long k) {
            return steps.to().isPresent() && k > steps.to().getAsLong();
        }

        private SafeSide told() {
            return new SafeSide(undecided ? Decision.UNDECIDED : Decision.YES, OptionalLong.empty());
        }

        private SafeSide halved(long first) {
            long last = first;
            while (!isPast(last) && !isSettled(last) && !isLost(last)) {
                last *= 2;
                if (last > FARTHEST) {
                    return new SafeSide(Decision.UNDECIDED, OptionalLong.empty());
                }
            }
            // a class that is lost from a step on has one within a period
            OptionalLong across = across(first, steps.to().isPresent() ? steps.to().getAsLong()
                    : last + scaled.classes());
            undecided |= ranges > MOST_RANGES;
            return across.isPresent() ? new SafeSide(Decision.NO, across) : told();
        }

        private OptionalLong across(long first, long last) {
            if (first > last || ++ranges > MOST_RANGES || keepsSide(first, last)) {
                return OptionalLong.empty();
            }
            if (first == last) {
                return isAcross(first) ? OptionalLong.of(first) : OptionalLong.empty();
            }
            long middle = first + (last - first) / 2;
            OptionalLong early = across(first, middle);
            return early.isPresent() ? early : across(middle + 1, last);
        }

        private boolean keepsSide(long first, long last) {
            return keepsSide(unscaled, first, last) || keepsSide(scaled, first, last);
        }

        private boolean keepsSide(EnclosedWaves waves, long first, long last) {
            for (int residue = 0; residue < waves.classes(); residue++) {
                if (!isSafe(waves.over(residue, first, last))) {
                    return false;
                }
            }
            return true;
        }

        private boolean isSafe(Ball difference) {
            return side == Claim.SafeSide.ABOVE
                    ? difference.lower().signum() >= 0 : difference.upper().signum() <= 0;
        }

        private boolean isUnsafe(Ball difference) {
            return side == Claim.SafeSide.ABOVE ? difference.isNegative() : difference.isPositive();
        }

        private boolean isAcross(long k) {
            Ball seen = k > curve.lastImpulse() ? scaled.valueAt(k) : Ball.of(0, FIRST_BITS);
            if (!seen.containsZero()) {
                return isUnsafe(seen);
            }
            for (int bits = FIRST_BITS; bits <= MOST_BITS; bits *= 2) {
                Ball difference = (bits == FIRST_BITS ? error : curve.enclose(bits)).signedAt(k);
                if (isSafe(difference) || isUnsafe(difference)) {
                    return isUnsafe(difference);
                }
                if (bits == FIRST_BITS && isEqual(k)) {
                    return false;
                }
            }
            undecided = true;
            return false;
        }

        private boolean isEqual(long k) {
            return claimed.valueAt(k).minus(Quantity.of(truth.valueAt(k))).isZero() == Decision.YES;
        }

        /** Whether it is on the wrong side at all steps of a class from one on. */
        private boolean isLost(long k) {
            return IntStream.range(0, scaled.classes()).anyMatch(residue ->
                    scaled.beyond(residue, k).filter(this::isUnsafe).isPresent());
        }

        private boolean isSettled(long k) {
            for (int residue = 0; residue < scaled.classes(); residue++) {
                Optional<Ball> beyond = scaled.beyond(residue, k);
                if (beyond.isEmpty() || !isSafe(beyond.get())) {
                    return false;
                }
            }
            return steps.to().isEmpty();
        }

        /** The difference over the power of its largest base: signs stay. */
        private EnclosedWaves scaled() {
            List<Wave> waves = new ArrayList<>();
            curve.difference().forEach(strand -> {
                waves.add(strand.strand().wave());
                strand.strand().nearlyOpposite().ifPresent(waves::add);
            });
            Quantity largest = waves.stream().map(wave -> modulus(wave.base()))
                    .max((a, b) -> a.enclose(64).real().middle().compareTo(b.enclose(64).real().middle()))
                    .orElse(Quantity.ONE);
            return EnclosedWaves.of(waves.stream().map(wave -> wave.over(largest))
                    .map(wave -> TurningStrand.of(new Strand(wave, Optional.empty()))).toList(), FIRST_BITS);
        }

        private static Quantity modulus(Quantity base) {
            return base.conjugate() == base
                    ? base.enclose(64).real().isNegative() ? base.negate() : base
                    : base.times(base.conjugate()).squareRoot();
        }
    }
}
