package org.pofk.check;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import org.pofk.exact.Rational;

/**
 * A complex number known to lie within {@code radius} of a centre of {@value #DIGITS} digits. Certified: radii take in
 * what is rounded and are rounded up. Written for these tests alone and sharing nothing with the enclosures of the
 * tool, so that what it says is a second opinion.
 */
record Near(BigDecimal real, BigDecimal imaginary, BigDecimal radius) {
    static final int DIGITS = 64;
    static final MathContext CENTRE = new MathContext(DIGITS, RoundingMode.HALF_EVEN);
    private static final MathContext UP = new MathContext(9, RoundingMode.CEILING);
    private static final MathContext DOWN = new MathContext(9, RoundingMode.FLOOR);
    private static final int EXPONENT_OF_NOTHING = 9_000;
    /** The radius of a number of which nothing is known. */
    private static final BigDecimal UNKNOWN = BigDecimal.ONE.scaleByPowerOfTen(EXPONENT_OF_NOTHING);

    static final Near ZERO = exactly(BigDecimal.ZERO);
    static final Near ONE = exactly(BigDecimal.ONE);
    static final Near I = new Near(BigDecimal.ZERO, BigDecimal.ONE, BigDecimal.ZERO);

    static Near exactly(BigDecimal value) {
        return of(value, BigDecimal.ZERO, BigDecimal.ZERO);
    }

    static Near exactly(long value) {
        return exactly(BigDecimal.valueOf(value));
    }

    static Near of(Rational value) {
        return exactly(new BigDecimal(value.numerator())).over(exactly(new BigDecimal(value.denominator())));
    }

    /** The centre rounded to so many digits as are carried, and what that may lose added to the radius. */
    static Near of(BigDecimal real, BigDecimal imaginary, BigDecimal radius) {
        BigDecimal x = real.round(CENTRE);
        BigDecimal y = imaginary.round(CENTRE);
        BigDecimal lost = x.subtract(real).abs().add(y.subtract(imaginary).abs());
        BigDecimal wide = lost.signum() == 0 ? radius.round(UP) : radius.add(lost, UP);
        return new Near(x, y, wide.compareTo(UNKNOWN) > 0 ? UNKNOWN : wide);
    }

    Near widened(BigDecimal by) {
        return of(real, imaginary, radius.add(by, UP));
    }

    boolean isReal() {
        return imaginary.signum() == 0;
    }

    boolean isExact() {
        return radius.signum() == 0;
    }

    BigDecimal upperModulus() {
        return isReal() ? real.abs().round(UP) : squaredModulus().sqrt(UP).multiply(new BigDecimal("1.0000001"), UP);
    }

    private BigDecimal lowerModulus() {
        return isReal() ? real.abs().round(DOWN)
                : squaredModulus().sqrt(DOWN).multiply(new BigDecimal("0.9999999"), DOWN);
    }

    private BigDecimal squaredModulus() {
        return real.multiply(real).add(imaginary.multiply(imaginary));
    }

    /** True when no number this may be is a number the other may be. */
    boolean differsFrom(Near other) {
        Near difference = minus(other);
        return difference.lowerModulus().compareTo(difference.radius) > 0;
    }

    Near plus(Near other) {
        return of(real.add(other.real), imaginary.add(other.imaginary), radius.add(other.radius, UP));
    }

    Near negate() {
        return new Near(real.negate(), imaginary.negate(), radius);
    }

    Near minus(Near other) {
        return plus(other.negate());
    }

    Near conjugate() {
        return new Near(real, imaginary.negate(), radius);
    }

    Near times(Near other) {
        BigDecimal spread = isExact() && other.isExact() ? BigDecimal.ZERO
                : upperModulus().multiply(other.radius).add(other.upperModulus().multiply(radius), UP)
                        .add(radius.multiply(other.radius), UP);
        if (isReal() && other.isReal()) {
            return of(real.multiply(other.real), BigDecimal.ZERO, spread);
        }
        return of(real.multiply(other.real).subtract(imaginary.multiply(other.imaginary)),
                real.multiply(other.imaginary).add(imaginary.multiply(other.real)), spread);
    }

    Near inverse() {
        BigDecimal least = lowerModulus().subtract(radius);
        if (least.signum() <= 0) {
            return new Near(BigDecimal.ZERO, BigDecimal.ZERO, UNKNOWN);
        }
        BigDecimal square = squaredModulus();
        BigDecimal x = isReal() ? BigDecimal.ONE.divide(real, CENTRE) : real.divide(square, CENTRE);
        BigDecimal y = isReal() ? BigDecimal.ZERO : imaginary.negate().divide(square, CENTRE);
        BigDecimal spread = radius.divide(lowerModulus().multiply(least), UP);
        return of(x, y, spread.add(lastPlaces(x, y), UP));
    }

    private static BigDecimal lastPlaces(BigDecimal x, BigDecimal y) {
        return ulp(x).add(ulp(y));
    }

    private static BigDecimal ulp(BigDecimal x) {
        return x.signum() == 0 ? BigDecimal.ZERO : x.ulp();
    }

    Near over(Near other) {
        return other.equals(ONE) ? this : exactQuotient(other) ? exactly(real.divide(other.real, CENTRE))
                : times(other.inverse());
    }

    /** Quotients that end within the digits carried stay exact: a fraction such as 3/8 is no rounded number. */
    private boolean exactQuotient(Near other) {
        if (!isReal() || !other.isReal() || !isExact() || !other.isExact() || other.real.signum() == 0) {
            return false;
        }
        return real.divide(other.real, CENTRE).multiply(other.real).compareTo(real) == 0;
    }

    Near pow(int exponent) {
        if (exponent < 0) {
            return pow(-exponent).inverse();
        }
        Near result = ONE;
        Near square = this;
        for (int left = exponent; left > 0; left >>= 1) {
            if ((left & 1) == 1) {
                result = result.times(square);
            }
            if (left > 1) {
                square = square.times(square);
            }
        }
        return result;
    }

    /** The whole number this is exactly. */
    int whole() {
        if (!isExact() || !isReal()) {
            throw new ArithmeticException("no whole number: " + this);
        }
        return real.intValueExact();
    }

    boolean isWhole() {
        return isExact() && isReal() && real.stripTrailingZeros().scale() <= 0;
    }

    static Near binomial(Near n, int p) {
        Near product = ONE;
        for (int i = 0; i < p; i++) {
            product = product.times(n.minus(exactly(i))).over(exactly(i + 1L));
        }
        return product;
    }

    static BigDecimal decimal(BigInteger numerator, BigInteger denominator) {
        return new BigDecimal(numerator).divide(new BigDecimal(denominator), CENTRE);
    }
}
