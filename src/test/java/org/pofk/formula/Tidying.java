package org.pofk.formula;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Call;
import org.pofk.formula.Formula.Cases;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.RootSum;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.Formula.WrittenDecimal;

/** Builds a formula anew by {@link Formulas}; functions of numbers are worked out where their value is rational. */
final class Tidying implements Formula.Visitor<Formula> {
    private static final Tidying TIDYING = new Tidying();

    private Tidying() {
    }

    static Formula tidy(Formula formula) {
        return formula.accept(TIDYING);
    }

    private List<Formula> all(List<Formula> formulas) {
        return formulas.stream().map(Tidying::tidy).toList();
    }

    @Override
    public Formula number(Number number) {
        return number;
    }

    @Override
    public Formula decimal(WrittenDecimal decimal) {
        return Formulas.decimal(decimal.text());
    }

    @Override
    public Formula symbol(Symbol symbol) {
        return symbol;
    }

    @Override
    public Formula constant(Constant constant) {
        return constant;
    }

    @Override
    public Formula negation(Negation negation) {
        return Formulas.negated(tidy(negation.operand()));
    }

    @Override
    public Formula sum(Sum sum) {
        return Formulas.sum(all(sum.terms()));
    }

    @Override
    public Formula product(Product product) {
        return Formulas.product(all(product.factors()));
    }

    @Override
    public Formula quotient(Quotient quotient) {
        return Formulas.quotient(tidy(quotient.numerator()), tidy(quotient.denominator()));
    }

    @Override
    public Formula power(Power power) {
        return Formulas.power(tidy(power.base()), tidy(power.exponent()));
    }

    @Override
    public Formula call(Call call) {
        List<Formula> arguments = all(call.arguments());
        List<Rational> numbers = arguments.stream().filter(Number.class::isInstance).map(Number.class::cast)
                .map(Number::value).toList();
        Optional<Rational> value = numbers.size() == arguments.size()
                ? ExactFunctions.value(call.function(), numbers) : Optional.empty();
        return value.map(Formulas::number).orElseGet(() -> new Call(call.function(), arguments));
    }

    @Override
    public Formula rootSum(RootSum sum) {
        return new RootSum(sum.variable(), tidy(sum.polynomial()), tidy(sum.body()));
    }

    @Override
    public Formula cases(Cases cases) {
        return new Cases(cases.branches().stream()
                .map(branch -> new Cases.Branch(branch.from(), branch.to(), tidy(branch.formula()))).toList());
    }
}
