package org.pofk.report;

import org.pofk.modes.Mode;

/** Whether a mode as {@link ModeTerm} shows it has a rounded number in it. */
record ModeRounding(NumberFormula numbers) implements Mode.Visitor<Boolean> {

    /** The term, with ≈ before it where it isn't exact. */
    static Prose marked(Mode mode, NumberFormula numbers) {
        return Prose.of(mode.accept(new ModeRounding(numbers)) ? NumberFormula.ROUNDED : "")
                .andFormula(mode.accept(new ModeTerm(numbers)));
    }

    @Override
    public Boolean impulse(Mode.Impulse impulse) {
        return numbers.isRounded(impulse.value());
    }

    @Override
    public Boolean geometric(Mode.Geometric mode) {
        return numbers.isRounded(mode.coefficient()) || numbers.isRounded(mode.base());
    }

    @Override
    public Boolean oscillating(Mode.Oscillating mode) {
        return numbers.isRounded(mode.amplitude()) || numbers.isRounded(mode.modulus())
                || numbers.isRoundedAngle(mode.angle()) || numbers.isRoundedAngle(mode.phase());
    }
}
