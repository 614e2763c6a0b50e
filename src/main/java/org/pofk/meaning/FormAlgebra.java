package org.pofk.meaning;

import java.util.List;
import java.util.Optional;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Suggestion;

/** What formulas in z, or another variable, mean: sums of products of polynomials to whole powers. Exact. */
final class FormAlgebra implements Algebra<List<FormSummand>> {
    private final String variable;
    private final Scalars scalars;
    private final ConstantReading constants;
    private final FormArithmetic arithmetic;

    FormAlgebra(String variable, Scalars scalars) {
        this.variable = variable;
        this.scalars = scalars;
        this.constants = new ConstantReading(scalars);
        this.arithmetic = new FormArithmetic(scalars);
    }

    @Override
    public List<FormSummand> constant(Scalar value, ParsedFormula part) {
        return value.isPlainZero() ? List.of() : List.of(new FormSummand(value, List.of(), part.span()));
    }

    @Override
    public List<FormSummand> symbol(Formula.Symbol symbol, ParsedFormula part) {
        if (symbol.name().equals(variable)) {
            return List.of(new FormSummand(Scalars.of(1), List.of(FormFactor.variable(part.span())), part.span()));
        }
        if (symbol.name().equals("e")) {
            return constant(scalars.e(), part);
        }
        throw RefusedPart.at(part, "name-unknown", "isn't known: this formula is in " + variable
                + Suggestion.didYouMean(List.of(variable), symbol.name()));
    }

    @Override
    public Optional<Scalar> asConstant(List<FormSummand> meaning) {
        return meaning.isEmpty() ? Optional.of(Scalars.of(0)) : Optional.of(meaning.get(0))
                .filter(only -> meaning.size() == 1 && only.factors().isEmpty()).map(FormSummand::front);
    }

    private static List<FormSummand> at(List<FormSummand> form, ParsedFormula part) {
        return form.size() == 1 ? List.of(form.get(0).at(part.span())) : form;
    }

    @Override
    public List<FormSummand> sum(List<List<FormSummand>> terms, ParsedFormula part) {
        return at(arithmetic.sum(terms.stream().flatMap(List::stream).toList(), part.span()), part);
    }

    @Override
    public List<FormSummand> negation(List<FormSummand> operand, ParsedFormula part) {
        return at(arithmetic.negate(operand), part);
    }

    @Override
    public List<FormSummand> product(List<List<FormSummand>> factors, ParsedFormula part) {
        return at(factors.stream().reduce((a, b) -> arithmetic.times(a, b, part.span())).orElseThrow(), part);
    }

    @Override
    public List<FormSummand> quotient(List<FormSummand> numerator, List<FormSummand> denominator,
            ParsedFormula part) {
        ParsedFormula below = part.parts().get(1);
        return at(arithmetic.times(numerator, power(denominator, -1, below, below), part.span()), part);
    }

    /** {@code at} is the part that is raised. */
    private List<FormSummand> power(List<FormSummand> base, int exponent, ParsedFormula at, ParsedFormula part) {
        List<FormSummand> single = exponent == 1 ? base : arithmetic.overOneLine(base, at.span());
        if (single.isEmpty() && exponent < 0) {
            throw RefusedPart.at(at, "division-by-zero", "is zero, and nothing can be divided by it");
        }
        if (exponent < 0) {
            constants.requireNotZero(single.get(0).front(), at);
        }
        return exponent == 1 ? single
                : single.stream().map(summand -> arithmetic.pow(summand, exponent, part.span())).toList();
    }

    @Override
    public List<FormSummand> power(List<FormSummand> base, List<FormSummand> exponent, ParsedFormula part) {
        int times = asConstant(exponent).flatMap(Scalar::whole).orElseThrow(() -> RefusedPart.at(
                part.parts().get(1), "exponent-not-whole",
                "isn't a whole number: a formula in " + variable + " has only whole powers"));
        return power(base, times, part.parts().get(0), part);
    }

    @Override
    public List<FormSummand> call(Formula.Function function, List<List<FormSummand>> arguments, ParsedFormula part) {
        throw RefusedPart.at(part, "not-rational", "has " + variable
                + " in a function: a formula in " + variable + " has sums, products, quotients and whole powers");
    }

    @Override
    public List<FormSummand> cases(Formula.Cases cases, List<List<FormSummand>> branches, ParsedFormula part) {
        throw RefusedPart.at(part, "not-rational", "is given by steps, but this is a formula in " + variable);
    }
}
