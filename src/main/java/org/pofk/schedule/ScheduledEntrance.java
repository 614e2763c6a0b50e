package org.pofk.schedule;

import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import org.pofk.answer.Increment;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Rational;

/**
 * Whether and when a set is first entered under a schedule. From each state at a step of it: h, the probability of ever
 * entering the set, u and w, the means of T and of T² where it is entered and zero where it isn't, T counted from there.
 * First-step analysis step by step: before a step that does M, h = Mᵀ h, u = Mᵀ (u + h), w = Mᵀ (w + 2 u + h); over a
 * whole cycle each solves one system with I − Sᵀ on the states from which the set can be reached. Exact, or certified
 * where that says so.
 *
 * @param first    from the start
 * @param fromEach from each state at k = 0
 * @param back     of a start that lies in the set: until the first step k ≥ 1 in which it is there, after the move or
 *                 after an action
 */
public record ScheduledEntrance(ScheduledWait first, List<ScheduledWait> fromEach, Optional<ScheduledWait> back) {
    public ScheduledEntrance {
        fromEach = List.copyOf(fromEach);
    }

    /**
     * Empty where bounds tell nothing: it takes too many cycles.
     *
     * @param unstopped the timetable of the chain that is not stopped
     */
    static <W> Optional<ScheduledEntrance> of(StoppedSchedule stopped, Timetable unstopped,
            BackwardArithmetic<W> arithmetic) {
        Backwards<W> backwards = new Backwards<>(stopped, unstopped, arithmetic);
        return backwards.atCycles().map(backwards::entrance);
    }

    /** What is expected from each state at one step. */
    private record Sums<W>(W h, W u, W w) {
    }

    /** One stopped chain, from later steps to earlier ones. */
    private static final class Backwards<W> {
        private final StoppedSchedule stopped;
        private final Timetable timetable;
        private final Timetable unstopped;
        private final BackwardArithmetic<W> arithmetic;
        private final EntranceGraph graph;
        private final List<Integer> waiting;
        private final W zeros;

        Backwards(StoppedSchedule stopped, Timetable unstopped, BackwardArithmetic<W> arithmetic) {
            this.stopped = stopped;
            this.timetable = stopped.chain().timetable();
            this.unstopped = unstopped;
            this.arithmetic = arithmetic;
            this.graph = EntranceGraph.of(stopped);
            this.waiting = IntStream.range(0, size()).filter(state -> !stopped.into().contains(state)
                    && !stopped.avoiding().contains(state)).boxed().toList();
            this.zeros = arithmetic.weights(Increment.zeros(size()));
        }

        private int size() {
            return stopped.chain().chain().size();
        }

        /** At the beginning of any cycle. */
        Optional<Sums<W>> atCycles() {
            List<Moment> cycle = timetable.cycle();
            W inside = arithmetic.weights(stopped.distribution().coefficients());
            return arithmetic.solved(graph.open(), arithmetic.through(cycle, inside))
                    .map(open -> arithmetic.sum(open, inside)).flatMap(h ->
                    solved(through(cycle, new Sums<>(h, zeros, zeros)).u).flatMap(u ->
                    solved(through(cycle, new Sums<>(h, u, zeros)).w).map(w -> new Sums<>(h, u, w))));
        }

        private Optional<W> solved(W added) {
            return arithmetic.solved(graph.open(), added);
        }

        Sums<W> through(List<Moment> moments, Sums<W> end) {
            Sums<W> now = end;
            for (int i = moments.size() - 1; i >= 0; i--) {
                Sums<W> counted = before(moments.get(i), now);
                now = new Sums<>(counted.h, arithmetic.only(waiting, counted.u), arithmetic.only(waiting, counted.w));
            }
            return now;
        }

        /** One step earlier, and counted, wherever that is. */
        private Sums<W> before(Moment moment, Sums<W> after) {
            W later = arithmetic.sum(after.u, after.h);
            return new Sums<>(arithmetic.before(moment, after.h), arithmetic.before(moment, later),
                    arithmetic.before(moment, arithmetic.sum(arithmetic.sum(after.w, after.u), later)));
        }

        ScheduledEntrance entrance(Sums<W> atCycles) {
            Sums<W> begin = through(timetable.preamble(), atCycles);
            List<Rational> start = stopped.chain().chain().start();
            List<ScheduledWait> fromEach = IntStream.range(0, size()).mapToObj(state -> {
                List<Rational> there = Increment.zeros(size());
                there.set(state, Rational.ONE);
                return wait(graph.from(CycleGraph.support(there)), there, begin);
            }).toList();
            return new ScheduledEntrance(wait(graph.from(CycleGraph.support(start)), start, begin), fromEach,
                    CycleGraph.support(start).stream().allMatch(stopped.into()::contains)
                            ? Optional.of(back(start, atCycles)) : Optional.empty());
        }

        private ScheduledWait wait(ScheduledWait.Ever ever, List<Rational> start, Sums<W> sums) {
            return ScheduledWait.of(ever, arithmetic.expected(start, sums.h), arithmetic.expected(start, sums.u),
                    arithmetic.expected(start, sums.w));
        }

        /** The first thing that happens leads out of the set as it may; from there on the chain is stopped. */
        private ScheduledWait back(List<Rational> start, Sums<W> atCycles) {
            List<Moment> first = timetable.before() > 0 ? timetable.preamble() : timetable.cycle();
            Moment moment = first.get(0);
            boolean isMoved = moment.move().isPresent();
            List<Rational> after = (isMoved ? unstopped.moves().get(moment.move().getAsInt())
                    : unstopped.actions().get(moment.actions().get(0)).matrix()).times(start);
            Moment rest = new Moment(OptionalInt.empty(), isMoved ? moment.actions()
                    : moment.actions().subList(1, moment.actions().size()));
            BitSet reached = CycleGraph.through(timetable, List.of(rest), CycleGraph.support(after));
            return wait(graph.afterOneStep(reached), after,
                    before(rest, through(first.subList(1, first.size()), atCycles)));
        }
    }
}
