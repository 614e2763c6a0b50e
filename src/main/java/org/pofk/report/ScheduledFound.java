package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.chain.Timetable;
import org.pofk.modes.FormulaShape;
import org.pofk.report.Document.Labelled;
import org.pofk.schedule.CycleCourse;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.steps.StepValue;

/** An output under a schedule; it is as before where the first cycle, the long run and the formulas are. */
record ScheduledFound(Timetable timetable, ScheduledOutput output) implements FoundOutput {
    static List<FoundOutput> in(ScheduledModel found) {
        return found.outputs().stream().<FoundOutput>map(output -> new ScheduledFound(found.timetable(), output))
                .toList();
    }

    @Override
    public String name() {
        return output.output().name();
    }

    /** Of the first formula over the cycles. */
    @Override
    public Optional<Prose> shape() {
        return output.over().stream().findFirst().map(formula ->
                Prose.of("over the cycles: " + ShapeProse.of(FormulaShape.of(formula.closedForm()))));
    }

    @Override
    public String withoutShape() {
        return "the values are others; there is no formula over the cycles";
    }

    @Override
    public List<Labelled> facts(Style style) {
        return RegimeBlocks.of(timetable, output, style).stream().map(Labelled.class::cast).toList();
    }

    @Override
    public Prose longRun(Style style) {
        return Prose.of(RegimeBlocks.inBrief(output, style));
    }

    @Override
    public Prose reading() {
        return Prose.of("Read at the end of step k, after what is done there");
    }

    @Override
    public List<StepValue> values() {
        return output.values().stream().map(reading -> new StepValue(reading.j(), reading.after().exact(),
                reading.after().enclosure())).toList();
    }

    @Override
    public Optional<Object> identity() {
        if (output.first().isEmpty() || output.regime().isEmpty()) {
            return Optional.empty();
        }
        List<Object> all = new ArrayList<>(List.of(timetable.before(), timetable.period()));
        Stream.of(output.preamble(), output.first(), CycleTables.recurring(output)).forEach(course ->
                all.add(course.map(ScheduledFound::values)));
        output.over().forEach(formula -> all.addAll(List.of(formula.place(), formula.closedForm().transform().y())));
        return Optional.of(all);
    }

    private static List<String> values(CycleCourse course) {
        return course.readings().stream().flatMap(reading -> Stream.of(reading.before(), reading.after()))
                .map(PythonSchedule::value).toList();
    }
}
