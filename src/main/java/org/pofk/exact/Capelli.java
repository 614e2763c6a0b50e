package org.pofk.exact;

import java.math.BigInteger;
import java.util.Optional;

/**
 * When h(z^m) is irreducible for an irreducible h with a root α: exactly if α is no p-th power in Q(α) for the primes
 * p that divide m, and not −4 times a fourth power when 4 divides m (Capelli 1901; Lang, Algebra, VI.9, from memory).
 * Powers are ruled out by their norms, which are powers of rationals; so yes is a proof and no says nothing.
 */
final class Capelli {
    private Capelli() {
    }

    /** Whether the norm of α proves that h(z^m) is irreducible, h irreducible with h(0) ≠ 0. */
    static boolean proveIrreducible(IntegerPolynomial irreducible, int m) {
        Rational norm = norm(irreducible);
        for (int prime : SmallPrimes.dividing(m)) {
            if (isPower(norm, prime)) {
                return false;
            }
        }
        return m % 4 != 0 || !isPower(norm.dividedBy(Rational.of(-4).pow(irreducible.degree())), 4);
    }

    /** The product of the roots. */
    private static Rational norm(IntegerPolynomial polynomial) {
        Rational quotient = new Rational(polynomial.coefficient(0), polynomial.leading());
        return polynomial.degree() % 2 == 0 ? quotient : quotient.negate();
    }

    private static boolean isPower(Rational value, int exponent) {
        return root(value.numerator(), exponent).isPresent() && root(value.denominator(), exponent).isPresent();
    }

    /** The integer whose power this is, by halving the interval it lies in. */
    private static Optional<BigInteger> root(BigInteger value, int exponent) {
        if (value.signum() < 0) {
            return exponent % 2 == 0 ? Optional.empty() : root(value.negate(), exponent).map(BigInteger::negate);
        }
        BigInteger low = BigInteger.ZERO;
        BigInteger high = BigInteger.ONE.shiftLeft(value.bitLength() / exponent + 1);
        while (low.compareTo(high) < 0) {
            BigInteger middle = low.add(high).shiftRight(1);
            if (middle.pow(exponent).compareTo(value) < 0) {
                low = middle.add(BigInteger.ONE);
            } else {
                high = middle;
            }
        }
        return low.pow(exponent).equals(value) ? Optional.of(low) : Optional.empty();
    }
}
