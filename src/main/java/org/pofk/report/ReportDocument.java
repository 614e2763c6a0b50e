package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.chain.Model.Convention;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;

/**
 * The document an analyst hands in: the results on the first page, then the answers, what was modelled, the derivation,
 * why it holds, how it was checked, and what it stands on.
 */
public final class ReportDocument {
    private final Report report;
    private final Report.Depth depth;
    private final Style style;
    private final Convention convention;

    private ReportDocument(Report report, Report.Depth depth, Style style, Convention convention) {
        this.report = report;
        this.depth = depth;
        this.style = style;
        this.convention = convention;
    }

    public static Document of(Report report, Report.Depth depth, Style style, Convention convention) {
        ReportDocument document = new ReportDocument(report, depth, style, convention);
        List<Block> blocks = new ArrayList<>(before(report, style));
        if (depth == Report.Depth.FULL) {
            blocks.addAll(document.way());
        }
        blocks.addAll(document.results());
        blocks.addAll(after(report));
        return new Document(blocks, report.derived().outputs().stream()
                .flatMap(output -> output.transform().map(OutputSequence::of).stream()).toList());
    }

    /** The first page, and each answer in a section of its own. */
    static List<Block> before(Report report, Style style) {
        List<Block> blocks = new ArrayList<>(ReportSummary.of(report, style));
        report.answers().forEach(answer -> {
            blocks.add(new Heading(2, answer.title()));
            blocks.addAll(answer.blocks());
        });
        return blocks;
    }

    /** From the matrix to the closed forms. */
    private List<Block> way() {
        DerivedModel derived = report.derived();
        List<Block> blocks = new ArrayList<>(ChainBlocks.of(derived.model(),
                derived.outputs().stream().map(DerivedOutput::output).toList(), convention));
        derived.outputs().forEach(output -> {
            blocks.addAll(WayBlocks.of(output, style));
            blocks.addAll(MissingBlocks.way(output));
        });
        return blocks;
    }

    private List<Block> results() {
        DerivedModel derived = report.derived();
        List<Block> blocks = new ArrayList<>();
        derived.outputs().forEach(output -> {
            blocks.addAll(ResultBlocks.of(output, style));
            blocks.addAll(MissingBlocks.checks(output, derived.wanted()));
        });
        List<DerivedOutput> listed = derived.outputs().stream().filter(output -> !output.values().isEmpty()).toList();
        if (!listed.isEmpty()) {
            blocks.add(new Heading(2, "Values"));
            blocks.add(ValuesTable.of(listed, style.digits()));
        }
        blocks.addAll(MissingBlocks.values(derived));
        return blocks;
    }

    /** What it stands on. */
    static List<Block> after(Report report) {
        return ProvenanceBlocks.of(report.provenance());
    }
}
