package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * A rational polynomial as content · part: the part has coprime integer coefficients and a positive leading one;
 * zero is 0 · 0. Exact. Costs one gcd per coefficient in either direction.
 */
record PrimitiveForm(Rational content, IntegerPolynomial part) {

    static PrimitiveForm of(Polynomial<Rational> polynomial) {
        BigInteger denominator = CommonDenominator.of(polynomial.coefficients());
        List<BigInteger> integers = new ArrayList<>(polynomial.coefficients().size());
        for (Rational coefficient : polynomial.coefficients()) {
            integers.add(coefficient.denominator().equals(denominator)
                    ? coefficient.numerator()
                    : coefficient.numerator().multiply(denominator.divide(coefficient.denominator())));
        }
        IntegerPolynomial cleared = new IntegerPolynomial(integers);
        return new PrimitiveForm(new Rational(cleared.content(), denominator), cleared.primitivePart());
    }

    /** The primitive integer polynomial with the same roots. */
    static IntegerPolynomial partOf(Polynomial<Rational> polynomial) {
        return of(polynomial).part;
    }

    Polynomial<Rational> polynomial() {
        return polynomial(content, part);
    }

    /** scale · part over Q. */
    static Polynomial<Rational> polynomial(Rational scale, IntegerPolynomial part) {
        List<Rational> all = new ArrayList<>(part.coefficients().size());
        for (BigInteger coefficient : part.coefficients()) {
            all.add(new Rational(coefficient.multiply(scale.numerator()), scale.denominator()));
        }
        return Polynomial.ofRationals(all);
    }

    /** The part over its leading coefficient; zero stays zero. */
    static Polynomial<Rational> monic(IntegerPolynomial part) {
        return polynomial(part.isZero() ? Rational.ONE : Rational.of(part.leading()).inverse(), part);
    }
}
