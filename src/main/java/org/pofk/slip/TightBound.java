package org.pofk.slip;

import java.util.Optional;
import org.pofk.answer.Peak;
import org.pofk.claim.Claim;
import org.pofk.claim.OutputTruth;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.text.RefusedException;

/**
 * Whether a bound is one that somebody would state: near the extreme value it bounds. Any loose number bounds
 * something, so that undoing a slip towards it explains nothing. What is told rests on this, never a verdict.
 */
final class TightBound {
    private static final int BITS = 64;
    private static final Rational NEAR = Rational.of(1, 4);

    private TightBound() {
    }

    /** True for what is no bound, and where the extreme isn't known. */
    static boolean isTight(Claim claim, Truth truth) {
        return !(claim.statement() instanceof Statement.Bound bound) || extreme(bound, truth)
                .flatMap(extreme -> stated(bound, claim).map(stated -> stated.minus(extreme).abs()
                        .compareTo(extreme.abs().times(NEAR)) <= 0)).orElse(true);
    }

    private static Optional<Rational> extreme(Statement.Bound bound, Truth truth) {
        OutputTruth output = truth.about(bound.output());
        Optional<Peak> peak = bound.direction() == Statement.Bound.Direction.AT_MOST
                ? Peak.highest(truth.chain(), output.closedForm(), output.longRun())
                : Peak.lowest(truth.chain(), bound.output());
        return peak.map(found -> found.value().enclosure().enclose(BITS).middle());
    }

    private static Optional<Rational> stated(Statement.Bound bound, Claim claim) {
        try {
            return Optional.of(ExponentialSum.of(bound.is().parsed(), new Precision(claim.carried())).valueAt(0)
                    .enclose(BITS).real().middle());
        } catch (RefusedException | ArithmeticException none) {
            return Optional.empty();
        }
    }
}
