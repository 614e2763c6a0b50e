package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.PossibleSteps;

/**
 * One sequence over another, a(k)/b(k), both outputs of one chain: b has no negative coefficient, and a none where b
 * has none, so that it is what an output is given what has probability b. Exact and certified as closed forms are.
 */
public final class ConditionalSequence {
    private final ClosedForm joint;
    private final ClosedForm event;
    private final Optional<ConditionalForms> forms;
    private final Optional<PossibleSteps> possible;

    private ConditionalSequence(ClosedForm joint, ClosedForm event, Optional<ConditionalForms> forms,
            Optional<PossibleSteps> possible) {
        this.joint = joint;
        this.event = event;
        this.forms = forms;
        this.possible = possible;
    }

    /** @param joint a, and {@code event} b */
    public static ConditionalSequence of(Chain chain, ClosedForm joint, ClosedForm event) {
        List<Rational> coefficients = event.transform().output().coefficients();
        Set<Integer> in = IntStream.range(0, chain.size()).filter(state -> !coefficients.get(state).isZero()).boxed()
                .collect(Collectors.toSet());
        return new ConditionalSequence(joint, event, ConditionalForms.of(in, chain, List.of(event, joint)),
                PossibleSteps.of(chain, in));
    }

    /** What it tends to. */
    public ConditionalLongRun longRun() {
        return forms.map(each -> each.longRun(0)).orElseGet(() ->
                ConditionalLongRun.without(ConditionalLongRun.Kind.PERIOD_TOO_LONG));
    }

    /** When it meets a condition; where b is zero nothing is met. */
    public When when(WhenModel.Asked asked) {
        return forms.isPresent() && possible.isPresent()
                ? ConditionalSearch.of(forms.get(), possible.get(), longRun(), 0, asked)
                : new When(new When.Condition(asked.kind(), asked.bound()), Optional.empty(), Optional.empty(),
                        List.of(), false, When.Reason.NO_LONG_RUN);
    }

    /** Its value at a step at which b isn't zero. */
    public Enclosed at(int k) {
        return ConditionalValues.quotient(k, joint, event);
    }
}
