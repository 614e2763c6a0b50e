package org.pofk.chain;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Rational;

/**
 * An n × n matrix of rationals, kept by columns. Canonical form: no zero entries, each column's entries by ascending
 * row. Column j holds the moves out of state j.
 */
public record SparseMatrix(List<List<Entry>> columns) {

    /** The value in row {@code row} of some column: the move into state {@code row}. */
    public record Entry(int row, Rational value) {
    }

    public SparseMatrix {
        List<List<Entry>> canonical = new ArrayList<>(columns.size());
        for (List<Entry> column : columns) {
            canonical.add(column.stream().filter(entry -> !entry.value.isZero())
                    .sorted((a, b) -> Integer.compare(a.row, b.row)).toList());
        }
        columns = List.copyOf(canonical);
    }

    /** From rows written out in full, entry [i][j] the move from j to i. */
    public static SparseMatrix ofRows(List<List<Rational>> rows) {
        List<List<Entry>> columns = new ArrayList<>();
        for (int j = 0; j < rows.size(); j++) {
            List<Entry> column = new ArrayList<>();
            for (int i = 0; i < rows.size(); i++) {
                column.add(new Entry(i, rows.get(i).get(j)));
            }
            columns.add(column);
        }
        return new SparseMatrix(columns);
    }

    /** n, the number of states. */
    public int size() {
        return columns.size();
    }

    /** The least positive integer that makes integers of all entries. */
    public BigInteger commonDenominator() {
        return CommonDenominator.of(columns.stream().flatMap(List::stream).map(Entry::value).distinct().toList());
    }

    /** The entry in row i of column j. */
    public Rational at(int i, int j) {
        return columns.get(j).stream().filter(entry -> entry.row == i).map(Entry::value).findFirst()
                .orElse(Rational.ZERO);
    }

    /** A x for a vector of n components. */
    public List<Rational> times(List<Rational> vector) {
        List<Rational> product = new ArrayList<>(Collections.nCopies(size(), Rational.ZERO));
        for (int j = 0; j < size(); j++) {
            Rational weight = vector.get(j);
            if (!weight.isZero()) {
                for (Entry entry : columns.get(j)) {
                    product.set(entry.row, product.get(entry.row).plus(entry.value.times(weight)));
                }
            }
        }
        return List.copyOf(product);
    }
}
