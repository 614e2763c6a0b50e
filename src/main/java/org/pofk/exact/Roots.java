package org.pofk.exact;

import java.util.List;

/**
 * All roots of a square-free rational polynomial, each in a disc of its own. Canonical order: real roots descending,
 * then the roots of the upper half-plane by ascending angle (descending modulus where angles are equal), then their
 * conjugates in the same order. Certified.
 */
public record Roots(List<Root> all) {
    public static Roots of(Polynomial<Rational> squareFree) {
        throw new UnsupportedOperationException();
    }
}
