package org.pofk.chain;

import java.util.BitSet;
import java.util.Collection;
import java.util.List;

/** What can be reached along moves that are not zero. Exact; linear in the number of entries. */
public final class Reach {
    private Reach() {
    }

    /** The given states and all that can be reached from them, ascending. */
    public static List<Integer> from(SparseMatrix matrix, Collection<Integer> states) {
        return reached(MoveGraph.of(matrix), states);
    }

    /** The given states and all from which one of them can be reached, ascending. */
    public static List<Integer> into(SparseMatrix matrix, Collection<Integer> states) {
        return reached(MoveGraph.of(matrix).reversed(), states);
    }

    private static List<Integer> reached(MoveGraph graph, Collection<Integer> states) {
        BitSet first = new BitSet(graph.size());
        states.forEach(first::set);
        return graph.reachedFrom(first).stream().boxed().toList();
    }
}
