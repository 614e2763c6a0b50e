package org.pofk.input;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.text.Faults;
import org.pofk.text.Position;

/** A list or mapping whose end has not been read yet. Mutable; lives for one reading. */
abstract sealed class OpenNode {

    static OpenNode sequence(Position position) {
        return new OpenSequence(position);
    }

    static OpenNode mapping(Position position) {
        return new OpenMapping(position);
    }

    /** Where it begins. */
    abstract Position position();

    /** The next value would be a key. */
    abstract boolean awaitsKey();

    /** Takes the next value; a fault for a key that was given before. */
    abstract void add(Node node, Faults faults);

    abstract Node close();

    private static final class OpenSequence extends OpenNode {
        private final Position position;
        private final List<Node> items = new ArrayList<>();

        OpenSequence(Position position) {
            this.position = position;
        }

        @Override
        Position position() {
            return position;
        }

        @Override
        boolean awaitsKey() {
            return false;
        }

        @Override
        void add(Node node, Faults faults) {
            items.add(node);
        }

        @Override
        Node close() {
            return new Node.Sequence(position, items);
        }
    }

    private static final class OpenMapping extends OpenNode {
        private final Position position;
        private final List<Node.Entry> entries = new ArrayList<>();
        private final Map<String, Position> keys = new HashMap<>();
        private Optional<Node.Scalar> key = Optional.empty();

        OpenMapping(Position position) {
            this.position = position;
        }

        @Override
        Position position() {
            return position;
        }

        @Override
        boolean awaitsKey() {
            return key.isEmpty();
        }

        @Override
        void add(Node node, Faults faults) {
            if (key.isPresent()) {
                addEntry(key.get(), node, faults);
                key = Optional.empty();
            } else {
                key = Optional.of((Node.Scalar) node);
            }
        }

        private void addEntry(Node.Scalar name, Node value, Faults faults) {
            if (isRestOfDecimal(name, value)) {
                joinDecimal(name, faults);
                return;
            }
            Position before = keys.putIfAbsent(Names.canonical(name.text()), name.position());
            if (name.isPlain() && name.text().equals("<<")) {
                faults.add(name.position(), "merge-key", "the merge key '<<' isn't accepted; write the entries out");
            } else if (before != null) {
                faults.add(name.position(), "duplicate-key", "the key '" + Words.shortened(name.text())
                        + "' is given twice; it stands at line " + before.line() + ", column " + before.column()
                        + " already");
            } else {
                entries.add(new Node.Entry(name, value));
            }
        }

        /** In {@code {both: 0,5}} YAML sees a second key 5, without a value. */
        private boolean isRestOfDecimal(Node.Scalar key, Node value) {
            if (entries.isEmpty() || value.asScalar().filter(Node.Scalar::isAbsent).isEmpty()) {
                return false;
            }
            return entries.get(entries.size() - 1).value().asScalar().filter(Node.Scalar::isPlain)
                    .filter(whole -> Numerals.hasDecimalComma(whole.text() + "," + key.text()))
                    .filter(whole -> whole.position().line() == key.position().line()
                            && whole.position().column() + whole.text().length() + 1 == key.position().column())
                    .isPresent();
        }

        /** Refuses the comma, and reads on as if a point stood there. */
        private void joinDecimal(Node.Scalar fraction, Faults faults) {
            Node.Entry last = entries.remove(entries.size() - 1);
            Node.Scalar whole = last.value().asScalar().orElseThrow();
            String joined = whole.text() + "." + fraction.text();
            faults.add(whole.position(), "decimal-comma", "'" + Words.shortened(whole.text() + "," + fraction.text())
                    + "' has a decimal comma; write " + Words.shortened(joined));
            entries.add(new Node.Entry(last.key(), new Node.Scalar(whole.position(), joined, Node.Style.PLAIN)));
        }

        @Override
        Node close() {
            return new Node.Mapping(position, entries);
        }
    }
}
