package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.Schedule;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.steps.FixedPointColumn;
import org.pofk.steps.FixedPointState;
import org.pofk.steps.KnownValue;
import org.pofk.steps.ModeValues;
import org.pofk.steps.StateArithmetic;

/** Every answer about a schedule against plain stepping: x(k⁻) and x(k) one after the other, nothing but A and B. */
class SchedulingTest {
    private static final long SEED = 20_261_201L;
    private static final int STEPS = 5_000;
    private static final Rational TINY = Rational.of(10).pow(-25);

    /** One step after the other, by matrices times vectors alone; denominators are powers of two. */
    private static final class Plain {
        private final Model model;
        private List<Rational> before;
        private List<Rational> state;
        private int k;

        Plain(Model model) {
            this.model = model;
            this.state = model.chain().start();
            this.before = state;
        }

        void step() {
            k++;
            ScheduledCases.Step step = ScheduledCases.Step.of(model, k);
            before = step.move().isPresent() ? step.move().get().times(state) : state;
            state = before;
            step.actions().forEach(action -> state = action.matrix().times(state));
        }
    }

    private static final List<Integer> AT = IntStream.concat(IntStream.rangeClosed(0, 60), IntStream.of(299, 300))
            .boxed().toList();
    private static final Map<String, ScheduledModel> DERIVED = new HashMap<>();

    /** Each case is derived once. */
    private static ScheduledModel derived(Model model) {
        return DERIVED.computeIfAbsent(model.origin().file(), name ->
                Scheduling.of(model, outputs(model), AT, Scheduling.Formulas.ALL, published -> { }));
    }

    private static List<Output> outputs(Model model) {
        return Outputs.states(model.chain()).subList(1, 3);
    }

    /** Values asked for are those of plain stepping at every k up to 300, and far out by the formulas. */
    @Test
    void valuesEqualPlainSteppingBeforeAndAfterTheAction() {
        int compared = 0;
        for (Map.Entry<String, String> each : ScheduledCases.ofTheContract().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            ScheduledModel found = derived(model);
            Plain plain = new Plain(model);
            for (int k = 0, place = 0; k <= 300; k++) {
                if (AT.get(place) == k) {
                    for (int i = 0; i < found.outputs().size(); i++) {
                        Reading reading = found.outputs().get(i).values().get(place);
                        String where = each.getKey() + " at " + k;
                        compared += assertIs(plain.before.get(i + 1), reading.before(), where);
                        compared += assertIs(plain.state.get(i + 1), reading.after(), where);
                    }
                    place++;
                }
                plain.step();
            }
        }
        assertEquals(ScheduledCases.ofTheContract().size() * 63 * 2 * 2, compared);
    }

    private static int assertIs(Rational expected, KnownValue found, String where) {
        if (found.exact().isPresent()) {
            assertEquals(expected, found.exact().get(), where);
        } else {
            assertTrue(found.enclosure().enclose(100).contains(expected), where);
        }
        return 1;
    }

    /** The formulas in m at every place, and those of the mean, at every cycle that 5,000 steps hold. */
    @Test
    void formulasOverTheCyclesEqualPlainSteppingForFiveThousandSteps() {
        long compared = 0;
        for (Map.Entry<String, String> each : ScheduledCases.ofTheContract().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
            ScheduledModel found = derived(model);
            FloatingPlain plain = new FloatingPlain(model, STEPS + timetable.period());
            for (int i = 0; i < found.outputs().size(); i++) {
                for (CycleFormula formula : found.outputs().get(i).over()) {
                    compared += compare(formula, timetable, plain, i + 1, each.getKey());
                }
            }
        }
        assertTrue(compared > 20_000, "compared " + compared);
    }

    private static long compare(CycleFormula formula, Timetable timetable, FloatingPlain plain, int state, String name) {
        long compared = 0;
        int last = (STEPS - timetable.before()) / timetable.period();
        ModeValues modes = ModeValues.of(formula.closedForm());
        for (int m = 0; m <= last; m += m < 40 ? 1 : 1 + last / 40) {
            int k = timetable.before() + m * timetable.period();
            var expected = formula.place().map(place -> place.side() == Side.BEFORE
                    ? plain.before(k + place.j(), state) : plain.after(k + place.j(), state))
                    .orElseGet(() -> plain.mean(k, timetable.period(), state));
            assertTrue(modes.at(m).enclose(90).overlaps(expected), name + " " + formula.place() + " at m = " + m);
            compared++;
        }
        return compared * 16;
    }

    /** Plain stepping from below in fixed point: every state is known within what it lacks to one. */
    private static final class FloatingPlain {
        private final List<FixedPointState> before = new ArrayList<>();
        private final List<FixedPointState> after = new ArrayList<>();

        FloatingPlain(Model model, int steps) {
            FixedPointState state = FixedPointState.below(model.chain().start());
            before.add(state);
            after.add(state);
            Map<SparseMatrix, List<FixedPointColumn>> columns = new HashMap<>();
            for (int k = 1; k <= steps; k++) {
                ScheduledCases.Step step = ScheduledCases.Step.of(model, k);
                if (step.move().isPresent()) {
                    state = FixedPointState.combination(columns.computeIfAbsent(step.move().get(),
                            FixedPointColumn::below), state.components());
                }
                before.add(state);
                for (Schedule.Action action : step.actions()) {
                    state = FixedPointState.combination(columns.computeIfAbsent(action.matrix(),
                            FixedPointColumn::below), state.components());
                }
                after.add(state);
            }
        }

        private static Ball reading(FixedPointState state, int place) {
            List<Rational> weights = IntStream.range(0, 3)
                    .mapToObj(i -> i == place ? Rational.ONE : Rational.ZERO).toList();
            return state.reading(new Output("state", weights, Rational.ZERO, "state"));
        }

        Ball before(int k, int state) {
            return reading(before.get(k), state);
        }

        Ball after(int k, int state) {
            return reading(after.get(k), state);
        }

        Ball mean(int from, int steps, int state) {
            Ball sum = after(from, state);
            for (int j = 1; j < steps; j++) {
                sum = sum.plus(after(from + j, state));
            }
            return sum.dividedBy(steps);
        }
    }

    /** The long run of the exact way is where 5,000 steps have come to, and the certified way encloses it. */
    @Test
    void theRegimeIsWhatPlainSteppingComesTo() {
        int compared = 0;
        for (Map.Entry<String, String> each : ScheduledCases.ofTheContract().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
            int period = timetable.period() * 6;
            FloatingPlain plain = new FloatingPlain(model, STEPS * 2 + period);
            int last = timetable.before() + (STEPS * 2 - timetable.before()) / period * period;
            for (int i = 0; i < 2; i++) {
                PeriodicRegime regime = derived(model).outputs().get(i).regime().orElseThrow();
                CycleCourse course = ((PeriodicRegime.Recurring) regime).course();
                for (int j = 0; j <= course.steps(); j++) {
                    Rational there = course.readings().get(j).after().enclosure().enclose(100).middle();
                    Rational stepped = plain.after(last + j, i + 1).middle();
                    assertTrue(there.minus(stepped).abs().compareTo(TINY) < 0, each.getKey() + " at j = " + j + ": "
                            + there.approximate() + " and " + stepped.approximate());
                    compared++;
                }
            }
        }
        assertTrue(compared > 2_000, "compared " + compared);
    }

    @Test
    void theCertifiedWayEnclosesTheExactOne() {
        int compared = 0;
        for (Map.Entry<String, String> each : ScheduledCases.ofTheContract().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
            StateArithmetic.Fixed fixed = StateArithmetic.Fixed.of(timetable);
            FixedPointState start =
                    fixed.walked(timetable, fixed.start(model.chain().start()), 0, timetable.before());
            var structure = CycleGraph.of(timetable, model.chain().start());
            int period = CycleLongRun.period(structure).orElseThrow();
            var certified = CycleLongRun.certified(CycleMatrices.below(timetable, fixed), start, structure, period)
                    .orElseThrow();
            List<CycleCourse> courses = CycleCourse.of(timetable, fixed, certified.limit(), timetable.before(),
                    timetable.period() * period, outputs(model)).courses();
            for (int i = 0; i < 2; i++) {
                CycleCourse exact = ((PeriodicRegime.Recurring) derived(model).outputs().get(i).regime()
                        .orElseThrow()).course();
                assertEquals(exact.steps(), courses.get(i).steps(), each.getKey());
                for (KnownValue[] pair : new KnownValue[][] {{exact.average(), courses.get(i).average()},
                    {exact.highest().value(), courses.get(i).highest().value()},
                    {exact.lowest().value(), courses.get(i).lowest().value()}}) {
                    assertTrue(pair[1].enclosure().enclose(0).overlaps(pair[0].enclosure().enclose(200)),
                            each.getKey());
                    compared++;
                }
            }
        }
        assertEquals(ScheduledCases.ofTheContract().size() * 6, compared);
    }

    /** Exact identities on random chains: the mean in the long run is that of the values; the joint formula's parts. */
    @Test
    void formulasWithinACycleEqualTheCourse() {
        Random random = new Random(SEED);
        int compared = 0;
        for (Map.Entry<String, String> each : ScheduledCases.ofTheContract().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            ScheduledModel found = derived(model);
            for (ScheduledOutput output : found.outputs()) {
                for (StretchFormula formula : output.within()) {
                    CycleCourse course = formula.cycle() == StretchFormula.Cycle.FIRST ? output.first().orElseThrow()
                            : ((PeriodicRegime.Recurring) output.regime().orElseThrow()).course();
                    int j = formula.from() + 1 + random.nextInt(formula.to() - formula.from());
                    Rational value = formula.closedForm().expansion().valueAt(j - formula.from());
                    assertIs(value, course.readings().get(j).before(), each.getKey() + " at j = " + j);
                    compared++;
                }
            }
        }
        assertTrue(compared >= 30, "compared " + compared);
    }

    @Test
    void jointFormulasEqualTheValuesAtEveryStep() {
        Model model = ScheduledCases.model("renewed", "transitions: {good: {failed: 1/8, good: rest}, worn: stays, failed: stays}\n"
                + "actions: {test: {failed: {good: 3/4, failed: rest}}}\nschedule: {every: 6, do: test}\n");
        ScheduledOutput output = derived(model).outputs().get(1);
        JointFormula joint = output.joint().orElseThrow();
        for (int k : AT) {
            Rational sum = Rational.ZERO;
            for (JointFormula.Term term : joint.terms()) {
                sum = sum.plus(term.base().pow(k / 6).times(term.within().expansion().valueAt(k % 6)));
            }
            assertEquals(output.values().get(AT.indexOf(k)).after().exact().orElseThrow(), sum);
        }
    }
}
