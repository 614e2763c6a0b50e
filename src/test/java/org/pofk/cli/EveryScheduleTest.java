package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Gauss;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.chain.Schedule;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;

/** When, asked on every side of each state of every scheduled model: against stepping its moves and actions. */
class EveryScheduleTest {
    private static final int LAST = 60;

    /** The states before and after what is done at each step. */
    private record Sided(List<List<Rational>> before, List<List<Rational>> after) {
        static Sided of(Model model) {
            List<List<Rational>> before = new ArrayList<>(List.of(model.chain().start()));
            List<List<Rational>> after = new ArrayList<>(before);
            for (int k = 1; k <= LAST; k++) {
                int step = k;
                List<Schedule.Recurring> due = model.schedule().orElseThrow().recurring().stream()
                        .filter(each -> step >= each.first() && (step - each.first()) % each.every() == 0).toList();
                boolean moves = due.stream().allMatch(each -> each.when() == Schedule.When.AFTER_THE_STEP);
                List<Rational> state = after.get(k - 1);
                state = moves ? times(move(model, k), state) : state;
                before.add(state);
                for (Schedule.Recurring each : due) {
                    state = times(each.action().matrix(), state);
                }
                after.add(state);
            }
            return new Sided(before, after);
        }

        private static SparseMatrix move(Model model, int k) {
            return model.schedule().orElseThrow().phases().map(phases -> phases.list().stream()
                    .flatMap(phase -> IntStream.range(0, phase.steps()).mapToObj(i -> phase.matrix())).toList())
                    .map(all -> all.get((k - 1) % all.size())).orElse(model.chain().matrix());
        }

        private static List<Rational> times(SparseMatrix matrix, List<Rational> state) {
            return IntStream.range(0, state.size()).mapToObj(i -> Gauss.dot(IntStream.range(0, state.size())
                    .mapToObj(j -> matrix.at(i, j)).toList(), state)).toList();
        }

        boolean holds(String side, int k, int state, IntPredicate sign, Rational bound) {
            return (side.equals("after") || sign.test(before.get(k).get(state).compareTo(bound)))
                    && (side.equals("before") || sign.test(after.get(k).get(state).compareTo(bound)));
        }
    }

    private static List<Path> files() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("test-data", "scheduled"))) {
            return files.sorted().toList();
        }
    }

    @Test
    void atLeastAndAtMostOnEverySide() throws Exception {
        int asked = 0;
        Set<String> reasons = new TreeSet<>();
        for (Path file : files()) {
            Model model = ModelReader.read(Source.ofText(file.toString(), Files.readString(file)), Optional.empty(),
                    Overrides.NONE);
            Sided steps = Sided.of(model);
            int state = model.chain().size() - 1;
            String name = Outputs.states(model.chain()).get(state).name();
            Rational touched = steps.after().get(7).get(state);
            for (String side : List.of("before", "after", "both")) {
                for (String option : List.of("--at-least", "--at-most")) {
                    IntPredicate sign = option.equals("--at-least") ? s -> s >= 0 : s -> s <= 0;
                    JsonNode found = AskedPattern.ask(file, "when", "--of", name, option, touched.toString(),
                            "--side", side);
                    assertEquals(side, found.get("side").asText());
                    EveryConditionTest.assertWithin(LAST, found,
                            k -> steps.holds(side, k, state, sign, touched), file + side + option + touched);
                    reasons.add(found.get("reason").asText());
                    asked++;
                }
            }
        }
        assertEquals(6 * files().size(), asked);
        assertTrue(asked >= 42 && reasons.size() >= 3, asked + " asked: " + reasons);
    }
}
