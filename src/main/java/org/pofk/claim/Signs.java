package org.pofk.claim;

import java.util.OptionalInt;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/** Signs of real quantities at face value: read off enclosures, zero proved. */
final class Signs {
    private static final int FIRST_BITS = 64;
    private static final int MOST_BITS = 4_096;

    private Signs() {
    }

    /** −1, 0 or 1; empty where neither is decided. */
    static OptionalInt of(Quantity real) {
        if (real.rational().isPresent()) {
            return OptionalInt.of(real.rational().get().signum());
        }
        for (int bits = FIRST_BITS; bits <= FIRST_BITS * 4; bits *= 2) {
            OptionalInt sign = read(real, bits);
            if (sign.isPresent()) {
                return sign;
            }
        }
        Decision zero = real.isZero();
        if (zero == Decision.YES) {
            return OptionalInt.of(0);
        }
        for (int bits = FIRST_BITS * 8; bits <= MOST_BITS; bits *= 2) {
            OptionalInt sign = read(real, bits);
            if (sign.isPresent()) {
                return sign;
            }
        }
        return OptionalInt.empty();
    }

    private static OptionalInt read(Quantity real, int bits) {
        Ball ball = real.enclose(bits).real();
        return ball.isPositive() ? OptionalInt.of(1) : ball.isNegative() ? OptionalInt.of(-1) : OptionalInt.empty();
    }

    /** The sign of a − b. */
    static OptionalInt compare(Quantity a, Quantity b) {
        return of(a.minus(b));
    }

    static OptionalInt compare(Quantity a, Rational b) {
        return of(a.minus(Quantity.of(b)));
    }
}
