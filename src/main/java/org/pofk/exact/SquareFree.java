package org.pofk.exact;

import java.util.SortedMap;
import java.util.TreeMap;

/** Multiplicities without roots: a polynomial over a field of characteristic zero taken apart by how often. Exact. */
public final class SquareFree {
    private SquareFree() {
    }

    /**
     * For each multiplicity that occurs, the monic product of (z − root) over the roots that have it; empty for
     * constants, an {@link ArithmeticException} for zero. Yun 1976, On square-free decomposition algorithms (from
     * memory); about as much work as one gcd of the polynomial and its derivative.
     */
    public static <E> SortedMap<Integer, Polynomial<E>> byMultiplicity(Polynomial<E> polynomial) {
        SortedMap<Integer, Polynomial<E>> parts = new TreeMap<>();
        Polynomial<E> monic = polynomial.dividedBy(Polynomial.constant(polynomial.field(), polynomial.leading()))
                .quotient();
        Polynomial<E> common = monic.greatestCommonDivisor(monic.derivative());
        Polynomial<E> left = monic.dividedExactlyBy(common);
        Polynomial<E> slope = monic.derivative().dividedExactlyBy(common);
        for (int multiplicity = 1; !left.isConstant(); multiplicity++) {
            Polynomial<E> excess = slope.minus(left.derivative());
            Polynomial<E> part = left.greatestCommonDivisor(excess);
            if (!part.isConstant()) {
                parts.put(multiplicity, part);
            }
            left = left.dividedExactlyBy(part);
            slope = excess.dividedExactlyBy(part);
        }
        return parts;
    }

    /** The monic polynomial with the same roots, each once. */
    public static <E> Polynomial<E> part(Polynomial<E> polynomial) {
        return polynomial.dividedExactlyBy(polynomial.greatestCommonDivisor(polynomial.derivative())).monic();
    }

    /** Whether no root is repeated; constants other than zero have none. */
    public static <E> boolean is(Polynomial<E> polynomial) {
        return !polynomial.isZero() && polynomial.greatestCommonDivisor(polynomial.derivative()).isConstant();
    }
}
