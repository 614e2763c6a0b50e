package org.pofk.transform;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/** Small chains and recursions drawn from a seed, of every shape that has tripped an engine. */
final class RandomSystems {
    /** What is peculiar about a drawn system. */
    enum Shape { CHAIN, ABSORBING, REDUCIBLE, PERIODIC, REPEATED, SYMMETRIC, RECURSION, NILPOTENT, COMPANION, CONSTANT }

    private final Random random;

    RandomSystems(long seed) {
        random = new Random(seed);
    }

    /** A system with one to three outputs. */
    Chain next(Shape shape) {
        int size = 1 + random.nextInt(6);
        Rational[][] matrix = matrix(shape, size);
        boolean chain = switch (shape) {
            case RECURSION, NILPOTENT, COMPANION, CONSTANT -> false;
            default -> true;
        };
        List<Rational> start = chain ? probabilities(size) : entries(size);
        List<Output> outputs = new ArrayList<>();
        for (int i = random.nextInt(3); i >= 0; i--) {
            Rational constant = shape == Shape.CONSTANT ? fraction() : Rational.ZERO;
            outputs.add(new Output("y" + i, shape == Shape.SYMMETRIC && random.nextBoolean()
                    ? Collections.nCopies(size, Rational.ONE) : entries(size), constant, "y" + i));
        }
        return new Chain(chain ? Chain.Kind.CHAIN : Chain.Kind.RECURSION, names(size), sparse(matrix), start,
                Map.of(), outputs);
    }

    /** A chain of given size with so many random moves out of every state, one start and one output. */
    static Chain sparseChain(long seed, int size, int moves) {
        Random random = new Random(seed);
        List<List<Entry>> columns = new ArrayList<>();
        for (int j = 0; j < size; j++) {
            Rational[] column = new Rational[size];
            Arrays.fill(column, Rational.ZERO);
            int left = 1000;
            for (int move = 1; move < moves; move++) {
                int weight = 1 + random.nextInt(1000 / moves);
                left -= weight;
                int to = random.nextInt(size);
                column[to] = column[to].plus(Rational.of(weight, 1000));
            }
            column[j] = column[j].plus(Rational.of(left, 1000));
            List<Entry> entries = new ArrayList<>();
            for (int i = 0; i < size; i++) {
                entries.add(new Entry(i, column[i]));
            }
            columns.add(entries);
        }
        List<Rational> start = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        start.set(0, Rational.ONE);
        List<Rational> last = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        last.set(size - 1, Rational.ONE);
        return new Chain(Chain.Kind.CHAIN, names(size), new SparseMatrix(columns), start, Map.of(),
                List.of(new Output("last", last, Rational.ZERO, "last")));
    }

    private Rational[][] matrix(Shape shape, int size) {
        Rational[][] matrix = new Rational[size][size];
        for (int j = 0; j < size; j++) {
            List<Rational> column = column(shape, size, j);
            for (int i = 0; i < size; i++) {
                matrix[i][j] = column.get(i);
            }
        }
        return matrix;
    }

    private List<Rational> column(Shape shape, int size, int j) {
        return switch (shape) {
            case CHAIN -> probabilities(size);
            case ABSORBING -> j == size - 1 ? unit(size, j) : probabilities(size);
            case REDUCIBLE -> below(size, j < size / 2 ? 0 : size / 2);
            case PERIODIC -> unit(size, random.nextInt(4) == 0 ? random.nextInt(size) : (j + 1) % size);
            case REPEATED -> stage(size, j);
            case SYMMETRIC -> mixed(size, j);
            case RECURSION, CONSTANT -> entries(size);
            case NILPOTENT -> strictlyBelow(size, j);
            case COMPANION -> j < size - 1 ? unit(size, j + 1) : entries(size);
        };
    }

    /** Moves to later states only, from {@code first} on. */
    private List<Rational> below(int size, int first) {
        List<Rational> column = new ArrayList<>(Collections.nCopies(first, Rational.ZERO));
        column.addAll(probabilities(size - first));
        return column;
    }

    /** The same chance to go on at every stage: repeated poles. */
    private List<Rational> stage(int size, int j) {
        List<Rational> column = new ArrayList<>(unit(size, j));
        if (j < size - 1) {
            column.set(j, Rational.of(1, 3));
            column.set(j + 1, Rational.of(2, 3));
        }
        return column;
    }

    /** Every other state alike: cancelled poles. */
    private List<Rational> mixed(int size, int j) {
        Rational other = Rational.of(1, 2 * size);
        List<Rational> column = new ArrayList<>(Collections.nCopies(size, other));
        column.set(j, Rational.ONE.minus(other.times(Rational.of(size - 1))));
        return column;
    }

    private List<Rational> strictlyBelow(int size, int j) {
        List<Rational> column = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        for (int i = j + 1; i < size; i++) {
            column.set(i, fraction());
        }
        return column;
    }

    private static List<Rational> unit(int size, int place) {
        List<Rational> column = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        column.set(place, Rational.ONE);
        return column;
    }

    private List<Rational> entries(int size) {
        List<Rational> entries = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            entries.add(random.nextInt(3) == 0 ? Rational.ZERO : fraction());
        }
        return entries;
    }

    private Rational fraction() {
        return Rational.of(random.nextInt(13) - 6, 1 + random.nextInt(4));
    }

    private List<Rational> probabilities(int size) {
        long[] weights = new long[size];
        long sum = 0;
        for (int i = 0; i < size; i++) {
            weights[i] = random.nextInt(3) == 0 ? random.nextInt(7) : 0;
            sum += weights[i];
        }
        if (sum == 0) {
            return unit(size, random.nextInt(size));
        }
        List<Rational> column = new ArrayList<>();
        for (long weight : weights) {
            column.add(Rational.of(weight, sum));
        }
        return column;
    }

    private static SparseMatrix sparse(Rational[][] matrix) {
        List<List<Rational>> rows = new ArrayList<>();
        for (Rational[] row : matrix) {
            rows.add(List.of(row));
        }
        return SparseMatrix.ofRows(rows);
    }

    private static List<String> names(int size) {
        List<String> names = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            names.add("s" + i);
        }
        return names;
    }
}
