package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Increment;
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
import org.pofk.schedule.ScheduledWhen.Sides;

/** Totals and conditions under a schedule against plain stepping with nothing but its matrices. */
class ScheduledQuestionsTest {
    private static final int STEPS = 130;

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
            ScheduledCases.Step step = ScheduledCases.Step.of(model, k);
            Rational due = Rational.ZERO;
            if (step.move().isPresent()) {
                for (Costs.Move move : costs.moves()) {
                    due = due.plus(move.cost().times(state.get(move.from()))
                            .times(step.move().get().at(move.to(), move.from())));
                }
                state = step.move().get().times(state);
            }
            for (Schedule.Action action : step.actions()) {
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
            ScheduledCases.Step step = ScheduledCases.Step.of(model, k);
            List<SparseMatrix> all = new ArrayList<>(step.move().stream().toList());
            step.actions().forEach(each -> all.add(each.matrix()));
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
        for (Map.Entry<String, String> each : ScheduledCases.withCosts().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
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

    /** p(k) of two states at the end of each step, after what is done there. */
    private static List<List<Rational>> values(Model model) {
        List<Rational> state = model.chain().start();
        List<List<Rational>> all = new ArrayList<>(List.of(state));
        for (int k = 1; k <= STEPS; k++) {
            ScheduledCases.Step step = ScheduledCases.Step.of(model, k);
            state = step.move().isPresent() ? step.move().get().times(state) : state;
            for (Schedule.Action action : step.actions()) {
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
        for (Map.Entry<String, String> each : ScheduledCases.withCosts().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            List<List<Rational>> values = values(model);
            for (When.Condition.Kind kind : List.of(When.Condition.Kind.AT_LEAST, When.Condition.Kind.AT_MOST)) {
                for (Rational bound : bounds) {
                    ScheduledWhen found = ScheduledWhen.of(model, Outputs.states(model.chain()),
                            new WhenModel.Asked(kind, bound, false), Sides.AFTER, published -> { });
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
        assertEquals(ScheduledCases.withCosts().size() * 24, decided);
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
        String chain = ScheduledCases.CHAIN.replace("failed: {good: 1/32, failed: rest}", "failed: {good: 1/2, failed: rest}");
        Model model = ScheduledCases.model("nothing", chain + "actions: {look: {failed: stays}}\n"
                + "schedule: {every: 6, first: 10, do: look}\n");
        List<WhenModel.Asked> all = List.of(
                new WhenModel.Asked(When.Condition.Kind.AT_LEAST, Rational.of(1, 8), false),
                new WhenModel.Asked(When.Condition.Kind.AT_MOST, Rational.of(3, 5), false),
                new WhenModel.Asked(When.Condition.Kind.SETTLED, Rational.of(1, 1000), false),
                new WhenModel.Asked(When.Condition.Kind.SETTLED, Rational.of(1, 100), true));
        for (WhenModel.Asked asked : all) {
            List<WhenModel.Answer> plain = WhenModel.of(model, Outputs.states(model.chain()), asked, published -> { })
                    .answers();
            List<ScheduledWhen.Answer> found = ScheduledWhen.of(model, Outputs.states(model.chain()), asked, Sides.AFTER,
                    published -> { }).answers();
            for (int i = 0; i < 3; i++) {
                assertEquals(plain.get(i).when().first(), found.get(i).when().first());
                assertEquals(plain.get(i).when().forEverFrom(), found.get(i).when().forEverFrom());
                assertEquals(plain.get(i).when().reason(), found.get(i).when().reason());
            }
        }
    }
}
