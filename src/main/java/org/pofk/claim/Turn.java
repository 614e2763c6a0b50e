package org.pofk.claim;

import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/**
 * How a base moves as it is raised to powers: where it lies with respect to the unit circle, and after how many steps
 * its power is positive again. Decided exactly; the order is only looked for where it is needed.
 *
 * @param order 1 for a positive number, 2 for a negative one, n for a primitive n-th root of unity; 0 where none of
 *              these is proved
 */
record Turn(Place place, int order) {
    private static final int BITS = 96;
    private static final int LARGEST_ORDER = 360;
    private static final double NEAR = 1e-9;

    /** Inside the unit circle, on it, outside, or not told from it. */
    enum Place { INSIDE, ON, OUTSIDE, NOT_DECIDED }

    static Turn of(Wave wave) {
        Quantity base = wave.base();
        ComplexBall ball = base.enclose(BITS);
        if (isReal(base, ball)) {
            Ball size = ball.real().abs();
            Quantity beyond = ball.real().isNegative() ? base.plus(Quantity.ONE) : base.minus(Quantity.ONE);
            return new Turn(place(size, beyond), ball.real().isNegative() ? 2 : ball.real().isPositive() ? 1 : 0);
        }
        Place place = wave.radius().isPresent()
                ? Turn.of(new Wave(wave.coefficient(), 0, wave.radius().get(), Optional.empty())).place
                : place(ball.modulus(), base.times(base.conjugate()).minus(Quantity.ONE));
        return new Turn(place, place == Place.ON ? order(base, ball) : 0);
    }

    private static boolean isReal(Quantity base, ComplexBall ball) {
        return base.conjugate() == base
                || ball.imaginary().containsZero() && base.imaginaryPart().isZero() == Decision.YES;
    }

    private static Place place(Ball size, Quantity beyond) {
        Ball excess = size.minus(Ball.of(1, size.scale()));
        if (!excess.containsZero()) {
            return excess.isNegative() ? Place.INSIDE : Place.OUTSIDE;
        }
        return beyond.isZero() == Decision.YES ? Place.ON : Place.NOT_DECIDED;
    }

    /** Guessed from the angle, proved by the power. */
    private static int order(Quantity base, ComplexBall ball) {
        double turns = Math.atan2(ball.imaginary().middle().approximate(), ball.real().middle().approximate())
                / (2 * Math.PI);
        for (int n = 3; n <= LARGEST_ORDER; n++) {
            if (Math.abs(n * turns - Math.rint(n * turns)) < NEAR) {
                return base.pow(n).minus(Quantity.ONE).isZero() == Decision.YES ? n : 0;
            }
        }
        return 0;
    }
}
