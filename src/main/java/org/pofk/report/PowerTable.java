package org.pofk.report;

import java.util.List;
import org.pofk.answer.PowerModel;

/** Outputs from each state in turn at the steps asked for, a row for each start, output and step. */
public final class PowerTable {
    private PowerTable() {
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(PowerModel found, int digits) {
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
