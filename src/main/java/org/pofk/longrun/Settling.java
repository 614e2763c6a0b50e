package org.pofk.longrun;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;

/**
 * How an output approaches its long run: by its slowest decaying mode, and from which step on it is proved to stay
 * close. Certified.
 *
 * @param slowest the largest modulus below one of a pole; empty when no mode decays and the long run is there once the
 *                impulses are over
 * @param exactly that modulus where it is known to be rational
 * @param tied    how many modes have that modulus or one that agrees with it to {@value #TIED_BITS} bits; a pair counts
 *                once. Equal moduli can't be told apart by looking closer
 * @param power   the highest power of k that one of these comes with
 * @param period  in how many steps that mode turns round once: two for a negative base; empty for a positive one, and where
 *                several modes are tied
 * @param digits  of the promise below
 * @param from    |p(k) − long run| ≤ 10^−digits for every k from here on: a bound from the amplitudes, so it may hold
 *                earlier
 */
public record Settling(Optional<Enclosed> slowest, Optional<Rational> exactly, int tied, int power, Optional<Enclosed> period, int digits,
        BigInteger from) {
    static final int TIED_BITS = 256;

    /** Empty when there is neither a limit nor a cycle. */
    public static Optional<Settling> of(ClosedForm closedForm, LongRun longRun, int digits) {
        return longRun.accept(new IsReached()) ? Optional.of(of(closedForm, digits)) : Optional.empty();
    }

    private static Settling of(ClosedForm closedForm, int digits) {
        List<DecayingMode> decaying = DecayingMode.of(closedForm);
        BigInteger from = DecayBound.of(decaying, digits).settledFrom(
                BigInteger.valueOf(closedForm.withoutImpulsesFrom()));
        Optional<DecayingMode> slowest = decaying.stream().max((a, b) -> a.compareModulus(b, TIED_BITS));
        List<Mode> modes = DecayingMode.decaying(closedForm);
        List<Integer> tied = IntStream.range(0, decaying.size()).filter(i -> slowest.stream().anyMatch(most ->
                decaying.get(i).compareModulus(most, TIED_BITS) == 0)).boxed().toList();
        int power = tied.stream().mapToInt(i -> decaying.get(i).power()).max().orElse(0);
        boolean isOne = tied.stream().map(i -> modes.get(i).pole()).distinct().count() == 1;
        return new Settling(slowest.map(DecayingMode::modulus), isOne ? modes.get(tied.get(0)).accept(new Modulus())
                : Optional.empty(), tied.size(), power,
                isOne ? modes.get(tied.get(0)).accept(new Period()) : Optional.empty(), digits, from);
    }

    /** After how many steps the slowest mode is half as large, powers of k left aside: ln 2 / −ln modulus. */
    public Optional<Enclosed> halfLife() {
        return slowest.map(modulus -> Enclosed.raising(bits -> {
            // what is known more closely would make the logarithm as long
            Ball ball = modulus.enclose(bits).roundedTo(bits);
            return Ball.of(2, bits).log().dividedBy(ball.log().negate());
        }));
    }

    /** Where it is rational. */
    private static final class Modulus implements Mode.Visitor<Optional<Rational>> {
        @Override
        public Optional<Rational> impulse(Mode.Impulse impulse) {
            throw new AssertionError("impulses don't decay: " + impulse);
        }

        @Override
        public Optional<Rational> geometric(Mode.Geometric mode) {
            return mode.base().rational().map(Rational::abs);
        }

        @Override
        public Optional<Rational> oscillating(Mode.Oscillating mode) {
            return mode.modulus().rational();
        }
    }

    /** 2π over the angle. */
    private static final class Period implements Mode.Visitor<Optional<Enclosed>> {
        private static final int BITS = 64;

        @Override
        public Optional<Enclosed> impulse(Mode.Impulse impulse) {
            throw new AssertionError("impulses don't decay: " + impulse);
        }

        @Override
        public Optional<Enclosed> geometric(Mode.Geometric mode) {
            return mode.base().enclosure().enclose(BITS).isNegative() ? Optional.of(Enclosed.of(Rational.TWO))
                    : Optional.empty();
        }

        @Override
        public Optional<Enclosed> oscillating(Mode.Oscillating mode) {
            return Optional.of(Enclosed.pi().times(Enclosed.of(Rational.TWO)).dividedBy(mode.angle().enclosure()));
        }
    }

    /** Enough digits to say something about a small long run: a thousandth of its smallest value other than zero. */
    public static int digitsFor(LongRun longRun, int atLeast) {
        Optional<Rational> smallest = LongRunValues.of(longRun).stream().filter(value -> !value.isZero())
                .map(Rational::abs).min(Rational::compareTo);
        int digits = atLeast;
        while (smallest.isPresent() && Rational.of(1000).compareTo(smallest.get().times(Rational.of(10).pow(digits))) > 0) {
            digits++;
        }
        return digits;
    }

    /** A cycle too long to list is approached like a short one. */
    private static final class IsReached implements LongRun.Visitor<Boolean> {
        @Override
        public Boolean limit(LongRun.Limit limit) {
            return true;
        }

        @Override
        public Boolean cycle(LongRun.Cycle cycle) {
            return true;
        }

        @Override
        public Boolean none(LongRun.None none) {
            return none.reason() == LongRun.Reason.CYCLE_TOO_LONG;
        }
    }
}
