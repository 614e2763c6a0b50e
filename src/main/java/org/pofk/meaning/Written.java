package org.pofk.meaning;

import java.math.BigDecimal;
import org.pofk.exact.Rational;
import org.pofk.text.Span;

/**
 * A decimal in a claim: it stands for every number within half a unit of its last place. Two decimals at different
 * places of a text are two numbers, even when they read the same; which one this is, its place says.
 *
 * @param text      the digits as written, without a sign
 * @param value     what the digits denote exactly
 * @param lastPlace the unit of the last place, written or carried: 10^−4 for {@code 0.4508}
 */
public record Written(String text, Rational value, Rational lastPlace, Span span) {

    /** The decimal at a place of a text, as precise as its last place says, or as its author carries numbers. */
    public static Written of(String text, Span span, Precision precision) {
        BigDecimal digits = new BigDecimal(text);
        Rational value = Rational.of(digits);
        Rational written = Rational.of(10).pow(-digits.scale());
        return new Written(text, value, precision.carried()
                .map(carried -> Rational.min(written, carried.lastPlace(value))).orElse(written), span);
    }

    /** True when a number lies within half a unit of the last place. */
    public Rational halfUnit() {
        return lastPlace.times(Rational.HALF);
    }
}
