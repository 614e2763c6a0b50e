package org.pofk.input;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.exact.Rational;
import org.pofk.formula.LinearForm;
import org.pofk.formula.ParsedFormula;

/**
 * The section {@code outputs}: linear expressions in states, sets, parameters and other outputs, or mappings of states
 * to coefficients.
 */
final class OutputsSection {
    private final States states;
    private final Chain.Kind kind;
    private final Map<String, List<Integer>> sets;
    private final Amounts amounts;
    private final ParameterValues parameters;
    private final Reading reading;
    private final Map<String, LinearForm> names = new LinkedHashMap<>();
    private final Map<String, Node> written = new LinkedHashMap<>();
    private final Set<String> allNames = new HashSet<>();
    private final Deque<String> open = new ArrayDeque<>();

    OutputsSection(States states, Chain.Kind kind, Map<String, List<Integer>> sets, ParameterValues parameters,
            Reading reading) {
        this.states = states;
        this.kind = kind;
        this.sets = sets;
        this.amounts = new Amounts(parameters, reading);
        this.parameters = parameters;
        this.reading = reading;
        names.putAll(parameters.known());
        states.names().forEach(state -> names.put(state, LinearForm.of(state)));
        sets.forEach((name, members) -> names.put(name, sum(members)));
    }

    private LinearForm sum(List<Integer> members) {
        return new LinearForm(Rational.ZERO, members.stream()
                .collect(Collectors.toMap(states.names()::get, member -> Rational.ONE)));
    }

    List<Output> read(Node node) {
        reading.mapping(node, "'outputs'", "{lost: 1 - running}").ifPresent(this::collect);
        written.keySet().forEach(this::resolve);
        return written.keySet().stream().map(this::output).toList();
    }

    private void collect(Node.Mapping mapping) {
        for (Node.Entry entry : mapping.entries()) {
            if (States.isName(entry.key(), "an output", reading)) {
                written.put(entry.name(), entry.value());
            }
        }
        allNames.addAll(names.keySet());
        allNames.addAll(parameters.faulty());
        allNames.addAll(written.keySet());
    }

    private Output output(String name) {
        LinearForm form = names.get(name);
        boolean spread = kind == Chain.Kind.CHAIN;
        Rational everywhere = spread ? form.constant() : Rational.ZERO;
        List<Rational> coefficients = states.names().stream()
                .map(state -> form.coefficient(state).plus(everywhere)).toList();
        return new Output(name, coefficients, spread ? Rational.ZERO : form.constant(), definition(written.get(name)));
    }

    /** How the file writes it, without remarks. */
    private String definition(Node node) {
        if (node.asMapping().isEmpty()) {
            return node.asScalar().map(Node.Scalar::text).orElse("").strip();
        }
        List<Node.Entry> terms = node.asMapping().get().entries().stream()
                .filter(entry -> isTerm(entry.name()) || !Fields.isRemark(entry)).toList();
        return terms.size() == 1 && !isTerm(terms.get(0).name()) ? definition(terms.get(0).value())
                : terms.stream().map(term -> term.name() + ": " + definition(term.value()))
                        .collect(Collectors.joining(", ", "{", "}"));
    }

    private boolean isTerm(String name) {
        return states.contains(name) || sets.containsKey(name);
    }

    /** Makes the output's form known; zero when it has faults, so that each fault is told once. */
    private void resolve(String name) {
        if (!names.containsKey(name)) {
            open.push(name);
            LinearForm form = form(written.get(name), name);
            open.pop();
            names.put(name, form);
        }
    }

    private LinearForm form(Node node, String output) {
        if (node.asMapping().isPresent()) {
            return mapped(node.asMapping().get(), output);
        }
        return reading.scalar(node, "the output '" + Words.shortened(output) + "'").flatMap(this::expression)
                .orElse(LinearForm.ZERO);
    }

    private Optional<LinearForm> expression(Node.Scalar scalar) {
        if (!scalar.isPlain() && isName(scalar.name())) {
            if (written.containsKey(scalar.name())) {
                resolve(scalar.name());
            }
            return Optional.of(names.get(scalar.name()));
        }
        return Expressions.parse(scalar, allNames, reading).flatMap(this::evaluate);
    }

    private Optional<LinearForm> evaluate(ParsedFormula parsed) {
        boolean circle = false;
        for (ParsedFormula symbol : parsed.symbols()) {
            String name = Expressions.name(symbol);
            if (!names.containsKey(name) && written.containsKey(name)
                    && reading.closesCircle(open, name, "output", symbol.position())) {
                circle = true;
            } else if (written.containsKey(name)) {
                resolve(name);
            }
        }
        return circle || !parameters.suffice(parsed) ? Optional.empty() : Expressions.evaluate(parsed, names, reading);
    }

    /** Coefficients by state or set, or an expression with remarks as {@code {value: …, note: …}}. */
    private LinearForm mapped(Node.Mapping mapping, String output) {
        LinearForm sum = LinearForm.ZERO;
        for (Node.Entry entry : mapping.entries()) {
            sum = sum.plus(term(entry, output));
        }
        return sum;
    }

    private LinearForm term(Node.Entry entry, String output) {
        Place on = Place.of(Part.OUTPUT, output);
        String name = entry.name();
        if (isTerm(name)) {
            return amounts.number(entry.value(), on).map(names.get(name)::times).orElse(LinearForm.ZERO);
        }
        if (name.equals("value")) {
            return form(entry.value(), output);
        }
        if (!Fields.takeRemark(entry, on, reading)) {
            List<String> known = new ArrayList<>(states.names());
            known.addAll(sets.keySet());
            reading.fault(entry.key().position(), "unknown-state", "there is no state or set '"
                    + Words.shortened(name) + "'" + reading.known(known, name, "there"));
        }
        return LinearForm.ZERO;
    }

    private boolean isName(String name) {
        return names.containsKey(name) || written.containsKey(name) && !open.contains(name);
    }
}
