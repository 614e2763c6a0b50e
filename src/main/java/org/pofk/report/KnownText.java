package org.pofk.report;

import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StepValue;

/** A number of an answer in decimals, as many as are certain. */
final class KnownText {
    private static final int BITS = 128;
    private static final int BOUND_DIGITS = 2;

    private KnownText() {
    }

    /** For people: {@code 0.0376446}; {@code below 1.2e-30} or {@code above 1 − 1.2e-30} where no digit is certain. */
    static String of(KnownValue value, int digits) {
        return number(value, digits, ValueText::of, ValueText::of).orElseGet(() -> {
            Ball ball = value.enclosure().enclose(BITS);
            return ball.lower().compareTo(Rational.HALF) > 0 && ball.lower().compareTo(Rational.ONE) < 0
                    ? "above 1 − " + bound(Rational.ONE.minus(ball.lower())) : "below " + bound(largest(ball));
        });
    }

    /** A tenth more than the number: no rounding makes it less. */
    private static String bound(Rational number) {
        return Decimals.of(number.times(Rational.of(11, 10)), BOUND_DIGITS).text();
    }

    /** For people, an exact one with its fraction. */
    static String withFraction(KnownValue value, int digits) {
        return value.exact().map(exact -> new LongRunProse(digits).number(exact)).orElseGet(() -> of(value, digits));
    }

    /** For programs: always a number; none where no digit is certain. */
    static Optional<String> number(KnownValue value, int digits) {
        return number(value, digits, ValueText::number, ValueText::number);
    }

    private interface Exact {
        String of(Rational value, int digits);
    }

    private interface Long {
        String of(StepValue value, int digits);
    }

    private static Optional<String> number(KnownValue value, int digits, Exact exact, Long enclosed) {
        if (value.exact().isPresent()) {
            return Optional.of(exact.of(value.exact().get(), digits));
        }
        if (value.word() == KnownValue.Word.EXACT) {
            return Optional.of(enclosed.of(new StepValue(0, Optional.empty(), value.enclosure()), digits));
        }
        Ball ball = value.enclosure().enclose(BITS);
        Rational radius = ball.upper().minus(ball.middle());
        // within a hundredth of the last place; of the complement's where that is what is written
        Rational smallest = Rational.min(ball.middle().abs(), Rational.ONE.minus(ball.middle()).abs());
        return radius.times(Rational.of(10).pow(digits + 2)).compareTo(smallest) <= 0
                ? Optional.of(exact.of(ball.middle(), digits)) : Optional.empty();
    }

    private static Rational largest(Ball ball) {
        return Rational.max(ball.upper().abs(), ball.lower().abs());
    }
}
