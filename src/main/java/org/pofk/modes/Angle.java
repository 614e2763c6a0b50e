package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/** An angle in (−π, π] with a short exact form. Exact. */
sealed interface Angle {

    Formula formula();

    /** The angle over π where that is rational. */
    Optional<Rational> piFraction();

    /** fraction · π. */
    record PiMultiple(Rational fraction) implements Angle {
        @Override
        public Formula formula() {
            return fraction.isZero()
                    ? Formulas.number(fraction)
                    : Formulas.fraction(fraction, Formula.Constant.PI);
        }

        @Override
        public Optional<Rational> piFraction() {
            return Optional.of(fraction);
        }
    }

    /** ±arccos(cosine), which reaches all quadrants; never a rational multiple of π. */
    record ArcCosine(int sign, Radical cosine) implements Angle {
        @Override
        public Formula formula() {
            Formula angle = Formulas.call(Formula.Function.ARCCOS, cosine.formula());
            return sign < 0 ? Formulas.negated(angle) : angle;
        }

        @Override
        public Optional<Rational> piFraction() {
            return Optional.empty();
        }
    }
}
