package org.pofk.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.Known;
import org.pofk.chain.Model;
import org.pofk.schedule.ScheduledEntrance;
import org.pofk.schedule.ScheduledPassage;
import org.pofk.schedule.ScheduledWait;
import org.pofk.steps.KnownValue;

/** A first passage under a schedule as JSON: format {@code pofk-schedule-passage}. */
public final class ScheduledPassageJson {
    private ScheduledPassageJson() {
    }

    /** The text; {@code digits} are the significant digits of decimals, {@code model} has the start asked about. */
    public static String write(Model model, Optional<Known> known, ScheduledPassage found, int digits) {
        return ScheduledJson.write("passage", model, found.timetable(), digits, (json, writer) -> {
            new JsonGiven(json).write(known);
            json.texts("into", names(model, found.into()));
            json.texts("avoiding", names(model, found.avoiding()));
            json.text("word", word(found));
            json.optional("wait", found.entrance(), entrance -> json.object(() ->
                    wait(json, writer, entrance.first())));
            json.optional("return", found.entrance().flatMap(ScheduledEntrance::back), back ->
                    json.object(() -> wait(json, writer, back)));
            json.optional("visits", found.visits(), visits -> json.object(() ->
                    value(json, writer, "steps", visits.steps())));
            json.list("percentiles", found.percentiles(), each -> json.object(() -> {
                json.text("p", each.p().toString());
                json.optional("k", each.k().stream().boxed().findFirst(), k -> json.count(k));
            }));
            json.optional("decay", found.decay(), decay -> json.object(() -> {
                writer.value("perCycle", decay.perCycle());
                writer.value("perStep", decay.perStep());
            }));
            json.optional("overCycles", found.over(), over -> json.object(() -> {
                json.list("law", over.laws(), writer::over);
                json.list("distribution", over.distributions(), writer::over);
                json.list("survival", over.survivals(), writer::over);
                json.optional("givenThatItHappens", over.happening(), happening -> json.object(() -> {
                    json.name("law");
                    writer.over(happening.law());
                    json.name("distribution");
                    writer.over(happening.distribution());
                }));
            }));
            json.list("values", found.values(), at -> json.object(() -> {
                json.count("k", at.k());
                writer.value("law", at.law());
                writer.value("distribution", at.distribution());
                writer.value("survival", at.survival());
                value(json, writer, "hazard", at.hazard());
            }));
            List<ScheduledWait> each = found.entrance().map(ScheduledEntrance::fromEach).orElse(List.of());
            json.list("fromEach", IntStream.range(0, each.size()).boxed().toList(), state -> json.object(() -> {
                json.text("state", model.chain().states().get(state));
                wait(json, writer, each.get(state));
            }));
        });
    }

    private static String word(ScheduledPassage found) {
        return !found.isDecided() ? "undecided"
                : found.entrance().filter(entrance -> entrance.first().isExact()).isPresent() ? "exact" : "certified";
    }

    private static void wait(Json json, ScheduledJson writer, ScheduledWait wait) {
        json.text("ever", wait.ever().name().toLowerCase(Locale.ROOT));
        writer.value("probability", wait.probability());
        value(json, writer, "mean", wait.mean());
        value(json, writer, "variance", wait.variance());
    }

    private static void value(Json json, ScheduledJson writer, String name, Optional<KnownValue> value) {
        value.ifPresentOrElse(known -> writer.value(name, known), () -> json.text(name, Optional.empty()));
    }

    private static List<String> names(Model model, List<Integer> states) {
        return states.stream().map(model.chain().states()::get).toList();
    }
}
