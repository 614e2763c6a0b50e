package org.pofk.report;

import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.PowerModel;

/** Outputs from each state in turn as data: JSON of the format {@code pofk-powers}, and rows. */
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

    /** A row for each start, output and step. */
    public static Document.Table table(PowerModel found, int digits) {
        StepColumns steps = StepColumns.of(found.model());
        Rows rows = new Rows(digits, Rows.words("from", "output"), steps.header(), Rows.words("exact", "decimal"));
        List<String> states = found.model().chain().states();
        for (int from = 0; from < states.size(); from++) {
            for (PowerModel.FromEach each : found.found()) {
                Prose start = Prose.name(states.get(from));
                each.byStart().get(from).values().forEach(value -> rows.add(
                        List.of(start, Prose.name(each.output().name())), steps.cells(value.k()), rows.value(value)));
            }
        }
        return rows.table();
    }
}
