package org.pofk.input;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Schedule.Action;
import org.pofk.chain.Schedule.Recurring;
import org.pofk.chain.Schedule.When;
import org.pofk.chain.SparseMatrix;

/** The section {@code schedule}: one action that recurs, or a list of them. */
final class RecurringSection {
    private static final List<String> KEYS = List.of("every", "first", "do", "when");
    private static final String EXAMPLE = "{every: 12 steps, do: ACTION}";

    private final Map<String, SparseMatrix> actions;
    private final Set<String> used;
    private final StepCounts counts;
    private final Reading reading;

    private enum Moment implements Keyword {
        AFTER_THE_STEP(When.AFTER_THE_STEP), INSTEAD_OF_THE_STEP(When.INSTEAD_OF_THE_STEP);

        private final When meaning;

        Moment(When meaning) {
            this.meaning = meaning;
        }

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT).replace('_', ' ');
        }
    }

    /** @param used takes the names of the actions that are done */
    RecurringSection(Map<String, SparseMatrix> actions, Set<String> used, StepCounts counts, Reading reading) {
        this.actions = actions;
        this.used = used;
        this.counts = counts;
        this.reading = reading;
    }

    List<Recurring> read(Node node) {
        if (node.asSequence().isEmpty()) {
            return one(node).stream().toList();
        }
        List<Node> items = node.asSequence().get().items();
        if (items.isEmpty()) {
            reading.fault(node.position(), "schedule-empty", "the schedule is an empty list; write " + EXAMPLE
                    + ", or leave it out");
        }
        return items.stream().flatMap(item -> one(item).stream()).toList();
    }

    private Optional<Recurring> one(Node node) {
        Optional<Node.Mapping> written = reading.mapping(node, "a schedule", EXAMPLE);
        if (written.isEmpty()) {
            return Optional.empty();
        }
        Fields fields = Fields.of(written.get(), "schedule", KEYS, reading);
        Optional<Integer> every = required(fields, "every", "every: 12 steps", node)
                .flatMap(value -> counts.read(value, "'every'"));
        Optional<Node> firstWritten = fields.value("first");
        Optional<Integer> first = firstWritten.isPresent()
                ? counts.read(firstWritten.get(), "'first'") : every;
        Optional<Moment> when = fields.value("when").map(value -> reading.keyword(value, "'when'", Moment.values()))
                .orElse(Optional.of(Moment.AFTER_THE_STEP));
        Optional<Action> action = required(fields, "do", "do: ACTION", node).flatMap(this::action);
        return every.isPresent() && first.isPresent() && when.isPresent() && action.isPresent()
                ? Optional.of(new Recurring(action.get(), every.get(), first.get(), when.get().meaning))
                : Optional.empty();
    }

    private Optional<Node> required(Fields fields, String key, String example, Node schedule) {
        if (fields.value(key).isEmpty()) {
            reading.fault(schedule.position(), "key-missing", "the schedule lacks '" + key + "'; write for example "
                    + example);
        }
        return fields.value(key);
    }

    private Optional<Action> action(Node node) {
        Optional<Node.Scalar> name = reading.scalar(node, "'do'");
        name.ifPresent(each -> used.add(each.name()));
        if (name.isPresent() && !actions.containsKey(name.get().name())) {
            reading.fault(node.position(), "unknown-action", "there is no action '"
                    + Words.shortened(name.get().name()) + "'" + (actions.isEmpty() ? "; define it under actions"
                            : reading.known(actions.keySet(), name.get().name(), "the actions")));
        }
        return name.map(Node.Scalar::name).filter(actions::containsKey)
                .map(each -> new Action(each, actions.get(each)));
    }
}
