package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunChecks;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;
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
 * @param averages  total(k) over how many steps count up to k, at the steps asked for: k + 1, for a state or a set the share
 *                  of time spent there; for entries k, and none at k = 0
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
                values.get(1).stream().filter(value -> counted(increment, value) > 0)
                        .map(value -> average(value, counted(increment, value))).toList());
    }

    private static DerivedOutput derived(ClosedForm form, LongRun longRun, List<StepValue> values) {
        return DerivedOutput.of(form.transform().output()).with(form.transform()).with(form).with(values)
                .with(new LongRunChecks(longRun, Optional.empty(), Optional.empty(), BigInteger.ONE));
    }

    /** Steps that add something up to k: entries are made in the steps 1 … k. */
    private static long counted(Increment increment, StepValue total) {
        return increment.kind() == Increment.Kind.ENTRIES ? total.k() : total.k() + 1L;
    }

    private static StepValue average(StepValue total, long steps) {
        Rational share = Rational.of(1, steps);
        return new StepValue(total.k(), total.exact().map(share::times),
                total.enclosure().times(Enclosed.of(share)));
    }
}
