package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/** The exact formula of every closed form: factors without short forms stand as sums over their roots. Exact. */
final class FormulaOverRoots {
    private static final Formula.Symbol LAMBDA = TablePair.LAMBDA;

    private FormulaOverRoots() {
    }

    static Formula of(ClosedForm form) {
        List<Formula> terms = new ArrayList<>(form.modes().stream()
                .filter(mode -> mode.pole().isEmpty()).map(ModeFormula::exact).toList());
        for (Expansion.Part<Rational> part : form.expansion().parts()) {
            int index = form.transform().factors().factors().indexOf(part.factor());
            List<Mode> modes = form.modes().stream()
                    .filter(mode -> !mode.pole().isEmpty() && mode.pole().get(0) == index).toList();
            if (modes.stream().allMatch(Mode::isExact)) {
                modes.forEach(mode -> terms.add(ModeFormula.exact(mode)));
            } else {
                terms.add(overRoots(part));
            }
        }
        return Terms.sum(terms);
    }

    /** Σ over q(λ) = 0 of Σ_p R_p(λ) binomial(k, p) λ^(k−p). */
    static Formula.RootSum overRoots(Expansion.Part<Rational> part) {
        List<Formula> body = new ArrayList<>();
        for (int power = 0; power < part.coefficients().size(); power++) {
            Expansion.Coefficient<Rational> coefficient = part.coefficients().get(power);
            if (!coefficient.isZero()) {
                body.add(Terms.product(List.of(written(coefficient), Terms.binomial(power),
                        Terms.power(LAMBDA, Terms.kMinus(power)))));
            }
        }
        return new Formula.RootSum(LAMBDA, polynomial(part.factor().polynomial()), Terms.sum(body));
    }

    /** R(λ). */
    static Formula written(Expansion.Coefficient<Rational> coefficient) {
        Formula numerator = polynomial(coefficient.numerator());
        return coefficient.isReduced()
                ? numerator
                : new Formula.Quotient(numerator, polynomial(coefficient.denominator()));
    }

    private static Formula polynomial(Polynomial<Rational> polynomial) {
        return Terms.polynomial(polynomial, LAMBDA);
    }
}
