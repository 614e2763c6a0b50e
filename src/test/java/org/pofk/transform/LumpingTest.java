package org.pofk.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;
import org.pofk.transform.Lumping.Kind;
import org.pofk.transform.RandomSystems.Shape;

class LumpingTest {

    @Test
    void everyLumpingKeepsItsPrintedIdentity() {
        RandomSystems systems = new RandomSystems(61);
        Map<Kind, Integer> seen = new EnumMap<>(Kind.class);
        for (int i = 0; i < 3000; i++) {
            Chain chain = systems.next(Shape.values()[i % Shape.values().length]);
            for (Lumping lumping : Reduction.of(chain, chain.outputs()).lumpings()) {
                assertIdentity(lumping);
                seen.merge(lumping.kind(), 1, Integer::sum);
            }
        }
        assertEquals(Map.of(Kind.EXACT, 0, Kind.ORDINARY, 0).keySet(), seen.keySet());
        assertTrue(seen.values().stream().allMatch(count -> count > 100), seen::toString);
    }

    // Eight alike switches, each step one of them chosen and flipped (an Ehrenfest chain): 256 states by which switches
    // are on, 9 by how many. p(k) of "all on" from "all off" is Σ_j C(8, j) (−1)^j (1 − 2j/8)^k / 2^8
    // (Kac 1947, Random walk and the theory of Brownian motion, section on the Ehrenfest model; from memory).
    @Test
    void hypercubeOfEightSwitchesIsNineStatesAndFollowsTheBinomialForm() {
        Chain chain = hypercube(8);
        Reduction reduction = Reduction.of(chain, chain.outputs());
        assertEquals(256, reduction.kept().size());
        assertEquals(9, reduction.reduced().size());
        assertEquals(Kind.EXACT, reduction.lumpings().get(0).kind());
        assertIdentity(reduction.lumpings().get(0));
        Transform transform = Transforms.of(chain, chain.outputs()).get(0);
        assertEquals(9, transform.recurrence().degree());
        List<Rational> terms = DirectSolution.terms(chain, chain.outputs().get(0), 21);
        for (int k = 0; k < 21; k++) {
            Rational value = Rational.ZERO;
            BigInteger binomial = BigInteger.ONE;
            for (int j = 0; j <= 8; j++) {
                Rational term = Rational.of(8 - 2L * j, 8).pow(k).times(Rational.of(binomial));
                value = j % 2 == 0 ? value.plus(term) : value.minus(term);
                binomial = binomial.multiply(BigInteger.valueOf(8 - j)).divide(BigInteger.valueOf(j + 1));
            }
            assertEquals(value.dividedBy(Rational.of(256)), terms.get(k));
        }
    }

    @Test
    void readingHowManyAreOnLumpsWhateverTheStart() {
        Chain cube = hypercube(4);
        List<Rational> start = new ArrayList<>(Collections.nCopies(16, Rational.ZERO));
        start.set(1, Rational.of(1, 3));
        start.set(6, Rational.of(2, 3));
        List<Rational> on = new ArrayList<>();
        for (int state = 0; state < 16; state++) {
            on.add(Rational.of(Integer.bitCount(state)));
        }
        Output output = new Output("on", on, Rational.ZERO, "on");
        Chain chain = new Chain(Chain.Kind.CHAIN, cube.states(), cube.matrix(), start, Map.of(), List.of(output));
        Reduction reduction = Reduction.of(chain, List.of(output));
        assertEquals(5, reduction.reduced().size());
        assertEquals(Kind.ORDINARY, reduction.lumpings().get(0).kind());
        reduction.lumpings().forEach(LumpingTest::assertIdentity);
    }

    @Test
    void chainWithoutSymmetryIsLeftAlone() {
        Chain chain = RandomSystems.sparseChain(3, 40, 6);
        assertTrue(Reduction.of(chain, chain.outputs()).lumpings().isEmpty());
    }

    private static Chain hypercube(int switches) {
        int size = 1 << switches;
        List<List<Entry>> columns = new ArrayList<>();
        List<String> names = new ArrayList<>();
        for (int state = 0; state < size; state++) {
            List<Entry> column = new ArrayList<>();
            for (int one = 0; one < switches; one++) {
                column.add(new Entry(state ^ (1 << one), Rational.of(1, switches)));
            }
            columns.add(column);
            names.add(Integer.toBinaryString(state));
        }
        List<Rational> start = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        start.set(0, Rational.ONE);
        List<Rational> last = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        last.set(size - 1, Rational.ONE);
        return new Chain(Chain.Kind.CHAIN, names, new SparseMatrix(columns), start, Map.of(),
                List.of(new Output("all on", last, Rational.ZERO, "all on")));
    }

    /** A U = U Ã, x0 = U x̃0, c̃ = c U; or V A = Ã V, c = c̃ V, x̃0 = V x0. */
    private static void assertIdentity(Lumping lumping) {
        List<List<Rational>> matrix = dense(lumping.before().matrix());
        List<List<Rational>> lumped = dense(lumping.after().matrix());
        List<List<Rational>> start = lumping.before().start().stream().map(List::of).toList();
        List<List<Rational>> lumpedStart = lumping.after().start().stream().map(List::of).toList();
        if (lumping.kind() == Kind.EXACT) {
            List<List<Rational>> spread = transposed(indicators(lumping, true));
            assertEquals(product(matrix, spread), product(spread, lumped));
            assertEquals(start, product(spread, lumpedStart));
            assertEquals(lumping.after().readings(), product(lumping.before().readings(), spread));
        } else {
            List<List<Rational>> sum = indicators(lumping, false);
            assertEquals(product(sum, matrix), product(lumped, sum));
            assertEquals(lumpedStart, product(sum, start));
            assertEquals(lumping.before().readings(), product(lumping.after().readings(), sum));
        }
    }

    private static List<List<Rational>> indicators(Lumping lumping, boolean even) {
        List<List<Rational>> rows = new ArrayList<>();
        for (List<Integer> block : lumping.blocks()) {
            List<Rational> row = new ArrayList<>(Collections.nCopies(lumping.before().size(), Rational.ZERO));
            block.forEach(member -> row.set(member, even ? Rational.of(1, block.size()) : Rational.ONE));
            rows.add(row);
        }
        return rows;
    }

    private static List<List<Rational>> dense(SparseMatrix matrix) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < matrix.size(); i++) {
            List<Rational> row = new ArrayList<>();
            for (int j = 0; j < matrix.size(); j++) {
                row.add(matrix.at(i, j));
            }
            rows.add(row);
        }
        return rows;
    }

    private static List<List<Rational>> transposed(List<List<Rational>> rows) {
        List<List<Rational>> columns = new ArrayList<>();
        for (int j = 0; j < rows.get(0).size(); j++) {
            int place = j;
            columns.add(rows.stream().map(row -> row.get(place)).toList());
        }
        return columns;
    }

    private static List<List<Rational>> product(List<List<Rational>> a, List<List<Rational>> b) {
        List<List<Rational>> columns = transposed(b);
        List<List<Rational>> product = new ArrayList<>();
        for (List<Rational> row : a) {
            List<Rational> result = new ArrayList<>();
            for (List<Rational> column : columns) {
                Rational sum = Rational.ZERO;
                for (int i = 0; i < row.size(); i++) {
                    if (!row.get(i).isZero() && !column.get(i).isZero()) {
                        sum = sum.plus(row.get(i).times(column.get(i)));
                    }
                }
                result.add(sum);
            }
            product.add(result);
        }
        return product;
    }
}
