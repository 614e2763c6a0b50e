package org.pofk.exact;

import java.util.function.BinaryOperator;
import java.util.function.IntFunction;
import java.util.function.UnaryOperator;

/**
 * A real number known as closely as asked: the certified way from an algebraic number to its decimals.
 * The enclosure need not be nested from one call to the next; each contains the number.
 */
@FunctionalInterface
public interface Enclosed {
    /** A ball that contains the number, its radius at most 2^−bits times max(1, |number|). */
    Ball enclose(int bits);

    /** A rational number. */
    static Enclosed of(Rational value) {
        return bits -> Ball.of(value, Math.max(bits, 0));
    }

    /** π. */
    static Enclosed pi() {
        return bits -> Ball.pi(Math.max(bits, 0));
    }

    /**
     * The number that {@code atPrecision} encloses ever more closely as its argument grows: asked again with more bits
     * until the goal is met. A {@link NotSeparatedException} counts as too few bits, so a divisor that is exactly zero
     * has to be excluded by the caller; it ends in an {@link AssertionError}. Keeps the finest ball found.
     */
    static Enclosed raising(IntFunction<Ball> atPrecision) {
        Raising<Ball> raising = new Raising<>(atPrecision, Ball::isWithin);
        return bits -> {
            Ball ball = raising.enclose(bits);
            // an exact ball may come at a coarse scale, on which what is computed from it would stay as coarse
            return ball.roundedTo(Math.max(bits, ball.scale()));
        };
    }

    /** f of this number. */
    default Enclosed map(UnaryOperator<Ball> f) {
        return raising(bits -> f.apply(enclose(bits)));
    }

    /** f of two numbers. */
    static Enclosed combine(Enclosed a, Enclosed b, BinaryOperator<Ball> f) {
        return raising(bits -> f.apply(a.enclose(bits), b.enclose(bits)));
    }

    default Enclosed negate() {
        return bits -> enclose(bits).negate();
    }

    default Enclosed plus(Enclosed other) {
        return combine(this, other, Ball::plus);
    }

    default Enclosed times(Enclosed other) {
        return combine(this, other, Ball::times);
    }

    /** This over a number that isn't zero. */
    default Enclosed dividedBy(Enclosed other) {
        return combine(this, other, Ball::dividedBy);
    }
}
