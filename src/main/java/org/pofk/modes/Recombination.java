package org.pofk.modes;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.pofk.exact.Field;
import org.pofk.exact.Polynomial;
import org.pofk.transform.TransferFunction;

/**
 * An expansion back over one denominator. A part of q^e is a sequence s with denominator q^e; its transform is
 * z·P/q^e, and P the polynomial part of q^e · Σ s_k z^(−k−1), which the first d·e terms give. Exact.
 */
final class Recombination {
    private Recombination() {
    }

    static <E> TransferFunction<E> of(Expansion<E> expansion) {
        Field<E> field = expansion.field();
        int last = Math.max(0, expansion.impulses().size() - 1);
        List<E> backwards = new ArrayList<>(expansion.impulses());
        Collections.reverse(backwards);
        TransferFunction<E> sum = new TransferFunction<>(new Polynomial<>(field, backwards),
                Polynomial.monomial(field, field.one(), last));
        for (Expansion.Part<E> part : expansion.parts()) {
            sum = plus(sum, transform(part));
        }
        return sum;
    }

    private static <E> TransferFunction<E> transform(Expansion.Part<E> part) {
        Polynomial<E> power = part.factor().polynomial().pow(part.factor().multiplicity());
        int terms = power.degree();
        List<E> backwards = new ArrayList<>();
        for (int k = terms - 1; k >= 0; k--) {
            backwards.add(part.valueAt(k));
        }
        Polynomial<E> shifted = new Polynomial<>(power.field(), backwards).times(power);
        Polynomial<E> polynomialPart = new Polynomial<>(power.field(),
                shifted.coefficients().subList(Math.min(terms, shifted.coefficients().size()),
                        shifted.coefficients().size()));
        return new TransferFunction<>(polynomialPart.shiftedUp(1), power);
    }

    private static <E> TransferFunction<E> plus(TransferFunction<E> a, TransferFunction<E> b) {
        return new TransferFunction<>(
                a.numerator().times(b.denominator()).plus(b.numerator().times(a.denominator())),
                a.denominator().times(b.denominator()));
    }
}
