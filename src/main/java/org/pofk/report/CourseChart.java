package org.pofk.report;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.When;
import org.pofk.chain.Chain;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;

/**
 * Which steps of outputs are drawn, and how: as far as the last output settles and a little on, a few turns of a cycle,
 * some steps where there is no long run. Every value is exact, or certified where stepping so far would take too long.
 */
public final class CourseChart {
    /** More outputs than this can't be told apart in one figure. */
    public static final int MOST_CURVES = 12;
    /** Up to this step each value has a mark of its own. */
    static final int MARKED_UP_TO = 40;
    /** The last step of a figure in which something oscillates, so that none is left out. */
    static final int OSCILLATING_UP_TO = 600;
    private static final int LONGEST = 1_000_000_000;
    private static final int POINTS = 300;
    private static final int FEWEST = 10;
    private static final int WITHOUT_LONG_RUN = 40;
    private static final int LOOKED_AT = 20;
    private static final int INTERVALS = 6;
    private static final int STEP_INTERVALS = 10;
    private static final int SIGN_BITS = 64;
    private static final int DRAWN_BITS = 32;
    private static final int MOST_BITS = 4096;

    private CourseChart() {
    }

    /** The outputs whose formula is known, over steps chosen here; empty for none or more than can be told apart. */
    public static Optional<Chart.Course> of(DerivedModel derived) {
        return of(derived, List.of());
    }

    /** The same at the steps given in ascending order. */
    public static Optional<Chart.Course> of(DerivedModel derived, List<Integer> at) {
        List<DerivedOutput> outputs = derived.outputs().stream().filter(DerivedOutput::isDecided).toList();
        return outputs.isEmpty() || outputs.size() > MOST_CURVES ? Optional.empty()
                : Optional.of(drawn(derived, outputs, at));
    }

    private static Chart.Course drawn(DerivedModel derived, List<DerivedOutput> outputs, List<Integer> at) {
        Chain chain = derived.model().chain();
        List<ClosedForm> forms = outputs.stream().map(each -> each.closedForm().orElseThrow()).toList();
        List<LongRun> longRuns = outputs.stream().map(each -> each.longRun().orElseThrow().byPoles()).toList();
        Rational within = within(StepValues.of(chain, forms, IntStream.rangeClosed(0, LOOKED_AT).boxed().toList()),
                longRuns);
        List<Optional<Long>> settled = new ArrayList<>();
        for (int i = 0; i < forms.size(); i++) {
            settled.add(When.of(chain, forms.get(i), longRuns.get(i),
                    new When.Condition(When.Condition.Kind.SETTLED, within)).forEverFrom());
        }
        List<Integer> steps = at.isEmpty() ? steps(forms, longRuns, settled) : at;
        List<List<StepValue>> values = StepValues.of(chain, forms, steps);
        List<Chart.Curve> curves = new ArrayList<>();
        for (int i = 0; i < forms.size(); i++) {
            curves.add(new Chart.Curve(outputs.get(i).output().name(), values.get(i),
                    LongRunValues.of(longRuns.get(i)), settled.get(i)));
        }
        Axis stepAxis = steps.size() == 1 ? Axis.around(Rational.of(steps.get(0)), Rational.of(steps.get(0)), 1)
                : Axis.between(Rational.of(steps.get(0)), Rational.of(steps.get(steps.size() - 1)), STEP_INTERVALS);
        return course(derived, drawing(steps, curves.size()), whole(stepAxis), within, curves);
    }

    private static Chart.Course course(DerivedModel derived, Chart.Drawing drawing, Axis steps, Rational within,
            List<Chart.Curve> curves) {
        Prose names = Prose.names(curves.stream().map(Chart.Curve::name).toList());
        Prose title = Prose.of("p(k) of ").and(names).and(" — ").andName(derived.model().title());
        return new Chart.Course(title, CourseProse.of(curves, within), derived.model().step().named(), drawing, steps,
                valueAxis(curves), within, curves);
    }

    /** Ticks at whole steps. */
    private static Axis whole(Axis axis) {
        return new Axis(axis.from(), axis.to(), Rational.max(axis.step(), Rational.ONE));
    }

    /** A step whose values all have marks: stems for one output, which would hide each other for several. */
    private static Chart.Drawing drawing(List<Integer> steps, int curves) {
        if (steps.size() > MARKED_UP_TO + 1) {
            return Chart.Drawing.LINE;
        }
        return curves == 1 ? Chart.Drawing.STEMS : Chart.Drawing.JOINED_MARKS;
    }

    /** Values, long runs, and zero; what is probabilities ends at one. */
    private static Axis valueAxis(List<Chart.Curve> curves) {
        List<Rational> all = Stream.concat(curves.stream().flatMap(curve -> curve.points().stream())
                .map(CourseChart::near), curves.stream().flatMap(curve -> curve.longRun().stream())).toList();
        Rational lowest = all.stream().reduce(Rational.ZERO, Rational::min);
        Rational highest = all.stream().reduce(Rational.ZERO, Rational::max);
        return Axis.around(lowest, highest, INTERVALS);
    }

    /** The value, or the middle of a narrow enclosure. */
    static Rational near(StepValue value) {
        return value.exact().orElseGet(() -> rounded(value));
    }

    /** The value to some nine digits, which is what can be drawn; zero for what can't be told from it. */
    static Rational rounded(StepValue value) {
        Ball ball = value.enclosure().enclose(SIGN_BITS);
        for (int bits = 2 * SIGN_BITS; isCoarse(ball) && bits <= MOST_BITS; bits *= 2) {
            ball = value.enclosure().enclose(bits);
        }
        return ball.middle();
    }

    private static boolean isCoarse(Ball ball) {
        return !ball.isExact() && ball.radius().shiftLeft(DRAWN_BITS).compareTo(ball.center().abs()) > 0;
    }

    /** A power of ten, at most a fiftieth of what the outputs move over. */
    private static Rational within(List<List<StepValue>> values, List<LongRun> longRuns) {
        List<Rational> all = Stream.concat(values.stream().flatMap(List::stream).map(CourseChart::near),
                longRuns.stream().flatMap(each -> LongRunValues.of(each).stream())).toList();
        Rational span = all.stream().reduce(all.get(0), Rational::max)
                .minus(all.stream().reduce(all.get(0), Rational::min));
        Rational size = span.isZero() ? Rational.max(all.get(0).abs(), Rational.of(1, 1000)) : span;
        return Axis.powerOfTenAtMost(size.dividedBy(Rational.of(50)));
    }

    /** From 0 to a round step, each of them, or in large steps where nothing oscillates between. */
    private static List<Integer> steps(List<ClosedForm> forms, List<LongRun> longRuns, List<Optional<Long>> settled) {
        long last = FEWEST;
        boolean oscillates = false;
        for (int i = 0; i < forms.size(); i++) {
            int period = LongRunValues.of(longRuns.get(i)).size();
            long shown = period == 0 ? WITHOUT_LONG_RUN : settled.get(i).map(k -> k + k / 4 + 2).orElse((long) LONGEST);
            last = Math.max(last, shown + (period > 1 ? 3L * period : 0));
            oscillates |= period != 1 || oscillates(forms.get(i));
        }
        long most = oscillates ? OSCILLATING_UP_TO : LONGEST;
        int round = roundUp(Math.min(last, most));
        int stride = round <= OSCILLATING_UP_TO ? 1
                : Axis.roundAtLeast(Rational.of(round, POINTS)).floor().intValueExact();
        return IntStream.rangeClosed(0, round / stride).map(i -> i * stride).boxed().toList();
    }

    /** The next multiple of a tenth, rounded, of a number of steps. */
    private static int roundUp(long steps) {
        BigInteger tick = Axis.roundAtLeast(Rational.of(steps, STEP_INTERVALS)).floor().max(BigInteger.ONE);
        long unit = tick.longValueExact();
        return Math.toIntExact((steps + unit - 1) / unit * unit);
    }

    /** Whether a mode may go up and down: all but those of poles that are seen to be positive. */
    private static boolean oscillates(ClosedForm form) {
        return !form.modes().stream().allMatch(mode -> mode.accept(new IsSteady()));
    }

    private static final class IsSteady implements Mode.Visitor<Boolean> {
        @Override
        public Boolean impulse(Mode.Impulse impulse) {
            return true;
        }

        @Override
        public Boolean geometric(Mode.Geometric geometric) {
            return geometric.base().enclosure().enclose(SIGN_BITS).isPositive();
        }

        @Override
        public Boolean oscillating(Mode.Oscillating oscillating) {
            return false;
        }
    }
}
