package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.longrun.Settling;

/**
 * How long until a set of states is first entered: T = min{k ≥ 0: x(k) in the set}, so a start inside it gives 0.
 * Exact but for the percentiles and the rate of decay, which are certified.
 *
 * @param into         the set
 * @param avoiding     states that end the wait without success
 * @param stopped      the chain stopped where the set is entered: law, distribution and survival are its outputs
 * @param law          f(k) = P(T = k), with what it stands on
 * @param distribution F(k) = P(T ≤ k)
 * @param survival     P(T > k), "not yet"
 * @param happening    law and distribution given that the set is entered, where that is neither certain nor impossible
 * @param moments      of T, given that the set is entered
 * @param settling     how P(T > k) approaches what it tends to: its slowest mode is the rate of decay in the long run
 * @param percentiles  of T, those asked for
 * @param hazards      P(T = k | T ≥ k) at the steps asked for
 * @param fromEach     the same question from every state
 * @param returns      where the start lies in the set with certainty
 * @param visits       the expected number of steps k ≥ 0 spent in the set; empty where that is infinite
 */
public record Passage(List<Integer> into, List<Integer> avoiding, Chain stopped, DerivedOutput law,
        DerivedOutput distribution, DerivedOutput survival, Optional<Happening> happening, PassageMoments moments,
        Optional<Settling> settling, List<Percentile> percentiles, List<Hazard> hazards, FirstEntrance fromEach,
        Optional<Return> returns, Optional<Rational> visits) {

    /** f(k) and F(k) over the probability that T is finite. */
    public record Happening(DerivedOutput law, DerivedOutput distribution) {
    }

    /** P(T = k | T ≥ k); empty where T ≥ k has probability zero. */
    public record Hazard(int k, Optional<Rational> value) {
    }

    /** The first step k ≥ 1 back in the set: whether it comes, and when, given that it does. */
    public record Return(Rational probability, Optional<Rational> mean) {
    }

    public Passage {
        into = List.copyOf(into);
        avoiding = List.copyOf(avoiding);
        percentiles = List.copyOf(percentiles);
        hazards = List.copyOf(hazards);
    }

    /** Everything about the passage of a chain, from its start; steps ascending. */
    public static Passage of(Chain chain, Set<Integer> into, Set<Integer> avoiding, List<Rational> percentiles,
            List<Integer> steps) {
        return new PassageAnalysis(chain, into, avoiding).passage(percentiles, steps);
    }
}
