package org.pofk.transform;

import java.util.List;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * A system ready to be taken modulo one prime after the other: A by rows in plain arrays, each different number held
 * once. Exact; a prime costs O(entries).
 */
final class SystemResidues {
    private final RationalTable table = new RationalTable();
    private final int[] rowStart;
    private final int[] column;
    private final int[] value;
    private final int[] start;
    private final List<int[]> readings;

    SystemResidues(LinearSystem system) {
        int size = system.size();
        rowStart = new int[size + 1];
        for (List<Entry> entries : system.matrix().columns()) {
            for (Entry entry : entries) {
                rowStart[entry.row() + 1]++;
            }
        }
        for (int i = 0; i < size; i++) {
            rowStart[i + 1] += rowStart[i];
        }
        column = new int[rowStart[size]];
        value = new int[rowStart[size]];
        int[] next = rowStart.clone();
        for (int j = 0; j < size; j++) {
            for (Entry entry : system.matrix().columns().get(j)) {
                column[next[entry.row()]] = j;
                value[next[entry.row()]++] = table.placeOf(entry.value());
            }
        }
        start = places(system.start());
        readings = system.readings().stream().map(this::places).toList();
    }

    private int[] places(List<Rational> vector) {
        return vector.stream().mapToInt(table::placeOf).toArray();
    }

    /** True when every number of the system has a residue modulo the prime. */
    boolean isDefinedModulo(PrimeField field) {
        return table.isDefinedModulo(field);
    }

    /** The system modulo the prime, which divides none of its denominators. */
    ModularSystem modulo(PrimeField field) {
        long[] residues = table.modulo(field);
        return new ModularSystem(field, rowStart, column, residuesAt(value, residues), residuesAt(start, residues),
                readings.stream().map(reading -> residuesAt(reading, residues)).toList());
    }

    private static int[] residuesAt(int[] places, long[] residues) {
        int[] chosen = new int[places.length];
        for (int i = 0; i < places.length; i++) {
            chosen[i] = (int) residues[places[i]];
        }
        return chosen;
    }
}
