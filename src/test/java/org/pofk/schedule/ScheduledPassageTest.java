package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Passage;
import org.pofk.answer.Percentile;
import org.pofk.chain.Model;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.schedule.ScheduledPassage.At;
import org.pofk.schedule.ScheduledWait.Ever;
import org.pofk.steps.KnownValue;

/** First passages under a schedule against plain stepping in which what has entered the set is taken out at once. */
class ScheduledPassageTest {
    private static final int STEPS = 130;
    private static final int FAR = 2_500;
    private static final List<Integer> AT = IntStream.rangeClosed(0, STEPS).boxed().toList();
    private static final List<Rational> SHARES = List.of(Rational.of(1, 100), Rational.HALF, Rational.of(9, 10));
    private static final int FAILED = 2;
    private static final int BITS = 512;

    private static Map<String, String> cases() {
        Map<String, String> cases = new TreeMap<>(ScheduledCases.withCosts());
        ScheduledCases.ofTheContract().forEach(cases::putIfAbsent);
        cases.remove("every thousandth");
        return cases;
    }

    private static ScheduledPassage passage(Model model, List<Integer> steps) {
        return ScheduledPassage.of(model.chain(), timetable(model), Set.of(FAILED), Set.of(), SHARES, steps,
                published -> { });
    }

    private static Timetable timetable(Model model) {
        return Timetable.of(model.chain(), model.schedule().orElseThrow());
    }

    private static List<SparseMatrix> matrices(Model model, int k) {
        ScheduledCases.Step step = ScheduledCases.Step.of(model, k);
        List<SparseMatrix> matrices = new ArrayList<>(step.move().stream().toList());
        step.actions().forEach(each -> matrices.add(each.matrix()));
        return matrices;
    }

    /** P(T ≤ k) for k = from … last, where it is in {@code state} at the end of that step; rounded beyond the first steps. */
    private static List<Rational> entered(Model model, List<Rational> start, int last) {
        List<Rational> state = new ArrayList<>(start);
        Rational entered = state.get(FAILED);
        state.set(FAILED, Rational.ZERO);
        List<Rational> all = new ArrayList<>(List.of(entered));
        for (int k = 1; k <= last; k++) {
            for (SparseMatrix matrix : matrices(model, k)) {
                state = new ArrayList<>(matrix.times(state));
                entered = entered.plus(state.get(FAILED));
                state.set(FAILED, Rational.ZERO);
            }
            if (k > STEPS) {
                state = new ArrayList<>(state.stream().map(ScheduledPassageTest::shortened).toList());
                entered = shortened(entered);
            }
            all.add(entered);
        }
        return all;
    }

    /** To 200 binary places: sums of a thousand long fractions take minutes. */
    private static Rational shortened(Rational value) {
        return new Rational(value.numerator().shiftLeft(200).divide(value.denominator()), BigInteger.ONE.shiftLeft(200));
    }

    @Test
    void lawDistributionSurvivalAndHazardEqualPlainStepping() {
        int compared = 0;
        for (Map.Entry<String, String> each : cases().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            List<Rational> entered = entered(model, model.chain().start(), STEPS);
            List<At> values = passage(model, AT).values();
            for (int k = 0; k <= STEPS; k++) {
                At at = values.get(k);
                Rational waiting = k == 0 ? Rational.ONE : Rational.ONE.minus(entered.get(k - 1));
                Rational law = k == 0 ? entered.get(0) : entered.get(k).minus(entered.get(k - 1));
                assertEquals(Optional.of(entered.get(k)), at.distribution().exact(), each.getKey());
                assertEquals(Optional.of(Rational.ONE.minus(entered.get(k))), at.survival().exact(), each.getKey());
                assertEquals(Optional.of(law), at.law().exact(), each.getKey());
                assertEquals(waiting.isZero() ? Optional.empty() : Optional.of(law.dividedBy(waiting)),
                        at.hazard().flatMap(KnownValue::exact), each.getKey());
                compared += 4;
            }
        }
        assertEquals(cases().size() * (STEPS + 1) * 4, compared);
    }

    @Test
    void formulasOverTheCyclesEqualPlainStepping() {
        int compared = 0;
        for (Map.Entry<String, String> each : cases().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            Timetable timetable = timetable(model);
            List<Rational> entered = entered(model, model.chain().start(), STEPS);
            ScheduledPassage.OverCycles over = passage(model, List.of(STEPS - 1)).over().orElseThrow();
            for (int m = 0; timetable.before() + (m + 1) * timetable.period() <= STEPS; m++) {
                int from = timetable.before() + m * timetable.period();
                for (CycleFormula law : over.laws()) {
                    int k = from + law.place().orElseThrow().j();
                    assertEquals(entered.get(k).minus(entered.get(k - 1)), at(law, m), each.getKey() + " at " + k);
                    compared++;
                }
                for (CycleFormula distribution : over.distributions()) {
                    assertEquals(entered.get(from + distribution.place().orElseThrow().j()), at(distribution, m));
                    compared++;
                }
                for (CycleFormula survival : over.survivals()) {
                    assertEquals(Rational.ONE.minus(entered.get(from + survival.place().orElseThrow().j())),
                            at(survival, m));
                    compared++;
                }
            }
        }
        assertTrue(compared > 1_500, "compared " + compared);
    }

    private static Rational at(CycleFormula formula, int m) {
        return formula.closedForm().expansion().valueAt(m);
    }

    @Test
    void percentilesAreTheFirstStepsAndMomentsAreSums() {
        for (Map.Entry<String, String> each : ScheduledCases.withCosts().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            List<Rational> entered = entered(model, model.chain().start(), FAR);
            ScheduledPassage found = passage(model, List.of());
            for (Percentile percentile : found.percentiles()) {
                int k = percentile.k().orElseThrow();
                assertTrue(entered.get(k).compareTo(percentile.p()) >= 0, each.getKey());
                assertTrue(k == 0 || entered.get(k - 1).compareTo(percentile.p()) < 0, each.getKey());
            }
            assertMomentsAreSums(each.getKey(), entered, found.entrance().orElseThrow().first());
        }
    }

    /** The sums of k f(k) and k² f(k) up to a step beyond which next to nothing is left; nothing of them is negative. */
    private static void assertMomentsAreSums(String name, List<Rational> entered, ScheduledWait wait) {
        Rational mean = Rational.ZERO;
        Rational square = Rational.ZERO;
        for (int k = 1; k < entered.size(); k++) {
            Rational law = shortened(entered.get(k).minus(entered.get(k - 1)));
            mean = mean.plus(law.times(Rational.of(k)));
            square = square.plus(law.times(Rational.of((long) k * k)));
        }
        assertEquals(Ever.CERTAIN, wait.ever(), name);
        assertNear(name, mean, wait.mean().flatMap(KnownValue::exact).orElseThrow());
        assertNear(name, square.minus(mean.times(mean)), wait.variance().flatMap(KnownValue::exact).orElseThrow());
    }

    private static void assertNear(String name, Rational expected, Rational found) {
        assertTrue(found.minus(expected).abs().compareTo(Rational.of(1, 1_000_000)) < 0,
                name + ": " + found.approximate() + " and " + expected.approximate());
    }

    /** From failed: the first thing that happens in step 1 may leave it; then T as from any state, one step on. */
    @Test
    void returnsEqualPlainSteppingFromTheFirstMoveOn() {
        int compared = 0;
        for (Map.Entry<String, String> each : ScheduledCases.withCosts().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), "start: failed\n" + each.getValue());
            List<Rational> state = model.chain().start();
            Rational mean = Rational.ZERO;
            Rational back = Rational.ZERO;
            boolean isLeaving = true;
            for (int k = 1; k <= FAR; k++) {
                Rational now = Rational.ZERO;
                for (SparseMatrix matrix : matrices(model, k)) {
                    if (!isLeaving) {
                        state = new ArrayList<>(state);
                        state.set(FAILED, Rational.ZERO);
                    }
                    isLeaving = false;
                    state = new ArrayList<>(matrix.times(state).stream().map(ScheduledPassageTest::shortened).toList());
                    now = now.plus(state.get(FAILED));
                }
                back = back.plus(now);
                mean = mean.plus(now.times(Rational.of(k)));
            }
            ScheduledWait found = passage(model, List.of()).entrance().orElseThrow().back().orElseThrow();
            assertNear(each.getKey(), back, found.probability().exact().orElseThrow());
            assertNear(each.getKey(), mean, found.mean().flatMap(KnownValue::exact).orElseThrow());
            compared++;
        }
        assertEquals(ScheduledCases.withCosts().size(), compared);
    }

    /** What stands between bounds for cycles too long for formulas encloses what is exact. */
    @Test
    void theBoundedWayEnclosesTheExactOne() {
        int compared = 0;
        for (Map.Entry<String, String> each : cases().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            for (Set<Integer> avoiding : List.of(Set.<Integer>of(), Set.of(1))) {
                StoppedSchedule stopped = StoppedSchedule.of(model.chain(), timetable(model), Set.of(FAILED), avoiding);
                ScheduledChain chain = ScheduledChain.of(model.chain(), timetable(model));
                ScheduledEntrance exact = ScheduledEntrance.of(stopped, timetable(model),
                        BackwardExactly.of(stopped.chain())).orElseThrow();
                BackwardBounded bounds = BackwardBounded.of(stopped.chain().timetable());
                ScheduledEntrance bounded = ScheduledEntrance.of(stopped, timetable(model), bounds).orElseThrow();
                compared += compare(each.getKey(), exact.first(), bounded.first());
                for (int state = 0; state < 3; state++) {
                    compared += compare(each.getKey(), exact.fromEach().get(state), bounded.fromEach().get(state));
                }
                ScheduledVisits visits = ScheduledVisits.of(chain, stopped.distribution().coefficients(),
                        BackwardExactly.of(chain)).orElseThrow();
                ScheduledVisits between = ScheduledVisits.of(chain, stopped.distribution().coefficients(),
                        BackwardBounded.of(chain.timetable())).orElseThrow();
                assertEquals(visits.steps().isPresent(), between.steps().isPresent(), each.getKey());
                visits.steps().ifPresent(steps -> assertEncloses(each.getKey(), steps, between.steps().orElseThrow()));
                BoundedPercentiles finder = new BoundedPercentiles(stopped, exact.first());
                ScheduledPercentiles byFormulas = new ScheduledPercentiles(stopped,
                        exact.first().probability().exact().orElseThrow());
                for (Rational share : List.of(Rational.of(1, 100), Rational.HALF, Rational.of(99, 100), Rational.ONE)) {
                    assertEquals(byFormulas.of(share), finder.of(share), each.getKey());
                    compared++;
                }
            }
        }
        assertTrue(compared > 400, "compared " + compared);
    }

    private static int compare(String name, ScheduledWait exact, ScheduledWait bounded) {
        Rational probability = exact.probability().exact().orElseThrow();
        assertEquals(probability.isOne() ? Ever.CERTAIN : probability.isZero() ? Ever.NEVER : Ever.PERHAPS,
                bounded.ever(), name);
        assertEncloses(name, exact.probability(), bounded.probability());
        exact.mean().ifPresent(mean -> assertEncloses(name, mean, bounded.mean().orElseThrow()));
        exact.variance().ifPresent(variance -> assertEncloses(name, variance, bounded.variance().orElseThrow()));
        return 3;
    }

    private static void assertEncloses(String name, KnownValue exact, KnownValue bounded) {
        Ball ball = bounded.enclosure().enclose(0);
        Rational value = exact.exact().orElseThrow();
        assertTrue(bounded.exact().equals(exact.exact()) || ball.contains(value), name);
        assertTrue(bounded.exact().isPresent() || ball.upper().minus(ball.lower()).times(Rational.of(10).pow(40))
                .compareTo(Rational.ONE) < 0, name + ": too wide");
    }

    @Test
    void theBoundedDecayIsThatOfTheFormulas() {
        int compared = 0;
        for (Map.Entry<String, String> each : cases().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            StoppedSchedule stopped = StoppedSchedule.of(model.chain(), timetable(model), Set.of(FAILED), Set.of());
            Ball bounded = CycleDecay.of(BackwardBounded.of(stopped.chain().timetable()).cycle(),
                    CycleGraph.of(stopped.chain().timetable(), model.chain().start()),
                    EntranceGraph.of(stopped).open()).orElseThrow();
            KnownValue factor = passage(model, List.of()).decay().orElseThrow().perCycle();
            assertTrue(factor.enclosure().enclose(200).overlaps(bounded), each.getKey());
            compared++;
        }
        assertEquals(cases().size(), compared);
    }

    @Test
    void anActionThatDoesNothingLeavesThePassageAsItIs() {
        Model model = ScheduledCases.model("nothing", ScheduledCases.CHAIN + "actions: {look: {failed: stays}}\n"
                + "schedule: {every: 6, first: 10, do: look}\n");
        for (Set<Integer> avoiding : List.of(Set.<Integer>of(), Set.of(1))) {
            Passage plain = Passage.of(model.chain(), Set.of(FAILED), avoiding, SHARES, AT);
            ScheduledPassage found = ScheduledPassage.of(model.chain(), timetable(model), Set.of(FAILED), avoiding,
                    SHARES, AT, published -> { });
            ScheduledEntrance entrance = found.entrance().orElseThrow();
            assertEquals(plain.moments().probability(), entrance.first().probability().exact().orElseThrow());
            assertEquals(plain.moments().mean(), entrance.first().mean().flatMap(KnownValue::exact));
            assertEquals(plain.moments().variance(), entrance.first().variance().flatMap(KnownValue::exact));
            assertEquals(plain.percentiles(), found.percentiles());
            assertEquals(plain.fromEach().means(), entrance.fromEach().stream()
                    .map(each -> each.mean().flatMap(KnownValue::exact)).toList());
            assertEquals(plain.visits(), found.visits().orElseThrow().steps().flatMap(KnownValue::exact));
            assertEquals(plain.hazards().stream().map(Passage.Hazard::value).toList(),
                    found.values().stream().map(each -> each.hazard().flatMap(KnownValue::exact)).toList());
        }
    }

    /** (1 − qᴺ)/p + qᴺ/r, q = 1 − p, where a step fails with p until N and with r from there on. */
    @Test
    void longPreambleIsEnclosedAndNoStepOfItIsMissing() {
        int steps = 20_000;
        Rational early = Rational.of(1, 1 << 14);
        Rational late = Rational.of(1, 1 << 12);
        Model model = ScheduledCases.model("long preamble", """
                moves:
                  early: {good: {failed: 1/16384, good: rest}, worn: stays, failed: stays}
                  late: {good: {failed: 1/4096, good: rest}, worn: stays, failed: stays}
                phases: [{for: 20000, use: early}, {for: 1, use: late}]
                repeat: once
                """);
        ScheduledPassage passage = passage(model, List.of(100, 15_000, 30_000));
        Rational left = Rational.ONE.minus(early).pow(steps);
        assertEquals(ScheduledPassage.Formulas.TOO_LONG, passage.formulas());
        assertHolds(Rational.ONE.minus(left).dividedBy(early).plus(left.dividedBy(late)),
                passage.entrance().orElseThrow().first().mean().orElseThrow());
        assertHolds(Rational.ONE.minus(early).pow(100), passage.values().get(0).survival());
        assertHolds(Rational.ONE.minus(early).pow(15_000), passage.values().get(1).survival());
        assertHolds(left.times(Rational.ONE.minus(late).pow(10_000)), passage.values().get(2).survival());
    }

    @Test
    void allOfItHasHappenedWhereMovesAndActionsLeaveNothingThatWaits() {
        String pushed = "transitions: {good: stays, worn: stays, failed: stays}\n"
                + "actions: {push: {good: {worn: 1}, worn: {failed: 1}}}\n";
        assertEquals(OptionalInt.of(14), all(pushed + "schedule: {every: 7, do: push}\n").k());
        assertEquals(OptionalInt.of(10), all(pushed + "schedule: {every: 7, first: 3, do: push}\n").k());
        assertEquals(OptionalInt.of(5), all(pushed + "schedule: {every: 3, first: 2, do: push}\n").k());
        assertEquals(Optional.of(Percentile.Reason.NEVER),
                all(ScheduledCases.ofTheContract().get("every twelfth")).reason());
    }

    /** The step by which it has happened with probability 1. */
    private static Percentile all(String rest) {
        Model model = ScheduledCases.model("all", rest);
        StoppedSchedule stopped = StoppedSchedule.of(model.chain(), timetable(model), Set.of(FAILED), Set.of());
        ScheduledWait wait = ScheduledEntrance.of(stopped, timetable(model),
                BackwardBounded.of(stopped.chain().timetable())).orElseThrow().first();
        return new BoundedPercentiles(stopped, wait).of(Rational.ONE);
    }

    private static void assertHolds(Rational expected, KnownValue found) {
        Ball ball = found.enclosure().enclose(BITS);
        assertTrue(ball.lower().compareTo(expected) <= 0 && expected.compareTo(ball.upper()) <= 0, ball::toString);
        assertTrue(ball.upper().minus(ball.lower()).compareTo(Rational.TWO.pow(-100)) < 0, ball::toString);
    }
}
