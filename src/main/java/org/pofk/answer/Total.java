package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * What is added up over the steps k = 0 … K, K included: what each step adds, the total, and how that grows. Formulas
 * hold for every k, proved as those of any output; values and growth are exact, certified where a value says so.
 *
 * @param increment what is added up
 * @param factor    v, with which each later step counts less; one where nothing is discounted
 * @param summed    the recursion whose outputs these are
 * @param step      what step k adds
 * @param total     what was added by the end of step k
 * @param averages  total(k)/(k+1) at the steps asked for: for a state or a set the share of time spent there
 */
public record Total(Increment increment, Rational factor, SummedChain summed, DerivedOutput step, DerivedOutput total,
        Growth growth, List<StepValue> averages) {
    public Total {
        averages = List.copyOf(averages);
    }

    /** Everything about the total; steps ascending. */
    public static Total of(Chain chain, Increment increment, List<Integer> steps) {
        return of(chain, increment, Rational.ONE, steps);
    }

    /** The same where what step k adds counts v^k of it. */
    public static Total of(Chain chain, Increment increment, Rational factor, List<Integer> steps) {
        SummedChain summed = SummedChain.of(chain, increment, factor);
        List<Transform> transforms = Transforms.of(summed.recursion(), List.of(summed.step(), summed.total()));
        LongRun ofStep = LongRun.of(chain, transforms.get(0));
        Growth growth = Growth.of(chain, ofStep, transforms.get(1).y());
        KnownPoles poles = new KnownPoles(() -> Eigenvalues.guesses(summed.recursion().matrix()));
        List<ClosedForm> forms = transforms.stream().map(transform -> ClosedForm.of(transform, poles)).toList();
        List<List<StepValue>> values = StepValues.of(summed.recursion(), forms, steps);
        return new Total(increment, factor, summed, derived(forms.get(0), ofStep, values.get(0)),
                derived(forms.get(1), growth.longRun(), values.get(1)), growth,
                values.get(1).stream().map(Total::average).toList());
    }

    private static DerivedOutput derived(ClosedForm form, LongRun longRun, List<StepValue> values) {
        return DerivedOutput.of(form.transform().output()).with(form.transform()).with(form).with(values)
                .with(new LongRunChecks(longRun, Optional.empty(), Optional.empty(), BigInteger.ONE));
    }

    private static StepValue average(StepValue total) {
        Rational share = Rational.of(1, total.k() + 1);
        return new StepValue(total.k(), total.exact().map(share::times),
                total.enclosure().times(Enclosed.of(share)));
    }
}
