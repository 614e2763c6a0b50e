package org.pofk.input;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Rational;
import org.pofk.longrun.StationaryDistribution;

/**
 * A start in the long run: the shares that the states of a closed part have in it, which one step leaves as they are.
 * A period plays no part in that. Exact.
 */
final class LongRunStart {
    private static final int LISTED = 6;

    private final States states;
    private final Map<String, List<Integer>> sets;
    private final SparseMatrix matrix;
    private final List<CommunicatingClass> closed;
    private final Reading reading;

    private LongRunStart(States states, Map<String, List<Integer>> sets, SparseMatrix matrix, Reading reading) {
        this.states = states;
        this.sets = sets;
        this.matrix = matrix;
        this.closed = Structure.of(new Chain(Chain.Kind.CHAIN, states.names(), matrix,
                Collections.nCopies(states.size(), Rational.of(1, states.size())), Map.of(), List.of()))
                .closedClasses();
        this.reading = reading;
    }

    /** Of the only closed part there is; a fault at {@code written} when there are more. */
    static List<Rational> ofChain(Node.Scalar written, States states, Map<String, List<Integer>> sets,
            SparseMatrix matrix, Reading reading) {
        if (!reading.faults().isEmpty()) {
            return List.of();
        }
        LongRunStart start = new LongRunStart(states, sets, matrix, reading);
        if (start.closed.size() > 1) {
            reading.fault(written.position(), "long-run-of-which", "the chain can end in " + start.closed.size()
                    + " closed parts, " + start.parts() + ", each with a long run of its own; name a state or a set of "
                    + "one, " + like(states.names().get(start.closed.get(0).states().get(0)), reading));
            return List.of();
        }
        return start.of(start.closed.get(0));
    }

    /** How it is named where it was asked for: in the file or on the command line. */
    private static String like(String state, Reading reading) {
        return reading.overrides().start().isPresent() ? "like --start \"long run of " + state + "\""
                : "like start: {long run of: " + state + "}";
    }

    /** Of the closed part in which a state or a set lies; a fault at the name when there is none. */
    static List<Rational> ofPart(Node.Scalar name, States states, Map<String, List<Integer>> sets, SparseMatrix matrix,
            Reading reading) {
        if (!reading.faults().isEmpty()) {
            return List.of();
        }
        LongRunStart start = new LongRunStart(states, sets, matrix, reading);
        List<Integer> members = start.members(name);
        Optional<CommunicatingClass> part = start.closed.stream()
                .filter(each -> each.states().containsAll(members)).findFirst();
        if (part.isEmpty() && !members.isEmpty()) {
            reading.fault(name.position(), "not-a-closed-part", "'" + Words.shortened(name.name())
                    + "' doesn't lie in one closed part, which alone has a long run to start in; "
                    + (start.closed.size() == 1 ? "the closed part is " : "closed parts are ") + start.parts());
        }
        return part.filter(each -> !members.isEmpty()).map(start::of).orElse(List.of());
    }

    private List<Rational> of(CommunicatingClass part) {
        List<Rational> vector = new ArrayList<>(Collections.nCopies(states.size(), Rational.ZERO));
        List<Rational> shares = StationaryDistribution.of(matrix, part.states());
        for (int i = 0; i < shares.size(); i++) {
            vector.set(part.states().get(i), shares.get(i));
        }
        return List.copyOf(vector);
    }

    private List<Integer> members(Node.Scalar name) {
        if (states.contains(name.name())) {
            return List.of(states.place(name.name()));
        }
        if (sets.containsKey(name.name())) {
            return sets.get(name.name());
        }
        List<String> known = new ArrayList<>(states.names());
        known.addAll(sets.keySet());
        reading.fault(name.position(), "unknown-state", "there is no state or set '" + Words.shortened(name.name())
                + "'" + reading.known(known, name.name(), "there"));
        return List.of();
    }

    /** {@code {relined tight, relined leaking} and {out of use}}. */
    private String parts() {
        List<String> shown = new ArrayList<>(closed.stream().limit(LISTED).map(this::part).toList());
        if (closed.size() > LISTED) {
            shown.add((closed.size() - LISTED) + " more");
        }
        return Words.list(shown);
    }

    private String part(CommunicatingClass part) {
        return part.states().stream().limit(LISTED).map(states.names()::get)
                .collect(Collectors.joining(", ", "{", part.states().size() > LISTED ? ", …}" : "}"));
    }
}
