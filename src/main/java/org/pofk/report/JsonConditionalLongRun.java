package org.pofk.report;

import java.util.Locale;
import org.pofk.answer.ConditionalLongRun;

/** The long run of a conditional value as a JSON object; a place where what is known is impossible is null. */
record JsonConditionalLongRun(Json json, int digits) {

    void write(ConditionalLongRun longRun) {
        JsonNumbers numbers = new JsonNumbers(json, digits);
        json.object(() -> {
            json.text("kind", longRun.kind().name().toLowerCase(Locale.ROOT).replace('_', ' '));
            json.list("values", longRun.values(), value ->
                    value.ifPresentOrElse(numbers::number, json::nothing));
        });
    }
}
