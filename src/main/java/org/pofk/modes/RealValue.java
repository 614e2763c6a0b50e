package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/**
 * A real constant of a closed form: its short exact form where there is one, and its decimals as far as asked.
 * Certified; exact when {@code exact} is present.
 */
public record RealValue(Optional<Formula> exact, Enclosed enclosure) {
    private static final int FIRST_BITS = 64;
    private static final int TOLD_FROM_ZERO_BITS = 1_024;

    public static RealValue of(Rational value) {
        return new RealValue(Optional.of(Formulas.number(value)), Enclosed.of(value));
    }

    static RealValue of(Optional<Radical> shortForm, Enclosed enclosure) {
        return shortForm.flatMap(Radical::rational).map(RealValue::of)
                .orElseGet(() -> new RealValue(shortForm.map(Radical::formula), enclosure));
    }

    /** An angle; a rational multiple of π is enclosed as one, for an argument's enclosure straddles π at π. */
    static RealValue ofAngle(Optional<Angle> shortForm, Enclosed enclosure) {
        Enclosed sharper = shortForm.flatMap(Angle::piFraction)
                .map(fraction -> Enclosed.pi().times(Enclosed.of(fraction))).orElse(enclosure);
        return new RealValue(shortForm.map(Angle::formula), sharper);
    }

    /**
     * To so many significant digits. A number that can't be told from zero with {@value #TOLD_FROM_ZERO_BITS} bits, and
     * isn't known to be zero, is written to so many places instead.
     */
    public Decimal decimal(int digits) {
        if (rational().isPresent()) {
            return Decimals.of(rational().get(), digits);
        }
        return enclosure.enclose(FIRST_BITS).containsZero()
                        && enclosure.enclose(TOLD_FROM_ZERO_BITS).containsZero()
                ? Decimals.fixed(enclosure, digits)
                : Decimals.of(enclosure, digits);
    }

    /** The value where it is known to be rational. */
    public Optional<Rational> rational() {
        return exact.filter(Formula.Number.class::isInstance).map(number -> ((Formula.Number) number).value());
    }
}
