package org.pofk.input;

import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.SparseMatrix;
import org.pofk.input.Head.Orientation;

/** The states and the moves between them, from {@code transitions} or from {@code matrix}. */
final class Moves {
    private final Optional<Node.Mapping> transitions;
    private final Optional<MatrixSection> matrix;
    private final States states;
    private final Reading reading;

    private Moves(Optional<Node.Mapping> transitions, Optional<MatrixSection> matrix, States states, Reading reading) {
        this.transitions = transitions;
        this.matrix = matrix;
        this.states = states;
        this.reading = reading;
    }

    static Moves read(Fields fields, Node.Mapping root, Optional<Path> folder, Reading reading) {
        Optional<Node> own = fields.value("transitions").or(() -> fields.value("matrix").isPresent()
                ? Optional.empty() : ScheduleSections.firstMoves(fields));
        if (own.isPresent() == fields.value("matrix").isPresent()) {
            reading.fault(fields.position("matrix").orElse(root.position()), "moves-source",
                    fields.value("matrix").isPresent()
                            ? "the file has both 'transitions' and 'matrix'; leave one of them out"
                            : "the file lacks the moves; write transitions: or matrix:");
        }
        Optional<Node.Mapping> transitions = own.flatMap(node -> reading.mapping(node,
                fields.value("transitions").isPresent() ? "'transitions'" : "an entry of 'moves'",
                "{STATE: {OTHER: 1/20, STATE: rest}}"));
        Optional<MatrixSection> matrix = fields.value("matrix")
                .flatMap(node -> reading.mapping(node, "'matrix'", "{orientation: rows, entries: [[…], …]}"))
                .map(node -> MatrixSection.read(node, fields.position("matrix").orElseThrow(), folder, reading));
        return new Moves(transitions, matrix, states(fields, transitions, matrix, reading), reading);
    }

    private static States states(Fields fields, Optional<Node.Mapping> transitions, Optional<MatrixSection> matrix,
            Reading reading) {
        Optional<Node.Sequence> listed = fields.value("states")
                .flatMap(node -> reading.sequence(node, "'states'", "[both, one, none]"));
        if (listed.isPresent()) {
            return States.listed(listed.get().items().stream()
                    .flatMap(item -> reading.scalar(item, "a state").stream()).toList(), reading);
        }
        if (transitions.isPresent()) {
            return States.named(Transitions.states(transitions.get()), reading);
        }
        List<Node.Scalar> names = matrix.map(MatrixSection::names).orElse(List.of());
        return names.isEmpty() ? States.numbered(matrix.flatMap(MatrixSection::size).orElse(0))
                : States.named(names, reading);
    }

    States states() {
        return states;
    }

    Optional<Orientation> orientation() {
        return matrix.flatMap(MatrixSection::orientation);
    }

    /** A, n × n. */
    SparseMatrix matrix(Head head, Amounts amounts) {
        if (transitions.isPresent()) {
            return new Transitions(transitions.get(), states, head, amounts, reading).matrix();
        }
        return matrix.map(section -> section.matrix(states, head, amounts))
                .orElseGet(() -> new SparseMatrix(Collections.nCopies(states.size(), List.of())));
    }
}
