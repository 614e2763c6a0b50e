package org.pofk.report;

import java.util.Optional;
import org.pofk.answer.StepValue;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;

/** A value at a step, in decimals. */
final class ValueText {
    /** A certified value smaller than 2^−this is written 0: it may be. */
    private static final int SMALLEST_BITS = 4096;
    private static final Rational NEARLY_ONE = Rational.of(1, 1000);

    private ValueText() {
    }

    static String decimal(StepValue value, int digits) {
        if (value.exact().isPresent()) {
            return Decimals.of(value.exact().get(), digits).text();
        }
        return mayBeZero(value) ? "0" : Decimals.of(value.enclosure(), digits).text();
    }

    /** For the eye: within 1e-3 of one, what a value lacks to one is written to as many digits. */
    static String forReading(StepValue value, int digits) {
        Optional<Rational> missing = value.exact().map(Rational.ONE::minus)
                .filter(rest -> rest.signum() > 0 && rest.compareTo(NEARLY_ONE) <= 0);
        return missing.map(rest -> "1 − " + Decimals.of(rest, digits).text()).orElseGet(() -> decimal(value, digits));
    }

    private static boolean mayBeZero(StepValue value) {
        Ball ball = value.enclosure().enclose(1);
        for (int bits = 64; ball.containsZero() && bits <= SMALLEST_BITS; bits *= 2) {
            ball = value.enclosure().enclose(bits);
        }
        return ball.containsZero();
    }
}
