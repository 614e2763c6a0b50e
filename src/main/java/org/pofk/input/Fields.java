package org.pofk.input;

import java.util.Arrays;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Model.Remark;
import org.pofk.chain.Place;
import org.pofk.text.Position;
import org.pofk.text.Suggestion;

/** A mapping whose keys are words of the file format. Keys that begin with {@code x-} are ignored. */
final class Fields {
    private static final int MOST_LISTED = 24;

    private final Map<String, Node.Entry> entries;
    private final Set<String> misspelt;

    private Fields(Map<String, Node.Entry> entries, Set<String> misspelt) {
        this.entries = entries;
        this.misspelt = misspelt;
    }

    /**
     * The known keys of {@code mapping}; a fault for each other key. A {@code note} or {@code source} is kept as a
     * remark on {@code on}.
     */
    static Fields of(Node.Mapping mapping, Place on, List<String> known, Reading reading) {
        Map<String, Node.Entry> entries = new LinkedHashMap<>();
        Set<String> misspelt = new HashSet<>();
        for (Node.Entry entry : mapping.entries()) {
            if (known.contains(entry.name())) {
                entries.put(entry.name(), entry);
            } else if (!takeRemark(entry, on, reading) && !entry.name().startsWith("x-")) {
                reading.fault(entry.key().position(), "unknown-key", "the key '" + Words.shortened(entry.name())
                        + "' isn't known here" + suggestion(known, entry.name(), reading));
                Suggestion.among(known, entry.name()).ifPresent(misspelt::add);
            }
        }
        return new Fields(entries, misspelt);
    }

    /** The same of a section that nobody asks by its place what is written on it. */
    static Fields of(Node.Mapping mapping, String on, List<String> known, Reading reading) {
        return of(mapping, Place.named(on), known, reading);
    }

    static boolean isRemark(Node.Entry entry) {
        return kind(entry).isPresent();
    }

    /** Keeps the entry as a remark when it is one. */
    static boolean takeRemark(Node.Entry entry, Place on, Reading reading) {
        Optional<Remark.Kind> kind = kind(entry);
        kind.ifPresent(key -> reading.text(entry.value(), "'" + entry.name() + "'")
                .ifPresent(text -> reading.remarks().add(new Remark(on, key, text))));
        return kind.isPresent();
    }

    private static Optional<Remark.Kind> kind(Node.Entry entry) {
        return Arrays.stream(Remark.Kind.values()).filter(kind -> kind.word().equals(entry.name())).findFirst();
    }

    private static String suggestion(List<String> known, String name, Reading reading) {
        String meant = reading.didYouMean(known, name);
        return meant.isEmpty() && known.size() <= MOST_LISTED ? "; known are " + String.join(", ", known) : meant;
    }

    Optional<Node> value(String key) {
        return Optional.ofNullable(entries.get(key)).map(Node.Entry::value);
    }

    /** Whether a key that isn't known was probably meant to be one of these, for which there is a fault already. */
    boolean misspell(List<String> keys) {
        return keys.stream().anyMatch(misspelt::contains);
    }

    /** Where the key stands. */
    Optional<Position> position(String key) {
        return Optional.ofNullable(entries.get(key)).map(entry -> entry.key().position());
    }
}
