package org.pofk.transform;

import java.math.BigInteger;
import java.util.List;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * What can be said beforehand of the numbers in a system's recurrences. Exact; every bound is rounded upwards.
 *
 * @param scale       Δ·l: Δ the product of the columns' (or rows') own common denominators, the smaller of the two,
 *                    l the common denominators of start and readings. Times Δ every monic divisor of the
 *                    characteristic polynomial is integral (Gauss), times Δ·l every numerator over it
 * @param coefficient bound on the sum of the absolute coefficients of every such divisor: with the eigenvalues λ,
 *                    Π (1 + |λ|) ≤ (1 + ‖A‖_F/√n)^n (Schur 1909 and the means inequality)
 * @param term        bound on |y(k)| for k below n, at least 1
 */
record SystemBounds(BigInteger scale, BigInteger coefficient, BigInteger term) {
    private static final int FRACTION_BITS = 32;

    static SystemBounds of(LinearSystem system) {
        BigInteger scale = commonDenominators(system.matrix()).multiply(commonDenominator(system.start()))
                .multiply(commonDenominator(system.readings().stream().flatMap(List::stream).toList()));
        return new SystemBounds(scale, coefficientBound(system.matrix()), termBound(system));
    }

    /** The least common multiple of the denominators. */
    static BigInteger commonDenominator(List<Rational> values) {
        BigInteger common = BigInteger.ONE;
        for (Rational value : values) {
            BigInteger denominator = value.denominator();
            if (common.mod(denominator).signum() != 0) {
                common = common.multiply(denominator.divide(common.gcd(denominator)));
            }
        }
        return common;
    }

    private static BigInteger commonDenominators(SparseMatrix matrix) {
        BigInteger ofColumns = productOfDenominators(matrix.columns());
        BigInteger ofRows = productOfDenominators(SystemTransposition.rows(matrix));
        return ofColumns.min(ofRows);
    }

    private static BigInteger productOfDenominators(List<List<Entry>> lines) {
        BigInteger product = BigInteger.ONE;
        for (List<Entry> line : lines) {
            product = product.multiply(commonDenominator(line.stream().map(Entry::value).toList()));
        }
        return product;
    }

    private static BigInteger coefficientBound(SparseMatrix matrix) {
        if (matrix.size() == 0) {
            return BigInteger.ONE;
        }
        BigInteger squares = BigInteger.ZERO;
        for (List<Entry> column : matrix.columns()) {
            for (Entry entry : column) {
                squares = squares.add(scaledUp(entry.value().times(entry.value()), 2 * FRACTION_BITS));
            }
        }
        BigInteger root = squares.divide(BigInteger.valueOf(matrix.size())).add(BigInteger.ONE).sqrt()
                .add(BigInteger.ONE);
        return powerRoundedUp(root.add(BigInteger.ONE.shiftLeft(FRACTION_BITS)), matrix.size());
    }

    private static BigInteger termBound(LinearSystem system) {
        Rational startSum = sum(system.start());
        Rational startLargest = largest(system.start());
        BigInteger byColumns = growth(system.matrix().columns(), system.size());
        BigInteger byRows = growth(SystemTransposition.rows(system.matrix()), system.size());
        BigInteger bound = BigInteger.ONE;
        for (List<Rational> reading : system.readings()) {
            BigInteger column = scaledUp(largest(reading).times(startSum), 0).multiply(byColumns);
            BigInteger row = scaledUp(sum(reading).times(startLargest), 0).multiply(byRows);
            bound = bound.max(column.min(row));
        }
        return bound;
    }

    /** max(1, largest sum of absolute values of a line)^steps. */
    private static BigInteger growth(List<List<Entry>> lines, int steps) {
        Rational largest = Rational.ONE;
        for (List<Entry> line : lines) {
            largest = Rational.max(largest, sum(line.stream().map(Entry::value).toList()));
        }
        return largest.isOne() ? BigInteger.ONE : powerRoundedUp(scaledUp(largest, FRACTION_BITS), steps);
    }

    private static Rational sum(List<Rational> values) {
        return values.stream().map(Rational::abs).reduce(Rational.ZERO, Rational::plus);
    }

    private static Rational largest(List<Rational> values) {
        return values.stream().map(Rational::abs).reduce(Rational.ZERO, Rational::max);
    }

    /** ⌈value · 2^bits⌉. */
    private static BigInteger scaledUp(Rational value, int bits) {
        return new Rational(value.numerator().negate().shiftLeft(bits), value.denominator()).floor().negate();
    }

    /** A whole number not below (base · 2^−{@value #FRACTION_BITS})^exponent, for a base of at least one. */
    private static BigInteger powerRoundedUp(BigInteger base, int exponent) {
        BigInteger power = BigInteger.ONE.shiftLeft(FRACTION_BITS);
        for (int i = 0; i < exponent; i++) {
            power = power.multiply(base).shiftRight(FRACTION_BITS).add(BigInteger.ONE);
        }
        return power.shiftRight(FRACTION_BITS).add(BigInteger.ONE);
    }
}
