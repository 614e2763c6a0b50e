package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/**
 * What an answer is worth in each state, taken through a timetable from later steps to earlier ones: what is worth w
 * after a step that does M is worth Mᵀ w before it. Exact, or between bounds.
 *
 * @param <W> one number a state, none of them negative
 */
interface BackwardArithmetic<W> {

    W weights(List<Rational> weights);

    W beforeMove(int move, W after);

    W beforeAction(int action, W after);

    W sum(W first, W second);

    /** Zero in all other states. */
    W only(List<Integer> states, W weights);

    /**
     * x = Sᵀ x + {@code added} on these states and zero elsewhere, S that of a whole cycle; they are left for ever with
     * certainty. Empty where that takes so many cycles that nothing is certain of x.
     */
    Optional<W> solved(List<Integer> open, W added);

    /** Expected over a start. */
    KnownValue expected(List<Rational> start, W weights);

    default W before(Moment moment, W after) {
        W weights = after;
        for (int i = moment.actions().size() - 1; i >= 0; i--) {
            weights = beforeAction(moment.actions().get(i), weights);
        }
        return moment.move().isPresent() ? beforeMove(moment.move().getAsInt(), weights) : weights;
    }

    default W through(List<Moment> moments, W end) {
        W weights = end;
        for (int i = moments.size() - 1; i >= 0; i--) {
            weights = before(moments.get(i), weights);
        }
        return weights;
    }
}
