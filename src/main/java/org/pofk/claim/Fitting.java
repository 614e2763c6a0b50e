package org.pofk.claim;

import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.exact.Rational;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;

/** How a written decimal goes with the real number it should be: decided, never read off digits. */
final class Fitting {
    private Fitting() {
    }

    /** Empty where it isn't decided on which side of half a unit, or of a whole one, the number lies. */
    static Optional<Fit> of(Written written, Quantity right) {
        Quantity missing = right.minus(Quantity.of(written.value()));
        OptionalInt beyondHalf = beyond(missing, written.halfUnit());
        if (beyondHalf.isEmpty()) {
            return Optional.empty();
        }
        if (beyondHalf.getAsInt() <= 0) {
            return Optional.of(Fit.RIGHT);
        }
        OptionalInt beyondUnit = beyond(missing, written.lastPlace());
        OptionalInt side = Signs.of(right);
        OptionalInt missingSide = Signs.of(missing);
        if (beyondUnit.isEmpty() || side.isEmpty() || missingSide.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(beyondUnit.getAsInt() < 0 && side.getAsInt() == missingSide.getAsInt()
                ? Fit.CUT_OFF : Fit.WRONG);
    }

    /** The sign of |number| − bound. */
    private static OptionalInt beyond(Quantity number, Rational bound) {
        OptionalInt above = Signs.compare(number, bound);
        OptionalInt below = Signs.compare(number.negate(), bound);
        if (above.isEmpty() || below.isEmpty()) {
            return OptionalInt.empty();
        }
        return OptionalInt.of(Math.max(above.getAsInt(), below.getAsInt()));
    }
}
