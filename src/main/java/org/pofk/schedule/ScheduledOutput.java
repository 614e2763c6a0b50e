package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Output;

/**
 * What is known of one output under a schedule. What wasn't reached within a budget is empty; what is there is proven.
 *
 * @param preamble the steps 0 … P before the first cycle, where there are any
 * @param first    the first cycle, steps P … P + T
 * @param regime   what the cycles tend to
 * @param within   formulas within a cycle
 * @param over     formulas over the cycles
 * @param joint    both at once
 * @param values   at the steps asked for, {@code j} being the step k itself
 */
public record ScheduledOutput(Output output, Optional<CycleCourse> preamble, Optional<CycleCourse> first,
        Optional<PeriodicRegime> regime, List<StretchFormula> within, List<CycleFormula> over,
        Optional<JointFormula> joint, List<CycleCourse.Reading> values) {

    public ScheduledOutput {
        within = List.copyOf(within);
        over = List.copyOf(over);
        values = List.copyOf(values);
    }

    static ScheduledOutput of(Output output) {
        return new ScheduledOutput(output, Optional.empty(), Optional.empty(), Optional.empty(), List.of(), List.of(),
                Optional.empty(), List.of());
    }

    ScheduledOutput withFirst(Optional<CycleCourse> before, CycleCourse found) {
        return new ScheduledOutput(output, before, Optional.of(found), regime, within, over, joint, values);
    }

    ScheduledOutput with(PeriodicRegime found) {
        return new ScheduledOutput(output, preamble, first, Optional.of(found), within, over, joint, values);
    }

    /** The same with these formulas within a cycle. */
    public ScheduledOutput withWithin(List<StretchFormula> found) {
        return new ScheduledOutput(output, preamble, first, regime, found, over, joint, values);
    }

    /** The same with these formulas over the cycles. */
    public ScheduledOutput withOver(List<CycleFormula> found) {
        return new ScheduledOutput(output, preamble, first, regime, within, found, joint, values);
    }

    ScheduledOutput with(JointFormula found) {
        return new ScheduledOutput(output, preamble, first, regime, within, over, Optional.of(found), values);
    }

    ScheduledOutput withValues(List<CycleCourse.Reading> found) {
        return new ScheduledOutput(output, preamble, first, regime, within, over, joint, found);
    }

    /** The same under another name. */
    public ScheduledOutput named(String name) {
        return new ScheduledOutput(new Output(name, output.coefficients(), output.constant(), output.definition()),
                preamble, first, regime, within, over, joint, values);
    }
}
