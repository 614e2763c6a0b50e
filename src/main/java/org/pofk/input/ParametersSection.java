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
import org.pofk.chain.Model.Parameter;
import org.pofk.chain.Model.Remark.Kind;
import org.pofk.chain.Model.Setting;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.exact.Rational;
import org.pofk.formula.LinearForm;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Position;

/** The section {@code parameters}: named numbers, which may be defined by one another without going in a circle. */
final class ParametersSection {
    private static final List<String> KEYS = List.of("value", "from", "to", "meaning");
    private static final Set<String> RESERVED = Set.of("k", "z", "i", "pi", "π", "deg", "degree", "degrees", "delta", "rest",
            "sqrt", "cos", "sin", "exp", "arctan", "atan", "arccos", "acos", "binomial");

    private final Reading reading;
    private final Map<String, Declaration> declared = new LinkedHashMap<>();
    private final Map<String, Optional<Rational>> values = new LinkedHashMap<>();
    private final Set<String> refused = new HashSet<>();
    private final Deque<String> open = new ArrayDeque<>();

    /** A parameter as the file gives it; {@code value} is the scalar that defines it. */
    private record Declaration(Node.Scalar name, Optional<Node.Scalar> value, Optional<Node> from, Optional<Node> to,
            Optional<String> meaning, Optional<String> source) {
    }

    ParametersSection(Reading reading) {
        this.reading = reading;
    }

    /** All parameters with their values; those with faults are left out. */
    List<Parameter> read(Optional<Node> node) {
        node.flatMap(section -> reading.mapping(section, "'parameters'", "{fade: 1/50}")).ifPresent(this::declareAll);
        refuseUnknownOverrides();
        List<Parameter> parameters = new ArrayList<>();
        for (Declaration declaration : declared.values()) {
            value(declaration.name().name()).ifPresent(value -> parameters.add(parameter(declaration, value)));
        }
        return parameters;
    }

    /** The values, for expressions. */
    ParameterValues values() {
        Map<String, LinearForm> known = new LinkedHashMap<>();
        Set<String> faulty = new HashSet<>(refused);
        declared.keySet().forEach(name -> value(name).ifPresentOrElse(
                value -> known.put(name, LinearForm.constant(value)), () -> faulty.add(name)));
        return ParameterValues.of(known, faulty);
    }

    private void declareAll(Node.Mapping mapping) {
        for (Node.Entry entry : mapping.entries()) {
            if (RESERVED.contains(entry.name())) {
                reading.fault(entry.key().position(), "reserved-name", "'" + entry.name()
                        + "' has a meaning of its own in formulas; give the parameter another name");
                refused.add(entry.name());
            } else if (States.isName(entry.key(), "a parameter", reading)) {
                declared.put(entry.name(), declaration(entry));
            }
        }
    }

    private Declaration declaration(Node.Entry entry) {
        Optional<Node> override = Optional.ofNullable(reading.overrides().parameters().get(entry.name()))
                .map(text -> new Node.Scalar(option(entry.name()), text, Node.Style.QUOTED));
        if (entry.value().asMapping().isEmpty()) {
            override.ifPresent(value -> set(entry, value, Optional.of(entry.value())));
            return new Declaration(entry.key(), scalar(override.or(() -> Optional.of(entry.value()))),
                    Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
        }
        Place on = Place.of(Part.PARAMETER, entry.name());
        Fields fields = Fields.of(entry.value().asMapping().get(), on, KEYS, reading);
        override.ifPresent(value -> set(entry, value, fields.value("value")));
        return new Declaration(entry.key(), scalar(override.or(() -> fields.value("value"))), fields.value("from"),
                fields.value("to"), fields.value("meaning").flatMap(node -> reading.text(node, "'meaning'")),
                reading.remarks().stream().filter(remark -> remark.on().equals(on) && remark.kind() == Kind.SOURCE)
                        .filter(remark -> override.isEmpty()).map(remark -> remark.text()).findFirst());
    }

    private void set(Node.Entry entry, Node value, Optional<Node> inFile) {
        reading.settings().add(new Setting(Optional.of(entry.name()), value.inOneLine(),
                inFile.map(Node::inOneLine).filter(text -> !text.isEmpty())));
    }

    /** The scalar that defines a value; none for nothing, {@code ~} and {@code null}. */
    private Optional<Node.Scalar> scalar(Optional<Node> node) {
        if (node.isPresent() && node.get().asScalar().isEmpty()) {
            reading.fault(node.get().position(), "not-a-number", "a number belongs here, not " + node.get().inWords());
        }
        return node.flatMap(Node::asScalar).filter(value -> !value.isAbsent()
                && !(value.isPlain() && (value.text().equals("null") || value.text().equals("~"))));
    }

    private void refuseUnknownOverrides() {
        for (String name : reading.overrides().parameters().keySet()) {
            if (!declared.containsKey(Names.canonical(name))) {
                reading.fault(option(name), "unknown-parameter", "there is no parameter '"
                        + Words.shortened(name) + "'" + reading.known(declared.keySet(), name, "the parameters"));
            }
        }
    }

    private static Position option(String name) {
        return Position.ofWhole(Overrides.SET_OPTION + " " + name);
    }

    private Optional<Rational> value(String name) {
        if (!values.containsKey(name)) {
            open.push(name);
            Optional<Rational> value = evaluate(declared.get(name));
            open.pop();
            values.put(name, value);
        }
        return values.get(name);
    }

    private Optional<Rational> evaluate(Declaration declaration) {
        if (declaration.value().isEmpty()) {
            reading.fault(declaration.name().position(), "parameter-without-value", "the parameter '"
                    + declaration.name().name() + "' has no value; formulas in symbols aren't available yet, so write "
                    + "for example " + declaration.name().name() + ": 1/20");
            return Optional.empty();
        }
        Node.Scalar written = declaration.value().get();
        if (!Expressions.isExpression(written.text())) {
            return Numerals.read(written.text(), written.position(), reading.faults());
        }
        return Expressions.parse(written, declared.keySet(), reading).flatMap(this::evaluate);
    }

    private Optional<Rational> evaluate(ParsedFormula definition) {
        Map<String, LinearForm> known = new LinkedHashMap<>();
        boolean allKnown = true;
        for (ParsedFormula symbol : definition.symbols()) {
            String name = Expressions.name(symbol);
            if (reading.closesCircle(open, name, "parameter", symbol.position())) {
                allKnown = false;
            } else if (declared.containsKey(name)) {
                Optional<Rational> value = value(name);
                allKnown &= value.isPresent();
                known.put(name, LinearForm.constant(value.orElse(Rational.ZERO)));
            } else if (!refused.contains(name)) {
                reading.fault(symbol.position(), "unknown-parameter", "there is no parameter '"
                        + Words.shortened(name) + "'" + reading.known(declared.keySet(), name, "the parameters"));
                allKnown = false;
            }
        }
        return allKnown ? Expressions.evaluate(definition, known, reading).map(LinearForm::constant)
                : Optional.empty();
    }

    private Parameter parameter(Declaration declaration, Rational value) {
        Amounts amounts = new Amounts(ParameterValues.NONE, reading);
        Optional<Rational> from = declaration.from().flatMap(node -> amounts.number(node, Place.named("from")));
        Optional<Rational> to = declaration.to().flatMap(node -> amounts.number(node, Place.named("to")));
        Position place = declaration.value().orElseThrow().position();
        String name = declaration.name().name();
        if (from.isPresent() && to.isPresent() && from.get().compareTo(to.get()) > 0) {
            reading.fault(declaration.from().get().position(), "empty-range", "the range of '" + name + "' from "
                    + Numbers.shown(from.get()) + " to " + Numbers.shown(to.get()) + " is empty; turn it round");
        } else {
            from.filter(least -> value.compareTo(least) < 0).ifPresent(least -> reading.fault(place, "out-of-range",
                    "the parameter '" + name + "' is " + Numbers.shown(value) + ", below " + Numbers.shown(least)
                            + ", where its range begins"));
            to.filter(most -> value.compareTo(most) > 0).ifPresent(most -> reading.fault(place, "out-of-range",
                    "the parameter '" + name + "' is " + Numbers.shown(value) + ", above " + Numbers.shown(most)
                            + ", where its range ends"));
        }
        Optional<String> definition = declaration.value().map(Node.Scalar::text).map(String::strip)
                .filter(Expressions::isExpression);
        return new Parameter(name, value.toString(), definition, from.map(Rational::toString),
                to.map(Rational::toString), declaration.meaning(), declaration.source());
    }
}
