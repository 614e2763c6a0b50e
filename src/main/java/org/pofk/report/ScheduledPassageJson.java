package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.FirstEntrance;
import org.pofk.answer.Known;
import org.pofk.chain.Model;
import org.pofk.schedule.ScheduledPassage;

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
            json.text("word", found.over().isPresent() ? "exact" : "undecided");
            json.optional("overCycles", found.over(), over -> json.object(() -> over(json, writer, model, over)));
            json.list("values", found.values(), at -> json.object(() -> {
                json.count("k", at.k());
                writer.value("distribution", at.distribution());
                writer.value("survival", at.survival());
            }));
        });
    }

    private static List<String> names(Model model, List<Integer> states) {
        return states.stream().map(model.chain().states()::get).toList();
    }

    private static void over(Json json, ScheduledJson writer, Model model, ScheduledPassage.OverCycles over) {
        json.text("probability", over.moments().probability().toString());
        json.text("mean", over.moments().mean().map(Object::toString));
        json.text("variance", over.moments().variance().map(Object::toString));
        json.list("percentiles", over.percentiles(), each -> json.object(() -> {
            json.text("p", each.p().toString());
            json.optional("k", each.k().stream().boxed().findFirst(), k -> json.count(k));
        }));
        json.list("distribution", over.distributions(), writer::over);
        FirstEntrance each = over.fromEach();
        json.list("fromEach", IntStream.range(0, each.means().size()).boxed().toList(), state -> json.object(() -> {
            json.text("state", model.chain().states().get(state));
            json.text("probability", each.probabilities().get(state).toString());
            json.text("mean", each.means().get(state).map(Object::toString));
        }));
    }
}
