package org.pofk.exact;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.stream.IntStream;

/**
 * The cyclotomic polynomials: the n-th is monic, irreducible over Q, of degree φ(n), and its roots are the primitive
 * n-th roots of unity. Exact.
 */
public final class Cyclotomic {
    private Cyclotomic() {
    }

    /** The n-th cyclotomic polynomial, n ≥ 1. About n·φ(n) additions. */
    public static Polynomial<Rational> polynomial(int order) {
        return PrimitiveForm.polynomial(Rational.ONE, integerPolynomial(order));
    }

    /** Euler's φ: how many of 1 … n are coprime to n. */
    public static int totient(int order) {
        int totient = order;
        for (int prime : SmallPrimes.dividing(order)) {
            totient = totient / prime * (prime - 1);
        }
        return totient;
    }

    /** So few divisions cost less than finding the part whose roots come with their inverses. */
    private static final int TRIED_ONE_BY_ONE = 8;

    /** All n whose cyclotomic polynomial divides this one, ascending; none for the zero polynomial. */
    public static List<Integer> ordersDividing(Polynomial<Rational> polynomial) {
        IntegerPolynomial common = withInverses(PrimitiveForm.partOf(polynomial));
        return ordersDividing(common, ordersUpToDegree(common.degree()));
    }

    /** Those of the candidate orders whose cyclotomic polynomial divides this one, ascending; none for zero. */
    public static List<Integer> ordersDividing(Polynomial<Rational> polynomial, Collection<Integer> candidates) {
        IntegerPolynomial part = PrimitiveForm.partOf(polynomial);
        return ordersDividing(candidates.size() <= TRIED_ONE_BY_ONE ? part : withInverses(part), candidates);
    }

    private static List<Integer> ordersDividing(IntegerPolynomial part, Collection<Integer> candidates) {
        return candidates.stream().distinct().sorted().filter(order -> divides(order, part)).toList();
    }

    /** The part whose roots come with their inverses, as roots of unity do; mostly there are none. */
    private static IntegerPolynomial withInverses(IntegerPolynomial polynomial) {
        return polynomial.greatestCommonDivisor(polynomial.reversed());
    }

    /** Whether the n-th cyclotomic polynomial divides this one, which isn't zero. */
    static boolean divides(int order, IntegerPolynomial part) {
        return totient(order) <= part.degree()
                && vanishesModuloPrime(order, part)
                && part.quotientBy(integerPolynomial(order)).isPresent();
    }

    /** All n with φ(n) ≤ degree, ascending. */
    static List<Integer> ordersUpToDegree(int degree) {
        return IntStream.rangeClosed(1, largestOrder(degree)).filter(order -> totient(order) <= degree).boxed()
                .toList();
    }

    /**
     * A bound on n with φ(n) ≤ degree. With k distinct primes φ(n) is at least the product of p − 1 over the first k
     * primes, and n/φ(n) at most the product of p/(p − 1) over them.
     */
    private static int largestOrder(int degree) {
        long smallestTotient = 1;
        long product = 1;
        int prime = 2;
        while (smallestTotient * (prime - 1) <= degree) {
            smallestTotient *= prime - 1;
            product *= prime;
            prime = SmallPrimes.after(prime);
        }
        return Math.toIntExact(Math.max(0, degree) * product / smallestTotient);
    }

    /** Built prime by prime: Φ of m·p is Φ_m(z^p)/Φ_m(z) for a new prime p, and Φ_m(z^p) for an old one. */
    static IntegerPolynomial integerPolynomial(int order) {
        if (order < 1) {
            throw new ArithmeticException("there is no cyclotomic polynomial of order " + order);
        }
        IntegerPolynomial result = IntegerPolynomial.ofIntegers(-1, 1);
        int built = 1;
        for (int prime : SmallPrimes.dividing(order)) {
            result = result.atPower(prime).quotientBy(result).orElseThrow();
            built *= prime;
        }
        return result.atPower(order / built);
    }

    /**
     * Whether the polynomial vanishes at an element of order n modulo a prime that is 1 modulo n: it does when the
     * n-th cyclotomic polynomial divides it, so nearly all others are told apart without a division.
     */
    private static boolean vanishesModuloPrime(int order, IntegerPolynomial part) {
        int prime = (1 << 20) / order * order + 1;
        while (!SmallPrimes.isPrime(prime)) {
            prime += order;
        }
        return part.modulo(prime).valueAt(elementOfOrder(order, prime)) == 0;
    }

    private static long elementOfOrder(int order, int prime) {
        for (long base = 2;; base++) {
            long element = ModularPolynomial.power(base, (prime - 1) / order, prime);
            if (SmallPrimes.dividing(order).stream().allMatch(
                    divisor -> ModularPolynomial.power(element, order / divisor, prime) != 1)) {
                return element;
            }
        }
    }

    /**
     * The cyclotomic polynomials that divide a square-free polynomial without the roots ±1, the likely orders tried
     * first.
     */
    static List<IntegerPolynomial> factorsOf(IntegerPolynomial squareFree, Collection<Integer> likelyOrders) {
        IntegerPolynomial rest = withInverses(squareFree);
        List<Integer> orders = new ArrayList<>(likelyOrders);
        orders.addAll(ordersUpToDegree(rest.degree()));
        List<IntegerPolynomial> found = new ArrayList<>();
        for (int order : orders) {
            if (divides(order, rest)) {
                IntegerPolynomial factor = integerPolynomial(order);
                found.add(factor);
                rest = rest.quotientBy(factor).orElseThrow();
            }
        }
        return found;
    }
}
