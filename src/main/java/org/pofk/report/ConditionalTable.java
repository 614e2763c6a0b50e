package org.pofk.report;

import java.util.List;
import org.pofk.answer.Conditional;
import org.pofk.answer.ConditionalModel;
import org.pofk.chain.Model;

/** Outputs given what is known, a row for each output and step; the number's cells are empty where that is impossible. */
public final class ConditionalTable {
    private ConditionalTable() {
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(ConditionalModel found, int digits) {
        StepColumns steps = StepColumns.of(found.model());
        Rows rows = rows(steps, digits);
        for (Conditional output : found.outputs()) {
            output.values().forEach(at -> rows.add(List.of(Prose.name(output.joint().output().name())),
                    steps.cells(at.k()), at.value().map(rows::value).orElse(List.of(Prose.EMPTY, Prose.EMPTY))));
        }
        return rows.table();
    }

    /** What is given has probability zero: no row. */
    public static Document.Table ofNothing(Model model) {
        return rows(StepColumns.of(model), 1).table();
    }

    private static Rows rows(StepColumns steps, int digits) {
        return new Rows(digits, Rows.words("output"), steps.header(), Rows.words("exact", "decimal"));
    }
}
