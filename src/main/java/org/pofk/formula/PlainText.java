package org.pofk.formula;

import java.util.List;
import java.util.stream.Collectors;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Call;
import org.pofk.formula.Formula.Cases;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Function;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.RootSum;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.Formula.WrittenDecimal;
import org.pofk.text.Alphabet;

/**
 * Writes a formula in the notation that {@link FormulaParser} reads, with no parentheses but those it needs: what is
 * written is read as the same tree, except that a negative number becomes a negation and a fraction a quotient.
 * (A {@link RootSum} is for reading by people only.) Linear in the size of the formula.
 */
public final class PlainText {
    /** {@code −1/2·0.45^k·cos(2π·k/3)}, {@code √2}. */
    public static final PlainText UNICODE = new PlainText(Alphabet.UNICODE);
    /** {@code -1/2*0.45^k*cos(2*pi*k/3)}, {@code sqrt(2)}. */
    public static final PlainText ASCII = new PlainText(Alphabet.ASCII);

    private final Alphabet alphabet;
    private final Writer writer = new Writer();

    private PlainText(Alphabet alphabet) {
        this.alphabet = alphabet;
    }

    public static PlainText in(Alphabet alphabet) {
        return alphabet == Alphabet.UNICODE ? UNICODE : ASCII;
    }

    /** The formula on one line. */
    public String write(Formula formula) {
        return formula.accept(writer).text;
    }

    /**
     * The formula on lines of at most {@code width} characters where its signs allow that: broken before its outermost
     * signs, then before those further inside. The first line leaves room for {@code indent} characters, and the
     * others begin with as many blanks.
     */
    public List<String> lines(Formula formula, int width, int indent) {
        return LineBreaking.lines(write(formula), width, indent);
    }

    /** How tightly a text holds together: what binds less than its place asks for is put in parentheses. */
    private enum Binding { SUM, NEGATION, ROOT_SUM, QUOTIENT, PRODUCT, POWER, ROOT, ATOM }

    private record Piece(String text, Binding binding) {
        /** The text, in parentheses unless it binds at least so tightly. */
        String at(Binding least) {
            return binding.compareTo(least) >= 0 ? text : "(" + text + ")";
        }
    }

    private final class Writer implements Formula.Visitor<Piece> {
        private String sign(String unicode, String ascii) {
            return alphabet == Alphabet.UNICODE ? unicode : ascii;
        }

        private Piece write(Formula formula) {
            return formula.accept(this);
        }

        private Piece negative(String text) {
            return new Piece(sign("−", "-") + text, Binding.NEGATION);
        }

        @Override
        public Piece number(Number number) {
            Rational value = number.value();
            Piece absolute = new Piece(value.abs().toString(), value.isInteger() ? Binding.ATOM : Binding.QUOTIENT);
            return value.signum() < 0 ? negative(absolute.text) : absolute;
        }

        @Override
        public Piece decimal(WrittenDecimal decimal) {
            String text = decimal.text();
            if (text.startsWith("-")) {
                return negative(text.substring(1));
            }
            return new Piece(text, text.contains("e") || text.contains("E") ? Binding.POWER : Binding.ATOM);
        }

        @Override
        public Piece symbol(Symbol symbol) {
            String name = symbol.name();
            return new Piece(Words.isBareName(name) ? alphabet.write(name) : "'" + name.replace("'", "''") + "'",
                    Binding.ATOM);
        }

        @Override
        public Piece constant(Constant constant) {
            return new Piece(switch (constant) {
                case PI -> sign("π", "pi");
                case I -> "i";
                case DEGREE -> sign("°", "deg");
            }, Binding.ATOM);
        }

        @Override
        public Piece negation(Negation negation) {
            return negative(write(negation.operand()).at(Binding.ROOT_SUM));
        }

        @Override
        public Piece sum(Sum sum) {
            StringBuilder text = new StringBuilder();
            for (Formula term : sum.terms()) {
                Piece piece = write(term);
                boolean isFirst = text.isEmpty();
                if (piece.binding == Binding.NEGATION && !isFirst) {
                    text.append(' ').append(piece.text.charAt(0)).append(' ').append(piece.text.substring(1));
                } else {
                    text.append(isFirst ? "" : " + ").append(piece.at(Binding.NEGATION));
                }
            }
            return new Piece(text.toString(), Binding.SUM);
        }

        @Override
        public Piece product(Product product) {
            List<Formula> factors = product.factors();
            Piece first = write(factors.get(0));
            // a quotient may stand first, for a/b·c is read from the left; a product may not: the two would be one
            StringBuilder text = new StringBuilder(
                    first.binding == Binding.QUOTIENT ? first.text : first.at(Binding.POWER));
            for (int i = 1; i < factors.size(); i++) {
                text.append(i == 1 && needsNoSign(factors.get(0), factors.get(1))
                                ? "" : separator(factors.get(i - 1), factors.get(i)))
                        .append(write(factors.get(i)).at(Binding.POWER));
            }
            return new Piece(text.toString(), Binding.PRODUCT);
        }

        private String separator(Formula left, Formula right) {
            return right == Constant.DEGREE && isUnsigned(left) ? sign("", " ") : sign("·", "*");
        }

        /** True for {@code 2k} and {@code 2z^2}. */
        private boolean needsNoSign(Formula left, Formula right) {
            return alphabet == Alphabet.UNICODE && isUnsigned(left) && left instanceof Number
                    && isLetter(right instanceof Power power ? power.base() : right);
        }

        private static boolean isUnsigned(Formula formula) {
            return formula instanceof Number number && number.value().isInteger() && number.value().signum() >= 0
                    || formula instanceof WrittenDecimal decimal && !decimal.text().startsWith("-");
        }

        private static boolean isLetter(Formula formula) {
            return formula == Constant.PI || formula == Constant.I || formula instanceof Symbol symbol
                    && symbol.name().codePointCount(0, symbol.name().length()) == 1
                    && Words.isBareName(symbol.name()) && !symbol.name().equalsIgnoreCase("e");
        }

        @Override
        public Piece quotient(Quotient quotient) {
            return new Piece(write(quotient.numerator()).at(Binding.PRODUCT) + "/"
                    + write(quotient.denominator()).at(Binding.POWER), Binding.QUOTIENT);
        }

        @Override
        public Piece power(Power power) {
            return new Piece(write(power.base()).at(Binding.ATOM) + "^" + write(power.exponent()).at(Binding.ATOM),
                    Binding.POWER);
        }

        @Override
        public Piece call(Call call) {
            if (call.function() == Function.SQRT && alphabet == Alphabet.UNICODE) {
                return new Piece("√" + write(call.arguments().get(0)).at(Binding.ATOM), Binding.ROOT);
            }
            return new Piece(Words.nameOf(call.function()) + call.arguments().stream()
                    .map(argument -> write(argument).text).collect(Collectors.joining(", ", "(", ")")), Binding.ATOM);
        }

        @Override
        public Piece rootSum(RootSum sum) {
            String roots = alphabet.write(sum.variable().name()) + ": " + write(sum.polynomial()).text + " = 0";
            return new Piece(sign("Σ", "sum") + "[" + roots + "] " + write(sum.body()).at(Binding.QUOTIENT),
                    Binding.ROOT_SUM);
        }

        @Override
        public Piece cases(Cases cases) {
            return new Piece(cases.branches().stream().map(this::branch).collect(Collectors.joining("; ", "{", "}")),
                    Binding.ATOM);
        }

        private String branch(Cases.Branch branch) {
            long from = branch.from();
            String steps = branch.to().isEmpty() ? "k " + sign("≥", ">=") + " " + from
                    : branch.to().getAsLong() == from ? "k = " + from
                    : from + sign(" ≤ k ≤ ", " <= k <= ") + branch.to().getAsLong();
            return write(branch.formula()).text + " for " + steps;
        }
    }
}
