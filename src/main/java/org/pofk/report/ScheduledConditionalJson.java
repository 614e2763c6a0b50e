package org.pofk.report;

import java.util.Optional;
import org.pofk.schedule.ConditionalCourse;
import org.pofk.schedule.ConditionalCourse.Reading;
import org.pofk.schedule.ConditionalCourse.Value;
import org.pofk.schedule.ConditionalSchedule;
import org.pofk.schedule.ConditionalSchedule.Conditional;
import org.pofk.schedule.CycleCourse.Extreme;
import org.pofk.steps.KnownValue;

/** Outputs of a model with a schedule given what is known, as JSON: format {@code pofk-schedule-conditional}. */
public final class ScheduledConditionalJson {
    private final Json json;
    private final ScheduledJson schedule;
    private final ConditionalSchedule found;

    private ScheduledConditionalJson(Json json, ScheduledJson schedule, ConditionalSchedule found) {
        this.json = json;
        this.schedule = schedule;
        this.found = found;
    }

    /** The text; {@code digits} are the significant digits of decimals. */
    public static String write(ConditionalSchedule found, int digits) {
        return ScheduledJson.write("conditional", "derive", found.model(), found.stopped().timetable(), digits,
                (json, schedule) -> new ScheduledConditionalJson(json, schedule, found).fields());
    }

    private void fields() {
        new JsonGiven(json).write(found.given(), Optional.empty(), Optional.empty());
        json.name("event");
        schedule.output(found.event());
        json.optional("impossible", found.possible(), possible -> json.object(() -> {
            json.name("before");
            ConditionalJson.impossible(json, possible.before());
            json.name("after");
            ConditionalJson.impossible(json, possible.after());
        }));
        json.list("outputs", found.outputs(), this::output);
    }

    private void output(Conditional output) {
        json.object(() -> {
            json.text("name", output.output().name());
            json.text("word", word(output));
            json.name("joint");
            schedule.output(output.joint());
            json.optional("preamble", output.preamble(), course -> json.object(() -> summary(course)));
            json.optional("firstCycle", output.first(), course -> json.object(() -> summary(course)));
            json.optional("longRun", output.longRun(), course -> json.object(() -> {
                json.count("cycles", course.steps() / found.stopped().timetable().period());
                summary(course);
                json.list("steps", course.readings(), reading -> reading(reading, "j"));
            }));
            json.list("values", output.values(), reading -> reading(reading, "k"));
        });
    }

    private static String word(Conditional output) {
        boolean isDecided = output.first().filter(ConditionalCourse::isDecided).isPresent()
                && output.longRun().filter(ConditionalCourse::isDecided).isPresent();
        boolean isExact = output.first().stream().allMatch(ScheduledConditionalJson::isExact)
                && output.longRun().stream().allMatch(ScheduledConditionalJson::isExact);
        return isDecided ? isExact ? "exact" : "certified" : "undecided";
    }

    private static boolean isExact(ConditionalCourse course) {
        return course.average().stream().allMatch(value -> value.word() == KnownValue.Word.EXACT);
    }

    private void summary(ConditionalCourse course) {
        known("average", course.average());
        extreme("highest", course.highest());
        extreme("lowest", course.lowest());
    }

    private void known(String name, Optional<KnownValue> value) {
        value.ifPresentOrElse(known -> schedule.value(name, known), () -> {
            json.name(name);
            json.nothing();
        });
    }

    private void extreme(String name, Optional<Extreme> extreme) {
        extreme.ifPresentOrElse(each -> schedule.extreme(name, each), () -> {
            json.name(name);
            json.nothing();
        });
    }

    private void reading(Reading reading, String step) {
        json.object(() -> {
            json.count(step, reading.j());
            value("before", reading.before());
            value("after", reading.after());
        });
    }

    private void value(String name, Value value) {
        known(name, value.value());
    }
}
