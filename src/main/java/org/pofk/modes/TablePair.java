package org.pofk.modes;

import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * A line of the table of transforms: {@code transform} in z (and the pole λ) belongs to {@code sequence} in k. Exact;
 * the pairs are those of Jury, Theory and Application of the z-Transform Method, 1964, from memory.
 */
public record TablePair(Formula transform, Formula sequence) {
    public static final Formula.Symbol Z = new Formula.Symbol("z");
    public static final Formula.Symbol LAMBDA = new Formula.Symbol("λ");

    /** z/(z − λ)^(p+1) ↔ binomial(k, p) λ^(k−p). */
    static TablePair ofPole(int power) {
        Formula distance = new Formula.Sum(List.of(Z, Terms.negated(LAMBDA)));
        Formula transform =
                new Formula.Quotient(Z, Terms.power(distance, Terms.number(Rational.of(power + 1L))));
        Formula sequence = Terms.product(List.of(Terms.binomial(power), Terms.power(LAMBDA, Terms.kMinus(power))));
        return new TablePair(transform, sequence);
    }

    /** z^−at ↔ δ(k − at). */
    static TablePair ofImpulse(int at) {
        Formula transform = at == 0
                ? Terms.number(Rational.ONE)
                : Terms.power(Z, Terms.number(Rational.of(-at)));
        return new TablePair(transform, ModeFormula.impulse(Terms.number(Rational.ONE), at));
    }
}
