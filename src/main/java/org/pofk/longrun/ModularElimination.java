package org.pofk.longrun;

import java.math.BigInteger;
import java.util.Optional;

/** A matrix taken apart into triangles modulo a prime below 2^31.5, rows exchanged as needed. n³/3 operations. */
final class ModularElimination {
    private final long prime;
    private final long[][] triangles;
    private final int[] order;
    private final long[] pivotInverse;

    private ModularElimination(long prime, long[][] triangles) {
        this.prime = prime;
        this.triangles = triangles;
        this.order = new int[triangles.length];
        this.pivotInverse = new long[triangles.length];
        for (int i = 0; i < order.length; i++) {
            order[i] = i;
        }
    }

    /** Empty when the matrix is singular modulo the prime. */
    static Optional<ModularElimination> of(IntegerRows rows, long prime) {
        ModularElimination elimination = new ModularElimination(prime, rows.modulo(prime));
        for (int column = 0; column < rows.size(); column++) {
            if (!elimination.bringPivot(column)) {
                return Optional.empty();
            }
            elimination.clearBelow(column);
        }
        return Optional.of(elimination);
    }

    long prime() {
        return prime;
    }

    private boolean bringPivot(int column) {
        for (int row = column; row < order.length; row++) {
            if (triangles[row][column] != 0) {
                long[] values = triangles[row];
                triangles[row] = triangles[column];
                triangles[column] = values;
                int place = order[row];
                order[row] = order[column];
                order[column] = place;
                pivotInverse[column] = BigInteger.valueOf(values[column]).modInverse(BigInteger.valueOf(prime))
                        .longValueExact();
                return true;
            }
        }
        return false;
    }

    /** Below the pivot stands afterwards by what the pivot's row was multiplied. */
    private void clearBelow(int column) {
        long[] pivot = triangles[column];
        for (int row = column + 1; row < order.length; row++) {
            long[] values = triangles[row];
            if (values[column] != 0) {
                long factor = values[column] * pivotInverse[column] % prime;
                values[column] = factor;
                for (int j = column + 1; j < order.length; j++) {
                    if (pivot[j] != 0) {
                        values[j] = (values[j] + (prime - factor) * pivot[j]) % prime;
                    }
                }
            }
        }
    }

    /** The solution modulo the prime. */
    long[] solve(BigInteger[] right) {
        BigInteger modulus = BigInteger.valueOf(prime);
        long[] solution = new long[order.length];
        for (int i = 0; i < order.length; i++) {
            long sum = right[order[i]].mod(modulus).longValueExact();
            for (int j = 0; j < i; j++) {
                sum = (sum + (prime - triangles[i][j]) * solution[j]) % prime;
            }
            solution[i] = sum;
        }
        for (int i = order.length - 1; i >= 0; i--) {
            long sum = solution[i];
            for (int j = i + 1; j < order.length; j++) {
                sum = (sum + (prime - triangles[i][j]) * solution[j]) % prime;
            }
            solution[i] = sum * pivotInverse[i] % prime;
        }
        return solution;
    }
}
