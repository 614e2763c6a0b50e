package org.pofk.schedule;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.answer.Conditional;
import org.pofk.answer.ConditionalLongRun;
import org.pofk.answer.ConditionalSequence;
import org.pofk.answer.ConditionalWhen;
import org.pofk.answer.Given;
import org.pofk.answer.When;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Reason;
import org.pofk.answer.When.ResidueClass;
import org.pofk.answer.WhenModel;
import org.pofk.answer.WhenSummary;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.modes.RealValue;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.steps.KnownValue;
import org.pofk.steps.PossibleSteps;
import org.pofk.steps.StepValue;

/**
 * When outputs of a model with a schedule, given what is known at the same step after what is done there, meet a
 * condition: for each step of a cycle by the sign of a − t b over the cycles; the steps before the cycles one by one.
 */
public final class ScheduledConditionalWhen {
    private static final int BITS = 8192;

    private final ScheduledChain chain;
    private final Timetable timetable;
    private final Optional<PossibleSteps> possible;
    private final Output event;
    private final List<Place> places;

    private ScheduledConditionalWhen(Model stopped, Given given) {
        this.timetable = Timetable.of(stopped.chain(), stopped.schedule().orElseThrow());
        this.chain = ScheduledChain.of(stopped.chain(), timetable);
        this.possible = PossibleMoments.of(timetable, stopped.chain().start(), given.in()).map(PossibleMoments::after);
        this.event = given.event(stopped.chain());
        this.places = IntStream.range(0, timetable.period()).mapToObj(j -> new Place(j, Side.AFTER)).toList();
    }

    /** The answers, published one after the other; the long run of each is told by the residue of k. */
    public static ConditionalWhen of(Model model, Given given, List<Output> outputs, WhenModel.Asked asked,
            Consumer<ConditionalWhen> published) {
        ScheduledConditionalWhen search = new ScheduledConditionalWhen(given.model(model), given);
        List<ConditionalWhen.Answer> answers = new ArrayList<>();
        for (Output output : outputs) {
            answers.add(search.answer(output, given.joint(output), asked));
            published.accept(new ConditionalWhen(model, given, outputs, search.possible, answers));
        }
        return new ConditionalWhen(model, given, outputs, search.possible, answers);
    }

    private ConditionalWhen.Answer answer(Output output, Output joint, WhenModel.Asked asked) {
        if (possible.filter(PossibleSteps::isNever).isPresent()) {
            return new ConditionalWhen.Answer(output, ConditionalWhen.nothingDefined(asked), ConditionalLongRun.without(
                    ConditionalLongRun.Kind.IMPOSSIBLE_IN_THE_END), List.of());
        }
        if (!chain.areAllFormulasWithinReach() || possible.isEmpty()) {
            return new ConditionalWhen.Answer(output, notDecided(asked, Reason.TOO_MANY_STEPS),
                    ConditionalLongRun.without(possible.isEmpty() ? ConditionalLongRun.Kind.PERIOD_TOO_LONG
                            : ConditionalLongRun.Kind.FORMULAS_TOO_LONG), List.of());
        }
        List<ConditionalSequence> sequences = chain.conditional(joint, event, places);
        List<ConditionalLongRun> limits = sequences.stream().map(ConditionalSequence::longRun).toList();
        When when = when(joint, sequences, limits, asked);
        return new ConditionalWhen.Answer(output, when, bySteps(limits), around(joint, sequences, when));
    }

    private static When notDecided(WhenModel.Asked asked, Reason reason) {
        return new When(new Condition(asked.kind(), asked.bound()), Optional.empty(), Optional.empty(), List.of(),
                false, reason);
    }

    private When when(Output joint, List<ConditionalSequence> sequences, List<ConditionalLongRun> limits,
            WhenModel.Asked asked) {
        Rational size = asked.relative() ? limits.stream().map(ConditionalLongRun::largest)
                .reduce(Rational.ZERO, Rational::max) : Rational.ONE;
        WhenModel.Asked absolute = new WhenModel.Asked(asked.kind(), asked.bound().times(size), false);
        Condition condition = new Condition(absolute.kind(), absolute.bound());
        List<KnownValue> above = chain.before(joint).stream().map(Reading::after).toList();
        List<KnownValue> below = chain.before(event).stream().map(Reading::after).toList();
        List<ResidueClass> classes = new ArrayList<>();
        for (int j = 0; j < timetable.period(); j++) {
            When inCycles = sequences.get(j).when(absolute);
            if (inCycles.reason() == Reason.NO_LONG_RUN) {
                return notDecided(absolute, Reason.NO_LONG_RUN);
            }
            ConditionalLongRun limit = limits.get(j);
            classes.add(ResidueOfPlace.of(timetable, j, inCycles, (k, m) -> possible.get().at(k)
                    ? isMet(above.get(k), below.get(k), condition, limit.at(m)) : Optional.of(false)));
        }
        classes.sort(Comparator.comparing(ResidueClass::residue));
        return WhenSummary.of(condition, classes);
    }

    private static Optional<Boolean> isMet(KnownValue above, KnownValue below, Condition condition,
            Optional<RealValue> limit) {
        return switch (condition.kind()) {
            case AT_LEAST -> sign(above, below, condition.bound()).map(sign -> sign >= 0);
            case AT_MOST -> sign(above, below, condition.bound()).map(sign -> sign <= 0);
            case SETTLED -> limit.isEmpty() ? Optional.of(false) : isNear(above, below, condition.bound(), limit.get());
        };
    }

    /** Of a − t b, b not being zero. */
    private static Optional<Integer> sign(KnownValue above, KnownValue below, Rational t) {
        if (above.exact().isPresent() && below.exact().isPresent()) {
            return Optional.of(above.exact().get().minus(below.exact().get().times(t)).signum());
        }
        Ball difference = above.enclosure().enclose(BITS)
                .minus(below.enclosure().enclose(BITS).times(Ball.of(t, BITS)));
        return difference.sign().stream().boxed().findFirst();
    }

    /** A limit that is no fraction stands between two that are near; both have to give the same answer. */
    private static Optional<Boolean> isNear(KnownValue above, KnownValue below, Rational bound, RealValue limit) {
        Rational near = ConditionalLongRun.near(limit);
        Rational within = limit.rational().isPresent() ? Rational.ZERO : ConditionalLongRun.NEAR_WITHIN;
        Optional<Boolean> inner = isNear(above, below, near, bound.minus(within));
        Optional<Boolean> outer = isNear(above, below, near, bound.plus(within));
        return inner.equals(outer) ? inner : Optional.empty();
    }

    private static Optional<Boolean> isNear(KnownValue above, KnownValue below, Rational middle, Rational distance) {
        return sign(above, below, middle.minus(distance)).flatMap(low ->
                sign(above, below, middle.plus(distance)).map(high -> low >= 0 && high <= 0));
    }

    /** By the residue of k. */
    private ConditionalLongRun bySteps(List<ConditionalLongRun> limits) {
        int cycles = limits.stream().mapToInt(each -> Math.max(1, each.values().size())).max().orElseThrow();
        boolean isListed = limits.stream().allMatch(each -> cycles % Math.max(1, each.values().size()) == 0)
                && limits.stream().noneMatch(each -> each.kind() == ConditionalLongRun.Kind.PERIOD_TOO_LONG);
        int steps = cycles * timetable.period();
        return !isListed ? ConditionalLongRun.without(ConditionalLongRun.Kind.PERIOD_TOO_LONG)
                : ConditionalLongRun.of(IntStream.range(0, steps).mapToObj(k -> {
                    int late = Math.floorMod(k - timetable.before(), steps);
                    return limits.get(late % timetable.period()).at(late / timetable.period());
                }).toList());
    }

    /** The values just before and at the two steps that were found. */
    private List<Conditional.At> around(Output joint, List<ConditionalSequence> sequences, When when) {
        List<Integer> steps = Stream.of(when.first(), when.forEverFrom()).flatMap(Optional::stream)
                .flatMap(k -> Stream.of(k - 1, k)).filter(k -> k >= 0 && k <= Integer.MAX_VALUE)
                .map(Long::intValue).distinct().sorted().toList();
        List<Optional<KnownValue>> above = chain.after(joint, steps);
        List<Optional<KnownValue>> below = chain.after(event, steps);
        return IntStream.range(0, steps.size()).mapToObj(i -> new Conditional.At(steps.get(i),
                possible.orElseThrow().at(steps.get(i)) ? Optional.of(value(steps.get(i), above.get(i).orElseThrow(),
                        below.get(i).orElseThrow(), sequences)) : Optional.empty())).toList();
    }

    private StepValue value(int k, KnownValue above, KnownValue below, List<ConditionalSequence> sequences) {
        Timetable.Place place = timetable.place(k);
        KnownValue value = below.exact().isEmpty() && place.cycle().isPresent()
                ? KnownValue.of(sequences.get(place.within()).at(place.cycle().getAsInt())) : above.over(below);
        return new StepValue(k, value.exact(), value.enclosure());
    }
}
