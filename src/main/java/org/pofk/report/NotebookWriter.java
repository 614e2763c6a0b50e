package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Increment;
import org.pofk.answer.Passage;
import org.pofk.answer.Total;
import org.pofk.answer.TotalModel;
import org.pofk.answer.Wanted;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Output;
import org.pofk.chain.Structure;
import org.pofk.modes.ClosedForm;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.ReportDocument.Part;

/**
 * A derivation as a notebook that proves it again: its prose and formulas are those of the document, its code needs
 * nothing but Python's own library, takes the numbers of the model and of the formula alone from here, and ends with
 * an error where a claim doesn't hold. Nothing in it is decided by a number that was rounded.
 */
public final class NotebookWriter {
    private static final String WHAT_IT_DOES = "The cells of code step the matrix in exact fractions and prove the"
            + " formulas again, independently of the program that wrote them; they need Python's own library alone and"
            + " end with an error where something doesn't hold.";

    private final List<Notebook.Cell> cells = new ArrayList<>();
    private final DerivedModel derived;
    private final Style style;
    private final Convention convention;

    private NotebookWriter(DerivedModel derived, Style style, Convention convention) {
        this.derived = derived;
        this.style = style;
        this.convention = convention;
    }

    /** The notebook as JSON, nbformat 4.5, nothing of it run. */
    public static String write(DerivedModel derived, Style style, Convention convention) {
        NotebookWriter writer = new NotebookWriter(derived, style, convention);
        List<Block> head = new ArrayList<>(ModelHead.of(derived.model()));
        head.add(new Paragraph(WHAT_IT_DOES));
        writer.text(head);
        writer.chain();
        derived.outputs().forEach(writer::output);
        writer.text(List.of(Caution.of(derived.model())));
        return new Notebook(writer.cells).write();
    }

    /** The totals of a model, each proved as outputs of the recursion that adds it up. */
    public static String write(TotalModel found, Style style, Convention convention) {
        List<DerivedModel> recursions = found.totals().stream().map(total -> recursion(found, total)).toList();
        List<Block> head = new ArrayList<>(ModelHead.of(found.model()));
        head.add(new Paragraph(WHAT_IT_DOES));
        head.add(new Paragraph("A total is an output of a linear recursion: the states of the model, and behind them"
                + " what the moves of a step add and what was added before."));
        List<Notebook.Cell> cells = new ArrayList<>();
        for (int i = 0; i < recursions.size(); i++) {
            NotebookWriter writer = new NotebookWriter(recursions.get(i), style, convention);
            writer.text(i == 0 ? head : List.of());
            writer.text(List.of(new Heading(2, OutputProse.title(found.totals().get(i).total().output()))));
            writer.text(TotalBlocks.of(found.model(), found.totals().get(i), style));
            if (i == 0) {
                writer.chain(recursions);
            } else {
                writer.nextChain();
            }
            writer.derived.outputs().forEach(writer::output);
            cells.addAll(writer.cells);
        }
        cells.add(new Notebook.Cell(Notebook.Kind.MARKDOWN, MarkdownWriter.write(List.of(Caution.of(found.model())))));
        return new Notebook(cells).write();
    }

    /**
     * A first passage, its law, distribution and survival proved as outputs of the stopped chain.
     *
     * @param start the chain with the start that was asked about
     */
    public static String write(Model model, Chain start, Passage passage, Style style, Convention convention) {
        Model stopped = model.with(passage.stopped());
        NotebookWriter writer = new NotebookWriter(new DerivedModel(stopped, Structure.of(stopped.chain()),
                List.of(passage.law(), passage.distribution(), passage.survival()), Optional.empty(),
                new Wanted(List.of(), Set.of())), style, convention);
        ReportSection section = PassageDocument.section(start, passage, style);
        List<Block> head = new ArrayList<>(ModelHead.of(model));
        head.add(new Heading(2, section.title()));
        head.addAll(section.blocks());
        head.add(new Paragraph(WHAT_IT_DOES));
        head.add(new Paragraph("They prove law, distribution and survival; moments, percentiles, visits and what holds"
                + " from each state are stated, not worked out again."));
        writer.text(head);
        writer.chain();
        writer.derived.outputs().forEach(writer::output);
        writer.text(List.of(Caution.of(model)));
        return new Notebook(writer.cells).write();
    }

    private static DerivedModel recursion(TotalModel found, Total total) {
        Model model = found.model().with(total.summed().recursion());
        return new DerivedModel(model, Structure.of(model.chain()), total.increment().kind() == Increment.Kind.COSTS
                ? List.of(total.step(), total.total()) : List.of(total.total()), Optional.empty(),
                new Wanted(List.of(), Set.of()));
    }

    /** A whole report, and behind the way of each output its cells of code; where no way is told, behind the proof. */
    public static String write(Report report, Report.Depth depth, Style style, Convention convention) {
        NotebookWriter writer = new NotebookWriter(report.derived(), style, convention);
        List<Part> parts = ReportDocument.parts(report, depth, style, convention);
        List<Part> before = parts.stream().takeWhile(part -> part.proved().isEmpty()).toList();
        before.forEach(writer::part);
        writer.text(WHAT_IT_DOES);
        writer.tools(List.of(report.derived()));
        parts.subList(before.size(), parts.size()).forEach(writer::part);
        return new Notebook(writer.cells).write();
    }

    private void part(Part part) {
        text(part.blocks());
        part.proved().forEach(output -> {
            if (part.blocks().isEmpty()) {
                text(List.of(new Heading(3, OutputProse.atStep(output.output()))));
            }
            proof(output);
            printed(output);
        });
    }

    private void text(List<Block> blocks) {
        if (!blocks.isEmpty()) {
            cells.add(new Notebook.Cell(Notebook.Kind.MARKDOWN, MarkdownWriter.write(blocks)));
        }
    }

    private void text(String paragraph) {
        text(List.of(new Paragraph(paragraph)));
    }

    private void code(String source) {
        cells.add(new Notebook.Cell(Notebook.Kind.CODE, source));
    }

    private void chain() {
        chain(List.of(derived));
    }

    /** Another recursion, to which the tools of the first apply. */
    private void nextChain() {
        text("The recursion in exact fractions, stepped from its start:");
        code(PythonChain.of(derived.model().chain(), convention) + "\npath = [start]");
    }

    /** @param all what the tools given here are to serve */
    private void chain(List<DerivedModel> all) {
        List<Output> outputs = derived.outputs().stream().map(DerivedOutput::output).toList();
        text(ChainBlocks.of(derived.model(), outputs, convention));
        tools(all);
    }

    private void tools(List<DerivedModel> all) {
        text("The model in exact fractions:");
        code(Python.tools("numbers"));
        code(PythonChain.of(derived.model().chain(), convention));
        text("Stepping it, and counting the states that take part:");
        code(Python.tools("steps"));
        text(List.of(new Heading(2, "How the formulas are proved again"), new Paragraph("A matrix of n states"
                + " annihilates y(k) by its characteristic polynomial (Cayley–Hamilton). So a recurrence of order d"
                + " that holds at k = 0 … n − 1 holds at every k, and a closed form that satisfies a recurrence of"
                + " order d and equals y(k) at k = 0 … n + d − 1 equals it at every k."), new Paragraph("A closed form"
                + " is evaluated without its roots: what the roots λ of a factor q add, the sum of R(λ) λ^k, is the"
                + " trace of R(x) x^k in Q[x]/(q).")));
        code(Python.tools("polynomials"));
        code(Python.tools("proof"));
        text("A long run is proved by the poles: those on the unit circle are simple roots of unity, all others lie"
                + " inside.");
        code(Python.tools("long_run"));
        if (all.stream().flatMap(each -> each.outputs().stream()).flatMap(output -> output.closedForm().stream())
                .anyMatch(form -> PythonFormulas.of(form, style.digits()).needsDecimals())) {
            text("Roots, cosines and π to 100 digits, for formulas as they are printed:");
            code(Python.tools("decimals"));
        }
        code(Python.tools("printed"));
        code(Python.tools("figure"));
    }

    private void output(DerivedOutput output) {
        List<Block> told = WayBlocks.of(output, style);
        text(told.isEmpty() ? List.of(new Heading(2, OutputProse.title(output.output()))) : told);
        proof(output);
        text(ResultBlocks.of(output, style));
        printed(output);
    }

    private void proof(DerivedOutput output) {
        output.transform().ifPresent(transform -> {
            text("The terms, the recurrence and Y(z) proved again:");
            code(PythonOutput.transform(transform));
        });
        output.closedForm().ifPresent(form -> {
            text(PythonOutput.isEvaluated(form) ? "The closed form proved again:"
                    : "A factor of high degree has its coefficient as a quotient that is not reduced here. The closed"
                    + " form is not evaluated; what proves it again is the recurrence with Y(z) above, the parts it"
                    + " falls into and its long run are not.");
            if (PythonOutput.isEvaluated(form)) {
                code(PythonOutput.parts(form));
            }
        });
    }

    private void printed(DerivedOutput output) {
        output.closedForm().ifPresent(this::printed);
        output.longRun().ifPresent(checks -> code(output.closedForm().filter(PythonOutput::isEvaluated).isPresent()
                ? PythonLongRun.of(checks.byPoles()) : PythonLongRun.FIGURE_ALONE));
    }

    private void printed(ClosedForm form) {
        PythonFormulas formulas = PythonFormulas.of(form, style.digits());
        text(formulas.isEmpty() ? "The formula has neither short exact forms nor decimals for every number of it; what"
                + " is proved above is the whole of it." : "The formulas as printed, at the first steps:");
        formulas.cells().forEach(this::code);
    }
}
