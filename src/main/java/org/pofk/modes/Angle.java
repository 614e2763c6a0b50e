package org.pofk.modes;

import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/** An angle in (−π, π] with a short exact form. Exact. */
sealed interface Angle {

    Formula formula();

    /** fraction · π. */
    record PiMultiple(Rational fraction) implements Angle {
        @Override
        public Formula formula() {
            return fraction.isZero()
                    ? Terms.number(fraction)
                    : Terms.scaled(fraction, Formula.Constant.PI);
        }
    }

    /** ±arccos(cosine), which reaches all quadrants; never a rational multiple of π. */
    record ArcCosine(int sign, Radical cosine) implements Angle {
        @Override
        public Formula formula() {
            Formula angle = Terms.call(Formula.Function.ARCCOS, cosine.formula());
            return sign < 0 ? Terms.negated(angle) : angle;
        }
    }
}
