package org.pofk.claim;

import org.pofk.exact.NotSeparatedException;
import org.pofk.meaning.Quantity;

/** What the decimals of an expression allow it to be. Certified. */
final class Spread {
    private static final int BITS = 96;

    private Spread() {
    }

    /** False where no numbers that the decimals stand for give the value; one of a divisor may be zero. */
    static boolean mayBe(Quantity written, Quantity right) {
        try {
            return written.spread(BITS).overlaps(right.enclose(BITS));
        } catch (NotSeparatedException dividedByZero) {
            return true;
        }
    }
}
