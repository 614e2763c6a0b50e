package org.pofk.schedule;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Model;
import org.pofk.chain.Schedule;
import org.pofk.chain.SparseMatrix;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/** Models with schedules that tests of all answers share, and what each step of them does. */
final class ScheduledCases {
    private static final String HEAD = """
            pofk: 1
            states: [good, worn, failed]
            """;
    static final String CHAIN = """
            transitions:
              good: {worn: 1/8, good: rest}
              worn: {failed: 1/4, good: 1/16, worn: rest}
              failed: {good: 1/32, failed: rest}
            """;
    private static final String OVERHAUL =
            "actions: {overhaul: {failed: {good: 3/4, failed: rest}, worn: {good: 1/2, worn: rest}}}\n";
    private static final String STAGGERED = CHAIN + OVERHAUL.replace("}}}", "}}, renew: {failed: {good: 1}}}")
            + "schedule: [{every: 4, first: 2, do: overhaul}, {every: 6, do: renew},"
            + " {every: 12, do: overhaul, when: instead of the step}]\n";
    private static final String COSTS = "costs: {unit: EUR, each step in: {good: -1, failed: 5}, at start: 7,"
            + " each overhaul in: {good: 2, worn: 3, failed: 11}%s}\n";
    private static final String MOVES = ", each move: {good: {worn: 4}, worn: {good: 6, failed: 1}}";


    private ScheduledCases() {
    }

    /** The cases of the contract, by name. */
    static Map<String, String> ofTheContract() {
        Map<String, String> cases = new LinkedHashMap<>();
        cases.put("every step", CHAIN + OVERHAUL + "schedule: {every: 1, do: overhaul}\n");
        cases.put("every twelfth", CHAIN + OVERHAUL + "schedule: {every: 12, do: overhaul}\n");
        cases.put("every thousandth", CHAIN + OVERHAUL + "schedule: {every: 1000, do: overhaul}\n");
        cases.put("begins late", CHAIN + OVERHAUL + "schedule: {every: 5, first: 13, do: overhaul}\n");
        cases.put("begins early", CHAIN + OVERHAUL + "schedule: {every: 7, first: 3, do: overhaul}\n");
        cases.put("instead", CHAIN + OVERHAUL + "schedule: {every: 4, do: overhaul, when: instead of the step}\n");
        cases.put("singular action", CHAIN + "actions: {renew: {worn: {good: 1}, failed: {good: 1}}}\n"
                + "schedule: {every: 6, do: renew}\n");
        cases.put("permutation", CHAIN + "actions: {swap: {good: {worn: 1}, worn: {failed: 1}, failed: {good: 1}}}\n"
                + "schedule: {every: 5, do: swap}\n");
        cases.put("nothing but a permutation", "transitions: {good: stays, worn: stays, failed: stays}\n"
                + "actions: {swap: {good: {worn: 1}, worn: {good: 1}}}\nschedule: {every: 2, do: swap}\n");
        cases.put("staggered", STAGGERED);
        String phases = "moves:\n  wet: {good: {worn: 1/2, good: rest}, worn: {failed: 1/2, worn: rest},"
                + " failed: {good: 1/8, worn: 1/8, failed: rest}}\n  dry: {good: {failed: 1/16, good: rest},"
                + " worn: {good: 3/8, worn: rest}, failed: {worn: 1/2, failed: rest}}\n"
                + "phases: [{for: 3, use: wet}, {for: 9, use: dry}]\n";
        cases.put("phases over and over", phases);
        cases.put("phases once", phases + "repeat: once\n");
        cases.put("phases with inspections", phases + OVERHAUL + "schedule: {every: 8, do: overhaul}\n");
        cases.put("absorbing", "transitions: {good: {worn: 1/8, failed: 1/64, good: rest},"
                + " worn: {failed: 1/16, worn: rest}, failed: stays}\n"
                + "actions: {look: {worn: {good: 3/4, worn: rest}}}\nschedule: {every: 3, do: look}\n");
        return cases;
    }

    /** Some of them with costs. */
    static Map<String, String> withCosts() {
        Map<String, String> cases = new LinkedHashMap<>();
        String costs = COSTS.formatted(MOVES);
        cases.put("every step", CHAIN + OVERHAUL + "schedule: {every: 1, do: overhaul}\n" + costs);
        cases.put("every twelfth", CHAIN + OVERHAUL + "schedule: {every: 12, do: overhaul}\n" + costs);
        cases.put("begins late", CHAIN + OVERHAUL + "schedule: {every: 5, first: 13, do: overhaul}\n" + costs);
        cases.put("instead", CHAIN + OVERHAUL
                + "schedule: {every: 4, do: overhaul, when: instead of the step}\n" + costs);
        cases.put("discounted", CHAIN + OVERHAUL + "schedule: {every: 6, do: overhaul}\n"
                + COSTS.formatted(MOVES + ", discount: 1/50"));
        cases.put("staggered", STAGGERED + costs);
        String phases = "moves:\n  wet: {good: {worn: 1/2, good: rest}, worn: {failed: 1/2, worn: rest},"
                + " failed: {good: 1/8, worn: 1/8, failed: rest}}\n  dry: {good: {failed: 1/16, worn: 1/16, good: rest},"
                + " worn: {good: 3/8, worn: rest}, failed: {worn: 1/2, failed: rest}}\n"
                + "phases: [{for: 3, use: wet}, {for: 9, use: dry}]\n";
        cases.put("phases with inspections", phases + OVERHAUL + "schedule: {every: 8, do: overhaul}\n"
                + COSTS.formatted(""));
        cases.put("phases once", phases + "repeat: once\n" + "costs: {each step in: {failed: 3}}\n");
        return cases;
    }

    /** Starts in good where the rest doesn't begin otherwise. */
    static Model model(String name, String rest) {
        try {
            return ModelReader.read(Source.ofText(name, HEAD + (rest.startsWith("start:") ? "" : "start: good\n") + rest), Optional.empty(), Overrides.NONE);
        } catch (RefusedException e) {
            throw new AssertionError(name + e.faults(), e);
        }
    }

    /** What each step does: the move, where one is made, then the actions with their names. */
    record Step(Optional<SparseMatrix> move, List<Schedule.Action> actions) {
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
}
