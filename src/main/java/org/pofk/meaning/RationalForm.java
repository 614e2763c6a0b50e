package org.pofk.meaning;

import java.util.List;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/**
 * What a formula in z means: a sum of products of polynomials to whole powers, as written. What is factored stays
 * factored, and fractions that are added stay apart; polynomials that are added are one, fractions within fractions
 * are flattened, and a sum of fractions below a line or raised is brought over one line. Powers of z alone are one
 * factor. In 1/(1 − 0.4 z^(−1)) the line is multiplied through: z/(z − 0.4).
 *
 * @param summands one for a formula that is a single product or quotient; none for zero
 */
public record RationalForm(List<Summand> summands) {

    /**
     * front · Π polynomial^exponent; exponents are not zero, negative below the line.
     *
     * @param span the part of the text that means this summand alone; where it was multiplied out, the part that tells
     *             it from its neighbours
     */
    public record Summand(Quantity front, List<Factor> factors, Span span) {
        public Summand {
            factors = List.copyOf(factors);
        }

        private Quantity valueAt(Quantity z) {
            return factors.stream().map(factor -> factor.valueAt(z)).reduce(front, Quantity::times);
        }

        private int degreeAbove() {
            return factors.stream().mapToInt(factor -> factor.degree() * Math.max(factor.exponent(), 0)).sum();
        }

        private int degreeBelow() {
            return factors.stream().mapToInt(factor -> factor.degree() * Math.max(-factor.exponent(), 0)).sum();
        }
    }

    /** A polynomial of degree at least one, coefficients by ascending power, to a whole power. */
    public record Factor(List<Quantity> coefficients, int exponent, Span span) {
        public Factor {
            coefficients = List.copyOf(coefficients);
        }

        public int degree() {
            return coefficients.size() - 1;
        }

        private Quantity valueAt(Quantity z) {
            return WrittenPolynomial.valueAt(coefficients, z).pow(exponent);
        }
    }

    public RationalForm {
        summands = List.copyOf(summands);
    }

    /** What a formula means in the variable of this name; refused, with the place, where it isn't rational in it. */
    public static RationalForm of(ParsedFormula formula, String variable, Precision precision)
            throws RefusedException {
        return of(formula, variable, precision, new Work());
    }

    static RationalForm of(ParsedFormula formula, String variable, Precision precision, Work work)
            throws RefusedException {
        Scalars scalars = new Scalars(work);
        return new RationalForm(Reading.of(formula, new FormAlgebra(variable, scalars), scalars, precision).stream()
                .map(RationalForm::finished).toList());
    }

    private static Summand finished(FormSummand summand) {
        return new Summand(summand.front().quantity(), summand.factors().stream().map(factor -> new Factor(
                factor.coefficients().stream().map(Scalar::quantity).toList(), factor.exponent(), factor.span()))
                .toList(), summand.span());
    }

    /** The value at a point where nothing below a line is zero. */
    public Quantity valueAt(Quantity z) {
        return Quantity.sum(summands.stream().map(summand -> summand.valueAt(z)).toList());
    }

    /** The degree below the line at most, all brought over one line. */
    public int denominatorDegree() {
        return summands.stream().mapToInt(Summand::degreeBelow).sum();
    }

    /** The degree above the line at most, all brought over one line; 0 for zero. */
    public int numeratorDegree() {
        int below = denominatorDegree();
        return summands.stream().mapToInt(summand -> below - summand.degreeBelow() + summand.degreeAbove()).max()
                .orElse(0);
    }
}
