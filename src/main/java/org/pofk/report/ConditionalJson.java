package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.Conditional;
import org.pofk.answer.ConditionalModel;
import org.pofk.answer.Given;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
import org.pofk.steps.PossibleSteps;

/** Outputs given what is known at the same step, as JSON: format {@code pofk-conditional}. */
public final class ConditionalJson {
    private static final String FORMAT = "pofk-conditional";

    private final Json json;
    private final JsonOutput outputs;
    private final int digits;

    private ConditionalJson(Json json, int digits) {
        this.json = json;
        this.outputs = new JsonOutput(json, digits);
        this.digits = digits;
    }

    /** The text; {@code digits} are the significant digits of decimals. */
    public static String write(ConditionalModel found, int digits) {
        return Json.ofObject(json -> new ConditionalJson(json, digits).fields(found));
    }

    /** What is given has probability zero at the step. */
    public static String ofNothing(Model model, String command, Given given, int at) {
        return Json.ofObject(json -> {
            JsonHead.write(json, FORMAT, command, model);
            new JsonGiven(json).write(given, Optional.of(at), Optional.of(Rational.ZERO));
            json.name("event");
            json.nothing();
            json.name("impossible");
            json.nothing();
            json.list("outputs", List.of(), each -> { });
        });
    }

    private void fields(ConditionalModel found) {
        JsonHead.write(json, FORMAT, "derive", found.model());
        new JsonGiven(json).write(found.given(), Optional.empty(), Optional.empty());
        json.name("event");
        outputs.write(found.event());
        json.optional("impossible", found.possible(), possible -> impossible(json, possible));
        json.list("outputs", found.outputs(), this::output);
    }

    /** The steps at which what is known has probability zero. */
    static void impossible(Json json, PossibleSteps possible) {
        json.object(() -> {
            json.list("steps", possible.impossibleBefore(), json::count);
            json.count("from", possible.from());
            json.count("period", possible.period());
            json.list("residues", possible.impossibleResidues(), json::count);
        });
    }

    private void output(Conditional output) {
        json.object(() -> {
            json.text("name", output.joint().output().name());
            json.text("word", output.joint().isDecided() && output.longRun().isPresent() ? "exact" : "undecided");
            json.name("joint");
            outputs.write(output.joint());
            json.optional("longRun", output.longRun(), new JsonConditionalLongRun(json, digits)::write);
            json.list("values", output.values(), this::value);
        });
    }

    private void value(Conditional.At at) {
        json.object(() -> {
            json.count("k", at.k());
            json.text("exact", at.value().flatMap(value -> value.exact()).map(Rational::toString));
            json.text("decimal", at.value().map(value -> ValueText.number(value, digits)));
        });
    }
}
