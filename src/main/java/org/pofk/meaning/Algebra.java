package org.pofk.meaning;

import java.util.List;
import java.util.Optional;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;

/**
 * What formulas in one variable mean, put together part by part by {@link Reading}. An operation that has no meaning
 * is a {@link RefusedPart}. {@code part} is the formula whose meaning is asked for; operands stand in its order.
 */
interface Algebra<T> {

    T constant(Scalar value, ParsedFormula part);

    /** The meaning of a name; refused where it isn't the variable's. */
    T symbol(Formula.Symbol symbol, ParsedFormula part);

    /** The number that a meaning is, where the variable isn't in it. */
    Optional<Scalar> asConstant(T meaning);

    T sum(List<T> terms, ParsedFormula part);

    T negation(T operand, ParsedFormula part);

    T product(List<T> factors, ParsedFormula part);

    T quotient(T numerator, T denominator, ParsedFormula part);

    /** The variable is in the base or in the exponent. */
    T power(T base, T exponent, ParsedFormula part);

    /** The variable is in an argument. */
    T call(Formula.Function function, List<T> arguments, ParsedFormula part);

    /** One meaning per branch. */
    T cases(Formula.Cases cases, List<T> branches, ParsedFormula part);
}
