package org.pofk.modes;

import java.util.List;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/**
 * A mode as a term in k. An impulse is a multiple of δ(k − at); a phase written π is a minus sign in front of the
 * cosine; a pole written 1 leaves no power.
 */
public final class ModeFormula {
    private static final Formula K = new Formula.Symbol("k");

    private ModeFormula() {
    }

    /** k − shift. */
    public static Formula kMinus(int shift) {
        return Formulas.sum(List.of(K, Formulas.number(-shift)));
    }

    /** binomial(k, p): 1 for p = 0, k for p = 1. */
    public static Formula binomial(int p) {
        return switch (p) {
            case 0 -> Formulas.number(1);
            case 1 -> K;
            default -> Formulas.call(Formula.Function.BINOMIAL, K, Formulas.number(p));
        };
    }

    /** With every constant in its exact form, which it has. */
    static Formula exact(Mode mode) {
        return mode.accept(new Exact());
    }

    public static Formula impulse(Formula value, int at) {
        return Formulas.product(List.of(value, Formulas.call(Formula.Function.DELTA, kMinus(at))));
    }

    public static Formula geometric(Formula coefficient, int power, Formula base) {
        return Formulas.product(List.of(coefficient, binomial(power), Formulas.power(base, kMinus(power))));
    }

    public static Formula oscillating(Formula amplitude, int power, Formula modulus, Formula angle, Formula phase) {
        boolean turned = phase == Formula.Constant.PI;
        Formula turn = Formulas.overDenominator(angle, kMinus(power));
        Formula argument = turned || Formulas.isZero(phase) ? turn : new Formula.Sum(List.of(turn, phase));
        return Formulas.product(List.of(turned ? Formulas.negated(amplitude) : amplitude, binomial(power),
                Formulas.power(modulus, kMinus(power)), Formulas.call(Formula.Function.COS, argument)));
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
