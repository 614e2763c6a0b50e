package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.answer.ConditionalLongRun;
import org.pofk.answer.ConditionalWhen;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.Schedule;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.modes.RealValue;
import org.pofk.schedule.ConditionalCourse.Reading;
import org.pofk.schedule.ConditionalCourse.Value;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.steps.KnownValue;
import org.pofk.text.RefusedException;

/** What is given under a schedule against Bayes' rule on probabilities that are stepped by hand. */
class ConditionalScheduleTest {
    private static final long SEED = 20_261_201;
    private static final int MODELS = 30;
    private static final int STEPS = 26;
    private static final int WHEN_STEPS = 90;
    /** What falls by a tenth of a percent a cycle is gone by then, and what falls like 1/m is small. */
    private static final int FAR = 12_000;
    private static final Rational NEAR = Rational.of(1, 100);

    private static List<Model> models() throws IOException, RefusedException {
        List<Model> models = new ArrayList<>();
        try (Stream<Path> files = Files.list(Path.of("test-data", "scheduled"))) {
            for (Path file : files.sorted().toList()) {
                models.add(Pofk.read(file));
            }
        }
        RandomSchedules random = new RandomSchedules(SEED);
        IntStream.range(0, MODELS).forEach(i -> models.add(random.next()));
        return models;
    }

    private static Given given(Random random, int size) {
        return new Given(List.of("in"), subset(random, size), List.of(),
                random.nextInt(2) == 0 ? subset(random, size) : Set.of());
    }

    private static Set<Integer> subset(Random random, int size) {
        Set<Integer> states = new TreeSet<>();
        IntStream.range(0, size).filter(i -> random.nextBoolean()).forEach(states::add);
        states.add(random.nextInt(size));
        return states;
    }

    /** P(output and known) over P(known); empty where that is zero. */
    private static Optional<Rational> bayes(List<Rational> state, Output output, Given given) {
        Rational event = Rational.ZERO;
        Rational joint = Rational.ZERO;
        for (int i : given.in()) {
            event = event.plus(state.get(i));
            joint = joint.plus(state.get(i).times(output.coefficients().get(i).plus(output.constant())));
        }
        return event.isZero() ? Optional.empty() : Optional.of(joint.dividedBy(event));
    }

    /** The value after each step. */
    private static List<Optional<Rational>> stepped(Model model, Output output, Given given, int steps) {
        SteppedSchedule stepped = new SteppedSchedule(model, given.never());
        List<Optional<Rational>> values = new ArrayList<>();
        for (int k = 0; k < steps; k++) {
            values.add(bayes(stepped.after(), output, given));
            stepped.step();
        }
        return values;
    }

    private static Optional<Rational> exact(Value value) {
        assertTrue(value.kind() != Value.Kind.NOT_DECIDED);
        return value.value().map(known -> known.exact().orElseThrow());
    }

    @Test
    void valuesFormulasAndLimitsAreThoseOfSteppingByHand() throws Exception {
        Random random = new Random(SEED);
        int compared = 0;
        int impossible = 0;
        int formulas = 0;
        int limits = 0;
        int dyingOut = 0;
        List<Model> models = models();
        for (Model model : models) {
            Given given = given(random, model.chain().size());
            Output output = Outputs.states(model.chain()).get(random.nextInt(model.chain().size()));
            List<Integer> at = new ArrayList<>(IntStream.range(0, STEPS).boxed().toList());
            int period = Timetable.of(model.chain(), model.schedule().orElseThrow()).period();
            IntStream.range(0, Math.min(period, 12)).forEach(j -> at.add(FAR + j));
            ConditionalSchedule found = ConditionalSchedule.of(model, given, List.of(output), at,
                    Scheduling.Formulas.WITHIN_REACH);
            String message = model.origin().file() + model.chain() + model.schedule() + given;
            List<Reading> values = found.outputs().get(0).values();
            SteppedSchedule stepped = new SteppedSchedule(model, given.never());
            for (int k = 0; k < STEPS; k++) {
                assertEquals(bayes(stepped.before(), output, given), exact(values.get(k).before()),
                        message + " before " + k);
                assertEquals(bayes(stepped.after(), output, given), exact(values.get(k).after()),
                        message + " after " + k);
                formulas += compareFormulas(found, k, stepped, output, given, message);
                compared += 2;
                impossible += exact(values.get(k).after()).isEmpty() ? 1 : 0;
                stepped.step();
            }
            limits += compareLimits(found, values.subList(STEPS, values.size()), message);
            dyingOut += found.event().over().get(0).longRun().toString().contains("value=0") ? 1 : 0;
        }
        assertTrue(compared == 2 * STEPS * models.size() && impossible > 400 && formulas > 900 && limits > 50
                && dyingOut > 15, compared + " values, " + impossible + " impossible, " + formulas + " formulas, "
                + limits + " limits, " + dyingOut + " dying out");
    }

    /** N over D as the formulas over the cycles have them. */
    private static int compareFormulas(ConditionalSchedule found, int k, SteppedSchedule stepped, Output output,
            Given given, String message) {
        int compared = 0;
        int begin = found.stopped().timetable().before();
        int period = found.stopped().timetable().period();
        for (int i = 0; i < found.event().over().size(); i++) {
            CycleFormula below = found.event().over().get(i);
            CycleFormula above = found.outputs().get(0).joint().over().get(i);
            int beyond = below.place().map(place -> k - begin - place.j()).orElse(-1);
            if (beyond >= 0 && beyond % period == 0) {
                Rational event = below.closedForm().expansion().valueAt(beyond / period);
                Optional<Rational> quotient = event.isZero() ? Optional.empty()
                        : Optional.of(above.closedForm().expansion().valueAt(beyond / period).dividedBy(event));
                Side side = below.place().orElseThrow().side();
                assertEquals(bayes(side == Side.BEFORE ? stepped.before() : stepped.after(), output, given), quotient,
                        message + " formula at " + k);
                compared++;
            }
        }
        return compared;
    }

    private static int compareLimits(ConditionalSchedule found, List<Reading> far, String message) {
        ConditionalCourse longRun = found.outputs().get(0).longRun().orElseThrow(() -> new AssertionError(message));
        assertTrue(longRun.isDecided(), message);
        int compared = 0;
        for (Reading reading : far) {
            int place = (reading.j() - found.stopped().timetable().before()) % longRun.steps();
            Value limit = longRun.readings().get(place).after();
            assertEquals(limit.kind(), reading.after().kind(), message + " far");
            if (limit.kind() == Value.Kind.VALUE) {
                assertTrue(middle(limit).minus(middle(reading.after())).abs().compareTo(NEAR) < 0,
                        message + " far " + reading);
                compared++;
            }
        }
        return compared;
    }

    private static Rational middle(Value value) {
        return value.value().orElseThrow().enclosure().enclose(80).middle();
    }

    @Test
    void whenIsThatOfSteppingByHand() throws Exception {
        Random random = new Random(SEED + 1);
        int compared = 0;
        int forEver = 0;
        int met = 0;
        List<Model> models = models();
        for (Model model : models) {
            Given given = given(random, model.chain().size());
            Output output = Outputs.states(model.chain()).get(random.nextInt(model.chain().size()));
            List<Optional<Rational>> values = stepped(model, output, given, WHEN_STEPS);
            When.Condition.Kind kind = When.Condition.Kind.values()[random.nextInt(3)];
            Rational bound = kind == When.Condition.Kind.SETTLED ? Rational.of(10).pow(-1 - random.nextInt(3))
                    : values.get(random.nextInt(14)).map(value -> value.plus(Rational.of(random.nextInt(3) - 1, 97)))
                            .orElse(Rational.HALF);
            ConditionalWhen found = ScheduledConditionalWhen.of(model, given, List.of(output),
                    new WhenModel.Asked(kind, bound, false), each -> { });
            When when = found.answers().get(0).when();
            String message = model.origin().file() + model.chain() + model.schedule() + given + found.answers();
            assertTrue(when.decided(), message);
            for (int k = 0; k < WHEN_STEPS; k++) {
                boolean holds = values.get(k).isPresent() && holds(found.answers().get(0), values.get(k).get(), k);
                assertHolds(when, k, holds, message + " at " + k);
                compared++;
                met += holds ? 1 : 0;
            }
            forEver += when.forEverFrom().isPresent() ? 1 : 0;
        }
        assertTrue(compared == WHEN_STEPS * models.size() && forEver > 8 && met > 700, compared + " steps, " + forEver
                + " for ever, " + met + " met");
    }

    private static boolean holds(ConditionalWhen.Answer answer, Rational value, int k) {
        Rational bound = answer.when().condition().bound();
        return switch (answer.when().condition().kind()) {
            case AT_LEAST -> value.compareTo(bound) >= 0;
            case AT_MOST -> value.compareTo(bound) <= 0;
            case SETTLED -> {
                Optional<RealValue> limit = answer.longRun().at(k);
                yield limit.isPresent() && value.minus(limit.get().enclosure().enclose(400).middle()).abs()
                        .compareTo(bound) <= 0;
            }
        };
    }

    private static void assertHolds(When when, long k, boolean holds, String message) {
        assertTrue(!holds || when.first().stream().anyMatch(first -> first <= k), message);
        assertTrue(holds || when.first().stream().noneMatch(first -> first == k), message);
        assertTrue(holds || when.forEverFrom().stream().noneMatch(from -> from <= k), message);
        assertTrue(!holds || when.forEverFrom().stream().noneMatch(from -> from == k + 1), message);
        when.classes().stream().filter(each -> k % each.modulus() == each.residue()).forEach(each ->
                assertTrue(holds || each.forEverFrom().stream().noneMatch(from -> from <= k), message));
    }

    /** What is known at one step: the state then by Bayes' rule, and the rest of the schedule from there. */
    @Test
    void fromAStepOnItIsTheRestOfTheSchedule() throws Exception {
        Random random = new Random(SEED + 2);
        int compared = 0;
        int nothing = 0;
        for (Model model : models()) {
            for (int at = 0; at < 12; at++) {
                Given given = given(random, model.chain().size());
                SteppedSchedule until = new SteppedSchedule(model, given.never());
                IntStream.range(0, at).forEach(k -> until.step());
                List<Rational> state = IntStream.range(0, model.chain().size()).mapToObj(i -> given.in().contains(i)
                        ? until.after().get(i) : Rational.ZERO).toList();
                Rational event = state.stream().reduce(Rational.ZERO, Rational::plus);
                Optional<Known> known = Known.of(model, given, at);
                assertEquals(!event.isZero(), known.isPresent());
                nothing += event.isZero() ? 1 : 0;
                if (known.isPresent()) {
                    assertEquals(event, known.get().probability());
                    compared += compareRest(model, known.get(), state.stream().map(p -> p.dividedBy(event)).toList());
                }
            }
        }
        assertTrue(compared > 1_300 && nothing > 150, compared + " values, " + nothing + " of probability zero");
    }

    private static int compareRest(Model model, Known known, List<Rational> state) {
        List<Integer> at = IntStream.range(0, 8).boxed().toList();
        Output output = Outputs.states(model.chain()).get(0);
        Timetable timetable = Timetable.of(known.model().chain(), known.model().schedule().orElseThrow());
        List<CycleCourse.Reading> found = ScheduledValues.of(known.model().chain(), timetable,
                org.pofk.steps.StateArithmetic.Whole.of(timetable), List.of(output), at).get(0);
        SteppedSchedule rest = new SteppedSchedule(model, known.at(), state);
        for (int k : at) {
            assertEquals(Optional.of(rest.after().get(0)), found.get(k).after().exact(), model + " " + known + " " + k);
            if (k > 0) {
                assertEquals(Optional.of(rest.before().get(0)), found.get(k).before().exact(), model + " " + known);
            }
            rest.step();
        }
        return at.size();
    }

    /** Each path on its own: its probability, where it ends, and whether it kept clear of some states. */
    @Test
    void aFewStepsAreThoseOfAllPathsOneByOne() throws Exception {
        Random random = new Random(SEED + 3);
        RandomSchedules schedules = new RandomSchedules(SEED + 3);
        int paths = 0;
        for (int i = 0; i < 50; i++) {
            Model model = schedules.next();
            Given given = given(random, model.chain().size());
            Output output = Outputs.states(model.chain()).get(0);
            List<Reading> found = ConditionalSchedule.of(model, given, List.of(output), List.of(0, 1, 2, 3, 4, 5),
                    Scheduling.Formulas.WITHIN_REACH).outputs().get(0).values();
            for (int k = 0; k <= 5; k++) {
                Rational[] sums = {Rational.ZERO, Rational.ZERO};
                for (int state = 0; state < model.chain().size(); state++) {
                    paths += paths(factors(model, k), 0, state, model.chain().start().get(state), given, sums);
                }
                assertEquals(sums[1].isZero() ? Optional.empty() : Optional.of(sums[0].dividedBy(sums[1])),
                        exact(found.get(k).after()), model + " " + given + " at " + k);
            }
        }
        assertTrue(paths > 700, paths + " paths");
    }

    /** The matrices of the steps 1 … k, the first first. */
    private static List<SparseMatrix> factors(Model model, int k) {
        List<SparseMatrix> factors = new ArrayList<>();
        for (int step = 1; step <= k; step++) {
            int now = step;
            List<Schedule.Recurring> due = model.schedule().orElseThrow().recurring().stream()
                    .filter(each -> now >= each.first() && (now - each.first()) % each.every() == 0).toList();
            if (due.stream().allMatch(each -> each.when() == Schedule.When.AFTER_THE_STEP)) {
                factors.add(SteppedSchedule.move(model, step));
            }
            due.forEach(each -> factors.add(each.action().matrix()));
        }
        return factors;
    }

    /** @param sums of the paths that end in state 0 and in all, where what is given holds */
    private static int paths(List<SparseMatrix> factors, int begun, int state, Rational probability, Given given,
            Rational[] sums) {
        if (probability.isZero() || given.never().contains(state)) {
            return 0;
        }
        if (begun == factors.size()) {
            sums[0] = given.in().contains(state) && state == 0 ? sums[0].plus(probability) : sums[0];
            sums[1] = given.in().contains(state) ? sums[1].plus(probability) : sums[1];
            return 1;
        }
        int paths = 0;
        for (SparseMatrix.Entry entry : factors.get(begun).columns().get(state)) {
            paths += paths(factors, begun + 1, entry.row(), probability.times(entry.value()), given, sums);
        }
        return paths;
    }

    /**
     * A constant failure rate has no memory: R(T, t) = R(T + t) / R(T) = e^(−λt) at every age T (ReliaWiki, Conditional
     * reliability function of the exponential distribution, www.reliawiki.com), in steps (1 − p)^t. So at every age,
     * and however bad the tests were, what works fails until just before the next test with probability 1 − (1 − p)^t.
     */
    @Test
    void whatWorksFailsUntilTheNextTestAsIfItWereNew() throws Exception {
        Rational p = Rational.of(1, 1_000);
        Model model = ModelReader.read(Source.ofText("tested", "pofk: 1\nstart: {works: 3/4, failed: 1/4}\n"
                + "states: [works, failed]\ntransitions: {works: {failed: " + p + ", works: rest}, failed: stays}\n"
                + "actions: {test: {failed: {works: 0.6, failed: rest}, works: {failed: 0.01, works: rest}}}\n"
                + "schedule: {every: 12, do: test}\noutputs: {PFD: failed}\n"), Optional.empty(), Overrides.NONE);
        Given works = new Given(List.of("works"), Set.of(0), List.of(), Set.of());
        int compared = 0;
        for (int age = 0; age <= 30; age++) {
            int left = 12 - age % 12;
            Model seen = Known.of(model, works, age).orElseThrow().model();
            Optional<Rational> failed = Scheduling.of(seen, model.chain().outputs(), List.of(left),
                    Scheduling.Formulas.WITHIN_REACH, each -> { }).outputs().get(0).values().get(0).before().exact();
            assertEquals(Optional.of(Rational.ONE.minus(Rational.ONE.minus(p).pow(left))), failed);
            compared++;
        }
        assertEquals(31, compared);
    }

    @Test
    void whereFormulasAreTooLongThatIsTheReason() {
        Model model = ScheduledCases.model("every thousandth", ScheduledCases.ofTheContract().get("every thousandth"));
        Given given = new Given(List.of("all"), Set.of(0, 1, 2), List.of("failed"), Set.of(2));
        ConditionalWhen found = ScheduledConditionalWhen.of(model, given, Outputs.states(model.chain()).subList(0, 1),
                new WhenModel.Asked(When.Condition.Kind.AT_MOST, Rational.HALF, false), each -> { });
        assertFalse(found.isDecided());
        assertEquals(ConditionalLongRun.Kind.FORMULAS_TOO_LONG, found.answers().get(0).longRun().kind());
    }

    @Test
    void besideAValueThatIsNotDecidedNoneIsTheHighest() {
        Value one = Value.of(KnownValue.of(Rational.ONE));
        ConditionalCourse some = ConditionalCourse.of(3, (j, side) -> j == 2 ? Value.NOT_DECIDED : one);
        assertTrue(some.average().isEmpty() && some.highest().isEmpty() && some.lowest().isEmpty());
        ConditionalCourse rest = ConditionalCourse.of(3, (j, side) -> j == 2 ? Value.IMPOSSIBLE : one);
        assertEquals(Optional.of(Rational.ONE), rest.highest().flatMap(each -> each.value().exact()));
    }
}
