package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToIntFunction;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * Where the entries of a sparse matrix stand, row after row in plain arrays. The values are kept apart, one array of
 * residues a prime. Exact; a product costs one multiplication for each entry.
 */
final class CompressedRows {
    /** Where each row begins in {@link #column}; one more for the end. */
    private final int[] begin;
    private final int[] column;
    private final int[] value;

    /** {@code places} gives the place of an entry's value. */
    CompressedRows(SparseMatrix matrix, ToIntFunction<Rational> places) {
        List<Entry> inOrder = new ArrayList<>();
        begin = new int[matrix.size() + 1];
        List<List<Entry>> rows = Transposition.rows(matrix);
        for (int row = 0; row < rows.size(); row++) {
            inOrder.addAll(rows.get(row));
            begin[row + 1] = inOrder.size();
        }
        column = inOrder.stream().mapToInt(Entry::row).toArray();
        value = inOrder.stream().map(Entry::value).mapToInt(places).toArray();
    }

    /** The place of each entry's value, in the order {@link #times} wants its entries. */
    int[] valuePlaces() {
        return value.clone();
    }

    /** The matrix with these entries written out in full. */
    long[][] dense(int[] entries) {
        int size = begin.length - 1;
        long[][] matrix = new long[size][size];
        for (int row = 0; row < size; row++) {
            for (int at = begin[row]; at < begin[row + 1]; at++) {
                matrix[row][column[at]] = entries[at];
            }
        }
        return matrix;
    }

    /** True when sums of products of the entries of a row with residues stay below 2^63. */
    boolean isShort(int[] entries) {
        for (int row = 0; row + 1 < begin.length; row++) {
            long sum = 0;
            for (int at = begin[row]; at < begin[row + 1]; at++) {
                sum += entries[at];
            }
            if (sum >= 1L << 32) {
                return false;
            }
        }
        return true;
    }

    /** The matrix with these entries times a vector of residues, for entries that are short. */
    int[] timesShort(PrimeField field, int[] entries, int[] vector) {
        int[] product = new int[vector.length];
        for (int row = 0; row < product.length; row++) {
            long sum = 0;
            for (int at = begin[row]; at < begin[row + 1]; at++) {
                sum += (long) entries[at] * vector[column[at]];
            }
            product[row] = (int) field.reduce(sum);
        }
        return product;
    }

    /** The same for four vectors modulo four primes, interleaved: component i of vector v in place 4i + v. */
    int[] timesShort(PrimeField first, PrimeField second, PrimeField third, PrimeField fourth, int[] entries,
            int[] vectors) {
        int[] product = new int[vectors.length];
        for (int row = 0; row + 1 < begin.length; row++) {
            long sum0 = 0;
            long sum1 = 0;
            long sum2 = 0;
            long sum3 = 0;
            for (int at = begin[row]; at < begin[row + 1]; at++) {
                long entry = entries[at];
                int from = 4 * column[at];
                sum0 += entry * vectors[from];
                sum1 += entry * vectors[from + 1];
                sum2 += entry * vectors[from + 2];
                sum3 += entry * vectors[from + 3];
            }
            product[4 * row] = (int) first.reduce(sum0);
            product[4 * row + 1] = (int) second.reduce(sum1);
            product[4 * row + 2] = (int) third.reduce(sum2);
            product[4 * row + 3] = (int) fourth.reduce(sum3);
        }
        return product;
    }

    /** The matrix with these entries times a vector of residues. */
    int[] times(PrimeField field, int[] entries, int[] vector) {
        long square = field.prime() * field.prime();
        int[] product = new int[vector.length];
        for (int row = 0; row < product.length; row++) {
            long sum = 0;
            for (int at = begin[row]; at < begin[row + 1]; at++) {
                sum += (long) entries[at] * vector[column[at]] - square;
                sum += (sum >> 63) & square;
            }
            product[row] = (int) field.reduce(sum);
        }
        return product;
    }
}
