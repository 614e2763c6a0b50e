package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Output;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Figure;
import org.pofk.report.Document.Heading;
import org.pofk.report.Report.Depth;
import org.pofk.report.ReportSection.Place;

/**
 * The document an analyst hands in: the results on the first page, then the answers, what was modelled, the derivation,
 * why it holds, how it was checked, and what it stands on.
 */
public final class ReportDocument {
    private final Report report;
    private final Style style;
    private final Convention convention;
    private final List<Block> blocks = new ArrayList<>();

    private ReportDocument(Report report, Style style, Convention convention) {
        this.report = report;
        this.style = style;
        this.convention = convention;
    }

    /**
     * What is brief leaves out how the formulas were derived and checked, not why they hold. What is other than in the
     * same report of an earlier model is marked, and said before all results; a file's name alone is no difference.
     */
    public static Document of(Report report, Depth depth, Style style, Convention convention) {
        Document document = alone(report.alone(), depth, style, convention);
        return report.since().map(earlier -> DocumentDifference
                .marked(alone(earlier.asMadeLike(report), depth, style, convention), document)
                .with(firstSection(document.blocks()), ChangeBlocks.of(earlier, report, style))).orElse(document);
    }

    private static int firstSection(List<Block> blocks) {
        return (int) blocks.stream().takeWhile(block -> !(block instanceof Heading heading) || heading.level() < 2)
                .count();
    }

    private static Document alone(Report report, Depth depth, Style style, Convention convention) {
        ReportDocument document = new ReportDocument(report, style, convention);
        document.blocks.addAll(before(report, style));
        if (depth == Depth.FULL) {
            document.derivation();
        } else {
            document.blocks.addAll(ReportSummary.longFormulas(report, style));
        }
        document.blocks.addAll(ProofBlocks.of(report));
        if (depth == Depth.FULL) {
            document.blocks.addAll(CheckBlocks.of(report.derived(), style));
        }
        document.blocks.addAll(after(report));
        return new Document(document.blocks, report.derived().outputs().stream()
                .flatMap(output -> output.transform().map(OutputSequence::of).stream()).toList());
    }

    /** The first page, what has changed, the values, each answer in a section of its own, and what was modelled. */
    static List<Block> before(Report report, Style style) {
        DerivedModel derived = report.derived();
        List<Block> blocks = new ArrayList<>(ReportSummary.of(report, style));
        report.since().ifPresent(earlier -> blocks.addAll(firstSection(blocks),
                ChangeBlocks.of(earlier, report, style)));
        blocks.addAll(values(report, style));
        blocks.addAll(sections(report, Place.RESULTS));
        blocks.addAll(ModelBlocks.of(derived.model(), outputs(derived), derived.structure()));
        return blocks;
    }

    private static List<Output> outputs(DerivedModel derived) {
        return derived.outputs().stream().map(DerivedOutput::output).toList();
    }

    private static List<Block> values(Report report, Style style) {
        DerivedModel derived = report.derived();
        List<DerivedOutput> listed = derived.outputs().stream().filter(output -> !output.values().isEmpty()).toList();
        List<Block> blocks = new ArrayList<>();
        report.courses().forEach(chart -> blocks.add(new Figure(Prose.of("Course of ").and(Prose.names(chart.curves()
                .stream().map(Chart.Curve::name).toList())).and(" over steps"), chart)));
        if (!listed.isEmpty()) {
            blocks.add(ValuesTable.of(listed, style.digits()));
        }
        blocks.addAll(MissingBlocks.values(derived));
        if (!blocks.isEmpty()) {
            blocks.add(0, new Heading(2, "Course and values"));
        }
        return blocks;
    }

    /** An answer that is to be part of a report comes here by its {@link ReportSection}. */
    private static List<Block> sections(Report report, Place place) {
        List<Block> blocks = new ArrayList<>();
        report.answers().stream().filter(answer -> answer.place() == place).forEach(answer -> {
            blocks.add(new Heading(2, answer.title()));
            blocks.addAll(answer.blocks());
        });
        return blocks;
    }

    /** From the matrix to the closed forms and their long runs. */
    private void derivation() {
        DerivedModel derived = report.derived();
        blocks.addAll(ChainBlocks.worked(derived.model(), outputs(derived), convention));
        blocks.addAll(WayBlocks.rule(derived.outputs()));
        derived.outputs().forEach(output -> {
            blocks.addAll(WayBlocks.worked(output, style));
            blocks.addAll(MissingBlocks.way(output));
        });
        PoleChart.of(derived).ifPresent(chart -> blocks.add(new Figure(Prose.of("Poles and the unit circle"), chart)));
        blocks.addAll(LongRunBlocks.of(report, style));
    }

    /** The checks of what others state, and what the report stands on. */
    static List<Block> after(Report report) {
        List<Block> blocks = new ArrayList<>(sections(report, Place.CHECKS));
        blocks.addAll(ProvenanceBlocks.of(report.provenance()));
        return blocks;
    }
}
