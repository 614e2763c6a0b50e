package org.pofk.longrun;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;

/**
 * A sparse linear system with every row's denominators cleared. Lives for one solution, so it holds plain arrays and
 * is not handed out.
 */
final class IntegerRows {
    /** A row whose entries are that short in sum is multiplied by digits of 32 bits without overflow. */
    private static final int SHORT_BITS = 31;

    private final int[][] places;
    private final BigInteger[][] values;
    private final BigInteger[] right;
    private final boolean[] isShort;
    private final long[][] shortValues;

    private IntegerRows(int[][] places, BigInteger[][] values, BigInteger[] right) {
        this.places = places;
        this.values = values;
        this.right = right;
        this.isShort = new boolean[values.length];
        this.shortValues = new long[values.length][];
        for (int i = 0; i < values.length; i++) {
            isShort[i] = isShort(values[i]);
            shortValues[i] = isShort[i] ? Arrays.stream(values[i]).mapToLong(BigInteger::longValueExact).toArray()
                    : new long[0];
        }
    }

    static IntegerRows of(SparseMatrix matrix, List<Rational> right) {
        int size = matrix.size();
        BigInteger[] scale = new BigInteger[size];
        int[] counts = new int[size];
        for (int i = 0; i < size; i++) {
            scale[i] = right.get(i).denominator();
        }
        for (List<SparseMatrix.Entry> column : matrix.columns()) {
            for (SparseMatrix.Entry entry : column) {
                BigInteger denominator = entry.value().denominator();
                BigInteger known = scale[entry.row()];
                scale[entry.row()] = LeastCommonMultiple.of(known, denominator);
                counts[entry.row()]++;
            }
        }
        int[][] places = new int[size][];
        BigInteger[][] values = new BigInteger[size][];
        BigInteger[] cleared = new BigInteger[size];
        for (int i = 0; i < size; i++) {
            places[i] = new int[counts[i]];
            values[i] = new BigInteger[counts[i]];
            cleared[i] = scaled(right.get(i), scale[i]);
        }
        for (int j = size - 1; j >= 0; j--) {
            for (SparseMatrix.Entry entry : matrix.columns().get(j)) {
                int place = --counts[entry.row()];
                places[entry.row()][place] = j;
                values[entry.row()][place] = scaled(entry.value(), scale[entry.row()]);
            }
        }
        return new IntegerRows(places, values, cleared);
    }

    private static BigInteger scaled(Rational value, BigInteger multiple) {
        return value.numerator().multiply(multiple.divide(value.denominator()));
    }

    int size() {
        return right.length;
    }

    BigInteger[] right() {
        return right;
    }

    /** The matrix modulo a prime, written out in full. */
    long[][] modulo(long prime) {
        BigInteger modulus = BigInteger.valueOf(prime);
        long[][] full = new long[size()][size()];
        for (int i = 0; i < size(); i++) {
            for (int place = 0; place < places[i].length; place++) {
                full[i][places[i][place]] = values[i][place].mod(modulus).longValueExact();
            }
        }
        return full;
    }

    /** rest ← (rest − M digit) / prime, which leaves nothing. */
    void reduce(BigInteger[] rest, long[] digit, BigInteger prime) {
        for (int i = 0; i < rest.length; i++) {
            rest[i] = rest[i].subtract(isShort[i] ? BigInteger.valueOf(shortProduct(i, digit)) : product(i, digit))
                    .divide(prime);
        }
    }

    private BigInteger product(int row, long[] digit) {
        BigInteger sum = BigInteger.ZERO;
        for (int place = 0; place < places[row].length; place++) {
            sum = sum.add(values[row][place].multiply(BigInteger.valueOf(digit[places[row][place]])));
        }
        return sum;
    }

    private long shortProduct(int row, long[] digit) {
        long sum = 0;
        for (int place = 0; place < places[row].length; place++) {
            sum += shortValues[row][place] * digit[places[row][place]];
        }
        return sum;
    }

    /** Whether the sum of the row's entries times digits below 2^32 stays below 2^63. */
    private static boolean isShort(BigInteger[] row) {
        BigInteger sum = BigInteger.ZERO;
        for (BigInteger value : row) {
            sum = sum.add(value.abs());
        }
        return sum.bitLength() <= SHORT_BITS;
    }

    /** M numerators = denominator · b. */
    boolean isSolvedBy(BigInteger[] numerators, BigInteger denominator) {
        for (int i = 0; i < size(); i++) {
            BigInteger sum = BigInteger.ZERO;
            for (int place = 0; place < places[i].length; place++) {
                sum = sum.add(values[i][place].multiply(numerators[places[i][place]]));
            }
            if (!sum.equals(right[i].multiply(denominator))) {
                return false;
            }
        }
        return true;
    }
}
