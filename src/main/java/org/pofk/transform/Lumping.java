package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Rational;

/**
 * States that behave alike taken together, the readings' sequences unchanged (Kemeny and Snell 1960, section 6.3;
 * Buchholz 1994; from memory). Exact: found modulo a prime, then every sum is compared as a rational.
 *
 * @param kind   which of the two ways, and the identity that holds
 * @param blocks the states of {@code before} that each state of {@code after} stands for, each ascending, by their
 *               first members
 */
public record Lumping(Kind kind, List<List<Integer>> blocks, LinearSystem before, LinearSystem after) {

    /** The two ways of taking states together; A, x0, c belong to {@code before}, those with a tilde to after. */
    public enum Kind {
        /**
         * The start is the same throughout a block, and so stays the state: A U = U Ã, x0 = U x̃0, c̃ = c U, where U
         * spreads a block's sum evenly over its members (entry 1/size).
         */
        EXACT,
        /** The readings are the same throughout a block, only its sum is needed: V A = Ã V, c = c̃ V, x̃0 = V x0. */
        ORDINARY
    }

    public Lumping {
        blocks = blocks.stream().map(List::copyOf).toList();
    }

    /** The coarsest exact lumping from the level sets of the start; empty when no two states go together. */
    static Optional<Lumping> exact(LinearSystem system) {
        List<List<Entry>> columns = system.matrix().columns();
        return refined(columns, system.start()).map(blocks -> {
            List<List<Entry>> rows = Transposition.rows(system.matrix());
            List<List<Entry>> lumpedRows = new ArrayList<>();
            int[] blockOf = blockOf(blocks, system.size());
            for (List<Integer> block : blocks) {
                List<Entry> row = new ArrayList<>();
                sums(rows.get(block.get(0)), blockOf).forEach((source, sum) -> row.add(new Entry(source,
                        sum.times(Rational.of(block.size(), blocks.get(source).size())))));
                lumpedRows.add(row);
            }
            SparseMatrix matrix = new SparseMatrix(Transposition.rows(new SparseMatrix(lumpedRows)));
            List<Rational> start = blocks.stream()
                    .map(block -> system.start().get(block.get(0)).times(Rational.of(block.size()))).toList();
            List<List<Rational>> readings = system.readings().stream()
                    .map(reading -> blocks.stream().map(block -> mean(reading, block)).toList()).toList();
            return new Lumping(Kind.EXACT, blocks, system, new LinearSystem(matrix, start, readings));
        });
    }

    /** The coarsest ordinary lumping from the level sets of the readings; empty when no two states go together. */
    static Optional<Lumping> ordinary(LinearSystem system) {
        List<List<Rational>> readingsOfStates = new ArrayList<>();
        for (int state = 0; state < system.size(); state++) {
            int place = state;
            readingsOfStates.add(system.readings().stream().map(reading -> reading.get(place)).toList());
        }
        return refined(Transposition.rows(system.matrix()), readingsOfStates).map(blocks -> {
            int[] blockOf = blockOf(blocks, system.size());
            List<List<Entry>> columns = new ArrayList<>();
            for (List<Integer> block : blocks) {
                List<Entry> column = new ArrayList<>();
                sums(system.matrix().columns().get(block.get(0)), blockOf)
                        .forEach((target, sum) -> column.add(new Entry(target, sum)));
                columns.add(column);
            }
            List<Rational> start = blocks.stream()
                    .map(block -> mean(system.start(), block).times(Rational.of(block.size()))).toList();
            List<List<Rational>> readings = system.readings().stream()
                    .map(reading -> blocks.stream().map(block -> reading.get(block.get(0))).toList()).toList();
            return new Lumping(Kind.ORDINARY, blocks, system,
                    new LinearSystem(new SparseMatrix(columns), start, readings));
        });
    }

    /** The coarsest stable refinement of the level sets, exactly; empty when it takes nothing together. */
    private static Optional<List<List<Integer>>> refined(List<List<Entry>> givers, List<?> levels) {
        List<List<Entry>> takers = Transposition.rows(new SparseMatrix(givers));
        BigInteger denominator = CommonDenominator.of(givers.stream().flatMap(List::stream).map(Entry::value)
                .distinct().toList());
        for (long below = 1L << 31; ; ) {
            PrimeField field = PrimeField.below(below);
            below = field.prime();
            if (field.of(denominator) != 0) {
                List<List<Integer>> blocks =
                        CoarsestPartition.of(field, givers, CoarsestPartition.levelSets(levels));
                if (blocks.size() == givers.size()) {
                    return Optional.empty();
                }
                if (isStable(blocks, takers)) {
                    return Optional.of(blocks);
                }
            }
        }
    }

    private static boolean isStable(List<List<Integer>> blocks, List<List<Entry>> takers) {
        int[] blockOf = blockOf(blocks, takers.size());
        for (List<Integer> block : blocks) {
            Map<Integer, Rational> first = sums(takers.get(block.get(0)), blockOf);
            for (int member : block) {
                if (!sums(takers.get(member), blockOf).equals(first)) {
                    return false;
                }
            }
        }
        return true;
    }

    /** What a line adds up to within each block, zero sums left out. */
    private static Map<Integer, Rational> sums(List<Entry> line, int[] blockOf) {
        Map<Integer, Rational> sums = new HashMap<>();
        for (Entry entry : line) {
            sums.merge(blockOf[entry.row()], entry.value(), Rational::plus);
        }
        sums.values().removeIf(Rational::isZero);
        return sums;
    }

    private static int[] blockOf(List<List<Integer>> blocks, int size) {
        int[] blockOf = new int[size];
        for (int block = 0; block < blocks.size(); block++) {
            for (int member : blocks.get(block)) {
                blockOf[member] = block;
            }
        }
        return blockOf;
    }

    private static Rational mean(List<Rational> vector, List<Integer> block) {
        Rational sum = Rational.ZERO;
        for (int member : block) {
            sum = sum.plus(vector.get(member));
        }
        return sum.dividedBy(Rational.of(block.size()));
    }
}
