package org.pofk.chain;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A communicating class split by its period d: every move inside the class goes from set j to set j + 1 modulo d.
 * d is the greatest common divisor of level(u) + 1 − level(v) over all moves u → v inside the class, the levels taken
 * breadth first (Denardo 1977, Management Science 24, "Periods of connected networks"; from memory). Linear.
 */
final class CyclicClasses {
    private static final int OUTSIDE = -2;
    private static final int UNSEEN = -1;

    private final MoveGraph graph;
    private final int[] level;

    /** For a graph; one instance serves all its classes, which touch no common state. */
    CyclicClasses(MoveGraph graph) {
        this.graph = graph;
        level = new int[graph.size()];
        Arrays.fill(level, OUTSIDE);
    }

    /**
     * The sets of a class, set 0 the one that holds {@code first}; none for a single state without a move to itself.
     *
     * @param states the class, ascending
     */
    List<List<Integer>> of(List<Integer> states, int first) {
        states.forEach(state -> level[state] = UNSEEN);
        int period = periodByLevels(states.size(), first);
        List<List<Integer>> sets = new ArrayList<>();
        for (int j = 0; j < period; j++) {
            sets.add(new ArrayList<>());
        }
        for (int state : states) {
            if (period > 0) {
                sets.get(level[state] % period).add(state);
            }
            level[state] = OUTSIDE;
        }
        return sets.stream().map(List::copyOf).toList();
    }

    private int periodByLevels(int size, int first) {
        int[] queue = new int[size];
        int filled = 0;
        level[first] = 0;
        queue[filled++] = first;
        int period = 0;
        for (int next = 0; next < filled; next++) {
            int state = queue[next];
            for (int place = 0; place < graph.degree(state); place++) {
                int target = graph.successor(state, place);
                if (level[target] == UNSEEN) {
                    level[target] = level[state] + 1;
                    queue[filled++] = target;
                } else if (level[target] != OUTSIDE) {
                    period = greatestCommonDivisor(period, Math.abs(level[state] + 1 - level[target]));
                }
            }
        }
        return period;
    }

    private static int greatestCommonDivisor(int a, int b) {
        return b == 0 ? a : greatestCommonDivisor(b, a % b);
    }
}
