package org.pofk.meaning;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * Equations solved for one decimal after the other: the first open one with a single unknown that can be isolated gives
 * it, and it is put into the others. A decimal set free counts as known, and what is solved for then hangs on it.
 */
final class Propagation {
    private final List<Equation> equations;
    private final Map<Written, Quantity> right;
    private final Map<Written, Integer> solvedBy;
    private final Set<Written> free;
    private final List<Integer> open;

    private Propagation(List<Equation> equations, Map<Written, Quantity> right, Map<Written, Integer> solvedBy,
            Set<Written> free, List<Integer> open) {
        this.equations = equations;
        this.right = right;
        this.solvedBy = solvedBy;
        this.free = free;
        this.open = open;
    }

    /** With nothing set free. */
    static Propagation of(List<Equation> equations) {
        List<Integer> open = new ArrayList<>();
        for (int i = 0; i < equations.size(); i++) {
            open.add(i);
        }
        Propagation propagation = new Propagation(equations, new LinkedHashMap<>(), new LinkedHashMap<>(),
                new LinkedHashSet<>(), open);
        propagation.solve();
        return propagation;
    }

    /** The same with one more decimal set free. */
    Propagation setting(Written decimal) {
        Propagation next = new Propagation(equations, new LinkedHashMap<>(right), new LinkedHashMap<>(solvedBy),
                new LinkedHashSet<>(free), new ArrayList<>(open));
        next.free.add(decimal);
        next.solve();
        return next;
    }

    private void solve() {
        Optional<Integer> next = solvable();
        while (next.isPresent()) {
            open.remove(next.get());
            next = solvable();
        }
    }

    /** The first open equation that can be solved; its unknown is determined then. */
    private Optional<Integer> solvable() {
        for (int equation : open) {
            List<Written> unknowns = unknowns(equation);
            if (unknowns.size() == 1) {
                Written unknown = unknowns.get(0);
                Quantity written = equations.get(equation).written().with(right);
                Quantity target = equations.get(equation).right();
                Optional<Quantity> value = Isolating.solve(written, unknown, target).map(solved ->
                        isExact(written, unknown, target) ? Quantity.of(unknown.value()) : solved);
                if (value.isPresent()) {
                    right.put(unknown, value.get());
                    solvedBy.put(unknown, equation);
                    return Optional.of(equation);
                }
            }
        }
        return Optional.empty();
    }

    /** Whether the equation holds with its only decimal at face value. */
    private static boolean isExact(Quantity written, Written unknown, Quantity target) {
        return written.decimals().equals(List.of(unknown)) && written.minus(target).isZero() == Decision.YES;
    }

    List<Integer> open() {
        return open;
    }

    Set<Written> free() {
        return free;
    }

    /** The decimals solved for, with values in which those set free may occur. */
    Map<Written, Quantity> right() {
        return right;
    }

    /** The equation that gave a decimal's value. */
    int solvedBy(Written decimal) {
        return solvedBy.get(decimal);
    }

    /** Whether an equation has several decimals, and none of them is in another equation. */
    boolean standsAlone(int equation) {
        List<Written> own = equations.get(equation).written().decimals();
        return own.size() > 1 && IntStream.range(0, equations.size()).filter(other -> other != equation)
                .allMatch(other -> Collections.disjoint(equations.get(other).written().decimals(), own));
    }

    /** written − right as it stands. */
    Quantity differenceAsWritten(int equation) {
        return equations.get(equation).written().minus(equations.get(equation).right());
    }

    /** The decimals of an equation that are neither solved for nor free, in order of reading. */
    List<Written> unknowns(int equation) {
        return equations.get(equation).written().decimals().stream()
                .filter(decimal -> !right.containsKey(decimal) && !free.contains(decimal)).toList();
    }

    /** written − right with all that is known put in. */
    Quantity difference(int equation) {
        return equations.get(equation).written().with(right).minus(equations.get(equation).right());
    }
}
