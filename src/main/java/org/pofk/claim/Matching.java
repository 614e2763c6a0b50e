package org.pofk.claim;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.meaning.Quantity;

/**
 * Which of some numbers each stated number means: the nearest pairs first, none twice. A guess: that the numbers of a
 * pair are equal, or as near as they should be, is proved by whoever uses it.
 *
 * @param partners  for each stated number the place of its partner, or −1
 * @param unmatched the places of those that no stated number means
 */
record Matching(List<Integer> partners, List<Integer> unmatched) {
    Matching {
        partners = List.copyOf(partners);
        unmatched = List.copyOf(unmatched);
    }

    private record Pair(int stated, int right, double beyond, double apart, double distance) {
    }

    /** How far what belongs to a stated number, by place, is from what belongs to a right one. */
    interface Apart {
        double between(int stated, int right);
    }

    static Matching of(List<Quantity> stated, List<Quantity> right) {
        List<Pair> pairs = new ArrayList<>();
        for (int i = 0; i < stated.size(); i++) {
            for (int j = 0; j < right.size(); j++) {
                pairs.add(new Pair(i, j, 0, 0, Guesses.distance(stated.get(i), right.get(j))));
            }
        }
        return of(stated.size(), right.size(), pairs);
    }

    /** Those that the digits of a stated number allow are equally near; what belongs to them tells which is meant. */
    static Matching of(List<Quantity> stated, List<Quantity> right, Apart others) {
        List<Pair> pairs = new ArrayList<>();
        for (int i = 0; i < stated.size(); i++) {
            for (int j = 0; j < right.size(); j++) {
                double distance = Guesses.distance(stated.get(i), right.get(j));
                double beyond = Spread.mayBe(stated.get(i), right.get(j)) ? 0 : distance;
                pairs.add(new Pair(i, j, beyond, others.between(i, j), distance));
            }
        }
        return of(stated.size(), right.size(), pairs);
    }

    private static Matching of(int stated, int right, List<Pair> pairs) {
        pairs.sort(Comparator.comparingDouble(Pair::beyond).thenComparingDouble(Pair::apart)
                .thenComparingDouble(Pair::distance));
        Integer[] partners = new Integer[stated];
        Arrays.fill(partners, -1);
        boolean[] taken = new boolean[right];
        for (Pair pair : pairs) {
            if (partners[pair.stated] < 0 && !taken[pair.right]) {
                partners[pair.stated] = pair.right;
                taken[pair.right] = true;
            }
        }
        return new Matching(Arrays.asList(partners),
                IntStream.range(0, right).filter(j -> !taken[j]).boxed().toList());
    }

    /** The place of the number that is nearest to one; there is at least one. */
    static int nearest(Quantity stated, List<Quantity> right) {
        return IntStream.range(0, right.size()).boxed()
                .min(Comparator.comparingDouble(j -> Guesses.distance(stated, right.get(j)))).orElseThrow();
    }
}
