package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.steps.PossibleSteps;

/**
 * Puts a {@link ConditionalModel} together: numerators and denominator as outputs of one chain, and their quotient's
 * long run on the chain seen every few steps, where one pole leads.
 */
final class ConditionalAnalysis {
    private final Model model;
    private final Given given;
    private final Chain chain;
    private final Consumer<ConditionalModel> published;

    ConditionalAnalysis(Model model, Given given, Consumer<ConditionalModel> published) {
        this.model = model;
        this.given = given;
        this.chain = given.chain(model.chain());
        this.published = published;
    }

    ConditionalModel of(List<Output> outputs, List<Integer> at) {
        List<Output> asked = new ArrayList<>(List.of(given.event(chain)));
        outputs.forEach(output -> asked.add(given.joint(output)));
        Optional<PossibleSteps> possible = PossibleSteps.of(chain, given.in());
        DerivedModel derived = Deriving.of(model.with(chain), asked, at, Set.of(Deriving.Extra.COMPARISON), found ->
                published.accept(ConditionalModel.of(model, given, possible, found)));
        ConditionalModel known = ConditionalModel.of(model, given, possible, derived);
        List<ConditionalLongRun> longRuns = ConditionalForms.longRuns(ConditionalForms.of(given.in(), chain,
                derived.outputs().stream().map(each -> each.closedForm().orElseThrow()).toList()), outputs.size());
        List<Conditional> complete = new ArrayList<>();
        for (int i = 0; i < outputs.size(); i++) {
            DerivedOutput joint = known.outputs().get(i).joint();
            complete.add(new Conditional(joint, Optional.of(longRuns.get(i)), ConditionalValues.of(joint.values(),
                    joint.closedForm().orElseThrow(), known.event().values(),
                    known.event().closedForm().orElseThrow(), possible)));
        }
        ConditionalModel all = new ConditionalModel(model, given, known.event(), possible, complete);
        published.accept(all);
        return all;
    }
}
