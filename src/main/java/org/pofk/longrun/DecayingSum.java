package org.pofk.longrun;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formulas;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;

/**
 * The modes of a closed form that die out, added up over a stretch of steps at once: a real mode lies between its ends,
 * an oscillating one below its amplitude, and between the ends of its cosine where that turns little or, at the steps
 * of the stretch, not at all. Certified, to a fixed scale; the narrower the stretch, the closer. Cost: modes · log k
 * products.
 */
public final class DecayingSum {
    private static final BigInteger MOST_TURN = BigInteger.valueOf(3);
    /** An angle multiplied by a step needs as many more bits. */
    private static final int STEP_BITS = Long.SIZE;
    private static final int UNIT_BITS = 96;

    private final List<Term> terms;
    private final int bits;

    private DecayingSum(List<Term> terms, int bits) {
        this.terms = terms;
        this.bits = bits;
    }

    public static DecayingSum of(ClosedForm closedForm, int bits) {
        return new DecayingSum(DecayingMode.decaying(closedForm).stream()
                .map(mode -> mode.accept(new TermOf(bits))).toList(), bits);
    }

    /** The same over the k-th power of a positive number, not below any modulus. */
    public static DecayingSum inUnits(ClosedForm closedForm, Rational unit, int bits) {
        return new DecayingSum(of(closedForm, bits).terms.stream().map(term -> term.over(unit, bits)).toList(), bits);
    }

    /** A number just above the modulus of every mode that dies out; one where none does. */
    public static Rational unitAbove(ClosedForm closedForm) {
        return DecayingMode.of(closedForm).stream().map(mode -> mode.modulus().enclose(UNIT_BITS).upper())
                .reduce(Rational::max).map(most -> most.plus(Rational.TWO.pow(-UNIT_BITS))).orElse(Rational.ONE);
    }

    /** size · binomial(k, p) · modulus^(k−p) · cos(angle (k−p) + phase); for a real mode the angle is 0 or π. */
    private record Term(Ball size, Powers modulus, int power, Ball angle, Ball phase, Optional<Rational> turns) {
        public Term over(Rational unit, int bits) {
            return new Term(size.times(Ball.of(unit.pow(-power), bits)), new Powers(modulus.base().times(Ball.of(unit.inverse(), bits))),
                    power, angle, phase, turns);
        }
    }

    /** Turns: the angle over 2π, where that is known to be rational. */
    private record TermOf(int bits) implements Mode.Visitor<Term> {

        @Override
        public Term impulse(Mode.Impulse impulse) {
            throw new AssertionError("impulses don't decay: " + impulse);
        }

        @Override
        public Term geometric(Mode.Geometric mode) {
            Ball base = mode.base().enclosure().enclose(bits).roundedTo(bits);
            return new Term(mode.coefficient().enclosure().enclose(bits).roundedTo(bits), new Powers(base.abs()), mode.power(),
                    Ball.of(0, bits), Ball.of(0, bits),
                    Optional.of(base.isNegative() ? Rational.HALF : Rational.ZERO));
        }

        @Override
        public Term oscillating(Mode.Oscillating mode) {
            return new Term(mode.amplitude().enclosure().enclose(bits).roundedTo(bits),
                    new Powers(mode.modulus().enclosure().enclose(bits).roundedTo(bits)), mode.power(),
                    mode.angle().enclosure().enclose(bits + STEP_BITS).roundedTo(bits + STEP_BITS),
                    mode.phase().enclosure().enclose(bits + STEP_BITS).roundedTo(bits + STEP_BITS),
                    mode.angle().exact().flatMap(Formulas::multipleOfPi).map(Rational.HALF::times));
        }
    }

    /** The least stride, up to {@code most}, after which every mode whose angle allows it has the same phase again. */
    public long stride(long least, long most) {
        long stride = least;
        for (Term term : terms) {
            BigInteger denominator = term.turns.map(Rational::denominator).orElse(BigInteger.ONE);
            BigInteger next = BigInteger.valueOf(stride).multiply(denominator)
                    .divide(BigInteger.valueOf(stride).gcd(denominator));
            stride = next.compareTo(BigInteger.valueOf(most)) <= 0 ? next.longValueExact() : stride;
        }
        return stride;
    }

    /** All values at k = from, from + stride, …, to. */
    public Ball over(long from, long to, long stride) {
        Ball sum = Ball.of(Rational.ZERO, bits);
        for (Term term : terms) {
            Ball amount = size(term, from, to).times(term.size).roundedTo(bits);
            sum = sum.plus(amount.times(isGone(amount) ? everySign() : cosine(term, from, to, stride)));
        }
        return sum;
    }

    /** True for what is below the last place of the scale, whatever the cosine is. */
    private static boolean isGone(Ball amount) {
        return amount.center().bitLength() <= 1 && amount.radius().bitLength() <= 2;
    }

    /** binomial(k, p) · r^(k−p), zero for k < p. */
    private Ball size(Term term, long from, long to) {
        if (to < term.power) {
            return Ball.of(Rational.ZERO, bits);
        }
        long first = Math.max(from, term.power);
        Ball most = term.modulus.at(first - term.power).times(binomial(to, term.power));
        if (from == to) {
            return most;
        }
        return from < term.power ? hull(Ball.of(Rational.ZERO, bits), most)
                : hull(term.modulus.at(to - term.power).times(binomial(first, term.power)), most);
    }

    private Ball cosine(Term term, long from, long to, long stride) {
        boolean turnsFully = from == to
                || term.turns.stream().anyMatch(turns -> turns.times(Rational.of(stride)).isInteger());
        long last = turnsFully ? from : to;
        if (term.turns.isPresent() && term.phase.isExact() && term.phase.containsZero() && turnsFully) {
            Optional<Ball> real = real(term.turns.get().times(Rational.of(from - term.power)));
            if (real.isPresent()) {
                return real.get();
            }
        }
        if (term.turns.isPresent() && term.angle.isExact() && !turnsFully) {
            return everySign();
        }
        Ball steps = Ball.between(BigInteger.valueOf(from - term.power), BigInteger.valueOf(last - term.power), 0);
        Ball whole = term.angle.times(steps).plus(term.phase);
        boolean turnsFar = whole.radius().shiftLeft(1).compareTo(MOST_TURN.shiftLeft(whole.scale())) > 0;
        return turnsFar ? everySign() : whole.cos().roundedTo(bits);
    }

    /** The cosine of a whole or half number of turns. */
    private Optional<Ball> real(Rational turns) {
        Rational twice = turns.times(Rational.TWO);
        return twice.isInteger() ? Optional.of(Ball.of(twice.numerator().testBit(0) ? -1 : 1, bits)) : Optional.empty();
    }

    private Ball everySign() {
        return Ball.between(BigInteger.ONE.negate(), BigInteger.ONE, 0).roundedTo(bits);
    }

    private Ball binomial(long k, int power) {
        Rational binomial = Rational.ONE;
        for (int i = 0; i < power; i++) {
            binomial = binomial.times(Rational.of(k - i)).dividedBy(Rational.of(i + 1));
        }
        return Ball.of(binomial, bits);
    }

    private static Ball hull(Ball a, Ball b) {
        int scale = Math.max(a.scale(), b.scale());
        Ball first = a.roundedTo(scale);
        Ball second = b.roundedTo(scale);
        return Ball.between(first.center().subtract(first.radius()).min(second.center().subtract(second.radius())),
                first.center().add(first.radius()).max(second.center().add(second.radius())), scale);
    }
}
