package org.pofk.schedule;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeState;

/**
 * What an output reads later in a cycle, as an output of the state at its beginning: y(P + m T + j) = c_j x(P + m T)
 * with c_j = c M_j … M_1. Exact.
 */
final class CycleOutputs {
    private final Timetable timetable;
    private final StateArithmetic.Whole matrices;
    private final Output output;

    CycleOutputs(Timetable timetable, StateArithmetic.Whole matrices, Output output) {
        this.timetable = timetable;
        this.matrices = matrices;
        this.output = output;
    }

    /** At step j of the cycle, 1 ≤ j ≤ T, or 0 after; before or after what is done there. */
    Output at(int j, Side side) {
        WholeState row = WholeState.of(output.coefficients());
        for (int step = j; step >= 1; step--) {
            row = through(moment(step), row, step == j && side == Side.BEFORE ? List.of()
                    : moment(step).actions());
        }
        return read(row);
    }

    /** The mean of the values after at j = 0 … T − 1: c (1 + M_1 + M_2 M_1 + …) / T, by Horner's rule. */
    Output average() {
        WholeState once = WholeState.of(output.coefficients());
        WholeState sum = once;
        for (int step = timetable.period() - 1; step >= 1; step--) {
            sum = plus(through(moment(step), sum, moment(step).actions()), once);
        }
        return read(new WholeState(sum.numerators(),
                sum.divisor().multiply(BigInteger.valueOf(timetable.period()))));
    }

    private Moment moment(int step) {
        return timetable.cycle().get(step - 1);
    }

    private WholeState through(Moment moment, WholeState row, List<Integer> actions) {
        WholeState result = row;
        for (int i = actions.size() - 1; i >= 0; i--) {
            result = matrices.actions().get(actions.get(i)).timesFromLeft(result);
        }
        return moment.move().isPresent() ? matrices.moves().get(moment.move().getAsInt()).timesFromLeft(result)
                : result;
    }

    /** The divisor of the longer row is a multiple of the other's. */
    private static WholeState plus(WholeState row, WholeState once) {
        BigInteger factor = row.divisor().divide(once.divisor());
        List<BigInteger> sum = new ArrayList<>();
        for (int i = 0; i < row.numerators().size(); i++) {
            sum.add(row.numerators().get(i).add(once.numerators().get(i).multiply(factor)));
        }
        return new WholeState(sum, row.divisor());
    }

    private Output read(WholeState row) {
        List<Rational> coefficients = row.reduced();
        return new Output(output.name(), coefficients, output.constant(), output.definition());
    }
}
