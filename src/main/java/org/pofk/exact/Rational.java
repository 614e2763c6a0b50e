package org.pofk.exact;

import java.math.BigDecimal;
import java.math.BigInteger;

/**
 * An exact rational number. Canonical form: coprime numerator and denominator, denominator positive.
 * Exact; each operation costs one greatest common divisor of its operands' length.
 */
public record Rational(BigInteger numerator, BigInteger denominator) implements Comparable<Rational> {
    public static final Rational ZERO = of(0);
    public static final Rational ONE = of(1);
    public static final Rational TWO = of(2);
    public static final Rational HALF = of(1, 2);

    public Rational {
        if (denominator.signum() == 0) {
            throw new ArithmeticException("denominator is zero");
        }
        if (!denominator.equals(BigInteger.ONE)) {
            BigInteger divisor = numerator.gcd(denominator);
            if (denominator.signum() < 0) {
                divisor = divisor.negate();
            }
            if (!divisor.equals(BigInteger.ONE)) {
                numerator = numerator.divide(divisor);
                denominator = denominator.divide(divisor);
            }
        }
    }

    public static Rational of(long value) {
        return of(BigInteger.valueOf(value));
    }

    public static Rational of(long numerator, long denominator) {
        return new Rational(BigInteger.valueOf(numerator), BigInteger.valueOf(denominator));
    }

    public static Rational of(BigInteger value) {
        return new Rational(value, BigInteger.ONE);
    }

    /** The decimal's value, exactly: 0.70 is 7/10. */
    public static Rational of(BigDecimal value) {
        return value.scale() >= 0
                ? new Rational(value.unscaledValue(), BigInteger.TEN.pow(value.scale()))
                : of(value.toBigIntegerExact());
    }

    /** The value of {@code "-3/4"}, {@code "7"} or {@code "0.25"}; a {@link NumberFormatException} otherwise. */
    public static Rational parse(String text) {
        int slash = text.indexOf('/');
        return slash < 0
                ? of(new BigDecimal(text.strip()))
                : new Rational(new BigInteger(text.substring(0, slash).strip()),
                        new BigInteger(text.substring(slash + 1).strip()));
    }

    public Rational plus(Rational other) {
        if (other.denominator.equals(denominator)) {
            return new Rational(numerator.add(other.numerator), denominator);
        }
        return new Rational(numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
                denominator.multiply(other.denominator));
    }

    public Rational minus(Rational other) {
        return plus(other.negate());
    }

    public Rational times(Rational other) {
        return new Rational(numerator.multiply(other.numerator), denominator.multiply(other.denominator));
    }

    /** Quotient; an {@link ArithmeticException} when {@code other} is zero. */
    public Rational dividedBy(Rational other) {
        return new Rational(numerator.multiply(other.denominator), denominator.multiply(other.numerator));
    }

    public Rational negate() {
        return new Rational(numerator.negate(), denominator);
    }

    public Rational inverse() {
        return new Rational(denominator, numerator);
    }

    public Rational abs() {
        return signum() < 0 ? negate() : this;
    }

    /** This to the power of an integer of any sign; 0^0 is one. */
    public Rational pow(int exponent) {
        return exponent < 0
                ? inverse().pow(-exponent)
                : new Rational(numerator.pow(exponent), denominator.pow(exponent));
    }

    public int signum() {
        return numerator.signum();
    }

    public boolean isZero() {
        return numerator.signum() == 0;
    }

    public boolean isOne() {
        return equals(ONE);
    }

    public boolean isInteger() {
        return denominator.equals(BigInteger.ONE);
    }

    /** The largest integer that isn't above this. */
    public BigInteger floor() {
        BigInteger[] parts = numerator.divideAndRemainder(denominator);
        return parts[1].signum() < 0 ? parts[0].subtract(BigInteger.ONE) : parts[0];
    }

    public static Rational max(Rational a, Rational b) {
        return a.compareTo(b) >= 0 ? a : b;
    }

    public static Rational min(Rational a, Rational b) {
        return a.compareTo(b) <= 0 ? a : b;
    }

    @Override
    public int compareTo(Rational other) {
        return numerator.multiply(other.denominator).compareTo(other.numerator.multiply(denominator));
    }

    /** The nearest double or one of its neighbours; decides nothing. */
    public double approximate() {
        int shift = denominator.bitLength() - numerator.bitLength() + 66;
        BigInteger scaled = shift >= 0
                ? numerator.shiftLeft(shift).divide(denominator)
                : numerator.divide(denominator.shiftLeft(-shift));
        double mantissa = scaled.doubleValue();
        return Math.scalb(Math.scalb(mantissa, -(shift / 2)), -(shift - shift / 2));
    }

    /** Written out: a record's own equality takes 20 ms to set up when first used, in every small run. */
    @Override
    public boolean equals(Object other) {
        return other instanceof Rational rational && numerator.equals(rational.numerator)
                && denominator.equals(rational.denominator);
    }

    @Override
    public int hashCode() {
        return 31 * numerator.hashCode() + denominator.hashCode();
    }

    /** {@code 7/10}, {@code -3}. */
    @Override
    public String toString() {
        return isInteger() ? numerator.toString() : numerator + "/" + denominator;
    }
}
