package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.IntFunction;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Truth;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;

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
    private final List<Rational> truth;
    private final Optional<Claim.Within> within;

    private Screen(Probe probe, List<Rational> truth, Optional<Claim.Within> within) {
        this.probe = probe;
        this.truth = truth;
        this.within = within;
    }

    /** For one part of a claim; nothing where its place doesn't tell what is right. */
    static Optional<Screen> of(Claim claim, int part, Truth truth) {
        return Probe.of(claim, part, truth).map(probe -> {
            List<Rational> values = new ArrayList<>();
            for (int i = 0; i < probe.points(); i++) {
                values.add(probe.truth(truth, i));
            }
            return new Screen(probe, values, claim.within());
        });
    }

    Probe probe() {
        return probe;
    }

    List<Rational> truth() {
        return truth;
    }

    /** Whether nothing refutes that a text is right. */
    boolean mayBeRight(FormulaText text) {
        return probe.read(text).map(values -> refutedAt(values).isEmpty()).orElse(false);
    }

    /** The first point at which it can't be right. */
    OptionalInt refutedAt(IntFunction<Quantity> values) {
        for (int i = 0; i < truth.size(); i++) {
            try {
                if (isRefuted(values.apply(i), truth.get(i))) {
                    return OptionalInt.of(i);
                }
            } catch (ArithmeticException undecided) {
                // a pole at the point itself: no reason to think it wrong, none to think it right
                continue;
            }
        }
        return OptionalInt.empty();
    }

    private boolean isRefuted(Quantity value, Rational right) {
        Ball spread = value.spread(BITS).real();
        Rational open = spread.upper().minus(spread.lower()).times(Rational.HALF);
        Rational allowed = open.times(ALLOWANCE).plus(NOISE.times(Rational.max(Rational.ONE, right.abs())))
                .plus(within.map(w -> w.relative() ? w.amount().times(right.abs()) : w.amount()).orElse(Rational.ZERO));
        return spread.middle().minus(right).abs().compareTo(allowed) > 0;
    }
}
