package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.steps.StepValue;

/** What is seen of outputs over steps, in words. */
final class CourseProse {
    private static final int DIGITS = 4;
    private static final int LISTED = 6;

    private CourseProse() {
    }

    static Prose of(List<Chart.Curve> curves, Rational within) {
        List<StepValue> first = curves.get(0).points();
        int from = first.get(0).k();
        int to = first.get(first.size() - 1).k();
        int count = first.size();
        Prose scope = Prose.of(count == 1 ? "Step " + from + ". "
                : "Steps " + from + " to " + to + (count == to - from + 1 ? "" : ", " + count + " of them") + ". ");
        return scope.and(Prose.joined(curves.stream().map(curve -> of(curve, within, to)).toList(), " "));
    }

    private static Prose of(Chart.Curve curve, Rational within, int to) {
        StepValue first = curve.points().get(0);
        StepValue last = curve.points().get(curve.points().size() - 1);
        StepValue highest = curve.points().stream().reduce((a, b) -> isHigher(b, a) ? b : a).orElseThrow();
        StepValue lowest = curve.points().stream().reduce((a, b) -> isHigher(a, b) ? b : a).orElseThrow();
        Prose said = Prose.name(curve.name());
        if (!isHigher(highest, lowest)) {
            said = said.and(" is " + text(first) + " at every step shown");
        } else {
            said = said.and(" begins at " + text(first) + inside(" is highest", highest, first, last)
                    + inside(" is lowest", lowest, first, last) + " and ends at " + text(last));
        }
        return said.and(longRun(curve, within, to)).and(".");
    }

    private static boolean isHigher(StepValue a, StepValue b) {
        return CourseChart.near(a).compareTo(CourseChart.near(b)) > 0;
    }

    private static String inside(String is, StepValue value, StepValue first, StepValue last) {
        return text(value).equals(text(first)) || text(value).equals(text(last)) ? ""
                : "," + is + " at k = " + value.k() + " with " + text(value);
    }

    private static String text(StepValue value) {
        return value.exact().map(exact -> ChartNumber.of(exact, DIGITS)).orElseGet(() -> ValueText.of(value, DIGITS));
    }

    private static String longRun(Chart.Curve curve, Rational within, int to) {
        if (curve.longRun().isEmpty()) {
            return "; it has no limit and no cycle that is listed";
        }
        Optional<String> settled = curve.settled().map(k -> ", and stays within " + Decimals.of(within, 1).text()
                + " of it from k = " + k + " on" + (k > to ? ", beyond what is shown" : ""));
        if (curve.longRun().size() == 1) {
            return "; it tends to " + ChartNumber.of(curve.longRun().get(0), DIGITS) + settled.orElse("");
        }
        return "; it tends to a cycle of " + curve.longRun().size()
                + (curve.longRun().size() > LISTED ? "" : ": " + curve.longRun().stream()
                        .map(value -> ChartNumber.of(value, DIGITS)).collect(Collectors.joining(", ")))
                + settled.orElse("");
    }
}
