package org.pofk.meaning;

import java.util.List;
import java.util.Optional;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/**
 * A polynomial as an author writes it, in the one variable he uses, multiplied out.
 *
 * @param variable     the name he uses: z, λ, s, x
 * @param coefficients by ascending power; the last one isn't zero at face value; none for the polynomial zero
 */
public record WrittenPolynomial(String variable, List<Quantity> coefficients) {

    public WrittenPolynomial {
        coefficients = List.copyOf(coefficients);
    }

    /** The meaning of a formula in one variable; refused, with the place, where it has another or is no polynomial. */
    public static WrittenPolynomial of(ParsedFormula formula, Precision precision) throws RefusedException {
        String variable = variable(formula);
        Scalars scalars = new Scalars(new Work());
        List<FormSummand> form = Reading.of(formula, new FormAlgebra(variable, scalars), scalars, precision);
        if (!form.stream().allMatch(FormSummand::isPolynomial)) {
            throw refused(formula, "not-polynomial", "this is a fraction in " + variable
                    + ", where a polynomial is wanted");
        }
        return new WrittenPolynomial(variable, multipliedOut(formula, form, scalars));
    }

    private static List<Quantity> multipliedOut(ParsedFormula formula, List<FormSummand> form, Scalars scalars)
            throws RefusedException {
        try {
            FormArithmetic arithmetic = new FormArithmetic(scalars);
            return arithmetic.sum(form, formula.span()).stream()
                    .flatMap(whole -> arithmetic.multipliedOut(whole).stream())
                    .map(Scalar::quantity).toList();
        } catch (TooLargeException tooLarge) {
            throw refused(formula, "formula-too-large", "this polynomial is too large to be multiplied out");
        }
    }

    private static String variable(ParsedFormula formula) throws RefusedException {
        List<ParsedFormula> names = formula.symbols();
        Optional<ParsedFormula> first = names.stream().filter(name -> !nameOf(name).equals("e")).findFirst()
                .or(() -> names.stream().findFirst());
        return nameOf(first.orElseThrow(() -> refused(formula, "variable-missing",
                "a polynomial is wanted here, in a variable such as z")));
    }

    private static String nameOf(ParsedFormula name) {
        return ((Formula.Symbol) name.formula()).name();
    }

    private static RefusedException refused(ParsedFormula formula, String code, String message) {
        return new RefusedException(List.of(new Fault(formula.position(), code, message)));
    }

    public int degree() {
        return coefficients.size() - 1;
    }

    public Quantity valueAt(Quantity point) {
        return valueAt(coefficients, point);
    }

    /** By Horner's rule; ascending powers. */
    static Quantity valueAt(List<Quantity> coefficients, Quantity point) {
        Quantity value = Quantity.ZERO;
        for (int i = coefficients.size() - 1; i >= 0; i--) {
            value = value.times(point).plus(coefficients.get(i));
        }
        return value;
    }
}
