package org.pofk.schedule;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.answer.Band;
import org.pofk.exact.Ball;
import org.pofk.steps.FixedPointState;

/**
 * A band in whole units of 2^−{@value FixedPointState#BITS}: for multiples of the unit it says exactly what the band
 * says.
 *
 * @param low  the least unit in it
 * @param high the largest
 */
record FixedPointBand(Optional<BigInteger> low, Optional<BigInteger> high) {

    static FixedPointBand of(Band band) {
        return new FixedPointBand(band.low().map(bound -> FixedPointState.floor(bound.negate()).negate()),
                band.high().map(FixedPointState::floor));
    }

    /** All numbers of a ball with its radius widened, none of them, or that isn't told. */
    Band.Relation of(Ball ball, BigInteger widened) {
        BigInteger lower = ball.center().subtract(ball.radius()).subtract(widened);
        BigInteger upper = ball.center().add(ball.radius()).add(widened);
        if (low.stream().anyMatch(bound -> upper.compareTo(bound) < 0)
                || high.stream().anyMatch(bound -> lower.compareTo(bound) > 0)) {
            return Band.Relation.OUTSIDE;
        }
        return low.stream().allMatch(bound -> lower.compareTo(bound) >= 0)
                && high.stream().allMatch(bound -> upper.compareTo(bound) <= 0)
                ? Band.Relation.INSIDE : Band.Relation.EITHER;
    }
}
