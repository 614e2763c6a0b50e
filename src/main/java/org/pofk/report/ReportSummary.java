package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.KeyFigures;
import org.pofk.answer.Peak;
import org.pofk.chain.Model;
import org.pofk.formula.Formula;
import org.pofk.formula.PlainText;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.steps.StepValue;

/** The first page: the question, the result with where it holds, the answers, and the caution. */
final class ReportSummary {
    private static final int VALUES_SHOWN = 4;
    /** A longer exact formula stands in the derivation alone. */
    private static final int EXACT_SHOWN_UP_TO = 220;
    private static final int TERMS_SHOWN_UP_TO = 12;

    private final Report report;
    private final Model model;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ReportSummary(Report report, Style style) {
        this.report = report;
        this.model = report.derived().model();
        this.style = style;
    }

    static List<Block> of(Report report, Style style) {
        ReportSummary summary = new ReportSummary(report, style);
        summary.write();
        return summary.blocks;
    }

    private void write() {
        blocks.addAll(ModelHead.withoutAssumptions(model));
        model.settings().stream().map(SettingProse::line).forEach(blocks::add);
        blocks.add(new Heading(2, "Question"));
        List<Prose> questions = report.derived().outputs().stream()
                .map(output -> QuestionProse.of(output.output(), model)).toList();
        blocks.add(questions.size() == 1 ? new Paragraph(questions.get(0)) : new Items(questions));
        blocks.add(new Heading(2, "Result"));
        for (int i = 0; i < report.derived().outputs().size(); i++) {
            output(report.derived().outputs().get(i), report.figures().get(i));
        }
        if (!report.answers().isEmpty()) {
            blocks.add(new Heading(2, "Answers"));
            report.answers().forEach(answer -> blocks.addAll(answer.keyFigures()));
        }
        blocks.add(Caution.of(model));
    }

    private void output(DerivedOutput output, KeyFigures figures) {
        if (report.derived().outputs().size() > 1) {
            blocks.add(new Heading(3, OutputProse.title(output.output())));
        }
        output.closedForm().ifPresent(form -> {
            formulas(output, form);
            label("holds", holds(form));
        });
        if (!output.isDecided()) {
            label("formula", MissingBlocks.NOT_DECIDED);
        }
        blocks.addAll(facts(output, figures, style));
        if (!output.values().isEmpty()) {
            label("values", values(output.values()));
        }
    }

    private void formulas(DerivedOutput output, ClosedForm form) {
        if (isShort(form, report)) {
            blocks.addAll(ResultBlocks.formulas(output, style));
        } else if (form.modes().size() <= TERMS_SHOWN_UP_TO) {
            blocks.addAll(ResultBlocks.decimals(output, style));
        } else {
            label("formula", "a sum of " + form.modes().size() + " terms, too many for this page; it stands below");
        }
    }

    /** So that all of them have room. */
    private static boolean isShort(ClosedForm form, Report report) {
        Formula exact = form.exactFormula().orElseGet(form::formulaOverRoots);
        return PlainText.UNICODE.write(exact).length() * report.derived().outputs().size() <= EXACT_SHOWN_UP_TO;
    }

    /** The formulas that are too long for the first page, where no derivation ends with them. */
    static List<Block> longFormulas(Report report, Style style) {
        List<DerivedOutput> left = report.derived().outputs().stream()
                .filter(output -> output.closedForm().filter(form -> !isShort(form, report)).isPresent()).toList();
        List<Block> blocks = new ArrayList<>();
        if (!left.isEmpty()) {
            blocks.add(new Heading(2, "Formulas in full"));
            left.forEach(output -> blocks.addAll(ResultBlocks.formulas(output, style)));
        }
        return blocks;
    }

    private static String holds(ClosedForm form) {
        int from = form.withoutImpulsesFrom();
        return (form.isExactThroughout() ? "exact" : "certified") + " for every k ≥ 0, proved"
                + (from > 0 ? "; without the delta terms from k = " + from + " on" : "");
    }

    /** Where an output tends to, when it is there, and how high it gets. */
    static List<Labelled> facts(DerivedOutput output, KeyFigures figures, Style style) {
        List<Labelled> facts = new ArrayList<>();
        output.longRun().ifPresent(checks -> {
            LongRun longRun = checks.byPoles();
            facts.add(new Labelled("long run", new LongRunProse(style.digits()).of(longRun)));
            figures.settling().ifPresent(settling -> facts.add(new Labelled("settles",
                    SettlingProse.of(settling, longRun, style.digits()))));
            highest(output, longRun, figures, style).ifPresent(text -> facts.add(new Labelled("highest", text)));
        });
        return facts;
    }

    /** Nothing where it may grow for ever; a formula without any figures is one whose figures a budget left no time for. */
    private static Optional<String> highest(DerivedOutput output, LongRun longRun, KeyFigures figures, Style style) {
        if (figures.highest().isPresent()) {
            Peak peak = figures.highest().get();
            return Optional.of(ValueText.of(peak.value(), style.digits()) + peak.at().map(k -> " at k = " + k)
                    .orElse(", approached as k grows"));
        }
        return output.closedForm().isEmpty() || longRun instanceof LongRun.None ? Optional.empty()
                : Optional.of(figures.equals(KeyFigures.NONE) ? MissingBlocks.NOT_DECIDED : "not decided");
    }

    /** A few, spread over those that are listed later and differ from the one before. */
    private String values(List<StepValue> listed) {
        List<String> texts = listed.stream().map(value -> ValueText.of(value, style.digits())).toList();
        List<StepValue> all = IntStream.range(0, listed.size())
                .filter(i -> i == 0 || !texts.get(i).equals(texts.get(i - 1))).mapToObj(listed::get).toList();
        int last = all.size() - 1;
        return String.join("; ", IntStream.range(0, VALUES_SHOWN).map(i -> i * last / (VALUES_SHOWN - 1)).distinct()
                .mapToObj(all::get).map(value -> ValueText.of(value, style.digits()) + " at k = " + value.k()).toList());
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }
}
