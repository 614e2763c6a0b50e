package org.pofk.report;

import org.pofk.formula.Formula;
import org.pofk.modes.Mode;
import org.pofk.modes.ModeFormula;

/** A mode as a term in k, to be read, not to be computed with: its constants short. */
record ModeTerm(NumberFormula numbers) implements Mode.Visitor<Formula> {

    @Override
    public Formula impulse(Mode.Impulse impulse) {
        return ModeFormula.impulse(numbers.of(impulse.value()), impulse.at());
    }

    @Override
    public Formula geometric(Mode.Geometric mode) {
        return ModeFormula.geometric(numbers.of(mode.coefficient()), mode.power(), numbers.of(mode.base()));
    }

    @Override
    public Formula oscillating(Mode.Oscillating mode) {
        return ModeFormula.oscillating(numbers.of(mode.amplitude()), mode.power(), numbers.of(mode.modulus()),
                numbers.angle(mode.angle()), numbers.angle(mode.phase()));
    }
}
