package org.pofk.report;

import org.pofk.answer.StepValue;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;

/** A value at a step, in decimals. */
final class ValueText {
    /** A certified value smaller than 2^−this is written 0: it may be. */
    private static final int SMALLEST_BITS = 4096;
    private static final Rational NEARLY_ONE = Rational.of(999, 1000);

    private ValueText() {
    }

    static String decimal(StepValue value, int digits) {
        if (value.exact().isPresent()) {
            return Decimals.of(value.exact().get(), digits).text();
        }
        return mayBeZero(value) ? "0" : Decimals.of(value.enclosure(), digits).text();
    }

    /** A probability: within 1e-3 of one, what it lacks to one is written to as many digits. */
    static String probability(Rational value, int digits) {
        boolean nearlyOne = value.compareTo(NEARLY_ONE) >= 0 && value.compareTo(Rational.ONE) < 0;
        return nearlyOne
                ? "1 − " + Decimals.of(Rational.ONE.minus(value), digits).text()
                : Decimals.of(value, digits).text();
    }

    private static boolean mayBeZero(StepValue value) {
        Ball ball = value.enclosure().enclose(1);
        for (int bits = 64; ball.containsZero() && bits <= SMALLEST_BITS; bits *= 2) {
            ball = value.enclosure().enclose(bits);
        }
        return ball.containsZero();
    }
}
