package org.pofk.transform;

import org.pofk.exact.Polynomial;

/**
 * Y(z) = numerator / denominator, the z of the transform included. Canonical form: lowest terms, denominator monic;
 * y ≡ 0 is 0/1. Exact.
 */
public record TransferFunction<E>(Polynomial<E> numerator, Polynomial<E> denominator) {
    public TransferFunction {
        Polynomial<E> common = numerator.greatestCommonDivisor(denominator);
        if (common.degree() > 0) {
            numerator = numerator.dividedExactlyBy(common);
            denominator = denominator.dividedExactlyBy(common);
        }
        if (!denominator.leading().equals(denominator.field().one())) {
            numerator = numerator.times(numerator.field().inverse(denominator.leading()));
            denominator = denominator.monic();
        }
    }
}
