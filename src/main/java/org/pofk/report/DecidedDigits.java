package org.pofk.report;

import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/** A number known by an enclosure that can't be made narrower: what it may be exactly, 0 or 1, else the digits decided. */
final class DecidedDigits {
    private static final List<Rational> WHOLE = List.of(Rational.ZERO, Rational.ONE);

    /** How a number is written to so many digits. */
    interface Writing {
        String of(Rational value, int digits);
    }

    private DecidedDigits() {
    }

    /** As many of the digits asked for as both ends of the enclosure agree in; its middle where they agree in none. */
    static String of(Ball ball, int digits, Writing writing) {
        if (ball.isExact()) {
            return writing.of(ball.middle(), digits);
        }
        for (Rational whole : WHOLE) {
            if (ball.contains(whole)) {
                return whole.toString();
            }
        }
        for (int decided = digits; decided > 0; decided--) {
            String text = writing.of(ball.lower(), decided);
            if (text.equals(writing.of(ball.upper(), decided))) {
                return text;
            }
        }
        return "≈ " + writing.of(ball.middle(), 1);
    }
}
