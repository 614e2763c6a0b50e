package org.pofk.meaning;

import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * Whether a number is zero. No, when an enclosure excludes zero; yes, when it is zero in canonical form, or when an
 * enclosure closer than a separation bound still holds it; sums of angles by how far they turn. Certified; what isn't
 * seen to be algebraic, or needs more than {@link #MOST_BITS}, stays undecided unless some {@value #TRIED_BITS} bits
 * exclude zero.
 */
public final class ZeroTest {
    /** Beyond so many bits it isn't decided. */
    public static final int MOST_BITS = 200_000;
    /** The same with exponentials and angles, whose series take the square of the time. */
    public static final int MOST_BITS_OF_ANGLES = 10_000;
    private static final int FIRST_BITS = 96;
    private static final int TRIED_BITS = 3072;

    private ZeroTest() {
    }

    static Decision of(Quantity quantity) {
        if (quantity.rational().isPresent()) {
            return quantity.rational().get().isZero() ? Decision.YES : Decision.NO;
        }
        try {
            return excluded(quantity, FIRST_BITS) ? Decision.NO : exactly(quantity);
        } catch (ArithmeticException noSuchNumber) {
            return Decision.UNDECIDED;
        }
    }

    private static boolean excluded(Quantity quantity, int bits) {
        return !quantity.enclose(bits).containsZero();
    }

    private static Decision exactly(Quantity quantity) {
        Optional<Canonical.Form> form = Canonical.form(quantity).or(() -> ofTurn(quantity));
        if (form.isEmpty()) {
            return bySeparation(quantity, fromHeights(quantity));
        }
        return form.get().isZero()
                ? Decision.YES
                : bySeparation(form.get().value(), Optional.of(form.get().separation()));
    }

    /** That of e^(ix) − 1 for a sum x of angles: with |x| < 1 it is zero only where x is. */
    private static Optional<Canonical.Form> ofTurn(Quantity angle) {
        return Within.series(angle) && angle.enclose(FIRST_BITS).modulus().upper().compareTo(Rational.ONE) < 0
                ? Canonical.form(Quantity.i().times(angle).exponential().minus(Quantity.ONE)) : Optional.empty();
    }

    private static Optional<Long> fromHeights(Quantity quantity) {
        try {
            return Heights.separation(quantity);
        } catch (ArithmeticException beyondRange) {
            return Optional.empty();
        }
    }

    private static Decision bySeparation(Quantity quantity, Optional<Long> separation) {
        int most = Within.series(quantity) ? MOST_BITS_OF_ANGLES : MOST_BITS;
        Optional<Long> bound = separation.filter(bits -> bits <= most);
        // both parts within 2^(1 − bits) of zero: |x| < 2^(2 − bits)
        int enough = bound.map(bits -> bits.intValue() + 3).orElse(TRIED_BITS);
        for (int bits = FIRST_BITS; bits < enough; bits *= 2) {
            if (excluded(quantity, bits)) {
                return Decision.NO;
            }
        }
        if (excluded(quantity, enough)) {
            return Decision.NO;
        }
        return bound.isPresent() ? Decision.YES : Decision.UNDECIDED;
    }
}
