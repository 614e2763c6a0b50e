package org.pofk.exact;

import java.math.BigInteger;

/**
 * p and p′ of a whole-number polynomial at a dyadic point, with bounds on what rounding did. Certified. Horner's rule
 * with a unit that slides with |z|^j, so that every partial sum carries about {@code precision} bits and the end error
 * is below 8n · 2^−precision · max |c_j z^j|. The slide is chosen in doubles and decides nothing: the error is carried
 * along in whole numbers of the current unit. Cost: 8n products of {@code precision} bits, 2n for a real point.
 */
final class BoundedHorner {
    private static final long LARGEST_ERROR = 1L << 37;
    private static final int REACH_BITS = 24;

    private final BigInteger[] coefficients;
    private final double[] sizes;

    /** @param ascending degree at least 1; lowest and highest coefficient not zero */
    BoundedHorner(BigInteger[] ascending) {
        this.coefficients = ascending.clone();
        this.sizes = new double[ascending.length];
        for (int i = 0; i < sizes.length; i++) {
            sizes[i] = ascending[i].signum() == 0 ? Double.NEGATIVE_INFINITY : Logarithms.approximate(ascending[i]);
        }
    }

    int degree() {
        return coefficients.length - 1;
    }

    /** At (x + iy) · 2^−scale, not zero. */
    Evaluation at(BigInteger x, BigInteger y, int scale, int precision) {
        return new Walk(x, y, scale, precision).toTheEnd();
    }

    /** One evaluation on its way down; mutable, lives for one call. */
    private final class Walk {
        private final BigInteger x;
        private final BigInteger y;
        private final int scale;
        private final boolean onAxis;
        private final double slope;
        private final double lowest;
        private final int precision;
        private final long reach;
        private final int reachExponent;
        private BigInteger real;
        private BigInteger imaginary = BigInteger.ZERO;
        private BigInteger realSlope = BigInteger.ZERO;
        private BigInteger imaginarySlope = BigInteger.ZERO;
        private long error = 1;
        private long slopeError;

        Walk(BigInteger x, BigInteger y, int scale, int precision) {
            this.x = x;
            this.y = y;
            this.scale = scale;
            this.onAxis = y.signum() == 0;
            BigInteger modulus = onAxis ? x.abs() : IntegerRoots.ceiling(x.multiply(x).add(y.multiply(y)), 2);
            this.slope = Logarithms.approximate(modulus) - scale;
            this.reachExponent = Math.max(0, modulus.bitLength() - REACH_BITS);
            this.reach = Ball.shiftRightUp(modulus, reachExponent).longValueExact();
            this.precision = precision;
            this.lowest = largestTerm() - precision;
        }

        private double largestTerm() {
            double largest = Double.NEGATIVE_INFINITY;
            for (int i = 0; i < sizes.length; i++) {
                largest = Math.max(largest, sizes[i] + i * slope);
            }
            return largest;
        }

        private int unit(int power) {
            return (int) Math.floor(lowest - power * slope);
        }

        private BigInteger coefficient(int power) {
            return coefficients[power].shiftRight(unit(power));
        }

        Evaluation toTheEnd() {
            int degree = degree();
            real = coefficient(degree);
            int drop = 0;
            for (int power = degree - 1; power >= 0; power--) {
                slopeStep(drop);
                drop = unit(power) - unit(power + 1) + scale;
                valueStep(power, drop);
            }
            return new Evaluation(real, imaginary, error, unit(0), realSlope, imaginarySlope, slopeError, unit(1),
                    (int) Math.ceil(lowest) + precision, degree);
        }

        /** d ← d z + h, in the unit of h. */
        private void slopeStep(int drop) {
            BigInteger old = realSlope;
            realSlope = product(old, imaginarySlope).shiftRight(drop).add(real);
            if (!onAxis) {
                imaginarySlope = crossProduct(old, imaginarySlope).shiftRight(drop).add(imaginary);
            }
            slopeError = carried(slopeError, drop) + 2 + error;
        }

        /** h ← h z + c; two roundings and a truncated coefficient are less than three units. */
        private void valueStep(int power, int drop) {
            BigInteger old = real;
            real = product(old, imaginary).shiftRight(drop).add(coefficient(power));
            if (!onAxis) {
                imaginary = crossProduct(old, imaginary).shiftRight(drop);
            }
            error = carried(error, drop) + 3;
        }

        private BigInteger product(BigInteger a, BigInteger b) {
            return onAxis ? a.multiply(x) : a.multiply(x).subtract(b.multiply(y));
        }

        private BigInteger crossProduct(BigInteger a, BigInteger b) {
            return a.multiply(y).add(b.multiply(x));
        }

        /** units · |z| in the next unit, rounded up. */
        private long carried(long units, int drop) {
            if (units == 0) {
                return 0;
            }
            int shift = drop - reachExponent;
            if (units > LARGEST_ERROR || shift < 0 && -shift > REACH_BITS) {
                throw new AssertionError("the unit does not slide with |z|: " + units + " at slope " + slope
                        + " for " + x + " + i " + y + " at scale " + scale);
            }
            long product = units * reach;
            return shift >= 0 ? shift > 62 ? 1 : -((-product) >> shift) : Math.multiplyExact(product, 1L << -shift);
        }
    }
}
