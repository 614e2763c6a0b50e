package org.pofk.input;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.text.Position;

/** The states of a model, in order, by name. */
final class States {
    private final List<String> names;
    private final List<Node.Scalar> listed;
    private final Set<String> refused;
    private final Map<String, Integer> places = new HashMap<>();

    private States(List<String> names, List<Node.Scalar> listed, Set<String> refused) {
        this.names = List.copyOf(names);
        this.listed = List.copyOf(listed);
        this.refused = Set.copyOf(refused);
        for (String name : names) {
            places.put(name, places.size());
        }
    }

    /** From the list of states of a file; faults for names that are empty, unprintable or given twice. */
    static States listed(List<Node.Scalar> written, Reading reading) {
        States states = named(written, reading);
        Set<String> unseen = new HashSet<>(states.names);
        return new States(states.names, written.stream().filter(name -> unseen.remove(name.name())).toList(),
                states.refused);
    }

    /** From the places where states are named otherwise: entries of transitions, the header of a table. */
    static States named(List<Node.Scalar> written, Reading reading) {
        List<String> names = new ArrayList<>();
        Set<String> refused = new HashSet<>();
        Map<String, Position> seen = new HashMap<>();
        for (Node.Scalar scalar : written) {
            Position before = seen.putIfAbsent(scalar.name(), scalar.position());
            if (before != null) {
                reading.fault(scalar.position(), "duplicate-state", "the state '" + Words.shortened(scalar.name())
                        + "' is named twice; it stands at line " + before.line() + ", column " + before.column()
                        + " already");
            } else if (isName(scalar, "a state", reading)) {
                names.add(scalar.name());
            } else {
                refused.add(scalar.name());
            }
        }
        return new States(names, List.of(), refused);
    }

    /** States without names of their own: 1 … n. */
    static States numbered(int n) {
        return new States(IntStream.rangeClosed(1, n).mapToObj(Integer::toString).toList(),
                List.of(), Set.of());
    }

    /** Whether the scalar can name something; a fault otherwise. */
    static boolean isName(Node.Scalar scalar, String what, Reading reading) {
        if (scalar.name().isEmpty()) {
            reading.fault(scalar.position(), "empty-name", what + " needs a name; here is none");
            return false;
        }
        if (Names.isUnprintable(scalar.name())) {
            reading.fault(scalar.position(), "unprintable-name", "the name of " + what
                    + " holds a character that can't be shown, such as a line break; leave it out");
            return false;
        }
        return true;
    }

    List<String> names() {
        return names;
    }

    /** The list of states of the file, empty when it has none. */
    List<Node.Scalar> listed() {
        return listed;
    }

    int size() {
        return names.size();
    }

    boolean contains(String name) {
        return places.containsKey(name);
    }

    /** {@code there are 3 states}, with the line that lists them. */
    String count() {
        return (listed.isEmpty() ? "there are " : "line " + listed.get(0).position().line() + " lists ")
                + Words.count(size(), "state", "states");
    }

    /** The place of a state that is known to be there. */
    int place(String name) {
        return places.get(name);
    }

    /** The place of the state a scalar names, or a fault with what was probably meant unless it has one already. */
    Optional<Integer> find(Node.Scalar scalar, Reading reading) {
        Integer place = places.get(scalar.name());
        if (place == null && !refused.contains(scalar.name())) {
            reading.fault(scalar.position(), "unknown-state", "there is no state '" + Words.shortened(scalar.name()) + "'"
                    + suggestion(scalar.name(), reading));
        }
        return Optional.ofNullable(place);
    }

    /** What was probably meant, or all the names when they are few. */
    String suggestion(String name, Reading reading) {
        return reading.known(names, name, "the states");
    }
}
