package org.pofk.report;

import org.pofk.exact.Ball;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.steps.StepValue;

/**
 * A value in decimals. Between 0.999 and one, where it isn't its decimal, what it lacks to one has as many digits:
 * {@code 1 − 3.00000e-7} where people read it, {@code 0.999999700000} where a program does.
 */
final class ValueText {
    /** A certified value smaller than 2^−this is written 0, and one as near to one 1.00000: it may be. */
    private static final int SMALLEST_BITS = 4096;
    private static final int FIRST_BITS = 64;
    private static final Rational NEARLY_ONE = Rational.of(999, 1000);

    private ValueText() {
    }

    /** For people. */
    static String of(Rational value, int digits) {
        Decimal decimal = Decimals.of(value, digits);
        return isNearlyOne(value) && !decimal.exact()
                ? "1 − " + Decimals.of(Rational.ONE.minus(value), digits).text()
                : decimal.text();
    }

    /** For people. */
    static String of(StepValue value, int digits) {
        if (value.exact().isPresent()) {
            return of(value.exact().get(), digits);
        }
        if (mayBeZero(value.enclosure())) {
            return "0";
        }
        return isNearlyOne(value.enclosure())
                ? "1 − " + Decimals.of(lack(value.enclosure()), digits).text()
                : Decimals.of(value.enclosure(), digits).text();
    }

    /** Whether people read the value itself, not its decimals. */
    static boolean isExact(Rational value, int digits) {
        return Decimals.of(value, digits).exact()
                || isNearlyOne(value) && Decimals.of(Rational.ONE.minus(value), digits).exact();
    }

    /** For programs: always a number. */
    static String number(Rational value, int digits) {
        Decimal decimal = Decimals.of(value, digits);
        return isNearlyOne(value) && !decimal.exact()
                ? Decimals.fixed(value, places(Rational.ONE.minus(value), digits)).text()
                : decimal.text();
    }

    /** For programs: always a number. */
    static String number(StepValue value, int digits) {
        if (value.exact().isPresent()) {
            return number(value.exact().get(), digits);
        }
        if (mayBeZero(value.enclosure())) {
            return "0";
        }
        return isNearlyOne(value.enclosure())
                ? Decimals.fixed(value.enclosure(),
                        places(Decimals.of(lack(value.enclosure()), digits).value(), digits)).text()
                : Decimals.of(value.enclosure(), digits).text();
    }

    /** After the point, for so many digits of a number below one. */
    private static int places(Rational small, int digits) {
        int zeros = 0;
        for (Rational x = small.times(Rational.of(10)); x.compareTo(Rational.ONE) < 0; x = x.times(Rational.of(10))) {
            zeros++;
        }
        return zeros + digits;
    }

    private static Enclosed lack(Enclosed value) {
        return Enclosed.of(Rational.ONE).plus(value.negate());
    }

    private static boolean isNearlyOne(Rational value) {
        return value.compareTo(NEARLY_ONE) > 0 && value.compareTo(Rational.ONE) < 0;
    }

    private static boolean isNearlyOne(Enclosed value) {
        return value.enclose(FIRST_BITS).lower().compareTo(NEARLY_ONE) > 0 && !mayBeZero(lack(value))
                && lack(value).enclose(SMALLEST_BITS).lower().signum() > 0;
    }

    private static boolean mayBeZero(Enclosed value) {
        Ball ball = value.enclose(1);
        for (int bits = FIRST_BITS; ball.containsZero() && bits <= SMALLEST_BITS; bits *= 2) {
            ball = value.enclose(bits);
        }
        return ball.containsZero();
    }
}
