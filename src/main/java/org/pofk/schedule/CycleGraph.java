package org.pofk.schedule;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.chain.Structure;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.Rational;

/**
 * Which states a whole cycle leads to, from the graphs of its steps alone: where no entry is negative, that is where S
 * isn't zero. Exact; log T products of n × n tables of bits.
 */
final class CycleGraph {
    private CycleGraph() {
    }

    /** The structure of S, begun in the states where x(P) isn't zero. */
    static Structure of(Timetable timetable, List<Rational> start) {
        int size = start.size();
        BitSet begin = through(timetable, timetable.preamble(), support(start));
        return Structure.of(new Chain(Chain.Kind.RECURSION,
                IntStream.range(0, size).mapToObj(String::valueOf).toList(), matrix(timetable, size),
                IntStream.range(0, size).mapToObj(state -> begin.get(state) ? Rational.ONE : Rational.ZERO).toList(),
                Map.of(), List.of()));
    }

    /** One where S isn't zero. */
    static SparseMatrix matrix(Timetable timetable, int size) {
        List<BitSet> product = identity(size);
        for (CycleMatrices.Stretch stretch : CycleMatrices.stretches(timetable.cycle())) {
            product = product(power(step(timetable, stretch.moment(), size), stretch.times()), product);
        }
        return new SparseMatrix(product.stream().map(column ->
                column.stream().mapToObj(row -> new Entry(row, Rational.ONE)).toList()).toList());
    }

    /** Where a vector isn't zero. */
    static BitSet support(List<Rational> vector) {
        BitSet states = new BitSet();
        IntStream.range(0, vector.size()).filter(state -> !vector.get(state).isZero()).forEach(states::set);
        return states;
    }

    /** Where these steps lead to from some states. */
    static BitSet through(Timetable timetable, List<Moment> moments, BitSet from) {
        int size = timetable.moves().get(0).size();
        List<BitSet> now = List.of(from);
        for (CycleMatrices.Stretch stretch : CycleMatrices.stretches(moments)) {
            List<BitSet> step = step(timetable, stretch.moment(), size);
            now = product(stretch.times() == 1 ? step : power(step, stretch.times()), now);
        }
        return now.get(0);
    }

    private static List<BitSet> step(Timetable timetable, Moment moment, int size) {
        List<BitSet> step = moment.move().isPresent() ? graph(timetable.moves().get(moment.move().getAsInt()))
                : identity(size);
        for (int action : moment.actions()) {
            step = product(graph(timetable.actions().get(action).matrix()), step);
        }
        return step;
    }

    /** Column by column, where a matrix isn't zero. */
    static List<BitSet> graph(SparseMatrix matrix) {
        List<BitSet> columns = new ArrayList<>();
        for (List<Entry> column : matrix.columns()) {
            BitSet rows = new BitSet();
            column.forEach(entry -> rows.set(entry.row()));
            columns.add(rows);
        }
        return columns;
    }

    private static List<BitSet> identity(int size) {
        return IntStream.range(0, size).mapToObj(state -> {
            BitSet column = new BitSet();
            column.set(state);
            return column;
        }).toList();
    }

    private static List<BitSet> product(List<BitSet> m, List<BitSet> n) {
        return n.stream().map(column -> image(m, column)).toList();
    }

    /** Where the states of a column lead to. */
    static BitSet image(List<BitSet> graph, BitSet column) {
        BitSet image = new BitSet();
        column.stream().forEach(row -> image.or(graph.get(row)));
        return image;
    }

    private static List<BitSet> power(List<BitSet> matrix, int times) {
        return BinaryPowering.of(identity(matrix.size()), matrix, times, CycleGraph::product);
    }
}
