package org.pofk.input;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/** The section {@code sets}: named groups of states, of other sets, or of what is not in them. */
final class SetsSection {
    private static final List<String> KEYS = List.of("not", "states");

    private final States states;
    private final Reading reading;
    private final Map<String, Node> written = new LinkedHashMap<>();
    private final Map<String, SortedSet<Integer>> resolved = new LinkedHashMap<>();
    private final Deque<String> open = new ArrayDeque<>();

    SetsSection(States states, Reading reading) {
        this.states = states;
        this.reading = reading;
    }

    /** The states of each set, ascending, in the order of the file. */
    Map<String, List<Integer>> read(Node node) {
        reading.mapping(node, "'sets'", "{running: [STATE, STATE]}").ifPresent(this::collect);
        Map<String, List<Integer>> sets = new LinkedHashMap<>();
        for (String name : written.keySet()) {
            sets.put(name, List.copyOf(members(name)));
        }
        return sets;
    }

    private void collect(Node.Mapping mapping) {
        for (Node.Entry entry : mapping.entries()) {
            if (States.isName(entry.key(), "a set", reading)) {
                written.put(entry.name(), entry.value());
            }
        }
    }

    private SortedSet<Integer> members(String name) {
        SortedSet<Integer> known = resolved.get(name);
        if (known != null) {
            return known;
        }
        int before = reading.count();
        open.push(name);
        SortedSet<Integer> members = of(written.get(name), name);
        open.pop();
        if (members.isEmpty() && reading.count() == before) {
            reading.fault(written.get(name).position(), "empty-set", "the set '" + Words.shortened(name)
                    + "' holds no state; leave it out or name one");
        }
        resolved.put(name, members);
        return members;
    }

    private SortedSet<Integer> of(Node node, String set) {
        if (node.asScalar().isPresent()) {
            return named(node.asScalar().get(), set);
        }
        if (node.asMapping().isPresent()) {
            return described(node.asMapping().get(), set);
        }
        SortedSet<Integer> all = new TreeSet<>();
        for (Node item : node.asSequence().map(Node.Sequence::items).orElse(List.of())) {
            reading.scalar(item, "a member of the set '" + Words.shortened(set) + "'")
                    .ifPresent(member -> all.addAll(named(member, set)));
        }
        return all;
    }

    private SortedSet<Integer> described(Node.Mapping mapping, String set) {
        Fields fields = Fields.of(mapping, "set '" + set + "'", KEYS, reading);
        Optional<Node> not = fields.value("not");
        Optional<Node> members = fields.value("states");
        if (not.isPresent() == members.isPresent()) {
            reading.fault(mapping.position(), "set-unclear", "the set '" + Words.shortened(set)
                    + "' needs either states: […] or not: SET");
            return new TreeSet<>();
        }
        return members.map(node -> of(node, set)).orElseGet(() -> complement(of(not.orElseThrow(), set)));
    }

    private SortedSet<Integer> complement(SortedSet<Integer> members) {
        SortedSet<Integer> others = new TreeSet<>();
        for (int state = 0; state < states.size(); state++) {
            if (!members.contains(state)) {
                others.add(state);
            }
        }
        return others;
    }

    /** A state, or the states of another set. */
    private SortedSet<Integer> named(Node.Scalar scalar, String set) {
        String name = scalar.name();
        if (states.contains(name)) {
            return new TreeSet<>(List.of(states.place(name)));
        }
        if (written.containsKey(name) && reading.closesCircle(open, name, "set", scalar.position())) {
            return new TreeSet<>();
        }
        if (!written.containsKey(name)) {
            List<String> known = new ArrayList<>(states.names());
            known.addAll(written.keySet());
            reading.fault(scalar.position(), "unknown-state", "there is no state or set '" + Words.shortened(name)
                    + "'" + reading.known(known, name, "there"));
            return new TreeSet<>();
        }
        return members(name);
    }
}
