package org.pofk.schedule;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.chain.Model;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/**
 * Small models with a schedule, of two to four states: moves that are sparse or turn in a circle, actions that are any
 * matrix, singular or a permutation, phases over and over or once, late first actions, cycles of 1 to 6 steps.
 */
final class RandomSchedules {
    private static final int SIZES = 3;
    private final Random random;

    RandomSchedules(long seed) {
        this.random = new Random(seed);
    }

    Model next() {
        int size = 2 + random.nextInt(SIZES);
        boolean hasPhases = random.nextInt(3) == 0;
        boolean hasActions = !hasPhases || random.nextBoolean();
        String text = "pofk: 1\nstates: [" + IntStream.range(0, size).mapToObj(i -> "s" + i)
                .collect(Collectors.joining(", ")) + "]\nstart: s" + random.nextInt(size) + "\n"
                + (hasPhases ? phases(size) : "transitions: " + matrix(size, random.nextInt(4)) + "\n")
                + (hasActions ? actions(size, hasPhases ? 2 : 6) : "");
        try {
            return ModelReader.read(Source.ofText("random", text), Optional.empty(), Overrides.NONE);
        } catch (RefusedException e) {
            throw new AssertionError(text + e.faults(), e);
        }
    }

    private String phases(int size) {
        return "moves: {wet: " + matrix(size, random.nextInt(4)) + ", dry: " + matrix(size, random.nextInt(4))
                + "}\nphases: [{for: " + (1 + random.nextInt(2)) + ", use: wet}, {for: " + (1 + random.nextInt(2))
                + ", use: dry}]\nrepeat: " + (random.nextBoolean() ? "yes" : "once") + "\n";
    }

    private String actions(int size, int longest) {
        int every = 1 + random.nextInt(longest);
        String first = random.nextInt(3) == 0 ? ", first: " + (1 + random.nextInt(8)) : "";
        String when = every > 1 && random.nextInt(3) == 0 ? ", when: instead of the step" : "";
        return "actions: {mend: " + matrix(size, random.nextInt(4)) + "}\nschedule: {every: " + every + first
                + ", do: mend" + when + "}\n";
    }

    /** Kinds 0 and 1 any, 2 a permutation, 3 singular: two states lead to the same. */
    private String matrix(int size, int kind) {
        List<Integer> order = new ArrayList<>(IntStream.range(0, size).boxed().toList());
        Collections.shuffle(order, random);
        List<String> rows = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            int to = kind == 3 && i == 1 ? order.get(0) : order.get(i);
            int other = random.nextInt(size);
            String half = random.nextInt(3) == 0 || other == to ? "s" + to + ": 1"
                    : "s" + to + ": " + (1 + random.nextInt(6)) + "/7, s" + other + ": rest";
            rows.add("s" + i + ": {" + (kind >= 2 ? "s" + to + ": 1" : half) + "}");
        }
        return "{" + String.join(", ", rows) + "}";
    }
}
