package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.Total;
import org.pofk.answer.TotalModel;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Sequence;

/** What is spent in states, entered and paid over steps, as a document. */
public final class TotalDocument {
    private TotalDocument() {
    }

    public static Document of(TotalModel found, Style style) {
        List<Block> blocks = new ArrayList<>(ModelHead.of(found.model()));
        List<Sequence> sequences = new ArrayList<>();
        for (Total total : found.totals()) {
            blocks.add(new Heading(2, OutputProse.title(total.total().output())));
            blocks.addAll(TotalBlocks.of(found.model(), total, style));
            total.total().transform().ifPresent(transform -> sequences.add(OutputSequence.of(transform)));
        }
        if (!found.isComplete()) {
            blocks.add(new Labelled("not decided", "within the budget: " + (found.wanted() - found.totals().size())
                    + " more"));
        }
        blocks.add(Caution.of(found.model()));
        return new Document(blocks, sequences);
    }

    /** The place the totals have in a report. */
    public static ReportSection section(TotalModel found, Prose title, Style style) {
        List<Block> blocks = new ArrayList<>();
        List<Labelled> keyFigures = new ArrayList<>();
        List<Proved> proofs = new ArrayList<>();
        for (Total total : found.totals()) {
            blocks.add(new Heading(3, OutputProse.title(total.total().output())));
            blocks.addAll(TotalBlocks.of(found.model(), total, style));
            proofs.addAll(TotalBlocks.proofs(total));
            keyFigures.addAll(TotalBlocks.keyFigures(found.model(), total, style).stream().limit(1)
                    .map(each -> TotalBlocks.keyFigure(total.total().output(), each)).toList());
        }
        return new ReportSection(ReportSection.Place.RESULTS, title, keyFigures, blocks, proofs,
                found.isComplete() ? ReportSection.Standing.ANSWERED : ReportSection.Standing.NOT_DECIDED);
    }
}
