package org.pofk.report;

import java.util.List;
import org.pofk.formula.Formula;

/** The numbers of Python that a formula is computed in, each kind able to do what those before it do. */
enum PythonNumbers {
    WHOLE, FRACTIONS, DECIMALS, NONE;

    private PythonNumbers or(PythonNumbers other) {
        return compareTo(other) >= 0 ? this : other;
    }

    /** What a formula needs; {@link #NONE} where it has no value in any of them. */
    static final class Needed implements Formula.Visitor<PythonNumbers> {
        private PythonNumbers of(List<Formula> parts) {
            return parts.stream().map(part -> part.accept(this)).reduce(FRACTIONS, PythonNumbers::or);
        }

        private PythonNumbers whole(Formula formula) {
            return formula.accept(new IsWhole()) ? FRACTIONS : NONE;
        }

        @Override
        public PythonNumbers number(Formula.Number number) {
            return FRACTIONS;
        }

        @Override
        public PythonNumbers decimal(Formula.WrittenDecimal decimal) {
            return FRACTIONS;
        }

        @Override
        public PythonNumbers symbol(Formula.Symbol symbol) {
            return symbol.name().equals("k") ? FRACTIONS : NONE;
        }

        @Override
        public PythonNumbers constant(Formula.Constant constant) {
            return constant == Formula.Constant.I ? NONE : DECIMALS;
        }

        @Override
        public PythonNumbers negation(Formula.Negation negation) {
            return negation.operand().accept(this);
        }

        @Override
        public PythonNumbers sum(Formula.Sum sum) {
            return of(sum.terms());
        }

        @Override
        public PythonNumbers product(Formula.Product product) {
            return of(product.factors());
        }

        @Override
        public PythonNumbers quotient(Formula.Quotient quotient) {
            return of(List.of(quotient.numerator(), quotient.denominator()));
        }

        @Override
        public PythonNumbers power(Formula.Power power) {
            return power.base().accept(this).or(whole(power.exponent()));
        }

        @Override
        public PythonNumbers call(Formula.Call call) {
            return switch (call.function()) {
                case BINOMIAL, DELTA -> call.arguments().stream().map(this::whole).reduce(FRACTIONS, PythonNumbers::or);
                default -> of(call.arguments()).or(DECIMALS);
            };
        }

        @Override
        public PythonNumbers rootSum(Formula.RootSum rootSum) {
            return NONE;
        }

        @Override
        public PythonNumbers cases(Formula.Cases cases) {
            return NONE;
        }
    }

    /** Whether a formula in k is made of whole numbers by signs, sums and products. */
    private static final class IsWhole implements Formula.Visitor<Boolean> {
        @Override
        public Boolean number(Formula.Number number) {
            return number.value().isInteger();
        }

        @Override
        public Boolean decimal(Formula.WrittenDecimal decimal) {
            return false;
        }

        @Override
        public Boolean symbol(Formula.Symbol symbol) {
            return symbol.name().equals("k");
        }

        @Override
        public Boolean constant(Formula.Constant constant) {
            return false;
        }

        @Override
        public Boolean negation(Formula.Negation negation) {
            return negation.operand().accept(this);
        }

        @Override
        public Boolean sum(Formula.Sum sum) {
            return sum.terms().stream().allMatch(term -> term.accept(this));
        }

        @Override
        public Boolean product(Formula.Product product) {
            return product.factors().stream().allMatch(factor -> factor.accept(this));
        }

        @Override
        public Boolean quotient(Formula.Quotient quotient) {
            return false;
        }

        @Override
        public Boolean power(Formula.Power power) {
            return false;
        }

        @Override
        public Boolean call(Formula.Call call) {
            return false;
        }

        @Override
        public Boolean rootSum(Formula.RootSum rootSum) {
            return false;
        }

        @Override
        public Boolean cases(Formula.Cases cases) {
            return false;
        }
    }
}
