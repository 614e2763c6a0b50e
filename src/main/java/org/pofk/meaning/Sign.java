package org.pofk.meaning;

import java.util.Optional;
import org.pofk.exact.Ball;

/** The sign of a real number: read off an enclosure that excludes zero, or zero proved. Certified. */
final class Sign {
    private static final int FIRST_BITS = 96;

    private Sign() {
    }

    static Optional<Integer> of(Quantity real) {
        if (real.rational().isPresent()) {
            return Optional.of(real.rational().get().signum());
        }
        Ball first = real.enclose(FIRST_BITS).real();
        if (!first.containsZero()) {
            return Optional.of(first.center().signum());
        }
        return switch (real.isZero()) {
            case YES -> Optional.of(0);
            case NO -> Optional.of(awayFromZero(real));
            case UNDECIDED -> Optional.empty();
        };
    }

    private static int awayFromZero(Quantity real) {
        int bits = 2 * FIRST_BITS;
        while (real.enclose(bits).real().containsZero()) {
            bits *= 2;
        }
        return real.enclose(bits).real().center().signum();
    }
}
