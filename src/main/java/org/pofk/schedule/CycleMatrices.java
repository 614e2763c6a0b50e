package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.steps.FixedPointColumn;
import org.pofk.steps.StateArithmetic;
import org.pofk.steps.WholeMatrix;

/**
 * S, what a whole cycle of a timetable does to the state: x(P + (m+1) T) = S x(P + m T). By powers where the same
 * happens in many steps running: log T products of n × n matrices.
 */
final class CycleMatrices {
    private static final double FORMULAS_AT_MOST = 3e6;
    private static final double LOWEST_TERMS_AT_MOST = 1e10;

    private CycleMatrices() {
    }

    /** The same moment in {@code times} steps running. */
    record Stretch(Moment moment, int times) {
    }

    static List<Stretch> stretches(List<Moment> moments) {
        List<Stretch> stretches = new ArrayList<>();
        for (Moment moment : moments) {
            int last = stretches.size() - 1;
            if (last >= 0 && stretches.get(last).moment.equals(moment)) {
                stretches.set(last, new Stretch(moment, stretches.get(last).times + 1));
            } else {
                stretches.add(new Stretch(moment, 1));
            }
        }
        return stretches;
    }

    /** Exact; entries of as many bits as the divisors of all steps together. */
    static WholeMatrix exact(Timetable timetable, StateArithmetic.Whole matrices) {
        WholeMatrix product = WholeMatrix.identity(matrices.moves().get(0).size());
        for (Stretch stretch : stretches(timetable.cycle())) {
            product = step(stretch.moment, matrices).power(stretch.times).times(product);
        }
        return product;
    }

    private static WholeMatrix step(Moment moment, StateArithmetic.Whole matrices) {
        WholeMatrix step = moment.move().isPresent() ? matrices.moves().get(moment.move().getAsInt())
                : WholeMatrix.identity(matrices.moves().get(0).size());
        for (int action : moment.actions()) {
            step = matrices.actions().get(action).times(step);
        }
        return step;
    }

    /** From below. */
    static List<FixedPointColumn> below(Timetable timetable, StateArithmetic.Fixed matrices) {
        List<FixedPointColumn> product = FixedPointColumn.identity(matrices.moves().get(0).size());
        for (Stretch stretch : stretches(timetable.cycle())) {
            product = FixedPointColumn.product(power(step(stretch.moment, matrices), stretch.times), product);
        }
        return product;
    }

    private static List<FixedPointColumn> step(Moment moment, StateArithmetic.Fixed matrices) {
        List<FixedPointColumn> step = moment.move().isPresent() ? matrices.moves().get(moment.move().getAsInt())
                : FixedPointColumn.identity(matrices.moves().get(0).size());
        for (int action : moment.actions()) {
            step = FixedPointColumn.product(matrices.actions().get(action), step);
        }
        return step;
    }

    private static List<FixedPointColumn> power(List<FixedPointColumn> matrix, int times) {
        List<FixedPointColumn> result = FixedPointColumn.identity(matrix.size());
        List<FixedPointColumn> square = matrix;
        for (int left = times; left > 0; left >>= 1) {
            result = (left & 1) == 1 ? FixedPointColumn.product(square, result) : result;
            square = left > 1 ? FixedPointColumn.squared(square) : square;
        }
        return result;
    }

    /**
     * Whether a few formulas over the cycles are found in some seconds: by the primes that a recurrence of n states with
     * so long numbers needs, and by putting its numbers in lowest terms.
     */
    static boolean areFormulasWithinReach(int states, Timetable timetable, StateArithmetic.Whole matrices) {
        long bits = bits(timetable.cycle(), matrices);
        double begun = bits(timetable.preamble(), matrices);
        return Math.pow(states, 3) * bits <= FORMULAS_AT_MOST
                && states * Math.pow((double) states * bits + begun, 2) <= LOWEST_TERMS_AT_MOST;
    }

    /** How many bits the entries of S have at most, without computing it. */
    static long bits(Timetable timetable, StateArithmetic.Whole matrices) {
        return bits(timetable.cycle(), matrices);
    }

    private static long bits(List<Moment> moments, StateArithmetic.Whole matrices) {
        long bits = 0;
        for (Moment moment : moments) {
            bits += moment.move().isPresent() ? matrices.moves().get(moment.move().getAsInt()).divisor().bitLength() : 0;
            bits += moment.actions().stream().mapToLong(action -> matrices.actions().get(action).divisor().bitLength())
                    .sum();
        }
        return bits;
    }
}
