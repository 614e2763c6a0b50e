package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.answer.FirstEntrance;
import org.pofk.answer.PassageMoments;
import org.pofk.answer.Percentile;
import org.pofk.chain.Chain;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.longrun.Settling;
import org.pofk.steps.KnownValue;

/**
 * How long until a set of states is first entered under a schedule: T is the first step k ≥ 0 in which it is, by the
 * move or by an action; a start inside gives 0. Exact but for the percentiles, which are certified.
 *
 * @param into     the set
 * @param avoiding states that end the wait without success
 * @param stopped  the chain that is stopped where the wait ends
 * @param over     what holds over all cycles; empty where the numbers of a cycle are too long
 * @param values   at the steps asked for
 */
public record ScheduledPassage(List<Integer> into, List<Integer> avoiding, Timetable timetable,
        ScheduledChain stopped, Optional<OverCycles> over, List<At> values) {
    private static final int PLACES_AT_MOST = 6;
    private static final int SETTLED_DIGITS = 6;

    /**
     * @param moments       of T, given that the set is entered
     * @param percentiles   those asked for
     * @param distributions P(T ≤ k) at places of the cycle, as formulas in m
     * @param settling      how P(T > k) approaches what it tends to, from cycle to cycle
     * @param fromEach      the same question from every state
     */
    public record OverCycles(PassageMoments moments, List<Percentile> percentiles, List<CycleFormula> distributions,
            Optional<Settling> settling, FirstEntrance fromEach) {
        public OverCycles {
            percentiles = List.copyOf(percentiles);
            distributions = List.copyOf(distributions);
        }
    }

    /** P(T ≤ k) and P(T > k). */
    public record At(int k, KnownValue distribution, KnownValue survival) {
    }

    public ScheduledPassage {
        into = List.copyOf(into);
        avoiding = List.copyOf(avoiding);
        values = List.copyOf(values);
    }

    /** Everything about the passage of a chain, from its start; steps ascending. */
    public static ScheduledPassage of(Chain chain, Timetable timetable, Set<Integer> into, Set<Integer> avoiding,
            List<Rational> percentiles, List<Integer> steps) {
        StoppedSchedule stopped = StoppedSchedule.of(chain, timetable, into, avoiding);
        List<Optional<KnownValue>> entered = stopped.chain().at(stopped.distribution(), steps);
        List<Optional<KnownValue>> waiting = stopped.chain().at(stopped.survival(), steps);
        return new ScheduledPassage(into.stream().sorted().toList(), avoiding.stream().sorted().toList(), timetable,
                stopped.chain(), stopped.chain().areFormulasWithinReach() ? Optional.of(over(stopped, percentiles, steps)) : Optional.empty(),
                IntStream.range(0, steps.size()).mapToObj(i -> new At(steps.get(i), entered.get(i).orElseThrow(),
                        waiting.get(i).orElseThrow())).toList());
    }

    private static OverCycles over(StoppedSchedule stopped, List<Rational> percentiles, List<Integer> steps) {
        ScheduledEntrance entrance = ScheduledEntrance.of(stopped);
        PassageMoments moments = entrance.moments(stopped.chain().chain().start());
        ScheduledPercentiles finder = new ScheduledPercentiles(stopped, moments.probability());
        List<CycleFormula> distributions = new ArrayList<>();
        places(stopped.chain().timetable(), steps).forEach(j ->
                distributions.add(stopped.chain().cycles().formula(stopped.distribution(), j)));
        CycleFormula survival = stopped.chain().cycles().formula(stopped.survival(), 0);
        return new OverCycles(moments, percentiles.stream().map(finder::of).toList(), distributions,
                Settling.of(survival.closedForm(), survival.longRun(), SETTLED_DIGITS), entrance.fromEach());
    }

    /** The beginning of a cycle, and where the steps asked for lie. */
    private static List<Integer> places(Timetable timetable, List<Integer> steps) {
        return Stream.concat(Stream.of(0), steps.stream().filter(k -> k >= timetable.before())
                .map(k -> timetable.place(k).within())).distinct().limit(PLACES_AT_MOST).sorted().toList();
    }
}
