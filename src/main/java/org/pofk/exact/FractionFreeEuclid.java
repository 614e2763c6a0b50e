package org.pofk.exact;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;

/**
 * Euclid's algorithm on integer polynomials with the contents of the remainders divided out (Knuth, volume 2, section
 * 4.6.1, algorithm E; from memory). Exact. About degree² operations on numbers whose length grows degree-fold.
 */
final class FractionFreeEuclid {
    private FractionFreeEuclid() {
    }

    /** The primitive greatest common divisor of two polynomials that aren't zero, its leading coefficient positive. */
    static IntegerPolynomial greatestCommonDivisor(IntegerPolynomial a, IntegerPolynomial b) {
        IntegerPolynomial larger = a.primitivePart();
        IntegerPolynomial smaller = b.primitivePart();
        while (!smaller.isZero()) {
            IntegerPolynomial rest = larger.pseudoDividedBy(smaller).remainder().primitivePart();
            larger = smaller;
            smaller = rest;
        }
        return larger;
    }

    /**
     * The inverse 1/c · s of a polynomial, where s · polynomial ≡ c modulo one of higher degree. One common content is
     * divided out a step, instead of a gcd per coefficient. Nothing when the two have a common root.
     */
    static Optional<Polynomial<Rational>> inverse(IntegerPolynomial polynomial, IntegerPolynomial modulus) {
        IntegerPolynomial larger = modulus;
        IntegerPolynomial largerCofactor = new IntegerPolynomial(List.of());
        IntegerPolynomial smaller = polynomial;
        IntegerPolynomial smallerCofactor = IntegerPolynomial.ofIntegers(1);
        while (!smaller.isConstant()) {
            IntegerPolynomial.PseudoDivision division = larger.pseudoDividedBy(smaller);
            IntegerPolynomial next = largerCofactor.times(division.factor())
                    .plus(division.quotient().times(smallerCofactor).negate());
            BigInteger common = division.remainder().content().gcd(next.content());
            larger = smaller;
            largerCofactor = smallerCofactor;
            smaller = division.remainder().dividedBy(common);
            smallerCofactor = next.dividedBy(common);
        }
        return smaller.isZero()
                ? Optional.empty()
                : Optional.of(PrimitiveForm.polynomial(Rational.of(smaller.leading()).inverse(), smallerCofactor));
    }
}
