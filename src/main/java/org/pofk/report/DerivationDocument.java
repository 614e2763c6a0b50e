package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Paragraph;

/** What {@code derive} found, as a document. */
public final class DerivationDocument {
    private DerivationDocument() {
    }

    /** The result alone. */
    public static Document result(DerivedModel derived, Style style) {
        List<Block> blocks = new ArrayList<>(ModelHead.of(derived.model()));
        for (DerivedOutput output : derived.outputs()) {
            blocks.addAll(ResultBlocks.of(output, style));
        }
        List<DerivedOutput> listed = derived.outputs().stream().filter(output -> !output.values().isEmpty()).toList();
        if (!listed.isEmpty()) {
            blocks.add(ValuesTable.of(listed, style.digits()));
        }
        blocks.add(new Paragraph(Caution.TEXT));
        return new Document(blocks);
    }
}
