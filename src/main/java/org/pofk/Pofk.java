package org.pofk;

import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.Deriving;
import org.pofk.answer.Increment;
import org.pofk.answer.InspectedModel;
import org.pofk.answer.PowerModel;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.Scheduling;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** The small face of the library: read a model, derive, ask. */
public final class Pofk {
    private Pofk() {
    }

    /** The model in a file; refused with every fault of the file. */
    public static Model read(Path file) throws RefusedException {
        return ModelReader.read(file, Overrides.NONE);
    }

    /** The outputs, sets or states of these names; refused when one of them stands for nothing, or for two. */
    public static List<Output> outputs(Model model, String... names) throws RefusedException {
        return Outputs.named(model.chain(), List.of(names), Position.ofWhole("names"));
    }

    /** Formulas, long runs and comparisons of these outputs. */
    public static DerivedModel derive(Model model, List<Output> outputs) {
        return Deriving.of(model, outputs, List.of(), EnumSet.of(Deriving.Extra.COMPARISON), published -> { });
    }

    /** What these outputs add up to over the steps 0 … k, for a state or a set the steps spent there, in every k. */
    public static TotalModel totals(Model model, List<Output> outputs, List<Integer> steps) {
        return TotalModel.of(unscheduled(model), outputs.stream().map(output ->
                TotalModel.Asked.of(Increment.of(model.chain(), output))).toList(), steps, published -> { });
    }

    /** What the costs of a model add up to, and what is left of them discounted; nothing where it names none. */
    public static TotalModel costs(Model model, List<Integer> steps) {
        return TotalModel.of(unscheduled(model), TotalModel.costs(model), steps, published -> { });
    }

    /** These outputs from every state in turn: for all states the entries of A^k. */
    public static PowerModel powers(Model model, List<Output> outputs) {
        return PowerModel.of(unscheduled(model), outputs, List.of(), published -> { });
    }

    /** Formulas of a model with inspections or phases: its cycles, what they tend to, formulas within and over them. */
    public static ScheduledModel schedule(Model model, List<Output> outputs) {
        return Scheduling.of(model, outputs, List.of(), Scheduling.Formulas.WITHIN_REACH, published -> { });
    }

    /** Structure, long runs and a reviewer's questions. */
    public static InspectedModel inspect(Model model) {
        return InspectedModel.of(model, Outputs.byDefault(model.chain()));
    }

    /** Answers that know nothing of schedules must not leave one out of account. */
    private static Model unscheduled(Model model) {
        if (model.schedule().isPresent()) {
            throw new IllegalArgumentException(model.origin() + " has a schedule, of which this answer knows nothing");
        }
        return model;
    }
}
