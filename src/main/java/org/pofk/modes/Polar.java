package org.pofk.modes;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * A complex number in polar form, as far as modulus and angle have short exact forms. The angle in (−π, π].
 *
 * <p>Two ways. Where |λ|² is a rational s, the conjugate of h(λ) is h(s/λ), again in Q(λ): |h|², h/h̄ and the squared
 * cosine are elements of the field, so that a rational multiple of π is a root of unity h/h̄, proved by its power being
 * one. Otherwise the angle is a multiple of π/N exactly when h^N is real, which its minimal polynomial decides. What
 * N to try is read off an enclosure; only the proof counts. In Q(λ) with λ^m rational a single term c λ^i has both
 * without a search. Exact.
 */
record Polar(Optional<Radical> modulus, Optional<Angle> angle) {
    private static final int GUESS_BITS = 96;
    private static final Polar NOTHING = new Polar(Optional.empty(), Optional.empty());

    /** Neither modulus nor angle has been found in short form. */
    static Polar unknown() {
        return NOTHING;
    }

    /** The polar form of h(λ), not zero; {@code squaredModulus} is |λ|² where that is rational. */
    static Polar of(ElementAtRoot number, Optional<Rational> squaredModulus) {
        return squaredModulus.isPresent()
                ? withConjugate(number, squaredModulus.get())
                : byRealPower(number);
    }

    /** Only the test that is cheap at any degree: λ^m real, where q(z) = g(z^m). */
    static Polar ofStepPower(ElementAtRoot root) {
        int step = root.field().step();
        return PiGuess.of(root.enclosed(), step)
                .filter(guess -> root.field().hasRealStepPower(root.root()))
                .map(guess -> PiGuess.nearest(root.enclosed(), step))
                .map(known -> new Polar(Optional.empty(), Optional.of(new Angle.PiMultiple(known.fraction()))))
                .orElse(NOTHING);
    }

    private static Polar withConjugate(ElementAtRoot number, Rational squaredModulus) {
        NumberField field = number.field();
        Polynomial<Rational> h = number.element();
        Polynomial<Rational> conjugate = field.turnedOver(h, squaredModulus);
        Polynomial<Rational> norm = field.multiply(h, conjugate);
        Optional<Radical> modulus =
                ElementAtRoot.of(field, norm, number.root()).surd().map(surd -> Radical.root(surd, 2));
        if (h.equals(conjugate)) {
            return new Polar(modulus, Optional.of(new Angle.PiMultiple(
                    number.realSign() > 0 ? Rational.ZERO : Rational.ONE)));
        }
        Optional<Angle> multiple = PiGuess.of(number.enclosed(), 2 * field.degree() * field.degree())
                .filter(guess -> field.power(field.divide(h, conjugate), guess.order()).equals(field.one()))
                .map(guess -> new Angle.PiMultiple(guess.fraction()));
        return new Polar(modulus, multiple.isPresent() ? multiple : arcCosine(number, conjugate, norm));
    }

    /** cos² = (h + h̄)²/(4 h h̄); the sign of the cosine is that of h + h̄, of the angle that of the imaginary part. */
    private static Optional<Angle> arcCosine(ElementAtRoot number, Polynomial<Rational> conjugate,
            Polynomial<Rational> norm) {
        NumberField field = number.field();
        Polynomial<Rational> twice = number.element().plus(conjugate);
        Polynomial<Rational> squaredCosine =
                field.divide(field.multiply(twice, twice).times(Rational.of(1, 4)), norm);
        return ElementAtRoot.of(field, squaredCosine, number.root()).surd().map(surd -> {
            Radical cosine = Radical.root(surd, 2);
            return new Angle.ArcCosine(number.imaginarySign(), number.realSign() < 0 ? cosine.negate() : cosine);
        });
    }

    private static Polar byRealPower(ElementAtRoot number) {
        NumberField field = number.field();
        Optional<Radical> monomialSize = number.monomialSize();
        if (monomialSize.isPresent()) {
            return new Polar(monomialSize,
                    Optional.of(new Angle.PiMultiple(PiGuess.nearest(number.enclosed(), field.degree()).fraction())));
        }
        Optional<PiGuess> guess = PiGuess.of(number.enclosed(), Math.max(60, 2 * field.step()));
        if (guess.isEmpty()) {
            return NOTHING;
        }
        int order = guess.get().order();
        ElementAtRoot power = number.power(order);
        Optional<Angle> angle = Optional.of(new Angle.PiMultiple(guess.get().fraction()));
        Optional<Surd> surd = power.surd();
        if (surd.isPresent()) {
            Surd positive = surd.get().signum() < 0 ? surd.get().times(Rational.of(-1)) : surd.get();
            return new Polar(Optional.of(Radical.root(positive, order)), angle);
        }
        return field.degree() <= NumberField.SEARCHED_UP_TO && power.isReal()
                ? new Polar(Optional.empty(), angle)
                : NOTHING;
    }

    /**
     * The angle as it would be if it were fraction · π with a small denominator: a guess with an enclosure that
     * allows no other multiple of π/order.
     */
    private record PiGuess(Rational fraction) {

        /** The denominator N: if the angle is a multiple of π/N at all, it is this one. */
        int order() {
            return fraction.denominator().intValueExact();
        }

        /** By continued fractions of angle/π, denominators up to {@code largest}. */
        static Optional<PiGuess> of(EnclosedComplex number, int largest) {
            Ball angle = number.argument().enclose(GUESS_BITS);
            double target = angle.middle().approximate() / Math.PI;
            long before = 0;
            long denominator = 1;
            double rest = target - Math.floor(target);
            while (denominator <= largest) {
                long numerator = Math.round(target * denominator);
                if (Math.abs(target * denominator - numerator) < 1e-9) {
                    return Optional.of(new PiGuess(Rational.of(numerator, denominator)))
                            .filter(guess -> guess.isOnlyOne(angle, guess.order()));
                }
                double inverse = 1 / rest;
                long next = (long) Math.floor(inverse) * denominator + before;
                before = denominator;
                denominator = next;
                rest = inverse - Math.floor(inverse);
            }
            return Optional.empty();
        }

        /** The multiple of π/order that the angle is known to be. */
        static PiGuess nearest(EnclosedComplex number, int order) {
            Ball angle = number.argument().enclose(GUESS_BITS);
            Rational turns = angle.middle().times(Rational.of(order)).dividedBy(Ball.pi(GUESS_BITS).middle());
            PiGuess nearest = new PiGuess(new Rational(turns.plus(Rational.HALF).floor(), BigInteger.valueOf(order)));
            if (!nearest.isOnlyOne(angle, order)) {
                throw new AssertionError(angle + " is no multiple of π/" + order);
            }
            return nearest;
        }

        /** |angle − fraction π| is proved below 1/N, less than half of the distance π/N to the next multiple. */
        private boolean isOnlyOne(Ball angle, int order) {
            Ball multiple = Ball.pi(GUESS_BITS).times(Ball.of(fraction, GUESS_BITS));
            return angle.minus(multiple).abs().upper().times(Rational.of(order)).compareTo(Rational.ONE) < 0;
        }
    }
}
