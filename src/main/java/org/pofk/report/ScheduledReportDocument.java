package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.answer.Simulation;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Schedule.Action;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Figure;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.steps.KnownValue;

/**
 * The document an analyst hands in on a model with inspections or phases: results first, then course and values, what
 * was modelled, the formulas by step of the cycle, why they hold, how they were checked, and what it stands on.
 */
public final class ScheduledReportDocument {
    private final ScheduledReport report;
    private final ScheduledModel found;
    private final Model model;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledReportDocument(ScheduledReport report, Style style) {
        this.report = report;
        this.found = report.found();
        this.model = found.model();
        this.style = style;
    }

    /**
     * What is brief leaves out the matrices and how it was checked, not why it holds. What is other than in the same
     * report of an earlier model is marked and told.
     */
    public static Document of(ScheduledReport report, Report.Depth depth, Style style, Convention convention) {
        Document document = alone(report, depth, style, convention);
        return report.since().map(earlier -> ReissuedDocument.of(
                alone(earlier.asMadeLike(report), depth, style, convention), document, Reissue.of(Issue.of(earlier),
                        Issue.of(report)), style)).orElse(document);
    }

    private static Document alone(ScheduledReport report, Report.Depth depth, Style style, Convention convention) {
        ScheduledReportDocument document = new ScheduledReportDocument(report, style);
        document.firstPage();
        document.course();
        document.sections(ReportSection.Place.RESULTS);
        document.blocks.addAll(ScheduledModelBlocks.of(report.found()));
        document.formulas();
        if (depth == Report.Depth.FULL) {
            document.matrices(convention);
        }
        document.proof(convention);
        if (depth == Report.Depth.FULL) {
            report.simulation().ifPresent(document::simulation);
        }
        document.sections(ReportSection.Place.CHECKS);
        document.blocks.addAll(ProvenanceBlocks.of(report.provenance()));
        return new Document(document.blocks);
    }

    private void heading(String text) {
        blocks.add(new Heading(2, text));
    }

    private void firstPage() {
        blocks.addAll(ModelHead.withoutAssumptions(model));
        model.settings().stream().map(SettingProse::line).forEach(blocks::add);
        heading("Question");
        List<Prose> questions = found.outputs().stream().map(output -> QuestionProse.of(output.output(), model))
                .toList();
        blocks.add(questions.size() == 1 ? new Paragraph(questions.get(0)) : new Items(questions));
        heading("Result");
        for (ScheduledOutput output : found.outputs()) {
            if (found.outputs().size() > 1) {
                blocks.add(new Heading(3, OutputProse.title(output.output())));
            }
            blocks.addAll(RegimeBlocks.of(found.timetable(), output, style));
            blocks.add(new Labelled("holds", holds(output)));
        }
        if (!report.answers().isEmpty()) {
            heading("Answers");
            report.answers().forEach(answer -> blocks.addAll(answer.keyFigures()));
        }
        blocks.add(Caution.ofInspections(model));
    }

    private void sections(ReportSection.Place place) {
        blocks.addAll(ReportDocument.sections(report.answers(), place));
    }

    private static String holds(ScheduledOutput output) {
        Optional<KnownValue.Word> word = output.first().map(course -> course.average().word());
        if (word.isEmpty()) {
            return MissingBlocks.NOT_DECIDED;
        }
        String values = word.get() == KnownValue.Word.EXACT ? "the first cycle exactly"
                : "the first cycle within its enclosures";
        return values + (output.over().isEmpty() ? ", by stepping; the long run with the word beside it"
                : ", by stepping; the formulas for every cycle m ≥ 0, proved");
    }

    private void course() {
        heading("Course and values");
        report.course().ifPresent(chart -> blocks.add(new Figure(
                Prose.of("Course of ").and(Prose.names(chart.curves().stream().map(Chart.Curve::name).toList()))
                        .and(" over steps"), chart)));
        CycleTables.values(found, style).ifPresent(blocks::add);
    }

    private void formulas() {
        for (ScheduledOutput output : found.outputs()) {
            blocks.add(new Heading(2, OutputProse.title(output.output())));
            blocks.addAll(ScheduledDocument.formulas(found, output, style));
        }
    }

    private void matrices(Convention convention) {
        heading("The matrices");
        Timetable timetable = found.timetable();
        for (int i = 0; i < timetable.moves().size(); i++) {
            matrix(timetable.moves().size() == 1 ? "The moves of a step" : "Moves " + (i + 1), new Action("",
                    timetable.moves().get(i)), convention);
        }
        timetable.actions().forEach(action -> matrix("The action '" + action.name() + "'", action, convention));
    }

    private void matrix(String caption, Action action, Convention convention) {
        blocks.addAll(new MatrixBlocks(model.chain().states(), action.matrix(), convention).of(caption));
    }

    private void proof(Convention convention) {
        heading("Why it holds");
        blocks.add(new Paragraph("S is the product of the matrices of the steps of one cycle, the "
                + (convention == Convention.COLUMNS ? "last" : "first") + " on the left: each step moves and then does"
                + " what is due. So " + state(convention, ScheduleProse.step(found.timetable(), "m", "")) + " = "
                + powers(convention) + ", and at step j of the cycle an output weighs the components of that by fixed"
                + " numbers, c(j): y(" + ScheduleProse.step(found.timetable(), "m", "j") + ") = "
                + (convention == Convention.COLUMNS ? "c(j) " + powers(convention) : powers(convention) + " c(j)")
                        + "."));
        List<Proved> proofs = proofs();
        blocks.addAll(CycleProof.theorem(proofs));
        blocks.add(new Paragraph("In the long run the state where cycles begin is a fixed point of S, or of the power"
                + " of S that the cycles recur with; the values by step of the cycle are stepped from there."));
        if (report.answers().stream().anyMatch(answer -> !answer.proofs().isEmpty())) {
            blocks.add(new Paragraph("For a first passage the moves and actions are those of the chain stopped where"
                    + " the wait ends; for totals the state has two more components, what was added up so far and the"
                    + " constant one, so that S is linear there too."));
        }
        blocks.addAll(CycleProof.compared(proofs));
    }

    private static String state(Convention convention, String step) {
        return (convention == Convention.COLUMNS ? "x(" : "p(") + step + ")";
    }

    private String powers(Convention convention) {
        String begin = state(convention, String.valueOf(found.timetable().before()));
        return convention == Convention.COLUMNS ? "S^m " + begin : begin + " S^m";
    }

    /** Of the formulas of the outputs, then of those of the answers. */
    private List<Proved> proofs() {
        return Stream.concat(found.outputs().stream().flatMap(output -> CycleFormulas.proofs(found.timetable(),
                output)),
                report.answers().stream().flatMap(answer -> answer.proofs().stream())).toList();
    }

    private void simulation(Simulation simulation) {
        heading("Compared with simulation");
        blocks.add(SimulationDocument.sampled(simulation.runs(), simulation.seed()));
        blocks.add(new Paragraph("At each step k what is read is read after the actions done there."));
        for (Simulation.Series series : simulation.series()) {
            if (simulation.series().size() > 1) {
                blocks.add(new Heading(3, OutputProse.title(series.output())));
            }
            blocks.addAll(SimulationDocument.series(series, style));
        }
    }
}
