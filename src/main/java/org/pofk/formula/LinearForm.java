package org.pofk.formula;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeMap;
import org.pofk.exact.Rational;
import org.pofk.text.RefusedException;

/**
 * A constant plus a sum of names with exact coefficients: {@code 1 − lost − one}. Canonical form: no coefficient is
 * zero; names in the order in which they came in (which doesn't matter for equality). Exact.
 */
public record LinearForm(Rational constant, Map<String, Rational> coefficients) {
    public static final LinearForm ZERO = constant(Rational.ZERO);

    public LinearForm {
        Map<String, Rational> kept = new LinkedHashMap<>(coefficients);
        kept.values().removeIf(Rational::isZero);
        coefficients = Collections.unmodifiableMap(kept);
    }

    public static LinearForm constant(Rational value) {
        return new LinearForm(value, Map.of());
    }

    /** The name itself, with coefficient one. */
    public static LinearForm of(String name) {
        return new LinearForm(Rational.ZERO, Map.of(name, Rational.ONE));
    }

    /**
     * The value of a formula that is linear in what stands for itself in {@code names}; a parameter stands for a
     * constant, a set of states for a sum. Refused, with all faults and their places: names that aren't in the map,
     * products and powers of names, divisions by zero, what has no exact value, and numbers of tens of thousands of
     * digits.
     */
    public static LinearForm evaluate(ParsedFormula formula, Map<String, LinearForm> names) throws RefusedException {
        return LinearEvaluation.of(formula, names);
    }

    /**
     * The exact value of a formula in parameters alone; refused as {@link #evaluate} does.
     */
    public static Rational value(ParsedFormula formula, Map<String, Rational> parameters) throws RefusedException {
        Map<String, LinearForm> names = new LinkedHashMap<>();
        parameters.forEach((name, value) -> names.put(name, constant(value)));
        return evaluate(formula, names).constant;
    }

    /** True when no name has a coefficient. */
    public boolean isConstant() {
        return coefficients.isEmpty();
    }

    /** The coefficient of a name, zero when it has none. */
    public Rational coefficient(String name) {
        return coefficients.getOrDefault(name, Rational.ZERO);
    }

    public LinearForm plus(LinearForm other) {
        Map<String, Rational> sum = new LinkedHashMap<>(coefficients);
        other.coefficients.forEach((name, coefficient) -> sum.merge(name, coefficient, Rational::plus));
        return new LinearForm(constant.plus(other.constant), sum);
    }

    public LinearForm times(Rational factor) {
        Map<String, Rational> product = new LinkedHashMap<>();
        coefficients.forEach((name, coefficient) -> product.put(name, coefficient.times(factor)));
        return new LinearForm(constant.times(factor), product);
    }

    @Override
    public String toString() {
        return constant + new TreeMap<>(coefficients).toString();
    }
}
