package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A polynomial modulo a prime below 2^31; what it knows serves as a proof about an integer polynomial when the prime
 * doesn't divide that one's leading coefficient. Canonical form: ascending power, the last one not zero. Immutable
 * by keeping its array to itself. Schoolbook throughout: degree² per product, division or gcd.
 */
final class ModularPolynomial {
    /** Primes for quick proofs that two polynomials are coprime. */
    private static final int[] LARGE_PRIMES = {2147483647, 2147483629, 2147483587};

    private final long prime;
    private final long[] ascending;

    ModularPolynomial(long prime, long[] reduced) {
        int length = reduced.length;
        while (length > 0 && reduced[length - 1] == 0) {
            length--;
        }
        this.prime = prime;
        this.ascending = Arrays.copyOf(reduced, length);
    }

    /**
     * Whether some prime proves that the two have no common root: their images are coprime and one kept its degree.
     * No answer to the contrary is a proof.
     */
    static boolean provesCoprime(IntegerPolynomial a, IntegerPolynomial b) {
        for (int prime : LARGE_PRIMES) {
            ModularPolynomial first = a.modulo(prime);
            ModularPolynomial second = b.modulo(prime);
            if (first.degree() == a.degree() || second.degree() == b.degree()) {
                return first.greatestCommonDivisor(second).degree() == 0;
            }
        }
        return false;
    }

    /** The same for rational polynomials, the common denominators left alone: for long numbers the cheap first try. */
    static boolean provesCoprime(Polynomial<Rational> a, Polynomial<Rational> b) {
        for (int prime : LARGE_PRIMES) {
            BigInteger modulus = BigInteger.valueOf(prime);
            if (isDefined(a, modulus) && isDefined(b, modulus)) {
                ModularPolynomial first = image(a, prime);
                ModularPolynomial second = image(b, prime);
                return (first.degree() == a.degree() || second.degree() == b.degree())
                        && first.greatestCommonDivisor(second).degree() == 0;
            }
        }
        return false;
    }

    static boolean isDefined(Polynomial<Rational> polynomial, BigInteger modulus) {
        return polynomial.coefficients().stream()
                .allMatch(coefficient -> coefficient.denominator().mod(modulus).signum() != 0);
    }

    static ModularPolynomial image(Polynomial<Rational> polynomial, int prime) {
        BigInteger modulus = BigInteger.valueOf(prime);
        return new ModularPolynomial(prime, polynomial.coefficients().stream().mapToLong(coefficient ->
                coefficient.numerator().mod(modulus).longValueExact()
                        * power(coefficient.denominator().mod(modulus).longValueExact(), prime - 2L, prime)
                        % prime).toArray());
    }

    int degree() {
        return ascending.length - 1;
    }

    /** The coefficient of z^power, zero above the degree. */
    long coefficient(int power) {
        return power < ascending.length ? ascending[power] : 0;
    }

    long valueAt(long point) {
        long value = 0;
        for (int i = degree(); i >= 0; i--) {
            value = (value * point + ascending[i]) % prime;
        }
        return value;
    }

    ModularPolynomial derivative() {
        long[] result = new long[Math.max(0, degree())];
        for (int i = 1; i <= degree(); i++) {
            result[i - 1] = ascending[i] * (i % prime) % prime;
        }
        return new ModularPolynomial(prime, result);
    }

    boolean isSquareFree() {
        return greatestCommonDivisor(derivative()).degree() == 0;
    }

    /** Any greatest common divisor, not normalised; degree −1 only for two zeros. */
    ModularPolynomial greatestCommonDivisor(ModularPolynomial other) {
        ModularPolynomial larger = this;
        ModularPolynomial smaller = other;
        while (smaller.degree() >= 0) {
            ModularPolynomial rest = larger.remainder(smaller);
            larger = smaller;
            smaller = rest;
        }
        return larger;
    }

    ModularPolynomial remainder(ModularPolynomial divisor) {
        long[] rest = ascending.clone();
        divide(rest, divisor);
        return new ModularPolynomial(prime, Arrays.copyOf(rest, Math.min(rest.length, divisor.degree())));
    }

    ModularPolynomial quotient(ModularPolynomial divisor) {
        long[] rest = ascending.clone();
        divide(rest, divisor);
        return new ModularPolynomial(prime, degree() < divisor.degree()
                ? new long[0]
                : Arrays.copyOfRange(rest, divisor.degree(), rest.length));
    }

    /** Leaves the remainder in the low places and the quotient from place deg(divisor) on. */
    private void divide(long[] rest, ModularPolynomial divisor) {
        long inverse = power(divisor.ascending[divisor.degree()], prime - 2, prime);
        for (int shift = rest.length - divisor.ascending.length; shift >= 0; shift--) {
            int top = shift + divisor.degree();
            long factor = rest[top] * inverse % prime;
            long negative = factor == 0 ? 0 : prime - factor;
            for (int i = 0; negative != 0 && i < divisor.degree(); i++) {
                rest[shift + i] = (rest[shift + i] + negative * divisor.ascending[i]) % prime;
            }
            rest[top] = factor;
        }
    }

    ModularPolynomial timesModulo(ModularPolynomial other, ModularPolynomial modulus) {
        if (degree() < 0 || other.degree() < 0) {
            return new ModularPolynomial(prime, new long[0]);
        }
        long[] product = new long[ascending.length + other.ascending.length - 1];
        for (int i = 0; i < ascending.length; i++) {
            for (int j = 0; j < other.ascending.length; j++) {
                product[i + j] = (product[i + j] + ascending[i] * other.ascending[j]) % prime;
            }
        }
        return new ModularPolynomial(prime, product).remainder(modulus);
    }

    ModularPolynomial powerModulo(long exponent, ModularPolynomial modulus) {
        ModularPolynomial result = new ModularPolynomial(prime, new long[] {1});
        for (int bit = 63 - Long.numberOfLeadingZeros(exponent); bit >= 0; bit--) {
            result = result.timesModulo(result, modulus);
            if ((exponent >> bit & 1) == 1) {
                result = result.timesModulo(this, modulus);
            }
        }
        return result;
    }

    private ModularPolynomial minusVariable() {
        long[] all = Arrays.copyOf(ascending, Math.max(2, ascending.length));
        all[1] = (all[1] + prime - 1) % prime;
        return new ModularPolynomial(prime, all);
    }

    /**
     * The degrees of the irreducible factors of this square-free polynomial, ascending, by distinct-degree
     * factorization: gcd with z^(p^i) − z (Cantor and Zassenhaus 1981, from memory). degree³ · log p; large degrees
     * by the library.
     */
    List<Integer> factorDegrees() {
        if (degree() >= IntegerPolynomial.RINGS_DEGREE) {
            return RingsAlgebra.factorDegrees(prime, ascending.clone());
        }
        List<Integer> degrees = new ArrayList<>();
        ModularPolynomial rest = this;
        ModularPolynomial power = new ModularPolynomial(prime, new long[] {0, 1});
        for (int size = 1; 2 * size <= rest.degree(); size++) {
            power = power.remainder(rest).powerModulo(prime, rest);
            ModularPolynomial found = rest.greatestCommonDivisor(power.minusVariable());
            for (int i = 0; i < found.degree() / size; i++) {
                degrees.add(size);
            }
            rest = rest.quotient(found);
        }
        if (rest.degree() > 0) {
            degrees.add(rest.degree());
        }
        return degrees;
    }

    static long power(long base, long exponent, long prime) {
        long result = 1;
        long square = base;
        for (long left = exponent; left > 0; left >>= 1) {
            if ((left & 1) == 1) {
                result = result * square % prime;
            }
            square = square * square % prime;
        }
        return result;
    }
}
