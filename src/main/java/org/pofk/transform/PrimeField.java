package org.pofk.transform;

import java.math.BigInteger;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.pofk.exact.Rational;

/**
 * Residues modulo a prime of 31 bits, each a long in 0 … prime − 1, so that a product of two fits a signed long.
 * Exact.
 *
 * @param prime   the modulus, between 2^30 and 2^31
 * @param inverse ⌊2^64 / prime⌋, for reduction without a division (Barrett 1986, from memory)
 */
record PrimeField(long prime, long inverse) {
    private static final int LARGEST_TRIAL_DIVISOR = 46_341;
    /** Every derivation starts with the same few. */
    private static final Map<Long, PrimeField> FOUND = new ConcurrentHashMap<>();

    /** The field of that many elements. */
    static PrimeField of(long prime) {
        return new PrimeField(prime, Long.divideUnsigned(-1L, prime));
    }

    /** That of the largest prime below {@code below} (at most 2^31); found once for all. */
    static PrimeField below(long below) {
        return FOUND.computeIfAbsent(below, PrimeField::found);
    }

    private static PrimeField found(long below) {
        long candidate = (below - 2) | 1;
        while (!isPrime(candidate)) {
            candidate -= 2;
        }
        return of(candidate);
    }

    private static boolean isPrime(long odd) {
        for (int divisor = 3; divisor <= LARGEST_TRIAL_DIVISOR; divisor += 2) {
            if (odd % divisor == 0) {
                return odd == divisor;
            }
        }
        return true;
    }

    /** The residue of 0 ≤ value < 2^63: the quotient's error is below 3/2, so one correction is enough. */
    long reduce(long value) {
        long rest = value - Math.multiplyHigh(value, inverse) * prime - prime;
        return rest + ((rest >> 63) & prime);
    }

    long multiply(long a, long b) {
        return reduce(a * b);
    }

    long add(long a, long b) {
        long sum = a + b - prime;
        return sum + ((sum >> 63) & prime);
    }

    long subtract(long a, long b) {
        long difference = a - b;
        return difference + ((difference >> 63) & prime);
    }

    /** 1/a for a ≠ 0, by Fermat's little theorem. */
    long inverse(long a) {
        long result = 1;
        long square = a;
        for (long exponent = prime - 2; exponent > 0; exponent >>= 1) {
            if ((exponent & 1) == 1) {
                result = multiply(result, square);
            }
            square = multiply(square, square);
        }
        return result;
    }

    long of(BigInteger value) {
        return value.bitLength() < 63
                ? Math.floorMod(value.longValue(), prime)
                : value.mod(BigInteger.valueOf(prime)).longValue();
    }

    /** The residue of a rational whose denominator the prime doesn't divide. */
    long of(Rational value) {
        long denominator = of(value.denominator());
        if (denominator == 0) {
            throw new ArithmeticException(prime + " divides the denominator of " + value);
        }
        return multiply(of(value.numerator()), inverse(denominator));
    }

    /** Σ a[i]·b[i] over 0 ≤ i < length, b read backwards from {@code last}: the term of a convolution. */
    long convolution(long[] a, int first, long[] b, int last, int length) {
        long square = prime * prime;
        long sum = 0;
        for (int i = 0; i < length; i++) {
            sum += a[first + i] * b[last - i] - square;
            sum += (sum >> 63) & square;
        }
        return reduce(sum);
    }
}
