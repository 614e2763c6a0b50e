package org.pofk.modes;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.formula.Formula;

/**
 * What a geometric and an oscillating mode have in common: coefficient · binomial(k, power) · base^(k−power), with a
 * cosine where there is an angle.
 */
record PrintedTerm(int power, RealValue coefficient, RealValue base, Optional<RealValue> angle,
        Optional<RealValue> phase) {

    /** None for an impulse. */
    static Optional<PrintedTerm> of(Mode mode) {
        return mode.accept(new Mode.Visitor<>() {
            @Override
            public Optional<PrintedTerm> impulse(Mode.Impulse impulse) {
                return Optional.empty();
            }

            @Override
            public Optional<PrintedTerm> geometric(Mode.Geometric m) {
                return Optional.of(new PrintedTerm(m.power(), m.coefficient(), m.base(), Optional.empty(),
                        Optional.empty()));
            }

            @Override
            public Optional<PrintedTerm> oscillating(Mode.Oscillating m) {
                return Optional.of(new PrintedTerm(m.power(), m.amplitude(), m.modulus(), Optional.of(m.angle()),
                        Optional.of(m.phase())));
            }
        });
    }

    /** The coefficient, and the phase where there is one. */
    List<RealValue> constants() {
        return Stream.concat(Stream.of(coefficient), phase.stream()).toList();
    }

    /** The term with its numbers as they are written. */
    Formula written(Formula coefficient, Formula base, Optional<Formula> angle, Optional<Formula> phase) {
        return angle.isPresent() && phase.isPresent()
                ? ModeFormula.oscillating(coefficient, power, base, angle.get(), phase.get())
                : ModeFormula.geometric(coefficient, power, base);
    }
}
