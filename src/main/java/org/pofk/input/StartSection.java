package org.pofk.input;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model.Setting;
import org.pofk.chain.Model.Written.Form;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;
import org.pofk.text.Position;

/**
 * The section {@code start}: a state, a mapping of states to probabilities, a list of them, or the long run of a closed
 * part.
 */
final class StartSection {
    private static final String LONG_RUN = "long run";
    private static final String LONG_RUN_OF = "long run of";

    private final States states;
    private final Map<String, List<Integer>> sets;
    private final SparseMatrix matrix;
    private final Head head;
    private final Amounts amounts;
    private final Reading reading;

    /** @param matrix of the moves, for a start in their long run */
    StartSection(States states, Map<String, List<Integer>> sets, SparseMatrix matrix, Head head, Amounts amounts,
            Reading reading) {
        this.states = states;
        this.sets = sets;
        this.matrix = matrix;
        this.head = head;
        this.amounts = amounts;
        this.reading = reading;
    }

    /** x(0); the command line's start comes before the file's. */
    List<Rational> vector(Optional<Node> written, Position file) {
        Optional<String> override = reading.overrides().start();
        if (override.isPresent()) {
            Position option = Position.ofWhole(Overrides.START_OPTION);
            reading.settings().add(new Setting(Optional.empty(), override.get(), written.map(Node::inOneLine)));
            return inState(new Node.Scalar(option, override.get(), Node.Style.QUOTED));
        }
        if (written.isEmpty()) {
            reading.fault(file, "start-missing", "the key 'start' is missing; write start: STATE, or a mapping such as "
                    + "{STATE: 9/10, OTHER: rest}");
            return List.of();
        }
        Node start = written.get();
        if (start.asMapping().isPresent()) {
            return fromMapping(start.asMapping().get());
        }
        return start.asSequence().map(this::fromList)
                .orElseGet(() -> inState(start.asScalar().orElseThrow()));
    }

    /** A fault where the start is the long run of the moves alone, which a schedule changes. */
    void refuseLongRun(Optional<Node> written) {
        Optional<Node.Scalar> named = reading.overrides().start().map(word -> new Node.Scalar(
                Position.ofWhole(Overrides.START_OPTION), word, Node.Style.QUOTED))
                .or(() -> written.flatMap(Node::asScalar));
        Optional<Position> part = reading.overrides().start().isPresent() ? Optional.empty()
                : written.flatMap(Node::asMapping).stream().flatMap(each -> each.entries().stream())
                .filter(entry -> entry.name().equals(LONG_RUN_OF) && !states.contains(LONG_RUN_OF))
                .map(entry -> entry.key().position()).findFirst();
        named.filter(name -> !states.contains(name.name()) && name.name().startsWith(LONG_RUN)).map(Node::position)
                .or(() -> part).ifPresent(position -> reading.fault(position, "long-run-with-schedule", "the long run of"
                + " the moves alone is no start for a model with a schedule, which changes it; name a state, or write"
                + " the probabilities"));
    }

    /** In a state, or in what a word stands for that names none. */
    private List<Rational> inState(Node.Scalar name) {
        if (head.kind() == Chain.Kind.CHAIN && !states.contains(name.name())) {
            if (name.name().equals(LONG_RUN)) {
                return LongRunStart.ofChain(name, states, sets, matrix, reading);
            }
            if (name.name().startsWith(LONG_RUN_OF + " ")) {
                return LongRunStart.ofPart(new Node.Scalar(name.position(),
                        name.name().substring(LONG_RUN_OF.length()), name.style()), states, sets, matrix, reading);
            }
            if (reading.overrides().isStartEach()) {
                return Collections.nCopies(states.size(), Rational.of(1, states.size()));
            }
        }
        if (head.kind() == Chain.Kind.RECURSION && !states.contains(name.name())) {
            boolean isLongRun = name.name().equals(LONG_RUN) || name.name().startsWith(LONG_RUN_OF + " ");
            if (isLongRun || reading.overrides().isStartEach()) {
                refuseOfRecursion(name, isLongRun ? "doesn't start in a long run"
                        : "doesn't start in each state in turn");
                return List.of();
            }
        }
        return states.find(name, reading).map(state -> vector(List.of(new Entry(state, Rational.ONE))))
                .orElse(List.of());
    }

    private void refuseOfRecursion(Node.Scalar name, String what) {
        String first = states.names().get(0);
        reading.fault(name.position(), "start-of-a-recursion", "a recursion " + what + "; only a chain of probabilities"
                + " does. Name a state, like " + (reading.overrides().start().isPresent()
                ? "--start '" + first + "', or leave --start out" : "start: " + first
                        + ", or write numbers, like start: {" + first + ": 1}"));
    }

    private List<Rational> fromMapping(Node.Mapping mapping) {
        Optional<Node.Entry> part = mapping.entries().stream().filter(entry -> entry.name().equals(LONG_RUN_OF)
                && !states.contains(LONG_RUN_OF)).findFirst();
        if (part.isPresent() && head.kind() == Chain.Kind.RECURSION) {
            refuseOfRecursion(part.get().key(), "doesn't start in a long run");
            return List.of();
        }
        if (part.isPresent()) {
            Fields.of(mapping, Place.of(Part.START), List.of(LONG_RUN_OF), reading);
            return reading.scalar(part.get().value(), "the part whose long run is the start")
                    .map(name -> LongRunStart.ofPart(name, states, sets, matrix, reading)).orElse(List.of());
        }
        List<Optional<Share>> shares = new ArrayList<>();
        for (Node.Entry entry : mapping.entries()) {
            if (states.contains(entry.name()) || !Fields.takeRemark(entry, Place.of(Part.START), reading)) {
                Optional<Integer> state = states.find(entry.key(), reading);
                Optional<Share> share = share(entry.value(), state.orElse(0));
                shares.add(state.flatMap(known -> share));
            }
        }
        return complete(shares, mapping.position());
    }

    private List<Rational> fromList(Node.Sequence list) {
        List<Optional<Share>> shares = new ArrayList<>();
        if (list.items().size() != states.size()) {
            reading.fault(list.position(), "size-differs", "the start has "
                    + Words.count(list.items().size(), "number", "numbers") + ", but "
                    + states.count() + "; these must be equal in number");
            return List.of();
        }
        for (Node item : list.items()) {
            shares.add(share(item, shares.size()));
        }
        return complete(shares, list.position());
    }

    private Optional<Share> share(Node node, int state) {
        return head.kind() == Chain.Kind.CHAIN ? amounts.share(node, state, Place.of(Part.START))
                : amounts.number(node, Place.of(Part.START))
                        .map(value -> new Share(state, Optional.of(value), node.position(), Numbers.shown(value), Form.NUMBER));
    }

    private List<Rational> complete(List<Optional<Share>> read, Position position) {
        List<Share> shares = read.stream().flatMap(Optional::stream).toList();
        if (head.kind() == Chain.Kind.RECURSION) {
            return vector(shares.stream().map(share -> new Entry(share.state(), share.amount())).toList());
        }
        Distribution distribution = Distribution.ofStart(position, shares, states);
        if (shares.size() < read.size()) {
            distribution.eachIsSound(reading);
            return List.of();
        }
        return vector(distribution.complete(head.sums(), reading));
    }

    private List<Rational> vector(List<Entry> entries) {
        List<Rational> vector = new ArrayList<>(Collections.nCopies(states.size(), Rational.ZERO));
        entries.forEach(entry -> vector.set(entry.row(), vector.get(entry.row()).plus(entry.value())));
        return List.copyOf(vector);
    }
}
