package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.schedule.ScheduledChain;
import org.pofk.schedule.ScheduledTotal;
import org.pofk.schedule.ScheduledTotalModel;

/**
 * Totals under a schedule as a notebook that steps the recursion that adds up in exact fractions, proves the formulas
 * over the cycles again, and ends with an error where something doesn't hold.
 */
public final class ScheduledTotalNotebook {
    private ScheduledTotalNotebook() {
    }

    /** The notebook as JSON, nbformat 4.5, nothing of it run. */
    public static String write(ScheduledTotalModel found, Style style) {
        NotebookCells cells = new NotebookCells();
        List<Block> head = new ArrayList<>(ModelHead.of(found.model()));
        head.add(new Document.Paragraph("A total is an output of a linear recursion: the states of the model, and"
                + " behind them what was added up so far and the constant one. The cells of code step it in exact"
                + " fractions and prove the formulas over the cycles again; they need Python's own library alone and"
                + " end with an error where something doesn't hold. What is said of growth in the long run is stated, not"
                + " worked out again."));
        cells.text(head);
        for (int i = 0; i < found.totals().size(); i++) {
            ScheduledTotal total = found.totals().get(i);
            ScheduledChain recursion = total.recursion();
            cells.text(List.of(new Heading(2, OutputProse.title(total.total()))));
            cells.text(ScheduledTotalDocument.section(found, total, style));
            if (i == 0) {
                cells.schedule(recursion.chain(), recursion.timetable());
            } else {
                cells.text(Prose.of("The recursion, what it moves by and when:"));
                cells.code(List.of(PythonSchedule.of(recursion.chain(), recursion.timetable()), PythonSchedule.BEGIN));
            }
            cells.code("c = " + Python.numbers(total.total().coefficients()) + "\nconstant = Fraction(\""
                    + total.total().constant() + "\")");
            proofs(cells, total, style);
        }
        cells.text(List.of(Caution.ofInspections(found.model())));
        return cells.write();
    }

    private static void proofs(NotebookCells cells, ScheduledTotal total, Style style) {
        Prose name = Prose.name(total.total().name());
        List<ScheduledTotal.At> stepped = total.values().stream().filter(at -> PythonCycles.isStepped(at.k())
                && at.total().isPresent()).toList();
        if (!stepped.isEmpty()) {
            cells.code(PythonCycles.values(total.total().name() + ": the values listed, as stepped",
                    stepped.stream().map(ScheduledTotal.At::k).toList(),
                    stepped.stream().map(at -> at.total().orElseThrow()).toList()));
        }
        PythonCycles python = new PythonCycles(total.recursion().timetable());
        total.over().ifPresent(over -> {
            if (python.isProved(over.total()) && python.isProved(over.cycle())) {
                cells.code(python.formula(name.and("(" + ScheduleProse.stepOf(total.recursion().timetable(), 0) + ")"),
                        over.total(), style.digits()));
                cells.code(python.added(name.and(", added by cycle m"), over.cycle(), style.digits()));
            } else {
                cells.text(Prose.of("The formulas over the cycles are stated, not proved again here: their terms would"
                        + " take too many steps."));
            }
        });
        if (stepped.size() < total.values().size()) {
            cells.text(Prose.of("Values at later steps are stated, not stepped again here."));
        }
    }
}
