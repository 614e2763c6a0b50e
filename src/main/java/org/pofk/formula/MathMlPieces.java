package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.WrittenDecimal;
import org.pofk.formula.MathMl.Piece;

/**
 * A formula as pieces between which a line may end, which it may not within one {@code math} element: a piece a term,
 * and within a term only where it is wider than a line; a fraction is then written with a slash, a factor in
 * parentheses of several pieces, a whole number in parts.
 */
final class MathMlPieces {
    /** What lies over or under a stroke is set smaller and reads badly beside one. */
    private static final double STACKED = 1.5;

    private MathMlPieces() {
    }

    static List<Piece> of(Formula formula, double width) {
        if (formula instanceof Sum sum) {
            return terms(sum, width).stream().flatMap(List::stream).toList();
        }
        if (LatexWidth.of(formula) <= (formula instanceof Quotient ? STACKED * width : width)) {
            return List.of(MathMl.write(formula));
        }
        if (formula instanceof Negation negation) {
            return behind(new Piece("<mo form=\"prefix\">−</mo>", "-"), wrapped(negation.operand(), width));
        } else if (formula instanceof Product product) {
            return product(product, width);
        } else if (formula instanceof Quotient quotient) {
            return ratio(wrapped(quotient.numerator(), width), wrapped(quotient.denominator(), width));
        } else if (formula instanceof Power power && LatexWidth.of(power.base()) > width / 2) {
            Piece exponent = MathMl.write(power.exponent());
            return inParentheses(of(power.base(), width), new Piece("<msup><mo form=\"postfix\">)</mo><mrow>"
                    + exponent.elements() + "</mrow></msup>", "\\Bigr)^{" + exponent.latex() + "}"));
        } else if (formula instanceof Formula.RootSum sum) {
            return rootSum(sum, width);
        } else if (formula instanceof Formula.Cases cases) {
            return cases.branches().size() == 1 ? of(cases.branches().get(0).formula(), width)
                    : List.of(MathMl.write(formula));
        } else if (formula instanceof Number number) {
            return number(number, width);
        }
        return List.of(MathMl.write(formula));
    }

    /** Each term with the sign before it. */
    static List<List<Piece>> terms(Formula formula, double width) {
        List<List<Piece>> terms = new ArrayList<>();
        for (Formula term : formula instanceof Sum sum ? sum.terms() : List.of(formula)) {
            Optional<Formula> subtracted = subtracted(term);
            if (terms.isEmpty()) {
                terms.add(term instanceof Sum ? wrapped(term, width) : of(term, width));
            } else if (subtracted.isPresent()) {
                terms.add(behind(new Piece(MathMl.infix("−"), "- "), term(subtracted.get(), width)));
            } else {
                terms.add(behind(new Piece(MathMl.infix("+"), "+ "), term(term, width)));
            }
        }
        return terms;
    }

    private static List<Piece> term(Formula term, double width) {
        return term instanceof Sum || subtracted(term).isPresent() ? wrapped(term, width) : of(term, width);
    }

    /** What a term takes away, or nothing. */
    private static Optional<Formula> subtracted(Formula term) {
        if (term instanceof Negation negation) {
            return Optional.of(negation.operand());
        }
        if (term instanceof Number number && number.value().signum() < 0) {
            return Optional.of(new Number(number.value().negate()));
        }
        return term instanceof WrittenDecimal decimal && decimal.text().startsWith("-")
                ? Optional.of(new WrittenDecimal(decimal.text().substring(1))) : Optional.empty();
    }

    /** Factors side by side as far as they fit. */
    private static List<Piece> product(Product product, double width) {
        List<Piece> pieces = new ArrayList<>();
        List<Formula> together = new ArrayList<>();
        double used = 0;
        for (Formula factor : product.factors()) {
            double needed = LatexWidth.of(factor) + 2;
            if (!together.isEmpty() && used + needed > width) {
                addFactors(pieces, together, width);
                together.clear();
                used = 0;
            }
            together.add(factor);
            used += needed;
        }
        addFactors(pieces, together, width);
        return pieces;
    }

    private static void addFactors(List<Piece> pieces, List<Formula> together, double width) {
        List<Piece> factors = together.size() == 1 ? wrapped(together.get(0), width)
                : List.of(MathMl.write(new Product(together)));
        pieces.addAll(pieces.isEmpty() ? factors : behind(new Piece(MathMl.infix("·"), "\\cdot "), factors));
    }

    /** The polynomial is named below the sign and written out behind the sum. */
    private static List<Piece> rootSum(Formula.RootSum sum, double width) {
        if (LatexWidth.of(sum.polynomial()) <= width) {
            Piece polynomial = MathMl.write(sum.polynomial());
            return rootSum(sum, polynomial, width);
        }
        Piece variable = MathMl.write(sum.variable());
        Piece polynomial = new Piece("<mi>q</mi>" + MathMl.enclosed("(", variable.elements(), ")"),
                "q(" + variable.latex() + ")");
        List<Piece> pieces = new ArrayList<>(rootSum(sum, polynomial, width));
        pieces.add(new Piece("<mi>\u00a0with\u00a0</mi>" + polynomial.elements() + MathMl.infix("="),
                "\\text{ with } " + polynomial.latex() + " = "));
        pieces.addAll(of(sum.polynomial(), width));
        return pieces;
    }

    private static List<Piece> rootSum(Formula.RootSum sum, Piece polynomial, double width) {
        Piece variable = MathMl.write(sum.variable());
        Piece sign = new Piece("<munder><mo>∑</mo><mrow>" + variable.elements() + "<mo>:</mo>" + polynomial.elements()
                + "<mo>=</mo><mn>0</mn></mrow></munder>",
                "\\sum_{" + variable.latex() + ":\\, " + polynomial.latex() + " = 0} ");
        List<Piece> pieces = new ArrayList<>(List.of(sign));
        pieces.addAll(sum.body() instanceof Product product ? of(product, width) : wrapped(sum.body(), width));
        return pieces;
    }

    private static List<Piece> ratio(List<Piece> numerator, List<Piece> denominator) {
        List<Piece> pieces = new ArrayList<>(numerator);
        pieces.addAll(behind(new Piece(MathMl.infix("/"), "/ "), denominator));
        return pieces;
    }

    /** In parentheses where it is a sum, a product, a quotient or signed. */
    private static List<Piece> wrapped(Formula formula, double width) {
        if (LatexWidth.of(formula) <= width) {
            Product alone = new Product(List.of(formula));
            return List.of(formula instanceof Product || formula instanceof Quotient
                    ? MathMl.write(formula) : MathMl.write(alone));
        }
        boolean needsNone = formula instanceof Number number && number.value().isInteger()
                && number.value().signum() >= 0 || formula instanceof Power || formula instanceof Formula.Call
                || formula instanceof Formula.Symbol;
        return needsNone ? of(formula, width)
                : inParentheses(of(formula, width), new Piece("<mo form=\"postfix\">)</mo>", "\\Bigr)"));
    }

    private static List<Piece> number(Number number, double width) {
        if (number.value().isInteger()) {
            return digits(number.value().toString(), (int) width);
        }
        return ratio(digits(number.value().numerator().toString(), (int) width),
                digits(number.value().denominator().toString(), (int) width));
    }

    private static List<Piece> digits(String digits, int width) {
        List<Piece> pieces = new ArrayList<>();
        for (int i = 0; i < digits.length(); i += width) {
            String part = digits.substring(i, Math.min(digits.length(), i + width));
            pieces.add(new Piece("<mn>" + part.replace('-', '−') + "</mn>", part));
        }
        return pieces;
    }

    private static List<Piece> inParentheses(List<Piece> pieces, Piece end) {
        List<Piece> all = new ArrayList<>(behind(new Piece("<mo form=\"prefix\">(</mo>", "\\Bigl("), pieces));
        Piece last = all.get(all.size() - 1);
        all.set(all.size() - 1, new Piece(last.elements() + end.elements(), last.latex() + end.latex()));
        return all;
    }

    private static List<Piece> behind(Piece start, List<Piece> pieces) {
        List<Piece> all = new ArrayList<>(pieces);
        all.set(0, new Piece(start.elements() + all.get(0).elements(), start.latex() + all.get(0).latex()));
        return all;
    }
}
