package org.pofk.transform;

import java.math.BigInteger;
import java.util.List;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Rational;

/**
 * What can be said beforehand of the numbers in the recurrences of a system with matrix M, start b and readings c
 * in whole numbers. Exact; every bound is rounded upwards.
 *
 * @param scale       Δ, the product of the columns' (or of the rows') own common denominators, the smaller one: Δ times
 *                    any monic divisor of the characteristic polynomial χ is integral (Gauss), and so is Δ times the
 *                    numerator over it
 * @param denominator bound on the sum of the absolute coefficients of every monic divisor of χ: with the eigenvalues
 *                    λ, Π (1 + |λ|) ≤ (1 + ‖M‖_F/√n)^n (Schur 1909 and the means inequality)
 * @param numerator   bound on each coefficient of c adj(zI − M) b = (χ of (M − t b c) − χ of M)/t, the bound above
 *                    for t = (‖M‖_F + 1)/(n ‖b‖ ‖c‖)
 */
record CoefficientBounds(BigInteger scale, BigInteger denominator, BigInteger numerator) {
    private static final int FRACTION_BITS = 32;
    private static final BigInteger UNIT = BigInteger.ONE.shiftLeft(FRACTION_BITS);

    static CoefficientBounds of(LinearSystem system) {
        int size = system.size();
        if (size == 0) {
            return new CoefficientBounds(BigInteger.ONE, BigInteger.ONE, BigInteger.ONE);
        }
        BigInteger norm = root(squares(system.matrix()));
        BigInteger widened = norm.add(norm.add(UNIT).divide(BigInteger.valueOf(size))).add(BigInteger.ONE);
        BigInteger mean = root(widened.multiply(widened).divide(BigInteger.valueOf(size)).add(BigInteger.ONE));
        BigInteger bound = powerRoundedUp(UNIT.add(mean), size);
        BigInteger start = norm(system.start());
        BigInteger reading = system.readings().stream().map(CoefficientBounds::norm).reduce(BigInteger.ONE,
                BigInteger::max);
        BigInteger numerator = bound.shiftLeft(1).multiply(BigInteger.valueOf(size)).multiply(start).multiply(reading);
        return new CoefficientBounds(scale(system.matrix()), bound, numerator.max(BigInteger.ONE));
    }

    /** The product of primes must exceed this for Chinese remainders to give every coefficient of χ and its N. */
    BigInteger wanted() {
        return scale.multiply(denominator.max(numerator)).shiftLeft(1);
    }

    private static BigInteger scale(SparseMatrix matrix) {
        return productOfDenominators(matrix.columns())
                .min(productOfDenominators(Transposition.rows(matrix)));
    }

    private static BigInteger productOfDenominators(List<List<Entry>> lines) {
        BigInteger product = BigInteger.ONE;
        for (List<Entry> line : lines) {
            product = product.multiply(CommonDenominator.of(line.stream().map(Entry::value).toList()));
        }
        return product;
    }

    /** ‖M‖_F² times 2^(2·{@value #FRACTION_BITS}). */
    private static BigInteger squares(SparseMatrix matrix) {
        BigInteger squares = BigInteger.ZERO;
        for (List<Entry> column : matrix.columns()) {
            for (Entry entry : column) {
                BigInteger size = scaledUp(entry.value().abs());
                squares = squares.add(size.multiply(size));
            }
        }
        return squares;
    }

    /** ⌈‖v‖⌉. */
    private static BigInteger norm(List<Rational> vector) {
        BigInteger squares = BigInteger.ZERO;
        for (Rational value : vector) {
            BigInteger size = scaledUp(value.abs());
            squares = squares.add(size.multiply(size));
        }
        return root(squares).shiftRight(FRACTION_BITS).add(BigInteger.ONE);
    }

    private static BigInteger root(BigInteger square) {
        return square.sqrt().add(BigInteger.ONE);
    }

    /** ⌈value · 2^{@value #FRACTION_BITS}⌉, or one more. */
    private static BigInteger scaledUp(Rational value) {
        return value.numerator().shiftLeft(FRACTION_BITS).divide(value.denominator()).add(BigInteger.ONE);
    }

    /** A whole number not below (base · 2^−{@value #FRACTION_BITS})^exponent, for a base of at least one. */
    private static BigInteger powerRoundedUp(BigInteger base, int exponent) {
        BigInteger power = UNIT;
        for (int i = 0; i < exponent; i++) {
            power = power.multiply(base).shiftRight(FRACTION_BITS).add(BigInteger.ONE);
        }
        return power.shiftRight(FRACTION_BITS).add(BigInteger.ONE);
    }
}
