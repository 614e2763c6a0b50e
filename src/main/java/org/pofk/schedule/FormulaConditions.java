package org.pofk.schedule;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.answer.Constraint;
import org.pofk.answer.When.Condition;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Output;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRunValues;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.KnownValue;

/** By a formula in m for each place of a cycle. Exact. */
final class FormulaConditions implements CycleConditions {
    private final Map<Place, CycleFormula> formulas;
    private final Map<Place, Constraint> constraints;
    private final Condition condition;

    private FormulaConditions(Map<Place, CycleFormula> formulas, Map<Place, Constraint> constraints,
            Condition condition) {
        this.formulas = formulas;
        this.constraints = constraints;
        this.condition = condition;
    }

    /** Empty where one of them has no long run. */
    static Optional<FormulaConditions> of(CycleChain cycles, Output output, List<Place> places, WhenModel.Asked asked) {
        Map<Place, CycleFormula> formulas = new HashMap<>();
        for (CycleFormula formula : cycles.formulas(output, places)) {
            formulas.put(formula.place().orElseThrow(), formula);
        }
        Rational largest = formulas.values().stream().flatMap(each -> LongRunValues.of(each.longRun()).stream())
                .map(Rational::abs).reduce(Rational.ZERO, Rational::max);
        Condition condition = asked.of(largest);
        Map<Place, Constraint> constraints = new HashMap<>();
        formulas.forEach((place, formula) -> Constraint.of(cycles.chain(), formula.closedForm(), formula.longRun(),
                condition).ifPresent(constraint -> constraints.put(place, constraint)));
        return constraints.size() < formulas.size() ? Optional.empty()
                : Optional.of(new FormulaConditions(formulas, constraints, condition));
    }

    @Override
    public Condition condition() {
        return condition;
    }

    @Override
    public Constraint at(Place place) {
        return constraints.get(place);
    }

    @Override
    public KnownValue limit(Place place, long residue) {
        List<Rational> limits = LongRunValues.of(formulas.get(place).longRun());
        Rational limit = limits.get((int) Math.floorMod(residue, (long) limits.size()));
        return new KnownValue(KnownValue.Word.EXACT, Optional.of(limit), Enclosed.of(limit));
    }
}
