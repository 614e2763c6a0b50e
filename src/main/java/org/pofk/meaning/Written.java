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

    /**
     * The decimal of a text: {@code 0.4508}, {@code 1.2e-3}, {@code 43.5%}; without a sign. Its last place is that of
     * the last digit, or the finer one carried. A {@link NumberFormatException} for anything else.
     */
    public static Written of(String text, Span span, Precision precision) {
        boolean percent = text.endsWith("%");
        BigDecimal digits = new BigDecimal(percent ? text.substring(0, text.length() - 1).strip() : text);
        Rational scale = percent ? Rational.of(1, 100) : Rational.ONE;
        Rational value = Rational.of(digits).times(scale);
        Rational written = Rational.of(10).pow(-digits.scale()).times(scale);
        Rational lastPlace = precision.carried().map(carried -> Rational.min(written, carried.lastPlace(value)))
                .orElse(written);
        return new Written(text, value, lastPlace, span);
    }

    /** The lower (−1) or the upper (1) half of the numbers this stands for. */
    Written part(int side) {
        Rational quarter = lastPlace.times(Rational.of(side, 4));
        return new Written(text, value.plus(quarter), halfUnit(), span);
    }

    /** Half a unit of the last place. */
    public Rational halfUnit() {
        return lastPlace.times(Rational.HALF);
    }
}
