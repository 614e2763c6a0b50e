package org.pofk.modes;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Factoring;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.RecurrenceProof;
import org.pofk.transform.TransferFunction;
import org.pofk.transform.Transform;

/** Chains, recursions and transforms for the tests. */
final class Samples {
    private Samples() {
    }

    static Polynomial<Rational> polynomial(String ascending) {
        return RandomTransform.parse(ascending);
    }

    /** The closed form of a transform given by its coefficients, ascending. */
    static ClosedForm closedForm(String numerator, String denominator) {
        TransferFunction<Rational> y = new TransferFunction<>(polynomial(numerator), polynomial(denominator));
        return closedForm(y, Factoring.of(y.denominator()));
    }

    static ClosedForm closedForm(TransferFunction<Rational> y, Factorization<Rational> factors) {
        return ClosedForm.of(new Transform(new Output("y", List.of(), Rational.ZERO, "y"), y.denominator(), y, factors,
                new RecurrenceProof(RecurrenceProof.Method.WINDOWS, y.denominator().degree(),
                        2 * y.denominator().degree(), 0, 0)));
    }

    static Chain chain(Chain.Kind kind, List<List<Rational>> rows, List<Rational> start) {
        List<String> names = new ArrayList<>();
        for (int i = 0; i < start.size(); i++) {
            names.add("s" + i);
        }
        return new Chain(kind, names, SparseMatrix.ofRows(rows), start, Map.of(), List.of());
    }

    /** n states; every column sums to one, entries are multiples of 1/6, about half of them zero. */
    static Chain randomChain(Random random, int n) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            rows.add(new ArrayList<>());
        }
        for (int j = 0; j < n; j++) {
            int[] sixths = new int[n];
            for (int part = 0; part < 6; part++) {
                sixths[random.nextInt(4) == 0 ? random.nextInt(n) : (j + part / 3) % n]++;
            }
            for (int i = 0; i < n; i++) {
                rows.get(i).add(Rational.of(sixths[i], 6));
            }
        }
        return chain(Chain.Kind.CHAIN, rows, unit(n, random.nextInt(n)));
    }

    /** A recursion with blocks that give repeated complex pairs, repeated real poles and nilpotent parts. */
    static Chain randomRecursion(Random random) {
        List<List<List<Rational>>> blocks = new ArrayList<>();
        Rational a = Rational.of(1 + random.nextInt(3), 4);
        Rational b = Rational.of(1 + random.nextInt(2), 4);
        if (random.nextBoolean()) {
            blocks.add(pair(a, b, 1 + random.nextInt(2)));
        }
        if (random.nextBoolean()) {
            blocks.add(jordan(Rational.of(random.nextInt(5) - 2L, 3), 1 + random.nextInt(3)));
        }
        blocks.add(jordan(Rational.ZERO, 1 + random.nextInt(3)));
        int n = blocks.stream().mapToInt(List::size).sum();
        List<List<Rational>> rows = new ArrayList<>();
        int before = 0;
        for (List<List<Rational>> block : blocks) {
            for (List<Rational> row : block) {
                List<Rational> whole = new ArrayList<>(Collections.nCopies(n, Rational.ZERO));
                for (int j = 0; j < row.size(); j++) {
                    whole.set(before + j, row.get(j));
                }
                rows.add(whole);
            }
            before += block.size();
        }
        List<Rational> start = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            start.add(Rational.of(random.nextInt(7) - 3L, 2));
        }
        return chain(Chain.Kind.RECURSION, rows, start);
    }

    /** λ on the diagonal, 1 above it. */
    private static List<List<Rational>> jordan(Rational lambda, int size) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            List<Rational> row = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
            row.set(i, lambda);
            if (i + 1 < size) {
                row.set(i + 1, Rational.ONE);
            }
            rows.add(row);
        }
        return rows;
    }

    /** The real Jordan block of a ± ib. */
    private static List<List<Rational>> pair(Rational a, Rational b, int multiplicity) {
        int n = 2 * multiplicity;
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            List<Rational> row = new ArrayList<>(Collections.nCopies(n, Rational.ZERO));
            row.set(i, a);
            row.set(i % 2 == 0 ? i + 1 : i - 1, i % 2 == 0 ? b.negate() : b);
            if (i + 2 < n) {
                row.set(i + 2, Rational.ONE);
            }
            rows.add(row);
        }
        return rows;
    }

    static List<Rational> unit(int n, int place) {
        List<Rational> vector = new ArrayList<>(Collections.nCopies(n, Rational.ZERO));
        vector.set(place, Rational.ONE);
        return vector;
    }

    /** One output for each state. */
    static List<Output> states(Chain chain) {
        List<Output> outputs = new ArrayList<>();
        for (int i = 0; i < chain.size(); i++) {
            String name = chain.states().get(i);
            outputs.add(new Output(name, unit(chain.size(), i), Rational.ZERO, name));
        }
        return outputs;
    }
}
