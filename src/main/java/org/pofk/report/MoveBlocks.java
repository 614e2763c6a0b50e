package org.pofk.report;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Adjustment.Reason;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** The moves of a model: each number with how its author writes it, so that what a {@code rest} came to is seen. */
final class MoveBlocks {
    static final int LISTED_UP_TO = 150;
    private static final int CHANGES_LISTED_UP_TO = 40;

    private final Model model;
    private final Chain chain;
    private final Map<Move, String> written = new HashMap<>();

    private record Move(int from, int to) {
    }

    private MoveBlocks(Model model) {
        this.model = model;
        this.chain = model.chain();
        model.written().forEach(each -> written.put(new Move(each.from(), each.to()), each.text()));
    }

    static List<Block> of(Model model) {
        return new MoveBlocks(model).blocks();
    }

    private List<Block> blocks() {
        boolean isChain = chain.kind() == Chain.Kind.CHAIN;
        List<Block> blocks = new ArrayList<>(List.of(new Heading(3, isChain ? "Transitions" : "Coefficients")));
        int moves = chain.matrix().columns().stream().mapToInt(List::size).sum();
        if (moves > LISTED_UP_TO) {
            blocks.add(new Paragraph(moves + " moves between " + chain.size() + " states, too many to be listed here;"
                    + " they are those of the model file, whose checksum is at the end."));
        } else {
            blocks.add(table(isChain ? "probability" : "coefficient"));
        }
        List<Prose> changes = model.changes().stream().filter(change -> moves > LISTED_UP_TO
                || change.reason() != Reason.REST_OF_MOVES).map(change -> ModelHead.words(change.text())).toList();
        if (!changes.isEmpty()) {
            blocks.add(new Paragraph("What was worked out or changed on entry"
                    + (changes.size() > CHANGES_LISTED_UP_TO ? ", the first " + CHANGES_LISTED_UP_TO + " of "
                            + changes.size() + " entries:" : ":")));
            blocks.add(new Items(changes.stream().limit(CHANGES_LISTED_UP_TO).toList()));
            if (changes.size() > CHANGES_LISTED_UP_TO) {
                blocks.add(new Paragraph("And " + (changes.size() - CHANGES_LISTED_UP_TO) + " more."));
            }
        }
        return blocks;
    }

    private Table table(String number) {
        List<List<Prose>> rows = new ArrayList<>();
        for (int from = 0; from < chain.size(); from++) {
            for (SparseMatrix.Entry entry : chain.matrix().columns().get(from)) {
                rows.add(List.of(Prose.name(chain.states().get(from)), Prose.name(chain.states().get(entry.row())),
                        Prose.of(entry.value().toString()), asWritten(from, entry)));
            }
        }
        return new Table(Prose.EMPTY, List.of(Prose.of("from"), Prose.of("to"), Prose.of(number),
                Prose.of("as written")), rows);
    }

    private Prose asWritten(int from, SparseMatrix.Entry entry) {
        return Optional.ofNullable(written.get(new Move(from, entry.row()))).map(Prose::name)
                .orElseGet(() -> Prose.of(entry.value().equals(Rational.ONE) ? "stays" : ""));
    }
}
