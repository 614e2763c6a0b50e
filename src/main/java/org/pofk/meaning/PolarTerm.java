package org.pofk.meaning;

import java.util.List;
import org.pofk.text.Span;

/**
 * coefficient · k^power · base^k · cos(angle · k + phase). Canonical form: where the angle is zero as written so is
 * the phase; the base isn't zero.
 */
record PolarTerm(Scalar coefficient, int power, Scalar base, Scalar angle, Scalar phase, Span span) {
    /** The weight up to which bases are looked into. */
    private static final int LONGEST_APART = 16;

    static PolarTerm constant(Scalar value, Span span) {
        return new PolarTerm(value, 0, Scalars.of(1), Scalars.of(0), Scalars.of(0), span);
    }

    /**
     * Everything but the coefficient, as it is written: terms of one shape can be taken together. Real bases in decimals
     * at two places may stand for two near numbers, and stay apart.
     */
    List<Object> shape() {
        return List.of(atFaceValue(), oscillates() ? List.of() : decimals(base));
    }

    /** The same wherever the decimals stand. */
    List<Object> atFaceValue() {
        return List.of(power, named(base), named(angle), named(phase));
    }

    private static List<Written> decimals(Scalar scalar) {
        return scalar.rest() == Scalars.NO_REST || scalar.weight() > LONGEST_APART ? List.of()
                : scalar.quantity().decimals();
    }

    private static List<Object> named(Scalar scalar) {
        return List.<Object>of(scalar.factor(), scalar.rest());
    }

    boolean oscillates() {
        return !angle.isPlainZero();
    }

    /** True for coefficient · k^power. */
    boolean isMonomial() {
        return base.isPlainOne() && !oscillates();
    }

    PolarTerm with(Scalar newCoefficient) {
        return new PolarTerm(newCoefficient, power, base, angle, phase, span);
    }

    PolarTerm at(Span newSpan) {
        return new PolarTerm(coefficient, power, base, angle, phase, newSpan);
    }
}
