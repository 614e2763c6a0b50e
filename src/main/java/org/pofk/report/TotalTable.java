package org.pofk.report;

import java.util.List;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Total;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
import org.pofk.schedule.ScheduledTotal;
import org.pofk.schedule.ScheduledTotal.Bounds;
import org.pofk.schedule.ScheduledTotalModel;
import org.pofk.steps.KnownValue;

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

    /** The same under a schedule, which gives no step of its own; how much a cycle adds in the long run besides. */
    public static Document.Table of(ScheduledTotalModel found, int digits) {
        TotalTable table = new TotalTable(found.model(), digits);
        found.totals().forEach(table::total);
        return table.rows.table();
    }

    private void total(ScheduledTotal total) {
        List<Prose> of = List.of(Prose.name(total.total().name()));
        total.values().forEach(at -> at.total().ifPresent(value ->
                rows.add(of, Rows.words("total"), steps.cells(at.k()), rows.value(value))));
        if (total.factor().isOne()) {
            total.values().forEach(at -> at.average().ifPresent(value ->
                    rows.add(of, Rows.words("average of a step"), steps.cells(at.k()), rows.value(value))));
            total.perStep().ifPresent(value -> number(of, "a step in the long run", value));
            total.bounds().flatMap(Bounds::perStep).ifPresent(value -> number(of, "a step in the long run", value));
            total.bounds().flatMap(Bounds::perCycle).ifPresent(value -> number(of, "a cycle in the long run", value));
            total.over().ifPresent(over -> number(of, "a cycle in the long run", over.growth().perStep()));
        }
        total.over().flatMap(over -> over.growth().everything()).ifPresent(value -> number(of, "over all steps",
                value));
        total.bounds().flatMap(Bounds::everything).ifPresent(value -> number(of, "over all steps", value));
    }

    private void number(List<Prose> of, String quantity, KnownValue value) {
        rows.add(of, Rows.words(quantity), steps.none(), rows.value(value));
    }

    private void total(Total total) {
        byStep(total, "in the step", total.step());
        byStep(total, "total", total.total());
        if (total.factor().isOne()) {
            total.averages().forEach(value ->
                    rows.add(of(total), Rows.words("average of a step"), steps.cells(value.k()), rows.value(value)));
            number(of(total), "a step in the long run", total.growth().perStep());
        }
        total.growth().everything().ifPresent(value -> number(of(total), "over all steps", value));
    }

    private void byStep(Total total, String quantity, DerivedOutput output) {
        output.values().forEach(value ->
                rows.add(of(total), Rows.words(quantity), steps.cells(value.k()), rows.value(value)));
    }

    private void number(List<Prose> of, String quantity, Rational value) {
        rows.add(of, Rows.words(quantity), steps.none(), rows.value(value));
    }

    private static List<Prose> of(Total total) {
        return List.of(Prose.name(total.total().output().name()));
    }
}
