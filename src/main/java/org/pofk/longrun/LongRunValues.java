package org.pofk.longrun;

import java.util.List;
import org.pofk.exact.Rational;

/** The values a long run takes in turn: one for a limit, a whole period for a cycle, none where there is neither. */
public final class LongRunValues implements LongRun.Visitor<List<Rational>> {
    private LongRunValues() {
    }

    public static List<Rational> of(LongRun longRun) {
        return longRun.accept(new LongRunValues());
    }

    @Override
    public List<Rational> limit(LongRun.Limit limit) {
        return List.of(limit.value());
    }

    @Override
    public List<Rational> cycle(LongRun.Cycle cycle) {
        return cycle.values();
    }

    @Override
    public List<Rational> none(LongRun.None none) {
        return List.of();
    }
}
