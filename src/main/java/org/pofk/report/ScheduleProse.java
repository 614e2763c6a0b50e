package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Schedule;
import org.pofk.chain.Schedule.Phases;
import org.pofk.chain.Schedule.Recurring;
import org.pofk.chain.Schedule.Repeat;
import org.pofk.chain.Schedule.When;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;

/** A schedule in words. */
final class ScheduleProse {
    private ScheduleProse() {
    }

    static List<Block> of(Schedule schedule, Timetable timetable) {
        List<Block> blocks = new ArrayList<>();
        schedule.recurring().forEach(each -> blocks.add(new Labelled("action", recurring(each))));
        schedule.phases().ifPresent(phases -> blocks.add(new Labelled("phases", phases(phases))));
        blocks.add(new Labelled("cycle", cycle(timetable)));
        return blocks;
    }

    private static Prose recurring(Recurring each) {
        String steps = each.first() + ", " + ((long) each.first() + each.every()) + ", "
                + ((long) each.first() + 2L * each.every()) + ", …";
        return Prose.name(each.action().name()).and(each.when() == When.AFTER_THE_STEP
                ? " at the end of steps " + steps : " instead of the moves of steps " + steps);
    }

    private static Prose phases(Phases phases) {
        Prose all = Prose.joined(phases.list().stream().map(phase ->
                Prose.of(steps(phase.steps()) + " ").andName(phase.use())).toList(), ", ");
        return phases.repeat() == Repeat.YES ? all.and(", over and over")
                : all.and(", and from there on ").andName(phases.list().get(phases.list().size() - 1).use());
    }

    private static String cycle(Timetable timetable) {
        String step = step(timetable, "m", timetable.period() == 1 ? "" : "j");
        return steps(timetable.period()) + (timetable.before() == 0 ? ", from the start on"
                : ", the first after step " + timetable.before()) + "; k = " + step + " is "
                + (timetable.period() == 1 ? "the end of step m of them"
                : "the end of step j of cycle m, 0 ≤ j < " + timetable.period());
    }

    /** The names of what is done at the end of step j of a cycle. */
    static Prose done(Timetable timetable, int j) {
        return Prose.names(timetable.cycle().get((j - 1) % timetable.period()).actions().stream()
                .map(action -> timetable.actions().get(action).name()).toList());
    }

    /** {@code , just before fix}, where that is done at the end of step k ≥ 1, counted from the start; else nothing. */
    static Prose justBefore(Timetable timetable, int k) {
        List<String> done = timetable.at(k).actions().stream()
                .map(action -> timetable.actions().get(action).name()).toList();
        return done.isEmpty() ? Prose.EMPTY : Prose.of(", just before ").and(Prose.names(done));
    }

    /** Whether anything is done at the end of step j of a cycle; never at its beginning. */
    static boolean isActed(Timetable timetable, int j) {
        return j > 0 && !timetable.cycle().get((j - 1) % timetable.period()).actions().isEmpty();
    }

    /** {@code 12 m + j}, {@code 5 + 12 m}. */
    static String step(Timetable timetable, String m, String j) {
        String before = timetable.before() == 0 ? "" : timetable.before() + " + ";
        String cycles = timetable.period() == 1 ? m : timetable.period() + " " + m;
        return before + cycles + (j.isEmpty() ? "" : " + " + j);
    }

    /** Step j of cycle m as a formula in m: {@code 17 + 12 m}, {@code 12 m + 5}. */
    static String stepOf(Timetable timetable, int j) {
        return timetable.before() == 0 ? step(timetable, "m", j == 0 ? "" : String.valueOf(j))
                : timetable.before() + j + " + " + (timetable.period() == 1 ? "m" : timetable.period() + " m");
    }

    static String steps(int count) {
        return count == 1 ? "1 step" : count + " steps";
    }
}
