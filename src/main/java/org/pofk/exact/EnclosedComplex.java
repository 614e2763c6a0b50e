package org.pofk.exact;

import java.util.function.BinaryOperator;
import java.util.function.IntFunction;
import java.util.function.UnaryOperator;

/** A complex number known as closely as asked; see {@link Enclosed}. */
@FunctionalInterface
public interface EnclosedComplex {
    /** A rectangle that contains the number, both radii at most 2^−bits · max(1, |number|). */
    ComplexBall enclose(int bits);

    static EnclosedComplex of(Enclosed real) {
        return bits -> ComplexBall.of(real.enclose(bits));
    }

    static EnclosedComplex of(Rational value) {
        return of(Enclosed.of(value));
    }

    /** As {@link Enclosed#raising}. */
    static EnclosedComplex raising(IntFunction<ComplexBall> atPrecision) {
        Raising<ComplexBall> raising = new Raising<>(atPrecision, ComplexBall::isWithin);
        return bits -> {
            ComplexBall ball = raising.enclose(bits);
            return ball.roundedTo(Math.max(bits, ball.scale()));
        };
    }

    /** f of this number. */
    default EnclosedComplex map(UnaryOperator<ComplexBall> f) {
        return raising(bits -> f.apply(enclose(bits)));
    }

    /** f of two numbers. */
    static EnclosedComplex combine(EnclosedComplex a, EnclosedComplex b, BinaryOperator<ComplexBall> f) {
        return raising(bits -> f.apply(a.enclose(bits), b.enclose(bits)));
    }

    default EnclosedComplex conjugate() {
        return bits -> enclose(bits).conjugate();
    }

    default Enclosed realPart() {
        return Enclosed.raising(bits -> enclose(bits).real());
    }

    default Enclosed imaginaryPart() {
        return Enclosed.raising(bits -> enclose(bits).imaginary());
    }

    default Enclosed modulus() {
        return Enclosed.raising(bits -> enclose(bits).modulus());
    }

    /**
     * The angle in (−π, π] of a number that isn't zero. The caller has decided before whether the number is real: one
     * on the negative axis, known only by a rectangle around it, gives angles that straddle π and never −π.
     */
    default Enclosed argument() {
        return Enclosed.raising(bits -> enclose(bits).argument());
    }
}
