package org.pofk.claim;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.Latex;
import org.pofk.formula.ParsedFormula;
import org.pofk.formula.PlainText;
import org.pofk.text.Span;

/** A formula as its author wrote it, with other decimals in some places. */
final class MendedFormula implements Formula.Visitor<Formula> {
    private final ParsedFormula parsed;
    private final Map<Span, String> digits;

    private MendedFormula(ParsedFormula parsed, Map<Span, String> digits) {
        this.parsed = parsed;
        this.digits = digits;
    }

    /** In the author's notation; his own text where no decimal is another one. */
    static String of(FormulaText text, List<Judgement.JudgedNumber> numbers) {
        Map<Span, String> changed = new HashMap<>();
        numbers.stream().filter(number -> !number.right().equals(number.written().text()))
                .forEach(number -> changed.put(number.written().span(), number.right()));
        return changed.isEmpty() ? text.text() : written(mended(text.parsed(), changed), text);
    }

    /** A formula of ours in the author's notation. */
    static String written(Formula formula, FormulaText like) {
        if (like.notation() == FormulaText.Notation.LATEX) {
            return Latex.write(formula);
        }
        boolean isPlain = like.text().chars().allMatch(c -> c < 128);
        return (isPlain ? PlainText.ASCII : PlainText.UNICODE).write(formula);
    }

    private static Formula mended(ParsedFormula parsed, Map<Span, String> digits) {
        return parsed.formula().accept(new MendedFormula(parsed, digits));
    }

    private Formula part(int place) {
        return mended(parsed.parts().get(place), digits);
    }

    private List<Formula> parts() {
        return parsed.parts().stream().map(part -> mended(part, digits)).toList();
    }

    @Override
    public Formula number(Formula.Number number) {
        return number;
    }

    @Override
    public Formula decimal(Formula.WrittenDecimal decimal) {
        String right = digits.get(parsed.span());
        return right == null ? decimal : Formulas.decimal(right);
    }

    @Override
    public Formula symbol(Formula.Symbol symbol) {
        return symbol;
    }

    @Override
    public Formula constant(Formula.Constant constant) {
        return constant;
    }

    @Override
    public Formula negation(Formula.Negation negation) {
        return Formulas.negated(part(0));
    }

    @Override
    public Formula sum(Formula.Sum sum) {
        return new Formula.Sum(parts());
    }

    @Override
    public Formula product(Formula.Product product) {
        return new Formula.Product(parts());
    }

    @Override
    public Formula quotient(Formula.Quotient quotient) {
        return new Formula.Quotient(part(0), part(1));
    }

    @Override
    public Formula power(Formula.Power power) {
        return new Formula.Power(part(0), part(1));
    }

    @Override
    public Formula call(Formula.Call call) {
        return new Formula.Call(call.function(), parts());
    }

    @Override
    public Formula rootSum(Formula.RootSum rootSum) {
        return rootSum;
    }

    @Override
    public Formula cases(Formula.Cases cases) {
        List<Formula.Cases.Branch> branches = new java.util.ArrayList<>();
        for (int i = 0; i < cases.branches().size(); i++) {
            Formula.Cases.Branch branch = cases.branches().get(i);
            branches.add(new Formula.Cases.Branch(branch.from(), branch.to(), part(i)));
        }
        return new Formula.Cases(branches);
    }
}
