package org.pofk.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Rational;

/** A stretch of numbers with ticks at the multiples of a round step (1, 2 or 5 times a power of ten). Exact. */
record Axis(Rational from, Rational to, Rational step) {
    private static final Rational SMALLEST_PLAIN = Rational.of(1, 10_000);
    private static final Rational LARGEST_PLAIN = Rational.of(100_000);
    private static final List<Rational> ROUND = List.of(Rational.ONE, Rational.TWO, Rational.of(5), Rational.of(10));

    Axis {
        if (from.compareTo(to) >= 0 || step.signum() <= 0) {
            throw new IllegalArgumentException("no axis from " + from + " to " + to + " by " + step);
        }
    }

    /** From the multiple of a round step at or below the lowest value to the one at or above the highest. */
    static Axis around(Rational lowest, Rational highest, int mostIntervals) {
        Rational high = highest.equals(lowest) ? lowest.plus(sizeOf(lowest)) : highest;
        Rational step = roundAtLeast(high.minus(lowest).dividedBy(Rational.of(mostIntervals)));
        Axis axis = spanning(lowest, high, step);
        return axis.intervals() <= mostIntervals + 1 ? axis : spanning(lowest, high, nextAbove(step));
    }

    /** Exactly between two values that differ. */
    static Axis between(Rational from, Rational to, int mostIntervals) {
        return new Axis(from, to, roundAtLeast(to.minus(from).dividedBy(Rational.of(mostIntervals))));
    }

    private static Rational sizeOf(Rational value) {
        return value.isZero() ? Rational.ONE : value.abs();
    }

    private static Axis spanning(Rational lowest, Rational highest, Rational step) {
        return new Axis(below(lowest, step), below(highest.negate(), step).negate(), step);
    }

    private static Rational below(Rational value, Rational step) {
        return Rational.of(value.dividedBy(step).floor()).times(step);
    }

    private int intervals() {
        return to.minus(from).dividedBy(step).floor().intValueExact();
    }

    /** The least of 1, 2, 5 times a power of ten that is at least a positive number. */
    static Rational roundAtLeast(Rational positive) {
        Rational power = powerOfTenAtMost(positive);
        return ROUND.stream().map(power::times).filter(round -> round.compareTo(positive) >= 0).findFirst()
                .orElseThrow();
    }

    private static Rational nextAbove(Rational round) {
        return roundAtLeast(round.times(Rational.of(11, 10)));
    }

    /** The largest power of ten that is at most a positive number. */
    static Rational powerOfTenAtMost(Rational positive) {
        Rational ten = Rational.of(10);
        int exponent = positive.numerator().toString().length() - positive.denominator().toString().length();
        Rational power = ten.pow(exponent);
        return power.compareTo(positive) > 0 ? ten.pow(exponent - 1) : power;
    }

    List<Rational> ticks() {
        List<Rational> ticks = new ArrayList<>();
        for (Rational tick = below(from.negate(), step).negate(); tick.compareTo(to) <= 0; tick = tick.plus(step)) {
            ticks.add(tick);
        }
        return ticks;
    }

    /** The power of ten that the texts of ticks leave out: 0 where they are short without. */
    int exponent() {
        Rational largest = Rational.max(from.abs(), to.abs());
        boolean isPlain = step.compareTo(SMALLEST_PLAIN) >= 0 && largest.compareTo(LARGEST_PLAIN) < 0;
        Rational power = powerOfTenAtMost(largest);
        return isPlain ? 0 : power.numerator().toString().length() - power.denominator().toString().length();
    }

    /** A tick in decimals over 10^exponent, all of them with as many places: {@code 0.10}. */
    String text(Rational tick) {
        Rational unit = Rational.of(10).pow(exponent());
        return tick.isZero() ? "0" : ChartNumber.minus(new BigDecimal(tick.dividedBy(unit).numerator())
                .divide(new BigDecimal(tick.dividedBy(unit).denominator()), places(step.dividedBy(unit)),
                        RoundingMode.UNNECESSARY).toPlainString());
    }

    /** Behind the point, for multiples of a round number. */
    private static int places(Rational round) {
        int places = 0;
        while (!round.times(Rational.of(10).pow(places)).isInteger()) {
            places++;
        }
        return places;
    }

    /** Where a value lies between the ends: 0 at {@code from}, 1 at {@code to}. */
    Rational part(Rational value) {
        return value.minus(from).dividedBy(to.minus(from));
    }
}
