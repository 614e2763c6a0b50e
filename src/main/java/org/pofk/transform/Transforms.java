package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

/** The exact engine: Chain → Y(z) in lowest terms, factored, for any set of outputs at once. */
public final class Transforms {
    private Transforms() {
    }

    /** One transform per output, in their order. */
    public static List<Transform> of(Chain chain, List<Output> outputs) {
        List<Recurrence> recurrences = Recurrences.ofReadings(Reduction.of(chain, outputs).reduced());
        DenominatorFactors factors = new DenominatorFactors(chain);
        List<Transform> transforms = new ArrayList<>();
        for (int i = 0; i < outputs.size(); i++) {
            TransferFunction<Rational> y = inLowestTerms(recurrences.get(i));
            transforms.add(new Transform(outputs.get(i), recurrences.get(i).denominator(), y,
                    factors.of(y.denominator()), recurrences.get(i).proof()));
        }
        return transforms;
    }

    /** Y(z) of each output, not factored. */
    public static List<TransferFunction<Rational>> inLowestTerms(Chain chain, List<Output> outputs) {
        return Recurrences.ofReadings(Reduction.of(chain, outputs).reduced()).stream()
                .map(Transforms::inLowestTerms).toList();
    }

    /** z P/D, where a z may cancel. */
    private static TransferFunction<Rational> inLowestTerms(Recurrence recurrence) {
        return new TransferFunction<>(recurrence.numerators().get(0).shiftedUp(1), recurrence.denominator());
    }
}
