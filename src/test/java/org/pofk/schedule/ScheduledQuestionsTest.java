package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Increment;
import org.pofk.answer.Passage;
import org.pofk.answer.PassageMoments;
import org.pofk.answer.Percentile;
import org.pofk.answer.TotalModel;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Costs;
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
import org.pofk.text.RefusedException;

/** Totals, passages and conditions under a schedule against plain stepping with nothing but its matrices. */
class ScheduledQuestionsTest {
    private static final int STEPS = 130;
    private static final String HEAD = """
            pofk: 1
            states: [good, worn, failed]
            start: good
            """;
    private static final String CHAIN = """
            transitions:
              good: {worn: 1/8, good: rest}
              worn: {failed: 1/4, good: 1/16, worn: rest}
              failed: {good: 1/32, failed: rest}
            """;
    private static final String OVERHAUL =
            "actions: {overhaul: {failed: {good: 3/4, failed: rest}, worn: {good: 1/2, worn: rest}}}\n";
    private static final String COSTS = "costs: {unit: EUR, each step in: {good: -1, failed: 5}, at start: 7,"
            + " each overhaul in: {good: 2, worn: 3, failed: 11}%s}\n";
    private static final String MOVES = ", each move: {good: {worn: 4}, worn: {good: 6, failed: 1}}";

    private static Map<String, String> cases() {
        Map<String, String> cases = new LinkedHashMap<>();
        String costs = COSTS.formatted(MOVES);
        cases.put("every step", CHAIN + OVERHAUL + "schedule: {every: 1, do: overhaul}\n" + costs);
        cases.put("every twelfth", CHAIN + OVERHAUL + "schedule: {every: 12, do: overhaul}\n" + costs);
        cases.put("begins late", CHAIN + OVERHAUL + "schedule: {every: 5, first: 13, do: overhaul}\n" + costs);
        cases.put("instead", CHAIN + OVERHAUL
                + "schedule: {every: 4, do: overhaul, when: instead of the step}\n" + costs);
        cases.put("discounted", CHAIN + OVERHAUL + "schedule: {every: 6, do: overhaul}\n"
                + COSTS.formatted(MOVES + ", discount: 1/50"));
        cases.put("staggered", CHAIN + OVERHAUL.replace("}}}", "}}, renew: {failed: {good: 1}}}")
                + "schedule: [{every: 4, first: 2, do: overhaul}, {every: 6, do: renew},"
                + " {every: 12, do: overhaul, when: instead of the step}]\n" + costs);
        String phases = "moves:\n  wet: {good: {worn: 1/2, good: rest}, worn: {failed: 1/2, worn: rest},"
                + " failed: {good: 1/8, worn: 1/8, failed: rest}}\n  dry: {good: {failed: 1/16, worn: 1/16, good: rest},"
                + " worn: {good: 3/8, worn: rest}, failed: {worn: 1/2, failed: rest}}\n"
                + "phases: [{for: 3, use: wet}, {for: 9, use: dry}]\n";
        cases.put("phases with inspections", phases + OVERHAUL + "schedule: {every: 8, do: overhaul}\n"
                + COSTS.formatted(""));
        cases.put("phases once", phases + "repeat: once\n" + "costs: {each step in: {failed: 3}}\n");
        return cases;
    }

    private static Model model(String name, String rest) {
        try {
            return ModelReader.read(Source.ofText(name, HEAD + rest), Optional.empty(), Overrides.NONE);
        } catch (RefusedException e) {
            throw new AssertionError(name + e.faults(), e);
        }
    }

    /** What each step does: the move, where one is made, then the actions with their names. */
    private record Step(Optional<SparseMatrix> move, List<Schedule.Action> actions) {
        static Step of(Model model, int k) {
            Schedule schedule = model.schedule().orElseThrow();
            List<Schedule.Recurring> due = schedule.recurring().stream()
                    .filter(each -> k >= each.first() && (k - each.first()) % each.every() == 0).toList();
            boolean moves = due.stream().allMatch(each -> each.when() == Schedule.When.AFTER_THE_STEP);
            return new Step(moves ? Optional.of(move(model, k)) : Optional.empty(),
                    due.stream().map(Schedule.Recurring::action).toList());
        }

        private static SparseMatrix move(Model model, int k) {
            var phases = model.schedule().orElseThrow().phases();
            if (phases.isEmpty()) {
                return model.chain().matrix();
            }
            List<SparseMatrix> all = phases.get().list().stream()
                    .flatMap(phase -> IntStream.range(0, phase.steps()).mapToObj(i -> phase.matrix())).toList();
            return phases.get().repeat() == Schedule.Repeat.YES ? all.get((k - 1) % all.size())
                    : all.get(Math.min(k, all.size()) - 1);
        }
    }

    private static Rational read(List<Rational> weights, List<Rational> state) {
        return new Output("", weights, Rational.ZERO, "").of(state);
    }

    /** Costs of the steps 0 … k, each as it is due, times the factor to the power k. */
    private static List<Rational> costs(Model model, Rational factor) {
        Costs costs = model.costs().orElseThrow();
        List<Rational> state = model.chain().start();
        Rational total = costs.atStart().plus(read(costs.eachStep(), state));
        List<Rational> totals = new ArrayList<>(List.of(total));
        for (int k = 1; k <= STEPS; k++) {
            Step step = Step.of(model, k);
            Rational due = Rational.ZERO;
            if (step.move.isPresent()) {
                for (Costs.Move move : costs.moves()) {
                    due = due.plus(move.cost().times(state.get(move.from()))
                            .times(step.move.get().at(move.to(), move.from())));
                }
                state = step.move.get().times(state);
            }
            for (Schedule.Action action : step.actions) {
                due = due.plus(read(costs.ofAction(action.name()), state));
                state = action.matrix().times(state);
            }
            total = total.plus(due.plus(read(costs.eachStep(), state)).times(factor.pow(k)));
            totals.add(total);
        }
        return totals;
    }

    /** Moves and actions into the state from the others. */
    private static List<Rational> entries(Model model, int into) {
        List<Rational> state = model.chain().start();
        List<Rational> totals = new ArrayList<>(List.of(Rational.ZERO));
        for (int k = 1; k <= STEPS; k++) {
            Rational total = totals.get(k - 1);
            Step step = Step.of(model, k);
            List<SparseMatrix> all = new ArrayList<>(step.move.stream().toList());
            step.actions.forEach(each -> all.add(each.matrix()));
            for (SparseMatrix matrix : all) {
                for (int from = 0; from < 3; from++) {
                    total = from == into ? total : total.plus(matrix.at(into, from).times(state.get(from)));
                }
                state = matrix.times(state);
            }
            totals.add(total);
        }
        return totals;
    }

    private static final List<Integer> AT = IntStream.rangeClosed(0, STEPS).boxed().toList();

    @Test
    void totalsAndTheirFormulasEqualPlainSteppingWithSums() {
        int compared = 0;
        for (Map.Entry<String, String> each : cases().entrySet()) {
            Model model = model(each.getKey(), each.getValue());
            List<ScheduledTotal.Asked> asked = new ArrayList<>();
            List<List<Rational>> expected = new ArrayList<>();
            for (TotalModel.Asked total : TotalModel.costs(model)) {
                asked.add(new ScheduledTotal.Asked(chain -> Increment.ofCosts(chain, model.costs().orElseThrow()),
                        total.factor()));
                expected.add(costs(model, total.factor()));
            }
            Output failed = Outputs.states(model.chain()).get(2);
            asked.add(new ScheduledTotal.Asked(chain -> Increment.ofEntries(chain, failed), Rational.ONE));
            expected.add(entries(model, 2));
            ScheduledTotalModel found = ScheduledTotalModel.of(model, asked, AT, published -> { });
            assertTrue(found.isDecided());
            for (int i = 0; i < asked.size(); i++) {
                compared += compare(each.getKey(), found.timetable(), found.totals().get(i), expected.get(i));
            }
        }
        assertTrue(compared > 2_000, "compared " + compared);
    }

    private static int compare(String name, Timetable timetable, ScheduledTotal found, List<Rational> expected) {
        int compared = 0;
        for (int k = 0; k <= STEPS; k++) {
            Optional<Rational> exact = found.values().get(k).total().orElseThrow().exact();
            assertEquals(Optional.of(expected.get(k)), exact, name + " at " + k);
            compared++;
        }
        ScheduledTotal.OverCycles over = found.over().orElseThrow();
        for (int m = 0; timetable.before() + (m + 1) * timetable.period() <= STEPS; m++) {
            int k = timetable.before() + m * timetable.period();
            Rational begun = over.total().closedForm().expansion().valueAt(m);
            assertEquals(expected.get(k), begun, name + " in cycle " + m);
            assertEquals(expected.get(k + timetable.period()).minus(begun),
                    over.cycle().closedForm().expansion().valueAt(m), name + " in cycle " + m);
            compared += 2;
        }
        return compared;
    }

    /** P(T ≤ k) by stepping the chain with what has entered the set taken out at once; rounded beyond the first steps. */
    private static List<Rational> entered(Model model, int into) {
        List<Rational> state = new ArrayList<>(model.chain().start());
        Rational entered = state.get(into);
        state.set(into, Rational.ZERO);
        List<Rational> all = new ArrayList<>(List.of(entered));
        for (int k = 1; k <= FAR; k++) {
            Step step = Step.of(model, k);
            List<SparseMatrix> matrices = new ArrayList<>(step.move.stream().toList());
            step.actions.forEach(each -> matrices.add(each.matrix()));
            for (SparseMatrix matrix : matrices) {
                state = new ArrayList<>(matrix.times(state));
                entered = entered.plus(state.get(into));
                state.set(into, Rational.ZERO);
            }
            if (k > STEPS) {
                state = new ArrayList<>(state.stream().map(ScheduledQuestionsTest::shortened).toList());
                entered = shortened(entered);
            }
            all.add(entered);
        }
        return all;
    }

    private static final int FAR = 2_500;
    private static final List<Rational> SHARES = List.of(Rational.of(1, 100), Rational.HALF, Rational.of(9, 10));

    @Test
    void passagesEqualPlainSteppingWhereWhatHasEnteredIsTakenOut() {
        int compared = 0;
        for (Map.Entry<String, String> each : cases().entrySet()) {
            Model model = model(each.getKey(), each.getValue());
            Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
            List<Rational> entered = entered(model, 2);
            ScheduledPassage found = ScheduledPassage.of(model.chain(), timetable, Set.of(2), Set.of(), SHARES, AT);
            for (int k = 0; k <= STEPS; k++) {
                assertEquals(Optional.of(entered.get(k)), found.values().get(k).distribution().exact(), each.getKey());
                assertEquals(Optional.of(Rational.ONE.minus(entered.get(k))), found.values().get(k).survival().exact());
                compared += 2;
            }
            ScheduledPassage.OverCycles over = found.over().orElseThrow();
            for (CycleFormula formula : over.distributions()) {
                int j = formula.place().orElseThrow().j();
                for (int m = 0; timetable.before() + m * timetable.period() + j <= STEPS; m++) {
                    assertEquals(entered.get(timetable.before() + m * timetable.period() + j),
                            formula.closedForm().expansion().valueAt(m), each.getKey());
                    compared++;
                }
            }
            for (Percentile percentile : over.percentiles()) {
                int k = percentile.k().orElseThrow();
                assertTrue(entered.get(k).compareTo(percentile.p()) >= 0, each.getKey());
                assertTrue(k == 0 || entered.get(k - 1).compareTo(percentile.p()) < 0, each.getKey());
            }
            assertMomentsAreSums(each.getKey(), entered, over.moments());
        }
        assertTrue(compared > 2_500, "compared " + compared);
    }

    /** The sums of k f(k) and k² f(k) up to a step beyond which next to nothing is left; nothing of them is negative. */
    private static void assertMomentsAreSums(String name, List<Rational> entered, PassageMoments moments) {
        Rational mean = Rational.ZERO;
        Rational square = Rational.ZERO;
        for (int k = 1; k <= FAR; k++) {
            Rational law = shortened(entered.get(k).minus(entered.get(k - 1)));
            mean = mean.plus(law.times(Rational.of(k)));
            square = square.plus(law.times(Rational.of((long) k * k)));
        }
        Rational tiny = Rational.of(1, 1_000_000);
        assertTrue(moments.isCertain(), name);
        assertTrue(moments.mean().orElseThrow().minus(mean).abs().compareTo(tiny) < 0, name + ": mean "
                + moments.mean().get().approximate() + " and " + mean.approximate());
        Rational variance = square.minus(mean.times(mean));
        assertTrue(moments.variance().orElseThrow().minus(variance).abs().compareTo(tiny) < 0, name + ": variance "
                + moments.variance().get().approximate() + " and " + variance.approximate());
    }

    /** To 200 binary places: sums of a thousand long fractions take minutes. */
    private static Rational shortened(Rational value) {
        return new Rational(value.numerator().shiftLeft(200).divide(value.denominator()),
                java.math.BigInteger.ONE.shiftLeft(200));
    }

    @Test
    void anActionThatDoesNothingLeavesThePassageAsItIs() {
        String chain = "transitions:\n  good: {worn: 1/8, good: rest}\n"
                + "  worn: {failed: 1/4, good: 1/16, worn: rest}\n  failed: {good: 1/32, failed: rest}\n";
        Model model = model("nothing", chain + "actions: {look: {failed: stays}}\n"
                + "schedule: {every: 6, first: 10, do: look}\n");
        Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
        Passage plain = Passage.of(model.chain(), Set.of(2), Set.of(), SHARES, AT);
        ScheduledPassage.OverCycles over = ScheduledPassage.of(model.chain(), timetable, Set.of(2), Set.of(), SHARES,
                AT).over().orElseThrow();
        assertEquals(plain.moments(), over.moments());
        assertEquals(plain.percentiles(), over.percentiles());
        assertEquals(plain.fromEach(), over.fromEach());
    }

    /** p(k) of two states at the end of each step, after what is done there. */
    private static List<List<Rational>> values(Model model) {
        List<Rational> state = model.chain().start();
        List<List<Rational>> all = new ArrayList<>(List.of(state));
        for (int k = 1; k <= STEPS; k++) {
            Step step = Step.of(model, k);
            state = step.move.isPresent() ? step.move.get().times(state) : state;
            for (Schedule.Action action : step.actions) {
                state = action.matrix().times(state);
            }
            all.add(state);
        }
        return all;
    }

    @Test
    void conditionsHoldFromTheStepsSaidOnAndNotBefore() {
        int compared = 0;
        int decided = 0;
        List<Rational> bounds = List.of(Rational.of(1, 50), Rational.of(1, 10), Rational.of(1, 5), Rational.HALF);
        for (Map.Entry<String, String> each : cases().entrySet()) {
            Model model = model(each.getKey(), each.getValue());
            List<List<Rational>> values = values(model);
            for (When.Condition.Kind kind : List.of(When.Condition.Kind.AT_LEAST, When.Condition.Kind.AT_MOST)) {
                for (Rational bound : bounds) {
                    ScheduledWhen found = ScheduledWhen.of(model, Outputs.states(model.chain()),
                            new WhenModel.Asked(kind, bound, false), published -> { });
                    for (int state = 0; state < 3; state++) {
                        int place = state;
                        List<Boolean> met = values.stream().map(all -> kind == When.Condition.Kind.AT_LEAST
                                ? all.get(place).compareTo(bound) >= 0 : all.get(place).compareTo(bound) <= 0).toList();
                        When when = found.answers().get(state).when();
                        decided += when.decided() ? 1 : 0;
                        compared += compare(each.getKey() + " " + kind + " " + bound + " " + state, when, met);
                    }
                }
            }
        }
        assertEquals(cases().size() * 24, decided);
        assertTrue(compared > 10_000, "compared " + compared);
    }

    private static int compare(String name, When when, List<Boolean> met) {
        int first = met.indexOf(true);
        assertEquals(first < 0 ? when.first().filter(k -> k > STEPS) : Optional.of((long) first), when.first(), name);
        when.forEverFrom().filter(from -> from <= STEPS).ifPresent(from -> assertTrue(
                (from == 0 || !met.get((int) (from - 1))) && met.subList(from.intValue(), met.size()).stream()
                        .allMatch(each -> each), name + " for ever from " + from));
        int compared = 0;
        for (When.ResidueClass each : when.classes()) {
            for (long k = each.residue(); k <= STEPS; k += each.modulus()) {
                boolean isMet = met.get((int) k);
                boolean isForEver = each.forEverFrom().isPresent() && k >= each.forEverFrom().get();
                boolean isBeforeTheFirst = each.first().isEmpty() || k < each.first().get();
                assertTrue((!isForEver || isMet) && (!isBeforeTheFirst || !isMet), name + " at " + k);
                compared++;
            }
        }
        return compared;
    }

    @Test
    void anActionThatDoesNothingLeavesConditionsAsTheyAre() {
        String chain = CHAIN.replace("failed: {good: 1/32, failed: rest}", "failed: {good: 1/2, failed: rest}");
        Model model = model("nothing", chain + "actions: {look: {failed: stays}}\n"
                + "schedule: {every: 6, first: 10, do: look}\n");
        List<WhenModel.Asked> all = List.of(
                new WhenModel.Asked(When.Condition.Kind.AT_LEAST, Rational.of(1, 8), false),
                new WhenModel.Asked(When.Condition.Kind.AT_MOST, Rational.of(3, 5), false),
                new WhenModel.Asked(When.Condition.Kind.SETTLED, Rational.of(1, 1000), false),
                new WhenModel.Asked(When.Condition.Kind.SETTLED, Rational.of(1, 100), true));
        for (WhenModel.Asked asked : all) {
            List<WhenModel.Answer> plain = WhenModel.of(model, Outputs.states(model.chain()), asked, published -> { })
                    .answers();
            List<ScheduledWhen.Answer> found = ScheduledWhen.of(model, Outputs.states(model.chain()), asked,
                    published -> { }).answers();
            for (int i = 0; i < 3; i++) {
                assertEquals(plain.get(i).when().first(), found.get(i).when().first());
                assertEquals(plain.get(i).when().forEverFrom(), found.get(i).when().forEverFrom());
                assertEquals(plain.get(i).when().reason(), found.get(i).when().reason());
            }
        }
    }
}
