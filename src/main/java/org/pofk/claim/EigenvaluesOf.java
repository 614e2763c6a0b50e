package org.pofk.claim;

import java.util.List;
import org.pofk.exact.Factoring;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;
import org.pofk.meaning.Quantity;

/** The roots of a polynomial, each once. Exact. */
final class EigenvaluesOf {
    private EigenvaluesOf() {
    }

    static List<Quantity> distinct(Polynomial<Rational> polynomial) {
        return roots(polynomial).stream().map(Quantity::of).toList();
    }

    /** Each as a root of its factor. */
    static List<Root> roots(Polynomial<Rational> polynomial) {
        return Factoring.of(polynomial).factors().stream()
                .flatMap(factor -> Roots.of(factor.polynomial()).all().stream()).toList();
    }
}
