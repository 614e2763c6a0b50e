package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;

/** Values of outputs at given steps: exact by stepping as far as that is quick, certified from the modes beyond. */
final class StepValues {
    /** Steps times entries times machine words of a number: about a second. */
    private static final double WORK_AT_MOST = 1e9;

    private StepValues() {
    }

    /** One list for each closed form, in their order, each by ascending step. */
    static List<List<StepValue>> of(Chain chain, List<ClosedForm> closedForms, List<Integer> steps) {
        int last = lastExactStep(chain, steps);
        ExactSteps exact = ExactSteps.of(chain,
                closedForms.stream().map(each -> each.transform().output()).toList(), last);
        List<List<StepValue>> values = new ArrayList<>();
        for (int i = 0; i < closedForms.size(); i++) {
            List<Rational> known = exact.values().get(i);
            ModeValues modes = ModeValues.of(closedForms.get(i));
            values.add(steps.stream().map(k -> k <= last
                    ? new StepValue(k, Optional.of(known.get(k)), Enclosed.of(known.get(k)))
                    : new StepValue(k, Optional.empty(), modes.at(k))).toList());
        }
        return values;
    }

    private static int lastExactStep(Chain chain, List<Integer> steps) {
        return steps.stream().filter(k -> work(chain, k) <= WORK_AT_MOST).mapToInt(k -> k).max().orElse(0);
    }

    /** Numbers gain as many bits a step as the common denominator of A has. */
    private static double work(Chain chain, int k) {
        long entries = chain.matrix().columns().stream().mapToLong(List::size).sum() + chain.size();
        double words = 1 + ExactSteps.commonDenominator(chain.matrix()).bitLength() / 64.0 * k;
        return words * entries * k;
    }
}
