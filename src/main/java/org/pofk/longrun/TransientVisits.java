package org.pofk.longrun;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * How often the states that are left for ever are expected to be visited, counted apart by the step modulo d:
 * w_r = Σ over k ≡ r of x(k) on these states, so w_r = Q w_(r−1), and w_0 = Q w_(d−1) + x(0). Exact; one
 * {@link LinearEquations} with d unknowns a state. It has one solution because the powers of Q tend to zero.
 *
 * @param byResidue w_0 … w_(d−1), one component for each transient state in the order given
 */
record TransientVisits(List<List<Rational>> byResidue) {

    static TransientVisits of(Chain chain, List<Integer> transientStates, int modulus) {
        int count = transientStates.size();
        Map<Integer, Integer> place = StationaryDistribution.placeOf(transientStates);
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        List<Rational> right = new ArrayList<>(Collections.nCopies(count * modulus, Rational.ZERO));
        for (int residue = 0; residue < modulus; residue++) {
            int next = (residue + 1) % modulus;
            for (int t = 0; t < count; t++) {
                columns.add(column(chain.matrix(), transientStates.get(t), place, residue * count, next * count));
            }
        }
        for (int t = 0; t < count; t++) {
            right.set(t, chain.start().get(transientStates.get(t)));
        }
        List<Rational> visits = LinearEquations.solve(new SparseMatrix(columns), right);
        List<List<Rational>> byResidue = new ArrayList<>();
        for (int residue = 0; residue < modulus; residue++) {
            byResidue.add(visits.subList(residue * count, (residue + 1) * count));
        }
        return new TransientVisits(List.copyOf(byResidue));
    }

    private static List<SparseMatrix.Entry> column(SparseMatrix matrix, int state, Map<Integer, Integer> place,
            int own, int next) {
        List<SparseMatrix.Entry> column = new ArrayList<>();
        int diagonal = own + place.get(state);
        Rational onDiagonal = Rational.ONE;
        for (SparseMatrix.Entry entry : matrix.columns().get(state)) {
            Integer target = place.get(entry.row());
            if (target != null && next + target == diagonal) {
                onDiagonal = onDiagonal.minus(entry.value());
            } else if (target != null) {
                column.add(new SparseMatrix.Entry(next + target, entry.value().negate()));
            }
        }
        column.add(new SparseMatrix.Entry(diagonal, onDiagonal));
        return column;
    }
}
