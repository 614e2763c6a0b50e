package org.pofk.chain;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * States that bear another name in a later chain: gone by name here, new by name there, with the same start, the same
 * chance to stay, and the same moves from and to every state that both chains name, one at least. Decided on exact
 * numbers; of several that fit, in the order of the chains.
 */
final class RenamedStates {
    private final Chain before;
    private final Chain after;

    private RenamedStates(Chain before, Chain after) {
        this.before = before;
        this.after = after;
    }

    /** The later name by the earlier one. */
    static Map<String, String> of(Chain before, Chain after) {
        RenamedStates states = new RenamedStates(before, after);
        Map<String, String> renamed = new LinkedHashMap<>();
        for (String gone : before.states()) {
            if (!after.states().contains(gone)) {
                states.sameUnderAnotherName(gone, renamed).ifPresent(name -> renamed.put(gone, name));
            }
        }
        return renamed;
    }

    private Optional<String> sameUnderAnotherName(String gone, Map<String, String> renamed) {
        return after.states().stream()
                .filter(name -> !before.states().contains(name) && !renamed.containsValue(name))
                .filter(name -> isSame(before.states().indexOf(gone), after.states().indexOf(name))).findFirst();
    }

    private boolean isSame(int was, int is) {
        List<String> kept = before.states().stream().filter(after.states()::contains).toList();
        boolean isJoined = kept.stream().map(before.states()::indexOf).anyMatch(there ->
                !before.matrix().at(was, there).isZero() || !before.matrix().at(there, was).isZero());
        return isJoined && before.start().get(was).equals(after.start().get(is))
                && before.matrix().at(was, was).equals(after.matrix().at(is, is))
                && kept.stream().allMatch(name -> {
                    int there = before.states().indexOf(name);
                    int here = after.states().indexOf(name);
                    return before.matrix().at(was, there).equals(after.matrix().at(is, here))
                            && before.matrix().at(there, was).equals(after.matrix().at(here, is));
                });
    }
}
