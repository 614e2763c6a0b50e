package org.pofk.transform;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/**
 * x(k+1) = A x(k) from x(0) = start, and what is read off it: y(k) = c x(k) for each reading c. Exact.
 *
 * @param matrix   A, n × n
 * @param start    x(0), n components
 * @param readings one c of n components for each output, in their order
 */
public record LinearSystem(SparseMatrix matrix, List<Rational> start, List<List<Rational>> readings) {
    public LinearSystem {
        start = List.copyOf(start);
        readings = readings.stream().map(List::copyOf).toList();
    }

    /** The chain with its outputs; when one has a constant, a last state that stays one for ever carries it. */
    public static LinearSystem of(Chain chain, List<Output> outputs) {
        if (outputs.stream().allMatch(output -> output.constant().isZero())) {
            return new LinearSystem(chain.matrix(), chain.start(),
                    outputs.stream().map(Output::coefficients).toList());
        }
        List<List<Entry>> columns = new ArrayList<>(chain.matrix().columns());
        columns.add(List.of(new Entry(chain.size(), Rational.ONE)));
        return new LinearSystem(new SparseMatrix(columns), followedBy(chain.start(), Rational.ONE),
                outputs.stream().map(output -> followedBy(output.coefficients(), output.constant())).toList());
    }

    private static List<Rational> followedBy(List<Rational> vector, Rational last) {
        List<Rational> longer = new ArrayList<>(vector);
        longer.add(last);
        return longer;
    }

    /** n. */
    public int size() {
        return start.size();
    }

    /** The system on some of its states, given ascending; moves from or into others are left out. */
    LinearSystem restrictedTo(List<Integer> kept) {
        List<Integer> place = new ArrayList<>(Collections.nCopies(size(), -1));
        for (int i = 0; i < kept.size(); i++) {
            place.set(kept.get(i), i);
        }
        List<List<Entry>> columns = new ArrayList<>();
        for (int state : kept) {
            columns.add(matrix.columns().get(state).stream().filter(entry -> place.get(entry.row()) >= 0)
                    .map(entry -> new Entry(place.get(entry.row()), entry.value())).toList());
        }
        return new LinearSystem(new SparseMatrix(columns), chosen(start, kept),
                readings.stream().map(reading -> chosen(reading, kept)).toList());
    }

    private static List<Rational> chosen(List<Rational> vector, List<Integer> places) {
        return places.stream().map(vector::get).toList();
    }
}
