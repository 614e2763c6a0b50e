package org.pofk.schedule;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.pofk.answer.Band;
import org.pofk.answer.Constraint;
import org.pofk.answer.When;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.End;
import org.pofk.answer.When.Reason;
import org.pofk.answer.When.ResidueClass;
import org.pofk.answer.WhenModel;
import org.pofk.answer.WhenSearch;
import org.pofk.answer.WhenSummary;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.schedule.ScheduledWhen.Sides;
import org.pofk.steps.KnownValue;

/**
 * When an output of a scheduled chain meets a condition at step k, just before or just after what is done there or both
 * times: the steps P + m T + j of each place j = 1 … T of a cycle are a sequence in m, answered as any other; the steps
 * up to P are looked at one by one. Proved.
 */
final class ScheduledWhenSearch {
    private static final KnownValue ZERO =
            new KnownValue(KnownValue.Word.EXACT, Optional.of(Rational.ZERO), Enclosed.of(Rational.ZERO));
    private static final int[] BITS = {160, 8192};
    private static final int WALKED = 2_000;
    private static final long CLASSES_AT_MOST = 200_000;
    private static final long FEW_CLASSES = 120;

    private final ScheduledChain chain;
    private final Timetable timetable;
    private final Output output;
    private final Sides sides;

    ScheduledWhenSearch(ScheduledChain chain, Output output, Sides sides) {
        this.chain = chain;
        this.timetable = chain.timetable();
        this.output = output;
        this.sides = sides;
    }

    When of(WhenModel.Asked asked) {
        return chain.formulasWithinReach() >= places().size() ? byFormulas(asked) : byEnclosures(asked);
    }

    When byFormulas(WhenModel.Asked asked) {
        return FormulaConditions.of(chain.cycles(), output, places(), asked).map(this::answer)
                .orElseGet(() -> undecided(asked, Reason.NO_LONG_RUN));
    }

    When byEnclosures(WhenModel.Asked asked) {
        return EnclosedConditions.of(chain, output, places(), asked).map(this::alike)
                .orElseGet(() -> undecided(asked, Reason.TOO_MANY_STEPS));
    }

    private List<Place> places() {
        return IntStream.rangeClosed(1, timetable.period()).boxed().flatMap(j -> places(j).stream()).toList();
    }

    /** The places at step j of a cycle that are asked about. */
    private List<Place> places(int j) {
        return sides.of(timetable.at(timetable.before() + j)).stream().map(side -> new Place(j, side)).toList();
    }

    private When undecided(WhenModel.Asked asked, Reason reason) {
        Condition condition = new Condition(asked.kind(), asked.bound());
        return new When(condition, walked(condition), Optional.empty(), List.of(), false, reason);
    }

    /** The answer where conditions that enclose the one asked all say the same. */
    private When alike(List<? extends CycleConditions> conditions) {
        List<When> answers = conditions.stream().map(this::answer).toList();
        When last = answers.get(answers.size() - 1);
        return answers.stream().allMatch(each -> each.classes().equals(last.classes())) ? last
                : new When(last.condition(), Optional.empty(), Optional.empty(), List.of(), false,
                        Reason.TOO_MANY_STEPS);
    }

    private When answer(CycleConditions conditions) {
        List<WhenSearch> searches = IntStream.rangeClosed(1, timetable.period())
                .mapToObj(j -> new WhenSearch(constraints(conditions, j))).toList();
        long modulus = modulus(conditions, searches);
        if (modulus * timetable.period() > CLASSES_AT_MOST) {
            return new When(conditions.condition(), walked(conditions.condition()), Optional.empty(), List.of(), false,
                    Reason.TOO_MANY_STEPS);
        }
        List<Reading> before = chain.before(output);
        List<ResidueClass> classes = new ArrayList<>();
        for (int j = 1; j <= timetable.period(); j++) {
            for (ResidueClass each : searches.get(j - 1).classes(modulus)) {
                classes.add(residueClass(conditions, j, each, before));
            }
        }
        classes.sort(Comparator.comparing(ResidueClass::residue));
        When together = WhenSummary.of(conditions.condition(), classes);
        return together.decided() ? together
                : new When(together.condition(), walked(together.condition()), together.forEverFrom(),
                        together.classes(), false, together.reason());
    }

    private List<Constraint> constraints(CycleConditions conditions, int j) {
        return places(j).stream().map(conditions::at).toList();
    }

    /** After so many cycles all places are where they were, and the phases of what decays too while that is few. */
    private long modulus(CycleConditions conditions, List<WhenSearch> searches) {
        long modulus = 1;
        for (int j = 1; j <= timetable.period(); j++) {
            for (Constraint constraint : constraints(conditions, j)) {
                modulus = LeastCommonMultiple.of(modulus, constraint.period());
            }
        }
        long most = Math.max(2 * modulus, FEW_CLASSES);
        for (WhenSearch search : searches) {
            long next = search.modulus(modulus);
            modulus = next <= most ? next : modulus;
        }
        return modulus;
    }

    /** The first of the steps that are looked at one by one where no search says which it is. */
    private Optional<Long> walked(Condition condition) {
        if (condition.kind() == Condition.Kind.SETTLED) {
            return Optional.empty();
        }
        for (Reading reading : chain.first(output, WALKED)) {
            Optional<Boolean> isMet = isMet(reading, condition, side -> ZERO);
            if (isMet.isEmpty()) {
                return Optional.empty();
            }
            if (isMet.get()) {
                return Optional.of((long) reading.j());
            }
        }
        return Optional.empty();
    }

    /** The steps k of a class of cycles, those before the cycles included. */
    private ResidueClass residueClass(CycleConditions conditions, int j, ResidueClass cycles, List<Reading> before) {
        long period = timetable.period();
        long begin = timetable.before() + j;
        long stride = period * cycles.modulus();
        long start = begin + cycles.residue() * period;
        Optional<Long> first = cycles.first().map(m -> begin + m * period);
        Optional<Long> forEver = cycles.forEverFrom().map(m -> begin + m * period);
        boolean holdsSoFar = forEver.equals(Optional.of(start));
        for (long k = start - stride; k >= 0; k -= stride) {
            Optional<Boolean> isMet = isMet(before.get((int) k), conditions.condition(), side ->
                    conditions.limit(place(j, side), cycles.residue()));
            if (isMet.isEmpty()) {
                return new ResidueClass(start % stride, stride, End.TOO_MANY_STEPS, Optional.empty(), Optional.empty());
            }
            holdsSoFar &= isMet.get();
            first = isMet.get() ? Optional.of(k) : first;
            forEver = holdsSoFar ? Optional.of(k) : forEver;
        }
        return new ResidueClass(start % stride, stride, cycles.end(), first, forEver);
    }

    /** Where nothing is done at step j, both sides are one. */
    private Place place(int j, Side side) {
        return places(j).size() == 1 ? places(j).get(0) : new Place(j, side);
    }

    private Optional<Boolean> isMet(Reading reading, Condition condition, Function<Side, KnownValue> limit) {
        boolean isMet = true;
        for (Side side : sides.all()) {
            Optional<Boolean> here = isMet(reading.at(side), condition, limit.apply(side));
            if (here.isEmpty()) {
                return here;
            }
            isMet &= here.get();
        }
        return Optional.of(isMet);
    }

    private static Optional<Boolean> isMet(KnownValue value, Condition condition, KnownValue limit) {
        boolean settles = condition.kind() == Condition.Kind.SETTLED;
        Band band = condition.around(Rational.ZERO);
        if (value.exact().isPresent() && (!settles || limit.exact().isPresent())) {
            return Optional.of(band.contains(settles ? value.exact().get().minus(limit.exact().get())
                    : value.exact().get()));
        }
        Band.Relation relation = Band.Relation.EITHER;
        for (int i = 0; i < BITS.length && relation == Band.Relation.EITHER; i++) {
            Ball here = value.enclosure().enclose(BITS[i]);
            relation = band.of(settles ? here.minus(limit.enclosure().enclose(BITS[i])) : here);
        }
        return relation == Band.Relation.EITHER ? Optional.empty() : Optional.of(relation == Band.Relation.INSIDE);
    }
}
