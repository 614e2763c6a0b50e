package org.pofk.input;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model.Adjustment;
import org.pofk.chain.Model.Origin;
import org.pofk.chain.Model.Remark;
import org.pofk.chain.Model.Setting;
import org.pofk.chain.Model.Written;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.pofk.text.Suggestion;

/** What the sections of one model share while it is read: faults, remarks, changes and what was read. Mutable; one for a reading. */
final class Reading {
    private static final int MOST_SUGGESTIONS = 100;
    private static final int LONGEST_CHAIN = 200;
    private static final int MOST_LISTED = 12;

    private final Faults faults;
    private final Overrides overrides;
    private final List<Remark> remarks = new ArrayList<>();
    private final List<Adjustment> changes = new ArrayList<>();
    private final List<Written> written = new ArrayList<>();
    private final List<Origin> tables = new ArrayList<>();
    private final List<Setting> settings = new ArrayList<>();
    private int suggestions;
    private int count;

    Reading(Faults faults, Overrides overrides) {
        this.faults = faults;
        this.overrides = overrides;
    }

    Faults faults() {
        return faults;
    }

    Overrides overrides() {
        return overrides;
    }

    List<Remark> remarks() {
        return remarks;
    }

    List<Adjustment> changes() {
        return changes;
    }

    List<Written> written() {
        return written;
    }

    List<Origin> tables() {
        return tables;
    }

    List<Setting> settings() {
        return settings;
    }

    /**
     * {@code ; did you mean 'both'?}, or nothing when no candidate is near. Only the first faults get one: a large
     * file full of unknown names must not take the square of its length.
     */
    String didYouMean(Collection<String> candidates, String name) {
        return ++suggestions > MOST_SUGGESTIONS ? "" : Suggestion.didYouMean(candidates, name);
    }

    /** What was probably meant, or all that is known when that is little. */
    String known(Collection<String> candidates, String name, String these) {
        String meant = didYouMean(candidates, name);
        return meant.isEmpty() && !candidates.isEmpty() && candidates.size() <= MOST_LISTED
                ? "; " + these + " are " + Words.quotedList(List.copyOf(candidates)) : meant;
    }

    /**
     * A fault when {@code name} is among the definitions that are still open, outermost last, or when there are too
     * many of them.
     */
    boolean closesCircle(Deque<String> open, String name, String what, Position position) {
        if (open.contains(name)) {
            fault(position, what + "-cycle", "the " + what + " '" + Words.shortened(open.getFirst())
                    + "' is defined by itself" + (open.getFirst().equals(name) ? ""
                            : ", by way of '" + Words.shortened(name) + "'") + "; break the circle");
            return true;
        }
        if (open.size() > LONGEST_CHAIN) {
            fault(position, "definition-too-long", "the " + what + " '" + Words.shortened(open.getFirst())
                    + "' is reached through more than " + LONGEST_CHAIN + " definitions; shorten the chain");
            return true;
        }
        return false;
    }

    /** How many faults the sections have found so far. */
    int count() {
        return count;
    }

    void fault(Position position, String code, String message) {
        count++;
        faults.add(position, code, message);
    }

    /** The node as a mapping, or a fault that says what {@code what} should be. */
    Optional<Node.Mapping> mapping(Node node, String what, String example) {
        if (node.asMapping().isEmpty()) {
            fault(node.position(), "not-a-mapping",
                    what + " must be a mapping such as " + example + ", not " + node.inWords());
        }
        return node.asMapping();
    }

    /** The node as a list, or a fault. */
    Optional<Node.Sequence> sequence(Node node, String what, String example) {
        if (node.asSequence().isEmpty()) {
            fault(node.position(), "not-a-list",
                    what + " must be a list such as " + example + ", not " + node.inWords());
        }
        return node.asSequence();
    }

    /** The node as a single value that is there, or a fault. */
    Optional<Node.Scalar> scalar(Node node, String what) {
        Optional<Node.Scalar> scalar = node.asScalar().filter(value -> !value.isAbsent());
        if (scalar.isEmpty()) {
            fault(node.position(), "not-a-value", what + " must be a single value, not " + node.inWords());
        }
        return scalar;
    }

    /** The node as a text, or a fault. */
    Optional<String> text(Node node, String what) {
        return scalar(node, what).map(value -> value.text().strip());
    }

    /** One of some words, or a fault with what was probably meant. */
    <E extends Enum<E> & Keyword> Optional<E> keyword(Node node, String what, E[] choices) {
        Optional<Node.Scalar> scalar = scalar(node, what);
        if (scalar.isEmpty()) {
            return Optional.empty();
        }
        String word = scalar.get().name();
        for (E choice : choices) {
            if (choice.word().equals(word)) {
                return Optional.of(choice);
            }
        }
        List<String> words = Arrays.stream(choices).map(Keyword::word).toList();
        fault(node.position(), "unknown-word", what + " is " + Words.choice(words) + ", not " + node.inWords()
                + didYouMean(words, word));
        return Optional.empty();
    }
}
