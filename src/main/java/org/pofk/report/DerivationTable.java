package org.pofk.report;

import java.util.List;
import org.pofk.answer.DerivedModel;

/** What {@code derive} found at the steps asked for, a row for each output and step. */
public final class DerivationTable {
    private DerivationTable() {
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(DerivedModel derived, int digits) {
        StepColumns steps = StepColumns.of(derived.model());
        Rows rows = new Rows(digits, Rows.words("output"), steps.header(), Rows.words("exact", "decimal"));
        derived.outputs().forEach(output -> output.values().forEach(value -> rows.add(
                List.of(Prose.name(output.output().name())), steps.cells(value.k()), rows.value(value))));
        return rows.table();
    }
}
