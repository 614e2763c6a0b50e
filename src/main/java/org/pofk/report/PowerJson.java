package org.pofk.report;

import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.PowerModel;

/** Outputs from each state in turn, the entries of A^k among them, as JSON: format {@code pofk-powers}. */
public final class PowerJson {
    private PowerJson() {
    }

    /** {@code digits} are the significant digits of decimals. */
    public static String write(PowerModel found, int digits) {
        return Json.ofObject(json -> {
            JsonHead.write(json, "pofk-powers", "derive", found.model());
            json.count("undecided", found.wanted() - found.found().size());
            List<String> states = found.model().chain().states();
            json.list("starts", IntStream.range(0, states.size()).boxed().toList(), from -> json.object(() -> {
                json.text("from", states.get(from));
                json.list("outputs", found.found(), each ->
                        new JsonOutput(json, digits).write(each.byStart().get(from)));
            }));
        });
    }
}
