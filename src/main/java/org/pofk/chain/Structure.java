package org.pofk.chain;

import java.util.List;

/**
 * What the graph of a chain says: its communicating classes and what can be reached. Exact; linear in the number of
 * entries (Tarjan 1972 for the classes, Denardo 1977 for the periods).
 *
 * @param classes   in an order in which moves go from earlier to later classes
 * @param unreached states never reached from the start, ascending
 */
public record Structure(List<CommunicatingClass> classes, List<Integer> unreached) {

    /**
     * States that reach one another.
     *
     * @param states ascending
     * @param closed no move leads out of it
     * @param period greatest common divisor of the lengths of its cycles; 0 for a single state without a move to itself
     * @param reached the start reaches it
     */
    public record CommunicatingClass(List<Integer> states, boolean closed, int period, boolean reached) {
        /** A closed class of one state. */
        public boolean isAbsorbing() {
            return closed && states.size() == 1;
        }
    }

    public static Structure of(Chain chain) {
        throw new UnsupportedOperationException();
    }
}
