package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Model.Convention;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.schedule.PeriodicRegime;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.schedule.StretchFormula;

/**
 * What was found about a model with a schedule as a notebook that steps moves and actions in exact fractions, checks
 * the first cycle and the long run, proves the formulas again whose terms aren't too many, and ends with an error where
 * a value isn't the one stated or outside its enclosure, or a formula doesn't hold.
 */
public final class ScheduledNotebook {
    private final NotebookCells cells = new NotebookCells();
    private final ScheduledModel found;
    private final Style style;

    private ScheduledNotebook(ScheduledModel found, Style style) {
        this.found = found;
        this.style = style;
    }

    /** The notebook as JSON, nbformat 4.5, nothing of it run. */
    public static String write(ScheduledModel found, Style style) {
        ScheduledNotebook notebook = new ScheduledNotebook(found, style);
        notebook.head();
        found.outputs().forEach(notebook::output);
        notebook.cells.text(List.of(Caution.ofInspections(found.model())));
        return notebook.cells.write();
    }

    /** A whole report, and behind it the cells that check its numbers. */
    public static String write(ScheduledReport report, Report.Depth depth, Style style, Convention convention) {
        ScheduledNotebook notebook = new ScheduledNotebook(report.found(), style);
        notebook.cells.text(ScheduledReportDocument.of(report, depth, style, convention).blocks());
        notebook.cells.text(List.of(new Heading(2, "Checked again")));
        notebook.tools();
        report.found().outputs().forEach(output -> {
            notebook.checks(output);
            notebook.proofs(output);
        });
        if (!report.answers().isEmpty()) {
            notebook.cells.text(Prose.of("The answers are not worked out again here; pofk passage and pofk total"
                    + " write notebooks that prove theirs."));
        }
        return notebook.cells.write();
    }

    private void head() {
        List<Block> head = new ArrayList<>(ModelHead.of(found.model()));
        cells.text(head);
        tools();
    }

    private void tools() {
        cells.text(Prose.of("The cells of code step moves and actions in exact fractions, check the first cycle and the"
                + " long run, and prove the formulas again, independently of the program that wrote them; they need"
                + " Python's own library alone and end with an error where something doesn't hold. What is certified is"
                + " checked to lie in its enclosure. A formula that would take too many steps is stated, not proved"
                + " again, and said to be so."));
        cells.schedule(found.model().chain(), found.timetable());
    }

    private void output(ScheduledOutput output) {
        List<Block> blocks = new ArrayList<>(List.of(new Heading(2, OutputProse.title(output.output()))));
        blocks.addAll(RegimeBlocks.of(found.timetable(), output, style));
        cells.text(blocks);
        checks(output);
        cells.text(ScheduledDocument.formulas(found, output, style));
        proofs(output);
    }

    /** Of the formulas, or that they are only stated. */
    private void proofs(ScheduledOutput output) {
        List<String> proofs = new ArrayList<>();
        List<Prose> stated = new ArrayList<>();
        PythonCycles python = new PythonCycles(found.timetable());
        CycleFormulas formulas = CycleFormulas.of(found.timetable(), output);
        output.within().forEach(formula -> {
            boolean isFirst = formula.cycle() == StretchFormula.Cycle.FIRST;
            Prose name = formulas.left(formula).and(isFirst ? " in the first cycle" : " in the long run");
            if (python.isProved(formula.closedForm(), formula.to())) {
                proofs.add(PythonCycles.within(name, formula, "stepped(" + (isFirst ? "begin" : "settled")
                        + ", cycle)"));
            } else {
                stated.add(name);
            }
        });
        output.over().forEach(formula -> {
            Prose name = formulas.left(formula).and(formulas.side(formula));
            if (python.isProved(formula)) {
                proofs.addAll(python.formula(name, formula, style.digits()));
            } else {
                stated.add(name);
            }
        });
        output.joint().ifPresent(formula -> {
            boolean isProved = output.over().stream().allMatch(python::isProved) && formula.terms().stream()
                    .allMatch(term -> python.isProved(term.within(), formula.to()));
            if (isProved) {
                proofs.add(PythonCycles.joint(formulas.leftOfBoth(), formula));
            } else {
                stated.add(formulas.leftOfBoth());
            }
        });
        if (!proofs.isEmpty()) {
            cells.text(Prose.of("These formulas proved again; in the code a cycle m is called k where a formula is"
                    + " written as it is printed:"));
        }
        cells.code(proofs);
        if (!stated.isEmpty()) {
            cells.text(Prose.of("Not proved again here, as their terms would take too many steps: ")
                    .and(Prose.joined(stated, "; ")).and("."));
        }
    }

    private void checks(ScheduledOutput output) {
        String name = output.output().name();
        cells.code("c = " + Python.numbers(output.output().coefficients()) + "\nconstant = Fraction(\""
                + output.output().constant() + "\")");
        output.preamble().ifPresent(course -> cells.code(PythonSchedule.course(name + " before the cycles", course,
                "stepped(start, preamble)")));
        output.first().ifPresent(course -> cells.code(PythonSchedule.course(name + " in the first cycle", course,
                "stepped(begin, cycle)")));
        output.regime().ifPresent(regime -> regime.accept(new Regime(name)));
    }

    private final class Regime implements PeriodicRegime.Visitor<Boolean> {
        private final String name;

        Regime(String name) {
            this.name = name;
        }

        @Override
        public Boolean recurring(PeriodicRegime.Recurring recurring) {
            int cycles = recurring.cycles();
            cells.code("settled = limit(begin, " + cycles + ")\nrequire(\"it is a fixed point of S^" + cycles
                    + "\", stepped(settled, cycle * " + cycles + ")[-1][1] == settled)\n"
                    + PythonSchedule.course(name + " in the long run", recurring.course(),
                            "stepped(settled, cycle * " + cycles + ")"));
            return true;
        }

        @Override
        public Boolean none(PeriodicRegime.None none) {
            return false;
        }
    }
}
