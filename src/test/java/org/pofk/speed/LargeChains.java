package org.pofk.speed;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.function.IntFunction;

/**
 * Invented chains of any size as the trade meets them, each a whole model file: the state set "failed", an output
 * "lost" and costs. The same file every time.
 */
public enum LargeChains {
    /** n − 1 units that fail, three crews that mend: one unit down at a time goes up or down. */
    BIRTH_DEATH("Standby pumps and three repair crews", size -> moves(size, i -> {
        Moves moves = new Moves();
        moves.add(i + 1, i + 1 < size, 3 * (size - 1 - i), 10 * size);
        moves.add(i - 1, i > 0, Math.min(i, 3) * 6, 100);
        return moves;
    })),
    /** From every grade into every other one. */
    DENSE("Blend grades of a mixing plant", size -> moves(size, i -> {
        Random random = new Random(7 * size + i);
        Moves moves = new Moves();
        for (int j = 0; j < size; j++) {
            moves.add(j, j != i, 1 + random.nextInt(19), 20 * size);
        }
        return moves;
    })),
    /** A line that wears by a grade or two and is renewed from its worse half, seldom or for certain. */
    WEAR("Lining that wears and is renewed", size -> moves(size, i -> {
        Moves moves = new Moves();
        moves.add(i + 1, i + 1 < size, 60 + 3 * i % 97, 1000);
        moves.add(i + 2, i + 2 < size, 7 + i % 11, 1000);
        moves.add(0, 2 * i >= size, 2 + i % 5, 1000);
        moves.add(i / 2, i + 1 == size, 1, 5);
        return moves;
    })),
    /** Two fifths are passed through; what is entered for good is one of three closed classes. */
    BLOCKS("Batches that end in one of three lines", size -> moves(size, i -> {
        int line = size / 5;
        Moves moves = new Moves();
        if (i < size - 3 * line) {
            int open = size - 3 * line;
            moves.add((i + 1) % open, true, 250 + i, 1000);
            moves.add((i + 7) % open, (i + 7) % open != (i + 1) % open && (i + 7) % open != i, 31, 1000);
            moves.add(open + i % (3 * line), true, 10 + i % 7, 1000);
        } else {
            int first = size - line * (1 + (size - 1 - i) / line);
            moves.add(first + (i - first + 1) % line, line > 1, 120 + i, 1000);
            moves.add(first + (i - first + line - 1) % line, line > 2, 75 + i % 13, 1000);
        }
        return moves;
    })),
    /** Four shifts in turn, a quarter of the conditions in each: period four. */
    PERIODIC("Conditions of a press over four shifts", size -> moves(size, i -> {
        int conditions = size / 4;
        int next = (i / conditions + 1) % 4 * conditions;
        int condition = i % conditions;
        Moves moves = new Moves();
        moves.add(next + Math.min(condition + 1, conditions - 1), true, 200 + 3 * i, 1000);
        moves.add(next + condition / 3, condition / 3 != Math.min(condition + 1, conditions - 1), 70 + i % 17, 1000);
        moves.rest = next + condition;
        return moves;
    })),
    /** Measured shares, each to between six and nine decimals. */
    FINE("Shares counted in a log of feed water chemistry", size -> moves(size, i -> {
        Random random = new Random(31 * size + i);
        Moves moves = new Moves();
        for (int j = 1; j <= Math.min(4, size - 1); j++) {
            int decimals = 6 + random.nextInt(4);
            int scale = (int) Math.pow(10, decimals);
            moves.add((i + j * j * j) % size, (i + j * j * j) % size != i, 1 + random.nextInt(scale / 5), scale);
        }
        return moves;
    })),
    /** Two machines side by side, √n conditions each; both may change in a step. */
    PRODUCT("Two compressors side by side", size -> {
        int side = (int) Math.round(Math.sqrt(size));
        return moves(side * side, i -> {
            Moves moves = new Moves();
            Map<Integer, Integer> first = machine(i / side, side, 30);
            Map<Integer, Integer> second = machine(i % side, side, 45);
            first.forEach((a, chance) -> second.forEach((b, other) ->
                    moves.add(a * side + b, a * side + b != i, chance * other, 1_000_000)));
            return moves;
        });
    });

    private static final class Moves {
        private final Map<Integer, String> chances = new TreeMap<>();
        private int rest = -1;

        private void add(int target, boolean possible, int numerator, int denominator) {
            if (possible && numerator > 0) {
                chances.put(target, decimal(numerator, denominator));
            }
        }

        private static String decimal(int numerator, int denominator) {
            int digits = String.valueOf(denominator).length() - 1;
            return denominator == Math.pow(10, digits)
                    ? String.format(Locale.ROOT, "0.%0" + digits + "d", numerator) : numerator + "/" + denominator;
        }
    }

    private final String title;
    private final IntFunction<List<String>> transitions;

    LargeChains(String title, IntFunction<List<String>> transitions) {
        this.title = title;
        this.transitions = transitions;
    }

    /** The model file; at least twelve states, for {@link #PRODUCT} a square number, for {@link #PERIODIC} fours. */
    public String yaml(int size) {
        List<String> lines = new ArrayList<>(List.of("pofk: 1", "title: " + title + ", " + size + " states (invented)",
                "step: 1 shift", "start: s0", "transitions:"));
        List<String> rows = transitions.apply(size);
        String moved = rows.get(0).substring(rows.get(0).indexOf('{') + 1, rows.get(0).indexOf(": ", 6));
        lines.addAll(rows);
        lines.add("sets: {failed: [" + name(size - 1) + ", " + name(size - 2) + ", " + name(size - 3) + "]}");
        lines.add("outputs: {lost: failed}");
        lines.add("costs: {unit: kEUR, each step in: {failed: 12, s1: 0.4}, each move: {s0: {" + moved + ": 3/2}}, at start: 20}");
        return String.join("\n", lines) + "\n";
    }

    /** A machine's moves out of one condition in thousandths: worse by one, and back to new from the worse half. */
    private static Map<Integer, Integer> machine(int condition, int conditions, int wear) {
        Map<Integer, Integer> moves = new TreeMap<>();
        int left = 1000;
        if (condition + 1 < conditions) {
            moves.put(condition + 1, wear + 7 * condition);
            left -= wear + 7 * condition;
        }
        if (2 * condition >= conditions) {
            moves.put(0, 200 + condition);
            left -= 200 + condition;
        }
        moves.put(condition, left);
        return moves;
    }

    private static List<String> moves(int size, IntFunction<Moves> from) {
        List<String> lines = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            Moves moves = from.apply(i);
            List<String> entries = new ArrayList<>();
            int rest = moves.rest < 0 ? i : moves.rest;
            moves.chances.forEach((target, chance) -> {
                if (target != rest) {
                    entries.add(name(target) + ": " + chance);
                }
            });
            entries.add(name(rest) + ": rest");
            lines.add("  " + name(i) + ": {" + String.join(", ", entries) + "}");
        }
        return lines;
    }

    private static String name(int state) {
        return "s" + state;
    }
}
