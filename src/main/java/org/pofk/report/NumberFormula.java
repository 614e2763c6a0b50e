package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.PlainText;
import org.pofk.modes.RealValue;

/** Constants of a derivation as they are shown: short exact forms as such, others in decimals. */
record NumberFormula(Style style) {
    /** A short exact form is no longer than a decimal would be, and a little. */
    private static final int ROOM = 6;
    static final String ROUNDED = "≈ ";
    private static final Rational DEGREES_IN_HALF_TURN = Rational.of(180);

    Formula of(RealValue value) {
        return value.exact().filter(this::isShort).orElseGet(() -> decimal(value));
    }

    Formula of(Rational value) {
        return of(RealValue.of(value));
    }

    /** An angle in the unit of the style; exact multiples of π stay as they are in radians. */
    Formula angle(RealValue value) {
        if (style.angles() == Style.Angles.RADIANS) {
            return of(value);
        }
        Optional<Rational> halfTurns = value.exact().flatMap(PiMultiple::of);
        if (halfTurns.isPresent()) {
            Rational degrees = halfTurns.get().times(DEGREES_IN_HALF_TURN);
            return degrees.isZero() ? Formulas.number(degrees)
                    : Formulas.product(List.of(Formulas.number(degrees), Formula.Constant.DEGREE));
        }
        Enclosed degrees = value.enclosure().times(Enclosed.of(DEGREES_IN_HALF_TURN)).dividedBy(Enclosed.pi());
        return Formulas.product(List.of(decimal(new RealValue(Optional.empty(), degrees)), Formula.Constant.DEGREE));
    }

    /** With ≈ before it where it is rounded. */
    Prose marked(RealValue value) {
        return Prose.of(isRounded(value) ? ROUNDED : "").andFormula(of(value));
    }

    /** An angle with ≈ before it where it is rounded. */
    Prose markedAngle(RealValue value) {
        return Prose.of(isRoundedAngle(value) ? ROUNDED : "").andFormula(angle(value));
    }

    /** Whether what is shown isn't the value itself. */
    boolean isRounded(RealValue value) {
        return value.exact().filter(this::isShort).isEmpty() && !value.decimal(style.digits()).exact();
    }

    boolean isRoundedAngle(RealValue value) {
        return style.angles() == Style.Angles.RADIANS ? isRounded(value)
                : value.exact().flatMap(PiMultiple::of).isEmpty();
    }

    private boolean isShort(Formula exact) {
        return PlainText.UNICODE.write(exact).length() <= style.digits() + ROOM;
    }

    private Formula decimal(RealValue value) {
        return Formulas.decimal(value.decimal(style.digits()).text());
    }
}
