package org.pofk.chain;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import org.pofk.chain.Schedule.Action;
import org.pofk.chain.Schedule.Recurring;
import org.pofk.chain.Schedule.Repeat;
import org.pofk.chain.Schedule.When;

/**
 * What a schedule does in every step: {@code preamble} in steps 1 … P, then {@code cycle} in steps P + 1 … P + T, over
 * and over. Canonical form: T the least common multiple of what recurs; P the first step from which all recurs that
 * has an action T steps later, so that a cycle ends with one.
 *
 * @param moves   the matrices the chain moves by
 * @param actions what is done
 */
public record Timetable(List<SparseMatrix> moves, List<Action> actions, List<Moment> preamble, List<Moment> cycle) {
    /** Preambles and cycles are listed step by step. */
    public static final int STEPS_AT_MOST = 100_000;

    /**
     * One step k: x(k⁻) = A x(k−1), or x(k−1) where no move is made; x(k) = … B x(k⁻).
     *
     * @param move    the place of A in {@link #moves}; empty where actions stand instead of the move
     * @param actions the places of B, … in {@link #actions}, the first done first
     */
    public record Moment(OptionalInt move, List<Integer> actions) {
        public Moment {
            actions = List.copyOf(actions);
        }
    }

    /**
     * A step as a cycle and a place in it: k = P + m T + j with 0 ≤ j < T. Before P there is no cycle, and j is k.
     */
    public record Place(OptionalInt cycle, int within) {
    }

    public Timetable {
        moves = List.copyOf(moves);
        actions = List.copyOf(actions);
        preamble = List.copyOf(preamble);
        cycle = List.copyOf(cycle);
    }

    public static Timetable of(Chain chain, Schedule schedule) {
        return new Compiling(chain, schedule).timetable();
    }

    /** T of a schedule, as a number that may be above {@link #STEPS_AT_MOST}; then no larger than needed to see that. */
    public static long cycleSteps(Schedule schedule) {
        long steps = schedule.phases().filter(phases -> phases.repeat() == Repeat.YES)
                .map(phases -> (long) phases.steps()).orElse(1L);
        for (Recurring each : schedule.recurring()) {
            steps = steps > STEPS_AT_MOST ? steps : steps / greatestCommonDivisor(steps, each.every()) * each.every();
        }
        return steps;
    }

    /** P, the steps before the first cycle. */
    public int before() {
        return preamble.size();
    }

    /** T, the steps of a cycle. */
    public int period() {
        return cycle.size();
    }

    /** What happens in step k ≥ 1. */
    public Moment at(int k) {
        return k <= preamble.size() ? preamble.get(k - 1) : cycle.get((k - preamble.size() - 1) % cycle.size());
    }

    /** Where the end of step k ≥ 0 lies. */
    public Place place(int k) {
        int beyond = k - preamble.size();
        return beyond < 0 ? new Place(OptionalInt.empty(), k)
                : new Place(OptionalInt.of(beyond / cycle.size()), beyond % cycle.size());
    }

    private static long greatestCommonDivisor(long a, long b) {
        return b == 0 ? a : greatestCommonDivisor(b, a % b);
    }

    private static final class Compiling {
        private final Schedule schedule;
        private final List<SparseMatrix> moves = new ArrayList<>();
        private final List<Action> actions = new ArrayList<>();
        private final Map<Moment, Moment> known = new HashMap<>();
        private final List<Integer> moveOfPhase = new ArrayList<>();

        Compiling(Chain chain, Schedule schedule) {
            this.schedule = schedule;
            schedule.phases().ifPresentOrElse(phases -> phases.list().forEach(phase ->
                    moveOfPhase.addAll(Collections.nCopies(phase.steps(), place(moves, phase.matrix())))),
                    () -> moveOfPhase.add(place(moves, chain.matrix())));
        }

        Timetable timetable() {
            int period = Math.toIntExact(cycleSteps(schedule));
            int before = before(period);
            List<Moment> preamble = IntStream.rangeClosed(1, before).mapToObj(this::moment).toList();
            List<Moment> cycle = IntStream.rangeClosed(before + 1, before + period).mapToObj(this::moment).toList();
            return new Timetable(moves, actions, preamble, cycle);
        }

        private int before(int period) {
            int recurs = schedule.phases().filter(phases -> phases.repeat() == Repeat.ONCE)
                    .map(phases -> phases.steps() - phases.list().get(phases.list().size() - 1).steps()).orElse(0);
            for (Recurring each : schedule.recurring()) {
                recurs = Math.max(recurs, each.first() - each.every());
            }
            int from = recurs;
            return IntStream.range(from, from + period).filter(before -> isActed(before + period)).findFirst()
                    .orElse(from);
        }

        private boolean isActed(int k) {
            return schedule.recurring().stream().anyMatch(each -> each.isAt(k));
        }

        private Moment moment(int k) {
            List<Recurring> due = schedule.recurring().stream().filter(each -> each.isAt(k)).toList();
            boolean isMoved = due.stream().noneMatch(each -> each.when() == When.INSTEAD_OF_THE_STEP);
            Moment moment = new Moment(isMoved ? OptionalInt.of(move(k)) : OptionalInt.empty(),
                    due.stream().map(each -> place(actions, each.action())).toList());
            return Optional.ofNullable(known.putIfAbsent(moment, moment)).orElse(moment);
        }

        private int move(int k) {
            boolean again = schedule.phases().map(phases -> phases.repeat() == Repeat.YES).orElse(true);
            return moveOfPhase.get(again ? (k - 1) % moveOfPhase.size() : Math.min(k, moveOfPhase.size()) - 1);
        }

        private static <E> int place(List<E> list, E element) {
            if (!list.contains(element)) {
                list.add(element);
            }
            return list.indexOf(element);
        }
    }
}
