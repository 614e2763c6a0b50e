package org.pofk.transform;

import java.util.List;
import org.pofk.transform.RecurrenceProof.Method;

/**
 * One recurrence modulo a prime, with the numerators of every sequence that goes with it: for the j-th sequence
 * Σ y(k) z^(−k−1) = numerator_j / denominator. It holds for every k modulo that prime. Exact.
 */
final class ModularRecurrence {
    private final long[] denominator;
    private final List<long[]> numerators;
    private final Method method;
    private final int provedOrder;

    /** {@code provedOrder}: the order of the annihilating polynomial that the proof for every k stands on. */
    ModularRecurrence(long[] denominator, List<long[]> numerators, Method method, int provedOrder) {
        this.denominator = denominator;
        this.numerators = List.copyOf(numerators);
        this.method = method;
        this.provedOrder = provedOrder;
    }

    /** d. */
    int order() {
        return denominator.length - 1;
    }

    /** The coefficient of z^power in the denominator, monic of degree {@link #order()}. */
    long denominator(int power) {
        return denominator[power];
    }

    /** The coefficient of z^power, power below {@link #order()}, in the numerator of a sequence. */
    long numerator(int sequence, int power) {
        return numerators.get(sequence)[power];
    }

    int sequences() {
        return numerators.size();
    }

    Method method() {
        return method;
    }

    int provedOrder() {
        return provedOrder;
    }
}
