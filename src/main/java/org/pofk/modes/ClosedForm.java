package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Rational;
import org.pofk.exact.Roots;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
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

    /** Exact in what modes there are and in every short form; the constants left are certified enclosures. */
    public static ClosedForm of(Transform transform) {
        return of(transform, new KnownPoles());
    }

    /** The same, for one of several outputs. */
    public static ClosedForm of(Transform transform, KnownPoles known) {
        Expansion<Rational> expansion = PartialFractions.of(transform.y(), transform.factors());
        List<Factor<Rational>> factors = transform.factors().factors();
        List<Mode> modes = new ArrayList<>(impulses(expansion.impulses()));
        for (Expansion.Part<Rational> part : expansion.parts()) {
            modes.addAll(FactorModes.of(factors.indexOf(part.factor()), known.of(part.factor()), part.coefficients()));
        }
        return new ClosedForm(transform, expansion, factors.stream().map(known::of).map(FactorPoles::roots).toList(),
                modes);
    }

    private static List<Mode> impulses(List<Rational> values) {
        List<Mode> impulses = new ArrayList<>();
        for (int at = 0; at < values.size(); at++) {
            if (!values.get(at).isZero()) {
                impulses.add(new Mode.Impulse(at, RealValue.of(values.get(at))));
            }
        }
        return impulses;
    }

    /** True when every constant of every mode has a short exact form. */
    public boolean isExactThroughout() {
        return modes.stream().allMatch(Mode::isExact);
    }

    /** The formula in short exact forms; empty when some constant has none. Variable k. */
    public Optional<Formula> exactFormula() {
        return isExactThroughout()
                ? Optional.of(Formulas.sum(modes.stream().map(ModeFormula::exact).toList()))
                : Optional.empty();
    }

    /** The exact formula always: a factor without short forms is a {@link Formula.RootSum} over its roots. */
    public Formula formulaOverRoots() {
        return FormulaOverRoots.of(this);
    }

    /** The degrees of the factors that stand as sums over their roots in {@link #formulaOverRoots}. */
    public List<Integer> degreesOverRoots() {
        List<Factor<Rational>> factors = transform.factors().factors();
        return modes.stream().filter(mode -> !mode.isExact()).map(mode -> mode.pole().get(0)).distinct().sorted()
                .map(index -> factors.get(index).polynomial().degree()).toList();
    }

    /** The way here from the factored transform. */
    public Derivation derivation() {
        return Derivation.of(this);
    }

    /** The formula in decimals, with what it promises. */
    public DecimalForm decimalForm(int digits) {
        return DecimalForms.of(modes, digits);
    }

    /** The first k from which no impulse is left: where the formula without impulses holds. */
    public int withoutImpulsesFrom() {
        return expansion.impulses().size();
    }
}
