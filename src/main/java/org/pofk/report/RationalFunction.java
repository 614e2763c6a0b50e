package org.pofk.report;

import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.transform.TransferFunction;

/** Polynomials and their quotients in z as formulas. */
final class RationalFunction {
    static final Formula Z = new Formula.Symbol("z");

    private RationalFunction() {
    }

    static Formula inZ(TransferFunction<Rational> y) {
        Formula numerator = inZ(y.numerator());
        return y.denominator().isConstant() ? numerator : new Formula.Quotient(numerator, inZ(y.denominator()));
    }

    static Formula inZ(Polynomial<Rational> polynomial) {
        return Formulas.polynomial(polynomial, Z);
    }
}
