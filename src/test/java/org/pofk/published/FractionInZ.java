package org.pofk.published;

import java.util.Map;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.formula.Formula;

/** An expression in z with rational coefficients, as numerator over denominator, not reduced. Exact. */
record FractionInZ(Polynomial<Rational> numerator, Polynomial<Rational> denominator) {

    static FractionInZ of(Formula formula, Map<String, Rational> values) {
        return formula.accept(new Evaluation(values));
    }

    static FractionInZ constant(Rational value) {
        return new FractionInZ(Polynomial.constant(RationalField.Q, value), Polynomial.ofIntegers(1));
    }

    FractionInZ plus(FractionInZ other) {
        return new FractionInZ(numerator.times(other.denominator).plus(other.numerator.times(denominator)),
                denominator.times(other.denominator));
    }

    FractionInZ times(FractionInZ other) {
        return new FractionInZ(numerator.times(other.numerator), denominator.times(other.denominator));
    }

    FractionInZ inverse() {
        return new FractionInZ(denominator, numerator);
    }

    FractionInZ pow(int exponent) {
        return exponent < 0
                ? inverse().pow(-exponent)
                : new FractionInZ(numerator.pow(exponent), denominator.pow(exponent));
    }

    boolean sameAs(FractionInZ other) {
        return numerator.times(other.denominator).equals(other.numerator.times(denominator));
    }

    /** The number this is when z doesn't occur. */
    Rational value() {
        Polynomial<Rational> quotient = numerator.dividedExactlyBy(denominator);
        if (!quotient.isConstant()) {
            throw new AssertionError("not a number: " + this);
        }
        return quotient.coefficient(0);
    }

    private record Evaluation(Map<String, Rational> values) implements Formula.Visitor<FractionInZ> {

        @Override
        public FractionInZ number(Formula.Number number) {
            return FractionInZ.constant(number.value());
        }

        @Override
        public FractionInZ decimal(Formula.WrittenDecimal decimal) {
            return FractionInZ.constant(Rational.parse(decimal.text()));
        }

        @Override
        public FractionInZ symbol(Formula.Symbol symbol) {
            if (symbol.name().equals("z")) {
                return new FractionInZ(Polynomial.ofIntegers(0, 1), Polynomial.ofIntegers(1));
            }
            Rational value = values.get(symbol.name());
            if (value == null) {
                throw new AssertionError("no value for " + symbol.name());
            }
            return FractionInZ.constant(value);
        }

        @Override
        public FractionInZ constant(Formula.Constant constant) {
            throw new AssertionError("no rational value: " + constant);
        }

        @Override
        public FractionInZ negation(Formula.Negation negation) {
            return FractionInZ.constant(Rational.of(-1)).times(negation.operand().accept(this));
        }

        @Override
        public FractionInZ sum(Formula.Sum sum) {
            return sum.terms().stream().map(term -> term.accept(this)).reduce(FractionInZ::plus).orElseThrow();
        }

        @Override
        public FractionInZ product(Formula.Product product) {
            return product.factors().stream().map(factor -> factor.accept(this)).reduce(FractionInZ::times)
                    .orElseThrow();
        }

        @Override
        public FractionInZ quotient(Formula.Quotient quotient) {
            return quotient.numerator().accept(this).times(quotient.denominator().accept(this).inverse());
        }

        @Override
        public FractionInZ power(Formula.Power power) {
            return power.base().accept(this).pow(power.exponent().accept(this).value().numerator().intValueExact());
        }

        @Override
        public FractionInZ call(Formula.Call call) {
            throw new AssertionError("no rational value: " + call);
        }

        @Override
        public FractionInZ rootSum(Formula.RootSum rootSum) {
            throw new AssertionError("no published expression sums over roots");
        }

        @Override
        public FractionInZ cases(Formula.Cases cases) {
            throw new AssertionError("no published expression differs from step to step");
        }
    }
}
