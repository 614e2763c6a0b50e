package org.pofk.report;

import java.util.Locale;
import org.pofk.schedule.ScheduledTotal;
import org.pofk.schedule.ScheduledTotalModel;

/** Totals under a schedule as JSON: format {@code pofk-schedule-total}. */
public final class ScheduledTotalJson {
    private ScheduledTotalJson() {
    }

    /** The text; {@code digits} are the significant digits of decimals. */
    public static String write(ScheduledTotalModel found, int digits) {
        return ScheduledJson.write("total", found.model(), found.timetable(), digits, (json, writer) -> {
            json.text("unit", found.model().costs().map(costs -> costs.unit()));
            json.list("totals", found.totals(), total -> json.object(() -> total(json, writer, total)));
        });
    }

    private static void total(Json json, ScheduledJson writer, ScheduledTotal total) {
        json.text("name", total.total().name());
        json.text("counts", total.increment().kind().name().toLowerCase(Locale.ROOT));
        json.text("factor", total.factor().toString());
        json.text("word", !total.isDecided() ? "undecided" : total.over().isPresent() ? "exact" : "certified");
        json.optional("overCycles", total.over(), over -> json.object(() -> {
            json.name("total");
            writer.over(over.total());
            json.name("added");
            writer.over(over.cycle());
            json.text("perCycle", over.growth().perStep().toString());
            json.text("perStep", total.perStep().orElseThrow().toString());
            json.text("everything", over.growth().everything().map(Object::toString));
            json.name("beyond");
            new JsonLongRun(json).write(over.growth().beyond());
        }));
        json.optional("bounds", total.bounds(), bounds -> json.object(() -> {
            json.optional("perCycle", bounds.perCycle(), writer::value);
            json.optional("perStep", bounds.perStep(), writer::value);
            json.optional("everything", bounds.everything(), writer::value);
        }));
        json.list("values", total.values().stream().filter(at -> at.total().isPresent()).toList(), at ->
                json.object(() -> {
            json.count("k", at.k());
            writer.value("total", at.total().orElseThrow());
            json.name("average");
            at.average().ifPresentOrElse(writer::value, json::nothing);
        }));
    }
}
