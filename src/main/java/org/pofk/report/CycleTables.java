package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.TreeSet;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Table;
import org.pofk.schedule.CycleCourse;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.PeriodicRegime;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;

/** Values under a schedule: by step of the cycles in the long run, and at the steps asked for. */
final class CycleTables {
    /** Longer cycles are shown at some of their steps. */
    private static final int STEPS_LISTED = 24;
    private static final int STEPS_CHOSEN = 12;

    private CycleTables() {
    }

    /** What a regime recurs with, both sides of each step where something is ever done; none for cycles of one step. */
    static Optional<Table> longRun(Timetable timetable, ScheduledOutput output, Style style) {
        return recurring(output).filter(course -> course.steps() > 1).map(course ->
                longRun(sides(timetable.cycle()), output, course, style));
    }

    /** What the cycles recur with in the long run. */
    static Optional<CycleCourse> recurring(ScheduledOutput output) {
        return output.regime().flatMap(regime -> regime.accept(new RecurringCourse()));
    }

    /** The course of a regime that recurs. */
    private static final class RecurringCourse implements PeriodicRegime.Visitor<Optional<CycleCourse>> {
        @Override
        public Optional<CycleCourse> recurring(PeriodicRegime.Recurring recurring) {
            return Optional.of(recurring.course());
        }

        @Override
        public Optional<CycleCourse> none(PeriodicRegime.None none) {
            return Optional.empty();
        }
    }

    private static List<Side> sides(List<Timetable.Moment> moments) {
        return moments.stream().anyMatch(moment -> !moment.actions().isEmpty()) ? List.of(Side.BEFORE, Side.AFTER)
                : List.of(Side.AFTER);
    }

    private static Table longRun(List<Side> sides, ScheduledOutput output, CycleCourse course, Style style) {
        List<Prose> header = new ArrayList<>(List.of(Prose.of("j")));
        header.addAll(sides.size() == 1 ? List.of(Prose.name(output.output().name()))
                : sides.stream().map(side -> Prose.of(side == Side.BEFORE ? "just before" : "just after")).toList());
        return new Table(Prose.of("In the long run, by step of the cycle"), header, listed(course).stream().map(j -> {
            List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(j))));
            // what is before the actions of step 0 stands at the end of the cycle
            sides.forEach(side -> cells.add(j == 0 && side == Side.BEFORE ? Prose.EMPTY
                    : cell(course.readings().get(j), side, style)));
            return cells;
        }).toList());
    }

    private static List<Integer> listed(CycleCourse course) {
        if (course.steps() <= STEPS_LISTED) {
            return IntStream.rangeClosed(0, course.steps()).boxed().toList();
        }
        TreeSet<Integer> chosen = new TreeSet<>(List.of(0, course.highest().j(), course.lowest().j(), course.steps()));
        for (int i = 1; i < STEPS_CHOSEN; i++) {
            chosen.add((int) ((long) course.steps() * i / STEPS_CHOSEN));
        }
        return List.copyOf(chosen);
    }

    /** At the steps asked for; none where there were none. */
    static Optional<Table> values(ScheduledModel found, Style style) {
        int rows = found.outputs().stream().mapToInt(output -> output.values().size()).max().orElse(0);
        if (rows == 0) {
            return Optional.empty();
        }
        List<Side> sides = sides(Stream.concat(found.timetable().preamble().stream(),
                found.timetable().cycle().stream()).toList());
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k"), Prose.of("cycle m"), Prose.of("step j")));
        found.outputs().stream().map(output -> Prose.name(output.output().name())).forEach(name -> header.addAll(
                sides.size() == 1 ? List.of(name) : List.of(name.and(", before"), name.and(", after"))));
        return Optional.of(new Table(Prose.of(sides.size() == 1 ? "Values at the end of step k"
                : "Values at step k, just before and just after what is done there"), header,
                IntStream.range(0, rows).mapToObj(row -> valuesAt(found, row, sides, style)).toList()));
    }

    private static List<Prose> valuesAt(ScheduledModel found, int row, List<Side> sides, Style style) {
        int k = found.outputs().get(0).values().get(row).j();
        Timetable.Place place = found.timetable().place(k);
        OptionalInt cycle = place.cycle();
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(k)),
                Prose.of(cycle.isPresent() ? String.valueOf(cycle.getAsInt()) : "–"),
                Prose.of(cycle.isPresent() ? String.valueOf(place.within()) : "–")));
        for (ScheduledOutput output : found.outputs()) {
            sides.forEach(side -> cells.add(cell(output.values().get(row), side, style)));
        }
        return cells;
    }

    private static Prose cell(Reading reading, Side side, Style style) {
        return Prose.of(KnownText.of(reading.at(side), style.digits()));
    }
}
