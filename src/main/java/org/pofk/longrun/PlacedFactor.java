package org.pofk.longrun;

import org.pofk.exact.Factorization;
import org.pofk.exact.Rational;
import org.pofk.exact.UnitCircle;

/** A factor of a denominator with how many of its roots lie inside, on and outside the unit circle. Exact. */
record PlacedFactor(Factorization.Factor<Rational> factor, UnitCircle.Counts counts) {

    static PlacedFactor of(Factorization.Factor<Rational> factor) {
        return new PlacedFactor(factor, UnitCircle.count(factor.polynomial()));
    }

    /** A root outside, or a repeated one on the circle. */
    boolean grows() {
        return counts.outside() > 0 || growsLikeAPower();
    }

    boolean growsLikeAPower() {
        return counts.on() > 0 && factor.multiplicity() > 1;
    }

    /** The power of k that goes with the factor's roots. */
    int power() {
        return factor.multiplicity() - 1;
    }
}
