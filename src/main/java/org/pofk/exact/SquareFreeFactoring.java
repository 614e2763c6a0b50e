package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.pofk.exact.Factorization.Irreducible;

/**
 * Takes a square-free primitive polynomial without the root zero apart, the cheap ways first: rational roots,
 * cyclotomic factors, known divisors, q(z) = g(z^m), degrees modulo primes, and the Rings library up to degree
 * {@link #FACTORED_DEGREE} while the numbers are not too long. Exact; what stays undecided is said so.
 */
final class SquareFreeFactoring {
    /** Up to here, and up to so much work, degree² · bits, full factorization takes about a second. */
    static final int FACTORED_DEGREE = 200;
    private static final long FACTORED_WORK = 10_000_000;
    /** Up to here short exact forms are looked for, which factors are needed for whatever they cost. */
    private static final int ALWAYS_FACTORED_DEGREE = 30;
    /** Where full factorization takes no longer, primes that bring nothing are given up soon. */
    private static final int QUICK_DEGREE = 48;
    private static final int SHORT_PATIENCE = 4;
    /** By chance a factor of degree 2 seems possible modulo 12 primes in a row for one polynomial in a thousand. */
    private static final int LONG_PATIENCE = 16;

    /** A factor, and whether it is known to have none of its own. */
    record Piece(IntegerPolynomial polynomial, Irreducible irreducible) {
        static Piece proved(IntegerPolynomial polynomial) {
            return new Piece(polynomial, Irreducible.PROVED);
        }
    }

    private SquareFreeFactoring() {
    }

    /** The factors in no particular order; none for a constant. */
    static List<Piece> of(IntegerPolynomial squareFree, Factoring.Hints hints) {
        List<Piece> pieces = new ArrayList<>();
        IntegerPolynomial rest = splitRootsAndCyclotomic(squareFree, hints.cyclotomicOrders(), pieces);
        for (IntegerPolynomial part : splitBy(rest, hints.divisors())) {
            pieces.addAll(withoutPowers(part));
        }
        return pieces;
    }

    /** Adds the rational linear and the cyclotomic factors to the pieces; what is left has none of either. */
    private static IntegerPolynomial splitRootsAndCyclotomic(IntegerPolynomial squareFree,
            Collection<Integer> likelyOrders, List<Piece> pieces) {
        IntegerPolynomial rest = squareFree;
        if (!rest.isConstant()) {
            rest = divideOut(rest, RationalRoots.of(rest).stream().map(RationalRoots::linear).toList(), pieces);
        }
        return divideOut(rest, Cyclotomic.factorsOf(rest, likelyOrders), pieces);
    }

    private static IntegerPolynomial divideOut(IntegerPolynomial polynomial, List<IntegerPolynomial> factors,
            List<Piece> pieces) {
        IntegerPolynomial rest = polynomial;
        for (IntegerPolynomial factor : factors) {
            pieces.add(Piece.proved(factor));
            rest = rest.quotientBy(factor).orElseThrow();
        }
        return rest;
    }

    /** Pairwise coprime parts that multiply to the polynomial, split along its common divisors with the known ones. */
    private static List<IntegerPolynomial> splitBy(IntegerPolynomial squareFree, List<Polynomial<Rational>> divisors) {
        List<IntegerPolynomial> parts = List.of(squareFree);
        for (Polynomial<Rational> divisor : divisors) {
            IntegerPolynomial known = PrimitiveForm.partOf(divisor);
            List<IntegerPolynomial> finer = new ArrayList<>();
            for (IntegerPolynomial part : parts) {
                IntegerPolynomial common = part.greatestCommonDivisor(known);
                finer.add(common);
                finer.add(part.quotientBy(common).orElseThrow());
            }
            parts = finer.stream().filter(part -> !part.isConstant()).toList();
        }
        return parts.stream().filter(part -> !part.isConstant()).toList();
    }

    /** Factors a polynomial without rational or cyclotomic factors by way of g where it is g(z^m), m maximal. */
    private static List<Piece> withoutPowers(IntegerPolynomial polynomial) {
        int m = polynomial.commonExponent();
        if (m == 1) {
            return direct(polynomial);
        }
        List<Piece> pieces = new ArrayList<>();
        for (Piece piece : of(polynomial.withExponentsOver(m), Factoring.Hints.NONE)) {
            pieces.addAll(raised(piece, m));
        }
        return pieces;
    }

    /** The factors of h(z^m): at once when Capelli's criterion holds, else one prime of m after the other. */
    private static List<Piece> raised(Piece piece, int m) {
        IntegerPolynomial h = piece.polynomial;
        if (m == 1 || piece.irreducible == Irreducible.NOT_PROVED || Capelli.proveIrreducible(h, m)) {
            return List.of(new Piece(h.atPower(m), piece.irreducible));
        }
        int prime = SmallPrimes.dividing(m).get(0);
        List<Piece> factors = new ArrayList<>();
        IntegerPolynomial rest = splitRootsAndCyclotomic(h.atPower(prime), List.of(), factors);
        factors.addAll(direct(rest));
        return factors.stream().flatMap(factor -> raised(factor, m / prime).stream()).toList();
    }

    /** Factors a polynomial without rational roots by degrees modulo primes, then by the library. */
    private static List<Piece> direct(IntegerPolynomial polynomial) {
        if (polynomial.isConstant()) {
            return List.of();
        }
        int patience = polynomial.degree() <= QUICK_DEGREE ? SHORT_PATIENCE : LONG_PATIENCE;
        if (DegreePatterns.proveIrreducible(polynomial, patience)) {
            return List.of(Piece.proved(polynomial));
        }
        return isFactoredSoon(polynomial)
                ? RingsAlgebra.irreducibleFactors(polynomial).stream().map(Piece::proved).toList()
                : List.of(new Piece(polynomial, Irreducible.NOT_PROVED));
    }

    private static boolean isFactoredSoon(IntegerPolynomial polynomial) {
        int degree = polynomial.degree();
        long bits = polynomial.coefficients().stream().mapToInt(BigInteger::bitLength).max().orElse(0);
        return degree <= ALWAYS_FACTORED_DEGREE
                || degree <= FACTORED_DEGREE && degree * degree * bits <= FACTORED_WORK;
    }
}
