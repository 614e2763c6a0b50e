package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import org.pofk.answer.Increment;
import org.pofk.chain.Chain;
import org.pofk.chain.Costs;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;

/**
 * What is added up over the steps of a timetable: from the state at the end of a step, from the move made in it, and
 * from each action. Exact.
 *
 * @param own      what doesn't depend on the matrix the chain moves by
 * @param byMove   for each matrix of the timetable what its moves add, by the state it is made from
 * @param byAction for each action what it adds, by the state in which it finds the chain
 */
record ScheduledIncrement(Increment own, List<List<Rational>> byMove, List<List<Rational>> byAction) {
    ScheduledIncrement {
        byMove = List.copyOf(byMove);
        byAction = List.copyOf(byAction);
    }

    /** @param increment what is added up by a chain of any matrix; costs of moves aren't those of actions */
    static ScheduledIncrement of(Chain chain, Timetable timetable, Function<Chain, Increment> increment,
            Optional<Costs> costs) {
        Increment own = increment.apply(chain);
        return new ScheduledIncrement(own,
                timetable.moves().stream().map(move -> increment.apply(by(chain, move)).byMove()).toList(),
                timetable.actions().stream().map(action -> own.kind() == Increment.Kind.COSTS
                        ? costs.orElseThrow().ofAction(action.name())
                        : increment.apply(by(chain, action.matrix())).byMove()).toList());
    }

    /** All of them. */
    Stream<Rational> amounts() {
        return Stream.of(own.atState().stream(), byMove.stream().flatMap(List::stream),
                byAction.stream().flatMap(List::stream), Stream.of(own.atStart(), own.constant()))
                        .flatMap(each -> each);
    }

    private static Chain by(Chain chain, SparseMatrix matrix) {
        return new Chain(chain.kind(), chain.states(), matrix, chain.start(), chain.sets(), chain.outputs());
    }
}
