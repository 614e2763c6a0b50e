package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.chain.Model.Convention;
import org.pofk.report.Document.Block;

/** What {@code derive} found, as a document. */
public final class DerivationDocument {
    private DerivationDocument() {
    }

    /** The result alone. */
    public static Document result(DerivedModel derived, Style style) {
        List<Block> blocks = new ArrayList<>(ModelHead.of(derived.model()));
        results(derived, style, blocks);
        return ended(blocks, derived);
    }

    /** The way to it alone, from the matrix to the closed form and the modes of the whole state. */
    public static Document derivation(DerivedModel derived, Style style, Convention convention) {
        List<Block> blocks = new ArrayList<>(ModelHead.of(derived.model()));
        way(derived, style, convention, WayBlocks::withClosedForm, blocks);
        return ended(blocks, derived);
    }

    /** The result first, then the way to it. */
    public static Document all(DerivedModel derived, Style style, Convention convention) {
        List<Block> blocks = new ArrayList<>(ModelHead.of(derived.model()));
        results(derived, style, blocks);
        way(derived, style, convention, WayBlocks::of, blocks);
        return ended(blocks, derived);
    }

    private static void results(DerivedModel derived, Style style, List<Block> blocks) {
        for (DerivedOutput output : derived.outputs()) {
            blocks.addAll(ResultBlocks.of(output, style));
            blocks.addAll(MissingBlocks.checks(output, derived.wanted()));
        }
        List<DerivedOutput> listed = derived.outputs().stream().filter(output -> !output.values().isEmpty()).toList();
        if (!listed.isEmpty()) {
            blocks.add(ValuesTable.of(listed, style.digits()));
        }
        blocks.addAll(MissingBlocks.values(derived));
    }

    private static void way(DerivedModel derived, Style style, Convention convention,
            BiFunction<DerivedOutput, Style, List<Block>> wayOf, List<Block> blocks) {
        blocks.addAll(ChainBlocks.of(derived.model(), derived.outputs().stream().map(DerivedOutput::output).toList(),
                convention));
        derived.outputs().forEach(output -> {
            blocks.addAll(wayOf.apply(output, style));
            blocks.addAll(MissingBlocks.way(output));
        });
        derived.state().ifPresent(state -> blocks.addAll(
                StateBlocks.of(state, derived.model().chain().states(), style)));
        blocks.addAll(MissingBlocks.state(derived));
    }

    private static Document ended(List<Block> blocks, DerivedModel derived) {
        blocks.add(Caution.of(derived.model()));
        return new Document(blocks, derived.outputs().stream()
                .flatMap(output -> output.transform().map(OutputSequence::of).stream()).toList());
    }
}
