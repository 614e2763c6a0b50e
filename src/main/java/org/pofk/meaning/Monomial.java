package org.pofk.meaning;

/** A product of powers of generators as one number, twelve bits for each exponent, so that a product is a sum. */
final class Monomial {
    static final long ONE = 0;
    static final int MOST_GENERATORS = 5;
    /** Exponents below half of what fits, so that a product of two fits. */
    static final int MOST_DEGREE = 2000;
    private static final int BITS = 12;
    private static final long MASK = (1L << BITS) - 1;

    private Monomial() {
    }

    static long power(int generator, int exponent) {
        return (long) exponent << (BITS * generator);
    }

    static int exponent(long monomial, int generator) {
        return (int) (monomial >>> (BITS * generator) & MASK);
    }
}
