package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.exact.Rational;

/**
 * States that are left hardly ever: nothing leads out of them but moves below {@link #HARDLY}. Where a chain has more
 * of these than closed classes, it seems settled long before it is (Simon and Ando 1961; Courtois 1977; from memory).
 * Exact.
 *
 * @param states          ascending
 * @param leavingAtMost   the largest chance, over its states, of leaving them in one step
 */
public record NearlyClosed(List<Integer> states, Rational leavingAtMost) {
    /** Moves less likely than this are left out of account. */
    public static final Rational HARDLY = Rational.of(1, 10_000);

    public NearlyClosed {
        states = List.copyOf(states);
    }

    /** None when leaving out unlikely moves makes no further class closed that the start reaches. */
    static List<NearlyClosed> of(Chain chain, Structure structure) {
        List<List<SparseMatrix.Entry>> likely = chain.matrix().columns().stream()
                .map(column -> column.stream().filter(entry -> entry.value().compareTo(HARDLY) >= 0).toList()).toList();
        Structure strong = Structure.of(new Chain(chain.kind(), chain.states(), new SparseMatrix(likely),
                chain.start(), chain.sets(), List.of()));
        List<NearlyClosed> found = new ArrayList<>();
        if (strong.closedClasses().size() > structure.closedClasses().size()) {
            List<Integer> place = structure.classOfState();
            for (Structure.CommunicatingClass each : strong.closedClasses()) {
                Structure.CommunicatingClass whole = structure.classes().get(place.get(each.states().get(0)));
                Rational leaving = leavingAtMost(chain.matrix(), each.states());
                if (whole.reached() && leaving.signum() > 0) {
                    found.add(new NearlyClosed(each.states(), leaving));
                }
            }
        }
        return List.copyOf(found);
    }

    private static Rational leavingAtMost(SparseMatrix matrix, List<Integer> states) {
        Rational most = Rational.ZERO;
        for (int state : states) {
            Rational leaving = matrix.columns().get(state).stream().filter(entry -> !states.contains(entry.row()))
                    .map(SparseMatrix.Entry::value).reduce(Rational.ZERO, Rational::plus);
            most = Rational.max(most, leaving);
        }
        return most;
    }
}
