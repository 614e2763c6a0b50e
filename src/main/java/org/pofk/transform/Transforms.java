package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;

/** The exact engine: Chain → Y(z) in lowest terms, factored, for any set of outputs at once. */
public final class Transforms {
    private Transforms() {
    }

    /** One transform per output, in their order. */
    public static List<Transform> of(Chain chain, List<Output> outputs) {
        List<Recurrence> recurrences = Recurrences.of(Reduction.of(chain, outputs).reduced());
        List<Transform> transforms = new ArrayList<>();
        for (int i = 0; i < outputs.size(); i++) {
            Recurrence recurrence = recurrences.get(i);
            TransferFunction<org.pofk.exact.Rational> y = recurrence.transferFunction();
            transforms.add(new Transform(outputs.get(i), recurrence.denominator(), y,
                    DenominatorFactors.of(y.denominator()), recurrence.proof()));
        }
        return transforms;
    }
}
