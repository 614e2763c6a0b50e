package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Truth;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * Refutes what can't be right: a formula that, whatever its decimals leave open, differs from the truth at one of a few
 * points. Numbers cut off instead of rounded are let through. What isn't refuted is still to be judged.
 */
final class Screen {
    private static final int BITS = 96;
    /** Cut off doubles what a decimal leaves open; half as much again for what isn't linear in it. */
    private static final Rational ALLOWANCE = Rational.of(3);
    private static final Rational NOISE = Rational.TWO.pow(-64);

    private final Probe probe;
    private final Optional<Claim.Within> within;

    private Screen(Probe probe, Optional<Claim.Within> within) {
        this.probe = probe;
        this.within = within;
    }

    /** For one part of a claim; nothing where its place doesn't tell what is right. */
    static Optional<Screen> of(Claim claim, int part, Truth truth) {
        return Probe.of(claim, part, truth).map(probe -> new Screen(probe, claim.within()));
    }

    Probe probe() {
        return probe;
    }

    /** Whether a text has a value at some of the points and none refutes it. */
    boolean mayBeRight(FormulaText text) {
        boolean seen = false;
        for (int i = 0; i < probe.points().size(); i++) {
            Optional<Ball> value = probe.spread(text, i, BITS);
            if (value.isPresent() && isRefuted(value.get(), probe.right().get(i))) {
                return false;
            }
            seen |= value.isPresent();
        }
        return seen;
    }

    /** How far the decimals of a text leave its value open at each point; nothing where it has none. */
    List<Optional<Rational>> open(FormulaText text) {
        return IntStream.range(0, probe.points().size())
                .mapToObj(i -> probe.spread(text, i, BITS).map(Screen::radius)).toList();
    }

    private static Rational radius(Ball ball) {
        return ball.upper().minus(ball.lower()).times(Rational.HALF);
    }

    private boolean isRefuted(Ball spread, Rational right) {
        Rational allowed = radius(spread).times(ALLOWANCE)
                .plus(NOISE.times(Rational.max(Rational.ONE, right.abs())))
                .plus(within.map(w -> w.relative() ? w.amount().times(right.abs()) : w.amount()).orElse(Rational.ZERO));
        return spread.middle().minus(right).abs().compareTo(allowed) > 0;
    }
}
