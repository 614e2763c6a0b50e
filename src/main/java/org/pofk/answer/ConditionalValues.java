package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.OutermostPole;
import org.pofk.steps.ModeValues;
import org.pofk.steps.PossibleSteps;
import org.pofk.steps.StepValue;

/**
 * Quotients of two outputs' values, the second never negative: exact where both are, certified elsewhere, in units of
 * the second's outermost pole's power, from which neither is far.
 */
final class ConditionalValues {
    private static final int SCALE_BITS = 64;

    private ConditionalValues() {
    }

    /** @param above and below, values at the same steps */
    static List<Conditional.At> of(List<StepValue> above, ClosedForm aboveForm, List<StepValue> below,
            ClosedForm belowForm, Optional<PossibleSteps> possible) {
        List<Conditional.At> values = new ArrayList<>();
        for (int i = 0; i < above.size(); i++) {
            StepValue one = above.get(i);
            StepValue other = below.get(i);
            boolean isPossible = other.exact().map(value -> !value.isZero())
                    .orElseGet(() -> possible.stream().anyMatch(each -> each.at(other.k())));
            values.add(new Conditional.At(one.k(), isPossible
                    ? Optional.of(quotient(one, aboveForm, other, belowForm)) : Optional.empty()));
        }
        return values;
    }

    private static StepValue quotient(StepValue above, ClosedForm aboveForm, StepValue below, ClosedForm belowForm) {
        if (above.exact().isPresent() && below.exact().isPresent()) {
            Rational exact = above.exact().get().dividedBy(below.exact().get());
            return new StepValue(above.k(), Optional.of(exact), Enclosed.of(exact));
        }
        return new StepValue(above.k(), Optional.empty(), quotient(above.k(), aboveForm, belowForm));
    }

    /** At a step far enough for the second's modes to be above zero. */
    static Enclosed quotient(int k, ClosedForm above, ClosedForm below) {
        Rational unit = OutermostPole.of(below).orElseThrow().value().enclose(SCALE_BITS).middle();
        return ModeValues.of(above).inUnitsOf(unit).at(k).dividedBy(ModeValues.of(below).inUnitsOf(unit).at(k));
    }
}
