package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;

/** States and moves in words. */
final class StateProse {
    private static final int DIGITS = 3;

    private StateProse() {
    }

    static Prose of(List<Chart.State> states, List<Chart.Move> moves, Chain.Kind kind) {
        Prose said = Prose.of(states.size() == 1 ? "One state: " : states.size() + " states: ")
                .and(Prose.joined(states.stream().map(state -> state(state, kind)).toList(), ", ")).and(".");
        List<Prose> left = new ArrayList<>();
        for (int i = 0; i < states.size(); i++) {
            int from = i;
            List<Prose> to = moves.stream().filter(move -> move.from() == from)
                    .map(move -> Prose.name(states.get(move.to()).name()).and(" " + move.text())).toList();
            if (!to.isEmpty() && !states.get(i).absorbing()) {
                left.add(Prose.of(left.isEmpty() ? "From " : "from ").andName(states.get(i).name()).and(" to ").and(Prose.joined(to, ", ")));
            }
        }
        return left.isEmpty() ? said : said.and(" ").and(Prose.joined(left, "; ")).and(".");
    }

    private static Prose state(Chart.State state, Chain.Kind kind) {
        List<String> marks = new ArrayList<>();
        if (!state.start().isZero()) {
            marks.add(state.start().isOne() ? "start" : "start with " + ChartNumber.of(state.start(), DIGITS));
        }
        if (state.absorbing() && kind == Chain.Kind.CHAIN) {
            marks.add("never left");
        }
        if (!state.reached()) {
            marks.add("never reached");
        }
        return Prose.name(state.name()).and(marks.isEmpty() ? "" : " (" + String.join(", ", marks) + ")");
    }
}
