package org.pofk.exact;

import java.math.BigInteger;

/** A complex number known to lie within the rectangle of two balls. Certified; fixed-point as {@link Ball} is. */
public record ComplexBall(Ball real, Ball imaginary) {

    /** A real number. */
    public static ComplexBall of(Ball real) {
        return new ComplexBall(real, Ball.of(0, real.scale()));
    }

    public static ComplexBall of(Rational value, int scale) {
        return of(Ball.of(value, scale));
    }

    public int scale() {
        return Math.max(real.scale(), imaginary.scale());
    }

    public ComplexBall plus(ComplexBall other) {
        return new ComplexBall(real.plus(other.real), imaginary.plus(other.imaginary));
    }

    public ComplexBall minus(ComplexBall other) {
        return new ComplexBall(real.minus(other.real), imaginary.minus(other.imaginary));
    }

    public ComplexBall negate() {
        return new ComplexBall(real.negate(), imaginary.negate());
    }

    public ComplexBall conjugate() {
        return new ComplexBall(real, imaginary.negate());
    }

    public ComplexBall times(ComplexBall other) {
        return new ComplexBall(real.times(other.real).minus(imaginary.times(other.imaginary)),
                real.times(other.imaginary).plus(imaginary.times(other.real)));
    }

    public ComplexBall times(Ball factor) {
        return new ComplexBall(real.times(factor), imaginary.times(factor));
    }

    /** Quotient; a {@link NotSeparatedException} when the divisor may be zero. */
    public ComplexBall dividedBy(ComplexBall other) {
        // numerator and denominator at twice the scale, so that a small divisor costs no more than it must
        int fine = 2 * Math.max(0, Math.max(scale(), other.scale()));
        ComplexBall divisor = other.roundedTo(fine);
        Ball squares = divisor.real.times(divisor.real).plus(divisor.imaginary.times(divisor.imaginary));
        ComplexBall product = roundedTo(fine).times(divisor.conjugate());
        return new ComplexBall(product.real.dividedBy(squares), product.imaginary.dividedBy(squares))
                .roundedTo(Math.max(scale(), other.scale()));
    }

    /** z^exponent, any sign; z^0 is one. */
    public ComplexBall pow(int exponent) {
        ComplexBall one = of(Ball.of(1, Math.max(scale(), 0)));
        if (exponent < 0) {
            return one.dividedBy(pow(Math.negateExact(exponent)));
        }
        return BinaryPowering.of(one, this, exponent, ComplexBall::times);
    }

    /** |z|, to within one unit of what the rectangle allows. */
    public Ball modulus() {
        int scale = scale();
        Ball across = real.roundedTo(scale).abs();
        Ball up = imaginary.roundedTo(scale).abs();
        BigInteger low = IntegerRoots.floor(square(least(across)).add(square(least(up))), 2);
        BigInteger high = IntegerRoots.ceiling(square(most(across)).add(square(most(up))), 2);
        return Ball.between(low, high, scale);
    }

    private static BigInteger square(BigInteger x) {
        return x.multiply(x);
    }

    private static BigInteger least(Ball x) {
        return x.center().subtract(x.radius()).max(BigInteger.ZERO);
    }

    private static BigInteger most(Ball x) {
        return x.center().add(x.radius());
    }

    /** The angle, with the cut as in {@link Ball#argument}. */
    public Ball argument() {
        return Ball.argument(imaginary, real);
    }

    public ComplexBall roundedTo(int scale) {
        return new ComplexBall(real.roundedTo(scale), imaginary.roundedTo(scale));
    }

    public boolean containsZero() {
        return real.containsZero() && imaginary.containsZero();
    }

    public boolean overlaps(ComplexBall other) {
        return real.overlaps(other.real) && imaginary.overlaps(other.imaginary);
    }

    /** Proved: both radii ≤ 2^−bits · max(1, |z|) for every z in the rectangle. */
    public boolean isWithin(int bits) {
        if (real.isWithin(bits) && imaginary.isWithin(bits)) {
            return true;
        }
        Ball modulus = modulus();
        BigInteger spread = real.roundedTo(scale()).radius().max(imaginary.roundedTo(scale()).radius());
        BigInteger least = modulus.center().subtract(modulus.radius()).max(BigInteger.ZERO);
        return bits >= 0
                ? spread.shiftLeft(bits).compareTo(least) <= 0
                : spread.compareTo(least.shiftLeft(-bits)) <= 0;
    }

    /** {@code 0.5 ± 2^-64 + i (0.8660 ± 2^-64)}. */
    @Override
    public String toString() {
        return real + " + i (" + imaginary + ")";
    }
}
