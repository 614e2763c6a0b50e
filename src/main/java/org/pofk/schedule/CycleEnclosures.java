package org.pofk.schedule;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.answer.TooMuchWorkException;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.chain.Timetable;
import org.pofk.steps.FixedPointColumn;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.StateArithmetic;

/**
 * The states x(P + m T) at the beginnings of the cycles of a scheduled chain, and what they tend to, in fixed point.
 * A step takes no two probability vectors farther apart: so how far a state is from its limit, and how far it moves in
 * some cycles, never grows from one cycle to the next. Certified, for a chain.
 */
final class CycleEnclosures {
    /** Products of two numbers: seconds. */
    private static final double WORK_AT_MOST = 2e8;
    private static final double STATES_CUBED_AT_MOST = 2e6;

    private final List<FixedPointState> limits;
    private final List<List<FixedPointColumn>> powers = new ArrayList<>();
    private final Map<Long, FixedPointState> states = new HashMap<>();
    private final Map<Long, BigInteger> distances = new HashMap<>();
    private final Map<Move, BigInteger> changes = new HashMap<>();
    private final FixedPointState begin;
    private double work;

    private CycleEnclosures(List<FixedPointState> limits, List<FixedPointColumn> cycle, FixedPointState begin) {
        this.limits = limits;
        this.powers.add(cycle);
        this.begin = begin;
    }

    /** Empty where the cycles come too slowly to their long run, recur after too many, or have too many states. */
    static Optional<CycleEnclosures> of(Chain chain, Timetable timetable) {
        Structure structure = CycleGraph.of(timetable, chain.start());
        Optional<Integer> period = CycleLongRun.period(structure);
        if (period.isEmpty() || Math.pow(chain.size(), 3) > STATES_CUBED_AT_MOST) {
            return Optional.empty();
        }
        StateArithmetic.Fixed fixed = StateArithmetic.Fixed.of(timetable);
        List<FixedPointColumn> cycle = CycleMatrices.below(timetable, fixed);
        FixedPointState begin = fixed.walked(timetable, fixed.start(chain.start()), 0, timetable.before());
        return CycleLongRun.certified(cycle, begin, structure, period.get()).map(longRun -> {
            List<FixedPointState> limits = new ArrayList<>(List.of(longRun.limit()));
            for (int r = 1; r < longRun.cycles(); r++) {
                limits.add(FixedPointState.combination(cycle, limits.get(r - 1).components()));
            }
            return new CycleEnclosures(limits, cycle, begin);
        });
    }

    /** d: the limit recurs after so many cycles. */
    int period() {
        return limits.size();
    }

    /** What the states at the cycles m ≡ residue tend to. */
    FixedPointState limit(long residue) {
        return limits.get((int) (residue % limits.size()));
    }

    /** At the beginning of cycle m: log m products of a matrix and a vector. */
    FixedPointState state(long m) throws TooMuchWorkException {
        FixedPointState known = states.get(m);
        if (known != null) {
            return known;
        }
        double size = begin.components().size();
        work += size * size * Long.bitCount(m);
        if (work > WORK_AT_MOST) {
            throw new TooMuchWorkException();
        }
        FixedPointState state = begin;
        for (int i = 0; m >> i > 0; i++) {
            if ((m >> i & 1) == 1) {
                state = FixedPointState.combination(power(i), state.components());
            }
        }
        states.put(m, state);
        return state;
    }

    /** S to the power of 2^i. */
    private List<FixedPointColumn> power(int i) {
        while (powers.size() <= i) {
            powers.add(FixedPointColumn.squared(powers.get(powers.size() - 1)));
        }
        return powers.get(i);
    }

    /**
     * In cycle m and all later ones the state is no farther than this from its limit, summed over all states, in units
     * of 2^−{@value FixedPointState#BITS}.
     */
    BigInteger distance(long m) throws TooMuchWorkException {
        BigInteger known = distances.get(m);
        BigInteger distance = known != null ? known : state(m).distance(limit(m));
        distances.put(m, distance);
        return distance;
    }

    /** From cycle m on, the state moves by no more than this in {@code stride} cycles, a multiple of the period. */
    BigInteger change(long m, long stride) throws TooMuchWorkException {
        Move move = new Move(m, stride);
        BigInteger known = changes.get(move);
        BigInteger change = known != null ? known : state(m).distance(state(m + stride));
        changes.put(move, change);
        return change;
    }

    private record Move(long m, long stride) {
    }
}
