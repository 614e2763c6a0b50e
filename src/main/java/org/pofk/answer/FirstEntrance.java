package org.pofk.answer;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.pofk.chain.Chain;
import org.pofk.chain.Reach;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.longrun.LinearEquations;
import org.pofk.longrun.StationaryDistribution;

/**
 * From each state: the probability of ever entering a set before those to be avoided, and the mean step of doing so
 * given that it happens. h = P h and u = P u + h outside the set (first-step analysis; Kemeny and Snell 1960, chapter
 * III, from memory), solved on the states from which the set can be reached. Exact; two {@link LinearEquations}.
 *
 * @param probabilities one a state, in order
 * @param means         one a state; empty where the set is never entered
 */
public record FirstEntrance(List<Rational> probabilities, List<Optional<Rational>> means) {
    public FirstEntrance {
        probabilities = List.copyOf(probabilities);
        means = List.copyOf(means);
    }

    /** That of a set, before the states of another one. */
    public static FirstEntrance of(Chain chain, Set<Integer> into, Set<Integer> avoiding) {
        List<Integer> open = open(chain.matrix(), into, avoiding);
        Map<Integer, Integer> place = StationaryDistribution.placeOf(open);
        List<Rational> entering = open.stream().map(state -> chain.matrix().columns().get(state).stream()
                .filter(entry -> into.contains(entry.row())).map(SparseMatrix.Entry::value)
                .reduce(Rational.ZERO, Rational::plus)).toList();
        SparseMatrix system = identityMinusTransposed(chain.matrix(), open, place);
        List<Rational> reached = LinearEquations.solve(system, entering);
        List<Rational> steps = LinearEquations.solve(system, reached);
        List<Rational> probabilities = new ArrayList<>();
        List<Optional<Rational>> means = new ArrayList<>();
        for (int state = 0; state < chain.size(); state++) {
            boolean inside = into.contains(state);
            Optional<Integer> at = Optional.ofNullable(place.get(state));
            probabilities.add(inside ? Rational.ONE : at.map(reached::get).orElse(Rational.ZERO));
            means.add(inside ? Optional.of(Rational.ZERO)
                    : at.map(i -> steps.get(i).dividedBy(reached.get(i))));
        }
        return new FirstEntrance(probabilities, means);
    }

    /**
     * The states outside both sets from which the first can be reached without passing the second: from the others it
     * never is, and without them I − Q is invertible.
     */
    public static List<Integer> open(SparseMatrix matrix, Collection<Integer> into, Collection<Integer> avoiding) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int state = 0; state < matrix.size(); state++) {
            columns.add(avoiding.contains(state) || into.contains(state) ? List.of() : matrix.columns().get(state));
        }
        Set<Integer> reaching = new TreeSet<>(Reach.into(new SparseMatrix(columns), into));
        reaching.removeAll(into);
        reaching.removeAll(avoiding);
        return List.copyOf(reaching);
    }

    /** I − Qᵀ on these states: row j says where j moves to. */
    public static SparseMatrix identityMinusTransposed(SparseMatrix matrix, List<Integer> states,
            Map<Integer, Integer> place) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        states.forEach(state -> columns.add(new ArrayList<>()));
        for (int j = 0; j < states.size(); j++) {
            Rational diagonal = Rational.ONE;
            for (SparseMatrix.Entry entry : matrix.columns().get(states.get(j))) {
                Integer target = place.get(entry.row());
                if (target != null && target == j) {
                    diagonal = diagonal.minus(entry.value());
                } else if (target != null) {
                    columns.get(target).add(new SparseMatrix.Entry(j, entry.value().negate()));
                }
            }
            columns.get(j).add(new SparseMatrix.Entry(j, diagonal));
        }
        return new SparseMatrix(columns);
    }
}
