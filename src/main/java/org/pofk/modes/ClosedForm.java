package org.pofk.modes;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.exact.Roots;
import org.pofk.formula.Formula;
import org.pofk.transform.Transform;

/**
 * p(k) of one output as a sum of modes, with all that was found on the way.
 *
 * @param roots  the roots of each factor of the transform's denominator, in the factors' order
 * @param modes  no zero modes; impulses by step, then by factor, root, power
 */
public record ClosedForm(Transform transform, Expansion<Rational> expansion, List<Roots> roots, List<Mode> modes) {
    public ClosedForm {
        roots = List.copyOf(roots);
        modes = List.copyOf(modes);
    }

    public static ClosedForm of(Transform transform) {
        throw new UnsupportedOperationException();
    }

    /** True when every constant of every mode has a short exact form. */
    public boolean isExactThroughout() {
        throw new UnsupportedOperationException();
    }

    /** The formula in short exact forms; empty when some constant has none. Variable k. */
    public Optional<Formula> exactFormula() {
        throw new UnsupportedOperationException();
    }

    /** The exact formula always: a factor without short forms is a {@link Formula.RootSum} over its roots. */
    public Formula formulaOverRoots() {
        throw new UnsupportedOperationException();
    }

    /** The formula in decimals, with what it promises. */
    public DecimalForm decimalForm(int digits) {
        throw new UnsupportedOperationException();
    }

    /** The first k from which no impulse is left: where the formula without impulses holds. */
    public int withoutImpulsesFrom() {
        return expansion.impulses().size();
    }
}
