package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Output;
import org.pofk.longrun.LongRunChecks;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.StepValue;
import org.pofk.transform.Transform;

/**
 * What is known of one output. What wasn't reached within a budget, or wasn't asked for, is empty; what is there is
 * proven.
 *
 * @param values at the steps asked for
 */
public record DerivedOutput(Output output, Optional<Transform> transform, Optional<LongRunChecks> longRun,
        Optional<ClosedForm> closedForm, Optional<Comparison> comparison, Optional<PoleCheck> poleCheck,
        Optional<SecondOpinion> secondOpinion, Optional<AbsentEigenvalues> absent, List<StepValue> values) {

    public DerivedOutput {
        values = List.copyOf(values);
    }

    /** Nothing is known yet. */
    static DerivedOutput of(Output output) {
        return new DerivedOutput(output, Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty(),
                Optional.empty(), Optional.empty(), Optional.empty(), List.of());
    }

    /** True when formula and long run are known: the answer proper. */
    public boolean isDecided() {
        return closedForm.isPresent() && longRun.isPresent();
    }

    DerivedOutput with(Transform found) {
        return new DerivedOutput(output, Optional.of(found), longRun, closedForm, comparison, poleCheck,
                secondOpinion, absent, values);
    }

    DerivedOutput with(LongRunChecks found) {
        return new DerivedOutput(output, transform, Optional.of(found), closedForm, comparison, poleCheck,
                secondOpinion, absent, values);
    }

    DerivedOutput with(ClosedForm found) {
        return new DerivedOutput(output, transform, longRun, Optional.of(found), comparison, poleCheck,
                secondOpinion, absent, values);
    }

    DerivedOutput with(Comparison found) {
        return new DerivedOutput(output, transform, longRun, closedForm, Optional.of(found), poleCheck,
                secondOpinion, absent, values);
    }

    DerivedOutput with(PoleCheck found) {
        return new DerivedOutput(output, transform, longRun, closedForm, comparison, Optional.of(found),
                secondOpinion, absent, values);
    }

    DerivedOutput with(SecondOpinion found) {
        return new DerivedOutput(output, transform, longRun, closedForm, comparison, poleCheck, Optional.of(found),
                absent, values);
    }

    DerivedOutput with(AbsentEigenvalues found) {
        return new DerivedOutput(output, transform, longRun, closedForm, comparison, poleCheck, secondOpinion,
                Optional.of(found), values);
    }

    DerivedOutput with(List<StepValue> found) {
        return new DerivedOutput(output, transform, longRun, closedForm, comparison, poleCheck, secondOpinion, absent, found);
    }
}
