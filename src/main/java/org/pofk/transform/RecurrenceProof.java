package org.pofk.transform;

/**
 * Why a recurrence D of order d, found from finitely many terms, holds for every k.
 *
 * @param order         n, the order of a polynomial known to annihilate the sequence: for {@link Method#VECTOR} that of
 *                      the one with D(A) x0 = 0, otherwise the states that take part (reached, lumped), whose
 *                      characteristic polynomial it is (Cayley–Hamilton). D vanishes for ever once it vanishes at
 *                      k = 0 … n−1
 * @param comparedSteps n + d, the terms y(0) … y(n+d−1) that were compared
 * @param primes        how many primes the comparison was made modulo; 0 when it was made in exact rationals
 * @param bits          bits of the product of these primes, above the bound on what could differ; 0 when exact
 */
public record RecurrenceProof(Method method, int order, int comparedSteps, int primes, int bits) {

    /** What was compared. */
    public enum Method {
        /** All n windows of the output's own sequence. */
        WINDOWS,
        /** D(A) x0 = 0 as a vector, which proves every output at once. */
        VECTOR,
        /**
         * Modulo every prime the sequence needs all n orders, so D is the characteristic polynomial of the states
         * that take part, and Cayley–Hamilton alone proves it; its coefficients are settled by primes beyond their
         * bound.
         */
        CHARACTERISTIC
    }
}
