package org.pofk.formula;

import java.util.List;
import org.pofk.formula.Formula.Cases;

/** About how wide a formula is set in a display, in digits. An estimate: it decides only where lines are broken. */
final class LatexWidth implements Formula.Visitor<Double> {
    private static final LatexWidth WIDTH = new LatexWidth();
    private static final double SIGN = 2.5;
    private static final double PARENTHESES = 1.6;
    private static final double RAISED = 0.75;

    private LatexWidth() {
    }

    static double of(Formula formula) {
        return formula.accept(WIDTH);
    }

    private static double total(List<Formula> formulas) {
        return formulas.stream().mapToDouble(LatexWidth::of).sum();
    }

    private static double enclosed(Formula formula) {
        boolean isEnclosed = formula instanceof Formula.Sum || formula instanceof Formula.Negation
                || formula instanceof Formula.Quotient;
        return of(formula) + (isEnclosed ? PARENTHESES : 0);
    }

    @Override
    public Double number(Formula.Number number) {
        double sign = number.value().signum() < 0 ? 2 : 0;
        return sign + Math.max(number.value().numerator().abs().toString().length(),
                number.value().isInteger() ? 0 : number.value().denominator().toString().length() + 0.5);
    }

    @Override
    public Double decimal(Formula.WrittenDecimal decimal) {
        return decimal.text().length() - (decimal.text().contains(".") ? 0.5 : 0) + (decimal.text().matches(".*[eE].*") ? 3.0 : 0);
    }

    @Override
    public Double symbol(Formula.Symbol symbol) {
        return symbol.name().length() == 1 ? 1.2 : symbol.name().length();
    }

    @Override
    public Double constant(Formula.Constant constant) {
        return 1.2;
    }

    @Override
    public Double negation(Formula.Negation negation) {
        return 2 + enclosed(negation.operand());
    }

    @Override
    public Double sum(Formula.Sum sum) {
        return total(sum.terms()) + SIGN * (sum.terms().size() - 1);
    }

    @Override
    public Double product(Formula.Product product) {
        return product.factors().stream().mapToDouble(LatexWidth::enclosed).sum() + product.factors().size();
    }

    @Override
    public Double quotient(Formula.Quotient quotient) {
        return 1 + Math.max(of(quotient.numerator()), of(quotient.denominator()));
    }

    @Override
    public Double power(Formula.Power power) {
        return enclosed(power.base()) + RAISED * of(power.exponent());
    }

    @Override
    public Double call(Formula.Call call) {
        return (call.function() == Formula.Function.SQRT ? 0 : 3) + PARENTHESES + total(call.arguments());
    }

    @Override
    public Double rootSum(Formula.RootSum rootSum) {
        return 2 + RAISED * (of(rootSum.polynomial()) + 6) + enclosed(rootSum.body());
    }

    @Override
    public Double cases(Cases cases) {
        return 14 + cases.branches().stream().mapToDouble(branch -> of(branch.formula())).max().orElse(0);
    }
}
