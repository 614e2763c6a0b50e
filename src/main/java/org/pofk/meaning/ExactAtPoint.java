package org.pofk.meaning;

import java.math.BigDecimal;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * The exact value of a part made of numbers, the variable and the four operations: exponents and the arguments of
 * delta and binomial. Decimals count as exact. Anything else, and what grows too long, is a {@link NoValueException}.
 */
final class ExactAtPoint implements Formula.Visitor<Rational> {
    private static final int MOST_BITS = 4_096;

    private final String variable;
    private final Rational point;

    ExactAtPoint(String variable, Rational point) {
        this.variable = variable;
        this.point = point;
    }

    private static Rational bounded(Rational value) {
        if (value.numerator().bitLength() + value.denominator().bitLength() > MOST_BITS) {
            throw new NoValueException();
        }
        return value;
    }

    @Override
    public Rational number(Formula.Number number) {
        return bounded(number.value());
    }

    @Override
    public Rational decimal(Formula.WrittenDecimal decimal) {
        return bounded(Rational.of(new BigDecimal(decimal.text())));
    }

    @Override
    public Rational symbol(Formula.Symbol symbol) {
        if (!symbol.name().equals(variable)) {
            throw new NoValueException();
        }
        return point;
    }

    @Override
    public Rational constant(Formula.Constant constant) {
        throw new NoValueException();
    }

    @Override
    public Rational negation(Formula.Negation negation) {
        return negation.operand().accept(this).negate();
    }

    @Override
    public Rational sum(Formula.Sum sum) {
        Rational total = Rational.ZERO;
        for (Formula term : sum.terms()) {
            total = bounded(total.plus(term.accept(this)));
        }
        return total;
    }

    @Override
    public Rational product(Formula.Product product) {
        Rational total = Rational.ONE;
        for (Formula factor : product.factors()) {
            total = bounded(total.times(factor.accept(this)));
        }
        return total;
    }

    @Override
    public Rational quotient(Formula.Quotient quotient) {
        Rational divisor = quotient.denominator().accept(this);
        if (divisor.isZero()) {
            throw new NoValueException();
        }
        return bounded(quotient.numerator().accept(this).dividedBy(divisor));
    }

    @Override
    public Rational power(Formula.Power power) {
        throw new NoValueException();
    }

    @Override
    public Rational call(Formula.Call call) {
        throw new NoValueException();
    }

    @Override
    public Rational rootSum(Formula.RootSum rootSum) {
        throw new NoValueException();
    }

    @Override
    public Rational cases(Formula.Cases cases) {
        throw new NoValueException();
    }
}
