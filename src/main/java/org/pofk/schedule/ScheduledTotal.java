package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.pofk.answer.Growth;
import org.pofk.answer.Increment;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.steps.KnownValue;

/**
 * What is added up over the steps k = 0 … K of a model with a schedule, K included, after what is done at its end.
 * Exact; the formulas hold for every cycle m.
 *
 * @param increment what is added up
 * @param factor    v, with which each later step counts less; one where nothing is discounted
 * @param recursion the chain with what is added up as one more component, whose output the total is
 * @param over      over whole cycles; empty where the numbers of a cycle are too long for formulas
 * @param values    at the steps asked for
 */
public record ScheduledTotal(Increment increment, Rational factor, Output total, ScheduledChain recursion, int period,
        Optional<OverCycles> over, List<At> values) {

    /** What is asked for: the increment of a chain by its matrix, and how much less each later step counts. */
    public record Asked(Function<Chain, Increment> increment, Rational factor) {
    }

    /**
     * @param total  up to the beginning of cycle m, step P + m T
     * @param cycle  what the steps of cycle m add, P + m T + 1 … P + (m+1) T
     * @param growth of the total, by cycles
     */
    public record OverCycles(CycleFormula total, CycleFormula cycle, Growth growth) {
    }

    /** The total of the steps 0 … k, and that over k + 1; empty where it isn't within reach. */
    public record At(int k, Optional<KnownValue> total) {
        public Optional<KnownValue> average() {
            Rational share = Rational.of(1, k + 1);
            return total.map(value -> new KnownValue(value.word(), value.exact().map(share::times),
                    value.enclosure().times(Enclosed.of(share))));
        }
    }

    public ScheduledTotal {
        values = List.copyOf(values);
    }

    static ScheduledTotal of(Model model, Timetable timetable, Asked asked, List<Integer> steps) {
        ScheduledIncrement increment =
                ScheduledIncrement.of(model.chain(), timetable, asked.increment, model.costs());
        SummedSchedule summed = SummedSchedule.of(model.chain(), timetable, increment, asked.factor);
        List<Optional<KnownValue>> values = steps.isEmpty() ? List.of() : summed.recursion().after(summed.total(), steps);
        return new ScheduledTotal(increment.own(), asked.factor, summed.total(), summed.recursion(), timetable.period(), over(summed),
                IntStream.range(0, steps.size()).mapToObj(i -> new At(steps.get(i), values.get(i))).toList());
    }

    private static Optional<OverCycles> over(SummedSchedule summed) {
        if (!summed.recursion().areFormulasWithinReach()) {
            return Optional.empty();
        }
        CycleChain cycles = summed.recursion().cycles();
        CycleFormula total = cycles.formula(summed.total(), 0);
        CycleFormula cycle = cycles.added(summed.total());
        return Optional.of(new OverCycles(total, cycle,
                Growth.of(cycles.chain(), cycle.longRun(), total.closedForm().transform().y())));
    }

    /** What a step adds on average in the long run, where that is known. */
    public Optional<Rational> perStep() {
        return over.map(each -> each.growth.perStep().dividedBy(Rational.of(period)));
    }

    public boolean isDecided() {
        return over.isPresent() && values.stream().allMatch(each -> each.total.isPresent());
    }
}
