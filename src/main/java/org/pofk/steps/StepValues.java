package org.pofk.steps;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;

/** Values of outputs at given steps: exact by stepping as far as that is quick, certified from the modes beyond. */
public final class StepValues {
    /** A longer fraction is read by nobody, and reducing it takes the square of its length. */
    private static final long BITS_AT_MOST = 10_000;
    /** Steps times entries times what an entry costs, in machine words of a number: a second or less. */
    private static final double WORK_AT_MOST = 1e8;
    private static final int WORDS_OF_A_SHORT_NUMBER = 8;

    private StepValues() {
    }

    /** One list for each closed form, in their order, each by ascending step. */
    public static List<List<StepValue>> of(Chain chain, List<ClosedForm> closedForms, List<Integer> steps) {
        List<Integer> stepped = stepped(chain, steps);
        ExactSteps exact = ExactSteps.at(chain,
                closedForms.stream().map(each -> each.transform().output()).toList(), stepped);
        List<List<StepValue>> values = new ArrayList<>();
        for (int i = 0; i < closedForms.size(); i++) {
            List<StepValue> found = new ArrayList<>();
            for (int j = 0; j < stepped.size(); j++) {
                Rational known = exact.values().get(i).get(j);
                found.add(new StepValue(stepped.get(j), Optional.of(known), Enclosed.of(known)));
            }
            ModeValues modes = ModeValues.of(closedForms.get(i));
            steps.subList(stepped.size(), steps.size()).forEach(k ->
                    found.add(new StepValue(k, Optional.empty(), modes.at(k))));
            values.add(found);
        }
        return values;
    }

    /** The steps, ascending, that are reached quickly by stepping. */
    private static List<Integer> stepped(Chain chain, List<Integer> steps) {
        long entries = chain.matrix().columns().stream().mapToLong(List::size).sum() + chain.size();
        long bits = ExactSteps.bitsPerStep(chain.matrix());
        return steps.stream().filter(k -> bits * k <= BITS_AT_MOST
                && (bits * k / 64.0 + WORDS_OF_A_SHORT_NUMBER) * entries * k <= WORK_AT_MOST).toList();
    }
}
