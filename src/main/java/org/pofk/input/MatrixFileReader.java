package org.pofk.input;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Model.About;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Model.Origin;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.input.Head.Orientation;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** Reads a chain from a table of numbers alone; what the table can't say is said by options. */
public final class MatrixFileReader {
    private static final String ORIENTATION_OPTION = "--orientation";

    private MatrixFileReader() {
    }

    /**
     * What a command line says about the table.
     *
     * @param orientation which of the two sums to one; never guessed
     * @param start       the state to start in
     */
    public record Options(Optional<Convention> orientation, Optional<String> start, TableOptions table) {
    }

    public static Model read(Path file, Options options) throws RefusedException {
        return read(Source.read(file), options);
    }

    public static Model read(Source source, Options options) throws RefusedException {
        FileKind.of(source).require(FileKind.MATRIX, source);
        NamedTable table = NamedTable.of(source, options.table());
        Faults faults = new Faults();
        Reading reading = new Reading(faults, new Overrides(Map.of(), options.start()));
        States states = table.names().isEmpty() ? States.numbered(table.cells().size())
                : States.named(table.names(), reading);
        faults.refuseIfAny();
        Head head = Head.ofTable(source.fileName());
        SparseMatrix matrix = matrix(grid(table, source, reading), options, states, head, reading);
        List<Rational> start = start(states, matrix, head, reading);
        faults.refuseIfAny();
        return new Model(head.title(), head.step(), options.orientation().orElseThrow(), About.NOTHING,
                new Chain(Chain.Kind.CHAIN, states.names(), matrix, start, Map.of(), List.of()), Optional.empty(),
                Optional.empty(), List.of(), List.of(), reading.changes(), reading.written(),
                new Origin(source.name(), source.sha256()), List.of(), reading.settings());
    }

    private static MatrixGrid grid(NamedTable table, Source source, Reading reading) {
        Amounts amounts = new Amounts(ParameterValues.NONE, reading);
        return new MatrixGrid(table.cells().stream().map(row -> row.stream()
                .map(cell -> amounts.share(cell, 0, Place.of(Part.MATRIX)).map(MatrixGrid.Cell::new)).toList()).toList(),
                new Position(source.name(), 1, 1));
    }

    private static SparseMatrix matrix(MatrixGrid grid, Options options, States states, Head head, Reading reading) {
        Position option = Position.ofWhole(ORIENTATION_OPTION);
        if (options.orientation().isEmpty()) {
            reading.fault(option, "orientation-missing", "say --orientation columns when each column adds up to 1, "
                    + "--orientation rows when each row does; " + grid.fitting(states, head));
            return new SparseMatrix(List.of());
        }
        Orientation orientation = options.orientation().get() == Convention.ROWS ? Orientation.ROWS
                : Orientation.COLUMNS;
        return grid.matrix(orientation, option, states, head, reading);
    }

    private static List<Rational> start(States states, SparseMatrix matrix, Head head, Reading reading) {
        if (reading.overrides().start().isEmpty()) {
            reading.fault(Position.ofWhole(Overrides.START_OPTION), "start-missing", "a table doesn't say where the "
                    + "chain starts; say --start STATE, for example --start '" + states.names().get(0) + "'");
            return List.of();
        }
        return new StartSection(states, Map.of(), matrix, head, new Amounts(ParameterValues.NONE, reading), reading)
                .vector(Optional.empty(), Position.ofWhole(Overrides.START_OPTION));
    }
}
