package org.pofk.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * A formula in k as an expression of Python. Rational throughout: in fractions, exact. With roots, cosines or π: in
 * decimals of as many digits as the notebook computes with.
 */
record PythonExpression(String text, PythonNumbers numbers) {

    /** None for a sum over roots, for cases and for powers that aren't whole. */
    static Optional<PythonExpression> of(Formula formula) {
        PythonNumbers numbers = formula.accept(new PythonNumbers.Needed());
        return numbers == PythonNumbers.NONE ? Optional.empty()
                : Optional.of(new PythonExpression(formula.accept(new Text(numbers)), numbers));
    }

    private record Text(PythonNumbers numbers) implements Formula.Visitor<String> {
        @Override
        public String number(Formula.Number number) {
            Rational value = number.value();
            return switch (numbers) {
                case WHOLE -> value.toString();
                case FRACTIONS -> "Fraction(\"" + value + "\")";
                default -> value.isInteger() ? "Decimal(" + value + ")"
                        : "(Decimal(" + value.numerator() + ") / " + value.denominator() + ")";
            };
        }

        @Override
        public String decimal(Formula.WrittenDecimal decimal) {
            return (numbers == PythonNumbers.FRACTIONS ? "Fraction" : "Decimal") + "(\"" + decimal.text() + "\")";
        }

        @Override
        public String symbol(Formula.Symbol symbol) {
            return symbol.name();
        }

        @Override
        public String constant(Formula.Constant constant) {
            return switch (constant) {
                case PI -> "pi";
                case DEGREE -> "(pi / 180)";
                case I -> throw new AssertionError("a closed form is real");
            };
        }

        @Override
        public String negation(Formula.Negation negation) {
            return "-" + factor(negation.operand());
        }

        @Override
        public String sum(Formula.Sum sum) {
            return sum.terms().stream().map(term -> term instanceof Formula.Negation negation
                    ? " - " + term(negation.operand()) : " + " + term(term))
                    .collect(Collectors.joining()).replaceFirst("^ \\+ ", "").replaceFirst("^ - ", "-");
        }

        private String term(Formula term) {
            return term instanceof Formula.Product || term instanceof Formula.Quotient ? term.accept(this)
                    : factor(term);
        }

        @Override
        public String product(Formula.Product product) {
            return product.factors().stream().map(this::factor).collect(Collectors.joining(" * "));
        }

        @Override
        public String quotient(Formula.Quotient quotient) {
            return factor(quotient.numerator()) + " / " + base(quotient.denominator());
        }

        @Override
        public String power(Formula.Power power) {
            return base(power.base()) + " ** (" + power.exponent().accept(new Text(PythonNumbers.WHOLE)) + ")";
        }

        private String factor(Formula formula) {
            return formula instanceof Formula.Power ? formula.accept(this) : base(formula);
        }

        private String base(Formula formula) {
            boolean isWhole = formula instanceof Formula.Symbol || formula instanceof Formula.Call
                    || formula instanceof Formula.Constant || formula instanceof Formula.WrittenDecimal
                    || formula instanceof Formula.Number && numbers != PythonNumbers.WHOLE;
            return isWhole ? formula.accept(this) : "(" + formula.accept(this) + ")";
        }

        @Override
        public String call(Formula.Call call) {
            List<Formula> arguments = call.arguments();
            String name = call.function().name().toLowerCase(Locale.ROOT);
            return switch (call.function()) {
                case BINOMIAL, DELTA -> name + arguments.stream()
                        .map(argument -> argument.accept(new Text(PythonNumbers.WHOLE)))
                        .collect(Collectors.joining(", ", "(", ")"));
                case EXP -> "(" + arguments.get(0).accept(this) + ").exp()";
                default -> name + "(" + arguments.get(0).accept(this) + ")";
            };
        }

        @Override
        public String rootSum(Formula.RootSum rootSum) {
            throw new AssertionError("no expression for a sum over roots");
        }

        @Override
        public String cases(Formula.Cases cases) {
            throw new AssertionError("no expression for cases");
        }
    }
}
