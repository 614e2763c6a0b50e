package org.pofk.meaning;

import org.pofk.exact.Rational;

/**
 * How precisely an author carries numbers, {@code 4 significant} or {@code 4 decimals}: where zeros were left off at
 * the end of a decimal, it is as precise as that.
 */
public record Carried(int count, Unit unit) {

    /** What is counted. */
    public enum Unit { SIGNIFICANT, DECIMALS }

    /** The place of the last digit carried for a number of this size: 10^−count, or count digits from the first. */
    public Rational lastPlace(Rational value) {
        if (unit == Unit.DECIMALS) {
            return Rational.of(10).pow(-count);
        }
        return value.isZero() ? Rational.ONE : Rational.of(10).pow(magnitude(value.abs()) + 1 - count);
    }

    /** e with 10^e ≤ value < 10^(e+1). */
    static int magnitude(Rational value) {
        int estimate = (int) Math.floor((value.numerator().bitLength() - value.denominator().bitLength()) * 0.30103);
        while (Rational.of(10).pow(estimate + 1).compareTo(value) <= 0) {
            estimate++;
        }
        while (Rational.of(10).pow(estimate).compareTo(value) > 0) {
            estimate--;
        }
        return estimate;
    }
}
