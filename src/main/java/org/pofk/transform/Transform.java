package org.pofk.transform;

import org.pofk.chain.Output;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * One output's transform, with the recurrence it stands on and why that holds for every k.
 *
 * @param recurrence D, monic of order d, with Σ D_i y(k+i) = 0 for every k ≥ 0; keeps z^m
 * @param y          Y(z) in lowest terms
 * @param factors    the factors of Y's denominator
 */
public record Transform(Output output, Polynomial<Rational> recurrence, TransferFunction<Rational> y,
        Factorization<Rational> factors, RecurrenceProof proof) {
}
