package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Rational;
import org.pofk.transform.StateTransform;

/**
 * The whole state at once: x(k) = Σ vector · (mode at k), the eigenvector expansion of the start. For a simple pole
 * the vector is an eigenvector of A; for a repeated one the vectors of its powers are a Jordan chain's, the highest
 * power's an eigenvector. Exact in which modes there are; n·d coefficients for n states and d modes.
 *
 * @param transform the state's transform, whose recurrence's factors the modes refer to
 * @param modes     those the start excites in at least one state; impulses by step, then by factor, root, power
 */
public record StateModes(StateTransform transform, List<VectorMode> modes) {

    /**
     * One mode of the state. {@code shape} is the mode itself with coefficient (amplitude) one and phase zero;
     * {@code vector} is the component of x(0) in that mode's space, one value a state; {@code cosine} and
     * {@code sine} of an oscillating mode give state s as cosine_s·r^k·cos(θk) − sine_s·r^k·sin(θk)
     * (cosine equals vector); empty for the others. {@code excitation} is the largest component in absolute value,
     * for an oscillating mode the largest amplitude: how strongly the start excites the mode.
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

    /** The expansion of the chain's start. */
    public static StateModes of(Chain chain) {
        return of(chain, new KnownPoles());
    }

    /** The same, where outputs of the chain have been derived. */
    public static StateModes of(Chain chain, KnownPoles known) {
        StateTransform transform = StateTransform.of(chain);
        List<Factor<Rational>> factors = transform.factors().factors();
        List<Expansion<Rational>> states =
                PartialFractions.ofEach(transform.numerators(), transform.recurrence(), transform.factors());
        List<VectorMode> modes = new ArrayList<>(VectorModes.impulses(states));
        for (int part = 0; part < states.get(0).parts().size(); part++) {
            int place = part;
            Factor<Rational> factor = states.get(0).parts().get(part).factor();
            modes.addAll(VectorModes.of(factors.indexOf(factor), known.of(factor),
                    states.stream().map(state -> state.parts().get(place).coefficients()).toList()));
        }
        return new StateModes(transform, modes);
    }
}
