package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.longrun.Settling;

/** The steps at which random runs are looked at beside a formula: early ones, and a late one where those say nothing. */
final class RandomRuns {
    private static final List<Integer> EARLY = List.of(1, 5, 20, Deriving.COMPARED_UP_TO);
    private static final int DIGITS = 6;
    /** Longer runs aren't worth their time. */
    private static final BigInteger LONGEST = BigInteger.valueOf(2_000);

    private RandomRuns() {
    }

    /** Where too few hits are expected of an output at every early step, the step where it has settled is added. */
    static Simulation of(Chain chain, List<DerivedOutput> derived, int runs, long seed) {
        List<Output> outputs = derived.stream().map(DerivedOutput::output).toList();
        Simulation early = Simulation.of(chain, outputs, EARLY, runs, seed);
        List<Integer> late = IntStream.range(0, derived.size())
                .filter(i -> early.series().get(i).checked() == 0)
                .mapToObj(i -> settled(derived.get(i))).flatMap(Optional::stream).distinct().toList();
        return late.isEmpty() ? early
                : Simulation.of(chain, outputs, Stream.concat(EARLY.stream(), late.stream()).toList(), runs, seed);
    }

    /** Empty where it has settled by the last early step, or so late that runs would take long. */
    private static Optional<Integer> settled(DerivedOutput output) {
        return output.longRun().flatMap(longRun -> output.closedForm().flatMap(form ->
                        Settling.of(form, longRun.byPoles(), DIGITS)))
                .map(Settling::from).filter(from -> from.compareTo(LONGEST) <= 0
                        && from.compareTo(BigInteger.valueOf(Deriving.COMPARED_UP_TO)) > 0)
                .map(BigInteger::intValueExact);
    }
}
