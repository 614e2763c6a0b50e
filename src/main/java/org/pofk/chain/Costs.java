package org.pofk.chain;

import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * What a chain costs, or yields where it is negative: the state at the end of each step, the moves made in it, and the
 * start. Exact; amounts of one unit.
 *
 * @param unit     what amounts are counted in: {@code kEUR}
 * @param eachStep of the state at the end of a step, one a state; the start, k = 0, counts as one
 * @param moves    of moves, each time they are made; at most one entry for each pair of states
 * @param actions  of actions of a schedule, each time they are done; at most one entry for each action
 * @param atStart  once, at k = 0
 * @param discount the rate d a step: what is due at the end of step k counts (1 + d)^−k of it today; not negative
 * @param written  the amounts that aren't zero and the discount as the file writes them; none where no file does
 */
public record Costs(String unit, List<Rational> eachStep, List<Move> moves, List<OfAction> actions,
        Rational atStart, Optional<Rational> discount, Map<Entry, String> written) {

    /** What one move costs each time it is made. */
    public record Move(int from, int to, Rational cost) {
    }

    /** What an action costs each time it is done, by the state in which it finds the chain: one amount a state. */
    public record OfAction(String action, List<Rational> inState) {
        public OfAction {
            inState = List.copyOf(inState);
        }
    }

    /** Without actions, and not from a file. */
    public Costs(String unit, List<Rational> eachStep, List<Move> moves, Rational atStart,
            Optional<Rational> discount) {
        this(unit, eachStep, moves, List.of(), atStart, discount, Map.of());
    }

    /** What an action costs, one amount a state; nothing where it has no cost. */
    public List<Rational> ofAction(String action) {
        return actions.stream().filter(each -> each.action.equals(action)).map(OfAction::inState).findFirst()
                .orElse(Collections.nCopies(eachStep.size(), Rational.ZERO));
    }

    public Costs {
        actions = List.copyOf(actions);
        eachStep = List.copyOf(eachStep);
        moves = List.copyOf(moves);
        written = Map.copyOf(written);
    }
}
