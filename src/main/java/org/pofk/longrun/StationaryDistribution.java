package org.pofk.longrun;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * The only vector of a closed class with A v = v and components that sum to one: the null space of A − I, found by
 * setting the first component to one and solving for the others. Exact; one {@link LinearEquations}.
 */
public final class StationaryDistribution {
    private StationaryDistribution() {
    }

    /** One component for each state of the class, in its order. */
    public static List<Rational> of(SparseMatrix matrix, List<Integer> closedClass) {
        List<Integer> others = closedClass.subList(1, closedClass.size());
        Map<Integer, Integer> place = placeOf(others);
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int state : others) {
            columns.add(identityMinus(matrix, state, place));
        }
        List<Rational> right = new ArrayList<>(Collections.nCopies(others.size(), Rational.ZERO));
        for (SparseMatrix.Entry entry : matrix.columns().get(closedClass.get(0))) {
            if (place.containsKey(entry.row())) {
                right.set(place.get(entry.row()), entry.value());
            }
        }
        List<Rational> vector = new ArrayList<>(List.of(Rational.ONE));
        vector.addAll(LinearEquations.solve(new SparseMatrix(columns), right));
        Rational total = vector.stream().reduce(Rational.ZERO, Rational::plus);
        return vector.stream().map(value -> value.dividedBy(total)).toList();
    }

    public static Map<Integer, Integer> placeOf(List<Integer> states) {
        Map<Integer, Integer> place = new HashMap<>();
        for (int i = 0; i < states.size(); i++) {
            place.put(states.get(i), i);
        }
        return place;
    }

    /** The column of I − A that belongs to a state, its rows those of the placed states. */
    private static List<SparseMatrix.Entry> identityMinus(SparseMatrix matrix, int state, Map<Integer, Integer> place) {
        List<SparseMatrix.Entry> column = new ArrayList<>();
        Rational diagonal = Rational.ONE;
        for (SparseMatrix.Entry entry : matrix.columns().get(state)) {
            if (entry.row() == state) {
                diagonal = diagonal.minus(entry.value());
            } else if (place.containsKey(entry.row())) {
                column.add(new SparseMatrix.Entry(place.get(entry.row()), entry.value().negate()));
            }
        }
        column.add(new SparseMatrix.Entry(place.get(state), diagonal));
        return column;
    }
}
