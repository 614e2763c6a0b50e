package org.pofk.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.pofk.answer.ConditionalWhen;
import org.pofk.answer.Known;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.longrun.Settling;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.ScheduledWhen;
import org.pofk.steps.KnownValue;
import org.pofk.steps.StepValue;

/** When an output meets a condition, as JSON: format {@code pofk-when}. */
public final class WhenJson {
    private static final String FORMAT = "pofk-when";
    private static final String COMMAND = "when";

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

    /** The text for the one answer given what is known at k. */
    public static String write(ConditionalWhen found, int digits) {
        return Json.ofObject(json -> new WhenJson(json, digits).fields(found));
    }

    /** The text for the one answer under a schedule. */
    public static String write(ScheduledWhen found, Optional<Known> known, int digits) {
        return Json.ofObject(json -> new WhenJson(json, digits).fields(found, known));
    }

    private void fields(ScheduledWhen found, Optional<Known> known) {
        ScheduledWhen.Answer answer = found.answers().get(0);
        JsonHead.write(json, FORMAT, COMMAND, found.model());
        new JsonGiven(json).write(known);
        json.text("side", word(found.sides()));
        met(answer.output(), answer.when());
        for (String absent : List.of("nearest", "longRun", "settling")) {
            json.name(absent);
            json.nothing();
        }
        json.list("values", answer.around().stream().flatMap(reading -> found.sides().all().stream()
                .map(side -> new SidedValue(reading.j(), side, reading.at(side)))).toList(), this::value);
    }

    private record SidedValue(int k, Side side, KnownValue value) {
    }

    private void value(SidedValue at) {
        json.object(() -> {
            json.count("k", at.k);
            json.text("side", word(at.side));
            json.text("exact", at.value.exact().map(Object::toString));
            json.text("decimal", KnownText.number(at.value, digits));
        });
    }

    private void fields(Model model, Optional<Known> known, WhenModel.Answer answer) {
        JsonHead.write(json, FORMAT, COMMAND, model);
        new JsonGiven(json).write(known);
        met(answer.output(), answer.when());
        json.optional("nearest", answer.nearest(), peak -> json.object(() -> {
            step("k", peak.at());
            json.text("exact", peak.value().exact().map(Object::toString));
            json.text("decimal", ValueText.number(peak.value(), digits));
        }));
        json.name("longRun");
        new JsonLongRun(json).write(answer.longRun());
        json.optional("settling", answer.settling(), this::settling);
        json.list("values", answer.around(), value -> value(value.k(), Optional.of(value)));
    }

    private void fields(ConditionalWhen found) {
        ConditionalWhen.Answer answer = found.answers().get(0);
        JsonHead.write(json, FORMAT, COMMAND, found.model());
        new JsonGiven(json).write(found.given(), Optional.empty(), Optional.empty());
        met(answer.output(), answer.when());
        json.name("nearest");
        json.nothing();
        json.name("longRun");
        json.nothing();
        json.name("settling");
        json.nothing();
        json.name("conditionalLongRun");
        new JsonConditionalLongRun(json, digits).write(answer.longRun());
        json.list("values", answer.around(), at -> value(at.k(), at.value()));
    }

    private void met(Output output, When when) {
        json.text("output", output.name());
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
    }

    private void settling(Settling settling) {
        json.object(() -> {
            json.count("digits", settling.digits());
            json.text("from", settling.from().toString());
            json.text("slowest", decimal(settling.slowest()));
            json.count("tied", settling.tied());
            json.count("power", settling.power());
            json.text("halfLife", decimal(settling.halfLife()));
            json.text("period", decimal(settling.period()));
        });
    }

    private Optional<String> decimal(Optional<Enclosed> value) {
        return value.map(each -> Decimals.of(each, digits).text());
    }

    private void value(int k, Optional<StepValue> value) {
        json.object(() -> {
            json.count("k", k);
            json.text("exact", value.flatMap(StepValue::exact).map(Object::toString));
            json.text("decimal", value.map(each -> ValueText.number(each, digits)));
        });
    }

    private void step(String field, Optional<Long> step) {
        json.optional(field, step, json::count);
    }

    private static String word(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
