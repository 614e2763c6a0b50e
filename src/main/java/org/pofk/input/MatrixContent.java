package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.FormulaText;

/** A matrix of a claim, as on paper: the outer list holds the written rows. */
final class MatrixContent {
    private MatrixContent() {
    }

    /** The rows; faults where they don't make a square of the model's size. */
    static List<List<FormulaText>> read(Content content, ClaimNames names, ClaimFormulas formulas, Reading reading) {
        List<Node> rows = reading.sequence(content.node(), "a matrix", "[[0.9, 0.2], [0.1, 0.8]]")
                .map(Node.Sequence::items).orElse(List.of());
        int size = names.states().orElse(rows.size());
        if (content.node().asSequence().isPresent() && rows.size() != size) {
            reading.fault(content.node().position(), "size-differs", "the matrix has "
                    + Words.count(rows.size(), "row", "rows") + ", but the model has "
                    + Words.count(size, "state", "states"));
        }
        List<List<FormulaText>> matrix = new ArrayList<>();
        for (Node row : rows) {
            matrix.add(row(content.part(row), size, formulas, reading));
        }
        return matrix;
    }

    private static List<FormulaText> row(Content row, int size, ClaimFormulas formulas, Reading reading) {
        Optional<Node.Sequence> list = reading.sequence(row.node(), "a row of the matrix", "[0.9, 0.2]");
        List<Node> cells = list.map(Node.Sequence::items).orElse(List.of());
        if (list.isPresent() && cells.size() != size) {
            reading.fault(row.node().position(), "size-differs", "this row has "
                    + Words.count(cells.size(), "number", "numbers") + ", not " + size);
        }
        return cells.stream().flatMap(cell -> formulas.number(row.part(cell), "a number").stream()).toList();
    }
}
