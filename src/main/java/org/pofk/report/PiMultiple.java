package org.pofk.report;

import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/** Reads a rational multiple of π off its formula: 2π/5 is 2/5, zero is 0. */
final class PiMultiple {
    private PiMultiple() {
    }

    static Optional<Rational> of(Formula formula) {
        if (Formulas.isZero(formula)) {
            return Optional.of(Rational.ZERO);
        }
        return Formulas.isMultipleOfPi(formula) ? Optional.of(factor(formula)) : Optional.empty();
    }

    /** Of a formula that {@link Formulas#isMultipleOfPi} accepts. */
    private static Rational factor(Formula formula) {
        if (formula instanceof Formula.Negation negation) {
            return factor(negation.operand()).negate();
        }
        if (formula instanceof Formula.Quotient quotient) {
            return factor(quotient.numerator()).dividedBy(((Formula.Number) quotient.denominator()).value());
        }
        return formula instanceof Formula.Product product
                ? ((Formula.Number) product.factors().get(0)).value()
                : Rational.ONE;
    }
}
