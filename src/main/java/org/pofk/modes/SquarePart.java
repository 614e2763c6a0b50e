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
    static final int PRIMES_BELOW = 1_000;

    static SquarePart of(BigInteger positive) {
        SquarePart part = new SquarePart(BigInteger.ONE, BigInteger.ONE);
        BigInteger rest = positive;
        for (int divisor = 2; divisor < PRIMES_BELOW && rest.bitLength() > 1; divisor += divisor == 2 ? 1 : 2) {
            int power = 0;
            while (remainder(rest, divisor) == 0) {
                rest = rest.divide(BigInteger.valueOf(divisor));
                power++;
            }
            part = power == 0 ? part : part.times(BigInteger.valueOf(divisor), power);
        }
        BigInteger last = rest.sqrt();
        return last.multiply(last).equals(rest) ? part.times(last, 2) : part.times(rest, 1);
    }

    /** Most numbers fit a long, and most divisors don't divide. */
    private static long remainder(BigInteger n, int divisor) {
        return n.bitLength() < Long.SIZE ? n.longValue() % divisor : n.mod(BigInteger.valueOf(divisor)).longValue();
    }

    /** This times base^power. */
    private SquarePart times(BigInteger base, int power) {
        return new SquarePart(root.multiply(base.pow(power / 2)), free.multiply(base.pow(power % 2)));
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
