package org.pofk.claim;

import org.pofk.exact.ComplexBall;
import org.pofk.meaning.Quantity;

/** Quantities in doubles, for guesses that are proved afterwards; they decide nothing. */
final class Guesses {
    private static final int BITS = 96;

    private Guesses() {
    }

    static double real(Quantity number) {
        return number.enclose(BITS).real().middle().approximate();
    }

    static double imaginary(Quantity number) {
        return number.enclose(BITS).imaginary().middle().approximate();
    }

    /** |a − b|. */
    static double distance(Quantity a, Quantity b) {
        ComplexBall difference = a.enclose(BITS).minus(b.enclose(BITS));
        return Math.hypot(difference.real().middle().approximate(), difference.imaginary().middle().approximate());
    }
}
