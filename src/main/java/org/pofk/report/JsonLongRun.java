package org.pofk.report;

import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;

/** A long run as the fields of a JSON object. */
record JsonLongRun(Json json) implements LongRun.Visitor<Runnable> {

    void write(LongRun longRun) {
        json.object(longRun.accept(this));
    }

    @Override
    public Runnable limit(LongRun.Limit limit) {
        return () -> {
            json.text("kind", "limit");
            json.text("value", limit.value().toString());
        };
    }

    @Override
    public Runnable cycle(LongRun.Cycle cycle) {
        List<String> values = cycle.values().stream().map(Rational::toString).toList();
        return () -> {
            json.text("kind", "cycle");
            json.count("period", cycle.period());
            json.texts("values", values);
            json.text("average", cycle.average().toString());
        };
    }

    @Override
    public Runnable none(LongRun.None none) {
        return () -> {
            json.text("kind", "none");
            json.text("reason", switch (none.reason()) {
                case GROWS -> "grows";
                case RECURS_WITHOUT_PERIOD -> "recurs without period";
                case CYCLE_TOO_LONG -> "cycle too long to list";
            });
            json.text("average", none.average().map(Rational::toString));
        };
    }
}
