package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement;
import org.pofk.text.Span;

/**
 * A possible slip undone in a statement.
 *
 * @param edits what is replaced in which of the statement's texts
 */
record Change(SlipKind kind, SortedMap<Integer, List<Replacement>> edits, Span span, String found, String right) {

    static Change of(int part, Edit edit) {
        return new Change(edit.kind(), new TreeMap<>(Map.of(part, edit.replacements())), edit.span(), edit.found(),
                edit.right());
    }

    /** The statement with all of some changes made; nothing where that can't be read. */
    static Optional<Statement> made(Statement statement, List<Change> changes) {
        SortedMap<Integer, List<Replacement>> all = new TreeMap<>();
        changes.forEach(change -> change.edits.forEach((part, replacements) ->
                all.computeIfAbsent(part, each -> new ArrayList<>()).addAll(replacements)));
        Optional<Statement> changed = Optional.of(statement);
        for (Map.Entry<Integer, List<Replacement>> each : all.entrySet()) {
            changed = changed.flatMap(current -> {
                StatementPart part = StatementPart.of(current).get(each.getKey());
                return AuthorText.of(part.text()).flatMap(text -> text.with(each.getValue())).map(part.with());
            });
        }
        return changed;
    }

    /** The text of one part with this made. */
    Optional<FormulaText> textOf(AuthorText text, int part) {
        return edits.containsKey(part) ? text.with(edits.get(part)) : Optional.empty();
    }

    /** Both changes as one, named as the first. */
    Change with(Change other) {
        SortedMap<Integer, List<Replacement>> all = new TreeMap<>();
        List.of(this, other).forEach(change -> change.edits.forEach((part, replacements) ->
                all.computeIfAbsent(part, each -> new ArrayList<>()).addAll(replacements)));
        return new Change(kind, all, span, found, right);
    }

    /** Whether two changes touch different stretches. */
    boolean isApartFrom(Change other) {
        return edits.entrySet().stream().noneMatch(mine -> other.edits.getOrDefault(mine.getKey(), List.of()).stream()
                .anyMatch(his -> mine.getValue().stream().anyMatch(own -> meet(own, his))));
    }

    private static boolean meet(Replacement a, Replacement b) {
        return a.start() < b.end() && b.start() < a.end() || a.start() == b.start() && a.end() == b.end();
    }
}
