package org.pofk.schedule;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.Band;
import org.pofk.answer.When;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Reason;
import org.pofk.answer.When.ResidueClass;
import org.pofk.answer.WhenModel;
import org.pofk.answer.WhenSummary;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRunValues;
import org.pofk.steps.KnownValue;

/**
 * When an output of a scheduled chain meets a condition at the end of step k, after what is done there: the steps
 * P + m T + j of each place j of a cycle are a sequence in m with a closed form, answered as any other; the steps
 * before the cycles are looked at one by one. Proved.
 */
final class ScheduledWhenSearch {
    private static final int BITS = 8192;
    private static final int WALKED = 2_000;

    private final ScheduledChain chain;
    private final Timetable timetable;
    private final Output output;

    ScheduledWhenSearch(ScheduledChain chain, Output output) {
        this.chain = chain;
        this.timetable = chain.timetable();
        this.output = output;
    }

    When of(WhenModel.Asked asked) {
        if (!chain.areAllFormulasWithinReach()) {
            return tooMuch(asked);
        }
        List<CycleFormula> formulas = chain.cycles().formulas(output);
        Condition condition = condition(asked, formulas);
        List<KnownValue> before = chain.before(output);
        List<ResidueClass> classes = new ArrayList<>();
        for (int j = 0; j < formulas.size(); j++) {
            CycleFormula formula = formulas.get(j);
            When when = When.of(chain.cycles().chain(), formula.closedForm(), formula.longRun(), condition);
            if (when.reason() == Reason.NO_LONG_RUN) {
                return new When(condition, walked(condition), Optional.empty(), List.of(), false, Reason.NO_LONG_RUN);
            }
            List<Rational> limits = LongRunValues.of(formula.longRun());
            classes.add(ResidueOfPlace.of(timetable, j, when, (k, m) ->
                    isMet(before.get(k), condition, limits.get(Math.floorMod(m, limits.size())))));
        }
        classes.sort(Comparator.comparing(ResidueClass::residue));
        When together = WhenSummary.of(condition, classes);
        return together.decided() ? together
                : new When(condition, walked(condition), together.forEverFrom(), together.classes(), false,
                        together.reason());
    }

    private static Condition condition(WhenModel.Asked asked, List<CycleFormula> formulas) {
        Rational largest = formulas.stream().flatMap(each -> LongRunValues.of(each.longRun()).stream())
                .map(Rational::abs).reduce(Rational.ZERO, Rational::max);
        return new Condition(asked.kind(), asked.relative() ? asked.bound().times(largest) : asked.bound());
    }

    private When tooMuch(WhenModel.Asked asked) {
        Condition condition = new Condition(asked.kind(), asked.bound());
        return new When(condition, walked(condition), Optional.empty(), List.of(), false, Reason.TOO_MANY_STEPS);
    }

    /** The first of the steps that are looked at one by one where no search says which it is. */
    private Optional<Long> walked(Condition condition) {
        if (condition.kind() == Condition.Kind.SETTLED) {
            return Optional.empty();
        }
        List<KnownValue> values = chain.first(output, WALKED);
        for (int k = 0; k <= WALKED; k++) {
            Optional<Boolean> isMet = isMet(values.get(k), condition, Rational.ZERO);
            if (isMet.isEmpty()) {
                return Optional.empty();
            }
            if (isMet.get()) {
                return Optional.of((long) k);
            }
        }
        return Optional.empty();
    }

    private static Optional<Boolean> isMet(KnownValue value, Condition condition, Rational limit) {
        Band band = condition.around(limit);
        if (value.exact().isPresent()) {
            return Optional.of(band.contains(value.exact().get().minus(limit)));
        }
        Band.Relation relation = band.of(value.enclosure().enclose(BITS).minus(Ball.of(limit, BITS)));
        return relation == Band.Relation.EITHER ? Optional.empty() : Optional.of(relation == Band.Relation.INSIDE);
    }
}
