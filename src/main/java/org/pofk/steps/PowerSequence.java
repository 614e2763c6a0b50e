package org.pofk.steps;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;

/**
 * The state of a chain at powers of two, x(1), x(2), x(4), …, and step by step until it hardly changes or the work
 * allows no more. Certified: from below, see {@link FixedPointState}.
 *
 * @param steps    x(0), x(1), x(2), … up to the first that differs from the one before by no more than the tolerance,
 *                 not before x({@value #HIGH})
 * @param doubling in place m the state at k = 2^m
 * @param tail     states that follow the last power of two, step by step
 */
public record PowerSequence(List<FixedPointState> steps, List<FixedPointState> doubling, List<FixedPointState> tail) {
    /** Above this many states no matrix is squared; then the powers of two end with the steps. */
    static final int SQUARED_UP_TO = 40;
    /** The last power of two reached by squaring. */
    static final int LAST_SQUARING = 40;
    /** Steps taken one by one cost at most this many multiplications, or are one. */
    private static final int MULTIPLICATIONS = 500_000;
    private static final int STEPS = 1024;
    /** Lower powers are nobody's idea of a high one. */
    public static final int HIGH = 8;

    public PowerSequence {
        steps = List.copyOf(steps);
        doubling = List.copyOf(doubling);
        tail = List.copyOf(tail);
    }

    /** With the last power of two and as many states after it as fill a cycle of {@code period}. */
    public static PowerSequence of(Chain chain, int period, Rational tolerance) {
        List<FixedPointColumn> columns = FixedPointColumn.below(chain.matrix());
        FixedPointState start = FixedPointState.below(chain.start());
        int entries = columns.stream().mapToInt(FixedPointColumn::entries).sum();
        List<FixedPointState> steps = untilSettled(columns, start, Math.min(STEPS, MULTIPLICATIONS / entries), tolerance);
        List<FixedPointState> doubling = chain.size() <= SQUARED_UP_TO
                ? squared(columns, start)
                : atPowersOfTwo(stepped(columns, start, Math.max(1, MULTIPLICATIONS / entries)));
        List<FixedPointState> tail = stepped(columns, doubling.get(doubling.size() - 1), period - 1);
        return new PowerSequence(steps, doubling, tail);
    }

    private static List<FixedPointState> stepped(List<FixedPointColumn> columns, FixedPointState start, int last) {
        List<FixedPointState> states = new ArrayList<>(List.of(start));
        for (int k = 1; k <= last; k++) {
            states.add(FixedPointState.combination(columns, states.get(k - 1).components()));
        }
        return states;
    }

    private static List<FixedPointState> untilSettled(List<FixedPointColumn> columns, FixedPointState start, int last,
            Rational tolerance) {
        List<FixedPointState> states = new ArrayList<>(List.of(start));
        boolean isSettled = false;
        while (states.size() <= last && !isSettled) {
            FixedPointState before = states.get(states.size() - 1);
            FixedPointState next = FixedPointState.combination(columns, before.components());
            isSettled = states.size() >= HIGH && next.isWithin(tolerance, before);
            states.add(next);
        }
        return states;
    }

    private static List<FixedPointState> squared(List<FixedPointColumn> columns, FixedPointState start) {
        List<FixedPointState> states = new ArrayList<>();
        List<FixedPointColumn> power = columns;
        for (int m = 0; m <= LAST_SQUARING; m++) {
            states.add(FixedPointState.combination(power, start.components()));
            power = FixedPointColumn.squared(power);
        }
        return states;
    }

    private static List<FixedPointState> atPowersOfTwo(List<FixedPointState> steps) {
        List<FixedPointState> states = new ArrayList<>();
        for (int k = 1; k < steps.size(); k *= 2) {
            states.add(steps.get(k));
        }
        return states;
    }
}
