package org.pofk.steps;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * A rational number whose common factors stay: taking them out of numbers of many thousand digits takes longer than
 * all that is done with them. Exact.
 *
 * @param denominator above zero
 */
public record Fraction(BigInteger numerator, BigInteger denominator) {
    /** Fractions up to this length are put in lowest terms and shown. */
    private static final int SHOWN_BITS = 2_000;
    private static final int LEADING_BITS = 256;

    public static Fraction of(Rational value) {
        return new Fraction(value.numerator(), value.denominator());
    }

    public Fraction plus(Fraction other) {
        if (other.denominator.bitLength() < denominator.bitLength()) {
            return other.plus(this);
        }
        BigInteger[] parts = other.denominator.divideAndRemainder(denominator);
        return parts[1].signum() == 0
                ? new Fraction(numerator.multiply(parts[0]).add(other.numerator), other.denominator)
                : new Fraction(numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
                        denominator.multiply(other.denominator));
    }

    Fraction over(int divisor) {
        return new Fraction(numerator, denominator.multiply(BigInteger.valueOf(divisor)));
    }

    boolean isAbove(Fraction other) {
        if (denominator.bitLength() > 2 * LEADING_BITS && other.denominator.bitLength() > 2 * LEADING_BITS) {
            Ball mine = leading();
            Ball others = other.leading();
            if (!mine.overlaps(others)) {
                return mine.center().compareTo(others.center()) > 0;
            }
        }
        return numerator.multiply(other.denominator).compareTo(other.numerator.multiply(denominator)) > 0;
    }

    /** From the leading bits alone, which nearly always tell two long fractions apart. */
    private Ball leading() {
        int shift = denominator.bitLength() - LEADING_BITS;
        BigInteger divisor = denominator.shiftRight(shift);
        BigInteger quotient = numerator.shiftRight(shift - LEADING_BITS).divide(divisor);
        // one unit each for the two shifts and the division; a divisor cut off makes the quotient too large by a 2^-255th
        return new Ball(quotient, quotient.abs().shiftRight(LEADING_BITS - 2).add(BigInteger.valueOf(4)), LEADING_BITS);
    }

    /** In lowest terms. */
    Rational reduced() {
        return new Rational(numerator, denominator);
    }

    KnownValue known() {
        if ((long) numerator.bitLength() + denominator.bitLength() <= 2 * SHOWN_BITS) {
            return KnownValue.of(reduced());
        }
        return new KnownValue(KnownValue.Word.EXACT, Optional.empty(), bits ->
                new Ball(numerator.shiftLeft(Math.max(bits, 0)).divide(denominator), BigInteger.ONE,
                        Math.max(bits, 0)));
    }
}
