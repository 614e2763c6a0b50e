package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import org.pofk.answer.Increment;
import org.pofk.answer.SummedName;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Schedule.Action;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;

/**
 * A scheduled chain with one more component, in which is added up what moves and actions add, and what the states at
 * the end of all steps before did: y(k) = v^k x(k), and the total G(k) = added(k) + c y(k) is an output. A move takes
 * y to v A y and adds c y + v m y, no move takes it to v y and adds c y, an action takes it to B y and adds b y. A
 * constant is carried by one more component. Exact.
 */
record SummedSchedule(ScheduledChain recursion, Output total) {

    /** @param factor v, with which each later step counts less */
    static SummedSchedule of(Chain chain, Timetable timetable, ScheduledIncrement increment, Rational factor) {
        List<SparseMatrix> moves = new ArrayList<>(IntStream.range(0, timetable.moves().size()).mapToObj(i ->
                stepped(timetable.moves().get(i), increment.own(), increment.byMove().get(i), factor)).toList());
        int staying = moves.size();
        moves.add(stepped(identity(chain.size()), increment.own(), Increment.zeros(chain.size()), factor));
        List<Action> actions = IntStream.range(0, timetable.actions().size()).mapToObj(i ->
                new Action(timetable.actions().get(i).name(), with(timetable.actions().get(i).matrix(),
                        increment.byAction().get(i), Rational.ONE, new Entry(chain.size() + 1, Rational.ONE)))).toList();
        Timetable summed = new Timetable(moves, actions, moving(timetable.preamble(), staying),
                moving(timetable.cycle(), staying));
        List<Rational> start = new ArrayList<>(chain.start());
        start.addAll(List.of(increment.own().atStart(), Rational.ONE));
        List<Rational> total = new ArrayList<>(increment.own().atState());
        total.addAll(List.of(Rational.ONE, increment.own().constant()));
        SummedName names = SummedName.of(increment.own(), factor);
        return new SummedSchedule(ScheduledChain.of(new Chain(Chain.Kind.RECURSION, names(chain), moves.get(0), start,
                chain.sets(), List.of()), summed), new Output(names.total(), total, Rational.ZERO, names.ofTotal()));
    }

    private static List<Moment> moving(List<Moment> moments, int staying) {
        return moments.stream().map(each -> each.move().isPresent() ? each
                : new Moment(OptionalInt.of(staying), each.actions())).toList();
    }

    /** v A, and in the row of sums c + v m. */
    private static SparseMatrix stepped(SparseMatrix move, Increment own, List<Rational> byMove, Rational factor) {
        List<Rational> added = IntStream.range(0, move.size())
                .mapToObj(i -> own.atState().get(i).plus(byMove.get(i).times(factor))).toList();
        int constant = move.size() + 1;
        return with(move, added, factor, new Entry(constant - 1, own.constant()), new Entry(constant, factor));
    }

    private static SparseMatrix with(SparseMatrix matrix, List<Rational> added, Rational factor, Entry... ofConstant) {
        List<List<Entry>> columns = new ArrayList<>();
        for (int state = 0; state < matrix.size(); state++) {
            List<Entry> column = new ArrayList<>(matrix.columns().get(state).stream()
                    .map(entry -> new Entry(entry.row(), entry.value().times(factor))).toList());
            column.add(new Entry(matrix.size(), added.get(state)));
            columns.add(column);
        }
        columns.add(List.of(new Entry(matrix.size(), Rational.ONE)));
        columns.add(List.of(ofConstant));
        return new SparseMatrix(columns);
    }

    private static SparseMatrix identity(int size) {
        return new SparseMatrix(IntStream.range(0, size).mapToObj(i -> List.of(new Entry(i, Rational.ONE))).toList());
    }

    private static List<String> names(Chain chain) {
        List<String> names = new ArrayList<>(chain.states());
        for (String wanted : List.of("added", "constant")) {
            String name = wanted;
            while (names.contains(name)) {
                name += "'";
            }
            names.add(name);
        }
        return names;
    }
}
