package org.pofk.exact;

import java.math.BigInteger;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import java.util.concurrent.atomic.AtomicReferenceArray;

/**
 * π, arctan, the argument, cos and sin of balls. Certified: each is taken at the center with guard bits, in ball
 * arithmetic, and widened by the radius times a bound on the derivative. O(bits) operations on numbers of that length.
 */
final class ElementaryFunctions {
    /** Times the argument is halved before a series is summed. */
    private static final int HALVINGS = 8;
    private static final int GUARD = 2 * HALVINGS + 16;

    /** arctan(j / 64) for j = 0 … 64, each as finely as it was needed so far. */
    private static final int STEPS = 64;
    private static final AtomicReferenceArray<Ball> FINEST_ARCTAN = new AtomicReferenceArray<>(STEPS + 1);

    private static final AtomicReference<Ball> FINEST_PI = new AtomicReference<>(machin(256));

    private ElementaryFunctions() {
    }

    static Ball pi(int scale) {
        Ball known = FINEST_PI.get();
        if (known.scale() < scale + 4) {
            known = machin(scale + 64);
            FINEST_PI.set(known);
        }
        return known.roundedTo(scale);
    }

    /** π = 16 arctan(1/5) − 4 arctan(1/239) (John Machin 1706). */
    private static Ball machin(int scale) {
        int fine = scale + GUARD;
        return arctanOfInverse(5, fine).times(16).minus(arctanOfInverse(239, fine).times(4)).roundedTo(scale);
    }

    /** Σ (−1)^i / ((2i+1) n^(2i+1)); each of its terms is off by less than two units, the rest by less than one. */
    private static Ball arctanOfInverse(int n, int scale) {
        BigInteger square = BigInteger.valueOf((long) n * n);
        BigInteger power = BigInteger.ONE.shiftLeft(scale).divide(BigInteger.valueOf(n));
        BigInteger sum = BigInteger.ZERO;
        int terms = 0;
        for (; power.signum() > 0; terms++) {
            BigInteger term = power.divide(BigInteger.valueOf(2L * terms + 1));
            sum = (terms & 1) == 0 ? sum.add(term) : sum.subtract(term);
            power = power.divide(square);
        }
        return new Ball(sum, BigInteger.valueOf(2L * terms + 2), scale);
    }

    static Ball arctan(Ball x) {
        if (x.scale() < 0) {
            return arctan(x.roundedTo(0));
        }
        int fine = x.scale() + GUARD;
        Ball center = Ball.exact(x.center(), x.scale()).roundedTo(fine);
        Ball value = center.center().abs().bitLength() <= fine
                ? arctanUpToOne(center)
                : quarterTurn(x.center().signum(), fine).minus(arctanUpToOne(Ball.of(1, fine).dividedBy(center)));
        return value.roundedTo(x.scale()).widened(x.radius());
    }

    private static Ball quarterTurn(int sign, int scale) {
        return pi(scale + 1).timesPowerOfTwo(-1).times(sign).roundedTo(scale);
    }

    /** |x| ≤ 1: arctan x = arctan t + arctan((x − t) / (1 + x t)), t the nearest of the kept steps. */
    private static Ball arctanUpToOne(Ball x) {
        int step = x.center().abs().multiply(BigInteger.valueOf(2L * STEPS)).shiftRight(x.scale()).add(BigInteger.ONE)
                .shiftRight(1).min(BigInteger.valueOf(STEPS)).intValueExact();
        if (step == 0) {
            return arctanSeries(x);
        }
        int signed = x.center().signum() * step;
        Ball rest = x.times(STEPS).minus(Ball.of(signed, x.scale()))
                .dividedBy(Ball.of(STEPS, x.scale()).plus(x.times(signed)));
        return arctanOfStep(step, x.scale()).times(x.center().signum()).plus(arctanSeries(rest)).roundedTo(x.scale());
    }

    private static Ball arctanOfStep(int step, int scale) {
        Optional<Ball> known = Optional.ofNullable(FINEST_ARCTAN.get(step)).filter(ball -> ball.scale() >= scale);
        Ball fine = known.orElseGet(() -> arctanByHalving(Ball.of(Rational.of(step, STEPS), scale + GUARD)));
        FINEST_ARCTAN.set(step, fine);
        return fine.roundedTo(scale);
    }

    /** |x| ≤ 1: arctan x = 2 arctan(x / (1 + √(1 + x²))), several times, then the series. */
    private static Ball arctanByHalving(Ball x) {
        Ball one = Ball.of(1, x.scale());
        Ball reduced = x;
        for (int i = 0; i < HALVINGS; i++) {
            reduced = reduced.dividedBy(one.plus(one.plus(reduced.times(reduced)).sqrt()));
        }
        return arctanSeries(reduced).timesPowerOfTwo(HALVINGS).roundedTo(x.scale());
    }

    /** Σ (−1)^i x^(2i+1) / (2i+1) for small |x|: alternating with falling terms. */
    private static Ball arctanSeries(Ball x) {
        Ball square = x.times(x);
        Ball power = x;
        Ball sum = x;
        for (int i = 1; magnitude(power).compareTo(BigInteger.TWO) > 0; i++) {
            power = power.times(square).negate();
            sum = sum.plus(power.dividedBy(2L * i + 1));
        }
        return sum.widened(magnitude(power));
    }

    private static BigInteger magnitude(Ball x) {
        return x.center().abs().add(x.radius());
    }

    static Ball argument(Ball y, Ball x) {
        int scale = Math.max(0, Math.max(x.scale(), y.scale()));
        Ball down = x.roundedTo(scale);
        Ball up = y.roundedTo(scale);
        if (up.center().abs().compareTo(down.center().abs()) > 0) {
            return quarterTurn(up.center().signum(), scale).minus(arctan(down.dividedBy(up)));
        }
        Ball slope = arctan(up.dividedBy(down));
        if (down.isPositive()) {
            return slope;
        }
        return up.isNegative() ? slope.minus(pi(scale)) : slope.plus(pi(scale));
    }

    static Ball sin(Ball x) {
        int scale = Math.max(0, x.scale());
        return cos(x.roundedTo(scale).minus(quarterTurn(1, scale)));
    }

    static Ball cos(Ball x) {
        if (x.scale() < 0) {
            return cos(x.roundedTo(0));
        }
        int fine = x.scale() + GUARD;
        Ball center = withinOneTurn(Ball.exact(x.center(), x.scale()).roundedTo(fine));
        Ball cosine = cosineSeries(center.timesPowerOfTwo(-HALVINGS).roundedTo(fine));
        for (int i = 0; i < HALVINGS; i++) {
            cosine = cosine.times(cosine).times(2).minus(Ball.of(1, fine));
        }
        return cosine.roundedTo(x.scale()).widened(x.radius());
    }

    /** x less a whole number of turns; any whole number is right, the nearest keeps the series short. */
    private static Ball withinOneTurn(Ball x) {
        int length = Math.max(0, x.center().bitLength() - x.scale());
        BigInteger twoPi = pi(x.scale() + length).timesPowerOfTwo(1).roundedTo(x.scale()).center();
        BigInteger turns = x.center().divide(twoPi);
        Ball all = pi(x.scale() + length + 2).timesPowerOfTwo(1);
        Ball whole = new Ball(all.center().multiply(turns), all.radius().multiply(turns.abs()), all.scale());
        return x.minus(whole).roundedTo(x.scale());
    }

    /** Σ (−1)^i x^(2i) / (2i)! for |x| < 1: alternating with falling terms, so the rest is below the last one taken. */
    private static Ball cosineSeries(Ball x) {
        Ball square = x.times(x);
        Ball term = Ball.of(1, x.scale());
        Ball sum = term;
        for (int i = 1; magnitude(term).compareTo(BigInteger.TWO) > 0; i++) {
            term = term.times(square).dividedBy((2L * i - 1) * (2L * i)).negate();
            sum = sum.plus(term);
        }
        return sum.widened(magnitude(term));
    }
}
