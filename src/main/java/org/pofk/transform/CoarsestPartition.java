package org.pofk.transform;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collection;
import java.util.Comparator;
import java.util.Deque;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.pofk.chain.SparseMatrix.Entry;

/**
 * Refines a partition of 0 … n−1 until, for every two blocks B and S, all members of B get the same sum from S, where
 * {@code lines.get(s)} says what s gives to whom. Splitting by one block at a time, all parts but the largest becoming
 * splitters (Valmari and Franceschinis 2010, from memory): O(entries · log n) operations modulo one prime. Sums that
 * differ by a multiple of the prime look the same, so the result may be too coarse, never too fine: the caller checks
 * it exactly. Mutable; one refinement.
 */
final class CoarsestPartition {
    private final PrimeField field;
    private final List<List<Entry>> lines;
    private final long[] residues;
    private final int[] begin;
    private final int[] blockOf;
    private final List<List<Integer>> blocks = new ArrayList<>();
    private final Deque<Integer> splitters = new ArrayDeque<>();
    private final BitSet waiting = new BitSet();

    private CoarsestPartition(PrimeField field, List<List<Entry>> lines, Collection<List<Integer>> coarse) {
        this.field = field;
        this.lines = lines;
        RationalTable table = new RationalTable();
        begin = new int[lines.size() + 1];
        List<Integer> places = new ArrayList<>();
        for (int line = 0; line < lines.size(); line++) {
            lines.get(line).forEach(entry -> places.add(table.placeOf(entry.value())));
            begin[line + 1] = places.size();
        }
        long[] ofTable = table.modulo(field);
        residues = places.stream().mapToLong(place -> ofTable[place]).toArray();
        blockOf = new int[lines.size()];
        for (List<Integer> block : coarse) {
            enqueue(add(new ArrayList<>(block)));
        }
    }

    /** The refined blocks, each ascending, by their first members. */
    static List<List<Integer>> of(PrimeField field, List<List<Entry>> lines, Collection<List<Integer>> coarse) {
        CoarsestPartition partition = new CoarsestPartition(field, lines, coarse);
        while (!partition.splitters.isEmpty()) {
            int splitter = partition.splitters.poll();
            partition.waiting.clear(splitter);
            partition.splitBy(splitter);
        }
        return partition.blocks.stream().map(block -> block.stream().sorted().toList())
                .sorted(Comparator.comparing(block -> block.get(0))).toList();
    }

    /** The places of a list by equal values, in order of appearance. */
    static Collection<List<Integer>> levelSets(List<?> values) {
        Map<Object, List<Integer>> sets = new LinkedHashMap<>();
        for (int i = 0; i < values.size(); i++) {
            sets.computeIfAbsent(values.get(i), unseen -> new ArrayList<>()).add(i);
        }
        return sets.values();
    }

    private int add(List<Integer> block) {
        block.forEach(member -> blockOf[member] = blocks.size());
        blocks.add(block);
        return blocks.size() - 1;
    }

    private void enqueue(int block) {
        if (!waiting.get(block)) {
            waiting.set(block);
            splitters.add(block);
        }
    }

    private void splitBy(int splitter) {
        Map<Integer, Long> sums = new HashMap<>();
        for (int giver : blocks.get(splitter)) {
            List<Entry> line = lines.get(giver);
            for (int i = 0; i < line.size(); i++) {
                sums.merge(line.get(i).row(), residues[begin[giver] + i], field::add);
            }
        }
        Map<Integer, Map<Long, List<Integer>>> parts = new TreeMap<>();
        sums.forEach((member, sum) -> {
            if (sum != 0) {
                parts.computeIfAbsent(blockOf[member], unseen -> new TreeMap<>())
                        .computeIfAbsent(sum, unseen -> new ArrayList<>()).add(member);
            }
        });
        parts.forEach((block, bySum) -> split(block, new ArrayList<>(bySum.values())));
    }

    /** Splits a block into the given parts and what is left of it. */
    private void split(int block, List<List<Integer>> parts) {
        List<Integer> left = new ArrayList<>(blocks.get(block));
        BitSet taken = new BitSet();
        parts.forEach(part -> part.forEach(taken::set));
        left.removeIf(taken::get);
        if (left.isEmpty()) {
            left = parts.remove(parts.size() - 1);
        }
        if (parts.isEmpty()) {
            return;
        }
        blocks.set(block, left);
        int largest = block;
        List<Integer> all = new ArrayList<>(List.of(block));
        for (List<Integer> part : parts) {
            int added = add(part);
            all.add(added);
            largest = part.size() > blocks.get(largest).size() ? added : largest;
        }
        boolean everyOne = waiting.get(block);
        for (int each : all) {
            if (everyOne || each != largest) {
                enqueue(each);
            }
        }
    }
}
