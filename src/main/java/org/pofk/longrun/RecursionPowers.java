package org.pofk.longrun;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.steps.ExactSteps;

/** A recursion's long run held against exact powers at one high step. Exact. */
final class RecursionPowers {
    /** Larger recursions are not stepped. */
    static final int STATES_AT_MOST = 40;
    private static final int STEP = 256;
    private static final int CYCLE_AT_MOST = 100;

    private RecursionPowers() {
    }

    /** Empty when there is neither a limit nor a short cycle, or too many states. */
    static Optional<HighPowers.Verdict> against(Chain recursion, LongRun longRun, Output output) {
        List<Rational> values = LongRunValues.of(longRun);
        if (values.isEmpty() || values.size() > CYCLE_AT_MOST || recursion.size() > STATES_AT_MOST) {
            return Optional.empty();
        }
        List<Integer> cycle = IntStream.range(STEP, STEP + values.size()).boxed().toList();
        List<Rational> powers = ExactSteps.at(recursion, List.of(output), cycle).values().get(0);
        Rational within = Rational.ZERO;
        for (int i = 0; i < powers.size(); i++) {
            Rational reached = values.get(cycle.get(i) % values.size());
            within = Rational.max(within, powers.get(i).minus(reached).abs());
        }
        return Optional.of(new HighPowers.Verdict(STEP, values.size(), within, List.of(), Optional.empty()));
    }
}
