package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.input.Head.Orientation;
import org.pofk.text.Faults;
import org.pofk.text.Position;

/**
 * A square matrix as written on paper, its cells read: n written rows of n cells.
 *
 * @param rows  a cell that could not be read is nothing, and has its fault already
 * @param place where the matrix begins
 */
record MatrixGrid(List<List<Optional<MatrixGrid.Cell>>> rows, Position place) {

    /** A cell: a number or {@code rest}. */
    record Cell(Share content) {
        Share to(int state) {
            return new Share(state, content.value(), content.position(), content.written(), content.form());
        }
    }

    /**
     * The matrix by columns, entries of column j the moves out of state j. When only the other orientation makes a
     * chain of it, that is the fault.
     */
    SparseMatrix matrix(Orientation orientation, Position said, States states, Head head, Reading reading) {
        Reading trial = new Reading(new Faults(), Overrides.NONE);
        SparseMatrix matrix = read(orientation, states, head, trial);
        boolean otherFits = !trial.faults().isEmpty() && fits(orientation.other(), states, head);
        if (otherFits) {
            String first = trial.faults().list().get(0).message();
            reading.fault(said, "wrong-orientation", "read by " + orientation.word() + ", " + first + "; read by "
                    + orientation.other().word() + " it would fit");
        } else {
            reading.faults().addAll(trial.faults().list());
        }
        reading.changes().addAll(trial.changes());
        reading.written().addAll(trial.written());
        return matrix;
    }

    /** Which orientation makes a chain of the matrix, in words. */
    String fitting(States states, Head head) {
        boolean byColumns = fits(Orientation.COLUMNS, states, head);
        boolean byRows = fits(Orientation.ROWS, states, head);
        if (head.kind() == Chain.Kind.RECURSION) {
            return "columns: column j holds what state j gives; rows: row j holds it";
        }
        if (byColumns && byRows) {
            return "here both would fit";
        }
        if (!byColumns && !byRows) {
            return "here neither fits as it stands";
        }
        return "here only " + (byColumns ? "columns" : "rows") + " would fit";
    }

    private boolean fits(Orientation orientation, States states, Head head) {
        Reading trial = new Reading(new Faults(), Overrides.NONE);
        read(orientation, states, head, trial);
        return trial.faults().isEmpty() && rows.stream().flatMap(List::stream).allMatch(Optional::isPresent);
    }

    private SparseMatrix read(Orientation orientation, States states, Head head, Reading reading) {
        List<List<Entry>> columns = new ArrayList<>();
        for (int state = 0; state < rows.size(); state++) {
            columns.add(column(state, line(orientation, state), orientation, states, head, reading));
        }
        return new SparseMatrix(columns);
    }

    /** The cells that hold the moves out of a state. */
    private List<Optional<Cell>> line(Orientation orientation, int state) {
        return orientation == Orientation.ROWS ? rows.get(state)
                : rows.stream().map(row -> row.get(state)).toList();
    }

    private List<Entry> column(int state, List<Optional<Cell>> line, Orientation orientation, States states, Head head,
            Reading reading) {
        List<Share> shares = new ArrayList<>();
        for (int to = 0; to < line.size(); to++) {
            int target = to;
            line.get(to).ifPresent(cell -> shares.add(cell.to(target)));
        }
        if (head.kind() == Chain.Kind.RECURSION) {
            shares.forEach(share -> reading.written().add(share.from(state)));
            return shares.stream().map(share -> new Entry(share.state(), share.amount())).toList();
        }
        String name = "from '" + states.names().get(state) + "' (" + (orientation == Orientation.ROWS ? "row "
                : "column ") + (state + 1) + ")";
        Distribution moves = Distribution.ofMoves(name, shares.isEmpty() ? place : shares.get(0).position(), shares,
                state, states);
        if (shares.size() < line.size()) {
            moves.eachIsSound(reading);
            return List.of();
        }
        return moves.complete(head.sums(), reading);
    }
}
