package org.pofk.modes;

import java.math.BigDecimal;
import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/** The value of a formula at one k, as a reader would work it out from what is printed: a ball of 2^−scale or so. */
final class FormulaValue implements Formula.Visitor<Ball> {
    private final long k;
    private final int scale;

    private FormulaValue(long k, int scale) {
        this.k = k;
        this.scale = scale;
    }

    static Ball of(Formula formula, long k, int scale) {
        return formula.accept(new FormulaValue(k, scale));
    }

    private Rational exact(Formula formula) {
        Ball value = formula.accept(this);
        if (!value.isExact()) {
            throw new AssertionError("no whole number: " + formula);
        }
        return value.middle();
    }

    @Override
    public Ball number(Formula.Number number) {
        return Ball.of(number.value(), scale);
    }

    @Override
    public Ball decimal(Formula.WrittenDecimal decimal) {
        return Ball.of(Rational.of(new BigDecimal(decimal.text())), scale);
    }

    @Override
    public Ball symbol(Formula.Symbol symbol) {
        if (!symbol.name().equals("k")) {
            throw new AssertionError("unknown: " + symbol);
        }
        return Ball.of(k, scale);
    }

    @Override
    public Ball constant(Formula.Constant constant) {
        if (constant != Formula.Constant.PI) {
            throw new AssertionError("unknown: " + constant);
        }
        return Ball.pi(scale);
    }

    @Override
    public Ball negation(Formula.Negation negation) {
        return negation.operand().accept(this).negate();
    }

    @Override
    public Ball sum(Formula.Sum sum) {
        return sum.terms().stream().map(term -> term.accept(this)).reduce(Ball::plus).orElseThrow();
    }

    @Override
    public Ball product(Formula.Product product) {
        return product.factors().stream().map(factor -> factor.accept(this)).reduce(Ball::times).orElseThrow();
    }

    @Override
    public Ball quotient(Formula.Quotient quotient) {
        return quotient.numerator().accept(this).dividedBy(quotient.denominator().accept(this));
    }

    @Override
    public Ball power(Formula.Power power) {
        Ball base = power.base().accept(this);
        if (power.exponent() instanceof Formula.Number number && !number.value().isInteger()) {
            return base.root(number.value().denominator().intValueExact());
        }
        return base.pow(exact(power.exponent()).numerator().intValueExact());
    }

    @Override
    public Ball call(Formula.Call call) {
        List<Formula> arguments = call.arguments();
        return switch (call.function()) {
            case SQRT -> arguments.get(0).accept(this).sqrt();
            case COS -> arguments.get(0).accept(this).cos();
            case ARCCOS -> arguments.get(0).accept(this).arccos();
            case DELTA -> Ball.of(exact(arguments.get(0)).isZero() ? 1 : 0, scale);
            case BINOMIAL -> Ball.of(Expansion.binomial(exact(arguments.get(0)).numerator().longValueExact(),
                    exact(arguments.get(1)).numerator().intValueExact()), scale);
            default -> throw new AssertionError("unknown: " + call);
        };
    }

    @Override
    public Ball rootSum(Formula.RootSum rootSum) {
        throw new AssertionError("not to be worked out by hand: " + rootSum);
    }

    @Override
    public Ball cases(Formula.Cases cases) {
        return cases.branches().stream().filter(branch -> branch.holdsAt(k)).findFirst().orElseThrow()
                .formula().accept(this);
    }
}
