package org.pofk.claim;

import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.NotSeparatedException;
import org.pofk.meaning.ExponentialSum.Term;
import org.pofk.meaning.Quantity;

/**
 * Terms of a formula in k that stand for one pole or conjugate pair: at face value their bases, turned by their angles,
 * are the same or each other's conjugates, as far as a guess tells.
 *
 * @param terms in the order of writing
 */
record ClaimedMode(List<ClaimedTerm> terms) {
    private static final int BITS = 64;

    ClaimedMode {
        terms = List.copyOf(terms);
    }

    /** How a term is written. */
    enum Shape {
        /** c r^k with a real base. */
        REAL,
        /** c r^k cos(θk + φ). */
        OSCILLATION,
        /** c λ^k with a base that isn't real. */
        COMPLEX
    }

    /** One term with its pole, the base turned by the angle. */
    record ClaimedTerm(Term term, Shape shape, Quantity pole, ComplexBall atFaceValue, ComplexBall spread) {
        static ClaimedTerm of(Term term) {
            Quantity pole = Wave.of(term).base();
            ComplexBall atFaceValue = pole.enclose(BITS);
            return new ClaimedTerm(term, shape(term), pole, atFaceValue, spread(pole, atFaceValue));
        }

        /** The face value where a divisor may be zero: it is only for guesses. */
        private static ComplexBall spread(Quantity pole, ComplexBall atFaceValue) {
            try {
                return pole.spread(BITS);
            } catch (NotSeparatedException dividedByZero) {
                return atFaceValue;
            }
        }

        private static Shape shape(Term term) {
            return term.oscillates() ? Shape.OSCILLATION
                    : term.base().conjugate() == term.base() ? Shape.REAL : Shape.COMPLEX;
        }

        /** Whether it lies below the real axis. */
        boolean isBelow() {
            return atFaceValue.imaginary().isNegative();
        }

        /** Whether two real terms are for the same power of k: written apart, they may stand for two near poles. */
        boolean isRival(ClaimedTerm other) {
            return shape == Shape.REAL && other.shape == Shape.REAL && term.power() == other.term.power();
        }

        /** How far a number, or its conjugate where that is nearer, is from all that the decimals allow. */
        double distance(ComplexBall number) {
            ComplexBall near = isBelow() ? number.conjugate() : number;
            return Math.hypot(beyond(near.real(), spread.real()), beyond(near.imaginary(), spread.imaginary()));
        }

        /** The same from the face value. */
        double distanceAtFaceValue(ComplexBall number) {
            ComplexBall near = isBelow() ? number.conjugate() : number;
            return Math.hypot(near.real().minus(atFaceValue.real()).middle().approximate(),
                    near.imaginary().minus(atFaceValue.imaginary()).middle().approximate());
        }

        private static double beyond(Ball number, Ball allowed) {
            double center = number.minus(allowed).middle().approximate();
            double radius = allowed.upper().minus(allowed.middle()).approximate();
            return Math.max(0, Math.abs(center) - radius);
        }
    }

    /** How far a number is from the first term's pole, as the decimals allow. */
    double distance(ComplexBall number) {
        return terms.get(0).distance(number);
    }

    double distanceAtFaceValue(ComplexBall number) {
        return terms.get(0).distanceAtFaceValue(number);
    }
}
