package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.ModelChanges;

/** An output in an earlier report and in a later one, or in one of them; a renamed state goes by its later name. */
record OutputPair(Optional<FoundOutput> before, Optional<FoundOutput> now) {

    /** How the two compare. */
    enum Standing { NEW, GONE, AS_BEFORE, MOVED }

    /** In the later order, what is gone last. */
    static List<OutputPair> of(List<FoundOutput> was, List<FoundOutput> is, ModelChanges changes) {
        List<OutputPair> pairs = new ArrayList<>();
        is.forEach(now -> pairs.add(new OutputPair(was.stream().filter(old -> isNamed(old, now, changes)).findFirst(),
                Optional.of(now))));
        was.stream().filter(old -> is.stream().noneMatch(now -> isNamed(old, now, changes)))
                .forEach(gone -> pairs.add(new OutputPair(Optional.of(gone), Optional.empty())));
        return pairs;
    }

    private static boolean isNamed(FoundOutput old, FoundOutput now, ModelChanges changes) {
        return changes.renamed().getOrDefault(old.name(), old.name()).equals(now.name());
    }

    String name() {
        return now.or(() -> before).orElseThrow().name();
    }

    Standing standing() {
        return before.isEmpty() ? Standing.NEW : now.isEmpty() ? Standing.GONE
                : before.get().identity().isPresent() && before.get().identity().equals(now.get().identity())
                        ? Standing.AS_BEFORE : Standing.MOVED;
    }

    /** Which of the formula's shape and numbers are other ones, where both reports have it. */
    String compared() {
        Optional<Prose> was = before.flatMap(FoundOutput::shape);
        Optional<Prose> is = now.flatMap(FoundOutput::shape);
        if (was.isEmpty() || is.isEmpty()) {
            return (was.isEmpty() ? before : now).orElseThrow().withoutShape();
        }
        return was.equals(is) ? "the formula has the same shape, with other numbers" : "the formula has another shape";
    }
}
