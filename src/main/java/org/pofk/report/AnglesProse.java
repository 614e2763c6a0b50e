package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;

/**
 * The angles and phases of a formula in degrees. The formula itself stays in radians: its bound is proved for the
 * digits as they are printed.
 */
final class AnglesProse {
    private AnglesProse() {
    }

    /** Empty where nothing oscillates. */
    static Optional<Prose> of(ClosedForm form, Style style) {
        NumberFormula numbers = new NumberFormula(style);
        List<Prose> turns = new ArrayList<>();
        form.modes().forEach(mode -> mode.accept(new Turn(numbers)).ifPresent(turns::add));
        return turns.isEmpty() ? Optional.empty() : Optional.of(Prose.joined(turns, "; "));
    }

    private record Turn(NumberFormula numbers) implements Mode.Visitor<Optional<Prose>> {
        @Override
        public Optional<Prose> impulse(Mode.Impulse impulse) {
            return Optional.empty();
        }

        @Override
        public Optional<Prose> geometric(Mode.Geometric geometric) {
            return Optional.empty();
        }

        @Override
        public Optional<Prose> oscillating(Mode.Oscillating mode) {
            return Optional.of(Prose.formula(numbers.angle(mode.angle())).and(" a step with phase ")
                    .andFormula(numbers.angle(mode.phase())));
        }
    }
}
