package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.transform.Lumping;
import org.pofk.transform.Reduction;

/** What a derivation starts from: the matrix, the start, the outputs, and which states take part. */
final class ChainBlocks {
    private static final int WRITTEN_OUT_UP_TO = 12;
    private static final int CHARACTERISTIC_UP_TO = 5;
    /** A wider matrix doesn't fit a page. */
    private static final int WORKED_UP_TO = 8;

    private final Model model;
    private final List<Output> outputs;
    private final Convention convention;
    private final List<Block> blocks = new ArrayList<>();

    private ChainBlocks(Model model, List<Output> outputs, Convention convention) {
        this.model = model;
        this.outputs = outputs;
        this.convention = convention;
    }

    static List<Block> of(Model model, List<Output> outputs, Convention convention) {
        ChainBlocks chain = new ChainBlocks(model, outputs, convention);
        chain.write();
        return chain.blocks;
    }

    /** The same where the moves, with what was changed on entry, have been listed before. */
    static List<Block> worked(Model model, List<Output> outputs, Convention convention) {
        ChainBlocks chain = new ChainBlocks(model, outputs, convention);
        chain.writeWorked();
        return chain.blocks;
    }

    private void write() {
        heading();
        blocks.addAll(matrix().of(symbol()));
        if (!model.changes().isEmpty()) {
            blocks.add(new Items(model.changes().stream().map(change -> Prose.name(change.text())).toList()));
        }
        vectors();
        if (model.chain().size() <= CHARACTERISTIC_UP_TO) {
            blocks.add(matrix().characteristic("zI − " + symbol()));
        }
        takingPart(Reduction.of(model.chain(), outputs));
    }

    private void writeWorked() {
        heading();
        int size = model.chain().size();
        boolean isWrittenOut = size <= WORKED_UP_TO;
        if (isWrittenOut) {
            blocks.addAll(matrix().of(symbol()));
        } else {
            blocks.add(new Paragraph(symbol() + " is " + size + " × " + size + " with "
                    + model.chain().matrix().columns().stream().mapToInt(List::size).sum() + " entries that are not"
                    + " zero, those of the table of transitions; neither it nor zI − " + symbol() + " is written out"
                    + " above " + WORKED_UP_TO + " states."));
        }
        vectors();
        if (isWrittenOut) {
            blocks.add(matrix().characteristic("zI − " + symbol()));
        }
        takingPart(Reduction.of(model.chain(), outputs));
    }

    private boolean isByColumns() {
        return convention == Convention.COLUMNS;
    }

    private String symbol() {
        return isByColumns() ? "A" : "P";
    }

    private MatrixBlocks matrix() {
        return new MatrixBlocks(model.chain().states(), model.chain().matrix(), convention);
    }

    private void heading() {
        blocks.add(new Heading(2, isByColumns() ? "From x(k+1) = A x(k) to Y(z)" : "From p(k+1) = p(k) P to Y(z)"));
    }

    private void vectors() {
        Chain chain = model.chain();
        boolean columns = isByColumns();
        blocks.add(new Labelled(columns ? "x(0)" : "p(0)", vector(chain.start())));
        for (Output output : outputs) {
            blocks.add(new Labelled(Prose.of("c of ").andName(output.name()), vector(output.coefficients())
                    .and(output.constant().isZero() ? "" : ", plus " + output.constant())));
        }
        blocks.add(new Labelled("transform", columns ? "Y(z) = c (zI − A)^−1 z x(0), the z kept in front"
                : "Y(z) = z p(0) (zI − P)^−1 c, the z kept in front"));
    }

    private Prose vector(List<Rational> values) {
        if (values.size() <= WRITTEN_OUT_UP_TO) {
            return Prose.of(values.stream().map(Rational::toString).collect(Collectors.joining(", ", "(", ")")));
        }
        Map<Rational, List<Integer>> places = IntStream.range(0, values.size()).filter(i -> !values.get(i).isZero())
                .boxed().collect(Collectors.groupingBy(values::get, LinkedHashMap::new, Collectors.toList()));
        List<Prose> entries = places.entrySet().stream().map(each -> Prose.of(each.getKey() + " at ")
                .and(StateNames.of(each.getValue(), model.chain().states()))).toList();
        return Prose.joined(entries, "; ").and("; 0 elsewhere");
    }

    private void takingPart(Reduction reduction) {
        int size = model.chain().size();
        List<Integer> kept = reduction.kept().stream().filter(state -> state < size).toList();
        if (kept.size() < size) {
            blocks.add(new Paragraph(Prose.of(kept.size() + " of " + size + " states take part (the start reaches them,"
                    + " and they reach an output): ").and(names(kept))));
        }
        reduction.lumpings().forEach(lumping -> lumping(lumping, reduction));
    }

    private Prose names(List<Integer> states) {
        return Prose.names(states.stream().map(this::name).toList());
    }

    private String name(int state) {
        return state < model.chain().size() ? model.chain().states().get(state) : "1";
    }

    private void lumping(Lumping lumping, Reduction reduction) {
        blocks.add(new Paragraph(switch (lumping.kind()) {
            case EXACT -> "The start is the same throughout these blocks, and so stays the state; states of a block are"
                    + " taken together: " + (isByColumns() ? "A U = U Ã, x(0) = U x̃(0), c̃ = c U."
                            : "U P = P̃ U, p(0) = p̃(0) U, c̃ = U c.");
            case ORDINARY -> "The outputs are the same throughout these blocks, and only their sums are needed; states"
                    + " of a block are taken together: " + (isByColumns() ? "V A = Ã V, c = c̃ V, x̃(0) = V x(0)."
                            : "P V = V P̃, c = V c̃, p̃(0) = p(0) V.");
        }));
        boolean first = lumping.equals(reduction.lumpings().get(0));
        blocks.add(new Items(IntStream.range(0, lumping.blocks().size()).mapToObj(i -> Prose.of("block "
                + (i + 1) + ": ").and(first ? names(lumping.blocks().get(i).stream().map(reduction.kept()::get).toList())
                        : Prose.of(lumping.blocks().get(i).stream().map(place -> "block " + (place + 1) + " above")
                                .collect(Collectors.joining(", "))))).toList()));
        List<String> blockNames = IntStream.rangeClosed(1, lumping.blocks().size()).mapToObj(i -> "block " + i).toList();
        blocks.addAll(new MatrixBlocks(blockNames, lumping.after().matrix(), convention)
                .of(isByColumns() ? "Ã" : "P̃"));
    }
}
