package org.pofk.chain;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.stream.IntStream;
import org.jgrapht.Graph;
import org.jgrapht.alg.connectivity.KosarajuStrongConnectivityInspector;
import org.jgrapht.graph.DefaultDirectedGraph;
import org.jgrapht.graph.DefaultEdge;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Rational;

class StructureTest {

    @Test
    void aRingHasItsLengthAsPeriodAndCyclicClassesInOrderFromTheStart() {
        Structure structure = Structure.of(chain(3, new int[][] {{1}, {2}, {0}}, 1));
        CommunicatingClass only = structure.classes().get(0);
        assertEquals(3, only.period());
        assertEquals(List.of(List.of(1), List.of(2), List.of(0)), only.cyclicClasses());
        assertTrue(only.closed() && only.reached() && !only.isAbsorbing());
    }

    @Test
    void aWalkBetweenReflectingEndsHasPeriodTwo() {
        // Grinstead and Snell, Introduction to Probability, 1997, section 11.3 (walks that alternate; from memory)
        Structure structure = Structure.of(chain(5, new int[][] {{1}, {0, 2}, {1, 3}, {2, 4}, {3}}, 0));
        assertEquals(List.of(List.of(0, 2, 4), List.of(1, 3)), structure.classes().get(0).cyclicClasses());
    }

    @Test
    void aWalkBetweenAbsorbingEndsHasThreeClasses() {
        // Grinstead and Snell, Introduction to Probability, 1997, example 11.13
        Structure structure = Structure.of(chain(5, new int[][] {{0}, {0, 2}, {1, 3}, {2, 4}, {4}}, 2));
        assertEquals(List.of(0, 4), structure.absorbing());
        assertEquals(List.of(List.of(1, 2, 3)),
                structure.transientClasses().stream().map(CommunicatingClass::states).toList());
        assertEquals(List.of(), structure.unreached());
    }

    @Test
    void aStateLeftForEverHasPeriodZeroAndWhatLiesBeforeTheStartIsUnreached() {
        Structure structure = Structure.of(chain(3, new int[][] {{1}, {2}, {2}}, 1));
        assertEquals(List.of(0), structure.unreached());
        assertEquals(List.of(0, 0, 1), structure.classes().stream().map(CommunicatingClass::period).toList());
        assertEquals(List.of(false, true, true),
                structure.classes().stream().map(CommunicatingClass::reached).toList());
        assertEquals(List.of(0, 1, 2), structure.classOfState());
    }

    @Test
    void aHundredThousandStatesInARowAreNoTrouble() {
        int size = 100_000;
        int[][] row = new int[size][];
        int[][] ring = new int[size][];
        for (int i = 0; i < size; i++) {
            row[i] = new int[] {Math.min(i + 1, size - 1)};
            ring[i] = new int[] {(i + 1) % size};
        }
        assertEquals(size, Structure.of(chain(size, row, 0)).classes().size());
        assertEquals(size, Structure.of(chain(size, ring, 7)).classes().get(0).period());
    }

    @Test
    void classesPeriodsAndReachAgreeWithOtherWaysOnRandomGraphs() {
        Random random = new Random(20);
        int compared = 0;
        int periodic = 0;
        for (int round = 0; round < 1_000; round++) {
            int size = 1 + random.nextInt(9);
            int[][] moves = new int[size][];
            for (int i = 0; i < size; i++) {
                moves[i] = random.ints(1 + random.nextInt(2), 0, size).distinct().toArray();
            }
            Chain chain = chain(size, moves, random.nextInt(size));
            Structure structure = Structure.of(chain);
            assertEquals(kosaraju(moves), statesOf(structure), () -> "seed 20, moves " + List.of(moves));
            assertMovesGoForward(structure, moves);
            for (CommunicatingClass each : structure.classes()) {
                assertEquals(periodByPowers(moves, each.states().get(0)), each.period());
                assertMovesFollowThePeriod(each, moves);
                periodic += each.period() > 1 ? 1 : 0;
            }
            compared++;
        }
        assertEquals(1_000, compared);
        assertTrue(periodic > 100, () -> "too few periodic classes to mean anything");
    }

    private static Set<Set<Integer>> statesOf(Structure structure) {
        Set<Set<Integer>> sets = new HashSet<>();
        structure.classes().forEach(each -> sets.add(Set.copyOf(each.states())));
        return sets;
    }

    private static Set<Set<Integer>> kosaraju(int[][] moves) {
        Graph<Integer, DefaultEdge> graph = new DefaultDirectedGraph<>(DefaultEdge.class);
        IntStream.range(0, moves.length).forEach(graph::addVertex);
        for (int from = 0; from < moves.length; from++) {
            for (int to : moves[from]) {
                graph.addEdge(from, to);
            }
        }
        return Set.copyOf(new KosarajuStrongConnectivityInspector<>(graph).stronglyConnectedSets());
    }

    private static void assertMovesGoForward(Structure structure, int[][] moves) {
        List<Integer> place = structure.classOfState();
        for (int from = 0; from < moves.length; from++) {
            for (int to : moves[from]) {
                assertTrue(place.get(from) <= place.get(to));
                assertTrue(place.get(from).equals(place.get(to)) || !structure.classes().get(place.get(from)).closed());
            }
        }
    }

    private static void assertMovesFollowThePeriod(CommunicatingClass each, int[][] moves) {
        for (int j = 0; j < each.period(); j++) {
            List<Integer> next = each.cyclicClasses().get((j + 1) % each.period());
            for (int from : each.cyclicClasses().get(j)) {
                for (int to : moves[from]) {
                    assertTrue(next.contains(to) || !each.states().contains(to));
                }
            }
        }
    }

    /** The greatest common divisor of all lengths up to 2 n² of closed walks through a state. */
    private static int periodByPowers(int[][] moves, int state) {
        Set<Integer> here = Set.of(state);
        BigInteger divisor = BigInteger.ZERO;
        for (int length = 1; length <= 2 * moves.length * moves.length; length++) {
            Set<Integer> next = new HashSet<>();
            for (int from : here) {
                for (int to : moves[from]) {
                    next.add(to);
                }
            }
            here = next;
            divisor = here.contains(state) ? divisor.gcd(BigInteger.valueOf(length)) : divisor;
        }
        return divisor.intValue();
    }

    /** Equal chances of the moves listed for each state. */
    private static Chain chain(int size, int[][] moves, int start) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int[] targets : moves) {
            List<SparseMatrix.Entry> column = new ArrayList<>();
            for (int target : targets) {
                column.add(new SparseMatrix.Entry(target, Rational.of(1, targets.length)));
            }
            columns.add(column);
        }
        List<Rational> first = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        first.set(start, Rational.ONE);
        List<String> names = IntStream.range(0, size).mapToObj(Integer::toString).toList();
        return new Chain(Chain.Kind.CHAIN, names, new SparseMatrix(columns), first, Map.of(), List.of());
    }
}
