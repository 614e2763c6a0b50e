package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Increment;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/** Totals between bounds enclose the exact ones, which plain stepping has confirmed. */
class BoundedTotalTest {
    private static final List<Integer> AT = List.of(0, 1, 4, 5, 13, 26, 77, 130);

    @Test
    void boundsEncloseValuesLongRunAndEverything() {
        int compared = 0;
        for (Map.Entry<String, String> each : ScheduledCases.withCosts().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
            for (TotalModel.Asked total : TotalModel.costs(model)) {
                compared += compare(each.getKey(), model, timetable, new ScheduledTotal.Asked(chain ->
                        Increment.ofCosts(chain, model.costs().orElseThrow()), total.factor()));
            }
            compared += compare(each.getKey(), model, timetable, new ScheduledTotal.Asked(chain ->
                    Increment.ofEntries(chain, Outputs.states(model.chain()).get(2)), Rational.ONE));
        }
        assertEquals((2 * ScheduledCases.withCosts().size() + 1) * (AT.size() + 1), compared);
    }

    private static int compare(String name, Model model, Timetable timetable, ScheduledTotal.Asked asked) {
        ScheduledTotal exact = ScheduledTotal.of(model, timetable, asked, AT, partly -> { });
        BoundedTotal bounded = BoundedTotal.of(model.chain(), timetable,
                ScheduledIncrement.of(model.chain(), timetable, asked.increment(), model.costs()), asked.factor());
        IntStream.range(0, AT.size()).forEach(i -> assertEncloses(name + " at " + AT.get(i),
                exact.values().get(i).total().flatMap(KnownValue::exact).orElseThrow(), bounded.at(AT.get(i))));
        ScheduledTotal.OverCycles over = exact.over().orElseThrow();
        if (asked.factor().isOne()) {
            assertEncloses(name, over.growth().perStep(), bounded.perCycle().orElseThrow());
        } else {
            assertEncloses(name, over.growth().everything().orElseThrow(), bounded.everything().orElseThrow());
        }
        return AT.size() + 1;
    }

    private static void assertEncloses(String name, Rational exact, KnownValue bounded) {
        Ball ball = bounded.enclosure().enclose(0);
        assertTrue(ball.contains(exact), name);
        assertTrue(ball.upper().minus(ball.lower()).times(Rational.of(10).pow(20)).compareTo(Rational.ONE) < 0,
                name + ": too wide");
    }

    /** As without a schedule: entries are made in the steps 1 … k, all else counts k = 0 too. */
    @Test
    void averagesAreOverTheStepsThatCount() {
        Model model = ScheduledCases.model("every sixth", ScheduledCases.CHAIN
                + "actions: {look: {failed: stays}}\nschedule: {every: 6, do: look}\n");
        Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
        for (boolean isEntries : List.of(true, false)) {
            ScheduledTotal total = ScheduledTotal.of(model, timetable, new ScheduledTotal.Asked(chain -> isEntries
                    ? Increment.ofEntries(chain, Outputs.states(chain).get(2))
                    : Increment.ofOutput(Outputs.states(chain).get(2)), Rational.ONE), List.of(0, 10), partly -> { });
            assertEquals(isEntries, total.values().get(0).average().isEmpty());
            Rational at = total.values().get(1).total().flatMap(KnownValue::exact).orElseThrow();
            assertEquals(at.dividedBy(Rational.of(isEntries ? 10 : 11)),
                    total.values().get(1).average().flatMap(KnownValue::exact).orElseThrow());
        }
    }
}
