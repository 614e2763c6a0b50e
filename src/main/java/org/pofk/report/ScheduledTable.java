package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Timetable;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;

/**
 * What {@code derive} found of a model with a schedule: a row for each output and step, two where something is done, at
 * the steps asked for or else before the cycles and over the first one. Exact, or certified where {@code exact} is
 * empty.
 */
public final class ScheduledTable {
    private ScheduledTable() {
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(ScheduledModel found, int digits) {
        StepColumns steps = StepColumns.of(found.model());
        Rows rows = new Rows(digits, Rows.words("output"), steps.header(), Rows.words("side", "exact", "decimal"));
        for (ScheduledOutput output : found.outputs()) {
            List<Prose> name = List.of(Prose.name(output.output().name()));
            for (Reading reading : readings(output, found.timetable())) {
                for (Side side : sides(found.timetable(), reading.j())) {
                    rows.add(name, steps.cells(reading.j()), Rows.words(side == Side.BEFORE ? "before" : "after"),
                            rows.value(reading.at(side)));
                }
            }
        }
        return rows.table();
    }

    /** Both where something is done at the end of step k, else the one value there is. */
    static List<Side> sides(Timetable timetable, int k) {
        return k > 0 && !timetable.at(k).actions().isEmpty() ? List.of(Side.BEFORE, Side.AFTER) : List.of(Side.AFTER);
    }

    /** With the step k as j. */
    static List<Reading> readings(ScheduledOutput output, Timetable timetable) {
        if (!output.values().isEmpty()) {
            return output.values();
        }
        List<Reading> readings = new ArrayList<>();
        output.preamble().ifPresent(course -> readings.addAll(course.readings()));
        List<Reading> cycle = output.first().stream().flatMap(course -> course.readings().stream())
                .filter(reading -> output.preamble().isEmpty() || reading.j() > 0)
                .map(reading -> new Reading(timetable.before() + reading.j(), reading.before(), reading.after()))
                .toList();
        readings.addAll(cycle);
        return readings;
    }
}
