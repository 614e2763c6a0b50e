package org.pofk.modes;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Rational;

/**
 * n = root² · free for a positive integer n, with as much taken out as is cheap to find: squares of primes below
 * {@link #PRIMES_BELOW}, and the rest when it is a square as a whole. Exact either way; {@code free} is square-free
 * unless a larger prime's square hides in it.
 */
record SquarePart(BigInteger root, BigInteger free) {
    static final int PRIMES_BELOW = 4_096;

    static SquarePart of(BigInteger positive) {
        BigInteger root = BigInteger.ONE;
        BigInteger free = BigInteger.ONE;
        BigInteger rest = positive;
        for (int prime = 2; prime < PRIMES_BELOW && rest.bitLength() > 1; prime += prime == 2 ? 1 : 2) {
            BigInteger divisor = BigInteger.valueOf(prime);
            int power = 0;
            for (BigInteger[] division = rest.divideAndRemainder(divisor); division[1].signum() == 0;
                    division = rest.divideAndRemainder(divisor)) {
                rest = division[0];
                power++;
            }
            root = root.multiply(divisor.pow(power / 2));
            free = free.multiply(divisor.pow(power % 2));
        }
        BigInteger last = rest.sqrt();
        return last.multiply(last).equals(rest)
                ? new SquarePart(root.multiply(last), free)
                : new SquarePart(root, free.multiply(rest));
    }

    /** √value for a rational value ≥ 0 that is a square. */
    static Optional<Rational> root(Rational value) {
        return value.signum() < 0 ? Optional.empty() : root(value, 2);
    }

    /** The positive m-th root of a rational value ≥ 0, where it is rational. */
    static Optional<Rational> root(Rational value, int m) {
        BigInteger numerator = integerRoot(value.numerator(), m);
        BigInteger denominator = integerRoot(value.denominator(), m);
        return numerator.pow(m).equals(value.numerator()) && denominator.pow(m).equals(value.denominator())
                ? Optional.of(new Rational(numerator, denominator))
                : Optional.empty();
    }

    /** ⌊n^(1/m)⌋ for n ≥ 0, by Newton's iteration from above. */
    private static BigInteger integerRoot(BigInteger n, int m) {
        if (n.bitLength() <= 1 || m == 1) {
            return n;
        }
        BigInteger root = BigInteger.ONE.shiftLeft(n.bitLength() / m + 1);
        BigInteger degree = BigInteger.valueOf(m);
        while (true) {
            BigInteger next = root.multiply(degree.subtract(BigInteger.ONE)).add(n.divide(root.pow(m - 1)))
                    .divide(degree);
            if (next.compareTo(root) >= 0) {
                return root;
            }
            root = next;
        }
    }
}
