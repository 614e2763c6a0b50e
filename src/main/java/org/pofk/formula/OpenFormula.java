package org.pofk.formula;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
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
 * Writes a formula in k as an OpenFormula expression (OASIS, Open Document Format 1.2, part 2) for spreadsheets, with
 * the semicolons and points of the standard whatever the reader's language. There a sign binds more tightly than a
 * power and powers are taken from the left, so both stand in parentheses. What a spreadsheet would take for an error
 * is asked for first: 0^0, and a binomial coefficient of k below its lower number. Spreadsheets calculate in double
 * precision; the expression itself is exact. Linear in the size of the formula.
 */
public final class OpenFormula {
    /** Above the largest number a spreadsheet holds there is nothing to be said. */
    private static final BigInteger LARGEST = BigInteger.TEN.pow(300);

    private OpenFormula() {
    }

    /**
     * The expression without an equals sign before it.
     *
     * @param step where k stands, {@code A1} or {@code [.A1]}
     * @return nothing where the formula has what OpenFormula can't say: sums over roots, names other than k, the
     *         imaginary unit, a number above 10^300
     */
    public static Optional<String> write(Formula formula, String step) {
        Writer writer = new Writer(step);
        String text = formula.accept(writer).text;
        return writer.isSayable ? Optional.of(text) : Optional.empty();
    }

    /** How tightly a text holds together: what binds less than its place asks for is put in parentheses. */
    private enum Binding { SUM, PRODUCT, POWER, ATOM }

    private record Piece(String text, Binding binding) {
        String at(Binding least) {
            return binding.compareTo(least) >= 0 ? text : "(" + text + ")";
        }
    }

    private static final class Writer implements Formula.Visitor<Piece> {
        private final String step;
        private boolean isSayable = true;

        Writer(String step) {
            this.step = step;
        }

        private Piece write(Formula formula) {
            return formula.accept(this);
        }

        private static Piece atom(String text) {
            return new Piece(text, Binding.ATOM);
        }

        private Piece unsayable() {
            isSayable = false;
            return atom("");
        }

        /** A sign makes a sum of one term: it is put in parentheses everywhere but at the start of a sum. */
        private static Piece negative(String operand) {
            return new Piece("-" + operand, Binding.SUM);
        }

        @Override
        public Piece number(Number number) {
            Rational value = number.value();
            if (value.signum() < 0) {
                return negative(number(new Number(value.negate())).at(Binding.ATOM));
            }
            if (value.numerator().compareTo(LARGEST) > 0 || value.denominator().compareTo(LARGEST) > 0) {
                return unsayable();
            }
            return new Piece(value.toString(), value.isInteger() ? Binding.ATOM : Binding.PRODUCT);
        }

        @Override
        public Piece decimal(WrittenDecimal decimal) {
            String text = decimal.text();
            return text.startsWith("-") ? negative(decimal(new WrittenDecimal(text.substring(1))).text)
                    : atom((text.startsWith(".") ? "0" : "") + text.replaceFirst("\\.(?![0-9])", "").replace('e', 'E'));
        }

        @Override
        public Piece symbol(Symbol symbol) {
            return symbol.name().equals("k") ? atom(step) : unsayable();
        }

        @Override
        public Piece constant(Constant constant) {
            return switch (constant) {
                case PI -> atom("PI()");
                case DEGREE -> atom("RADIANS(1)");
                case I -> unsayable();
            };
        }

        @Override
        public Piece negation(Negation negation) {
            return negative(write(negation.operand()).at(Binding.ATOM));
        }

        @Override
        public Piece sum(Sum sum) {
            StringBuilder text = new StringBuilder();
            for (Formula term : sum.terms()) {
                boolean isSubtracted = term instanceof Negation && !text.isEmpty();
                Piece piece = write(isSubtracted ? ((Negation) term).operand() : term);
                boolean isFirst = text.isEmpty();
                text.append(isFirst ? "" : isSubtracted ? "-" : "+")
                        .append(piece.at(isFirst ? Binding.SUM : Binding.PRODUCT));
            }
            return new Piece(text.toString(), Binding.SUM);
        }

        @Override
        public Piece product(Product product) {
            List<Formula> factors = product.factors();
            if (factors.size() == 2 && factors.get(1) == Constant.DEGREE) {
                return atom("RADIANS(" + write(factors.get(0)).text + ")");
            }
            return new Piece(factors.stream().map(factor -> factor instanceof Number number
                    && !number.value().isInteger() ? "(" + write(factor).text + ")" : write(factor).at(Binding.POWER))
                    .collect(Collectors.joining("*")), Binding.PRODUCT);
        }

        @Override
        public Piece quotient(Quotient quotient) {
            return new Piece(write(quotient.numerator()).at(Binding.POWER) + "/"
                    + write(quotient.denominator()).at(Binding.POWER), Binding.PRODUCT);
        }

        /** Zero to the power zero is one, here as in every formula of p(k). */
        @Override
        public Piece power(Power power) {
            Piece exponent = write(power.exponent());
            String text = write(power.base()).at(Binding.ATOM) + "^" + exponent.at(Binding.ATOM);
            return mayBeZero(power.base()) && mayBeZero(power.exponent())
                    ? atom("IF(" + exponent.text + "=0;1;" + text + ")") : new Piece(text, Binding.POWER);
        }

        private static boolean mayBeZero(Formula formula) {
            return formula instanceof Number number ? number.value().isZero()
                    : !(formula instanceof Constant) && !(formula instanceof Negation negation
                    && !mayBeZero(negation.operand())) && !(formula instanceof WrittenDecimal decimal
                    && decimal.text().matches(".*[1-9].*"));
        }

        @Override
        public Piece call(Call call) {
            String first = write(call.arguments().get(0)).text;
            return atom(switch (call.function()) {
                case SQRT -> "SQRT(" + first + ")";
                case COS -> "COS(" + first + ")";
                case SIN -> "SIN(" + first + ")";
                case EXP -> "EXP(" + first + ")";
                case ARCTAN -> "ATAN(" + first + ")";
                case ARCCOS -> "ACOS(" + first + ")";
                case DELTA -> "IF(" + first + "=0;1;0)";
                case BINOMIAL -> binomial(first, write(call.arguments().get(1)).text);
            });
        }

        private static String binomial(String upper, String lower) {
            return "IF((" + upper + ")<(" + lower + ");0;COMBIN(" + upper + ";" + lower + "))";
        }

        @Override
        public Piece rootSum(RootSum sum) {
            return unsayable();
        }

        /** Steps that no branch is for have no value. */
        @Override
        public Piece cases(Cases cases) {
            StringBuilder text = new StringBuilder();
            for (Cases.Branch branch : cases.branches()) {
                String least = branch.from() == 0 ? "" : step + ">=" + branch.from();
                String most = branch.to().isEmpty() ? "" : step + "<=" + branch.to().getAsLong();
                String condition = least.isEmpty() || most.isEmpty() ? least + most : "AND(" + least + ";" + most + ")";
                text.append("IF(").append(condition.isEmpty() ? "TRUE()" : condition).append(";")
                        .append(write(branch.formula()).text).append(";");
            }
            return atom(text + "NA()" + ")".repeat(cases.branches().size()));
        }
    }
}
