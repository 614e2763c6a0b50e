package org.pofk.formula;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Cases;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Product;

/**
 * A form that two formulas share when they differ only in what LaTeX has no two ways for: decimals as their numbers,
 * powers of ten as numbers, degrees with a factor of one left out. Exact.
 */
final class SameValue {

    private SameValue() {
    }

    static Formula of(Formula formula) {
        return formula.accept(new Form());
    }

    private static final class Form implements Formula.Visitor<Formula> {
        private List<Formula> all(List<Formula> formulas) {
            return formulas.stream().map(SameValue::of).toList();
        }

        @Override
        public Formula number(Number number) {
            return number;
        }

        @Override
        public Formula decimal(Formula.WrittenDecimal decimal) {
            return new Number(Rational.of(new BigDecimal(decimal.text())));
        }

        @Override
        public Formula symbol(Formula.Symbol symbol) {
            return symbol;
        }

        @Override
        public Formula constant(Constant constant) {
            return constant;
        }

        @Override
        public Formula negation(Formula.Negation negation) {
            return new Formula.Negation(of(negation.operand()));
        }

        @Override
        public Formula sum(Formula.Sum sum) {
            return new Formula.Sum(all(sum.terms()));
        }

        /** Factors of factors in one list, numbers that stand together multiplied. */
        @Override
        public Formula product(Product product) {
            List<Formula> factors = new ArrayList<>();
            for (Formula each : all(product.factors())) {
                (each instanceof Product inner ? inner.factors() : List.of(each)).forEach(factor -> {
                    int last = factors.size() - 1;
                    if (last >= 0 && factors.get(last) instanceof Number left && factor instanceof Number right) {
                        factors.set(last, new Number(left.value().times(right.value())));
                    } else {
                        factors.add(factor);
                    }
                });
            }
            factors.removeIf(factor -> factor.equals(new Number(Rational.ONE)) && factors.size() > 1);
            return factors.size() == 1 ? factors.get(0) : new Product(factors);
        }

        @Override
        public Formula quotient(Formula.Quotient quotient) {
            return new Formula.Quotient(of(quotient.numerator()), of(quotient.denominator()));
        }

        @Override
        public Formula power(Formula.Power power) {
            Formula base = of(power.base());
            Formula exponent = of(power.exponent());
            Formula size = exponent instanceof Formula.Negation negation ? negation.operand() : exponent;
            boolean isPowerOfTen = base.equals(new Number(Rational.of(10))) && size instanceof Number number
                    && number.value().isInteger() && number.value().compareTo(Rational.of(400)) <= 0;
            return isPowerOfTen ? new Number(Rational.of(10).pow((size == exponent ? 1 : -1)
                    * ((Number) size).value().numerator().intValueExact())) : new Formula.Power(base, exponent);
        }

        @Override
        public Formula call(Formula.Call call) {
            return new Formula.Call(call.function(), all(call.arguments()));
        }

        @Override
        public Formula rootSum(Formula.RootSum sum) {
            return new Formula.RootSum(sum.variable(), of(sum.polynomial()), of(sum.body()));
        }

        @Override
        public Formula cases(Cases cases) {
            return new Cases(cases.branches().stream()
                    .map(each -> new Cases.Branch(each.from(), each.to(), of(each.formula()))).toList());
        }
    }
}
