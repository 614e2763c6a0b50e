package org.pofk.formula;

import java.util.List;
import java.util.regex.Pattern;
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
import org.pofk.text.Xml;

/**
 * Writes a formula as presentation MathML, with what MathML Core has. Fractions lie over each other and need no
 * parentheses unless they are raised. A dot stands between factors where setting them side by side could be read as
 * something else; elsewhere the invisible sign for "times". Linear in the size of the formula.
 */
public final class MathMl {
    private static final String TIMES = "<mo>\u2062</mo>";
    private static final Pattern TALL = Pattern.compile("<m(frac|sqrt|under|table)");
    private static final String APPLIED = "<mo>\u2061</mo>";

    private MathMl() {
    }

    /**
     * A formula, or a part of one that may stand on a line of its own.
     *
     * @param elements the contents of a {@code math} element
     * @param latex    the same as LaTeX
     */
    public record Piece(String elements, String latex) {

        /** As a {@code math} element within a line of text. */
        public String inLine() {
            return within("<math>");
        }

        /** As a {@code math} element set as large as in a display. */
        public String displayed() {
            return within("<math displaystyle=\"true\">");
        }

        private String within(String start) {
            return start + "<semantics><mrow>" + elements + "</mrow><annotation encoding=\"application/x-tex\">"
                    + Xml.escaped(latex) + "</annotation></semantics></math>";
        }
    }

    /** The formula as one piece. */
    public static Piece write(Formula formula) {
        return new Piece(elements(formula), Latex.write(formula));
    }

    /** The formula's terms in their order, each in pieces where it is wider than {@code width} digits. */
    public static List<List<Piece>> terms(Formula formula, int width) {
        return MathMlPieces.terms(formula, width);
    }

    static String elements(Formula formula) {
        return formula.accept(Writer.WRITER).text;
    }

    /** A sign; one between two operands is set so even where it begins a piece. */
    static String infix(String sign) {
        return "<mo form=\"infix\">" + sign + "</mo>";
    }

    /** Between brackets, which are stretched only where what is between them is high: that sets them apart from it. */
    static String enclosed(String open, String elements, String close) {
        String start = TALL.matcher(elements).find() ? "<mo>" : "<mo stretchy=\"false\">";
        return "<mrow>" + start + open + "</mo>" + elements + start + close + "</mo></mrow>";
    }

    /** How tightly a text holds together: what binds less than its place asks for is put in parentheses. */
    private enum Binding { SUM, NEGATION, ROOT_SUM, PRODUCT, POWER_OF_TEN, FRACTION, POWER, CALL, ATOM }

    /** Elements in a row; an atom is one element. */
    private record Part(String text, Binding binding) {
        String at(Binding least) {
            return binding.compareTo(least) >= 0 ? text : enclosed("(", text, ")");
        }

        /** As one element. */
        String element() {
            return binding == Binding.ATOM ? text : "<mrow>" + text + "</mrow>";
        }

        /** As one element, in parentheses unless it is an atom. */
        String atom() {
            return at(Binding.ATOM);
        }
    }

    private static final class Writer implements Formula.Visitor<Part> {
        static final Writer WRITER = new Writer();
        private static final String MINUS = "<mo form=\"prefix\">−</mo>";

        private Part write(Formula formula) {
            return formula.accept(this);
        }

        private static Part atom(String text) {
            return new Part(text, Binding.ATOM);
        }

        @Override
        public Part number(Number number) {
            Rational value = number.value();
            if (value.signum() < 0) {
                return new Part(MINUS + number(new Number(value.negate())).text, Binding.NEGATION);
            }
            return value.isInteger() ? atom("<mn>" + value + "</mn>")
                    : new Part("<mfrac><mn>" + value.numerator() + "</mn><mn>" + value.denominator() + "</mn></mfrac>",
                            Binding.FRACTION);
        }

        @Override
        public Part decimal(WrittenDecimal decimal) {
            String text = decimal.text();
            if (text.startsWith("-")) {
                return new Part(MINUS + decimal(new WrittenDecimal(text.substring(1))).text, Binding.NEGATION);
            }
            String[] parts = text.split("[eE]\\+?");
            String digits = "<mn>" + Xml.escaped(parts[0]) + "</mn>";
            return parts.length == 1 ? atom(digits) : new Part(digits + "<mo>·</mo><msup><mn>10</mn><mrow>"
                    + decimal(new WrittenDecimal(parts[1])).text + "</mrow></msup>", Binding.POWER_OF_TEN);
        }

        /** One letter in italics, a word upright. (As text beside a sign, words would count as blanks.) */
        @Override
        public Part symbol(Symbol symbol) {
            return atom("<mi>" + Xml.escaped(symbol.name().replace(' ', '\u00a0')) + "</mi>");
        }

        @Override
        public Part constant(Constant constant) {
            return switch (constant) {
                case PI -> atom("<mi>π</mi>");
                case I -> atom("<mi mathvariant=\"normal\">i</mi>");
                case DEGREE -> new Part("<mn>1</mn><mo>°</mo>", Binding.POWER);
            };
        }

        @Override
        public Part negation(Negation negation) {
            return new Part(MINUS + write(negation.operand()).at(Binding.ROOT_SUM), Binding.NEGATION);
        }

        @Override
        public Part sum(Sum sum) {
            StringBuilder text = new StringBuilder();
            for (Formula term : sum.terms()) {
                Part part = write(term);
                if (text.isEmpty()) {
                    text.append(part.at(Binding.NEGATION));
                } else if (part.binding == Binding.NEGATION) {
                    text.append("<mo>−</mo>").append(part.text.substring(MINUS.length()));
                } else {
                    text.append("<mo>+</mo>").append(part.at(Binding.NEGATION));
                }
            }
            return new Part(text.toString(), Binding.SUM);
        }

        @Override
        public Part product(Product product) {
            List<Formula> factors = product.factors();
            StringBuilder text = new StringBuilder(write(factors.get(0)).at(Binding.POWER_OF_TEN));
            for (int i = 1; i < factors.size(); i++) {
                Formula before = factors.get(i - 1);
                if (factors.get(i) == Constant.DEGREE && isPlainNumber(before)) {
                    text.append("<mo>°</mo>");
                } else {
                    String factor = write(factors.get(i)).at(Binding.POWER_OF_TEN);
                    text.append(separator(before, factor)).append(factor);
                }
            }
            return new Part(text.toString(), Binding.PRODUCT);
        }

        private static boolean isPlainNumber(Formula formula) {
            return formula instanceof Number number && number.value().isInteger() && number.value().signum() >= 0
                    || formula instanceof WrittenDecimal decimal && decimal.text().matches("[0-9.]+");
        }

        /** A dot where side by side would read as another number, a mixed fraction, or a function of an argument. */
        private static String separator(Formula before, String factor) {
            String bare = factor.replaceFirst("^(<mrow>|<msup>)+", "").replace(" stretchy=\"false\"", "");
            boolean beginsWithNumber = bare.startsWith("<mn>") || bare.startsWith("<mfrac>")
                    || bare.startsWith("<mo>(</mo><mfrac>") && isPlainNumber(before);
            boolean looksLikeArgument = before instanceof Symbol && bare.startsWith("<mo>(</mo>")
                    && !bare.startsWith("<mo>(</mo><mfrac l");
            return beginsWithNumber || looksLikeArgument ? "<mo>·</mo>" : TIMES;
        }

        @Override
        public Part quotient(Quotient quotient) {
            return new Part("<mfrac>" + write(quotient.numerator()).element()
                    + write(quotient.denominator()).element() + "</mfrac>", Binding.FRACTION);
        }

        @Override
        public Part power(Power power) {
            return new Part("<msup>" + write(power.base()).atom() + write(power.exponent()).element() + "</msup>",
                    Binding.POWER);
        }

        @Override
        public Part call(Call call) {
            String argument = write(call.arguments().get(0)).text;
            return new Part(switch (call.function()) {
                case SQRT -> "<msqrt>" + argument + "</msqrt>";
                case COS, SIN, EXP, ARCTAN, ARCCOS -> "<mi>" + Words.nameOf(call.function()) + "</mi>" + APPLIED
                        + enclosed("(", argument, ")");
                case BINOMIAL -> enclosed("(", "<mfrac linethickness=\"0\">"
                        + write(call.arguments().get(0)).element() + write(call.arguments().get(1)).element()
                        + "</mfrac>", ")");
                case DELTA -> "<mi>δ</mi>" + enclosed("[", argument, "]");
            }, Binding.CALL);
        }

        @Override
        public Part rootSum(RootSum sum) {
            return new Part("<munder><mo>∑</mo><mrow>" + write(sum.variable()).text + "<mo>:</mo>"
                    + write(sum.polynomial()).text + "<mo>=</mo><mn>0</mn></mrow></munder>"
                    + write(sum.body()).at(Binding.PRODUCT), Binding.ROOT_SUM);
        }

        @Override
        public Part cases(Cases cases) {
            return new Part(cases.branches().stream().map(this::branch).collect(Collectors.joining("",
                    "<mrow><mo>{</mo><mtable columnalign=\"left\">", "</mtable></mrow>")), Binding.CALL);
        }

        private String branch(Cases.Branch branch) {
            String from = "<mn>" + branch.from() + "</mn>";
            String steps = branch.to().isEmpty() ? "<mi>k</mi><mo>≥</mo>" + from
                    : branch.to().getAsLong() == branch.from() ? "<mi>k</mi><mo>=</mo>" + from
                    : from + "<mo>≤</mo><mi>k</mi><mo>≤</mo><mn>" + branch.to().getAsLong() + "</mn>";
            return "<mtr><mtd>" + write(branch.formula()).text + "</mtd><mtd>" + steps + "</mtd></mtr>";
        }
    }
}
