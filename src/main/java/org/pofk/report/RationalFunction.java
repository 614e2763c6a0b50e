package org.pofk.report;

import java.util.stream.IntStream;
import java.util.stream.Stream;
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

    /** The number of characters of the longest coefficient. */
    static int longestCoefficient(TransferFunction<Rational> y) {
        return Stream.of(y.numerator(), y.denominator()).flatMapToInt(polynomial ->
                IntStream.rangeClosed(0, polynomial.degree()).map(i -> polynomial.coefficient(i).toString().length()))
                .max().orElse(0);
    }

    static Formula inZ(Polynomial<Rational> polynomial) {
        return Formulas.polynomial(polynomial, Z);
    }
}
