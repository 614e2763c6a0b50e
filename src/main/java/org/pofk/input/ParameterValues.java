package org.pofk.input;

import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.exact.Rational;
import org.pofk.formula.LinearForm;
import org.pofk.formula.ParsedFormula;

/**
 * The parameters of a model as expressions use them.
 *
 * @param known  value by name
 * @param faulty names whose definition has a fault: what uses them has no value, and no fault of its own
 * @param names  all of them
 */
record ParameterValues(Map<String, LinearForm> known, Set<String> faulty, Set<String> names) {
    static final ParameterValues NONE = of(Map.of(), Set.of());

    static ParameterValues of(Map<String, LinearForm> known, Set<String> faulty) {
        Set<String> names = new HashSet<>(known.keySet());
        names.addAll(faulty);
        return new ParameterValues(known, faulty, names);
    }

    /** Whether the expression can be evaluated as far as parameters go. */
    boolean suffice(ParsedFormula parsed) {
        return faulty.isEmpty() || Expressions.symbols(parsed).stream().noneMatch(faulty::contains);
    }

    /** The value of an expression in parameters alone; faults and nothing otherwise. */
    Optional<Rational> value(Node.Scalar scalar, Reading reading) {
        return Expressions.parse(scalar, names(), reading).filter(this::suffice)
                .flatMap(parsed -> Expressions.evaluate(parsed, known, reading)).map(LinearForm::constant);
    }
}
