package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.schedule.CycleCourse.Extreme;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.PeriodicRegime;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StepValue;

/**
 * Outputs under a schedule over the steps before the cycles and a few cycles, as a figure: where something is done,
 * both values stand at the same step, so that the line falls or rises upright there. Every value is exact or certified.
 */
public final class ScheduledCourse {
    private static final int CYCLES = 4;
    private static final int FEWEST = 12;
    private static final int STEPS_AT_MOST = 600;
    private static final int POINTS = 240;
    private static final int INTERVALS = 6;
    private static final int STEP_INTERVALS = 10;
    private static final int DIGITS = 4;

    private ScheduledCourse() {
    }

    /** The steps a figure shows unasked: all, or of long cycles some, and those at which something is done. */
    public static List<Integer> steps(Timetable timetable) {
        long wanted = timetable.before() + Math.max(FEWEST, (long) CYCLES * timetable.period());
        int last = (int) (wanted <= STEPS_AT_MOST ? wanted
                : Math.max(STEPS_AT_MOST, timetable.before() + (long) timetable.period()));
        int stride = last <= STEPS_AT_MOST ? 1 : last / POINTS;
        TreeSet<Integer> steps = new TreeSet<>(List.of(0, last));
        for (int k = stride; k < last; k += stride) {
            steps.add(k);
        }
        if (stride > 1) {
            IntStream.rangeClosed(1, last).filter(k -> !timetable.at(k).actions().isEmpty())
                    .limit(POINTS).forEach(steps::add);
        }
        return List.copyOf(steps);
    }

    /** The outputs at those of the steps for which values were found; empty for none or more than can be told apart. */
    public static Optional<Chart.Course> of(ScheduledModel found, List<Integer> steps) {
        List<Chart.Curve> curves = found.outputs().stream().map(output -> curve(output, found.timetable(), steps))
                .filter(curve -> !curve.points().isEmpty()).toList();
        if (curves.isEmpty() || curves.size() > CourseChart.MOST_CURVES) {
            return Optional.empty();
        }
        List<Rational> values = curves.stream().flatMap(curve -> curve.points().stream()).map(CourseChart::near)
                .toList();
        Axis levels = Axis.around(values.stream().reduce(Rational.ZERO, Rational::min),
                values.stream().reduce(Rational.ZERO, Rational::max), INTERVALS);
        Rational from = Rational.of(steps.get(0));
        Rational to = Rational.of(steps.get(steps.size() - 1));
        Axis axis = from.equals(to) ? Axis.around(from, to, 1) : Axis.between(from, to, STEP_INTERVALS);
        Prose title = Prose.of("p(k) of ").and(Prose.names(curves.stream().map(Chart.Curve::name).toList()))
                .and(" — ").andName(found.model().title());
        return Optional.of(new Chart.Course(title, alternative(found, steps), found.model().step().named(),
                steps.size() > CourseChart.MARKED_UP_TO + 1 ? Chart.Drawing.LINE : Chart.Drawing.JOINED_MARKS,
                new Axis(axis.from(), axis.to(), Rational.max(axis.step(), Rational.ONE)), levels, Rational.ZERO,
                        curves));
    }

    private static Chart.Curve curve(ScheduledOutput output, Timetable timetable, List<Integer> steps) {
        List<StepValue> points = new ArrayList<>();
        output.values().stream().filter(reading -> steps.contains(reading.j())).forEach(reading ->
                ScheduledTable.sides(timetable, reading.j()).forEach(side -> points.add(point(reading, side))));
        return new Chart.Curve(output.output().name(), points, List.of(), Optional.empty());
    }

    private static StepValue point(Reading reading, Side side) {
        KnownValue value = reading.at(side);
        return new StepValue(reading.j(), value.exact(), value.enclosure());
    }

    private static Prose alternative(ScheduledModel found, List<Integer> steps) {
        boolean isActed = steps.stream().anyMatch(k -> ScheduledTable.sides(found.timetable(), k).size() > 1);
        Prose scope = Prose.of("Steps " + steps.get(0) + " to " + steps.get(steps.size() - 1) + ". ")
                .and(isActed ? "Where something is done, the values just before and just after stand at one step. "
                        : "");
        return scope.and(Prose.joined(found.outputs().stream().map(output -> Prose.name(output.output().name())
                .and(output.regime().map(ScheduledCourse::longRun).orElse(": its long run is not decided"))
                .and(".")).toList(), " "));
    }

    private static String longRun(PeriodicRegime regime) {
        return regime.accept(new PeriodicRegime.Visitor<>() {
            @Override
            public String recurring(PeriodicRegime.Recurring recurring) {
                return ": in the long run between " + text(recurring.course().lowest()) + " and "
                        + text(recurring.course().highest()) + ", on average "
                        + KnownText.of(recurring.course().average(), DIGITS);
            }

            @Override
            public String none(PeriodicRegime.None none) {
                return ": in the long run nothing that recurs";
            }
        });
    }

    private static String text(Extreme extreme) {
        return KnownText.of(extreme.value(), DIGITS);
    }
}
