package org.pofk.meaning;

import java.util.List;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/**
 * What a formula in z means: a sum of products of polynomials to whole powers, as written.
 *
 * @param summands one for a formula that is a single product or quotient
 */
public record RationalForm(List<Summand> summands) {

    /** front · Π polynomial^exponent; exponents are not zero, negative below the line. */
    public record Summand(Quantity front, List<Factor> factors, Span span) {
    }

    /** A polynomial of degree at least one, coefficients by ascending power, to a whole power. */
    public record Factor(List<Quantity> coefficients, int exponent, Span span) {
    }

    /** The meaning of a formula in the variable of this name; refused, with the place, where it isn't rational in it. */
    public static RationalForm of(ParsedFormula formula, String variable, Precision precision)
            throws RefusedException {
        throw new AssertionError("to come");
    }

    /** The value at a point. */
    public Quantity valueAt(Quantity z) {
        throw new AssertionError("to come");
    }
}
