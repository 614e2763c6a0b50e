package org.pofk.answer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.modes.LimitOfQuotient;
import org.pofk.modes.OutermostPole;
import org.pofk.modes.RealValue;
import org.pofk.transform.Transforms;

/**
 * Puts a {@link ConditionalModel} together: numerators and denominator as outputs of one chain, and their quotient's
 * long run on the chain seen every few steps, where one pole leads.
 */
final class ConditionalAnalysis {
    private static final BigInteger PERIOD_AT_MOST = BigInteger.valueOf(60);
    private static final int SCALE_BITS = 64;

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
        List<ConditionalLongRun> longRuns = longRuns(derived);
        List<Conditional> complete = new ArrayList<>();
        for (int i = 0; i < outputs.size(); i++) {
            DerivedOutput joint = known.outputs().get(i).joint();
            complete.add(new Conditional(joint, Optional.of(longRuns.get(i)),
                    values(joint, known.event(), possible)));
        }
        ConditionalModel all = new ConditionalModel(model, given, known.event(), possible, complete);
        published.accept(all);
        return all;
    }

    private List<ConditionalLongRun> longRuns(DerivedModel derived) {
        int outputs = derived.outputs().size() - 1;
        BigInteger period = EveryFewSteps.period(chain, given.in());
        if (period.compareTo(PERIOD_AT_MOST) > 0) {
            return java.util.Collections.nCopies(outputs,
                    ConditionalLongRun.without(ConditionalLongRun.Kind.PERIOD_TOO_LONG));
        }
        List<List<Optional<RealValue>>> byOutput = new ArrayList<>();
        for (int i = 0; i < outputs; i++) {
            byOutput.add(new ArrayList<>());
        }
        for (List<ClosedForm> forms : forms(derived, period.intValueExact())) {
            for (int i = 0; i < outputs; i++) {
                byOutput.get(i).add(LimitOfQuotient.of(forms.get(i + 1), forms.get(0)));
            }
        }
        return byOutput.stream().map(ConditionalLongRun::of).toList();
    }

    /** The closed forms of all outputs, for each residue class of steps. */
    private List<List<ClosedForm>> forms(DerivedModel derived, int period) {
        if (period == 1) {
            return List.of(derived.outputs().stream().map(each -> each.closedForm().orElseThrow()).toList());
        }
        List<Output> outputs = derived.outputs().stream().map(DerivedOutput::output).toList();
        KnownPoles poles = new KnownPoles();
        return EveryFewSteps.of(chain, period).stream().map(every -> Transforms.of(every, outputs).stream()
                .map(transform -> ClosedForm.of(transform, poles)).toList()).toList();
    }

    private static List<Conditional.At> values(DerivedOutput joint, DerivedOutput event,
            Optional<PossibleSteps> possible) {
        List<Conditional.At> values = new ArrayList<>();
        for (int i = 0; i < joint.values().size(); i++) {
            StepValue above = joint.values().get(i);
            StepValue below = event.values().get(i);
            boolean isPossible = below.exact().map(value -> !value.isZero())
                    .orElseGet(() -> possible.stream().anyMatch(each -> each.at(below.k())));
            values.add(new Conditional.At(above.k(), isPossible
                    ? Optional.of(quotient(above, below, joint, event)) : Optional.empty()));
        }
        return values;
    }

    private static StepValue quotient(StepValue above, StepValue below, DerivedOutput joint, DerivedOutput event) {
        if (above.exact().isPresent() && below.exact().isPresent()) {
            Rational exact = above.exact().get().dividedBy(below.exact().get());
            return new StepValue(above.k(), Optional.of(exact), Enclosed.of(exact));
        }
        // both in units of the outermost pole's power, which neither is far from
        Rational unit = OutermostPole.of(event.closedForm().orElseThrow()).orElseThrow().value()
                .enclose(SCALE_BITS).middle();
        return new StepValue(above.k(), Optional.empty(), inUnits(joint, unit, above.k())
                .dividedBy(inUnits(event, unit, below.k())));
    }

    private static Enclosed inUnits(DerivedOutput output, Rational unit, int k) {
        return ModeValues.of(output.closedForm().orElseThrow()).inUnitsOf(unit).at(k);
    }
}
