package org.pofk.exact;

import java.math.BigDecimal;
import java.math.BigInteger;

/**
 * An exact rational number. Canonical form: coprime numerator and denominator, denominator positive.
 * Exact; divisors are looked for between the operands' own parts (Knuth, volume 2, section 4.5.1; from memory), so that
 * a product costs two greatest common divisors of their length, a sum one or two, and a negation or a power none.
 */
public final class Rational implements Comparable<Rational> {
    public static final Rational ZERO = of(0);
    public static final Rational ONE = of(1);
    public static final Rational TWO = of(2);
    public static final Rational HALF = of(1, 2);

    /** Numerator and denominator, coprime, the denominator positive. */
    private record Coprime(BigInteger numerator, BigInteger denominator) {
        static Coprime of(BigInteger numerator, BigInteger denominator) {
            if (denominator.signum() == 0) {
                throw new ArithmeticException("denominator is zero");
            }
            BigInteger divisor = commonDivisor(numerator, denominator);
            BigInteger signed = denominator.signum() < 0 ? divisor.negate() : divisor;
            return signed.equals(BigInteger.ONE) ? new Coprime(numerator, denominator)
                    : new Coprime(numerator.divide(signed), denominator.divide(signed));
        }
    }

    private final BigInteger numerator;
    private final BigInteger denominator;

    private Rational(Coprime parts) {
        numerator = parts.numerator;
        denominator = parts.denominator;
    }

    /** Their quotient; an {@link ArithmeticException} when the denominator is zero. */
    public Rational(BigInteger numerator, BigInteger denominator) {
        this(Coprime.of(numerator, denominator));
    }

    private static Rational coprime(BigInteger numerator, BigInteger denominator) {
        return new Rational(new Coprime(numerator, denominator));
    }

    /** The greatest common divisor, of which much is known when one is a power of two. */
    private static BigInteger commonDivisor(BigInteger a, BigInteger b) {
        if (isOne(a) || isOne(b)) {
            return BigInteger.ONE;
        }
        if (a.signum() != 0 && b.signum() != 0) {
            int twos = Math.min(a.getLowestSetBit(), b.getLowestSetBit());
            if (isPowerOfTwo(a) || isPowerOfTwo(b)) {
                return twos == 0 ? BigInteger.ONE : BigInteger.ONE.shiftLeft(twos);
            }
        }
        return a.gcd(b);
    }

    private static boolean isOne(BigInteger a) {
        return a.bitLength() == 1 && a.signum() > 0;
    }

    private static boolean isPowerOfTwo(BigInteger a) {
        return a.signum() > 0 && a.getLowestSetBit() == a.bitLength() - 1;
    }

    public BigInteger numerator() {
        return numerator;
    }

    public BigInteger denominator() {
        return denominator;
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
        BigInteger common = commonDivisor(denominator, other.denominator);
        if (isOne(common)) {
            return coprime(numerator.multiply(other.denominator).add(other.numerator.multiply(denominator)),
                    denominator.multiply(other.denominator));
        }
        BigInteger own = denominator.divide(common);
        BigInteger sum = numerator.multiply(other.denominator.divide(common)).add(other.numerator.multiply(own));
        BigInteger left = commonDivisor(sum, common);
        return coprime(sum.divide(left), own.multiply(other.denominator.divide(left)));
    }

    public Rational minus(Rational other) {
        return plus(other.negate());
    }

    public Rational times(Rational other) {
        if (isZero() || other.isZero()) {
            return ZERO;
        }
        BigInteger first = commonDivisor(numerator, other.denominator);
        BigInteger second = commonDivisor(other.numerator, denominator);
        return coprime(over(numerator, first).multiply(over(other.numerator, second)),
                over(denominator, second).multiply(over(other.denominator, first)));
    }

    private static BigInteger over(BigInteger value, BigInteger divisor) {
        return isOne(divisor) ? value : value.divide(divisor);
    }

    /** Quotient; an {@link ArithmeticException} when {@code other} is zero. */
    public Rational dividedBy(Rational other) {
        return times(other.inverse());
    }

    public Rational negate() {
        return coprime(numerator.negate(), denominator);
    }

    /** An {@link ArithmeticException} for zero. */
    public Rational inverse() {
        if (isZero()) {
            throw new ArithmeticException("denominator is zero");
        }
        return numerator.signum() > 0 ? coprime(denominator, numerator)
                : coprime(denominator.negate(), numerator.negate());
    }

    public Rational abs() {
        return signum() < 0 ? negate() : this;
    }

    /** This to the power of an integer of any sign; 0^0 is one. */
    public Rational pow(int exponent) {
        return exponent < 0 ? inverse().pow(-exponent) : coprime(numerator.pow(exponent), denominator.pow(exponent));
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
        if (signum() != other.signum() || isZero()) {
            return Integer.compare(signum(), other.signum());
        }
        // a product of b₁ and b₂ bits has b₁ + b₂ − 1 or b₁ + b₂
        int bits = numerator.abs().bitLength() + other.denominator.bitLength();
        int otherBits = other.numerator.abs().bitLength() + denominator.bitLength();
        if (Math.abs(bits - otherBits) > 1) {
            return bits > otherBits ? signum() : -signum();
        }
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

    /** By the canonical form. */
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
