package org.pofk.schedule;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.longrun.Settling;
import org.pofk.schedule.ScheduledPassage.At;
import org.pofk.schedule.ScheduledPassage.Decay;
import org.pofk.schedule.ScheduledPassage.OverCycles;
import org.pofk.schedule.ScheduledWait.Ever;
import org.pofk.steps.KnownValue;

/** Puts a {@link ScheduledPassage} together, part by part. */
final class ScheduledPassageAnalysis {
    private static final int PLACES_AT_MOST = 6;
    private static final int SETTLED_DIGITS = 6;

    private final ScheduledChain unstopped;
    private final StoppedSchedule stopped;
    private final Timetable timetable;
    private final Consumer<ScheduledPassage> published;
    private ScheduledPassage known;

    ScheduledPassageAnalysis(ScheduledChain unstopped, StoppedSchedule stopped, Consumer<ScheduledPassage> published) {
        this.unstopped = unstopped;
        this.stopped = stopped;
        this.timetable = stopped.chain().timetable();
        this.published = published;
        this.known = ScheduledPassage.of(stopped);
    }

    ScheduledPassage passage(List<Rational> percentiles, List<Integer> steps) {
        if (!steps.isEmpty()) {
            publish(known.withValues(values(steps)));
        }
        if (stopped.chain().areFormulasWithinReach()) {
            exactly(percentiles, steps);
        } else {
            bounded(percentiles);
        }
        return known;
    }

    private void publish(ScheduledPassage next) {
        known = next;
        published.accept(next);
    }

    private List<At> values(List<Integer> steps) {
        List<Integer> all = steps.stream().flatMap(k -> Stream.of(k - 1, k)).filter(k -> k >= 0).distinct().sorted()
                .toList();
        Map<Integer, KnownValue> entered = at(all, stopped.distribution());
        Map<Integer, KnownValue> waiting = at(all, stopped.survival());
        List<At> values = new ArrayList<>();
        for (int k : steps) {
            KnownValue law = k == 0 ? entered.get(0) : entered.get(k).minus(entered.get(k - 1));
            KnownValue before = k == 0 ? KnownValue.of(Rational.ONE) : waiting.get(k - 1);
            boolean isOver = before.exact().filter(Rational::isZero).isPresent();
            values.add(new At(k, law, entered.get(k), waiting.get(k), isOver ? Optional.empty()
                    : law.dividedBy(before)));
        }
        return values;
    }

    private Map<Integer, KnownValue> at(List<Integer> steps, Output output) {
        List<Optional<KnownValue>> values = stopped.chain().after(output, steps);
        Map<Integer, KnownValue> byStep = new HashMap<>();
        IntStream.range(0, steps.size()).forEach(i -> byStep.put(steps.get(i), values.get(i).orElseThrow()));
        return byStep;
    }

    private void exactly(List<Rational> percentiles, List<Integer> steps) {
        entrance(BackwardExactly.of(stopped.chain()));
        ScheduledVisits.of(unstopped, stopped.distribution().coefficients(), BackwardExactly.of(unstopped))
                .ifPresent(found -> publish(known.with(found)));
        ScheduledWait wait = known.entrance().orElseThrow().first();
        Rational probability = wait.probability().exact().orElseThrow();
        ScheduledPercentiles finder = new ScheduledPercentiles(stopped, probability);
        publish(known.withPercentiles(percentiles.stream().map(finder::of).toList()));
        CycleChain cycles = stopped.chain().cycles();
        CycleFormula survival = cycles.formula(stopped.survival(), 0);
        publish(known.with(decay(Settling.of(survival.closedForm(), survival.longRun(), SETTLED_DIGITS)
                .flatMap(Settling::slowest))));
        publish(known.with(over(cycles, wait, probability, steps)));
    }

    private Decay decay(Optional<Enclosed> perCycle) {
        return perCycle.map(factor -> new Decay(KnownValue.of(factor), KnownValue.of(factor.map(ball ->
                ball.root(timetable.period()))))).orElse(new Decay(KnownValue.of(Rational.ZERO),
                KnownValue.of(Rational.ZERO)));
    }

    private OverCycles over(CycleChain cycles, ScheduledWait wait, Rational probability, List<Integer> steps) {
        List<Integer> places = places(steps);
        List<CycleFormula> laws = places.stream().map(j -> j == 0 ? timetable.period() : j).sorted()
                .map(j -> cycles.difference(stopped.distribution(), j)).toList();
        return new OverCycles(laws, places.stream().map(j -> cycles.formula(stopped.distribution(), j)).toList(),
                places.stream().map(j -> cycles.formula(stopped.survival(), j)).toList(),
                wait.ever() != Ever.PERHAPS ? Optional.empty() : Optional.of(new ScheduledPassage.Happening(
                        cycles.difference(stopped.distributionOver(probability), timetable.period()),
                        cycles.formula(stopped.distributionOver(probability), 0))));
    }

    /** The beginning of a cycle, and where the steps asked for lie. */
    private List<Integer> places(List<Integer> steps) {
        return Stream.concat(Stream.of(0), steps.stream().filter(k -> k >= timetable.before())
                .map(k -> timetable.place(k).within())).distinct().limit(PLACES_AT_MOST).sorted().toList();
    }

    private void bounded(List<Rational> percentiles) {
        BackwardBounded bounds = BackwardBounded.of(timetable);
        entrance(bounds);
        ScheduledVisits.of(unstopped, stopped.distribution().coefficients(), BackwardBounded.of(unstopped.timetable()))
                .ifPresent(found -> publish(known.with(found)));
        known.entrance().ifPresent(found -> {
            BoundedPercentiles finder = new BoundedPercentiles(stopped, found.first());
            publish(known.withPercentiles(percentiles.stream().map(finder::of).toList()));
        });
        CycleDecay.of(bounds.cycle(), CycleGraph.of(timetable, stopped.chain().chain().start()),
                EntranceGraph.of(stopped).open()).ifPresent(factor -> publish(known.with(factor.center().signum() == 0
                && factor.isExact() ? decay(Optional.empty()) : new Decay(KnownValue.within(factor),
                        KnownValue.within(factor.root(timetable.period()))))));
        publish(known.withoutFormulas());
    }

    private <W> void entrance(BackwardArithmetic<W> arithmetic) {
        ScheduledEntrance.of(stopped, unstopped.timetable(), arithmetic)
                .ifPresent(found -> publish(known.with(found)));
    }
}
