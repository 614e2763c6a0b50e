package org.pofk.report;

import java.util.List;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;

/**
 * A report that is issued again: what is other is marked, said in short before all results and in full behind the
 * answers.
 */
final class ReissuedDocument {
    private ReissuedDocument() {
    }

    /** @param before the earlier report, written as if it were about the later one's files */
    static Document of(Document before, Document after, Reissue reissue, Style style) {
        return withChanges(DocumentDifference.marked(before, after), reissue, style);
    }

    /** The same without marks. */
    static Document withChanges(Document document, Reissue reissue, Style style) {
        return document.with(document.blocks().indexOf(ModelBlocks.TITLE), ChangeBlocks.of(reissue, style))
                .with(firstSection(document.blocks()), ChangeSummary.of(reissue, style));
    }

    private static int firstSection(List<Block> blocks) {
        return (int) blocks.stream().takeWhile(block -> !(block instanceof Heading heading) || heading.level() < 2)
                .count();
    }
}
