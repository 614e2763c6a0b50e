package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** A matrix over states, as a square for few states and as a list of moves for more, turned as the reader wants it. */
final class MatrixBlocks {
    private static final int SQUARE_UP_TO = 12;
    private static final int MOVES_LISTED_AT_MOST = 150;

    private final List<String> states;
    private final SparseMatrix matrix;
    private final Convention convention;

    MatrixBlocks(List<String> states, SparseMatrix matrix, Convention convention) {
        this.states = states;
        this.matrix = matrix;
        this.convention = convention;
    }

    /** The entries. */
    List<Block> of(String caption) {
        if (matrix.size() <= SQUARE_UP_TO) {
            return List.of(square(caption + ", " + direction(), (i, j) -> Prose.of(matrix.at(i, j).toString())));
        }
        int moves = matrix.columns().stream().mapToInt(List::size).sum();
        return List.of(moves <= MOVES_LISTED_AT_MOST ? moves(caption) : new Paragraph(caption + " has " + matrix.size()
                + " rows and columns and " + moves + " entries that are not zero; they are those of the model file."));
    }

    /** zI − A. */
    Block characteristic(String caption) {
        return square(caption + ", " + direction(), (i, j) -> Prose.formula(i == j
                ? Formulas.sum(withoutZero(RationalFunction.Z, matrix.at(i, j).negate()))
                : Formulas.number(matrix.at(i, j).negate())));
    }

    private static List<Formula> withoutZero(Formula z, Rational constant) {
        return constant.isZero() ? List.of(z)
                : List.of(z, constant.signum() < 0 ? Formulas.negated(Formulas.number(constant.negate()))
                        : Formulas.number(constant));
    }

    private String direction() {
        return convention == Convention.COLUMNS ? "from across, to down" : "from down, to across";
    }

    private interface Cell {
        Prose at(int to, int from);
    }

    private Table square(String caption, Cell cell) {
        List<Prose> header = new ArrayList<>(List.of(Prose.EMPTY));
        states.forEach(state -> header.add(Prose.name(state)));
        boolean columns = convention == Convention.COLUMNS;
        return new Table(Prose.of(caption), header, IntStream.range(0, matrix.size()).mapToObj(down -> {
            List<Prose> row = new ArrayList<>(List.of(Prose.name(states.get(down))));
            for (int across = 0; across < matrix.size(); across++) {
                row.add(columns ? cell.at(down, across) : cell.at(across, down));
            }
            return row;
        }).toList());
    }

    private Table moves(String caption) {
        List<List<Prose>> rows = new ArrayList<>();
        for (int from = 0; from < matrix.size(); from++) {
            for (SparseMatrix.Entry entry : matrix.columns().get(from)) {
                rows.add(List.of(Prose.name(states.get(from)), Prose.name(states.get(entry.row())),
                        Prose.of(entry.value().toString())));
            }
        }
        return new Table(Prose.of(caption + ", its entries that are not zero"),
                List.of(Prose.of("from"), Prose.of("to"), Prose.of("entry")), rows);
    }
}
