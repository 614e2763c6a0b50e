package org.pofk.meaning;

import org.pofk.exact.Rational;

/**
 * top/bottom of two elements of a {@link Tower}; the bottom is known not to be zero. Exact; the bottom has no
 * denominator, and is one where it is rational.
 */
record Quotient(Element top, Element bottom) {
    static final Quotient ZERO = of(Element.ZERO);

    Quotient {
        if (bottom.isZero()) {
            throw new BeyondTowerException();
        }
        Rational factor = bottom.isRational() ? bottom.constant().inverse() : Rational.of(bottom.denominator());
        if (!factor.isOne()) {
            top = top.times(factor);
            bottom = bottom.times(factor);
        }
    }

    static Quotient of(Element element) {
        return new Quotient(element, Element.ONE);
    }

    static Quotient of(Rational value) {
        return of(Element.of(value));
    }

    boolean isWhole() {
        return bottom.isRational();
    }

    Quotient plus(Quotient other, Tower tower) {
        return bottom.equals(other.bottom)
                ? new Quotient(top.plus(other.top), bottom)
                : new Quotient(tower.times(top, other.bottom).plus(tower.times(other.top, bottom)),
                        tower.times(bottom, other.bottom));
    }

    Quotient times(Quotient other, Tower tower) {
        return new Quotient(tower.times(top, other.top), tower.times(bottom, other.bottom));
    }
}
