package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * 2 Re h and 2 Im h of a number h = h(λ): its part in cos(θk) and, with the sign turned, in sin(θk). Exact where a
 * short form was found: from h + h̄ and (h − h̄)² where the conjugate is in the field, else where the angle is a
 * multiple of π/2; enclosed elsewhere. That a part is zero is known in all these cases.
 */
record Rectangular(RealValue cosine, RealValue sine) {
    static final Rectangular ZERO = new Rectangular(RealValue.of(Rational.ZERO), RealValue.of(Rational.ZERO));

    static Rectangular of(Optional<ElementAtRoot> element, EnclosedComplex value, Optional<Rational> squaredModulus) {
        return scaled(Rational.TWO, element, value, squaredModulus);
    }

    /** Re h and Im h themselves. */
    static Rectangular ofHalves(Optional<ElementAtRoot> element, EnclosedComplex value,
            Optional<Rational> squaredModulus) {
        return scaled(Rational.ONE, element, value, squaredModulus);
    }

    private static Rectangular scaled(Rational scale, Optional<ElementAtRoot> element, EnclosedComplex value,
            Optional<Rational> squaredModulus) {
        ShortForms forms = element.map(h -> squaredModulus.isPresent()
                ? withConjugate(h, squaredModulus.get())
                : onAxis(Polar.of(h, squaredModulus))).orElse(ShortForms.NONE);
        Rational half = scale.times(Rational.HALF);
        return new Rectangular(
                RealValue.of(forms.cosine.map(r -> r.times(half)), value.realPart().times(Enclosed.of(scale))),
                RealValue.of(forms.sine.map(r -> r.times(half)), value.imaginaryPart().times(Enclosed.of(scale))));
    }

    private record ShortForms(Optional<Radical> cosine, Optional<Radical> sine) {
        static final ShortForms NONE = new ShortForms(Optional.empty(), Optional.empty());
    }

    private static ShortForms withConjugate(ElementAtRoot h, Rational squaredModulus) {
        Polynomial<Rational> conjugate = h.field().turnedOver(h.element(), squaredModulus);
        Polynomial<Rational> difference = h.element().minus(conjugate);
        Optional<Surd> square = h.with(h.field().multiply(difference, difference).negate()).surd();
        return new ShortForms(h.with(h.element().plus(conjugate)).surd().map(Radical::of),
                square.map(s -> s.signum() == 0
                        ? Radical.of(Rational.ZERO)
                        : signed(Radical.root(s, 2), h.imaginarySign())));
    }

    /** An angle of 0, π or ±π/2 leaves one part, the other is zero. */
    private static ShortForms onAxis(Polar polar) {
        Optional<Radical> zero = Optional.of(Radical.of(Rational.ZERO));
        Optional<Radical> size = polar.modulus().map(r -> r.times(Rational.TWO));
        Rational turns = polar.angle().flatMap(Angle::piFraction).orElse(Rational.of(1, 3));
        if (turns.isInteger()) {
            return new ShortForms(size.map(r -> signed(r, turns.isZero() ? 1 : -1)), zero);
        }
        return turns.abs().equals(Rational.HALF)
                ? new ShortForms(zero, size.map(r -> signed(r, turns.signum())))
                : ShortForms.NONE;
    }

    private static Radical signed(Radical positive, int sign) {
        return sign < 0 ? positive.negate() : positive;
    }
}
