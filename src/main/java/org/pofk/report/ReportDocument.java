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
    private final List<Part> parts = new ArrayList<>();

    /**
     * A stretch of a report.
     *
     * @param proved the outputs whose way it tells: a notebook proves their formulas again behind it
     */
    record Part(List<Block> blocks, List<DerivedOutput> proved) {
        Part {
            blocks = List.copyOf(blocks);
            proved = List.copyOf(proved);
        }
    }

    private ReportDocument(Report report, Style style, Convention convention) {
        this.report = report;
        this.style = style;
        this.convention = convention;
    }

    /**
     * What is brief leaves out how the formulas were derived and checked, not why they hold. What is other than in the
     * same report of an earlier model is marked, said in short before all results and in full behind the answers; a
     * file's name alone is no difference.
     */
    public static Document of(Report report, Depth depth, Style style, Convention convention) {
        Document document = alone(report.alone(), depth, style, convention);
        return report.since().map(earlier -> ReissuedDocument.of(
                alone(earlier.asMadeLike(report), depth, style, convention), document, Reissue.of(Issue.of(earlier),
                        Issue.of(report)), style)).orElse(document);
    }

    /** The same in the order a notebook tells it, what has changed before all results. */
    static List<Part> parts(Report report, Depth depth, Style style, Convention convention) {
        ReportDocument document = new ReportDocument(report, style, convention);
        document.write(depth);
        report.since().ifPresent(earlier -> document.parts.set(0, new Part(ReissuedDocument.withChanges(
                new Document(document.parts.get(0).blocks()), Reissue.of(Issue.of(earlier), Issue.of(report)), style)
                .blocks(), List.of())));
        return document.parts;
    }

    private static Document alone(Report report, Depth depth, Style style, Convention convention) {
        ReportDocument document = new ReportDocument(report, style, convention);
        document.write(depth);
        return new Document(document.parts.stream().flatMap(part -> part.blocks().stream()).toList(),
                report.derived().outputs().stream()
                        .flatMap(output -> output.transform().map(OutputSequence::of).stream()).toList());
    }

    private void write(Depth depth) {
        add(answers());
        switch (depth) {
            case FULL -> {
                derivation();
                add(ProofBlocks.of(report, convention));
                add(CheckBlocks.of(report.derived(), style));
            }
            case BRIEF -> {
                add(ReportSummary.longFormulas(report, style));
                add(ProofBlocks.of(report, convention));
                parts.add(new Part(List.of(), report.derived().outputs()));
            }
        }
        add(grounds());
    }

    private void add(List<Block> blocks) {
        parts.add(new Part(blocks, List.of()));
    }

    /** The first page, the values, each answer in a section of its own, and what was modelled. */
    private List<Block> answers() {
        DerivedModel derived = report.derived();
        List<Block> blocks = new ArrayList<>(ReportSummary.of(report, style));
        blocks.addAll(values(report, style));
        blocks.addAll(sections(report.answers(), Place.RESULTS));
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
    static List<Block> sections(List<ReportSection> answers, Place place) {
        List<Block> blocks = new ArrayList<>();
        answers.stream().filter(answer -> answer.place() == place).forEach(answer -> {
            blocks.add(new Heading(2, answer.title()));
            blocks.addAll(answer.blocks());
        });
        return blocks;
    }

    /** From the matrix to the closed forms and their long runs. */
    private void derivation() {
        DerivedModel derived = report.derived();
        add(ChainBlocks.worked(derived.model(), outputs(derived), convention));
        List<Block> blocks = new ArrayList<>(WayBlocks.rule(derived.outputs()));
        derived.outputs().forEach(output -> {
            blocks.addAll(WayBlocks.worked(output, style));
            blocks.addAll(MissingBlocks.way(output));
            parts.add(new Part(blocks, List.of(output)));
            blocks.clear();
        });
        PoleChart.of(derived).ifPresent(chart -> blocks.add(new Figure(Prose.of("Poles and the unit circle"), chart)));
        blocks.addAll(LongRunBlocks.of(report, style));
        add(blocks);
    }

    /** The checks of what others state, and what the report stands on. */
    private List<Block> grounds() {
        List<Block> blocks = new ArrayList<>(sections(report.answers(), Place.CHECKS));
        blocks.addAll(ProvenanceBlocks.of(report.provenance()));
        return blocks;
    }
}
