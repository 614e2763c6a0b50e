package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * A system in numbers that keep its recurrences short: M = U·A, start and readings in whole numbers. Its terms are
 * (l·m) Uᵏ y(k), so its D and P give back those of A by D_A(z) = U^−d D(Uz), P_A(z) = U^(1−d) P(Uz)/(l·m). U is the
 * common denominator of A, or 1 where the columns' own denominators promise shorter numbers. Exact.
 *
 * @param unit   U
 * @param weight l·m, l the common denominator of the start and m of the readings
 */
record ScaledSystem(LinearSystem system, CoefficientBounds bounds, BigInteger unit, BigInteger weight) {
    /** A unit longer than this is never the shorter way. */
    private static final int LONGEST_UNIT = 4096;
    private static final int PARALLEL_FROM = 60;

    static ScaledSystem of(LinearSystem original) {
        BigInteger starts = CommonDenominator.of(original.start());
        BigInteger readings = CommonDenominator.of(original.readings().stream().flatMap(List::stream).toList());
        LinearSystem whole = new LinearSystem(original.matrix(), times(original.start(), starts),
                original.readings().stream().map(reading -> times(reading, readings)).toList());
        BigInteger weight = starts.multiply(readings);
        ScaledSystem asItIs = new ScaledSystem(whole, CoefficientBounds.of(whole), BigInteger.ONE, weight);
        BigInteger unit = original.matrix().commonDenominator();
        if (unit.bitLength() > LONGEST_UNIT || unit.equals(BigInteger.ONE)) {
            return asItIs;
        }
        LinearSystem integral = new LinearSystem(times(original.matrix(), unit), whole.start(), whole.readings());
        ScaledSystem scaled = new ScaledSystem(integral, CoefficientBounds.of(integral), unit, weight);
        return scaled.bounds.wanted().compareTo(asItIs.bounds.wanted()) <= 0 ? scaled : asItIs;
    }

    private static List<Rational> times(List<Rational> vector, BigInteger factor) {
        Rational scale = Rational.of(factor);
        return vector.stream().map(value -> value.isZero() ? value : value.times(scale)).toList();
    }

    private static SparseMatrix times(SparseMatrix matrix, BigInteger factor) {
        Rational scale = Rational.of(factor);
        return new SparseMatrix(matrix.columns().stream()
                .map(column -> column.stream().map(entry -> new Entry(entry.row(), entry.value().times(scale)))
                        .toList()).toList());
    }

    /** D of the original system from that of this one. */
    Polynomial<Rational> denominator(Polynomial<Rational> scaled) {
        return dilated(scaled, scaled.degree(), BigInteger.ONE);
    }

    /** P of the original system from that of this one, over a denominator of the given degree. */
    Polynomial<Rational> numerator(Polynomial<Rational> scaled, int degree) {
        return dilated(scaled, degree - 1, weight);
    }

    /** U^−degree · p(Uz)/divisor, the polynomial's degree at most that. */
    private Polynomial<Rational> dilated(Polynomial<Rational> p, int degree, BigInteger divisor) {
        if (unit.equals(BigInteger.ONE) && divisor.equals(BigInteger.ONE)) {
            return p;
        }
        List<BigInteger> denominators = new ArrayList<>();
        for (int power = degree; power >= 0; power--) {
            denominators.add(denominators.isEmpty()
                    ? divisor : denominators.get(denominators.size() - 1).multiply(unit));
        }
        IntStream powers = IntStream.range(0, p.coefficients().size());
        return Polynomial.ofRationals((degree < PARALLEL_FROM ? powers : powers.parallel())
                .mapToObj(power -> p.coefficient(power).dividedBy(Rational.of(denominators.get(degree - power))))
                .toList());
    }
}
