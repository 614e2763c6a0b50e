package org.pofk.transform;

import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;

/** The exact engine: Chain → Y(z) in lowest terms, factored, for any set of outputs at once. */
public final class Transforms {
    private Transforms() {
    }

    /** One transform per output, in their order. */
    public static List<Transform> of(Chain chain, List<Output> outputs) {
        throw new UnsupportedOperationException();
    }
}
