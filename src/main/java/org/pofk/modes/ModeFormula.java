package org.pofk.modes;

import java.util.List;
import java.util.function.Function;
import org.pofk.formula.Formula;

/**
 * A mode as a term in k, its constants written as {@code constant} says (exact or in decimals). An impulse is a
 * multiple of δ(k − at); a phase written π is a minus sign in front of the cosine.
 */
final class ModeFormula implements Mode.Visitor<Formula> {
    private final Function<RealValue, Formula> constant;

    ModeFormula(Function<RealValue, Formula> constant) {
        this.constant = constant;
    }

    /** With every constant in its exact form, which it has. */
    static Formula exact(Mode mode) {
        return mode.accept(new ModeFormula(value -> value.exact().orElseThrow(
                () -> new AssertionError("a constant without a short exact form in " + mode))));
    }

    @Override
    public Formula impulse(Mode.Impulse impulse) {
        Formula delta = Terms.call(Formula.Function.DELTA, Terms.kMinus(impulse.at()));
        return Terms.product(List.of(constant.apply(impulse.value()), delta));
    }

    @Override
    public Formula geometric(Mode.Geometric mode) {
        return Terms.product(List.of(constant.apply(mode.coefficient()), Terms.binomial(mode.power()),
                Terms.power(constant.apply(mode.base()), Terms.kMinus(mode.power()))));
    }

    @Override
    public Formula oscillating(Mode.Oscillating mode) {
        Formula amplitude = constant.apply(mode.amplitude());
        Formula phase = constant.apply(mode.phase());
        boolean turned = phase == Formula.Constant.PI;
        Formula turn = Terms.overDenominator(constant.apply(mode.angle()), Terms.kMinus(mode.power()));
        Formula argument = turned || Terms.isZero(phase)
                ? turn
                : new Formula.Sum(List.of(turn, phase));
        return Terms.product(List.of(turned ? Terms.negated(amplitude) : amplitude, Terms.binomial(mode.power()),
                Terms.power(constant.apply(mode.modulus()), Terms.kMinus(mode.power())),
                Terms.call(Formula.Function.COS, argument)));
    }
}
