package org.pofk.longrun;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;

/**
 * On which side of its limit a sum of decaying modes stays in the end. Decided where one real mode outlasts all others,
 * or one conjugate pair, whose cosine takes both signs for ever, as its angle is no multiple of π; in general this is
 * the positivity problem for linear recurrences, open from order six on (Ouaknine and Worrell 2014, from memory).
 * Moduli that agree to {@value Settling#TIED_BITS} bits are left undecided; poles with a power in common become one
 * where every so many steps are looked at. Certified.
 *
 * @param from for {@code POSITIVE} and {@code NEGATIVE}, a step from which the sign is kept
 */
public record EventualSign(Kind kind, long from) {
    private static final int BITS = 512;
    private static final int MOST_DOUBLINGS = 50;

    /** {@code ZERO}: nothing decays. */
    public enum Kind { POSITIVE, NEGATIVE, BOTH_FOR_EVER, ZERO, UNDECIDED }

    public static EventualSign of(ClosedForm closedForm) {
        long atLeast = closedForm.withoutImpulsesFrom();
        List<Mode> modes = DecayingMode.decaying(closedForm);
        if (modes.isEmpty()) {
            return new EventualSign(Kind.ZERO, atLeast);
        }
        List<Weight> weights = modes.stream().map(mode -> Weight.of(closedForm, mode)).toList();
        List<Weight> slowest = slowest(weights);
        int power = slowest.stream().mapToInt(Weight::power).max().orElseThrow();
        List<Weight> top = slowest.stream().filter(weight -> weight.power == power).toList();
        if (top.size() != 1) {
            return undecided();
        }
        if (top.get(0).swings) {
            return onePole(slowest) ? new EventualSign(Kind.BOTH_FOR_EVER, atLeast) : undecided();
        }
        Ball sum = top.get(0).coefficient.enclose(BITS);
        OptionalInt sign = sum.sign();
        if (sign.isEmpty() || sign.getAsInt() == 0) {
            return undecided();
        }
        List<Weight> others = new ArrayList<>(weights);
        others.removeAll(top);
        Optional<Long> from = outlasting(sum.abs(), top.get(0), others, atLeast);
        return from.map(k -> new EventualSign(sign.getAsInt() > 0 ? Kind.POSITIVE : Kind.NEGATIVE, k))
                .orElseGet(EventualSign::undecided);
    }

    private static EventualSign undecided() {
        return new EventualSign(Kind.UNDECIDED, 0);
    }

    private static List<Weight> slowest(List<Weight> weights) {
        Weight most = weights.stream().max((a, b) -> a.mode.compareModulus(b.mode, Settling.TIED_BITS)).orElseThrow();
        return weights.stream().filter(each -> each.mode.compareModulus(most.mode, Settling.TIED_BITS) == 0).toList();
    }

    private static boolean onePole(List<Weight> weights) {
        return weights.stream().map(weight -> weight.pole).distinct().count() == 1;
    }

    /**
     * A step from which |sum| · binomial(k, p) r^(k−p) stays above all others together: where it is above them, and
     * every other one's share falls from there on.
     */
    private static Optional<Long> outlasting(Ball sum, Weight top, List<Weight> others, long atLeast) {
        long k = Math.max(atLeast, top.power) + 1;
        for (Weight other : others) {
            Optional<Long> falling = top.sharesFallFrom(other);
            if (falling.isEmpty()) {
                return Optional.empty();
            }
            k = Math.max(k, falling.get());
        }
        for (int i = 0; i < MOST_DOUBLINGS; i++) {
            Ball rest = Ball.of(0, BITS);
            for (Weight other : others) {
                rest = rest.plus(top.share(other, k));
            }
            if (sum.minus(rest).isPositive()) {
                return Optional.of(k);
            }
            k = 2 * k;
        }
        return Optional.empty();
    }

    /** A mode with what tells when it is outlasted; it swings where it takes both signs for ever. */
    private record Weight(DecayingMode mode, List<Integer> pole, int power, boolean swings, Enclosed coefficient) {

        public static Weight of(ClosedForm form, Mode shape) {
            DecayingMode decay = DecayingMode.of(form, shape);
            return shape.accept(new Mode.Visitor<Weight>() {
                @Override
                public Weight impulse(Mode.Impulse impulse) {
                    throw new AssertionError("impulses don't decay: " + impulse);
                }

                @Override
                public Weight geometric(Mode.Geometric mode) {
                    return new Weight(decay, shape.pole(), mode.power(),
                            mode.base().enclosure().enclose(BITS).isNegative(), mode.coefficient().enclosure());
                }

                @Override
                public Weight oscillating(Mode.Oscillating mode) {
                    return new Weight(decay, shape.pole(), mode.power(), true, mode.amplitude().enclosure());
                }
            });
        }

        /** The step from which binomial(k, q) s^(k−q) over binomial(k, p) r^(k−p) falls, this the p and r. */
        Optional<Long> sharesFallFrom(Weight other) {
            if (other.pole.equals(pole)) {
                return Optional.of((long) power);
            }
            Ball ratio = other.mode.modulus().enclose(BITS).dividedBy(mode.modulus().enclose(BITS));
            Ball gap = Ball.of(1, BITS).minus(ratio);
            if (!gap.isPositive()) {
                return Optional.empty();
            }
            Rational steps = Rational.of(other.power + 1L).dividedBy(gap.lower());
            return steps.compareTo(Rational.of(Long.MAX_VALUE / 4)) > 0 ? Optional.empty()
                    : Optional.of(Math.max(steps.floor().longValueExact() + 1, other.power));
        }

        /** The other's size at k in units of this one's binomial(k, p) r^(k−p). */
        Ball share(Weight other, long k) {
            Ball r = mode.modulus().enclose(BITS).roundedTo(BITS);
            Ball ratio = other.mode.modulus().enclose(BITS).roundedTo(BITS).dividedBy(r);
            Ball powers = ratio.pow(k - other.power).times(r.pow(power - other.power));
            Rational binomials = Rational.ONE;
            for (int i = 0; i < other.power; i++) {
                binomials = binomials.times(Rational.of(k - i)).dividedBy(Rational.of(i + 1));
            }
            for (int i = 0; i < power; i++) {
                binomials = binomials.dividedBy(Rational.of(k - i)).times(Rational.of(i + 1));
            }
            return powers.times(Ball.of(binomials, BITS)).times(other.mode.amplitude().enclose(BITS));
        }
    }
}
