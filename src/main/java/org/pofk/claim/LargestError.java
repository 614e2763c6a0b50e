package org.pofk.claim;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Comparator;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.PriorityQueue;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.ExponentialSum;

/**
 * The largest error of a formula at face value over all k it is claimed for. Certified: the first steps are gone
 * through one by one until what is bounded beyond them is smaller; where poles are slow, ranges of k are halved, the
 * one with the largest bound first, until none can hold an error that is larger by more than a thousandth.
 *
 * @param atLeast some error is as large, or comes arbitrarily near to it
 * @param upTo    no error is larger; empty where the error isn't bounded, or no bound was found
 * @param at      where it is that large, to a thousandth
 */
record LargestError(Kind kind, Rational atLeast, Optional<Rational> upTo, OptionalLong at) {
    private static final int FIRST_BITS = 160;
    private static final int MOST_BITS = 2_048;
    private static final int STEPS = 384;
    private static final int MOST_RANGES = 1_500;
    private static final long FARTHEST = 1L << 52;
    private static final MathContext TWO_DIGITS_UP = new MathContext(2, RoundingMode.CEILING);

    /** What is known of the largest error. */
    enum Kind {
        /** Reached at a step. */
        REACHED,
        /** Approached as k grows. */
        APPROACHED,
        /** A bound within the work allowed, which may be more than is reached. */
        AT_MOST,
        /** The error grows beyond every bound, or at a step where p(k) is zero there is no relative one. */
        UNBOUNDED,
        /** No bound was found. */
        NOT_DECIDED
    }

    static LargestError of(ExponentialSum claimed, OutputTruth truth, Claim.Steps steps) {
        return of(ErrorCurve.absolute(claimed, truth), steps);
    }

    static LargestError relative(ExponentialSum claimed, OutputTruth truth, Claim.Steps steps) {
        return of(ErrorCurve.relative(claimed, truth), steps);
    }

    static LargestError of(ErrorCurve curve, Claim.Steps steps) {
        for (int bits = FIRST_BITS; ; bits *= 2) {
            Search search = new Search(curve.enclose(bits), curve.lastImpulse(), steps);
            LargestError found = search.result();
            if (search.isSharp() || bits >= MOST_BITS) {
                return found;
            }
        }
    }

    /** As a result, with two digits, rounded up. */
    Optional<Judgement.Difference> difference(Measure measure) {
        return upTo.map(size -> new Judgement.Difference(Decimals.of(roundedUp(size), 2),
                measure == Measure.RELATIVE, at));
    }

    /** What has to be said besides the size. */
    Optional<String> remark() {
        return switch (kind) {
            case REACHED, APPROACHED -> Optional.empty();
            case AT_MOST -> Optional.of("the largest error is a bound: it may be smaller");
            case UNBOUNDED -> Optional.of("the error is beyond every bound");
            case NOT_DECIDED -> Optional.of("no bound on the error was found");
        };
    }

    /** Whether no error is larger than an amount. */
    Decision isAtMost(Rational amount) {
        if (upTo.isPresent() && upTo.get().compareTo(amount) <= 0) {
            return Decision.YES;
        }
        return atLeast.compareTo(amount) > 0 || kind == Kind.UNBOUNDED ? Decision.NO : Decision.UNDECIDED;
    }

    private static Rational roundedUp(Rational size) {
        return size.isZero() ? size : Rational.of(new BigDecimal(size.numerator())
                .divide(new BigDecimal(size.denominator()), TWO_DIGITS_UP));
    }

    private record Range(int residue, long first, long last, BigInteger bound) {
    }

    /** One search at one precision; numbers in units of 2^−bits. */
    private static final class Search {
        private final EnclosedError error;
        private final long lastImpulse;
        private final Claim.Steps steps;
        /** Some error is at least this, there. */
        private BigInteger least = BigInteger.ZERO;
        private OptionalLong at;
        private Kind reached = Kind.REACHED;
        /** No error looked at is more. */
        private BigInteger most = BigInteger.ZERO;
        private boolean blind;
        private boolean infinite;

        Search(EnclosedError error, long lastImpulse, Claim.Steps steps) {
            this.error = error;
            this.lastImpulse = lastImpulse;
            this.steps = steps;
            this.at = OptionalLong.of(steps.from());
        }

        /** Whether the precision was enough to tell the size. */
        boolean isSharp() {
            return infinite || !blind && (most.signum() == 0 || most.bitLength() > error.bits() / 4);
        }

        LargestError result() {
            if (steps.to().isEmpty() && error.grows()) {
                return without(Kind.UNBOUNDED);
            }
            long next = goThroughFirst();
            if (blind) {
                return without(infinite ? Kind.UNBOUNDED : Kind.NOT_DECIDED);
            }
            return next < 0 ? told(reached) : halve(next);
        }

        private LargestError told(Kind kind) {
            return new LargestError(kind, number(least), Optional.of(number(most)),
                    kind == Kind.REACHED ? at : OptionalLong.empty());
        }

        private LargestError without(Kind kind) {
            return new LargestError(kind, number(least), Optional.empty(), OptionalLong.empty());
        }

        private Rational number(BigInteger units) {
            return new Rational(units, BigInteger.ONE.shiftLeft(error.bits()));
        }

        /** The step to go on from; negative when all is said. */
        private long goThroughFirst() {
            for (int residue = 0; residue < error.classes() && steps.to().isEmpty(); residue++) {
                error.limit(residue).ifPresent(limit -> atLeast(limit, OptionalLong.empty(), Kind.APPROACHED));
            }
            long end = Math.max(steps.from() + STEPS, Math.min(lastImpulse + 1, steps.from() + 4L * STEPS));
            long check = Math.max(steps.from() + 4, lastImpulse + 1);
            EnclosedError.Stepping stepping = error.from(steps.from());
            for (long k = steps.from(); k < end && !blind; k++) {
                if (steps.to().isPresent() && k > steps.to().getAsLong()) {
                    return -1;
                }
                if (k == check && steps.to().isEmpty()) {
                    if (isSettledFrom(k)) {
                        return -1;
                    }
                    check += Math.max(4, (check - steps.from()) / 4);
                }
                look(k, stepping.next());
            }
            return end;
        }

        private void look(long k) {
            look(k, error.at(k));
        }

        private void look(long k, Optional<Ball> value) {
            if (value.isEmpty()) {
                blind = true;
                infinite |= error.isInfiniteAt(k);
                return;
            }
            Ball size = value.get().roundedTo(error.bits());
            most = most.max(high(size));
            atLeast(size, OptionalLong.of(k), Kind.REACHED);
        }

        private void atLeast(Ball size, OptionalLong where, Kind kind) {
            Ball rounded = size.roundedTo(error.bits());
            BigInteger low = rounded.center().subtract(rounded.radius());
            if (low.compareTo(least) > 0) {
                least = low;
                at = where;
                reached = kind;
            }
        }

        private static BigInteger high(Ball size) {
            return size.center().add(size.radius());
        }

        /** Whether no error from k on is larger than what is known to be reached or approached. */
        private boolean isSettledFrom(long k) {
            BigInteger allowed = reached == Kind.APPROACHED ? least.add(least.shiftRight(30)) : least;
            BigInteger bound = BigInteger.ZERO;
            for (int residue = 0; residue < error.classes(); residue++) {
                Optional<Ball> beyond = error.beyond(residue, k);
                if (beyond.isEmpty()) {
                    return false;
                }
                bound = bound.max(high(beyond.get().roundedTo(error.bits())));
                if (bound.compareTo(allowed) > 0 && bound.signum() > 0) {
                    return false;
                }
            }
            most = most.max(bound);
            return true;
        }

        private LargestError halve(long first) {
            OptionalLong last = steps.to().isPresent() ? steps.to() : settling(first);
            if (last.isEmpty()) {
                return bounded(first);
            }
            PriorityQueue<Range> ranges = new PriorityQueue<>(Comparator.comparing(Range::bound).reversed());
            for (int residue = 0; residue < error.classes(); residue++) {
                add(residue, first, last.getAsLong(), ranges);
            }
            for (int count = 0; !ranges.isEmpty() && !blind; count++) {
                Range top = ranges.poll();
                if (top.bound.compareTo(least.add(least.shiftRight(10))) <= 0) {
                    most = most.max(top.bound);
                    return told(reached);
                }
                if (count > MOST_RANGES) {
                    most = most.max(top.bound);
                    return told(Kind.AT_MOST);
                }
                long middle = aligned((top.first + top.last) / 2, top.residue);
                if (middle > top.last || top.last - top.first < error.classes()) {
                    look(aligned(top.first, top.residue));
                    continue;
                }
                look(middle);
                add(top.residue, top.first, middle - 1, ranges);
                add(top.residue, middle + 1, top.last, ranges);
            }
            return blind ? without(Kind.NOT_DECIDED) : told(reached);
        }

        /** The first step of the class that isn't before k. */
        private long aligned(long k, int residue) {
            return k + Math.floorMod(residue - k, (long) error.classes());
        }

        private void add(int residue, long first, long last, PriorityQueue<Range> ranges) {
            if (aligned(first, residue) <= last) {
                Optional<Ball> bound = error.over(residue, first, last);
                ranges.add(new Range(residue, first, last, bound.map(ball -> high(ball.roundedTo(error.bits())))
                        .orElse(BigInteger.ONE.shiftLeft(2 * error.bits()))));
            }
        }

        /** A step from which on the error is settled, by doubling. */
        private OptionalLong settling(long first) {
            for (long k = first; k < FARTHEST; k *= 2) {
                look(k);
                if (isSettledFrom(k)) {
                    return OptionalLong.of(k);
                }
            }
            return OptionalLong.empty();
        }

        /** The bound from a step on, without saying where. */
        private LargestError bounded(long first) {
            for (int residue = 0; residue < error.classes(); residue++) {
                Optional<Ball> beyond = error.beyond(residue, first);
                if (beyond.isEmpty()) {
                    return without(Kind.NOT_DECIDED);
                }
                most = most.max(high(beyond.get().roundedTo(error.bits())));
            }
            return told(Kind.AT_MOST);
        }
    }
}
