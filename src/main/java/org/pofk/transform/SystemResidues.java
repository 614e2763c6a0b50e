package org.pofk.transform;

import java.util.List;
import org.pofk.exact.Rational;

/**
 * A system ready to be taken modulo one prime after the other: each different number held once. Exact; a prime
 * costs O(entries).
 */
final class SystemResidues {
    private final RationalTable table = new RationalTable();
    private final CompressedRows rows;
    private final int[] start;
    private final List<int[]> readings;

    SystemResidues(LinearSystem system) {
        rows = new CompressedRows(system.matrix(), table::placeOf);
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
        return new ModularSystem(field, rows, residuesAt(rows.valuePlaces(), residues), residuesAt(start, residues),
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
