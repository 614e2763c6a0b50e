package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;

/**
 * How an output approaches its long run: by its slowest decaying mode, and from which step on it is proved to stay
 * close. Certified.
 *
 * @param slowest the largest modulus below one of a pole; empty when no mode decays and the long run is there once the
 *                impulses are over
 * @param tied    how many modes have that modulus or one that agrees with it to {@value #TIED_BITS} bits; a pair counts
 *                once. Equal moduli can't be told apart by looking closer
 * @param power   the highest power of k that one of these comes with
 * @param digits  of the promise below
 * @param from    |p(k) − long run| ≤ 10^−digits for every k from here on: a bound from the amplitudes, so it may hold
 *                earlier
 */
public record Settling(Optional<Enclosed> slowest, int tied, int power, int digits, BigInteger from) {
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
        List<DecayingMode> tied = slowest.map(most -> decaying.stream()
                .filter(each -> each.compareModulus(most, TIED_BITS) == 0).toList()).orElse(List.of());
        int power = tied.stream().mapToInt(DecayingMode::power).max().orElse(0);
        return new Settling(slowest.map(DecayingMode::modulus), tied.size(), power, digits, from);
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
