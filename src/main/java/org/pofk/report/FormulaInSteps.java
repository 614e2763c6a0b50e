package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.PlainText;
import org.pofk.formula.Renaming;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.DecimalForm;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Relation;
import org.pofk.schedule.JointFormula;

/** A closed form whose steps are called otherwise than k: cycles m, or steps j within one. */
final class FormulaInSteps {
    private static final String STEP = "k";
    /** Exact forms above this are shown in decimals alone. */
    private static final int EXACT_SHOWN_UP_TO = 200;
    private static final int OVER_ROOTS_SHOWN_UP_TO = 400;
    private static final int ERROR_DIGITS = 2;

    private final String variable;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();
    private Rational largestError = Rational.ZERO;
    private Optional<Long> upTo = Optional.empty();

    /** For formulas in one variable, one after the other. */
    FormulaInSteps(String variable, Style style) {
        this.variable = variable;
        this.style = style;
    }

    /** The formulas in their order, then what their decimals promise together. */
    List<Block> blocks() {
        if (!largestError.isZero()) {
            blocks.add(new Labelled("decimals", "certified within " + Decimals.of(largestError, ERROR_DIGITS).text()
                    + upTo.map(last -> " for every " + variable + " up to " + last)
                            .orElse(" for every " + variable) + ", computed as printed"));
        }
        return blocks;
    }

    /** The decimals, and the exact form where it is short. */
    void add(ClosedForm form, Prose left, Prose range) {
        DecimalForm decimals = form.decimalForm(style.digits());
        Optional<Formula> exact = form.exactFormula().map(this::renamed)
                .filter(formula -> PlainText.UNICODE.write(formula).length() <= EXACT_SHOWN_UP_TO);
        Optional<Formula> decimal = decimals.formula().map(this::renamed)
                .filter(formula -> !exact.equals(Optional.of(formula)));
        decimal.ifPresent(formula -> {
            blocks.add(new Display(left, decimals.isExact() ? Relation.EQUAL : Relation.ROUNDED, formula, range));
            promise(decimals);
        });
        exact.filter(formula -> decimal.isEmpty() || !decimals.isExact())
                .ifPresent(formula -> blocks.add(new Display(left, Relation.EQUAL, formula, range)));
        if (decimal.isEmpty() && exact.isEmpty()) {
            withoutDecimals(form, decimals, left, range);
        }
    }

    private Formula renamed(Formula formula) {
        return Renaming.of(formula, STEP, variable);
    }

    private void promise(DecimalForm decimals) {
        largestError = Rational.max(largestError, decimals.errorBound());
        upTo = decimals.upTo().map(last -> Math.min(last, upTo.orElse(last))).or(() -> upTo);
    }

    private void withoutDecimals(ClosedForm form, DecimalForm decimals, Prose left, Prose range) {
        Formula over = renamed(form.formulaOverRoots());
        int length = PlainText.UNICODE.write(over).length();
        if (length <= OVER_ROOTS_SHOWN_UP_TO) {
            blocks.add(new Display(left, Relation.EQUAL, over, range));
        } else {
            blocks.add(new Labelled(left, Prose.of("too long to be shown, " + length + " characters"
                    + decimals.reason().map(why -> "; no decimals: " + why).orElse(""))));
        }
    }

    /** Σ μ^m · f_μ(j). */
    static Display joint(JointFormula formula, Prose left) {
        List<Formula> terms = formula.terms().stream().map(term -> {
            Formula within = Renaming.of(term.within().exactFormula().orElseThrow(), STEP, "j");
            return Formulas.product(Formulas.power(Formulas.number(term.base()), new Formula.Symbol("m")), within);
        }).toList();
        return new Display(left, Relation.EQUAL, Formulas.sum(terms),
                Prose.of("m ≥ 0, 0 ≤ j ≤ " + formula.to()));
    }
}
