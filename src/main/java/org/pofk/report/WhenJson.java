package org.pofk.report;

import java.util.Locale;
import java.util.Optional;
import org.pofk.answer.Known;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;

/** When an output meets a condition, as JSON: format {@code pofk-when}. */
public final class WhenJson {
    private final Json json;
    private final int digits;

    private WhenJson(Json json, int digits) {
        this.json = json;
        this.digits = digits;
    }

    /** The text for one answer; {@code digits} are the significant digits of decimals. */
    public static String write(Model model, Optional<Known> known, WhenModel.Answer answer, int digits) {
        return Json.ofObject(json -> new WhenJson(json, digits).fields(model, known, answer));
    }

    private void fields(Model model, Optional<Known> known, WhenModel.Answer answer) {
        When when = answer.when();
        JsonHead.write(json, "pofk-when", "when", model);
        new JsonGiven(json).write(known);
        json.text("output", answer.output().name());
        json.text("word", when.decided() ? "exact" : "undecided");
        json.object("condition", () -> {
            json.text("kind", word(when.condition().kind()));
            json.text("bound", when.condition().bound().toString());
        });
        step("first", when.first());
        step("forEverFrom", when.forEverFrom());
        json.list("classes", when.classes(), each -> json.object(() -> {
            json.count("residue", each.residue());
            json.count("modulus", each.modulus());
            json.text("end", word(each.end()));
            step("first", each.first());
            step("forEverFrom", each.forEverFrom());
        }));
        json.text("reason", word(when.reason()));
        json.optional("nearest", answer.nearest(), peak -> json.object(() -> {
            step("k", peak.at());
            json.text("exact", peak.value().exact().map(Object::toString));
            json.text("decimal", ValueText.number(peak.value(), digits));
        }));
        json.name("longRun");
        new JsonLongRun(json).write(answer.longRun());
        json.list("values", answer.around(), value -> json.object(() -> {
            json.count("k", value.k());
            json.text("exact", value.exact().map(Object::toString));
            json.text("decimal", ValueText.number(value, digits));
        }));
    }

    private void step(String field, Optional<Long> step) {
        json.optional(field, step, json::count);
    }

    private static String word(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
