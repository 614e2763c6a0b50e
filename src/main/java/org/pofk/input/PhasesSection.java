package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Schedule.Phase;
import org.pofk.chain.Schedule.Phases;
import org.pofk.chain.Schedule.Repeat;
import org.pofk.chain.SparseMatrix;

/** The sections {@code phases} and {@code repeat}: which moves are made for how many steps, and what follows. */
final class PhasesSection {
    private static final List<String> KEYS = List.of("for", "use");
    private static final String EXAMPLE = "{for: 3 steps, use: NAME}";

    private final Map<String, SparseMatrix> moves;
    private final Set<String> used;
    private final StepCounts counts;
    private final Reading reading;

    private enum Again implements Keyword {
        YES, ONCE;

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }

        Repeat meaning() {
            return this == YES ? Repeat.YES : Repeat.ONCE;
        }
    }

    /** @param used takes the names of the moves that are made in some phase */
    PhasesSection(Map<String, SparseMatrix> moves, Set<String> used, StepCounts counts, Reading reading) {
        this.moves = moves;
        this.used = used;
        this.counts = counts;
        this.reading = reading;
    }

    /** The phases, when there are some without faults. */
    Optional<Phases> read(Fields fields) {
        Optional<Again> again = fields.value("repeat")
                .map(node -> reading.keyword(node, "'repeat'", Again.values())).orElse(Optional.of(Again.YES));
        if (fields.value("phases").isEmpty()) {
            fields.position("repeat").ifPresent(place -> reading.fault(place, "repeat-without-phases",
                    "'repeat' says what follows the last of some phases, and there are no phases; leave it out"));
            return Optional.empty();
        }
        Node written = fields.value("phases").get();
        Optional<List<Node>> items = reading.sequence(written, "'phases'", "[" + EXAMPLE + ", …]")
                .map(Node.Sequence::items);
        if (items.filter(List::isEmpty).isPresent()) {
            reading.fault(written.position(), "phases-empty", "there are no phases in the list; write " + EXAMPLE
                    + ", or leave it out");
        }
        List<Phase> phases = new ArrayList<>();
        items.orElse(List.of()).forEach(item -> phase(item).ifPresent(phases::add));
        return phases.isEmpty() || again.isEmpty() ? Optional.empty()
                : Optional.of(new Phases(phases, again.get().meaning()));
    }

    private Optional<Phase> phase(Node node) {
        Optional<Node.Mapping> written = reading.mapping(node, "a phase", EXAMPLE);
        if (written.isEmpty()) {
            return Optional.empty();
        }
        Fields fields = Fields.of(written.get(), "phase", KEYS, reading);
        for (String key : KEYS) {
            if (fields.value(key).isEmpty()) {
                reading.fault(node.position(), "key-missing", "the phase lacks '" + key + "'; write for example "
                        + EXAMPLE);
            }
        }
        Optional<Integer> steps = fields.value("for").flatMap(value -> counts.read(value, "'for'"));
        Optional<String> use = fields.value("use").flatMap(this::moves);
        return steps.isPresent() && use.isPresent()
                ? Optional.of(new Phase(steps.get(), use.get(), moves.get(use.get()))) : Optional.empty();
    }

    private Optional<String> moves(Node node) {
        Optional<String> name = reading.scalar(node, "'use'").map(Node.Scalar::name);
        name.ifPresent(used::add);
        if (name.isPresent() && !moves.containsKey(name.get())) {
            reading.fault(node.position(), "unknown-moves", "there are no moves '" + Words.shortened(name.get()) + "'"
                    + reading.known(moves.keySet(), name.get(), "the moves"));
        }
        return name.filter(moves::containsKey);
    }
}
