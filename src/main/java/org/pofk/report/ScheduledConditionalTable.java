package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Timetable;
import org.pofk.schedule.ConditionalCourse.Reading;
import org.pofk.schedule.ConditionalSchedule;
import org.pofk.schedule.ConditionalSchedule.Conditional;
import org.pofk.schedule.CycleCourse.Side;

/**
 * Outputs of a model with a schedule given what is known: rows as in {@link ScheduledTable}; the number's cells are
 * empty where that is impossible.
 */
public final class ScheduledConditionalTable {
    private ScheduledConditionalTable() {
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(ConditionalSchedule found, int digits) {
        StepColumns steps = StepColumns.of(found.model());
        Timetable timetable = found.stopped().timetable();
        Rows rows = new Rows(digits, Rows.words("output"), steps.header(), Rows.words("side", "exact", "decimal"));
        for (Conditional output : found.outputs()) {
            for (Reading reading : readings(output, timetable)) {
                for (Side side : ScheduledTable.sides(timetable, reading.j())) {
                    rows.add(List.of(Prose.name(output.output().name())), steps.cells(reading.j()),
                            Rows.words(side == Side.BEFORE ? "before" : "after"),
                            reading.at(side).value().map(rows::value).orElse(List.of(Prose.EMPTY, Prose.EMPTY)));
                }
            }
        }
        return rows.table();
    }

    /** With the step k as j. */
    private static List<Reading> readings(Conditional output, Timetable timetable) {
        if (!output.values().isEmpty()) {
            return output.values();
        }
        List<Reading> readings = new ArrayList<>();
        output.preamble().ifPresent(course -> readings.addAll(course.readings()));
        output.first().ifPresent(course -> course.readings().stream()
                .filter(reading -> output.preamble().isEmpty() || reading.j() > 0)
                .map(reading -> new Reading(timetable.before() + reading.j(), reading.before(), reading.after()))
                .forEach(readings::add));
        return readings;
    }
}
