package org.pofk.meaning;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeSet;

/**
 * What equations between written decimals and exact values say about the decimals.
 *
 * <p>An equation with one decimal that isn't determined yet, and that occurs once where it can be isolated, determines
 * it exactly; it is put into the others, whatever is written. Where only equations with several unknowns are left, as
 * with a factor taken out, one unknown is taken at face value and the others are judged given it: the one that leaves
 * the fewest others wrong, of equals the one in the most equations, then the first. Whether all can hold together is
 * then decided for every value that the unknown stands for ({@link Holding}). In an equation that has its decimals to
 * itself, a coefficient in two parts, the others may take up what one is off: where it can hold, all are right.
 */
public final class Equations {
    /** Unknowns that are tried as the one to be taken at face value. */
    private static final int MOST_TRIED = 12;

    private Equations() {
    }

    public static Solution solve(List<Equation> equations) {
        Propagation propagation = Propagation.of(equations);
        List<Written> choices = choices(propagation);
        while (!choices.isEmpty()) {
            Propagation before = propagation;
            propagation = choices.stream().limit(MOST_TRIED).map(before::setting)
                    .min(Comparator.comparingLong(Equations::wrongNumbers)).orElseThrow();
            choices = choices(propagation);
        }
        return solution(propagation);
    }

    /** The unknowns of equations with several, by falling number of such equations, then in order of reading. */
    private static List<Written> choices(Propagation propagation) {
        Map<Written, Integer> occurrences = new LinkedHashMap<>();
        for (int equation : propagation.open()) {
            List<Written> unknowns = propagation.unknowns(equation);
            if (unknowns.size() > 1) {
                unknowns.forEach(unknown -> occurrences.merge(unknown, 1, Integer::sum));
            }
        }
        List<Written> choices = new ArrayList<>(occurrences.keySet());
        choices.sort(Comparator.comparing(occurrences::get, Comparator.reverseOrder()));
        return choices;
    }

    private static long wrongNumbers(Propagation propagation) {
        long decimals = propagation.right().entrySet().stream()
                .filter(entry -> WrittenNumber.within(entry.getKey(), entry.getValue()) == Decision.NO).count();
        long equations = propagation.open().stream().filter(equation -> propagation.unknowns(equation).isEmpty()
                && propagation.difference(equation).isZero() == Decision.NO).count();
        return decimals + equations;
    }

    private static Solution solution(Propagation propagation) {
        Map<Written, WrittenNumber> numbers = new LinkedHashMap<>();
        SortedMap<Integer, Decision> holding = Holding.of(propagation);
        propagation.right().forEach((decimal, value) -> {
            int equation = propagation.solvedBy(decimal);
            Quantity atFaceValue = value.with(FaceValues.of(propagation.free()));
            boolean isShared = propagation.standsAlone(equation) && holding.get(equation) == Decision.YES;
            numbers.put(decimal, isShared ? WrittenNumber.nearest(decimal, atFaceValue)
                    : WrittenNumber.of(decimal, atFaceValue));
        });
        TreeSet<Integer> failing = new TreeSet<>();
        boolean undecided = false;
        for (Map.Entry<Integer, Decision> equation : holding.entrySet()) {
            if (equation.getValue() == Decision.NO) {
                failing.add(equation.getKey());
            }
            undecided |= equation.getValue() == Decision.UNDECIDED;
        }
        Decision holds = !failing.isEmpty() ? Decision.NO : undecided ? Decision.UNDECIDED : Decision.YES;
        return new Solution(numbers, holds, List.copyOf(failing));
    }
}
