package org.pofk.chain;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;

/**
 * The sets of states that reach one another, in an order in which edges go from earlier to later sets; where the
 * edges leave a choice, the set with the smaller states tends to come first. Tarjan 1972 (SIAM J. Comput. 1,
 * section 4; from memory), with a stack of its own instead of recursion, so that 100,000 states in a row are no
 * trouble. Linear in the number of edges.
 */
final class StrongComponents {
    private static final int UNSEEN = -1;

    private final MoveGraph graph;
    private final int[] number;
    private final int[] lowest;
    private final int[] nextPlace;
    private final int[] path;
    private final int[] open;
    private final boolean[] isOpen;
    private final List<List<Integer>> found = new ArrayList<>();
    private int pathLength;
    private int openCount;
    private int numbered;

    private StrongComponents(MoveGraph graph) {
        this.graph = graph;
        number = new int[graph.size()];
        Arrays.fill(number, UNSEEN);
        lowest = new int[graph.size()];
        nextPlace = new int[graph.size()];
        path = new int[graph.size()];
        open = new int[graph.size()];
        isOpen = new boolean[graph.size()];
    }

    static List<List<Integer>> of(MoveGraph graph) {
        StrongComponents search = new StrongComponents(graph);
        // the last root is finished last, and the last set finished comes first
        for (int root = graph.size() - 1; root >= 0; root--) {
            if (search.number[root] == UNSEEN) {
                search.explore(root);
            }
        }
        Collections.reverse(search.found);
        return List.copyOf(search.found);
    }

    private void explore(int root) {
        enter(root);
        while (pathLength > 0) {
            int state = path[pathLength - 1];
            if (nextPlace[state] > 0) {
                follow(state, graph.successor(state, --nextPlace[state]));
            } else {
                leave(state);
            }
        }
    }

    private void enter(int state) {
        number[state] = numbered;
        lowest[state] = numbered++;
        nextPlace[state] = graph.degree(state);
        path[pathLength++] = state;
        open[openCount++] = state;
        isOpen[state] = true;
    }

    private void follow(int state, int target) {
        if (number[target] == UNSEEN) {
            enter(target);
        } else if (isOpen[target]) {
            lowest[state] = Math.min(lowest[state], number[target]);
        }
    }

    private void leave(int state) {
        pathLength--;
        if (pathLength > 0) {
            int parent = path[pathLength - 1];
            lowest[parent] = Math.min(lowest[parent], lowest[state]);
        }
        if (lowest[state] == number[state]) {
            close(state);
        }
    }

    /** All states opened since {@code root} reach one another. */
    private void close(int root) {
        List<Integer> states = new ArrayList<>();
        int state;
        do {
            state = open[--openCount];
            isOpen[state] = false;
            states.add(state);
        } while (state != root);
        Collections.sort(states);
        found.add(List.copyOf(states));
    }
}
