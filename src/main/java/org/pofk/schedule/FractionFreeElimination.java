package org.pofk.schedule;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.Optional;
import org.pofk.steps.WholeState;

/**
 * M x = b in whole numbers, by elimination that divides only where nothing is left over (Bareiss 1968, Mathematics of
 * Computation 22; from memory). Exact. n³/3 products of numbers as long as a determinant of M: for few unknowns with
 * long coefficients, where putting fractions in lowest terms would take longest.
 */
final class FractionFreeElimination {
    private FractionFreeElimination() {
    }

    /**
     * The solution over one denominator above zero; empty when M is singular. Uses up its arguments.
     *
     * @param rows  M, n × n
     * @param right b, n components
     */
    static Optional<WholeState> solve(BigInteger[][] rows, BigInteger[] right) {
        int size = rows.length;
        BigInteger before = BigInteger.ONE;
        for (int column = 0; column < size; column++) {
            if (!bringPivot(rows, right, column)) {
                return Optional.empty();
            }
            BigInteger pivot = rows[column][column];
            for (int i = column + 1; i < size; i++) {
                BigInteger factor = rows[i][column];
                for (int j = column + 1; j < size; j++) {
                    rows[i][j] = eliminated(pivot, rows[i][j], factor, rows[column][j], before);
                }
                right[i] = eliminated(pivot, right[i], factor, right[column], before);
                rows[i][column] = BigInteger.ZERO;
            }
            before = pivot;
        }
        return Optional.of(substituted(rows, right, before));
    }

    private static BigInteger eliminated(BigInteger pivot, BigInteger value, BigInteger factor, BigInteger above,
            BigInteger before) {
        BigInteger difference = pivot.multiply(value).subtract(factor.multiply(above));
        return before.equals(BigInteger.ONE) ? difference : difference.divide(before);
    }

    private static boolean bringPivot(BigInteger[][] rows, BigInteger[] right, int column) {
        for (int i = column; i < rows.length; i++) {
            if (rows[i][column].signum() != 0) {
                BigInteger[] row = rows[i];
                rows[i] = rows[column];
                rows[column] = row;
                BigInteger value = right[i];
                right[i] = right[column];
                right[column] = value;
                return true;
            }
        }
        return false;
    }

    /** From the triangle, whose last pivot is the determinant but for its sign: x times that is whole. */
    private static WholeState substituted(BigInteger[][] rows, BigInteger[] right, BigInteger determinant) {
        int size = rows.length;
        BigInteger[] solution = new BigInteger[size];
        for (int i = size - 1; i >= 0; i--) {
            BigInteger sum = determinant.multiply(right[i]);
            for (int j = i + 1; j < size; j++) {
                sum = sum.subtract(rows[i][j].multiply(solution[j]));
            }
            solution[i] = sum.divide(rows[i][i]);
        }
        boolean isNegative = determinant.signum() < 0;
        return new WholeState(Arrays.stream(solution)
                .map(each -> isNegative ? each.negate() : each).toList(), determinant.abs());
    }
}
