package org.pofk.exact;

import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.IntFunction;

/**
 * Raises the working precision until an enclosure is as close as asked; keeps the finest one. Certified. Safe for use
 * by several threads, which at worst do the same work twice.
 */
final class Raising<B> {
    /** No number of a model needs more; reached when a divisor is exactly zero, which the caller must have excluded. */
    static final int MOST_BITS = 1 << 18;
    private static final int FIRST_GUARD = 16;

    /** Whether an enclosure is within 2^−bits, relative for numbers above one. */
    interface Within<B> {
        boolean test(B enclosure, int bits);
    }

    private final IntFunction<B> atPrecision;
    private final Within<B> within;
    private final AtomicReference<Optional<B>> finest = new AtomicReference<>(Optional.empty());

    private final AtomicInteger sharedGuard;

    Raising(IntFunction<B> atPrecision, Within<B> within) {
        this(atPrecision, within, firstGuard());
    }

    /** @param sharedGuard bits that numbers of the same origin have needed so far; this one starts there, and adds */
    Raising(IntFunction<B> atPrecision, Within<B> within, AtomicInteger sharedGuard) {
        this.atPrecision = atPrecision;
        this.within = within;
        this.sharedGuard = sharedGuard;
    }

    static AtomicInteger firstGuard() {
        return new AtomicInteger(FIRST_GUARD);
    }

    B enclose(int bits) {
        Optional<B> known = finest.get();
        if (known.isPresent() && within.test(known.get(), bits)) {
            return known.get();
        }
        int guard = sharedGuard.get();
        while (guard < MOST_BITS) {
            try {
                B enclosure = atPrecision.apply(bits + guard);
                if (within.test(enclosure, bits)) {
                    finest.set(Optional.of(enclosure));
                    sharedGuard.accumulateAndGet(guard, Math::max);
                    return enclosure;
                }
            } catch (NotSeparatedException tooCoarse) {
                // more bits separate it from zero, or it is zero and the caller broke the contract
            }
            guard += guard / 2;
        }
        throw new AssertionError("not enclosed to 2^-" + bits + " with " + guard + " more bits: zero not excluded?");
    }
}
