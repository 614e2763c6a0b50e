package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.steps.StepValue;

/**
 * One output given what is known at the same step: E[output at k, and known] over P(known at k), two closed forms with
 * their proofs. Undefined where the second is zero, which is decided by the moves alone.
 *
 * @param joint   the quotient's numerator, named like the output
 * @param longRun empty where it wasn't reached within a budget
 * @param values  at the steps asked for; empty where what is known is impossible
 */
public record Conditional(DerivedOutput joint, Optional<ConditionalLongRun> longRun, List<At> values) {

    /** The value at one step. */
    public record At(int k, Optional<StepValue> value) {
    }

    public Conditional {
        values = List.copyOf(values);
    }
}
