package org.pofk.meaning;

import java.util.List;

/** Solves equations between written decimals and exact values. */
public final class Equations {
    private Equations() {
    }

    /** The right value of every decimal that is determined, and whether all can hold. */
    public static Solution solve(List<Equation> equations) {
        return Propagation.of(equations);
    }
}
