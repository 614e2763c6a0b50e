package org.pofk.exact;

import java.util.List;

/**
 * A polynomial as a product: unit · Π factor^multiplicity. Canonical form: factors monic, pairwise coprime,
 * square-free, ordered by degree and then by their coefficients (ascending power, compared as numbers).
 */
public record Factorization<E>(E unit, List<Factor<E>> factors) {

    /** How sure it is that a factor has no factor of its own. */
    public enum Irreducible { PROVED, NOT_PROVED }

    /** One factor; {@code polynomial} is monic and square-free. */
    public record Factor<E>(Polynomial<E> polynomial, int multiplicity, Irreducible irreducible) {
    }

    public Factorization {
        factors = List.copyOf(factors);
    }

    /** The product multiplied out. */
    public Polynomial<E> expand(Field<E> field) {
        Polynomial<E> product = Polynomial.constant(field, unit);
        for (Factor<E> factor : factors) {
            product = product.times(factor.polynomial.pow(factor.multiplicity));
        }
        return product;
    }
}
