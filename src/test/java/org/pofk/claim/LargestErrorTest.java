package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.text.RefusedException;

/** The largest error over all steps: found for slow poles without going through millions of steps. */
class LargestErrorTest {

    /** A part that fails with a chance of 10^−7 a step, invented. */
    private static OutputTruth seldom() {
        Chain chain = Models.recursion("1 0", "0.9999999 0", "0.0000001 1");
        return Truth.of(chain).about(Outputs.states(chain).get(1));
    }

    private static LargestError error(String text, OutputTruth truth) {
        try {
            return LargestError.of(ExponentialSum.of(WrittenFormulas.parse(text), Precision.AS_WRITTEN), truth,
                    Claim.Steps.ALL);
        } catch (RefusedException e) {
            throw new AssertionError(text, e);
        }
    }

    @Test
    void aSlowPoleRoundedIsWorstAfterMillionsOfSteps() {
        LargestError found = error("1 - 0.9999998^k", seldom());
        assertEquals(LargestError.Kind.REACHED, found.kind());
        // x − x² for x = 0.9999999^k is largest, 1/4, where x is a half: near k = ln 2 · 10^7
        assertTrue(found.upTo().orElseThrow().minus(Rational.of(1, 4)).abs()
                .compareTo(Rational.of(1, 1_000)) < 0, found::toString);
        assertTrue(Math.abs(found.at().getAsLong() - 6_931_472) < 400_000, found::toString);
    }

    @Test
    void anErrorThatIsOnlyApproachedSaysSo() {
        LargestError found = error("1.001 - 1.001*0.9999999^k", seldom());
        assertEquals(LargestError.Kind.APPROACHED, found.kind());
        assertEquals(OptionalLong.empty(), found.at());
        assertTrue(found.upTo().orElseThrow().minus(Rational.of(1, 1_000)).abs()
                .compareTo(Rational.of(1, 1_000_000)) < 0, found::toString);
    }

    @Test
    void aPoleAboveOneIsBeyondEveryBound() {
        assertEquals(LargestError.Kind.UNBOUNDED, error("1 - 1.0000001^k", seldom()).kind());
    }

    @Test
    void theTruthHasNoError() {
        assertTrue(error("1 - 0.9999999^k", seldom()).upTo().orElseThrow().isZero());
    }
}
