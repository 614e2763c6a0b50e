package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.Stream;
import org.pofk.answer.Percentile;
import org.pofk.chain.Chain;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/**
 * How long until a set of states is first entered under a schedule: T is the first step k ≥ 0 in which it is, by the
 * move or by an action; a start inside gives 0. Exact where the numbers of a cycle stay within reach, certified beyond;
 * percentiles and decay are always certified. What isn't known, or not yet, is empty.
 *
 * @param into        the set
 * @param avoiding    states that end the wait without success
 * @param stopped     the chain that is stopped where the wait ends
 * @param values      at the steps asked for
 * @param entrance    whether and when, from the start and from every state
 * @param visits      steps spent in the set
 * @param percentiles those asked for
 * @param decay       of P(T > k) in the long run
 * @param formulas    whether those over the cycles are there
 * @param over        formulas over the cycles
 */
public record ScheduledPassage(List<Integer> into, List<Integer> avoiding, Timetable timetable,
        ScheduledChain stopped, List<At> values, Optional<ScheduledEntrance> entrance,
        Optional<ScheduledVisits> visits, List<Percentile> percentiles,
        Optional<Decay> decay, Formulas formulas, Optional<OverCycles> over) {

    /** Why there are none: not come to yet, or a whole cycle has numbers that are too long. */
    public enum Formulas { NOT_YET, FOUND, TOO_LONG }

    /**
     * As formulas in m.
     *
     * @param laws          P(T = k) at places of the cycle
     * @param distributions P(T ≤ k) likewise
     * @param survivals     P(T > k) likewise
     * @param happening     law and distribution given that the set is entered, where that is neither certain nor
     *                      impossible
     */
    public record OverCycles(List<CycleFormula> laws, List<CycleFormula> distributions, List<CycleFormula> survivals,
            Optional<Happening> happening) {
        public OverCycles {
            laws = List.copyOf(laws);
            distributions = List.copyOf(distributions);
            survivals = List.copyOf(survivals);
        }

        /** All of them that stand on the chain stopped there. */
        public Stream<CycleFormula> all() {
            return Stream.of(laws, distributions, survivals).flatMap(List::stream);
        }
    }

    /** P(T = k | T < ∞) and P(T ≤ k | T < ∞). */
    public record Happening(CycleFormula law, CycleFormula distribution) {
    }

    /**
     * @param law    P(T = k)
     * @param hazard P(T = k | T ≥ k); empty where T ≥ k has probability zero or nothing is certain of it
     */
    public record At(int k, KnownValue law, KnownValue distribution, KnownValue survival, Optional<KnownValue> hazard) {
    }

    /** The factor by which a cycle lessens what P(T > k) is above its limit in the long run, and its T-th root. */
    public record Decay(KnownValue perCycle, KnownValue perStep) {
    }

    public ScheduledPassage {
        into = List.copyOf(into);
        avoiding = List.copyOf(avoiding);
        values = List.copyOf(values);
        percentiles = List.copyOf(percentiles);
    }

    static ScheduledPassage of(StoppedSchedule stopped) {
        return new ScheduledPassage(stopped.into().stream().sorted().toList(),
                stopped.avoiding().stream().sorted().toList(), stopped.chain().timetable(), stopped.chain(), List.of(),
                Optional.empty(), Optional.empty(), List.of(), Optional.empty(), Formulas.NOT_YET, Optional.empty());
    }

    /** Everything about the passage of a chain, from its start; steps ascending. Published after each part. */
    public static ScheduledPassage of(Chain chain, Timetable timetable, Set<Integer> into, Set<Integer> avoiding,
            List<Rational> percentiles, List<Integer> steps, Consumer<ScheduledPassage> published) {
        return new ScheduledPassageAnalysis(ScheduledChain.of(chain, timetable),
                StoppedSchedule.of(chain, timetable, into, avoiding), published).passage(percentiles, steps);
    }

    /** True when all but formulas is known. */
    public boolean isDecided() {
        return entrance.isPresent() && visits.isPresent() && decay.isPresent() && formulas != Formulas.NOT_YET;
    }

    ScheduledPassage withValues(List<At> found) {
        return new ScheduledPassage(into, avoiding, timetable, stopped, found, entrance, visits, percentiles, decay,
                formulas, over);
    }

    ScheduledPassage with(ScheduledEntrance found) {
        return new ScheduledPassage(into, avoiding, timetable, stopped, values, Optional.of(found), visits, percentiles,
                decay, formulas, over);
    }

    ScheduledPassage with(ScheduledVisits found) {
        return new ScheduledPassage(into, avoiding, timetable, stopped, values, entrance, Optional.of(found),
                percentiles, decay, formulas, over);
    }

    ScheduledPassage withPercentiles(List<Percentile> found) {
        return new ScheduledPassage(into, avoiding, timetable, stopped, values, entrance, visits, found, decay,
                formulas, over);
    }

    ScheduledPassage with(Decay found) {
        return new ScheduledPassage(into, avoiding, timetable, stopped, values, entrance, visits, percentiles,
                Optional.of(found), formulas, over);
    }

    ScheduledPassage with(OverCycles found) {
        return new ScheduledPassage(into, avoiding, timetable, stopped, values, entrance, visits, percentiles, decay,
                Formulas.FOUND, Optional.of(found));
    }

    ScheduledPassage withoutFormulas() {
        return new ScheduledPassage(into, avoiding, timetable, stopped, values, entrance, visits, percentiles, decay,
                Formulas.TOO_LONG, over);
    }
}
