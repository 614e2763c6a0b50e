package org.pofk.transform;

import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * A sequence by its shortest recurrence: Σ_k y(k) z^(−k−1) = numerator / denominator in lowest terms, the denominator
 * monic of degree d and the numerator's degree below d; proved for every k. Exact.
 */
public record Recurrence(Polynomial<Rational> numerator, Polynomial<Rational> denominator, RecurrenceProof proof) {

    /** Y(z) = Σ y(k) z^(−k) in lowest terms. */
    public TransferFunction<Rational> transferFunction() {
        return new TransferFunction<>(numerator.shiftedUp(1), denominator);
    }
}
