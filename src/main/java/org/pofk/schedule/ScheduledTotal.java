package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.pofk.answer.Growth;
import org.pofk.answer.Increment;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
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
 * @param bounds    what is certified in place of these
 * @param values    at the steps asked for
 */
public record ScheduledTotal(Increment increment, Rational factor, Output total, ScheduledChain recursion, int period,
        Optional<OverCycles> over, Optional<Bounds> bounds, List<At> values) {

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

    /**
     * What is certain where the numbers of a cycle are too long for formulas.
     *
     * @param perCycle   what a cycle adds in the long run
     * @param perStep    that over its steps
     * @param everything the total of all steps, where later ones count less
     */
    public record Bounds(Optional<KnownValue> perCycle, Optional<KnownValue> perStep, Optional<KnownValue> everything) {
        static Bounds of(BoundedTotal total, Rational factor, int period) {
            Optional<KnownValue> perCycle = factor.isOne() ? total.perCycle() : Optional.empty();
            return new Bounds(perCycle, perCycle.map(each -> each.over(KnownValue.of(Rational.of(period)))),
                    factor.compareTo(Rational.ONE) < 0 ? total.everything() : Optional.empty());
        }

        boolean isKnown() {
            return perCycle.isPresent() || everything.isPresent();
        }
    }

    /**
     * The total of the steps 0 … k, and that over how many of them count: k + 1, for entries k, and none at k = 0. Empty
     * where they aren't known.
     */
    public record At(int k, Optional<KnownValue> total, Optional<KnownValue> average) {
        static At of(Increment increment, int k, Optional<KnownValue> total) {
            long counted = increment.kind() == Increment.Kind.ENTRIES ? k : k + 1L;
            return new At(k, total, total.filter(value -> counted > 0)
                    .map(value -> value.over(KnownValue.of(Rational.of(counted)))));
        }
    }

    public ScheduledTotal {
        values = List.copyOf(values);
    }

    /** Published when its values are known, and whole. */
    static ScheduledTotal of(Model model, Timetable timetable, Asked asked, List<Integer> steps,
            Consumer<ScheduledTotal> published) {
        Chain chain = model.chain();
        ScheduledIncrement increment = ScheduledIncrement.of(chain, timetable, asked.increment, model.costs());
        SummedSchedule summed = SummedSchedule.of(chain, timetable, increment, asked.factor);
        boolean isBounded = chain.kind() == Chain.Kind.CHAIN && !summed.recursion().areFormulasWithinReach();
        Optional<BoundedTotal> bounded = isBounded
                ? Optional.of(BoundedTotal.of(chain, timetable, increment, asked.factor)) : Optional.empty();
        List<Optional<KnownValue>> values = steps.isEmpty() ? List.of()
                : summed.recursion().after(summed.total(), steps);
        ScheduledTotal known = new ScheduledTotal(increment.own(), asked.factor, summed.total(), summed.recursion(),
                timetable.period(), Optional.empty(), Optional.empty(), IntStream.range(0, steps.size()).mapToObj(i ->
                At.of(increment.own(), steps.get(i), values.get(i)
                        .or(() -> bounded.map(total -> total.at(steps.get(i))))))
                .toList());
        published.accept(known);
        return known.with(over(summed), bounded.map(total -> Bounds.of(total, asked.factor, timetable.period())));
    }

    private ScheduledTotal with(Optional<OverCycles> found, Optional<Bounds> between) {
        return new ScheduledTotal(increment, factor, total, recursion, period, found, between, values);
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
        return (over.isPresent() || bounds.filter(Bounds::isKnown).isPresent())
                && values.stream().allMatch(each -> each.total.isPresent());
    }
}
