package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.claim.FormulaText;

/** A matrix of a claim, as on paper: the outer list holds the written rows. */
final class MatrixContent {
    private MatrixContent() {
    }

    /** The rows; faults where they don't make a square of the model's size. */
    static List<List<FormulaText>> read(Content content, ClaimNames names, ClaimFormulas formulas, Reading reading) {
        if (content.isLatexText()) {
            return formulas.text(content, "a matrix").map(text -> inLatex(text, content, names, formulas, reading))
                    .orElse(List.of());
        }
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

    private static List<List<FormulaText>> inLatex(Content.Text text, Content content, ClaimNames names,
            ClaimFormulas formulas, Reading reading) {
        List<List<String>> rows = LatexGrid.matrix(text.text()).orElse(List.of());
        int size = names.states().orElse(rows.size());
        if (rows.isEmpty()) {
            reading.fault(content.node().position(), "matrix-form", "a matrix in LaTeX is written"
                    + " \\begin{pmatrix} 0.9 & 0.2 \\\\ 0.1 & 0.8 \\end{pmatrix}; or write are: [[0.9, 0.2], [0.1, 0.8]]");
        } else if (rows.size() != size || rows.stream().anyMatch(row -> row.size() != size)) {
            reading.fault(content.node().position(), "size-differs", "the matrix has "
                    + Words.count(rows.size(), "row", "rows") + " of " + rows.stream().map(List::size).distinct()
                    .map(String::valueOf).collect(Collectors.joining(" or ")) + ", but the model has "
                    + Words.count(size, "state", "states"));
        }
        return rows.stream().map(row -> row.stream()
                .flatMap(cell -> formulas.numberIn(cell, text).stream()).toList()).toList();
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
