package org.pofk.formula;

import java.util.List;
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

/** A formula with one of its symbols called otherwise; a bound variable of that name stays. */
public final class Renaming implements Formula.Visitor<Formula> {
    private final String from;
    private final Symbol to;

    private Renaming(String from, Symbol to) {
        this.from = from;
        this.to = to;
    }

    public static Formula of(Formula formula, String from, String to) {
        return formula.accept(new Renaming(from, new Symbol(to)));
    }

    private List<Formula> all(List<Formula> formulas) {
        return formulas.stream().map(each -> each.accept(this)).toList();
    }

    @Override
    public Formula number(Number number) {
        return number;
    }

    @Override
    public Formula decimal(WrittenDecimal decimal) {
        return decimal;
    }

    @Override
    public Formula symbol(Symbol symbol) {
        return symbol.name().equals(from) ? to : symbol;
    }

    @Override
    public Formula constant(Constant constant) {
        return constant;
    }

    @Override
    public Formula negation(Negation negation) {
        return new Negation(negation.operand().accept(this));
    }

    @Override
    public Formula sum(Sum sum) {
        return new Sum(all(sum.terms()));
    }

    @Override
    public Formula product(Product product) {
        return new Product(all(product.factors()));
    }

    @Override
    public Formula quotient(Quotient quotient) {
        return new Quotient(quotient.numerator().accept(this), quotient.denominator().accept(this));
    }

    @Override
    public Formula power(Power power) {
        return new Power(power.base().accept(this), power.exponent().accept(this));
    }

    @Override
    public Formula call(Call call) {
        return new Call(call.function(), all(call.arguments()));
    }

    @Override
    public Formula rootSum(RootSum rootSum) {
        return rootSum.variable().name().equals(from) ? rootSum
                : new RootSum(rootSum.variable(), rootSum.polynomial().accept(this), rootSum.body().accept(this));
    }

    @Override
    public Formula cases(Cases cases) {
        return new Cases(cases.branches().stream().map(branch ->
                new Cases.Branch(branch.from(), branch.to(), branch.formula().accept(this))).toList());
    }
}
