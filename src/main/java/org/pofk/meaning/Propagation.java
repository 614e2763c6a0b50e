package org.pofk.meaning;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;

/** Solving one decimal after the other: see {@link Equations}. */
final class Propagation {
    private static final int SPREAD_BITS = 96;

    private final List<Equation> equations;
    private final Map<Written, Quantity> right = new LinkedHashMap<>();
    private final Map<Written, WrittenNumber> numbers = new LinkedHashMap<>();
    private final List<Integer> open = new ArrayList<>();
    private final TreeSet<Integer> failing = new TreeSet<>();
    private boolean undecided;

    private Propagation(List<Equation> equations) {
        this.equations = equations;
        for (int i = 0; i < equations.size(); i++) {
            open.add(i);
        }
    }

    static Solution of(List<Equation> equations) {
        Propagation propagation = new Propagation(equations);
        while (propagation.solvesOne()) {
            propagation.open.size();
        }
        propagation.checkWhatIsLeft();
        Decision holds = !propagation.failing.isEmpty() ? Decision.NO
                : propagation.undecided ? Decision.UNDECIDED : Decision.YES;
        return new Solution(propagation.numbers, holds, List.copyOf(propagation.failing));
    }

    private List<Written> unknowns(int equation) {
        return equations.get(equation).written().decimals().stream().filter(w -> !right.containsKey(w)).toList();
    }

    /** Takes the first open equation with one unknown that can be solved for it, and puts the unknown in the others. */
    private boolean solvesOne() {
        for (int equation : open) {
            List<Written> unknowns = unknowns(equation);
            if (unknowns.size() == 1) {
                Optional<Quantity> value = solved(equation, unknowns.get(0));
                if (value.isPresent()) {
                    determine(equation, unknowns.get(0), value.get());
                    return true;
                }
            }
        }
        return false;
    }

    private Optional<Quantity> solved(int equation, Written unknown) {
        Quantity written = equations.get(equation).written().with(right);
        return Isolating.solve(written, unknown, equations.get(equation).right());
    }

    private void determine(int equation, Written unknown, Quantity value) {
        right.put(unknown, value);
        numbers.put(unknown, WrittenNumber.of(unknown, value));
        open.remove((Integer) equation);
        note(equation, WrittenNumber.within(unknown, value));
    }

    private void note(int equation, Decision holds) {
        if (holds == Decision.NO) {
            failing.add(equation);
        }
        undecided |= holds == Decision.UNDECIDED;
    }

    private void checkWhatIsLeft() {
        for (int equation : open) {
            Quantity difference = equations.get(equation).written().with(right).minus(equations.get(equation).right());
            note(equation, unknowns(equation).isEmpty() ? difference.isZero() : mayBeZero(difference));
        }
    }

    private static Decision mayBeZero(Quantity difference) {
        return difference.spread(SPREAD_BITS).containsZero() ? Decision.YES : Decision.NO;
    }
}
