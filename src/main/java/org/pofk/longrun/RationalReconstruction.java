package org.pofk.longrun;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * The fraction a residue stands for: numerator ≡ residue · denominator, both at most a limit in absolute value (Wang
 * 1981; from memory). Quadratic in the length of the modulus.
 */
final class RationalReconstruction {
    private RationalReconstruction() {
    }

    /** Empty when there is no such fraction; the only one when 2 · limit² is below the modulus. */
    static Optional<Rational> of(BigInteger residue, BigInteger modulus, BigInteger limit) {
        BigInteger symmetric = residue.shiftLeft(1).compareTo(modulus) > 0 ? residue.subtract(modulus) : residue;
        if (symmetric.abs().compareTo(limit) <= 0) {
            return Optional.of(Rational.of(symmetric));
        }
        BigInteger larger = modulus;
        BigInteger smaller = residue;
        BigInteger previous = BigInteger.ZERO;
        BigInteger factor = BigInteger.ONE;
        while (smaller.compareTo(limit) > 0) {
            BigInteger[] parts = larger.divideAndRemainder(smaller);
            larger = smaller;
            smaller = parts[1];
            BigInteger next = previous.subtract(parts[0].multiply(factor));
            previous = factor;
            factor = next;
        }
        boolean found = factor.abs().compareTo(limit) <= 0 && smaller.gcd(factor).equals(BigInteger.ONE);
        return found ? Optional.of(new Rational(smaller, factor)) : Optional.empty();
    }
}
