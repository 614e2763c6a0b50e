package org.pofk.modes;

import java.util.List;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.Field;
import org.pofk.exact.Polynomial;
import org.pofk.exact.ResidueField;

/** Sums over all roots λ of a square-free monic q, without the roots: traces in E[λ]/(q). Exact. */
final class Traces<E> {
    private final Field<E> field;
    private final ResidueField<E> residues;

    private Traces(Polynomial<E> q) {
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
            sum = field.add(sum, field.multiply(residues.trace(element), field.of(Expansion.binomial(k, p))));
        }
        return sum;
    }

    /** The coefficient as one polynomial of degree below d; one inverse modulo q where it is a quotient. */
    Polynomial<E> reduced(Expansion.Coefficient<E> coefficient) {
        return coefficient.isReduced()
                ? coefficient.numerator()
                : residues.divide(coefficient.numerator(), coefficient.denominator());
    }

    private Polynomial<E> powerOfRoot(long exponent) {
        return BinaryPowering.of(residues.one(), residues.generator(), exponent, residues::multiply);
    }
}
