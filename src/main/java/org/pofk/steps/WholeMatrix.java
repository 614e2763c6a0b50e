package org.pofk.steps;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * A square matrix in whole numbers over one divisor, kept by columns, common factors left in. Exact. Lives for one
 * computation, so it holds plain arrays and is not handed out.
 */
public final class WholeMatrix {
    private final int[][] rows;
    private final BigInteger[][] values;
    private final BigInteger divisor;

    private WholeMatrix(int[][] rows, BigInteger[][] values, BigInteger divisor) {
        this.rows = rows;
        this.values = values;
        this.divisor = divisor;
    }

    public static WholeMatrix of(SparseMatrix matrix) {
        BigInteger common = matrix.commonDenominator();
        return new WholeMatrix(
                matrix.columns().stream().map(column -> column.stream().mapToInt(Entry::row).toArray())
                        .toArray(int[][]::new),
                matrix.columns().stream().map(column -> column.stream().map(entry -> whole(entry.value(), common))
                        .toArray(BigInteger[]::new)).toArray(BigInteger[][]::new), common);
    }

    public static WholeMatrix identity(int size) {
        int[][] rows = new int[size][];
        BigInteger[][] values = new BigInteger[size][];
        for (int j = 0; j < size; j++) {
            rows[j] = new int[] {j};
            values[j] = new BigInteger[] {BigInteger.ONE};
        }
        return new WholeMatrix(rows, values, BigInteger.ONE);
    }

    static BigInteger whole(Rational value, BigInteger divisor) {
        return value.numerator().multiply(divisor.divide(value.denominator()));
    }

    public int size() {
        return rows.length;
    }

    /** How many entries are not zero. */
    public long entries() {
        return Arrays.stream(rows).mapToLong(column -> column.length).sum();
    }

    public BigInteger divisor() {
        return divisor;
    }

    /** The entries times the divisor, [i][j] in row i of column j. */
    public BigInteger[][] table() {
        BigInteger[][] table = new BigInteger[size()][size()];
        for (int j = 0; j < size(); j++) {
            BigInteger[] column = spread(j);
            for (int i = 0; i < size(); i++) {
                table[i][j] = column[i];
            }
        }
        return table;
    }

    private BigInteger[] spread(int j) {
        BigInteger[] column = zeros();
        for (int i = 0; i < rows[j].length; i++) {
            column[rows[j][i]] = values[j][i];
        }
        return column;
    }

    private BigInteger[] zeros() {
        BigInteger[] zeros = new BigInteger[size()];
        Arrays.fill(zeros, BigInteger.ZERO);
        return zeros;
    }

    /** M x. */
    public WholeState times(WholeState state) {
        return new WholeState(List.of(image(state.numerators().toArray(BigInteger[]::new))),
                state.divisor().multiply(divisor));
    }

    private BigInteger[] image(BigInteger[] vector) {
        BigInteger[] sums = zeros();
        for (int j = 0; j < size(); j++) {
            if (vector[j].signum() != 0) {
                for (int i = 0; i < rows[j].length; i++) {
                    sums[rows[j][i]] = sums[rows[j][i]].add(values[j][i].multiply(vector[j]));
                }
            }
        }
        return sums;
    }

    /** c M for a row c. */
    public WholeState timesFromLeft(WholeState row) {
        List<BigInteger> product = new ArrayList<>();
        for (int j = 0; j < size(); j++) {
            BigInteger sum = BigInteger.ZERO;
            for (int i = 0; i < rows[j].length; i++) {
                sum = sum.add(row.numerators().get(rows[j][i]).multiply(values[j][i]));
            }
            product.add(sum);
        }
        return new WholeState(product, row.divisor().multiply(divisor));
    }

    /** M N. */
    public WholeMatrix times(WholeMatrix right) {
        int[][] newRows = new int[size()][];
        BigInteger[][] newValues = new BigInteger[size()][];
        for (int j = 0; j < size(); j++) {
            BigInteger[] column = image(right.spread(j));
            newRows[j] = IntStream.range(0, size()).filter(i -> column[i].signum() != 0).toArray();
            newValues[j] = Arrays.stream(newRows[j]).mapToObj(i -> column[i]).toArray(BigInteger[]::new);
        }
        return new WholeMatrix(newRows, newValues, divisor.multiply(right.divisor));
    }

    /** M to the power of {@code times} ≥ 0 by squaring, or M by M where its columns are so short that this is less work. */
    public WholeMatrix power(int times) {
        WholeMatrix result = identity(size());
        if (times * entries() <= (long) size() * size() * (Integer.SIZE - Integer.numberOfLeadingZeros(times))) {
            for (int i = 0; i < times; i++) {
                result = times(result);
            }
            return result;
        }
        WholeMatrix square = this;
        for (int left = times; left > 0; left >>= 1) {
            result = (left & 1) == 1 ? square.times(result) : result;
            square = left > 1 ? square.times(square) : square;
        }
        return result;
    }

    /** The entries in lowest terms. */
    public SparseMatrix reduced() {
        List<List<Entry>> columns = new ArrayList<>();
        for (int j = 0; j < size(); j++) {
            List<Entry> column = new ArrayList<>();
            for (int i = 0; i < rows[j].length; i++) {
                column.add(new Entry(rows[j][i], new Rational(values[j][i], divisor)));
            }
            columns.add(column);
        }
        return new SparseMatrix(columns);
    }
}
