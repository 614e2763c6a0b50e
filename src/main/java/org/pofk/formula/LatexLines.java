package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.Sum;

/**
 * A formula as lines of LaTeX for a display: broken before its outermost signs, and within a term only where it is
 * longer than a line: a fraction is then written with a slash, a factor in parentheses that go on over lines, a whole
 * number in pieces.
 */
final class LatexLines {
    private static final double SLACK = 4;

    private LatexLines() {
    }

    /** Lines of about {@code width} digits. */
    static List<String> of(Formula formula, double width) {
        if (LatexWidth.of(formula) <= width) {
            return List.of(Latex.write(formula));
        }
        double inner = Math.max(12, width - SLACK);
        if (formula instanceof Sum sum) {
            return filled(sum, width);
        } else if (formula instanceof Negation negation) {
            return around("-", wrapped(negation.operand(), inner), "");
        } else if (formula instanceof Product product) {
            return product(product, inner);
        } else if (formula instanceof Quotient quotient) {
            return ratio(wrapped(quotient.numerator(), inner), wrapped(quotient.denominator(), inner));
        } else if (formula instanceof Power power && LatexWidth.of(power.base()) > inner / 2) {
            return around("\\Big(", of(power.base(), inner), "\\Big)^{" + Latex.write(power.exponent()) + "}");
        } else if (formula instanceof Formula.RootSum sum) {
            return rootSum(sum, inner);
        } else if (formula instanceof Number number) {
            return number(number, inner);
        }
        return List.of(Latex.write(formula));
    }

    /** Terms side by side as far as they fit. */
    private static List<String> filled(Sum sum, double width) {
        List<String> lines = new ArrayList<>();
        double used = 0;
        for (Formula term : sum.terms()) {
            List<String> own = term(term, lines.isEmpty(), width);
            double needed = LatexWidth.of(term) + 3;
            if (own.size() == 1 && !lines.isEmpty() && used + needed <= width) {
                lines.set(lines.size() - 1, lines.get(lines.size() - 1) + " " + own.get(0));
                used += needed;
            } else {
                lines.addAll(own);
                used = own.size() == 1 ? needed : width;
            }
        }
        return lines;
    }

    /** A term with its sign. */
    private static List<String> term(Formula term, boolean isFirst, double width) {
        List<String> own = of(term instanceof Sum ? new Product(List.of(term)) : term, width - 3);
        boolean isNegative = own.get(0).startsWith("-");
        return isFirst ? own : isNegative ? around("- ", around("", own, "", 1), "") : around("+ ", own, "");
    }

    private static List<String> product(Product product, double width) {
        List<String> lines = new ArrayList<>();
        double used = 0;
        for (Formula factor : product.factors()) {
            List<String> own = LatexWidth.of(factor) <= width ? List.of(Latex.write(new Product(List.of(factor))))
                    : wrapped(factor, width);
            double needed = LatexWidth.of(factor) + 3;
            if (own.size() == 1 && !lines.isEmpty() && used + needed <= width) {
                lines.set(lines.size() - 1, lines.get(lines.size() - 1) + " \\cdot " + own.get(0));
                used += needed;
            } else {
                lines.addAll(lines.isEmpty() ? own : around("\\cdot ", own, ""));
                used = own.size() == 1 ? needed : width;
            }
        }
        return lines;
    }

    /** The polynomial is named below the sign and written out behind the sum. */
    private static List<String> rootSum(Formula.RootSum sum, double width) {
        String polynomial = "q(" + Latex.write(sum.variable()) + ")";
        List<String> lines = new ArrayList<>(around("\\sum_{" + polynomial + " = 0} ", wrapped(sum.body(), width), ""));
        lines.addAll(around("\\text{with } " + polynomial + " = ", of(sum.polynomial(), width - 10), ""));
        return lines;
    }

    /** A numerator over a denominator on lines of their own. */
    private static List<String> ratio(List<String> numerator, List<String> denominator) {
        List<String> lines = new ArrayList<>(numerator);
        lines.addAll(around("\\Big/ ", denominator, ""));
        return lines;
    }

    /** In parentheses where it is a sum, a product, a quotient or signed. */
    private static List<String> wrapped(Formula formula, double width) {
        boolean isSigned = formula instanceof Number number && number.value().signum() < 0;
        boolean needsNone = !isSigned && (formula instanceof Number number && number.value().isInteger()
                || formula instanceof Formula.Symbol || formula instanceof Power || formula instanceof Formula.Call
                || formula instanceof Formula.WrittenDecimal decimal && !decimal.text().startsWith("-"));
        List<String> lines = of(formula, width);
        return needsNone ? lines : lines.size() == 1 ? around("\\left(", lines, "\\right)")
                : around("\\Big(", lines, "\\Big)");
    }

    private static List<String> number(Number number, double width) {
        if (number.value().isInteger()) {
            return digits(number.value().toString(), (int) width);
        }
        return ratio(digits(number.value().numerator().toString(), (int) width),
                digits(number.value().denominator().toString(), (int) width));
    }

    /** The digits of a whole number in pieces. */
    private static List<String> digits(String digits, int width) {
        List<String> lines = new ArrayList<>();
        for (int i = 0; i < digits.length(); i += width) {
            lines.add(digits.substring(i, Math.min(digits.length(), i + width)));
        }
        return lines;
    }

    private static List<String> around(String before, List<String> lines, String after) {
        return around(before, lines, after, 0);
    }

    private static List<String> around(String before, List<String> lines, String after, int leftOut) {
        List<String> around = new ArrayList<>(lines);
        around.set(0, before + around.get(0).substring(leftOut));
        around.set(around.size() - 1, around.get(around.size() - 1) + after);
        return around;
    }
}
