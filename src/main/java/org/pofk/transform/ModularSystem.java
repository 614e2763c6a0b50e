package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.pofk.transform.RecurrenceProof.Method;

/**
 * A system modulo one prime, and the recurrences of its readings there. Exact; a step costs one multiplication for
 * each entry of A.
 */
final class ModularSystem {
    /** Terms a probe must agree with beyond twice its order before its vector is looked at. */
    private static final int MARGIN = 8;

    private final PrimeField field;
    private final CompressedRows rows;
    private final int[] entries;
    private final boolean isShort;
    private final int[] start;
    private final List<int[]> readings;

    /** Nothing is copied: the arrays are this system's from here on. */
    ModularSystem(PrimeField field, CompressedRows rows, int[] entries, int[] start, List<int[]> readings) {
        this.field = field;
        this.rows = rows;
        this.entries = entries;
        this.start = start;
        this.readings = readings;
        isShort = rows.isShort(entries);
    }

    /** n. */
    int size() {
        return start.length;
    }

    PrimeField field() {
        return field;
    }

    CompressedRows rows() {
        return rows;
    }

    /** The entries in the order of the rows; not to be changed. */
    int[] entries() {
        return entries;
    }

    /** x(0); not to be changed. */
    int[] start() {
        return start;
    }

    /** One c for each reading; not to be changed. */
    List<int[]> readings() {
        return readings;
    }

    /** True when the entries are so small that a row's sum of products needs no reduction on the way. */
    boolean isShort() {
        return isShort;
    }

    /**
     * The shortest recurrence of each reading. Each is annihilating for every k, not only for the terms seen: n + order
     * terms, so all n windows, were looked at (Cayley–Hamilton). When a polynomial of smaller degree m with
     * D(A) x0 = 0 turns up on the way, m windows are enough.
     */
    List<ModularRecurrence> recurrences() {
        BerlekampMassey probe = new BerlekampMassey(field);
        int[] probing = randomVector(new Random(field.prime()));
        List<BerlekampMassey> found = new ArrayList<>();
        readings.forEach(reading -> found.add(new BerlekampMassey(field)));
        int windows = size();
        boolean probed = false;
        int[] state = start;
        while (windows > 0 && anyOpen(found, windows)) {
            for (int i = 0; i < found.size(); i++) {
                if (isOpen(found.get(i), windows)) {
                    found.get(i).accept(product(readings.get(i), state));
                }
            }
            if (!probed) {
                probe.accept(product(probing, state));
                probed = 3 * probe.order() >= size();
                if (!probed && probe.count() >= 2 * probe.order() + MARGIN) {
                    probed = true;
                    windows = annihilatesStart(probe.recurrence()) ? probe.order() : windows;
                }
            }
            state = next(state);
        }
        Method method = windows < size() ? Method.VECTOR : Method.WINDOWS;
        List<ModularRecurrence> recurrences = new ArrayList<>();
        for (BerlekampMassey one : found) {
            recurrences.add(new ModularRecurrence(one.recurrence(), List.of(one.numerator()), method, windows));
        }
        return recurrences;
    }

    private static boolean anyOpen(List<BerlekampMassey> found, int windows) {
        return found.stream().anyMatch(one -> isOpen(one, windows));
    }

    private static boolean isOpen(BerlekampMassey one, int windows) {
        return one.count() < windows + one.order();
    }

    private boolean annihilatesStart(long[] polynomial) {
        return isZero(remainderOf(polynomial, start, new ArrayList<>()));
    }

    /**
     * The monic polynomial D of least degree d with D(A) x0 = 0, with the numerators of all n components of
     * Σ x(k) z^(−k−1) = N(z)/D(z). Found from random readings (Wiedemann 1986): one whose polynomial leaves a vector
     * of zeros has the least one; otherwise each reading of what is left contributes its own.
     */
    ModularRecurrence ofState() {
        Random random = new Random(field.prime());
        long[] polynomial = probe(start, random, 0).recurrence();
        if (!annihilatesStart(polynomial)) {
            polynomial = new long[] {1};
            for (int[] left = start; !isZero(left); ) {
                long[] nearer = probe(left, random, size()).recurrence();
                polynomial = product(polynomial, nearer);
                left = remainderOf(nearer, left, new ArrayList<>());
            }
        }
        List<int[]> descending = new ArrayList<>();
        remainderOf(polynomial, start, descending);
        List<long[]> numerators = new ArrayList<>();
        int degree = polynomial.length - 1;
        for (int state = 0; state < size(); state++) {
            long[] numerator = new long[degree];
            for (int power = 0; power < degree; power++) {
                numerator[power] = descending.get(degree - 1 - power)[state];
            }
            numerators.add(numerator);
        }
        return new ModularRecurrence(polynomial, numerators, Method.VECTOR, degree);
    }

    /**
     * det(zI − A) by ascending power: the recurrence of a random reading of a random start when it needs all n orders,
     * as it does unless an eigenvalue has several eigenvectors, else by elimination where that is allowed.
     */
    Optional<long[]> characteristicPolynomial(boolean eliminate) {
        Random random = new Random(field.prime());
        BerlekampMassey probe = probe(randomVector(random), random, size());
        if (probe.order() == size()) {
            return Optional.of(probe.recurrence());
        }
        return eliminate
                ? Optional.of(HessenbergForm.characteristicPolynomial(field, rows.dense(entries)))
                : Optional.empty();
    }

    /** The recurrence of a random reading of Aᵏ x, settled for some terms and from at least {@code windows} windows. */
    private BerlekampMassey probe(int[] x, Random random, int windows) {
        int[] probing = randomVector(random);
        BerlekampMassey probe = new BerlekampMassey(field);
        int[] state = x;
        while (probe.count() < Math.max(windows + probe.order(), 2 * probe.order() + MARGIN)) {
            probe.accept(product(probing, state));
            state = next(state);
        }
        return probe;
    }

    /**
     * D(A) x by Horner's rule; the vectors on the way are the coefficients of N(z), D(z) = (zI − A) N(z) − …, from
     * z^(d−1) down to z^0, and are added to {@code onTheWay}.
     */
    private int[] remainderOf(long[] polynomial, int[] x, List<int[]> onTheWay) {
        int[] value = x;
        for (int power = polynomial.length - 2; power >= 0; power--) {
            onTheWay.add(value);
            int[] product = next(value);
            for (int i = 0; i < product.length; i++) {
                product[i] = (int) field.add(product[i], field.multiply(polynomial[power], x[i]));
            }
            value = product;
        }
        return value;
    }

    private long[] product(long[] a, long[] b) {
        long[] product = new long[a.length + b.length - 1];
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < b.length; j++) {
                product[i + j] = field.add(product[i + j], field.multiply(a[i], b[j]));
            }
        }
        return product;
    }

    private static boolean isZero(int[] vector) {
        for (int value : vector) {
            if (value != 0) {
                return false;
            }
        }
        return true;
    }

    /** Seeded by the prime alone, so that a run can be repeated. */
    private int[] randomVector(Random random) {
        int[] vector = new int[size()];
        for (int i = 0; i < vector.length; i++) {
            vector[i] = random.nextInt((int) field.prime());
        }
        return vector;
    }

    private long product(int[] reading, int[] state) {
        long square = field.prime() * field.prime();
        long sum = 0;
        for (int i = 0; i < reading.length; i++) {
            if (reading[i] != 0) {
                sum += (long) reading[i] * state[i] - square;
                sum += (sum >> 63) & square;
            }
        }
        return field.reduce(sum);
    }

    private int[] next(int[] state) {
        return isShort ? rows.timesShort(field, entries, state) : rows.times(field, entries, state);
    }
}
