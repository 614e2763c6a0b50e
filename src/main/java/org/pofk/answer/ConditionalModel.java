package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.steps.PossibleSteps;

/**
 * Outputs of a model given what is known at the same step.
 *
 * @param event    P(known at k), the denominator of all
 * @param possible at which steps what is known can be; empty where that repeats too late to be said
 * @param outputs  in the order in which they were asked for
 */
public record ConditionalModel(Model model, Given given, DerivedOutput event, Optional<PossibleSteps> possible,
        List<Conditional> outputs) {

    public ConditionalModel {
        outputs = List.copyOf(outputs);
    }

    /** True when every output has its two formulas and its long run. */
    public boolean isDecided() {
        return event.isDecided() && possible.isPresent() && outputs.stream().allMatch(each ->
                each.joint().isDecided() && each.longRun().stream().anyMatch(found ->
                        found.kind() != ConditionalLongRun.Kind.PERIOD_TOO_LONG));
    }

    /** Everything about these outputs at these steps, which ascend; what is proven is published as it is found. */
    public static ConditionalModel of(Model model, Given given, List<Output> outputs, List<Integer> at,
            Consumer<ConditionalModel> published) {
        return new ConditionalAnalysis(model, given, published).of(outputs, at);
    }

    static ConditionalModel of(Model model, Given given, Optional<PossibleSteps> possible, DerivedModel derived) {
        List<Conditional> outputs = new ArrayList<>();
        derived.outputs().subList(1, derived.outputs().size()).forEach(joint ->
                outputs.add(new Conditional(joint, Optional.empty(), List.of())));
        return new ConditionalModel(model, given, derived.outputs().get(0), possible, outputs);
    }
}
