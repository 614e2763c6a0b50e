package org.pofk.chain;

import java.util.BitSet;
import java.util.List;

/**
 * The graph of a matrix: an edge from j to i where a move from j to i is not zero. Exact; linear in the number of
 * entries. Lives for one computation, so it holds plain arrays and is not handed out.
 */
final class MoveGraph {
    private final int[][] successors;

    private MoveGraph(int[][] successors) {
        this.successors = successors;
    }

    static MoveGraph of(SparseMatrix matrix) {
        int[][] successors = new int[matrix.size()][];
        for (int j = 0; j < successors.length; j++) {
            List<SparseMatrix.Entry> column = matrix.columns().get(j);
            successors[j] = new int[column.size()];
            for (int i = 0; i < successors[j].length; i++) {
                successors[j][i] = column.get(i).row();
            }
        }
        return new MoveGraph(successors);
    }

    /** Every edge turned round; the successors of each state ascend. */
    MoveGraph reversed() {
        int[] counts = new int[size()];
        for (int[] targets : successors) {
            for (int target : targets) {
                counts[target]++;
            }
        }
        int[][] predecessors = new int[size()][];
        for (int i = 0; i < size(); i++) {
            predecessors[i] = new int[counts[i]];
        }
        int[] filled = new int[size()];
        for (int from = 0; from < size(); from++) {
            for (int target : successors[from]) {
                predecessors[target][filled[target]++] = from;
            }
        }
        return new MoveGraph(predecessors);
    }

    int size() {
        return successors.length;
    }

    int degree(int state) {
        return successors[state].length;
    }

    int successor(int state, int place) {
        return successors[state][place];
    }

    /** The given states and all that can be reached from them. */
    BitSet reachedFrom(BitSet states) {
        BitSet reached = (BitSet) states.clone();
        int[] waiting = new int[size()];
        int count = 0;
        for (int state = states.nextSetBit(0); state >= 0; state = states.nextSetBit(state + 1)) {
            waiting[count++] = state;
        }
        while (count > 0) {
            for (int target : successors[waiting[--count]]) {
                if (!reached.get(target)) {
                    reached.set(target);
                    waiting[count++] = target;
                }
            }
        }
        return reached;
    }
}
