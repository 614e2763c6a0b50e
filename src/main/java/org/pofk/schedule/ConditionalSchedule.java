package org.pofk.schedule;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.Given;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.schedule.ConditionalCourse.Reading;

/**
 * Outputs of a model with a schedule given what is known at the same moment: quotients of two formulas that are shown
 * and proved, N(k)/D(k).
 *
 * @param stopped  what was found of D and then of the N, in the order of {@code outputs}: of the model in which what is
 *                 entered that is known never to have been isn't left again, neither by a move nor by an action
 * @param possible at which steps what is known can be; empty where that repeats too late to be said
 */
public record ConditionalSchedule(Model model, Given given, ScheduledModel stopped, Optional<PossibleMoments> possible,
        List<Conditional> outputs) {

    /**
     * What is known of one output.
     *
     * @param preamble steps 0 … P before the first cycle, where there are any
     * @param first    the first cycle
     * @param longRun  what it tends to, over {@code cycles} cycles; empty where that isn't decided
     * @param values   at the steps asked for, {@code j} being the step k itself
     */
    public record Conditional(Output output, ScheduledOutput joint, Optional<ConditionalCourse> preamble,
            Optional<ConditionalCourse> first, Optional<ConditionalCourse> longRun, List<Reading> values) {
        public Conditional {
            values = List.copyOf(values);
        }
    }

    public ConditionalSchedule {
        outputs = List.copyOf(outputs);
    }

    /** Everything about these outputs at these steps, which ascend. */
    public static ConditionalSchedule of(Model model, Given given, List<Output> outputs, List<Integer> at,
            Scheduling.Formulas formulas) {
        return new ConditionalScheduling(model, given, outputs, at, formulas).found();
    }

    /** The probability of what is known. */
    public ScheduledOutput event() {
        return stopped.outputs().get(0);
    }

    /** True when every output has its first cycle, its long run and its values. */
    public boolean isDecided() {
        return possible.isPresent() && outputs.stream().allMatch(each ->
                each.first.filter(ConditionalCourse::isDecided).isPresent()
                        && each.longRun.filter(ConditionalCourse::isDecided).isPresent()
                        && each.values.stream().noneMatch(value -> value.before().kind()
                                == ConditionalCourse.Value.Kind.NOT_DECIDED || value.after().kind()
                                == ConditionalCourse.Value.Kind.NOT_DECIDED));
    }
}
