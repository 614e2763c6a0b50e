package org.pofk.report;

import java.util.List;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Total;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;

/**
 * Totals as rows that each say one number: what a step adds, the total and its average by step; without a step, how
 * much the total grows by in the long run, and the total over all steps where that is finite.
 */
public final class TotalTable {
    private final StepColumns steps;
    private final Rows rows;

    private TotalTable(Model model, int digits) {
        steps = StepColumns.of(model);
        rows = new Rows(digits, Rows.words("of", "quantity"), steps.header(), Rows.words("exact", "decimal"));
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(TotalModel found, int digits) {
        TotalTable table = new TotalTable(found.model(), digits);
        found.totals().forEach(table::total);
        return table.rows.table();
    }

    private void total(Total total) {
        byStep(total, "in the step", total.step());
        byStep(total, "total", total.total());
        if (total.factor().isOne()) {
            total.averages().forEach(value ->
                    rows.add(of(total), Rows.words("average of a step"), steps.cells(value.k()), rows.value(value)));
            number(total, "a step in the long run", total.growth().perStep());
        }
        total.growth().everything().ifPresent(value -> number(total, "over all steps", value));
    }

    private void byStep(Total total, String quantity, DerivedOutput output) {
        output.values().forEach(value ->
                rows.add(of(total), Rows.words(quantity), steps.cells(value.k()), rows.value(value)));
    }

    private void number(Total total, String quantity, Rational value) {
        rows.add(of(total), Rows.words(quantity), steps.none(), rows.value(value));
    }

    private static List<Prose> of(Total total) {
        return List.of(Prose.name(total.total().output().name()));
    }
}
