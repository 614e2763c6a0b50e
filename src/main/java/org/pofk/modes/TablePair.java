package org.pofk.modes;

import java.util.List;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/**
 * A line of the table of transforms: {@code transform} in z (and the pole λ) belongs to {@code sequence} in k. Exact;
 * the pairs are those of Jury, Theory and Application of the z-Transform Method, 1964, from memory.
 */
public record TablePair(Formula transform, Formula sequence) {
    public static final Formula.Symbol Z = new Formula.Symbol("z");
    public static final Formula.Symbol LAMBDA = new Formula.Symbol("λ");

    /** z/(z − λ)^(p+1) ↔ binomial(k, p) λ^(k−p). */
    static TablePair ofPole(int power) {
        Formula distance = new Formula.Sum(List.of(Z, Formulas.negated(LAMBDA)));
        Formula transform =
                new Formula.Quotient(Z, Formulas.power(distance, Formulas.number(power + 1L)));
        return new TablePair(transform, ModeFormula.geometric(Formulas.number(1), power, LAMBDA));
    }

    /** z^−at ↔ δ(k − at). */
    static TablePair ofImpulse(int at) {
        return new TablePair(Formulas.power(Z, Formulas.number(-at)), ModeFormula.impulse(Formulas.number(1), at));
    }
}
