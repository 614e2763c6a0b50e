package org.pofk.chain;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import org.pofk.exact.LeastCommonMultiple;

/**
 * What the graph of a chain says: its communicating classes and what can be reached. For a recursion the same is said
 * of the entries that are not zero. Exact; linear in the number of entries (Tarjan 1972 for the classes, Denardo 1977
 * for the periods).
 *
 * @param classes   in an order in which moves go from earlier to later classes
 * @param unreached states never reached from the start, ascending
 */
public record Structure(List<CommunicatingClass> classes, List<Integer> unreached) {

    /**
     * States that reach one another.
     *
     * @param states        ascending
     * @param closed        no move leads out of it
     * @param cyclicClasses the states by where they stand in the period: every move inside the class goes from set j
     *                      to set j + 1 modulo the period. Set 0 holds the first state of the start that lies in the
     *                      class, or else its first state; so a start inside set 0 is in set j at every k ≡ j.
     *                      One set for an aperiodic class, none for a single state without a move to itself
     * @param reached       the start reaches it
     */
    public record CommunicatingClass(List<Integer> states, boolean closed, List<List<Integer>> cyclicClasses,
            boolean reached) {
        public CommunicatingClass {
            states = List.copyOf(states);
            cyclicClasses = cyclicClasses.stream().map(List::copyOf).toList();
        }

        /** Greatest common divisor of the lengths of its cycles; 0 for a single state without a move to itself. */
        public int period() {
            return cyclicClasses.size();
        }

        /** A closed class of one state. */
        public boolean isAbsorbing() {
            return closed && states.size() == 1;
        }
    }

    public Structure {
        classes = List.copyOf(classes);
        unreached = List.copyOf(unreached);
    }

    public static Structure of(Chain chain) {
        MoveGraph graph = MoveGraph.of(chain.matrix());
        BitSet start = support(chain);
        BitSet reached = graph.reachedFrom(start);
        CyclicClasses cyclic = new CyclicClasses(graph);
        List<List<Integer>> components = StrongComponents.of(graph);
        int[] component = placeOfState(components, chain.size());
        List<CommunicatingClass> classes = new ArrayList<>();
        for (List<Integer> states : components) {
            int first = states.stream().filter(start::get).findFirst().orElse(states.get(0));
            classes.add(new CommunicatingClass(states, isClosed(graph, states, component), cyclic.of(states, first),
                    reached.get(first)));
        }
        reached.flip(0, chain.size());
        return new Structure(classes, reached.stream().boxed().toList());
    }

    /** The least common multiple of the periods of the closed classes that are reached; one where there are none. */
    public BigInteger period() {
        return closedClasses().stream().filter(CommunicatingClass::reached)
                .map(each -> BigInteger.valueOf(each.period())).reduce(BigInteger.ONE, LeastCommonMultiple::of);
    }

    /** The classes nothing leads out of, in their order. */
    public List<CommunicatingClass> closedClasses() {
        return classes.stream().filter(CommunicatingClass::closed).toList();
    }

    /** The classes something leads out of, in their order. */
    public List<CommunicatingClass> transientClasses() {
        return classes.stream().filter(each -> !each.closed).toList();
    }

    /** The states nothing leads out of, ascending. */
    public List<Integer> absorbing() {
        return classes.stream().filter(CommunicatingClass::isAbsorbing).map(each -> each.states.get(0)).sorted()
                .toList();
    }

    /** The place in {@link #classes} of the class each state lies in, by state. */
    public List<Integer> classOfState() {
        List<List<Integer>> sets = classes.stream().map(CommunicatingClass::states).toList();
        return Arrays.stream(placeOfState(sets, sets.stream().mapToInt(List::size).sum())).boxed().toList();
    }

    /** The states of the start: where x(0) is not zero. */
    private static BitSet support(Chain chain) {
        BitSet support = new BitSet(chain.size());
        for (int i = 0; i < chain.size(); i++) {
            support.set(i, !chain.start().get(i).isZero());
        }
        return support;
    }

    private static int[] placeOfState(List<List<Integer>> sets, int size) {
        int[] place = new int[size];
        for (int i = 0; i < sets.size(); i++) {
            for (int state : sets.get(i)) {
                place[state] = i;
            }
        }
        return place;
    }

    private static boolean isClosed(MoveGraph graph, List<Integer> states, int[] component) {
        for (int state : states) {
            for (int place = 0; place < graph.degree(state); place++) {
                if (component[graph.successor(state, place)] != component[state]) {
                    return false;
                }
            }
        }
        return true;
    }
}
