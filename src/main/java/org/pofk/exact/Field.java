package org.pofk.exact;

/**
 * A field of exact coefficients: the rationals, residues modulo a polynomial, later rational functions of parameters.
 * Elements are immutable and in canonical form, so that {@code equals} is equality in the field.
 *
 * @param <E> element
 */
public interface Field<E> {
    E zero();

    E one();

    /** The image of a rational number. */
    E of(Rational value);

    E add(E a, E b);

    E negate(E a);

    E multiply(E a, E b);

    /** 1/a; an {@link ArithmeticException} when a is zero. */
    E inverse(E a);

    boolean isZero(E a);

    /** How long an element is to write, in bits; a field whose elements don't grow has none to tell. */
    default int bits(E a) {
        return 0;
    }

    default E of(long value) {
        return of(Rational.of(value));
    }

    default E subtract(E a, E b) {
        return add(a, negate(b));
    }

    default E divide(E a, E b) {
        return multiply(a, inverse(b));
    }

    /** The product of two polynomials over this field; a field with a fast way overrides it. */
    default Polynomial<E> product(Polynomial<E> a, Polynomial<E> b) {
        return Polynomial.schoolbookProduct(this, a, b);
    }

    /** Quotient and remainder by a divisor that isn't zero; a field with a fast way overrides it. */
    default Polynomial.Division<E> division(Polynomial<E> dividend, Polynomial<E> divisor) {
        return Polynomial.longDivision(this, dividend, divisor);
    }

    /** The monic greatest common divisor, zero only for two zeros; a field with a fast way overrides it. */
    default Polynomial<E> greatestCommonDivisor(Polynomial<E> a, Polynomial<E> b) {
        return Polynomial.euclid(this, a, b);
    }

    /**
     * The b of degree below that of the modulus with a·b ≡ 1; an {@link ArithmeticException} when they have a common
     * root. The modulus isn't constant, the degree of a below its. A field with a fast way overrides it.
     */
    default Polynomial<E> inverseModulo(Polynomial<E> a, Polynomial<E> modulus) {
        return Polynomial.inverseByEuclid(this, a, modulus);
    }
}
