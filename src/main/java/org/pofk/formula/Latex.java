package org.pofk.formula;

import java.util.List;
import java.util.stream.Collectors;
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

/**
 * Writes a formula as LaTeX mathematics, to stand between dollar signs or in an amsmath display. Fractions are
 * {@code \frac}, which need no parentheses unless they are raised: {@code \left(\frac{1}{2}\right)^{k}}. Between
 * factors stands {@code \cdot} where setting them side by side could be read as something else.
 */
public final class Latex {

    private Latex() {
    }

    public static String write(Formula formula) {
        return formula.accept(Writer.WRITER).text;
    }

    /**
     * The formula on lines of about {@code width} digits: broken before its outermost signs, within a term only where
     * that is longer than a line.
     */
    public static List<String> lines(Formula formula, int width) {
        return LatexLines.of(formula, width);
    }

    /** How tightly a text holds together: what binds less than its place asks for is put in parentheses. */
    private enum Binding { SUM, NEGATION, ROOT_SUM, PRODUCT, POWER_OF_TEN, FRACTION, POWER, CALL, ATOM }

    private record Piece(String text, Binding binding) {
        String at(Binding least) {
            return binding.compareTo(least) >= 0 ? text : "\\left(" + text + "\\right)";
        }
    }

    private static final class Writer implements Formula.Visitor<Piece> {
        static final Writer WRITER = new Writer();

        private Piece write(Formula formula) {
            return formula.accept(this);
        }

        @Override
        public Piece number(Number number) {
            Rational value = number.value();
            if (value.signum() < 0) {
                return new Piece("-" + number(new Number(value.negate())).text, Binding.NEGATION);
            }
            return value.isInteger()
                    ? new Piece(value.toString(), Binding.ATOM)
                    : new Piece("\\frac{" + value.numerator() + "}{" + value.denominator() + "}", Binding.FRACTION);
        }

        @Override
        public Piece decimal(WrittenDecimal decimal) {
            String text = decimal.text();
            if (text.startsWith("-")) {
                return new Piece("-" + decimal(new WrittenDecimal(text.substring(1))).text, Binding.NEGATION);
            }
            String[] parts = text.split("[eE]\\+?");
            return parts.length == 1
                    ? new Piece(text, Binding.ATOM)
                    : new Piece(parts[0] + " \\cdot 10^{" + parts[1] + "}", Binding.POWER_OF_TEN);
        }

        @Override
        public Piece symbol(Symbol symbol) {
            return new Piece(LatexNames.write(symbol.name()), Binding.ATOM);
        }

        @Override
        public Piece constant(Constant constant) {
            return switch (constant) {
                case PI -> new Piece("\\pi", Binding.ATOM);
                case I -> new Piece("\\mathrm{i}", Binding.ATOM);
                case DEGREE -> new Piece("1^{\\circ}", Binding.POWER);
            };
        }

        @Override
        public Piece negation(Negation negation) {
            return new Piece("-" + write(negation.operand()).at(Binding.ROOT_SUM), Binding.NEGATION);
        }

        @Override
        public Piece sum(Sum sum) {
            StringBuilder text = new StringBuilder();
            for (Formula term : sum.terms()) {
                Piece piece = write(term);
                if (text.isEmpty()) {
                    text.append(piece.at(Binding.NEGATION));
                } else if (piece.binding == Binding.NEGATION) {
                    text.append(" - ").append(piece.text, 1, piece.text.length());
                } else {
                    text.append(" + ").append(piece.at(Binding.NEGATION));
                }
            }
            return new Piece(text.toString(), Binding.SUM);
        }

        @Override
        public Piece product(Product product) {
            List<Formula> factors = product.factors();
            StringBuilder text = new StringBuilder(write(factors.get(0)).at(Binding.POWER_OF_TEN));
            for (int i = 1; i < factors.size(); i++) {
                Formula before = factors.get(i - 1);
                if (factors.get(i) == Constant.DEGREE && isPlainNumber(before)) {
                    text.append("^{\\circ}");
                } else {
                    String factor = write(factors.get(i)).at(Binding.POWER_OF_TEN);
                    text.append(separator(before, factor)).append(factor);
                }
            }
            return new Piece(text.toString(), Binding.PRODUCT);
        }

        private static boolean isPlainNumber(Formula formula) {
            return formula instanceof Number number && number.value().isInteger() && number.value().signum() >= 0
                    || formula instanceof WrittenDecimal decimal && decimal.text().matches("[0-9.]+");
        }

        /** A dot where side by side would read as another number, a mixed fraction, or a function of an argument. */
        private static String separator(Formula before, String factor) {
            boolean beginsWithNumber = Character.isDigit(factor.charAt(0)) || factor.startsWith(".")
                    || factor.startsWith("\\frac") || factor.startsWith("\\left(\\frac") && isPlainNumber(before);
            boolean looksLikeArgument = before instanceof Symbol && factor.startsWith("\\left(");
            return beginsWithNumber || looksLikeArgument ? " \\cdot " : " ";
        }

        @Override
        public Piece quotient(Quotient quotient) {
            return new Piece("\\frac{" + write(quotient.numerator()).text + "}{" + write(quotient.denominator()).text
                    + "}", Binding.FRACTION);
        }

        @Override
        public Piece power(Power power) {
            return new Piece(write(power.base()).at(Binding.ATOM) + "^{" + write(power.exponent()).text + "}",
                    Binding.POWER);
        }

        @Override
        public Piece call(Call call) {
            String argument = write(call.arguments().get(0)).text;
            String inParentheses = "\\left(" + argument + "\\right)";
            return new Piece(switch (call.function()) {
                case SQRT -> "\\sqrt{" + argument + "}";
                case COS -> "\\cos" + inParentheses;
                case SIN -> "\\sin" + inParentheses;
                case EXP -> "\\exp" + inParentheses;
                case ARCTAN -> "\\arctan" + inParentheses;
                case ARCCOS -> "\\arccos" + inParentheses;
                case BINOMIAL -> "\\binom{" + argument + "}{" + write(call.arguments().get(1)).text + "}";
                case DELTA -> "\\delta[" + argument + "]";
            }, Binding.CALL);
        }

        @Override
        public Piece rootSum(RootSum sum) {
            return new Piece("\\sum_{" + write(sum.variable()).text + ":\\, " + write(sum.polynomial()).text + " = 0} "
                    + write(sum.body()).at(Binding.PRODUCT), Binding.ROOT_SUM);
        }

        @Override
        public Piece cases(Cases cases) {
            return new Piece(cases.branches().stream().map(this::branch)
                    .collect(Collectors.joining(" \\\\ ", "\\begin{cases} ", " \\end{cases}")), Binding.CALL);
        }

        private String branch(Cases.Branch branch) {
            long from = branch.from();
            String steps = branch.to().isEmpty() ? "k \\ge " + from
                    : branch.to().getAsLong() == from ? "k = " + from
                    : from + " \\le k \\le " + branch.to().getAsLong();
            return write(branch.formula()).text + " & " + steps;
        }
    }
}
