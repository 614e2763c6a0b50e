package org.pofk.claim;

import java.util.Map;
import java.util.Optional;
import java.util.function.LongPredicate;
import org.pofk.exact.Ball;
import org.pofk.exact.LeastCommonMultiple;

/**
 * The size of an {@link ErrorCurve} with all numbers enclosed: at one step, over ranges of steps of a class, and from
 * a step on. Certified: where a bound isn't found there is none.
 */
final class EnclosedError {
    private final EnclosedWaves difference;
    private final Map<Long, Ball> impulses;
    private final Optional<Reference> reference;
    private final int bits;
    private final int classes;

    /** p(k), for relative errors. */
    record Reference(EnclosedWaves truth, Map<Long, Ball> impulses, Ball largest, LongPredicate vanishes,
            LongPredicate agrees) {
    }

    EnclosedError(EnclosedWaves difference, Map<Long, Ball> impulses, Optional<Reference> reference, int bits) {
        this.difference = difference;
        this.impulses = impulses;
        this.reference = reference;
        this.bits = bits;
        this.classes = Math.toIntExact(LeastCommonMultiple.of(difference.classes(),
                reference.map(p -> p.truth.classes()).orElse(1)));
    }

    int bits() {
        return bits;
    }

    /** How many classes of k the bounds are given by. */
    int classes() {
        return classes;
    }

    boolean grows() {
        return difference.grows();
    }

    /** claimed(k) − p(k), with its sign. */
    Ball signedAt(long k) {
        return withImpulse(difference.valueAt(k), impulses, k);
    }

    private static Ball withImpulse(Ball value, Map<Long, Ball> impulses, long k) {
        Ball impulse = impulses.get(k);
        return impulse == null ? value : value.plus(impulse);
    }

    /** True where p(k) is zero and the formula isn't: there is no relative error, however large. */
    boolean isInfiniteAt(long k) {
        return reference.filter(p -> p.vanishes.test(k) && !p.agrees.test(k)).isPresent();
    }

    /** Empty where p(k) can't be told from zero, unless both are zero: then there is no error. */
    Optional<Ball> at(long k) {
        return at(k, difference.valueAt(k), reference.map(p -> p.truth.valueAt(k)));
    }

    private Optional<Ball> at(long k, Ball off, Optional<Ball> value) {
        if (reference.isEmpty()) {
            return Optional.of(withImpulse(off, impulses, k).abs());
        }
        Reference p = reference.get();
        Ball scale = impulses.containsKey(k) || p.impulses.containsKey(k)
                ? Ball.of(1, bits).dividedBy(Intervals.power(p.largest, k)) : Ball.of(1, bits);
        Ball error = scaled(off, impulses, scale, k);
        Ball truth = scaled(value.orElseThrow(), p.impulses, scale, k);
        return truth.containsZero() && p.vanishes.test(k) && p.agrees.test(k)
                ? Optional.of(Ball.of(0, bits)) : over(error, truth);
    }

    /** The errors at k = first, first + 1, …, each found from the one before. */
    Stepping from(long first) {
        return new Stepping(first);
    }

    /** Goes through the steps one by one. */
    final class Stepping {
        private final EnclosedWaves.Stepping differences;
        private final Optional<EnclosedWaves.Stepping> values;
        private long k;

        private Stepping(long first) {
            differences = difference.from(first);
            values = reference.map(p -> p.truth.from(first));
            k = first;
        }

        /** As {@link #at} has it at the step reached; then one further. */
        Optional<Ball> next() {
            Optional<Ball> error = at(k, differences.next(), values.map(EnclosedWaves.Stepping::next));
            k++;
            return error;
        }
    }

    private static Ball scaled(Ball value, Map<Long, Ball> impulses, Ball scale, long k) {
        Ball impulse = impulses.get(k);
        return impulse == null ? value : value.plus(impulse.times(scale));
    }

    private static Optional<Ball> over(Ball error, Ball truth) {
        return truth.containsZero() ? Optional.empty() : Optional.of(error.abs().dividedBy(truth.abs()));
    }

    /** Holds the error at all k of the class from first to last, none of which has an impulse. */
    Optional<Ball> over(int residue, long first, long last) {
        Ball error = difference.over(residue, first, last);
        return reference.isEmpty() ? Optional.of(error.abs())
                : over(error, reference.get().truth.over(residue, first, last));
    }

    /** Holds the error at all k of the class from first on. */
    Optional<Ball> beyond(int residue, long first) {
        Optional<Ball> error = difference.beyond(residue, first);
        return reference.isEmpty() || error.isEmpty() ? error.map(Ball::abs)
                : reference.get().truth.beyond(residue, first).flatMap(truth -> over(error.get(), truth));
    }

    /** What the error tends to in the class. */
    Optional<Ball> limit(int residue) {
        Optional<Ball> error = difference.limit(residue);
        return reference.isEmpty() || error.isEmpty() ? error.map(Ball::abs)
                : reference.get().truth.limit(residue).flatMap(truth -> over(error.get(), truth));
    }
}
