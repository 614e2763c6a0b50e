package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Guesses for a polynomial all of whose roots are real, such as the characteristic polynomial of a birth–death chain,
 * whose coefficients say so little about its roots that doubles can't find them. Approximate: starts only.
 *
 * <p>Euclid's algorithm on p and p′ gives p_{k−1} = (z − a_k) p_k − b_k p_{k+1}, monic, p_0 = p, and all b_k are
 * positive exactly when the roots are real and simple (Sturm). Then p is the characteristic polynomial of the symmetric
 * tridiagonal matrix with diagonal a_k and squares b_k beside it, and <em>its</em> eigenvalues are well conditioned:
 * taken in doubles by bisection on the number of negative pivots. n² products of some 4n bits, falling.
 */
final class TridiagonalStarts {
    private static final int LAST_BITS = 80;
    private static final int BITS_PER_STEP = 4;
    private static final int STEPS_BETWEEN_CUTS = 16;
    private static final int LARGEST_EXPONENT = 500;
    private static final int LARGEST_SHIFT = 1 << 10;
    private static final double ROUNDING = 0x1p-52;

    private final double[] diagonal;
    private final double[] squares;
    private final int exponent;
    private final int shift;
    private int bits;

    private TridiagonalStarts(int degree, int exponent, int shift) {
        this.diagonal = new double[degree];
        this.squares = new double[degree - 1];
        this.exponent = exponent;
        this.shift = shift;
        this.bits = LAST_BITS + BITS_PER_STEP * degree;
    }

    /**
     * Guesses at all roots; none when some b isn't positive. Works on u with z = 2^exponent · (u + shift), the roots
     * u around zero with variance about two, where the b are about one and rounding grows least.
     */
    static List<Start> of(Polynomial<Rational> polynomial) {
        Polynomial<Rational> monic = polynomial.monic();
        Rational degree = Rational.of(monic.degree());
        Rational sum = monic.coefficient(monic.degree() - 1).negate();
        Rational squares = sum.times(sum).minus(monic.coefficient(monic.degree() - 2).times(Rational.TWO));
        Rational mean = sum.dividedBy(degree);
        Rational variance = squares.dividedBy(degree).minus(mean.times(mean));
        if (variance.signum() <= 0) {
            return List.of();
        }
        double spread = (Logarithms.approximate(variance.numerator())
                - Logarithms.approximate(variance.denominator()) - 1) / 2;
        int exponent = (int) Math.round(spread);
        double shift = Math.scalb(mean.approximate(), -exponent);
        if (Math.abs(exponent) > LARGEST_EXPONENT || Math.abs(shift) > LARGEST_SHIFT) {
            return List.of();
        }
        TridiagonalStarts matrix = new TridiagonalStarts(monic.degree(), exponent, (int) Math.round(shift));
        return matrix.reduce(matrix.shifted(monic)) ? matrix.eigenvalues() : List.of();
    }

    /** The coefficients of p(2^exponent (u + shift)) / 2^(n exponent), in units of 2^−bits; Horner's scheme. */
    private BigInteger[] shifted(Polynomial<Rational> monic) {
        int degree = monic.degree();
        int guard = degree * (Integer.SIZE - Integer.numberOfLeadingZeros(Math.abs(shift) + 1));
        BigInteger[] all = new BigInteger[degree + 1];
        for (int i = 0; i <= degree; i++) {
            all[i] = Ball.of(monic.coefficient(i), bits + guard - (degree - i) * exponent).center();
        }
        BigInteger by = BigInteger.valueOf(shift);
        for (int round = 0; round < degree && shift != 0; round++) {
            for (int i = degree - 1; i >= round; i--) {
                all[i] = all[i].add(all[i + 1].multiply(by));
            }
        }
        for (int i = 0; i <= degree; i++) {
            all[i] = all[i].shiftRight(guard);
        }
        return all;
    }

    /** Fills the matrix; false when the roots can't all be real. */
    private boolean reduce(BigInteger[] monic) {
        int degree = monic.length - 1;
        BigInteger[] before = monic;
        BigInteger[] current = new BigInteger[degree];
        for (int i = 1; i <= degree; i++) {
            current[i - 1] = before[i].multiply(BigInteger.valueOf(i)).divide(BigInteger.valueOf(degree));
        }
        for (int k = 0; k < degree - 1; k++) {
            int top = current.length - 1;
            BigInteger a = current[top - 1].subtract(before[top]);
            BigInteger b = remainder(before, current, a, top - 1);
            diagonal[k] = asDouble(a);
            squares[k] = asDouble(b);
            if (!(squares[k] > 0)) {
                return false;
            }
            BigInteger inverse = BigInteger.ONE.shiftLeft(2 * bits).divide(b);
            BigInteger[] next = new BigInteger[top];
            for (int i = 0; i < top - 1; i++) {
                next[i] = remainder(before, current, a, i).multiply(inverse).shiftRight(bits);
            }
            next[top - 1] = BigInteger.ONE.shiftLeft(bits);
            before = current;
            current = next;
            if (k % STEPS_BETWEEN_CUTS == STEPS_BETWEEN_CUTS - 1) {
                cut(before);
                cut(current);
                bits -= STEPS_BETWEEN_CUTS * BITS_PER_STEP;
            }
        }
        diagonal[degree - 1] = asDouble(before[0].negate());
        return true;
    }

    /** Drops the bits that rounding has eaten by now. */
    private static void cut(BigInteger[] coefficients) {
        for (int i = 0; i < coefficients.length; i++) {
            coefficients[i] = coefficients[i].shiftRight(STEPS_BETWEEN_CUTS * BITS_PER_STEP);
        }
    }

    /** Coefficient i of (z − a) current − before. */
    private BigInteger remainder(BigInteger[] before, BigInteger[] current, BigInteger a, int i) {
        BigInteger product = a.multiply(current[i]).shiftRight(bits);
        return (i == 0 ? BigInteger.ZERO : current[i - 1]).subtract(product).subtract(before[i]);
    }

    private double asDouble(BigInteger units) {
        int shift = Math.max(0, units.bitLength() - 62);
        return Math.scalb(units.shiftRight(shift).doubleValue(), shift - bits);
    }

    private List<Start> eigenvalues() {
        double reach = 0;
        for (int i = 0; i < diagonal.length; i++) {
            double beside = (i > 0 ? Math.sqrt(squares[i - 1]) : 0) + (i < squares.length ? Math.sqrt(squares[i]) : 0);
            reach = Math.max(reach, Math.abs(diagonal[i]) + beside);
        }
        List<Start> starts = new ArrayList<>();
        bisect(-reach * 1.001, reach * 1.001, 0, diagonal.length, reach * ROUNDING, starts);
        return starts;
    }

    /** Splits (low, high], which has the eigenvalues number {@code below} to {@code upTo} − 1 from below. */
    private void bisect(double low, double high, int below, int upTo, double width, List<Start> starts) {
        if (below >= upTo) {
            return;
        }
        double middle = low + (high - low) / 2;
        if (high - low <= 2 * width || middle <= low || middle >= high) {
            double value = Math.scalb(middle + shift == 0 ? width : middle + shift, exponent);
            for (int i = below; i < upTo; i++) {
                starts.add(Start.of(value, 0, Math.scalb(high - low, exponent)));
            }
            return;
        }
        int count = eigenvaluesBelow(middle);
        bisect(low, middle, below, Math.min(count, upTo), width, starts);
        bisect(middle, high, Math.max(count, below), upTo, width, starts);
    }

    /** The number of negative pivots of the matrix less x. */
    private int eigenvaluesBelow(double x) {
        int count = 0;
        double pivot = 1;
        for (int i = 0; i < diagonal.length; i++) {
            pivot = diagonal[i] - x - (i > 0 ? squares[i - 1] / pivot : 0);
            if (pivot == 0) {
                pivot = ROUNDING * ROUNDING;
            }
            count += pivot < 0 ? 1 : 0;
        }
        return count;
    }
}
