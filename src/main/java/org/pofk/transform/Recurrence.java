package org.pofk.transform;

import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * Sequences by the shortest recurrence they share: Σ y(k) z^(−k−1) = numerator / denominator for each, the denominator
 * monic of degree d and the numerators' degrees below d; proved for every k. Exact.
 */
record Recurrence(Polynomial<Rational> denominator, List<Polynomial<Rational>> numerators, RecurrenceProof proof) {
    Recurrence {
        numerators = List.copyOf(numerators);
    }
}
