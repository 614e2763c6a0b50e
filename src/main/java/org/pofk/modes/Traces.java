package org.pofk.modes;

import java.util.List;
import org.pofk.exact.Field;
import org.pofk.exact.Polynomial;
import org.pofk.exact.ResidueField;

/**
 * Sums over all roots λ of a square-free monic q, without the roots: Σ g(λ)/q′(λ) is the coefficient of z^(d−1) of
 * g mod q, d the degree of q (Euler; see Serre, Local Fields, III §6, from memory). Exact.
 */
final class Traces<E> {
    private final Polynomial<E> q;
    private final Field<E> field;
    private final ResidueField<E> residues;

    private Traces(Polynomial<E> q) {
        this.q = q;
        field = q.field();
        residues = new ResidueField<>(q);
    }

    static <E> Traces<E> of(Polynomial<E> squareFree) {
        return new Traces<>(squareFree);
    }

    /** Σ over roots and powers p of R_p(λ) · binomial(k, p) · λ^(k−p). */
    E sequence(List<Expansion.Coefficient<E>> coefficients, long k) {
        E sum = field.zero();
        for (int p = 0; p < coefficients.size() && p <= k; p++) {
            Polynomial<E> element = residues.multiply(reduced(coefficients.get(p)), powerOfRoot(k - p));
            sum = field.add(sum, field.multiply(trace(element), field.of(Expansion.binomial(k, p))));
        }
        return sum;
    }

    /** The coefficient as one polynomial of degree below d; one inverse modulo q where it is a quotient. */
    Polynomial<E> reduced(Expansion.Coefficient<E> coefficient) {
        return coefficient.isReduced()
                ? coefficient.numerator()
                : residues.divide(coefficient.numerator().remainder(q), coefficient.denominator().remainder(q));
    }

    /** Σ a(λ) over the roots of q. */
    E trace(Polynomial<E> a) {
        return residues.multiply(a, q.derivative().remainder(q)).coefficient(q.degree() - 1);
    }

    private Polynomial<E> powerOfRoot(long exponent) {
        Polynomial<E> result = residues.one();
        Polynomial<E> square = Polynomial.monomial(field, field.one(), 1).remainder(q);
        for (long left = exponent; left > 0; left >>= 1) {
            if ((left & 1) == 1) {
                result = residues.multiply(result, square);
            }
            if (left > 1) {
                square = residues.multiply(square, square);
            }
        }
        return result;
    }
}
