package org.pofk.report;

import java.util.ArrayList;
import java.util.List;

/** Some of a chain's states by name; many that follow each other in the order of the model by the first and the last. */
final class StateNames {
    private static final int NAMED_IN_A_ROW = 3;

    private StateNames() {
    }

    /** {@code a, b, d … h}; places in ascending order. */
    static Prose of(List<Integer> places, List<String> states) {
        return joined(places, states, ", ");
    }

    static Prose joined(List<Integer> places, List<String> states, String between) {
        return Prose.joined(parts(places, states), between);
    }

    /** Each a state or several in a row. */
    static List<Prose> parts(List<Integer> places, List<String> states) {
        List<Prose> parts = new ArrayList<>();
        for (int from = 0; from < places.size();) {
            int end = from + 1;
            while (end < places.size() && places.get(end) == places.get(end - 1) + 1) {
                end++;
            }
            if (end - from <= NAMED_IN_A_ROW) {
                end = from + 1;
                parts.add(Prose.name(states.get(places.get(from))));
            } else {
                parts.add(Prose.name(states.get(places.get(from))).and(" … ")
                        .andName(states.get(places.get(end - 1))));
            }
            from = end;
        }
        return parts;
    }
}
