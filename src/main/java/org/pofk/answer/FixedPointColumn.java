package org.pofk.answer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.SparseMatrix;

/** A column of a chain's matrix (or of one of its powers) from below, its entries that are not zero by ascending row. */
record FixedPointColumn(List<Integer> rows, List<BigInteger> values) {

    static List<FixedPointColumn> below(SparseMatrix matrix) {
        return matrix.columns().stream().map(column -> new FixedPointColumn(
                column.stream().map(SparseMatrix.Entry::row).toList(),
                column.stream().map(entry -> FixedPointState.below(entry.value())).toList())).toList();
    }

    /** The columns of M² from below, M given by its columns from below. */
    static List<FixedPointColumn> squared(List<FixedPointColumn> columns) {
        return columns.stream().map(column -> of(FixedPointState.combination(columns, column.full(columns.size()))))
                .toList();
    }

    private static FixedPointColumn of(FixedPointState state) {
        List<Integer> rows = new ArrayList<>();
        List<BigInteger> values = new ArrayList<>();
        for (int i = 0; i < state.components().size(); i++) {
            if (state.components().get(i).signum() != 0) {
                rows.add(i);
                values.add(state.components().get(i));
            }
        }
        return new FixedPointColumn(rows, values);
    }

    private List<BigInteger> full(int size) {
        BigInteger[] all = new BigInteger[size];
        java.util.Arrays.fill(all, BigInteger.ZERO);
        addTo(all, BigInteger.ONE);
        return List.of(all);
    }

    /** sums ← sums + weight · column. */
    void addTo(BigInteger[] sums, BigInteger weight) {
        for (int i = 0; i < rows.size(); i++) {
            sums[rows.get(i)] = sums[rows.get(i)].add(values.get(i).multiply(weight));
        }
    }
}
