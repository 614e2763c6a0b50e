package org.pofk.input;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Written.Form;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.chain.SparseMatrix;
import org.pofk.input.Head.Orientation;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** The section {@code matrix}: entries in the file, or in a table beside it, and which of the two sums to one. */
final class MatrixSection {
    private static final List<String> KEYS = List.of("orientation", "entries", "file", "separator", "names", "sums");

    private final Position place;
    private final Fields fields;
    private final Optional<Orientation> orientation;
    private final Optional<Sums> sums;
    private final Reading reading;
    private final Optional<List<? extends List<? extends Node>>> cells;
    private final List<Node.Scalar> names;

    private MatrixSection(Node.Mapping written, Position place, Optional<Path> folder, Reading reading) {
        this.place = place;
        this.reading = reading;
        this.fields = Fields.of(written, Place.of(Part.MATRIX), KEYS, reading);
        this.orientation = fields.value("orientation")
                .flatMap(node -> reading.keyword(node, "the orientation", Orientation.values()));
        this.sums = fields.value("sums").flatMap(node -> reading.keyword(node, "'sums'", Sums.values()));
        Optional<NamedTable> table = fields.value("file").flatMap(node -> table(node, folder));
        this.names = table.map(NamedTable::names).orElse(List.of());
        this.cells = table.isPresent() ? table.map(NamedTable::cells)
                : fields.value("entries").flatMap(this::entries);
        checkOneSource();
    }

    /**
     * Reads the section.
     *
     * @param place where its key stands
     */
    static MatrixSection read(Node.Mapping written, Position place, Optional<Path> folder, Reading reading) {
        return new MatrixSection(written, place, folder, reading);
    }

    Optional<Orientation> orientation() {
        return orientation;
    }

    /** The names that the table gives its states; none when it gives none. */
    List<Node.Scalar> names() {
        return names;
    }

    /** n, where the matrix could be read. */
    Optional<Integer> size() {
        return cells.map(List::size);
    }

    SparseMatrix matrix(States states, Head head, Amounts amounts) {
        List<List<SparseMatrix.Entry>> nothing = Collections.nCopies(states.size(), List.of());
        Optional<List<List<Optional<MatrixGrid.Cell>>>> rows = cells.map(written -> cells(written, head, amounts));
        if (fields.value("orientation").isEmpty()) {
            String fitting = rows.filter(read -> read.size() == states.size())
                    .map(read -> "; " + new MatrixGrid(read, place).fitting(states, head)).orElse("");
            reading.fault(place, "orientation-missing", "the key 'orientation' is missing; write orientation: columns "
                    + "when each column adds up to 1, orientation: rows when each row does" + fitting);
        }
        if (rows.isEmpty() || orientation.isEmpty()) {
            return new SparseMatrix(nothing);
        }
        if (rows.get().size() != states.size()) {
            reading.fault(place, "size-differs", "the matrix has " + rows.get().size()
                    + " rows and columns, but " + states.count() + "; these must be equal in number");
            return new SparseMatrix(nothing);
        }
        Optional<List<Integer>> found = order(states);
        if (found.isEmpty()) {
            return new SparseMatrix(nothing);
        }
        List<Integer> order = found.get();
        List<List<Optional<MatrixGrid.Cell>>> ordered = order.stream()
                .map(i -> order.stream().map(j -> rows.get().get(i).get(j)).toList()).toList();
        return new MatrixGrid(ordered, place).matrix(orientation.get(),
                fields.value("orientation").get().position(), states, head.with(sums), reading);
    }

    /** For each state its row in the table; faults and nothing when the table names other states. */
    private Optional<List<Integer>> order(States states) {
        if (names.isEmpty()) {
            return Optional.of(IntStream.range(0, states.size()).boxed().toList());
        }
        States inTable = States.named(names, reading);
        boolean allKnown = names.stream().map(name -> states.find(name, reading)).filter(Optional::isPresent).count()
                == states.size();
        return allKnown && inTable.size() == states.size()
                ? Optional.of(states.names().stream().map(inTable::place).toList()) : Optional.empty();
    }

    private void checkOneSource() {
        boolean inFile = fields.value("file").isPresent();
        if (inFile == fields.value("entries").isPresent()) {
            reading.fault(place, "matrix-source", inFile
                    ? "the matrix has both 'entries' and 'file'; leave one of them out"
                    : "the matrix lacks its numbers; write entries: [[…], …] or file: NAME.csv");
        }
    }

    private List<List<Optional<MatrixGrid.Cell>>> cells(List<? extends List<? extends Node>> written, Head head,
            Amounts amounts) {
        return written.stream().map(row -> row.stream().map(node -> cell(node, head, amounts)).toList()).toList();
    }

    private static Optional<MatrixGrid.Cell> cell(Node node, Head head, Amounts amounts) {
        return head.kind() == Chain.Kind.CHAIN ? amounts.share(node, 0, Place.of(Part.MATRIX)).map(MatrixGrid.Cell::new)
                : amounts.number(node, Place.of(Part.MATRIX)).map(value -> new MatrixGrid.Cell(
                        new Share(0, Optional.of(value), node.position(), Numbers.shown(value), Form.NUMBER)));
    }

    /** The rows of {@code entries}, when they form a square. */
    private Optional<List<? extends List<? extends Node>>> entries(Node node) {
        Optional<Node.Sequence> list = reading.sequence(node, "'entries'", "[[9/10, 1/10], [1/5, 4/5]]");
        List<List<Node>> rows = new ArrayList<>();
        boolean square = list.isPresent();
        for (Node item : list.map(Node.Sequence::items).orElse(List.of())) {
            Optional<Node.Sequence> row = reading.sequence(item, "a row of the matrix", "[9/10, 1/10]");
            square &= row.isPresent();
            row.ifPresent(cells -> rows.add(cells.items()));
            square &= row.map(cells -> isAsLong(cells, list.get().items().size())).orElse(true);
        }
        return square ? Optional.of(rows) : Optional.empty();
    }

    private boolean isAsLong(Node.Sequence row, int n) {
        if (row.items().size() != n) {
            reading.fault(row.position(), "not-square", "this row has " + Words.count(row.items().size(), "entry",
                    "entries") + ", but there are " + Words.count(n, "row", "rows") + "; a matrix of moves is square"
                    + (row.items().size() == 2 * n ? ", and numbers have a decimal point, no comma" : ""));
        }
        return row.items().size() == n;
    }

    private Optional<NamedTable> table(Node node, Optional<Path> folder) {
        Optional<String> file = reading.text(node, "'file'");
        TableOptions options = TableOptions.read(fields, reading);
        if (file.isEmpty()) {
            return Optional.empty();
        }
        try {
            return Optional.of(NamedTable.of(tableFile(folder, file.get()), options));
        } catch (RefusedException refused) {
            refused.faults().forEach(fault -> reading.faults().addAll(List.of(located(fault, node, file.get()))));
            return Optional.empty();
        }
    }

    /** The table, named in faults as a neighbour of the model. */
    private Source tableFile(Optional<Path> folder, String file) throws RefusedException {
        Source table = Source.read(folder.orElse(Path.of("")).resolve(file),
                Path.of(place.source()).resolveSibling(file).toString());
        reading.tables().add(new Model.Origin(table.name(), table.sha256()));
        return table;
    }

    /** A fault of the file as a whole is shown where the model names the file. */
    private static Fault located(Fault fault, Node named, String file) {
        return fault.position().isWhole()
                ? new Fault(named.position(), fault.code(), "'" + Words.shortened(file) + "': " + fault.message()) : fault;
    }
}
