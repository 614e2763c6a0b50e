package org.pofk.meaning;

import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * A written decimal beside the value it should have. Certified.
 *
 * @param digits the right value to the last place written or carried, and further where it takes more to see how the
 *               two differ; in the author's way, with an exponent or a percent sign where he writes one
 */
public record WrittenNumber(Written written, Quantity right, Fit fit, String digits) {

    /** Half a unit is inclusive: a tie is right. {@code right} is real; one that isn't is wrong. */
    public static WrittenNumber of(Written written, Quantity right) {
        Fit fit = fit(written, right);
        return new WrittenNumber(written, right, fit, RightDigits.of(written, right, fit));
    }

    /** Right: with the value it stands for that is nearest to a real number, itself where it stands for that. */
    static WrittenNumber nearest(Written written, Quantity real) {
        WrittenNumber number = of(written, real);
        if (number.fit == Fit.RIGHT) {
            return number;
        }
        boolean isAbove = real.minus(Quantity.of(written.value())).sign().filter(sign -> sign > 0).isPresent();
        Rational end = isAbove ? written.value().plus(written.halfUnit()) : written.value().minus(written.halfUnit());
        return new WrittenNumber(written, Quantity.of(end), Fit.RIGHT, written.text());
    }

    private static Fit fit(Written written, Quantity right) {
        if (within(written, right) != Decision.NO) {
            return Fit.RIGHT;
        }
        return isCutOff(written, right) ? Fit.CUT_OFF : Fit.WRONG;
    }

    /** Whether a value is within half a unit of the last place, inclusive. */
    static Decision within(Written written, Quantity right) {
        return Condition.within(0, written, right).holds();
    }

    /** value ≤ |right| < value + last place, and the sign right where the value has one. */
    private static boolean isCutOff(Written written, Quantity right) {
        Optional<Integer> sign = right.sign();
        if (right.isReal() != Decision.YES || sign.isEmpty() || sign.get() < 0 && !written.value().isZero()) {
            return false;
        }
        Quantity beyond = (sign.get() < 0 ? right.negate() : right).minus(Quantity.of(written.value()));
        return beyond.sign().filter(s -> s >= 0).isPresent()
                && Quantity.of(written.lastPlace()).minus(beyond).sign().filter(s -> s > 0).isPresent();
    }
}
