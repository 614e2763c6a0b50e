package org.pofk.exact;

import java.math.BigInteger;
import java.util.OptionalInt;

/**
 * p(z) = (real + i imaginary ± error) · 2^unit and p′(z) likewise, as found by {@link BoundedHorner}. Certified.
 *
 * @param largest log₂ of the largest term of p(z), roughly; for choosing precisions only
 */
record Evaluation(BigInteger real, BigInteger imaginary, long error, int unit,
        BigInteger realSlope, BigInteger imaginarySlope, long slopeError, int slopeUnit, int largest, int degree) {

    /** |p(z)| ≤ 2^this. */
    int valueExponent() {
        return real.abs().add(imaginary.abs()).add(BigInteger.valueOf(error)).bitLength() + unit;
    }

    /** |p̃(z) − p(z)| ≤ 2^this. */
    int errorExponent() {
        return bitLength(error) + unit;
    }

    int slopeErrorExponent() {
        return bitLength(slopeError) + slopeUnit;
    }

    private static int bitLength(long value) {
        return Long.SIZE - Long.numberOfLeadingZeros(value);
    }

    /** |p′(z)| ≥ 2^this; empty when p′(z) may be zero. */
    OptionalInt slopeExponent() {
        BigInteger least = realSlope.abs().max(imaginarySlope.abs()).subtract(BigInteger.valueOf(slopeError));
        return least.signum() > 0 ? OptionalInt.of(least.bitLength() - 1 + slopeUnit) : OptionalInt.empty();
    }

    /** Rounding hides what p(z) is. */
    boolean isNoise() {
        return real.abs().max(imaginary.abs()).bitLength() <= bitLength(error) + 1;
    }

    /** Bits by which p′(z) lies below the largest term of p(z), roughly; for choosing precisions only. */
    int loss() {
        return largest - slopeExponent().orElse(0);
    }

    /** The disc of radius n·|p/p′| around z holds at least one root: it has radius ≤ 2^this. Empty as above. */
    OptionalInt radiusExponent() {
        OptionalInt slope = slopeExponent();
        return slope.isPresent()
                ? OptionalInt.of(ceilingLog(degree) + valueExponent() - slope.getAsInt())
                : OptionalInt.empty();
    }

    /** The least e with 2^e ≥ n. */
    static int ceilingLog(int n) {
        return Integer.SIZE - Integer.numberOfLeadingZeros(n - 1);
    }

    /** p̃/p̃′ in units of 2^−scale, both parts rounded down. */
    Correction correction(int scale) {
        BigInteger across = real.multiply(realSlope).add(imaginary.multiply(imaginarySlope));
        BigInteger up = imaginary.multiply(realSlope).subtract(real.multiply(imaginarySlope));
        BigInteger square = realSlope.multiply(realSlope).add(imaginarySlope.multiply(imaginarySlope));
        int shift = unit - slopeUnit + scale;
        return new Correction(floorQuotient(across, square, shift), floorQuotient(up, square, shift));
    }

    private static BigInteger floorQuotient(BigInteger numerator, BigInteger positive, int shift) {
        BigInteger[] parts = numerator.shiftLeft(Math.max(shift, 0))
                .divideAndRemainder(positive.shiftLeft(Math.max(-shift, 0)));
        return parts[1].signum() < 0 ? parts[0].subtract(BigInteger.ONE) : parts[0];
    }

    /** A step in units of a scale. */
    record Correction(BigInteger x, BigInteger y) {
    }
}
