package org.pofk.report;

import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;

/** A long run as Python that proves it and draws the first steps. */
final class PythonLongRun implements LongRun.Visitor<String> {
    /** The first steps drawn, nothing proved. */
    static final String FIGURE_ALONE = "figure(name, y[:61], [])";

    private PythonLongRun() {
    }

    static String of(LongRun longRun) {
        return longRun.accept(new PythonLongRun());
    }

    @Override
    public String limit(LongRun.Limit limit) {
        return settled(List.of(limit.value()), "tends to {settled[0]}");
    }

    @Override
    public String cycle(LongRun.Cycle cycle) {
        return settled(cycle.values(), "approaches a cycle of {len(settled)}");
    }

    private static String settled(List<Rational> values, String claim) {
        return String.join("\n", "settled = " + Python.numbers(values),
                "require(f\"{name}: " + claim + "\", long_run(parts, len(settled)) == settled)",
                "figure(name, y[:61], settled)");
    }

    @Override
    public String none(LongRun.None none) {
        return String.join("\n", "require(f\"{name}: not every pole lies inside the unit circle\",",
                "        not all(inside(q) for q, _ in parts))", FIGURE_ALONE);
    }
}
