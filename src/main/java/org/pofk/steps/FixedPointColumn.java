package org.pofk.steps;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.SparseMatrix;

/**
 * A column of a chain's matrix (or of one of its powers) from below, its entries that are not zero by ascending row.
 * Lives for one computation, so it holds plain arrays and is not handed out.
 */
public final class FixedPointColumn {
    private final int[] rows;
    private final BigInteger[] values;

    private FixedPointColumn(int[] rows, BigInteger[] values) {
        this.rows = rows;
        this.values = values;
    }

    public static List<FixedPointColumn> below(SparseMatrix matrix) {
        return matrix.columns().stream().map(column -> new FixedPointColumn(
                column.stream().mapToInt(SparseMatrix.Entry::row).toArray(),
                column.stream().map(entry -> FixedPointState.below(entry.value())).toArray(BigInteger[]::new))).toList();
    }

    /** The columns of M² from below, M given by its columns from below. */
    public static List<FixedPointColumn> squared(List<FixedPointColumn> columns) {
        return columns.stream().map(column -> column.image(columns)).toList();
    }

    /** The columns of M N from below, both given by their columns from below. */
    public static List<FixedPointColumn> product(List<FixedPointColumn> m, List<FixedPointColumn> n) {
        return n.stream().map(column -> column.image(m)).toList();
    }

    public static List<FixedPointColumn> identity(int size) {
        return IntStream.range(0, size).mapToObj(state -> new FixedPointColumn(new int[] {state},
                new BigInteger[] {BigInteger.ONE.shiftLeft(FixedPointState.BITS)})).toList();
    }

    /** The component in row i. */
    public BigInteger at(int i) {
        int place = Arrays.binarySearch(rows, i);
        return place < 0 ? BigInteger.ZERO : values[place];
    }

    /** How many entries are not zero. */
    int entries() {
        return rows.length;
    }

    /** sums ← sums + weight · column. */
    void addTo(BigInteger[] sums, BigInteger weight) {
        for (int i = 0; i < rows.length; i++) {
            sums[rows[i]] = sums[rows[i]].add(values[i].multiply(weight));
        }
    }

    /** M times this column, rounded down. */
    private FixedPointColumn image(List<FixedPointColumn> columns) {
        BigInteger[] sums = new BigInteger[columns.size()];
        Arrays.fill(sums, BigInteger.ZERO);
        for (int i = 0; i < rows.length; i++) {
            columns.get(rows[i]).addTo(sums, values[i]);
        }
        int[] filled = new int[sums.length];
        int count = 0;
        for (int i = 0; i < sums.length; i++) {
            sums[i] = sums[i].shiftRight(FixedPointState.BITS);
            if (sums[i].signum() != 0) {
                filled[count++] = i;
            }
        }
        int[] places = Arrays.copyOf(filled, count);
        return new FixedPointColumn(places, Arrays.stream(places).mapToObj(i -> sums[i]).toArray(BigInteger[]::new));
    }
}
