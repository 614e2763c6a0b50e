package org.pofk.modes;

import java.util.List;
import org.pofk.formula.Formula;

/**
 * A mode as a term in k. An impulse is a multiple of δ(k − at); a phase written π is a minus sign in front of the
 * cosine; a pole written 1 leaves no power.
 */
public final class ModeFormula {
    private ModeFormula() {
    }

    /** With every constant in its exact form, which it has. */
    static Formula exact(Mode mode) {
        return mode.accept(new Exact());
    }

    public static Formula impulse(Formula value, int at) {
        return Terms.product(List.of(value, Terms.call(Formula.Function.DELTA, Terms.kMinus(at))));
    }

    public static Formula geometric(Formula coefficient, int power, Formula base) {
        return Terms.product(List.of(coefficient, Terms.binomial(power), Terms.power(base, Terms.kMinus(power))));
    }

    public static Formula oscillating(Formula amplitude, int power, Formula modulus, Formula angle, Formula phase) {
        boolean turned = phase == Formula.Constant.PI;
        Formula turn = Terms.overDenominator(angle, Terms.kMinus(power));
        Formula argument = turned || Terms.isZero(phase) ? turn : new Formula.Sum(List.of(turn, phase));
        return Terms.product(List.of(turned ? Terms.negated(amplitude) : amplitude, Terms.binomial(power),
                Terms.power(modulus, Terms.kMinus(power)), Terms.call(Formula.Function.COS, argument)));
    }

    private static final class Exact implements Mode.Visitor<Formula> {
        @Override
        public Formula impulse(Mode.Impulse impulse) {
            return ModeFormula.impulse(exact(impulse.value()), impulse.at());
        }

        @Override
        public Formula geometric(Mode.Geometric mode) {
            return ModeFormula.geometric(exact(mode.coefficient()), mode.power(), exact(mode.base()));
        }

        @Override
        public Formula oscillating(Mode.Oscillating mode) {
            return ModeFormula.oscillating(exact(mode.amplitude()), mode.power(), exact(mode.modulus()),
                    exact(mode.angle()), exact(mode.phase()));
        }

        private static Formula exact(RealValue value) {
            return value.exact().orElseThrow(() -> new AssertionError("no short exact form of " + value));
        }
    }
}
