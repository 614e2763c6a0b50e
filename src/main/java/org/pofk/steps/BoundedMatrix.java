package org.pofk.steps;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.BinaryOperator;
import java.util.stream.IntStream;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Ball;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.Rational;

/**
 * A matrix without negative entries, each between two multiples of 2^−{@value #BITS}: sums and products are rounded
 * down for the lower ones and up for the upper ones, so what is true of the entries stays between. A vector has one
 * column. Certified. Lives for one computation, so it holds plain arrays and is not handed out.
 */
public final class BoundedMatrix {
    public static final int BITS = 320;
    /** Squarings before a series counts as too slow to be enclosed: its first 2^this terms. */
    private static final int SQUARINGS = 80;
    /** What is left of a series is less than 2^−this of what is there. */
    private static final int LEFT_BITS = 160;
    private static final BigInteger ONE = BigInteger.ONE.shiftLeft(BITS);

    private final BigInteger[][] low;
    private final BigInteger[][] high;
    private final int columns;

    private BoundedMatrix(BigInteger[][] low, BigInteger[][] high, int columns) {
        this.low = low;
        this.high = high;
        this.columns = columns;
    }

    private static BoundedMatrix zeros(int rows, int columns) {
        BigInteger[][] zeros = new BigInteger[rows][columns];
        Arrays.stream(zeros).forEach(row -> Arrays.fill(row, BigInteger.ZERO));
        return new BoundedMatrix(zeros, Arrays.stream(zeros).map(BigInteger[]::clone).toArray(BigInteger[][]::new),
                columns);
    }

    private void put(int row, int column, Rational value) {
        if (value.signum() < 0) {
            throw new AssertionError("a negative entry: " + value);
        }
        BigInteger[] parts = value.numerator().shiftLeft(BITS).divideAndRemainder(value.denominator());
        low[row][column] = parts[0];
        high[row][column] = parts[1].signum() == 0 ? parts[0] : parts[0].add(BigInteger.ONE);
    }

    /** A vector. */
    public static BoundedMatrix of(List<Rational> components) {
        BoundedMatrix vector = zeros(components.size(), 1);
        IntStream.range(0, components.size()).forEach(i -> vector.put(i, 0, components.get(i)));
        return vector;
    }

    /** The matrix the other way round: entry (i, j) in row j, column i. */
    public static BoundedMatrix transposed(SparseMatrix matrix) {
        BoundedMatrix transposed = zeros(matrix.size(), matrix.size());
        for (int j = 0; j < matrix.size(); j++) {
            for (Entry entry : matrix.columns().get(j)) {
                transposed.put(j, entry.row(), entry.value());
            }
        }
        return transposed;
    }

    public static BoundedMatrix identity(int size) {
        BoundedMatrix identity = zeros(size, size);
        IntStream.range(0, size).forEach(i -> identity.put(i, i, Rational.ONE));
        return identity;
    }

    public int rows() {
        return low.length;
    }

    /** An entry. */
    public Ball at(int row, int column) {
        return Ball.between(low[row][column], high[row][column], BITS);
    }

    /** M N. */
    public BoundedMatrix times(BoundedMatrix right) {
        BoundedMatrix product = zeros(low.length, right.columns);
        for (int i = 0; i < low.length; i++) {
            for (int k = 0; k < columns; k++) {
                if (high[i][k].signum() != 0) {
                    right.addRow(k, low[i][k], high[i][k], product.low[i], product.high[i]);
                }
            }
            for (int j = 0; j < right.columns; j++) {
                product.low[i][j] = product.low[i][j].shiftRight(BITS);
                product.high[i][j] = up(product.high[i][j]);
            }
        }
        return product;
    }

    private void addRow(int row, BigInteger lowFactor, BigInteger highFactor, BigInteger[] lowSums,
            BigInteger[] highSums) {
        for (int j = 0; j < columns; j++) {
            if (high[row][j].signum() != 0) {
                lowSums[j] = lowSums[j].add(lowFactor.multiply(low[row][j]));
                highSums[j] = highSums[j].add(highFactor.multiply(high[row][j]));
            }
        }
    }

    /** Over 2^{@value #BITS}, rounded up. */
    private static BigInteger up(BigInteger value) {
        return value.negate().shiftRight(BITS).negate();
    }

    public BoundedMatrix plus(BoundedMatrix other) {
        return new BoundedMatrix(sums(low, other.low), sums(high, other.high), columns);
    }

    private BigInteger[][] sums(BigInteger[][] a, BigInteger[][] b) {
        return IntStream.range(0, a.length).mapToObj(i -> IntStream.range(0, columns)
                .mapToObj(j -> a[i][j].add(b[i][j]))
                .toArray(BigInteger[]::new)).toArray(BigInteger[][]::new);
    }

    /** The same with zeros outside these rows and columns; of a vector, outside these rows. */
    public BoundedMatrix only(List<Integer> places) {
        BoundedMatrix part = zeros(low.length, columns);
        for (int i : places) {
            for (int j : columns == 1 ? List.of(0) : places) {
                part.low[i][j] = low[i][j];
                part.high[i][j] = high[i][j];
            }
        }
        return part;
    }

    public BoundedMatrix power(int times) {
        BinaryOperator<BoundedMatrix> product = BoundedMatrix::times;
        return BinaryPowering.of(identity(low.length), this, times, product);
    }

    /**
     * The vector x = b + M b + M² b + …, the only one with x = M x + b where the powers of M tend to zero: 2^q terms from
     * 2^(q−1), and for the rest that its components are at most r/(1 − r) times the largest of x so far, r the largest
     * sum of a row of that power. Empty where the first 2^{@value #SQUARINGS} terms leave too much.
     */
    public Optional<BoundedMatrix> series(BoundedMatrix first) {
        BoundedMatrix power = this;
        BoundedMatrix sum = first;
        for (int squarings = 0; squarings <= SQUARINGS; squarings++) {
            BigInteger left = power.largestRowSum();
            if (left.bitLength() <= BITS - LEFT_BITS) {
                return Optional.of(sum.widened(left));
            }
            sum = sum.plus(power.times(sum));
            power = power.times(power);
        }
        return Optional.empty();
    }

    private BigInteger largestRowSum() {
        return Arrays.stream(high).map(row -> Arrays.stream(row).reduce(BigInteger.ZERO, BigInteger::add))
                .reduce(BigInteger.ZERO, BigInteger::max);
    }

    /** Each upper end higher by left/(1 − left) of the largest of them. */
    private BoundedMatrix widened(BigInteger left) {
        BigInteger more = left.signum() == 0 ? BigInteger.ZERO
                : largestRowSum().multiply(left).divide(ONE.subtract(left)).add(BigInteger.ONE);
        return new BoundedMatrix(low, Arrays.stream(high).map(row -> Arrays.stream(row).map(more::add)
                .toArray(BigInteger[]::new)).toArray(BigInteger[][]::new), columns);
    }
}
