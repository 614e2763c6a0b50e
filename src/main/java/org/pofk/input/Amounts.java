package org.pofk.input;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Model.Written;
import org.pofk.chain.Model.Written.Form;
import org.pofk.chain.Place;
import org.pofk.exact.Rational;
import org.pofk.text.Fault;
import org.pofk.text.Faults;

/** Reads exact numbers, written as such or as expressions in parameters. */
final class Amounts {
    private static final String REST = "rest";
    private static final Set<String> OF_NUMBERS =
            Set.of("division-by-zero", "exponent-out-of-range", "number-too-large");
    private static final List<String> VALUE = List.of("value");

    private final ParameterValues parameters;
    private final Reading reading;

    Amounts(ParameterValues parameters, Reading reading) {
        this.parameters = parameters;
        this.reading = reading;
    }

    /** The number, or faults and nothing; {@code rest} is a fault. */
    Optional<Rational> number(Node node, Place on) {
        return scalar(node, on).flatMap(this::number);
    }

    /** What goes to a state, {@code rest} included; faults and nothing when it can't be read. */
    Optional<Share> share(Node node, int state, Place on) {
        Optional<Node.Scalar> scalar = scalar(node, on);
        if (scalar.isPresent() && isRest(scalar.get())) {
            return Optional.of(new Share(state, Optional.empty(), scalar.get().position(), REST, Form.REST));
        }
        return scalar.flatMap(written -> number(written)
                .map(value -> new Share(state, Optional.of(value), written.position(), written.text().strip(),
                        form(written))));
    }

    static boolean isRest(Node.Scalar scalar) {
        return scalar.text().strip().equals(REST);
    }

    /** The written number itself, out of {@code {value: …, note: …}} where it has remarks. */
    private Optional<Node.Scalar> scalar(Node node, Place on) {
        Optional<Node> value = node.asMapping().isEmpty() ? Optional.of(node)
                : Fields.of(node.asMapping().get(), on, VALUE, reading).value("value");
        if (value.isEmpty()) {
            reading.fault(node.position(), "number-missing", "a number is missing here; write for example "
                    + "{value: 1/20, note: …}");
            return Optional.empty();
        }
        if (value.get().asScalar().isEmpty()) {
            reading.fault(node.position(), "not-a-number",
                    "a number belongs here, not " + value.get().inWords());
        }
        return value.get().asScalar();
    }

    private Form form(Node.Scalar scalar) {
        boolean usesNames = Expressions.isExpression(scalar.text()) && Expressions.parse(scalar, parameters.names(),
                new Reading(new Faults(), Overrides.NONE)).filter(parsed -> !parsed.symbols().isEmpty()).isPresent();
        return usesNames ? Form.EXPRESSION : Form.NUMBER;
    }

    /** The number as it is written, without the remarks beside it. */
    Optional<Written> written(Node node, int from, int to) {
        return scalar(node).map(scalar -> new Written(from, to, scalar.text().strip(), form(scalar)));
    }

    /** The same as text alone. */
    Optional<String> written(Node node) {
        return scalar(node).map(scalar -> scalar.text().strip());
    }

    private static Optional<Node.Scalar> scalar(Node node) {
        Optional<Node> value = node.asMapping().map(mapping -> mapping.entries().stream()
                .filter(entry -> entry.name().equals("value")).map(Node.Entry::value).findFirst())
                        .orElse(Optional.of(node));
        return value.flatMap(Node::asScalar);
    }

    private Optional<Rational> number(Node.Scalar scalar) {
        if (isRest(scalar)) {
            reading.fault(scalar.position(), "rest-not-here",
                    "'rest' has no meaning here, where nothing must add up to 1; write the number");
            return Optional.empty();
        }
        if (!Expressions.isExpression(scalar.text())) {
            return Numerals.read(scalar.text(), scalar.position(), reading.faults());
        }
        return parameters.names().isEmpty() ? arithmetic(scalar) : parameters.value(scalar, reading);
    }

    /** Where there are no parameters, what can't be computed with numbers alone is an unreadable number. */
    private Optional<Rational> arithmetic(Node.Scalar scalar) {
        Reading trial = new Reading(new Faults(), Overrides.NONE);
        Optional<Rational> value = parameters.value(scalar, trial);
        List<Fault> faults = trial.faults().list();
        if (faults.stream().map(Fault::code).anyMatch(OF_NUMBERS::contains)) {
            reading.faults().addAll(faults);
        } else if (!faults.isEmpty()) {
            Numerals.refuse(scalar, reading.faults());
        }
        return value;
    }
}
