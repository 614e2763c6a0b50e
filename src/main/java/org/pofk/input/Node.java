package org.pofk.input;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.text.Places;
import org.pofk.text.Position;

/**
 * A value of a YAML or JSON text with the place where it begins. Scalars stay text: {@code 0.70}, {@code 010} and
 * {@code no} are what they are.
 */
sealed interface Node {

    Position position();

    /** What it is, in words. */
    String inWords();

    /** Its text in one line, as a reader would write it. */
    String inOneLine();

    /** This, when it is a single value. */
    default Optional<Scalar> asScalar() {
        return Optional.empty();
    }

    /** This, when it is a list. */
    default Optional<Sequence> asSequence() {
        return Optional.empty();
    }

    /** This, when it is a mapping. */
    default Optional<Mapping> asMapping() {
        return Optional.empty();
    }

    /** How a scalar is written; block scalars count as quoted. */
    enum Style { PLAIN, QUOTED }

    /**
     * A single value; empty and plain where nothing is written.
     *
     * @param written how it stands in the source, quotes and line breaks included, where that isn't just the text
     */
    record Scalar(Position position, String text, Style style, Optional<String> written) implements Node {
        Scalar(Position position, String text, Style style) {
            this(position, text, style, Optional.empty());
        }

        /** Nothing is written here. */
        boolean isAbsent() {
            return style == Style.PLAIN && text.isEmpty();
        }

        boolean isPlain() {
            return style == Style.PLAIN;
        }

        /** Inside double quotes, with a backslash: what it begins is no longer what stands in the file. */
        boolean isEscaped() {
            return written.filter(source -> source.startsWith("\"") && source.contains("\\")).isPresent();
        }

        /** Where each character of the text stands; all at the beginning when it is escaped. */
        Places places() {
            if (isEscaped()) {
                return offset -> position;
            }
            if (written.isPresent()) {
                return ScalarPlaces.of(position, written.get(), text);
            }
            return Places.from(position.isWhole() || isPlain() ? position
                    : new Position(position.source(), position.line(), position.column() + 1), text);
        }

        /** The text as a name: trimmed, in NFC. */
        String name() {
            return Names.canonical(text);
        }

        @Override
        public Optional<Scalar> asScalar() {
            return Optional.of(this);
        }

        @Override
        public String inWords() {
            return isAbsent() ? "nothing" : "'" + Words.shortened(text) + "'";
        }

        @Override
        public String inOneLine() {
            return text.strip();
        }
    }

    /** A list. */
    record Sequence(Position position, List<Node> items) implements Node {
        public Sequence {
            items = List.copyOf(items);
        }

        @Override
        public Optional<Sequence> asSequence() {
            return Optional.of(this);
        }

        @Override
        public String inWords() {
            return "a list";
        }

        @Override
        public String inOneLine() {
            return items.stream().map(Node::inOneLine).collect(Collectors.joining(", ", "[", "]"));
        }
    }

    /** Keys with values, in order; no key twice. */
    record Mapping(Position position, List<Entry> entries) implements Node {
        public Mapping {
            entries = List.copyOf(entries);
        }

        @Override
        public Optional<Mapping> asMapping() {
            return Optional.of(this);
        }

        @Override
        public String inWords() {
            return "a mapping";
        }

        @Override
        public String inOneLine() {
            return entries.stream().map(entry -> entry.name() + ": " + entry.value().inOneLine())
                    .collect(Collectors.joining(", ", "{", "}"));
        }
    }

    /** A key and its value. */
    record Entry(Scalar key, Node value) {
        String name() {
            return key.name();
        }
    }
}
