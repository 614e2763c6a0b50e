package org.pofk.input;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.pofk.chain.Chain;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;
import org.pofk.text.Position;
import org.pofk.text.Suggestion;

/**
 * Moves as {@code transitions}, an action or an entry of {@code moves} hold them: from each state a mapping of states
 * to probabilities, or {@code stays}.
 */
final class Transitions {
    private static final int MOST_MISSPELT = 100;
    private static final String STAYS = "stays";
    private static final String ALL = "transitions";

    private final Node.Mapping written;
    private final States states;
    private final Head head;
    private final Amounts amounts;
    private final Reading reading;
    private final String section;
    private final String in;

    Transitions(Node.Mapping written, States states, Head head, Amounts amounts, Reading reading) {
        this(written, states, head, amounts, reading, ALL, "");
    }

    private Transitions(Node.Mapping written, States states, Head head, Amounts amounts, Reading reading,
            String section, String in) {
        this.section = section;
        this.in = in;
        this.written = written;
        this.states = states;
        this.head = head;
        this.amounts = amounts;
        this.reading = reading;
    }

    /** The moves of an action, or of an entry of {@code moves}, called {@code section} in messages. */
    static Transitions named(String section, Node.Mapping written, States states, Head head, Amounts amounts,
            Reading reading) {
        return new Transitions(written, states, head, amounts, reading, section, section + ", ");
    }

    /** The states in the order of their entries. */
    static List<Node.Scalar> states(Node.Mapping written) {
        return written.entries().stream().filter(entry -> !isRemark(entry)).map(Node.Entry::key).toList();
    }

    /** A note or source on all transitions: no state's entry has a text as its value but {@code stays}. */
    private static boolean isRemark(Node.Entry entry) {
        return Fields.isRemark(entry) && entry.value().asScalar().filter(text -> !text.name().equals(STAYS)).isPresent();
    }

    SparseMatrix matrix() {
        Set<String> given = new HashSet<>();
        SparseMatrix matrix = over(new SparseMatrix(Collections.nCopies(states.size(), List.of())), given);
        Set<String> misspelt = misspelt(given);
        for (Node.Scalar state : states.listed()) {
            if (!given.contains(state.name()) && !misspelt.contains(state.name())) {
                reading.fault(state.position(), "state-without-entry", "the state '" + Words.shortened(state.name())
                        + "' has no entry under transitions; write '" + Words.shortened(state.name())
                        + ": stays' when nothing leaves it");
            }
        }
        return matrix;
    }

    /** States that entries of no state's name probably mean; what is wrong with these is said there. */
    private Set<String> misspelt(Set<String> given) {
        return given.stream().filter(name -> !states.contains(name)).sorted().limit(MOST_MISSPELT)
                .flatMap(name -> Suggestion.among(states.names(), name).stream()).collect(Collectors.toSet());
    }

    /** The moves given; a fault at {@code place} unless there are some from every state. */
    SparseMatrix complete(Position place) {
        Set<String> given = new HashSet<>();
        SparseMatrix matrix = over(new SparseMatrix(Collections.nCopies(states.size(), List.of())), given);
        List<String> missing = states.names().stream().filter(name -> !given.contains(name)).toList();
        if (!missing.isEmpty()) {
            reading.fault(place, "state-without-entry", in + "the state '" + Words.shortened(missing.get(0))
                    + "' has no entry; only where the model has transitions of its own does a state not named here"
                    + " move as it does there");
        }
        return matrix;
    }

    /** The moves given, and those of another matrix from every state not named. */
    SparseMatrix over(SparseMatrix others) {
        return over(others, new HashSet<>());
    }

    private SparseMatrix over(SparseMatrix others, Set<String> given) {
        List<List<Entry>> columns = new ArrayList<>(others.columns());
        for (Node.Entry entry : written.entries()) {
            if (!states.contains(entry.name()) && isRemark(entry)) {
                Fields.takeRemark(entry, section.equals(ALL) ? Place.of(Part.TRANSITIONS) : Place.named(section), reading);
                continue;
            }
            given.add(entry.name());
            Optional<Integer> from = states.find(entry.key(), reading);
            if (from.isPresent()) {
                columns.set(from.get(), column(entry, from.get()));
            } else {
                checkTargets(entry);
            }
        }
        return new SparseMatrix(columns);
    }

    private List<Entry> column(Node.Entry entry, int from) {
        if (entry.value().asScalar().map(Node.Scalar::name).filter(STAYS::equals).isPresent()) {
            return List.of(new Entry(from, Rational.ONE));
        }
        if (entry.value().asMapping().isEmpty()) {
            reading.fault(entry.value().position(), "not-transitions", "what leaves '" + entry.name()
                    + "' must be a mapping such as {STATE: 1/20, '" + entry.name() + "': rest}, or stays, not "
                    + entry.value().inWords());
            return List.of();
        }
        return head.kind() == Chain.Kind.CHAIN ? moves(entry, entry.value().asMapping().get(), from)
                : coefficients(entry, entry.value().asMapping().get(), from);
    }

    private List<Entry> moves(Node.Entry entry, Node.Mapping moves, int from) {
        List<Share> shares = new ArrayList<>();
        boolean allRead = true;
        for (Node.Entry move : withoutRemarks(moves, entry.name())) {
            Optional<Integer> to = target(move.key());
            Optional<Share> share = amounts.share(move.value(), to.orElse(from),
                    place(Part.MOVE, entry.name(), move.name()));
            allRead &= to.isPresent() && share.isPresent();
            if (to.isPresent()) {
                share.ifPresent(shares::add);
            }
        }
        Distribution distribution = Distribution.ofMoves(in + "from '" + entry.name() + "'", entry.key().position(), shares,
                from, states);
        if (!allRead) {
            distribution.eachIsSound(reading);
            return List.of();
        }
        return distribution.complete(head.sums(), reading);
    }

    private List<Entry> coefficients(Node.Entry entry, Node.Mapping coefficients, int from) {
        List<Entry> column = new ArrayList<>();
        for (Node.Entry move : withoutRemarks(coefficients, entry.name())) {
            Optional<Integer> to = target(move.key());
            Optional<Rational> value = amounts.number(move.value(), place(Part.MOVE, entry.name(), move.name()));
            if (to.isPresent()) {
                value.ifPresent(number -> column.add(new Entry(to.get(), number)));
                amounts.written(move.value(), from, to.get()).ifPresent(reading.written()::add);
            }
        }
        return column;
    }

    /** The moves; what is a remark on them goes to the remarks. */
    private List<Node.Entry> withoutRemarks(Node.Mapping moves, String from) {
        return moves.entries().stream()
                .filter(move -> states.contains(move.name()) || !Fields.takeRemark(move,
                        place(Part.MOVES_FROM, from), reading))
                .toList();
    }

    private Place place(Part part, String... states) {
        Place place = Place.of(part, states);
        return in.isEmpty() ? place : Place.named(in + place.words());
    }

    private Optional<Integer> target(Node.Scalar name) {
        if (!states.contains(name.name()) && states.listed().isEmpty()) {
            reading.fault(name.position(), "unknown-state", "the state '" + Words.shortened(name.name())
                    + "' has no entry under transitions" + states.suggestion(name.name(), reading));
            return Optional.empty();
        }
        return states.find(name, reading);
    }

    private void checkTargets(Node.Entry entry) {
        entry.value().asMapping().ifPresent(moves -> withoutRemarks(moves, entry.name())
                .forEach(move -> target(move.key())));
    }
}
