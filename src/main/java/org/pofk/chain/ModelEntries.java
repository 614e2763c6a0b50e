package org.pofk.chain;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.chain.Entry.Subject;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;

/**
 * All that a model states, as entries with their values: two models say the same where their entries are equal. Exact:
 * a number is its decimal where that ends soon, else its fraction. Zero moves and starts are no entries.
 */
final class ModelEntries {
    private static final int LONGEST_DECIMAL = 12;
    private static final int LONG_BITS = 1024;

    private final Model model;
    private final Map<String, String> names;
    private final Map<Entry, String> entries = new LinkedHashMap<>();

    private ModelEntries(Model model, Map<String, String> names) {
        this.model = model;
        this.names = names;
    }

    /**
     * The entries in the model's order.
     *
     * @param names other names for states, under which their entries are kept
     */
    static Map<Entry, String> of(Model model, Map<String, String> names) {
        ModelEntries all = new ModelEntries(model, names);
        all.about();
        all.chain();
        all.model.schedule().ifPresent(all::schedule);
        all.parameters();
        all.model.costs().ifPresent(all::costs);
        model.settings().forEach(all::inFile);
        // what a rest came to is listed among the changes on entry too, and is what the author wrote
        model.changes().stream().filter(Model.Adjustment::isChange).map(Model.Adjustment::text)
                .forEach(change -> all.put(change, Subject.ADJUSTED, change));
        model.notes().forEach(note -> all.join(Entry.of(Subject.NOTE, note.kind().word(), note.on().words()), note.text()));
        return all.entries;
    }

    private void put(String value, Subject subject, String... of) {
        entries.put(Entry.of(subject, of), value);
    }

    private void put(Optional<String> value, Subject subject, String... of) {
        value.ifPresent(text -> put(text, subject, of));
    }

    private void join(Entry entry, String text) {
        entries.merge(entry, text, (one, other) -> one + "; " + other);
    }

    private void about() {
        put(model.title(), Subject.TITLE);
        put(model.about().document(), Subject.DOCUMENT);
        put(model.about().revision(), Subject.REVISION);
        put(model.about().preparedBy(), Subject.PREPARED_BY);
        put(model.about().concerns().map(ModelEntries::words), Subject.CONCERNS);
        model.about().assumptions().forEach(assumption -> join(Entry.of(Subject.ASSUMPTION, assumption), assumption));
        put(model.chain().kind() == Chain.Kind.CHAIN ? "chain" : "recursion", Subject.KIND);
        put(words(model.convention()), Subject.CONVENTION);
        put(model.step().is(), Subject.STEP);
        put(model.step().lasts(), Subject.STEP_LASTS);
        put(model.step().first(), Subject.FIRST_STEP);
    }

    private String state(int place) {
        String name = model.chain().states().get(place);
        return names.getOrDefault(name, name);
    }

    private void chain() {
        Chain chain = model.chain();
        for (int i = 0; i < chain.size(); i++) {
            put(chain.states().get(i), Subject.STATE, state(i));
            if (!chain.start().get(i).isZero()) {
                put(number(chain.start().get(i)), Subject.START, state(i));
            }
        }
        moves(chain.matrix(), Subject.MOVE, List.of());
        chain.sets().forEach((name, members) -> put(members.stream().map(this::state)
                .collect(Collectors.joining(", ")), Subject.SET, name));
        chain.outputs().forEach(output -> put(output.definition(), Subject.OUTPUT, output.name()));
    }

    /** Of the chain, of an action, or of a phase's matrix, which {@code of} names. */
    private void moves(SparseMatrix matrix, Subject subject, List<String> of) {
        for (int from = 0; from < matrix.size(); from++) {
            for (SparseMatrix.Entry move : matrix.columns().get(from)) {
                List<String> named = new ArrayList<>(of);
                named.addAll(List.of(state(from), state(move.row())));
                entries.put(new Entry(subject, named), number(move.value()));
            }
        }
    }

    private void schedule(Schedule schedule) {
        for (Schedule.Recurring recurring : schedule.recurring()) {
            String name = recurring.action().name();
            join(Entry.of(Subject.ACTION, name), "every " + recurring.every() + " steps, first at step "
                    + recurring.first() + (recurring.when() == Schedule.When.AFTER_THE_STEP ? ", after the step"
                    : ", instead of the step"));
            moves(recurring.action().matrix(), Subject.ACTION_MOVE, List.of(name));
        }
        schedule.phases().ifPresent(phases -> {
            for (int i = 0; i < phases.list().size(); i++) {
                Schedule.Phase phase = phases.list().get(i);
                put(phase.steps() + " steps by " + phase.use(), Subject.PHASE, String.valueOf(i + 1));
                moves(phase.matrix(), Subject.PHASE_MOVE, List.of(phase.use()));
            }
            put(phases.repeat() == Schedule.Repeat.YES ? "the first again" : "the last for ever",
                    Subject.AFTER_PHASES);
        });
    }

    private void costs(Costs costs) {
        put(costs.unit(), Subject.COST_UNIT);
        for (int i = 0; i < costs.eachStep().size(); i++) {
            if (!costs.eachStep().get(i).isZero()) {
                put(number(costs.eachStep().get(i)), Subject.COST_OF_STATE, state(i));
            }
        }
        costs.moves().forEach(move -> put(number(move.cost()), Subject.COST_OF_MOVE, state(move.from()),
                state(move.to())));
        costs.actions().forEach(this::costs);
        if (!costs.atStart().isZero()) {
            put(number(costs.atStart()), Subject.COST_AT_START);
        }
        put(costs.discount().map(ModelEntries::number), Subject.DISCOUNT);
    }

    private void costs(Costs.OfAction costs) {
        for (int i = 0; i < costs.inState().size(); i++) {
            if (!costs.inState().get(i).isZero()) {
                put(number(costs.inState().get(i)), Subject.COST_OF_ACTION, costs.action(), state(i));
            }
        }
    }

    private void parameters() {
        for (Model.Parameter parameter : model.parameters()) {
            String name = parameter.name();
            put(number(Rational.parse(parameter.value())), Subject.PARAMETER, name);
            put(parameter.definition().filter(text -> !text.equals(parameter.value())), Subject.DEFINITION, name);
            if (parameter.from().isPresent() || parameter.to().isPresent()) {
                put("from " + parameter.from().orElse("−∞") + " to " + parameter.to().orElse("∞"), Subject.RANGE, name);
            }
            put(parameter.meaning(), Subject.MEANING, name);
        }
    }

    /** The file's own words where others take their place: they change too, without any effect. */
    private void inFile(Model.Setting setting) {
        setting.parameter().ifPresentOrElse(name -> put(setting.inFile(), Subject.PARAMETER_IN_FILE, name),
                () -> put(setting.inFile(), Subject.START_IN_FILE));
    }

    private static String words(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }

    private static String number(Rational value) {
        if (value.numerator().bitLength() + value.denominator().bitLength() > LONG_BITS) {
            return value.toString();
        }
        Decimal decimal = Decimals.of(value, LONGEST_DECIMAL);
        return decimal.exact() ? decimal.text() : value.toString();
    }
}
