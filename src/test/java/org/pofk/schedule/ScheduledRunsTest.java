package org.pofk.schedule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.pofk.answer.BinomialInterval;
import org.pofk.answer.Increment;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/** First passages and entries under a schedule held against runs at random, move by move and action by action. */
class ScheduledRunsTest {
    private static final long SEED = 20_261_201L;
    private static final int RUNS = 4_000;
    private static final int LAST = 40;
    private static final int FAILED = 2;

    /** The step of the first entrance, above {@value #LAST} where there is none by then, and how many entries there are. */
    private record Run(int first, int entries) {
        static Run of(Model model, List<ScheduledCases.Step> steps, Random random) {
            int state = model.chain().start().indexOf(Rational.ONE);
            int first = LAST + 1;
            int entries = 0;
            for (int k = 1; k <= LAST; k++) {
                List<SparseMatrix> matrices = new ArrayList<>(steps.get(k - 1).move().stream().toList());
                steps.get(k - 1).actions().forEach(action -> matrices.add(action.matrix()));
                for (SparseMatrix matrix : matrices) {
                    int next = next(matrix, state, random);
                    entries += next == FAILED && state != FAILED ? 1 : 0;
                    first = next == FAILED ? Math.min(first, k) : first;
                    state = next;
                }
            }
            return new Run(first, entries);
        }

        private static int next(SparseMatrix matrix, int state, Random random) {
            double left = random.nextDouble();
            List<SparseMatrix.Entry> column = matrix.columns().get(state);
            for (SparseMatrix.Entry entry : column) {
                left -= entry.value().approximate();
                if (left < 0) {
                    return entry.row();
                }
            }
            return column.get(column.size() - 1).row();
        }
    }

    /** 99.9 % intervals of 32 shares: more than one miss would be a thousandfold surprise. */
    @Test
    void runsAtRandomEnterWhenAndAsOftenAsTheAnswersSay() {
        Random random = new Random(SEED);
        List<Integer> at = List.of(4, 12, 20, LAST);
        int inside = 0;
        int asked = 0;
        for (Map.Entry<String, String> each : ScheduledCases.withCosts().entrySet()) {
            Model model = ScheduledCases.model(each.getKey(), each.getValue());
            Timetable timetable = Timetable.of(model.chain(), model.schedule().orElseThrow());
            List<ScheduledCases.Step> steps = new ArrayList<>();
            for (int k = 1; k <= LAST; k++) {
                steps.add(ScheduledCases.Step.of(model, k));
            }
            List<Run> runs = new ArrayList<>();
            for (int i = 0; i < RUNS; i++) {
                runs.add(Run.of(model, steps, random));
            }
            ScheduledPassage passage = ScheduledPassage.of(model.chain(), timetable, Set.of(FAILED), Set.of(),
                    List.of(Rational.HALF), at, partly -> { });
            for (int i = 0; i < at.size(); i++) {
                int k = at.get(i);
                BinomialInterval interval = BinomialInterval.of(runs.stream().filter(run -> run.first <= k).count(), RUNS,
                        0.999);
                double share = passage.values().get(i).distribution().enclosure().enclose(60).middle().approximate();
                inside += interval.lower() <= share && share <= interval.upper() ? 1 : 0;
                asked++;
            }
            assertEntries(each.getKey(), model, timetable, runs);
        }
        assertEquals(4 * ScheduledCases.withCosts().size(), asked);
        assertTrue(inside >= asked - 1, inside + " of " + asked + " inside");
    }

    /** The mean of the runs within four standard errors of the total. */
    private static void assertEntries(String name, Model model, Timetable timetable, List<Run> runs) {
        ScheduledTotal total = ScheduledTotal.of(model, timetable, new ScheduledTotal.Asked(chain ->
                Increment.ofEntries(chain, Outputs.states(chain).get(FAILED)), Rational.ONE), List.of(LAST),
                partly -> { });
        double expected = total.values().get(0).total().map(KnownValue::enclosure).orElseThrow().enclose(60).middle()
                .approximate();
        double mean = runs.stream().mapToInt(Run::entries).average().orElseThrow();
        double variance = runs.stream().mapToDouble(run -> (run.entries - mean) * (run.entries - mean)).sum() / (RUNS - 1);
        assertTrue(Math.abs(mean - expected) <= 4 * Math.sqrt(variance / RUNS), name + ": " + mean + ", not " + expected);
    }
}
