package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Schedule.Action;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;

/**
 * A scheduled chain stopped where a set is first entered, by a move or by an action: neither leads out of its states
 * any more, nor out of those to be avoided. So the probability of being in the set at the end of step k is that of
 * having entered it by then. Exact.
 *
 * @param distribution P(T ≤ k)
 * @param survival     P(T > k)
 */
record StoppedSchedule(ScheduledChain chain, Set<Integer> into, Set<Integer> avoiding, Output distribution,
        Output survival) {

    static StoppedSchedule of(Chain chain, Timetable timetable, Set<Integer> into, Set<Integer> avoiding) {
        List<SparseMatrix> moves = timetable.moves().stream().map(each -> stopped(each, into, avoiding)).toList();
        List<Action> actions = timetable.actions().stream().map(each ->
                new Action(each.name(), stopped(each.matrix(), into, avoiding))).toList();
        Timetable stopped = new Timetable(moves, actions, timetable.preamble(), timetable.cycle());
        return new StoppedSchedule(ScheduledChain.of(new Chain(chain.kind(), chain.states(),
                stopped(chain.matrix(), into, avoiding), chain.start(), chain.sets(), List.of()), stopped),
                Set.copyOf(into), Set.copyOf(avoiding),
                new Output("distribution", indicator(chain.size(), into, Rational.ONE, Rational.ZERO), Rational.ZERO,
                        "P(T ≤ k)"),
                new Output("survival", indicator(chain.size(), into, Rational.ZERO, Rational.ONE), Rational.ZERO,
                        "P(T > k)"));
    }

    /** P(T ≤ k | T < ∞), given the probability that T is finite. */
    Output distributionOver(Rational probability) {
        return new Output("distribution given that it happens", distribution.coefficients().stream()
                .map(each -> each.dividedBy(probability)).toList(), Rational.ZERO, "P(T ≤ k | T < ∞)");
    }

    private static SparseMatrix stopped(SparseMatrix matrix, Set<Integer> into, Set<Integer> avoiding) {
        List<List<Entry>> columns = new ArrayList<>();
        for (int state = 0; state < matrix.size(); state++) {
            columns.add(into.contains(state) || avoiding.contains(state) ? List.of(new Entry(state, Rational.ONE))
                    : matrix.columns().get(state));
        }
        return new SparseMatrix(columns);
    }

    private static List<Rational> indicator(int size, Set<Integer> states, Rational inside, Rational outside) {
        return IntStream.range(0, size).mapToObj(state -> states.contains(state) ? inside : outside).toList();
    }
}
