package org.pofk.exact;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.function.UnaryOperator;

/**
 * Numbers written in decimals, to significant digits or to places after the point. A rational number is rounded
 * exactly, half to even; an enclosed one is refined until the digits are decided. Certified: every text is within 0.51
 * units of its last place.
 *
 * <p>A value that is its decimal is written short ({@code 0.5}, {@code 3}); a rounded one keeps all its digits, zeros
 * at the end too ({@code 0.500000}), so that what was rounded can be told from what was not. Zero is {@code 0}.
 *
 * <p>To significant digits the text is plain from 0.001 on up to as many digits before the point as are right
 * (whole numbers that are exact: up to {@value #WHOLE_DIGITS}), and {@code 7.281e-4} or {@code 1.23457e8} beyond: the
 * number of significant digits stays. To places the text is always plain.
 */
public final class Decimals {
    private static final int SMALLEST_PLAIN_EXPONENT = -3;
    private static final int WHOLE_DIGITS = 15;
    /** An enclosure narrower than 2^−this units around the middle between two decimals counts as the middle. */
    private static final int TIE_BITS = 64;
    private static final int FIRST_GUARD = 8;

    private Decimals() {
    }

    /** The value to {@code digits} significant digits, at least 1. */
    public static Decimal of(Rational value, int digits) {
        return value.isZero() ? Decimal.ZERO : significant(roundToDigits(value, digits), value, digits);
    }

    /**
     * The value to {@code digits} significant digits. A number that is exactly zero has to be known to be: the caller
     * has excluded it, or the enclosure is the exact zero; otherwise this ends in an {@link AssertionError}.
     */
    public static Decimal of(Enclosed value, int digits) {
        Ball ball = awayFromZero(value, digits);
        return ball.isExact()
                ? of(ball.middle(), digits)
                : significant(decide(value, ball, x -> Rational.of(roundToDigits(x, digits))), digits);
    }

    /** The value to {@code places} places after the point, at least 0. */
    public static Decimal fixed(Rational value, int places) {
        BigDecimal rounded = roundToPlaces(value, places);
        if (!Rational.of(rounded).equals(value)) {
            return new Decimal(rounded.toPlainString(), Rational.of(rounded), false);
        }
        return value.isZero()
                ? Decimal.ZERO
                : new Decimal(rounded.stripTrailingZeros().toPlainString(), value, true);
    }

    /** The value to {@code places} places after the point; zero too, for nothing has to be known about its size. */
    public static Decimal fixed(Enclosed value, int places) {
        Ball ball = value.enclose(bitsFor(places));
        if (ball.isExact()) {
            return fixed(ball.middle(), places);
        }
        Rational decided = decide(value, ball, x -> Rational.of(roundToPlaces(x, places)));
        return new Decimal(roundToPlaces(decided, places).toPlainString(), decided, false);
    }

    private static Ball awayFromZero(Enclosed value, int digits) {
        int bits = bitsFor(digits);
        Ball ball = value.enclose(bits);
        while (ball.containsZero() && !ball.isExact()) {
            bits *= 2;
            if (bits > Raising.MOST_BITS) {
                throw new AssertionError("zero to within 2^-" + bits / 2 + " and not known to be zero");
            }
            ball = value.enclose(bits);
        }
        return ball;
    }

    private static int bitsFor(int digits) {
        return digits * 10 / 3 + FIRST_GUARD;
    }

    /** Refines until both ends round alike, or until a tie is certain to 2^−64 units: then half to even. */
    private static Rational decide(Enclosed value, Ball first, UnaryOperator<Rational> rounding) {
        Ball ball = first;
        int bits = Math.max(FIRST_GUARD, ball.scale());
        while (true) {
            Rational low = rounding.apply(ball.lower());
            Rational high = rounding.apply(ball.upper());
            if (low.equals(high)) {
                return low;
            }
            Rational width = ball.upper().minus(ball.lower());
            if (width.times(Rational.TWO.pow(TIE_BITS)).compareTo(high.minus(low)) <= 0) {
                return rounding.apply(low.plus(high).times(Rational.HALF));
            }
            bits += TIE_BITS;
            ball = value.enclose(bits);
        }
    }

    private static BigDecimal roundToDigits(Rational value, int digits) {
        return new BigDecimal(value.numerator())
                .divide(new BigDecimal(value.denominator()), new MathContext(digits, RoundingMode.HALF_EVEN));
    }

    private static BigDecimal roundToPlaces(Rational value, int places) {
        return new BigDecimal(value.numerator())
                .divide(new BigDecimal(value.denominator()), places, RoundingMode.HALF_EVEN);
    }

    private static Decimal significant(Rational decided, int digits) {
        BigDecimal rounded = roundToDigits(decided, digits);
        return new Decimal(roundedText(rounded, digits), decided, false);
    }

    private static Decimal significant(BigDecimal rounded, Rational value, int digits) {
        Rational denoted = Rational.of(rounded);
        return denoted.equals(value)
                ? new Decimal(text(rounded.stripTrailingZeros(), Math.max(digits, WHOLE_DIGITS)), value, true)
                : new Decimal(roundedText(rounded, digits), denoted, false);
    }

    private static String roundedText(BigDecimal rounded, int digits) {
        return text(rounded.setScale(rounded.scale() + digits - rounded.precision()), digits);
    }

    /** The digits of a number that isn't zero, plain or with an exponent. */
    private static String text(BigDecimal number, int mostDigitsBeforePoint) {
        int exponent = number.precision() - number.scale() - 1;
        if (exponent >= SMALLEST_PLAIN_EXPONENT && exponent < mostDigitsBeforePoint) {
            return number.toPlainString();
        }
        BigInteger unscaled = number.unscaledValue();
        String digits = unscaled.abs().toString();
        return (unscaled.signum() < 0 ? "-" : "") + digits.charAt(0)
                + (digits.length() > 1 ? "." + digits.substring(1) : "") + "e" + exponent;
    }
}
