package org.pofk.modes;

import java.util.List;

/**
 * The whole state at once: x(k) = Σ vector · (mode at k), the eigenvector expansion of the start.
 */
public record StateModes(List<VectorMode> modes) {

    /**
     * One mode of the state. {@code shape} is the mode itself with coefficient (amplitude) one and phase zero;
     * {@code vector} is the component of x(0) in that mode's space, one value a state; {@code cosine} and
     * {@code sine} of an oscillating mode give state s as cosine_s·r^k·cos(θk) − sine_s·r^k·sin(θk)
     * (cosine equals vector); empty for the others. {@code excitation} is the largest component in absolute value:
     * how strongly the start excites the mode.
     */
    public record VectorMode(Mode shape, List<RealValue> vector, List<RealValue> sine, RealValue excitation) {
        public VectorMode {
            vector = List.copyOf(vector);
            sine = List.copyOf(sine);
        }
    }

    public StateModes {
        modes = List.copyOf(modes);
    }
}
