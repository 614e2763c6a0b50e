package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.longrun.ClosedClassLongRun;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunChecks;
import org.pofk.longrun.Settling;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * A model's structure and its long runs.
 *
 * @param outputs how each output asked for ends
 * @param states  the long run of every state, from the closed classes alone; empty for a recursion, and where that way
 *                isn't open
 */
public record InspectedModel(Model model, Inspection inspection, List<InspectedOutput> outputs,
        List<LongRun> states) {
    private static final int SETTLED_DIGITS = 6;

    /**
     * How one output ends.
     *
     * @param settling from which step on it stays near its long run; empty when it has none
     */
    public record InspectedOutput(Output output, LongRunChecks longRun, Optional<Settling> settling) {
    }

    public InspectedModel {
        outputs = List.copyOf(outputs);
        states = List.copyOf(states);
    }

    /** The structure, and the long run of these outputs three ways; under a schedule, where it isn't the chain's, none. */
    public static InspectedModel of(Model model, List<Output> outputs) {
        Chain chain = model.chain();
        Inspection inspection = Inspection.of(model);
        if (model.schedule().isPresent()) {
            return new InspectedModel(model, inspection, List.of(), List.of());
        }
        List<InspectedOutput> inspected = new ArrayList<>();
        if (!outputs.isEmpty()) {
            LongRunChecks.Ground ground = LongRunChecks.Ground.of(chain);
            KnownPoles poles = new KnownPoles(() -> Eigenvalues.guesses(chain.matrix()));
            for (Transform transform : Transforms.of(chain, outputs)) {
                LongRunChecks longRun = LongRunChecks.of(ground, transform);
                inspected.add(new InspectedOutput(transform.output(), longRun,
                        Settling.of(ClosedForm.of(transform, poles), longRun.byPoles(),
                                Settling.digitsFor(longRun.byPoles(), SETTLED_DIGITS))));
            }
        }
        Optional<ClosedClassLongRun> classes = chain.kind() == Chain.Kind.CHAIN
                ? ClosedClassLongRun.of(chain, inspection.structure())
                : Optional.empty();
        return new InspectedModel(model, inspection, inspected, classes
                .map(found -> Outputs.states(chain).stream().map(found::of).toList()).orElse(List.of()));
    }
}
