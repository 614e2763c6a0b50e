package org.pofk.longrun;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;

/**
 * A sequence that repeats, given as a sum of sequences with periods of their own: part i reads
 * {@code parts.get(i).get(k mod its size)} at k. Exact.
 */
record PeriodicValues(List<List<Rational>> parts, Rational constant) {
    /** Cycles longer than this are not written out value by value. */
    static final int LISTED_UP_TO = 100_000;

    static PeriodicValues sum(List<List<Rational>> parts) {
        return new PeriodicValues(parts, Rational.ZERO);
    }

    PeriodicValues plus(Rational more) {
        return new PeriodicValues(parts, constant.plus(more));
    }

    /** A limit when all values are equal, otherwise a cycle of the least period. */
    LongRun longRun() {
        List<List<Rational>> least = parts.stream().map(PeriodicValues::leastPeriod).toList();
        long period = 1;
        for (List<Rational> part : least) {
            period = LeastCommonMultiple.of(period, part.size());
            if (period > LISTED_UP_TO) {
                return new LongRun.None(LongRun.Reason.CYCLE_TOO_LONG, Optional.of(average()),
                        "cycles with a period above " + LISTED_UP_TO + ", too long to list");
            }
        }
        List<Rational> values = new ArrayList<>();
        for (int j = 0; j < period; j++) {
            Rational sum = constant;
            for (List<Rational> part : least) {
                sum = sum.plus(part.get(j % part.size()));
            }
            values.add(sum);
        }
        List<Rational> cycle = leastPeriod(values);
        return cycle.size() == 1 ? new LongRun.Limit(cycle.get(0)) : new LongRun.Cycle(cycle);
    }

    private Rational average() {
        Rational average = constant;
        for (List<Rational> part : parts) {
            average = average.plus(part.stream().reduce(Rational.ZERO, Rational::plus)
                    .dividedBy(Rational.of(part.size())));
        }
        return average;
    }

    private static List<Rational> leastPeriod(List<Rational> values) {
        for (int period = 1; period < values.size(); period++) {
            if (values.size() % period == 0 && repeatsAfter(values, period)) {
                return values.subList(0, period);
            }
        }
        return values;
    }

    private static boolean repeatsAfter(List<Rational> values, int period) {
        for (int i = period; i < values.size(); i++) {
            if (!values.get(i).equals(values.get(i - period))) {
                return false;
            }
        }
        return true;
    }
}
