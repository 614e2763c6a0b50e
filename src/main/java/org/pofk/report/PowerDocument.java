package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.PowerModel;
import org.pofk.chain.Chain;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** Outputs from each state in turn, the entries of A^k among them, as a document. */
public final class PowerDocument {
    private final PowerModel found;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private PowerDocument(PowerModel found, Style style) {
        this.found = found;
        this.style = style;
    }

    public static Document of(PowerModel found, Style style) {
        PowerDocument document = new PowerDocument(found, style);
        document.blocks.addAll(ModelHead.ofEachStart(found.model()));
        document.blocks.add(new Paragraph("From each state in turn: what is expected after k steps, for every k ≥ 0. For"
                + " all states these are the entries of A^k."));
        Chain chain = found.model().chain();
        document.blocks.addAll(IntStream.range(0, chain.size()).parallel().mapToObj(document::from)
                .flatMap(List::stream).toList());
        document.found.found().forEach(document::values);
        if (!found.isComplete()) {
            document.blocks.add(new Labelled("not decided", "within the budget: "
                    + (found.wanted() - found.found().size()) + " more outputs"));
        }
        document.blocks.add(Caution.of(found.model()));
        return new Document(document.blocks);
    }

    private List<Block> from(int state) {
        List<Block> own = new ArrayList<>(List.of(
                new Heading(2, Prose.of("From ").andName(found.model().chain().states().get(state)))));
        for (PowerModel.FromEach each : found.found()) {
            DerivedOutput output = each.byStart().get(state);
            own.addAll(ResultBlocks.proved(output, OutputProse.atStep(output.output()), "states", style));
            output.longRun().ifPresent(checks -> own.add(new Labelled("long run",
                    new LongRunProse(style.digits()).of(checks.byPoles()))));
        }
        return own;
    }

    private void values(PowerModel.FromEach each) {
        if (each.byStart().get(0).values().isEmpty()) {
            return;
        }
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k")));
        found.model().chain().states().forEach(state -> header.add(Prose.of("from ").andName(state)));
        int rows = each.byStart().get(0).values().size();
        blocks.add(new Table(OutputProse.atStep(each.output()).and(" from each state"), header,
                IntStream.range(0, rows).mapToObj(row -> {
                    List<Prose> cells = new ArrayList<>(List.of(
                            Prose.of(String.valueOf(each.byStart().get(0).values().get(row).k()))));
                    each.byStart().forEach(output ->
                            cells.add(Prose.of(ValueText.of(output.values().get(row), style.digits()))));
                    return cells;
                }).toList()));
    }
}
