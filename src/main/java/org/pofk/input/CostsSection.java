package org.pofk.input;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Costs;
import org.pofk.chain.Entry;
import org.pofk.chain.Entry.Subject;
import org.pofk.chain.Model.Written;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.text.Position;

/** The section {@code costs}: what states, moves, actions and the start cost, and how later steps are discounted. */
final class CostsSection {
    private static final List<String> KEYS = List.of("unit", "each step in", "each move", "at start", "discount");
    private static final String UNIT = "units";

    private final States states;
    private final Map<String, List<Integer>> sets;
    private final MoveFinder moves;
    private final List<String> actions;
    private final Amounts amounts;
    private final Reading reading;
    private final Map<Entry, String> written = new HashMap<>();

    /** Whether there is a move between two states. */
    interface MoveFinder {
        boolean isMove(int from, int to);

        /**
         * A move that isn't zero in one of the matrices the chain moves by, or that the file writes although it is: a
         * parameter may be zero.
         */
        static MoveFinder of(List<SparseMatrix> matrices, List<Written> written) {
            Set<List<Integer>> moves = new HashSet<>();
            written.forEach(each -> moves.add(List.of(each.from(), each.to())));
            for (SparseMatrix matrix : matrices) {
                for (int from = 0; from < matrix.size(); from++) {
                    int left = from;
                    matrix.columns().get(from).forEach(entry -> moves.add(List.of(left, entry.row())));
                }
            }
            return (from, to) -> moves.contains(List.of(from, to));
        }
    }

    /** @param actions the names of the model's actions */
    CostsSection(States states, Map<String, List<Integer>> sets, MoveFinder moves, List<String> actions,
            Amounts amounts, Reading reading) {
        this.states = states;
        this.sets = sets;
        this.moves = moves;
        this.actions = actions;
        this.amounts = amounts;
        this.reading = reading;
    }

    /** The costs; faults, and what there is, when something is wrong with them. */
    Optional<Costs> read(Node node, Head head) {
        if (head.kind() == Chain.Kind.RECURSION) {
            reading.fault(node.position(), "costs-of-recursion", "costs are expected over a chain of probabilities; "
                    + "this model is a recursion, in which an output can hold the amounts");
            return Optional.empty();
        }
        return reading.mapping(node, "'costs'", "{unit: kEUR, each step in: {STATE: 12}}").map(this::costs);
    }

    private Costs costs(Node.Mapping mapping) {
        List<String> keys = new ArrayList<>(KEYS);
        actions.stream().map(CostsSection::key).filter(key -> !KEYS.contains(key)).forEach(keys::add);
        Fields fields = Fields.of(mapping, Place.of(Part.COSTS), keys, reading);
        if (keys.stream().filter(key -> !key.equals("unit") && !key.equals("discount"))
                .allMatch(key -> fields.value(key).isEmpty())) {
            reading.fault(mapping.position(), "costs-of-nothing", "these costs name no amount; write for example "
                    + "each step in: {STATE: 12}, each move: {STATE: {OTHER: 40}} or at start: 100");
        }
        return new Costs(fields.value("unit").flatMap(unit -> reading.text(unit, "'unit'")).orElse(UNIT),
                fields.value("each step in").map(node -> eachIn(node, "each step in",
                        Place.of(Part.COSTS_OF_EACH_STEP), state -> Entry.of(Subject.COST_OF_STATE, state)))
                                .orElseGet(() -> byState(Map.of())),
                fields.value("each move").map(this::eachMove).orElse(List.of()),
                actions.stream().filter(action -> keys.indexOf(key(action)) >= KEYS.size())
                        .flatMap(action -> fields.value(key(action)).map(node -> new Costs.OfAction(action,
                                eachIn(node, key(action), Place.named("costs of each " + action),
                                        state -> Entry.of(Subject.COST_OF_ACTION, action, state)))).stream()).toList(),
                fields.value("at start").flatMap(this::atStart).orElse(Rational.ZERO),
                fields.value("discount").flatMap(this::discount), written);
    }

    /** What an action's costs stand under. */
    private static String key(String action) {
        return "each " + action + " in";
    }

    private void write(Node value, Entry entry) {
        amounts.written(value).ifPresent(text -> written.put(entry, text));
    }

    private Optional<Rational> atStart(Node node) {
        write(node, Entry.of(Subject.COST_AT_START));
        return amounts.number(node, Place.of(Part.COSTS_AT_START));
    }

    /** Amounts by state: {@code what} is {@code each step in}, or {@code each ACTION in}. */
    private List<Rational> eachIn(Node node, String what, Place on, Function<String, Entry> entryOf) {
        Map<Integer, Rational> found = new HashMap<>();
        Map<Integer, Position> seen = new HashMap<>();
        reading.mapping(node, "'" + what + "'", "{STATE: 12}").ifPresent(mapping -> {
            for (Node.Entry entry : costed(mapping, on)) {
                Optional<Rational> cost = amounts.number(entry.value(),
                        Place.named("cost of " + what + " '" + entry.name() + "'"));
                for (int state : members(entry.key())) {
                    if (isNew(seen, state, entry.key(), what + " '" + states.names().get(state) + "'")) {
                        write(entry.value(), entryOf.apply(states.names().get(state)));
                        cost.ifPresent(amount -> found.put(state, amount));
                    }
                }
            }
        });
        return byState(found);
    }

    private List<Rational> byState(Map<Integer, Rational> found) {
        Rational[] all = new Rational[states.size()];
        Arrays.setAll(all, state -> found.getOrDefault(state, Rational.ZERO));
        return List.of(all);
    }

    private List<Costs.Move> eachMove(Node node) {
        Map<List<Integer>, Position> seen = new LinkedHashMap<>();
        List<Costs.Move> found = new ArrayList<>();
        reading.mapping(node, "'each move'", "{STATE: {OTHER: 40}}").ifPresent(mapping -> {
            for (Node.Entry from : costed(mapping, Place.of(Part.COSTS_OF_MOVES))) {
                List<Integer> left = members(from.key());
                reading.mapping(from.value(), "what moves from '" + Words.shortened(from.name()) + "' cost",
                        "{OTHER: 40}").ifPresent(targets -> costed(targets, Place.named("costs of moves from '"
                                + from.name() + "'"))
                        .forEach(to -> found.addAll(moves(from, to, left, seen))));
            }
        });
        return found;
    }

    /** The moves between two states or sets that there are, each with its cost; a fault where there is none. */
    private List<Costs.Move> moves(Node.Entry from, Node.Entry to, List<Integer> left,
            Map<List<Integer>, Position> seen) {
        Optional<Rational> cost = amounts.number(to.value(),
                Place.named("cost of the move from '" + from.name() + "' to '" + to.name() + "'"));
        List<Integer> entered = members(to.key());
        List<Costs.Move> found = new ArrayList<>();
        boolean any = left.isEmpty() || entered.isEmpty();
        for (int start : left) {
            for (int end : entered) {
                if (moves.isMove(start, end)) {
                    any = true;
                    if (isNew(seen, List.of(start, end), to.key(), "the move from '" + states.names().get(start)
                            + "' to '" + states.names().get(end) + "'")) {
                        write(to.value(), Entry.of(Subject.COST_OF_MOVE, states.names().get(start),
                                states.names().get(end)));
                        cost.ifPresent(amount -> found.add(new Costs.Move(start, end, amount)));
                    }
                }
            }
        }
        if (!any) {
            reading.fault(to.key().position(), "unknown-move", "there is no move from '" + Words.shortened(from.name())
                    + "' to '" + Words.shortened(to.name()) + "' that could cost anything" + instead(left));
        }
        return found;
    }

    private String instead(List<Integer> left) {
        List<String> targets = left.stream().flatMap(from -> IntStream.range(0, states.size())
                .filter(to -> moves.isMove(from, to)).mapToObj(states.names()::get)).distinct().toList();
        return targets.size() > 8 ? "" : "; moves lead from there to " + Words.quotedList(targets);
    }

    private <K> boolean isNew(Map<K, Position> seen, K costed, Node.Scalar key, String what) {
        Position before = seen.putIfAbsent(costed, key.position());
        if (before != null) {
            reading.fault(key.position(), "cost-twice", what + " has a cost at line " + before.line() + ", column "
                    + before.column() + " already; write it once");
        }
        return before == null;
    }

    /** The entries that are no remarks. */
    private List<Node.Entry> costed(Node.Mapping mapping, Place on) {
        return mapping.entries().stream().filter(entry -> states.contains(entry.name())
                || sets.containsKey(entry.name()) || !Fields.takeRemark(entry, on, reading)).toList();
    }

    /** The states a name stands for; none, and a fault, for an unknown one. */
    private List<Integer> members(Node.Scalar name) {
        if (sets.containsKey(name.name())) {
            return sets.get(name.name());
        }
        if (states.contains(name.name())) {
            return List.of(states.place(name.name()));
        }
        List<String> known = new ArrayList<>(states.names());
        known.addAll(sets.keySet());
        reading.fault(name.position(), "unknown-state", "there is no state or set '" + Words.shortened(name.name())
                + "'" + reading.known(known, name.name(), "there"));
        return List.of();
    }

    private Optional<Rational> discount(Node node) {
        write(node, Entry.of(Subject.DISCOUNT));
        Optional<Rational> rate = amounts.number(node, Place.of(Part.DISCOUNT));
        if (rate.isPresent() && (rate.get().signum() < 0 || rate.get().compareTo(Rational.ONE) > 0)) {
            reading.fault(node.position(), "discount-out-of-range", "a discount of " + Numbers.shown(rate.get())
                    + " a step must lie between 0 and 1; write for example 3.5%");
            return Optional.empty();
        }
        return rate;
    }
}
