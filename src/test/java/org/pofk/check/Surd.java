package org.pofk.check;

import java.math.BigInteger;
import org.pofk.exact.Rational;

/** u + v√d exactly, d a whole number above one without a square in it; or u + v√d·i where {@code isImaginary}. */
record Surd(Rational u, Rational v, BigInteger d, boolean isImaginary) {
    private static final int LARGEST_DIVISOR = 1_000;

    /** The root of z² + bz + c above the axis, or the larger one; {@code sign} −1 takes the other. */
    static Surd root(Rational b, Rational c, int sign) {
        Rational discriminant = b.times(b).minus(Rational.of(4).times(c));
        BigInteger radicand = discriminant.numerator().multiply(discriminant.denominator()).abs();
        Rational scale = new Rational(BigInteger.ONE, discriminant.denominator());
        for (long p = 2; p <= LARGEST_DIVISOR; p++) {
            BigInteger square = BigInteger.valueOf(p * p);
            while (radicand.mod(square).signum() == 0) {
                radicand = radicand.divide(square);
                scale = scale.times(Rational.of(p));
            }
        }
        return new Surd(b.negate().times(Rational.HALF), scale.times(Rational.HALF).times(Rational.of(sign)), radicand,
                discriminant.signum() < 0);
    }

    /** a + b·this. */
    Surd scaled(Rational a, Rational b) {
        return new Surd(a.plus(b.times(u)), b.times(v), d, isImaginary);
    }

    Surd plus(Surd other) {
        return new Surd(u.plus(other.u), v.plus(other.v), d, isImaginary);
    }

    /** v√d as a real number, of one with an imaginary part. */
    Surd imaginaryPart() {
        return new Surd(Rational.ZERO, v, d, false);
    }

    /** u² + v²d, the square of the modulus of a number with an imaginary part. */
    Rational squaredModulus() {
        return u.times(u).plus(v.times(v).times(Rational.of(d)));
    }

    Surd times(Surd other) {
        Rational square = v.times(other.v).times(Rational.of(d));
        return new Surd(u.times(other.u).plus(isImaginary ? square.negate() : square),
                u.times(other.v).plus(v.times(other.u)), d, isImaginary);
    }

    Surd inverse() {
        Rational square = v.times(v).times(Rational.of(d));
        Rational norm = u.times(u).plus(isImaginary ? square : square.negate());
        return new Surd(u.dividedBy(norm), v.negate().dividedBy(norm), d, isImaginary);
    }

    Surd negate() {
        return new Surd(u.negate(), v.negate(), d, isImaginary);
    }
}
