package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Factoring;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;
import org.pofk.meaning.Quantity;

/**
 * A zero of a rational polynomial, complex ones each by itself, with how often it is one. Exact.
 *
 * @param of the factor it is a root of
 */
record FormPole(Root root, Quantity value, Polynomial<Rational> of, int multiplicity) {

    /** All zeros of a polynomial that isn't zero. */
    static List<FormPole> allOf(Polynomial<Rational> polynomial) {
        List<FormPole> all = new ArrayList<>();
        for (Factor<Rational> factor : Factoring.of(polynomial).factors()) {
            for (Root root : Roots.of(factor.polynomial()).all()) {
                all.add(new FormPole(root, Quantity.of(root), factor.polynomial(), factor.multiplicity()));
            }
        }
        return all;
    }

    boolean isZero() {
        return value.rational().filter(Rational::isZero).isPresent();
    }

    /** The conjugate of a complex one among those given. */
    Optional<FormPole> conjugate(List<FormPole> all) {
        return root.isReal() ? Optional.empty() : all.stream()
                .filter(other -> other.of.equals(of) && other.root.index() == root.conjugateIndex()).findFirst();
    }
}
