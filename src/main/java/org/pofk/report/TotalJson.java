package org.pofk.report;

import java.util.Locale;
import org.pofk.answer.Total;
import org.pofk.answer.TotalModel;
import org.pofk.exact.Rational;
import org.pofk.steps.StepValue;

/** What is spent in states, entered and paid over steps, as JSON: format {@code pofk-total}. */
public final class TotalJson {
    private final Json json;
    private final int digits;

    private TotalJson(Json json, int digits) {
        this.json = json;
        this.digits = digits;
    }

    /** The text; {@code digits} are the significant digits of decimals. */
    public static String write(TotalModel found, int digits) {
        return Json.ofObject(json -> new TotalJson(json, digits).fields(found));
    }

    private void fields(TotalModel found) {
        JsonHead.write(json, "pofk-total", "total", found.model());
        json.text("unit", found.model().costs().map(costs -> costs.unit()));
        json.count("undecided", found.wanted() - found.totals().size());
        json.list("totals", found.totals(), this::total);
    }

    private void total(Total total) {
        json.object(() -> {
            json.text("kind", total.increment().kind().name().toLowerCase(Locale.ROOT));
            json.text("of", total.increment().name());
            json.text("factor", total.factor().toString());
            json.name("step");
            new JsonOutput(json, digits).write(total.step());
            json.name("total");
            new JsonOutput(json, digits).write(total.total());
            json.object("growth", () -> {
                json.text("word", "exact");
                json.text("perStep", total.growth().perStep().toString());
                json.name("beyond");
                new JsonLongRun(json).write(total.growth().beyond());
                json.text("everything", total.growth().everything().map(Rational::toString));
            });
            json.list("averages", total.averages(), this::value);
        });
    }

    private void value(StepValue value) {
        json.object(() -> {
            json.count("k", value.k());
            json.text("exact", value.exact().map(Rational::toString));
            json.text("decimal", ValueText.number(value, digits));
        });
    }
}
