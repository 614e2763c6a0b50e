package org.pofk.claim;

import org.pofk.exact.ComplexBall;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/** Angles as exact numbers; which of many equal ones is chosen by a guess, which changes no direction. */
final class Angles {
    private static final int BITS = 64;
    private static final double NEAR = 1e-9;

    private Angles() {
    }

    /** An angle of a number that isn't zero, by its tangent or the inverse of it, whichever is small. */
    static Quantity of(Quantity number) {
        ComplexBall ball = number.enclose(BITS);
        double x = ball.real().middle().approximate();
        double y = ball.imaginary().middle().approximate();
        Quantity real = number.realPart();
        Quantity imaginary = number.imaginaryPart();
        if (Math.abs(x) >= Math.abs(y)) {
            Quantity angle = imaginary.dividedBy(real).arctangent();
            return x < 0 ? angle.plus(Quantity.pi()) : angle;
        }
        Quantity quarter = Quantity.pi().dividedBy(Quantity.of(2));
        Quantity angle = quarter.minus(real.dividedBy(imaginary).arctangent());
        return y < 0 ? angle.minus(Quantity.pi()) : angle;
    }

    /** The angle with whole turns added that lies nearest to another. */
    static Quantity near(Quantity angle, Quantity other) {
        double turns = (approximate(other) - approximate(angle)) / (2 * Math.PI);
        long whole = Math.round(turns);
        return whole == 0 ? angle : angle.plus(Quantity.pi().times(Quantity.of(2 * whole)));
    }

    /**
     * The phase with whole turns added that its author would write: the nearest to the stated one, or where that is far
     * off it and past half a turn, which the stated one isn't, the one of at most half a turn.
     */
    static Quantity phaseLike(Quantity stated, Quantity phase) {
        Quantity near = near(phase, stated);
        double written = approximate(stated);
        double turned = approximate(near);
        boolean isPast = Math.abs(written) <= Math.PI && Math.abs(turned) > Math.PI;
        return isPast && Math.abs(turned - written) > Math.PI / 2 ? near(phase, Quantity.ZERO) : near;
    }

    private static double approximate(Quantity real) {
        return real.enclose(BITS).real().middle().approximate();
    }

    /** e^(i angle); a power of i where the angle is proved to be a multiple of a quarter turn. */
    static Quantity unit(Quantity angle) {
        double quarters = approximate(angle) / (Math.PI / 2);
        long whole = Math.round(quarters);
        if (Math.abs(quarters - whole) < NEAR && angle.decimals().isEmpty()
                && angle.minus(Quantity.pi().times(Quantity.of(whole)).dividedBy(Quantity.of(2))).isZero()
                == Decision.YES) {
            return Quantity.i().pow((int) Math.floorMod(whole, 4L));
        }
        return Quantity.i().times(angle).exponential();
    }
}
