package org.pofk.transform;

/**
 * The characteristic polynomial of a dense matrix modulo a prime, by elimination to Hessenberg form and the recurrence
 * of its leading minors (Cohen 1993, A Course in Computational Algebraic Number Theory, algorithm 2.2.9; from memory).
 * Exact; n³ multiplications.
 */
final class HessenbergForm {
    private HessenbergForm() {
    }

    /** det(zI − M) by ascending power; the matrix is used up. */
    static long[] characteristicPolynomial(PrimeField field, long[][] matrix) {
        reduce(field, matrix);
        int size = matrix.length;
        long[][] minors = new long[size + 1][];
        minors[0] = new long[] {1};
        for (int m = 1; m <= size; m++) {
            long[] minor = new long[m + 1];
            System.arraycopy(minors[m - 1], 0, minor, 1, m);
            subtract(field, minor, minors[m - 1], matrix[m - 1][m - 1]);
            long below = 1;
            for (int i = 1; i < m; i++) {
                below = field.multiply(below, matrix[m - i][m - i - 1]);
                subtract(field, minor, minors[m - i - 1], field.multiply(below, matrix[m - i - 1][m - 1]));
            }
            minors[m] = minor;
        }
        return minors[size];
    }

    private static void subtract(PrimeField field, long[] from, long[] polynomial, long factor) {
        for (int i = 0; factor != 0 && i < polynomial.length; i++) {
            from[i] = field.subtract(from[i], field.multiply(factor, polynomial[i]));
        }
    }

    /** Similar matrices until nothing is left below the first subdiagonal. */
    private static void reduce(PrimeField field, long[][] matrix) {
        for (int column = 0; column + 2 < matrix.length; column++) {
            int pivot = column + 1;
            while (pivot < matrix.length && matrix[pivot][column] == 0) {
                pivot++;
            }
            if (pivot < matrix.length) {
                exchange(matrix, pivot, column + 1);
                eliminate(field, matrix, column);
            }
        }
    }

    private static void exchange(long[][] matrix, int a, int b) {
        long[] row = matrix[a];
        matrix[a] = matrix[b];
        matrix[b] = row;
        for (long[] each : matrix) {
            long value = each[a];
            each[a] = each[b];
            each[b] = value;
        }
    }

    private static void eliminate(PrimeField field, long[][] matrix, int column) {
        long[] pivotRow = matrix[column + 1];
        long inverse = field.inverse(pivotRow[column]);
        for (int i = column + 2; i < matrix.length; i++) {
            long factor = field.multiply(matrix[i][column], inverse);
            if (factor != 0) {
                for (int j = column; j < matrix.length; j++) {
                    matrix[i][j] = field.subtract(matrix[i][j], field.multiply(factor, pivotRow[j]));
                }
                for (long[] row : matrix) {
                    row[column + 1] = field.add(row[column + 1], field.multiply(factor, row[i]));
                }
            }
        }
    }
}
