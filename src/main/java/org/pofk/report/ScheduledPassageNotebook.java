package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.pofk.answer.Percentile;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Paragraph;
import org.pofk.schedule.CycleFormula;
import org.pofk.schedule.ScheduledEntrance;
import org.pofk.schedule.ScheduledPassage;
import org.pofk.schedule.ScheduledWait;
import org.pofk.steps.KnownValue;

/**
 * A first passage under a schedule as a notebook that steps the stopped chain in exact fractions, proves the formulas
 * over the cycles again, works out the moments by first-step analysis, and ends with an error where something doesn't
 * hold.
 */
public final class ScheduledPassageNotebook {
    private final ScheduledPassage passage;
    private final Chain chain;
    private final Style style;
    private final NotebookCells cells = new NotebookCells();

    private ScheduledPassageNotebook(ScheduledPassage passage, Chain chain, Style style) {
        this.passage = passage;
        this.chain = chain;
        this.style = style;
    }

    /**
     * The notebook as JSON, nbformat 4.5, nothing of it run.
     *
     * @param model with the start that was asked about
     */
    public static String write(Model model, ScheduledPassage passage, Style style) {
        ScheduledPassageNotebook notebook = new ScheduledPassageNotebook(passage, model.chain(), style);
        ReportSection section = ScheduledPassageDocument.section(model.chain(), passage, style);
        List<Block> head = new ArrayList<>(ModelHead.of(model));
        head.add(new Heading(2, section.title()));
        notebook.cells.text(Stream.concat(head.stream(), section.blocks().stream()).toList());
        notebook.checks();
        notebook.cells.text(List.of(Caution.ofInspections(model)));
        return notebook.cells.write();
    }

    private void checks() {
        cells.text(List.of(new Heading(2, "Checked again"), new Paragraph("The cells of code step the chain that is stopped"
                + " where the wait ends, in exact fractions; they prove the formulas over the cycles again and work out"
                + " probability, mean and variance step by step from what is entered. They need Python's own library"
                + " alone and end with an error where something doesn't hold. The decay is stated, not worked out"
                + " again.")));
        cells.schedule(passage.stopped().chain(), passage.stopped().timetable());
        cells.code(Python.tools("entrance"));
        cells.code("into, avoiding = " + passage.into() + ", " + passage.avoiding()
                + "\nc = [Fraction(int(i in into)) for i in range(len(states))]\nconstant = Fraction(0)");
        values();
        passage.entrance().ifPresent(this::moments);
        percentiles(passage.percentiles());
        passage.over().ifPresent(over -> {
            over.distributions().forEach(this::distribution);
            cells.text(Prose.of("P(T > k) is what P(T ≤ k) lacks to one, and P(T = k) what it is above P(T ≤ k − 1)."));
        });
    }

    private void values() {
        List<ScheduledPassage.At> stepped = passage.values().stream().filter(at -> PythonCycles.isStepped(at.k()))
                .toList();
        if (!stepped.isEmpty()) {
            cells.code(PythonCycles.values("P(T ≤ k) as stepped, at the steps listed",
                    stepped.stream().map(ScheduledPassage.At::k).toList(),
                    stepped.stream().map(ScheduledPassage.At::distribution).toList()));
        }
        if (stepped.size() < passage.values().size()) {
            cells.text(Prose.of("Values at later steps are stated, not stepped again here."));
        }
    }

    private void moments(ScheduledEntrance entrance) {
        if (!entrance.first().isExact()) {
            cells.text(Prose.of("Probability, mean and variance are certified and stated, not worked out again here."));
            return;
        }
        ScheduledWait wait = entrance.first();
        String stated = Stream.of(Optional.of(wait.probability()), wait.mean(), wait.variance())
                .flatMap(Optional::stream).map(ScheduledPassageNotebook::exact).collect(Collectors.joining("\n"));
        String each = entrance.fromEach().stream().map(from -> exact(from.probability()) + "\n"
                + from.mean().map(ScheduledPassageNotebook::exact).orElse("0")).collect(Collectors.joining("\n"));
        cells.code(String.join("\n", "h, u, w = first_entrance(into, avoiding)",
                "require(\"probability, and mean and variance where it happens\", holds(\"\"\"", stated,
                "\"\"\", moments_of(h, u, w)))",
                "require(\"probability and mean from each state\", holds(\"\"\"", each,
                "\"\"\", [value for a, b in zip(h, u) for value in (a, b / a if a != 0 else Fraction(0))]))"));
    }

    private static String exact(KnownValue value) {
        return value.exact().orElseThrow().toString();
    }

    private void percentiles(List<Percentile> percentiles) {
        List<String> lines = new ArrayList<>();
        percentiles.stream().filter(each -> each.k().isPresent() && PythonCycles.isStepped(each.k().getAsInt()))
                .forEach(each -> lines.add("    (" + each.k().getAsInt() + ", Fraction(\"" + each.p() + "\")),"));
        if (!lines.isEmpty()) {
            lines.add(0, "percentiles = [  # the step, and the probability with which it has happened by then");
            lines.addAll(List.of("]", "for k, p in percentiles:",
                    "    before, by_then = at_steps(c, constant, [max(k - 1, 0), k])",
                    "    require(f\"{p} by k = {k}, not before\", by_then >= p and (k == 0 or before < p))"));
            cells.code(String.join("\n", lines));
        }
        if (percentiles.stream().anyMatch(each -> each.k().isPresent()
                && !PythonCycles.isStepped(each.k().getAsInt()))) {
            cells.text(Prose.of("Percentiles at later steps are stated, not stepped again here."));
        }
    }

    private void distribution(CycleFormula formula) {
        PythonCycles python = new PythonCycles(passage.stopped().timetable());
        Prose left = ScheduledPassageDocument.left(passage, "≤", formula, "");
        if (python.isProved(formula)) {
            cells.code(python.formula(left, formula, style.digits()));
        } else {
            cells.text(left.and(" is stated, not proved again here: its terms would take too many steps."));
        }
    }
}
