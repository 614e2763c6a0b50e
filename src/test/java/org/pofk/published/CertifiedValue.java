package org.pofk.published;

import java.util.Map;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * The value of a published expression (radicals, powers, cosines, impulses) as a complex ball. Certified: exponents
 * and the arguments of impulses are evaluated exactly, everything else with outward rounding.
 *
 * @param values what the names stand for, k among them
 * @param scale  bits behind the binary point
 */
record CertifiedValue(Map<String, Rational> values, int scale) implements Formula.Visitor<ComplexBall> {

    static ComplexBall of(Formula formula, Map<String, Rational> values, int scale) {
        return formula.accept(new CertifiedValue(values, scale));
    }

    private ComplexBall exactly(Rational value) {
        return ComplexBall.of(value, scale);
    }

    private ComplexBall unit() {
        return new ComplexBall(Ball.of(0, scale), Ball.of(1, scale));
    }

    @Override
    public ComplexBall number(Formula.Number number) {
        return exactly(number.value());
    }

    @Override
    public ComplexBall decimal(Formula.WrittenDecimal decimal) {
        return exactly(Rational.parse(decimal.text()));
    }

    @Override
    public ComplexBall symbol(Formula.Symbol symbol) {
        if (symbol.name().equals("I")) {
            return unit();
        }
        Rational value = values.get(symbol.name());
        if (value == null) {
            throw new AssertionError("no value for " + symbol.name());
        }
        return exactly(value);
    }

    @Override
    public ComplexBall constant(Formula.Constant constant) {
        return switch (constant) {
            case PI -> ComplexBall.of(Ball.pi(scale));
            case I -> unit();
            case DEGREE -> ComplexBall.of(Ball.pi(scale).dividedBy(Ball.of(180, scale)));
        };
    }

    @Override
    public ComplexBall negation(Formula.Negation negation) {
        return negation.operand().accept(this).negate();
    }

    @Override
    public ComplexBall sum(Formula.Sum sum) {
        return sum.terms().stream().map(term -> term.accept(this)).reduce(ComplexBall::plus).orElseThrow();
    }

    @Override
    public ComplexBall product(Formula.Product product) {
        return product.factors().stream().map(factor -> factor.accept(this)).reduce(ComplexBall::times).orElseThrow();
    }

    @Override
    public ComplexBall quotient(Formula.Quotient quotient) {
        return quotient.numerator().accept(this).dividedBy(quotient.denominator().accept(this));
    }

    @Override
    public ComplexBall power(Formula.Power power) {
        int exponent = FractionInZ.of(power.exponent(), values).value().numerator().intValueExact();
        ComplexBall base = power.base().accept(this);
        return exponent < 0 ? exactly(Rational.ONE).dividedBy(base.pow(-exponent)) : base.pow(exponent);
    }

    @Override
    public ComplexBall call(Formula.Call call) {
        if (call.function() == Formula.Function.DELTA) {
            boolean hit = FractionInZ.of(call.arguments().get(0), values).value().isZero();
            return exactly(hit ? Rational.ONE : Rational.ZERO);
        }
        ComplexBall argument = call.arguments().get(0).accept(this);
        return switch (call.function()) {
            case SQRT -> squareRoot(argument.real());
            case COS -> ComplexBall.of(argument.real().cos());
            case SIN -> ComplexBall.of(argument.real().sin());
            case ARCTAN -> ComplexBall.of(argument.real().arctan());
            case ARCCOS -> ComplexBall.of(argument.real().arccos());
            case DELTA, EXP, BINOMIAL -> throw new AssertionError("no published expression uses " + call);
        };
    }

    /** The principal square root of a real number of either sign. */
    private ComplexBall squareRoot(Ball radicand) {
        return radicand.isNegative()
                ? unit().times(radicand.negate().sqrt())
                : ComplexBall.of(radicand.sqrt());
    }

    @Override
    public ComplexBall rootSum(Formula.RootSum rootSum) {
        throw new AssertionError("no published expression sums over roots");
    }

    @Override
    public ComplexBall cases(Formula.Cases cases) {
        throw new AssertionError("no published expression differs from step to step");
    }
}
