package org.pofk.report;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunChecks;

/** A long run in words. */
record LongRunProse(int digits) implements LongRun.Visitor<String> {
    private static final int LONGEST_FRACTION = 40;

    String of(LongRun longRun) {
        return longRun.accept(this);
    }

    /** How it was found. */
    static String ways(LongRunChecks checks) {
        return "the poles of Y(z)"
                + (checks.byClasses().isPresent() ? ", the null spaces of the closed classes" : "")
                + checks.highPowers().map(verdict -> ", and powers up to k = " + verdict.k() + ", within "
                        + Decimals.of(verdict.within(), 2).text()).orElse("");
    }

    @Override
    public String limit(LongRun.Limit limit) {
        return "tends to " + number(limit.value());
    }

    @Override
    public String cycle(LongRun.Cycle cycle) {
        return "no limit; a cycle of " + cycle.period() + ": "
                + cycle.values().stream().map(this::number).collect(Collectors.joining(", "))
                + " for k ≡ " + residues(cycle.period()) + " (mod " + cycle.period() + "); its average is "
                + number(cycle.average());
    }

    private static String residues(int period) {
        List<String> all = IntStream.range(0, period).mapToObj(String::valueOf).toList();
        return period <= 3 ? String.join(", ", all) : "0, 1, …, " + (period - 1);
    }

    @Override
    public String none(LongRun.None none) {
        return "no limit and no cycle: " + none.explanation()
                + none.average().map(average -> "; the average over steps tends to " + number(average)).orElse("");
    }

    /** {@code 20/2447 ≈ 0.00817327}; a fraction that is a short decimal, as that alone. */
    String number(Rational value) {
        Decimal decimal = Decimals.of(value, digits);
        if (value.isInteger() || decimal.exact() && decimal.text().length() <= value.toString().length()) {
            return decimal.text();
        }
        String text = ValueText.of(value, digits);
        int length = value.toString().length();
        if (length <= LONGEST_FRACTION) {
            return value + (ValueText.isExact(value, digits) ? " = " : " ≈ ") + text;
        }
        return text + " (" + (ValueText.isExact(value, digits) ? "exactly" : "a fraction of "
                + (value.numerator().abs().toString().length() + value.denominator().toString().length())
                + " digits") + ")";
    }
}
