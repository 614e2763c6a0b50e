package org.pofk.schedule;

import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;

/**
 * An output at step P + m T + i, 0 ≤ i ≤ {@code to} (just before what is done there), in m and i together:
 * Σ μ^m · f_μ(i). Where the poles of S are simple rational numbers. Exact.
 */
public record JointFormula(int to, List<Term> terms) {

    /** μ^m · f_μ(i). */
    public record Term(Rational base, ClosedForm within) {
    }

    public JointFormula {
        terms = List.copyOf(terms);
    }
}
