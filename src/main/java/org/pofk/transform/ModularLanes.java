package org.pofk.transform;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.pofk.transform.RecurrenceProof.Method;

/**
 * The same system modulo four primes at once, for matrices of small whole numbers: each entry is read once for all
 * four, which takes half the time. Exact, and the same results as one prime after the other.
 */
final class ModularLanes {
    /** How many primes go together. */
    static final int WIDTH = 4;

    private final List<ModularSystem> systems;
    private final CompressedRows rows;
    private final int[] entries;
    private final int size;

    private ModularLanes(List<ModularSystem> systems) {
        this.systems = systems;
        rows = systems.get(0).rows();
        entries = systems.get(0).entries();
        size = systems.get(0).size();
    }

    /** Empty unless there are {@value #WIDTH} systems with the same short entries. */
    static Optional<ModularLanes> of(List<ModularSystem> systems) {
        boolean same = systems.size() == WIDTH && systems.stream().allMatch(system -> system.isShort()
                && Arrays.equals(system.entries(), systems.get(0).entries()));
        return same ? Optional.of(new ModularLanes(systems)) : Optional.empty();
    }

    /**
     * What {@link ModularSystem#recurrences()} says for each prime, from n windows. A recurrence longer than
     * {@code order} needs more terms than are looked at here: such a prime is left to the system itself.
     */
    List<List<ModularRecurrence>> recurrences(int order) {
        List<List<BerlekampMassey>> found = new ArrayList<>();
        for (ModularSystem system : systems) {
            List<BerlekampMassey> ofPrime = new ArrayList<>();
            system.readings().forEach(reading -> ofPrime.add(new BerlekampMassey(system.field())));
            found.add(ofPrime);
        }
        int[] state = interleaved();
        for (int term = 0; term < size + order; term++) {
            for (int lane = 0; lane < WIDTH; lane++) {
                accept(lane, found.get(lane), state);
            }
            state = next(state);
        }
        List<List<ModularRecurrence>> recurrences = new ArrayList<>();
        for (int lane = 0; lane < WIDTH; lane++) {
            boolean settled = found.get(lane).stream().allMatch(one -> one.order() <= order);
            recurrences.add(settled
                    ? found.get(lane).stream().map(this::recurrence).toList()
                    : systems.get(lane).recurrences());
        }
        return recurrences;
    }

    private ModularRecurrence recurrence(BerlekampMassey found) {
        return new ModularRecurrence(found.recurrence(), List.of(found.numerator()), Method.WINDOWS, size);
    }

    private void accept(int lane, List<BerlekampMassey> found, int[] state) {
        List<int[]> readings = systems.get(lane).readings();
        for (int i = 0; i < readings.size(); i++) {
            found.get(i).accept(product(systems.get(lane).field(), readings.get(i), state, lane));
        }
    }

    private static long product(PrimeField field, int[] reading, int[] state, int lane) {
        long square = field.prime() * field.prime();
        long sum = 0;
        for (int i = 0; i < reading.length; i++) {
            if (reading[i] != 0) {
                sum += (long) reading[i] * state[WIDTH * i + lane] - square;
                sum += (sum >> 63) & square;
            }
        }
        return field.reduce(sum);
    }

    private int[] interleaved() {
        int[] state = new int[WIDTH * size];
        for (int lane = 0; lane < WIDTH; lane++) {
            for (int i = 0; i < size; i++) {
                state[WIDTH * i + lane] = systems.get(lane).start()[i];
            }
        }
        return state;
    }

    private int[] next(int[] state) {
        return rows.timesShort(systems.get(0).field(), systems.get(1).field(), systems.get(2).field(),
                systems.get(3).field(), entries, state);
    }
}
