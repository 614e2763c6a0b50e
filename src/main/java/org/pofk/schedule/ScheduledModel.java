package org.pofk.schedule;

import java.util.List;
import org.pofk.chain.Model;
import org.pofk.chain.Timetable;
import org.pofk.steps.StateArithmetic;

/**
 * All that was found about some outputs of a model with a schedule, in the order in which they were asked for.
 *
 * @param formulasLeftOut true when formulas over the cycles would take too long and weren't asked for regardless
 */
public record ScheduledModel(Model model, Timetable timetable, List<ScheduledOutput> outputs, boolean formulasLeftOut) {
    public ScheduledModel {
        outputs = List.copyOf(outputs);
    }

    /** True when the first cycle and the long run of every output are known. */
    public boolean isDecided() {
        return outputs.stream().allMatch(output -> output.first().isPresent() && output.regime().isPresent());
    }

    /** How many digits the numerators and denominators of a whole cycle's matrix have at most, about. */
    public long cycleDigits() {
        return CycleMatrices.bits(timetable, StateArithmetic.Whole.of(timetable)) * 30_103 / 100_000;
    }
}
