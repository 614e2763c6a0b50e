package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.LongRun;
import org.pofk.answer.Settling;
import org.pofk.modes.ClosedForm;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;

/** The first page: the question, the result, where it holds, and the caution. */
final class ReportSummary {
    private static final int SETTLED_DIGITS = 6;

    private final Report report;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ReportSummary(Report report, Style style) {
        this.report = report;
        this.style = style;
    }

    static List<Block> of(Report report, Style style) {
        ReportSummary summary = new ReportSummary(report, style);
        summary.write();
        return summary.blocks;
    }

    private void write() {
        blocks.addAll(ModelHead.of(report.derived().model()));
        report.derived().outputs().forEach(this::output);
        if (!report.answers().isEmpty()) {
            blocks.add(new Heading(2, "Answers"));
            report.answers().forEach(answer -> blocks.addAll(answer.keyFigures()));
        }
        blocks.add(new Paragraph(Caution.TEXT));
    }

    private void output(DerivedOutput output) {
        blocks.add(new Heading(2, Prose.of("Result: ").and(OutputProse.title(output.output()))));
        blocks.addAll(ResultBlocks.formulas(output, style));
        output.longRun().ifPresent(checks -> {
            LongRun longRun = checks.byPoles();
            blocks.add(new Labelled("long run", new LongRunProse(style.digits()).of(longRun)));
            output.closedForm().flatMap(form -> settling(form, longRun)).ifPresent(settling -> blocks.add(
                    new Labelled("settles", SettlingProse.of(settling, longRun, style.digits()))));
        });
    }

    private static java.util.Optional<Settling> settling(ClosedForm form, LongRun longRun) {
        return Settling.of(form, longRun, SETTLED_DIGITS);
    }
}
