package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * The terms c Aᵏ x(0) of a system modulo primes: A by rows in plain arrays, ready to be taken modulo one prime after
 * the other. Exact; a step costs one multiplication for each entry of A.
 */
final class KrylovTerms {
    private final LinearSystem system;
    private final RationalTable table = new RationalTable();
    private final int[] rowStart;
    private final int[] column;
    private final int[] value;
    private final int[] start;
    private final List<int[]> readings;

    KrylovTerms(LinearSystem system) {
        this.system = system;
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

    /**
     * The shortest recurrence of each reading modulo the prime, one for each. It is annihilating for every k there,
     * not only for the terms seen: n + order terms, so all n windows, were looked at (Cayley–Hamilton).
     */
    List<BerlekampMassey> recurrencesModulo(PrimeField field) {
        long[] residues = table.modulo(field);
        int[] entries = residuesAt(value, residues);
        int[] state = residuesAt(start, residues);
        List<int[]> read = readings.stream().map(reading -> residuesAt(reading, residues)).toList();
        List<BerlekampMassey> found = new ArrayList<>();
        read.forEach(reading -> found.add(new BerlekampMassey(field)));
        for (boolean open = system.size() > 0; open; ) {
            open = false;
            for (int i = 0; i < found.size(); i++) {
                BerlekampMassey recurrence = found.get(i);
                if (recurrence.count() < system.size() + recurrence.order()) {
                    recurrence.accept(product(field, read.get(i), state));
                    open |= recurrence.count() < system.size() + recurrence.order();
                }
            }
            state = open ? next(field, entries, state) : state;
        }
        return found;
    }

    private static int[] residuesAt(int[] places, long[] residues) {
        int[] chosen = new int[places.length];
        for (int i = 0; i < places.length; i++) {
            chosen[i] = (int) residues[places[i]];
        }
        return chosen;
    }

    private static long product(PrimeField field, int[] reading, int[] state) {
        long square = field.prime() * field.prime();
        long sum = 0;
        for (int i = 0; i < reading.length; i++) {
            sum += (long) reading[i] * state[i] - square;
            sum += (sum >> 63) & square;
        }
        return field.reduce(sum);
    }

    private int[] next(PrimeField field, int[] entries, int[] state) {
        long square = field.prime() * field.prime();
        int[] product = new int[state.length];
        for (int i = 0; i < state.length; i++) {
            long sum = 0;
            for (int at = rowStart[i]; at < rowStart[i + 1]; at++) {
                sum += (long) entries[at] * state[column[at]] - square;
                sum += (sum >> 63) & square;
            }
            product[i] = (int) field.reduce(sum);
        }
        return product;
    }
}
