package org.pofk.chain;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * What a later model says otherwise than an earlier one, entry by entry, in exact values. Nothing for two models that
 * say the same, whatever their files look like.
 *
 * @param changes by subject, then in the order of the later model, what is gone last
 * @param renamed the later name of a state by its earlier one
 */
public record ModelChanges(List<Change> changes, Map<String, String> renamed) {

    /** An entry with its values; empty in a model without it. A renamed state's entries bear the later name. */
    public record Change(Entry entry, Optional<String> before, Optional<String> after) {
    }

    /** What is listed in an order that a reader sees, or that counts. */
    private static final Map<Entry.Subject, String> ORDERED = new EnumMap<>(Map.of(Entry.Subject.STATE, "states",
            Entry.Subject.PARAMETER, "parameters", Entry.Subject.SET, "sets", Entry.Subject.OUTPUT, "outputs",
            Entry.Subject.ACTION, "actions", Entry.Subject.ASSUMPTION, "assumptions"));

    public ModelChanges {
        changes = List.copyOf(changes);
        renamed = Map.copyOf(renamed);
    }

    public static ModelChanges of(Model before, Model after) {
        Map<String, String> renamed = RenamedStates.of(before.chain(), after.chain());
        Map<Entry, String> was = ModelEntries.of(before, renamed);
        Map<Entry, String> is = ModelEntries.of(after, Map.of());
        Set<Entry> all = new LinkedHashSet<>(is.keySet());
        all.addAll(was.keySet());
        List<Change> changes = new ArrayList<>();
        for (Entry entry : all) {
            Change change = new Change(entry, Optional.ofNullable(was.get(entry)), Optional.ofNullable(is.get(entry)));
            if (!change.before().equals(change.after())) {
                changes.add(change);
            }
        }
        ORDERED.forEach((subject, name) -> {
            Change order = new Change(Entry.of(Entry.Subject.ORDER, name),
                    Optional.of(listed(was.keySet(), is.keySet(), subject)),
                    Optional.of(listed(is.keySet(), was.keySet(), subject)));
            if (!order.before().equals(order.after())) {
                changes.add(order);
            }
        });
        changes.sort(Comparator.comparing(change -> change.entry().subject()));
        return new ModelChanges(changes, renamed);
    }

    /** The names of those that are in both models, in the order of the first. */
    private static String listed(Set<Entry> entries, Set<Entry> others, Entry.Subject subject) {
        return entries.stream().filter(entry -> entry.subject() == subject && others.contains(entry))
                .map(entry -> entry.of().get(0)).collect(Collectors.joining(", "));
    }

    /** The earlier chain with the later names of its states. */
    public Chain renamed(Chain before) {
        return new Chain(before.kind(), before.states().stream().map(name -> renamed.getOrDefault(name, name)).toList(),
                before.matrix(), before.start(), before.sets(), before.outputs());
    }

    /** Whether both models say the same. */
    public boolean isEmpty() {
        return changes.isEmpty();
    }
}
