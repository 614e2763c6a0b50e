package org.pofk.steps;

import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;
import org.pofk.modes.RealValue;

/**
 * The modes of a closed form added up at given steps, from the enclosures of their constants: bases, amplitudes,
 * angles and phases as they are shown. Certified.
 */
public final class ModeValues {
    private static final int FIRST_BITS = 128;
    private static final int MOST_BITS = 4096;
    /** Enough to tell a wrong constant from a right one. */
    private static final int WANTED_BITS = 64;

    private final List<Mode> modes;
    private final Rational unit;

    private ModeValues(List<Mode> modes, Rational unit) {
        this.modes = modes;
        this.unit = unit;
    }

    public static ModeValues of(ClosedForm closedForm) {
        return new ModeValues(closedForm.modes(), Rational.ONE);
    }

    /** The same over the k-th power of a positive number. */
    public ModeValues inUnitsOf(Rational positive) {
        return new ModeValues(modes, positive);
    }

    /** No sum at k = 0, 1, … is farther than this from the value in that place. */
    public Rational farthestFrom(List<Rational> exact) {
        int bits = FIRST_BITS;
        while (true) {
            Rational farthest = farthestFrom(exact, bits);
            if (farthest.compareTo(Rational.TWO.pow(-WANTED_BITS)) <= 0 || bits >= MOST_BITS) {
                return farthest;
            }
            bits *= 2;
        }
    }

    private Rational farthestFrom(List<Rational> exact, int bits) {
        Rational farthest = Rational.ZERO;
        for (int k = 0; k < exact.size(); k++) {
            Ball sum = sum(k, bits);
            Rational value = exact.get(k);
            farthest = Rational.max(farthest, Rational.max(sum.upper().minus(value), value.minus(sum.lower())));
        }
        return farthest;
    }

    /** The sum at one step. */
    public Enclosed at(int k) {
        return Enclosed.raising(bits -> sum(k, Math.max(bits, 0)));
    }

    private Ball sum(int k, int bits) {
        Ball sum = Ball.of(Rational.ZERO, bits);
        for (Mode mode : modes) {
            sum = sum.plus(mode.accept(new AtStep(k, unit, bits)));
        }
        return sum;
    }

    /** A mode's value at k. */
    private record AtStep(int k, Rational unit, int bits) implements Mode.Visitor<Ball> {

        @Override
        public Ball impulse(Mode.Impulse impulse) {
            return k == impulse.at() ? ball(impulse.value()).times(Ball.of(unit.pow(-k), bits)) : Ball.of(Rational.ZERO, bits);
        }

        @Override
        public Ball geometric(Mode.Geometric geometric) {
            return k < geometric.power()
                    ? Ball.of(Rational.ZERO, bits)
                    : ball(geometric.coefficient()).times(binomial(geometric.power()))
                            .times(power(geometric.base(), k - geometric.power()));
        }

        @Override
        public Ball oscillating(Mode.Oscillating oscillating) {
            int steps = k - oscillating.power();
            return steps < 0
                    ? Ball.of(Rational.ZERO, bits)
                    : ball(oscillating.amplitude()).times(binomial(oscillating.power()))
                            .times(power(oscillating.modulus(), steps))
                            .times(ball(oscillating.angle()).times(steps).plus(ball(oscillating.phase())).cos());
        }

        /** base^steps over unit^k. */
        private Ball power(RealValue base, int steps) {
            return unit.isOne() ? ball(base).pow(steps)
                    : ball(base).times(Ball.of(unit.inverse(), bits)).pow(steps)
                            .times(Ball.of(unit.pow(steps - k), bits));
        }

        private Ball ball(RealValue value) {
            return value.enclosure().enclose(bits).roundedTo(bits);
        }

        private Ball binomial(int power) {
            Rational binomial = Rational.ONE;
            for (int i = 0; i < power; i++) {
                binomial = binomial.times(Rational.of(k - i, i + 1));
            }
            return Ball.of(binomial, bits);
        }
    }
}
