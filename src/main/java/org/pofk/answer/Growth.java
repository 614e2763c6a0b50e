package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.exact.Factoring;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunByPoles;
import org.pofk.longrun.LongRunValues;
import org.pofk.transform.TransferFunction;

/**
 * What a total does as k grows: G(k) = perStep · k + r(k), and what r does. For a chain r always has a limit or a
 * cycle, so G(k) = perStep · k + offset + what vanishes. Exact.
 *
 * @param perStep what the steps add on average in the long run; zero where they have no average
 * @param beyond  what r(k) does
 */
public record Growth(Rational perStep, LongRun beyond) {

    /** The total of all steps k ≥ 0, where it is finite. */
    public Optional<Rational> everything() {
        List<Rational> values = LongRunValues.of(beyond);
        return perStep.isZero() && values.size() == 1 ? Optional.of(values.get(0)) : Optional.empty();
    }

    /** The long run of the total itself. */
    public LongRun longRun() {
        return perStep.isZero() ? beyond
                : new LongRun.None(LongRun.Reason.GROWS, Optional.empty(), "grows like k");
    }

    /**
     * Of a total over a chain, whose reached closed classes alone leave poles on the unit circle, or over a recursion.
     *
     * @param step  what a step adds in the long run
     * @param total the transform of the total
     */
    public static Growth of(Chain chain, LongRun step, TransferFunction<Rational> total) {
        Rational perStep = step.meanValue().orElse(Rational.ZERO);
        TransferFunction<Rational> beyond = without(perStep, total);
        return new Growth(perStep, chain.kind() == Chain.Kind.CHAIN
                ? LongRunByPoles.ofChain(Structure.of(chain), beyond)
                : LongRunByPoles.ofRecursion(beyond, Factoring.of(beyond.denominator())));
    }

    /** G(k) − perStep · k: perStep · z/(z−1)² less. */
    private static TransferFunction<Rational> without(Rational perStep, TransferFunction<Rational> total) {
        if (perStep.isZero()) {
            return total;
        }
        Polynomial<Rational> rest = total.denominator()
                .dividedExactlyBy(Polynomial.ofIntegers(-1, 1)).dividedExactlyBy(Polynomial.ofIntegers(-1, 1));
        Polynomial<Rational> ramp = rest.shiftedUp(1).times(perStep);
        return new TransferFunction<>(total.numerator().minus(ramp), total.denominator());
    }
}
