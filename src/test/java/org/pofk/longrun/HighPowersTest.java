package org.pofk.longrun;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Chains;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.longrun.HighPowers.Outcome;
import org.pofk.longrun.HighPowers.Plateau;
import org.pofk.longrun.HighPowers.Stop;
import org.pofk.longrun.HighPowers.Verdict;
import org.pofk.longrun.HighPowers.Way;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.PowerSequence;

class HighPowersTest {

    @Test
    void comparingSuccessivePowersIsRightWhereTheSecondEigenvalueIsSmall() {
        Verdict verdict = verdict(Chains.pumps(), 2);
        assertFalse(verdict.habitMisleads());
        assertEquals(2, verdict.habits().size());
        assertEquals(Optional.empty(), verdict.plateau());
    }

    @Test
    void squaringTakesOneValueOfACycleForALimit() {
        Chain turns = Chains.chain("1 0", "0 1", "1 0");
        List<Stop> habits = verdict(turns, 0).habits();
        assertEquals(List.of(Outcome.MISLED_BY_CYCLE), habits.stream().map(Stop::outcome).toList());
        assertEquals(Way.BY_SQUARING, habits.get(0).way());
    }

    @Test
    void aNearlyReducibleChainSeemsSettledAtTheWrongValue() {
        Verdict verdict = verdict(Chains.nearlyReducible(), 2);
        assertTrue(verdict.habits().stream().allMatch(stop -> stop.outcome() == Outcome.MISLED_BY_SLOW_POLE));
        Plateau plateau = verdict.plateau().orElseThrow();
        assertTrue(plateau.from() <= 64 && plateau.to() >= 4096, plateau.toString());
        assertTrue(plateau.value().upper().compareTo(Rational.of(1, 1_000_000)) < 0);
        assertTrue(verdict.k() == 1L << 40 && verdict.within().compareTo(Rational.of(1, 1_000_000)) < 0);
    }

    @Test
    void aRareFailureHasToBeRightInItsOwnSize() {
        // 1e-7 in the long run; the first steps show 1e-10 and hardly change from one to the next
        Chain interlock = Chains.chain("1 0", "0.9999999999 0.001", "0.0000000001 0.999");
        Verdict verdict = verdict(interlock, 1);
        assertTrue(verdict.habits().stream().allMatch(stop -> stop.outcome() == Outcome.MISLED_BY_SLOW_POLE));
        assertTrue(verdict.habits().stream().allMatch(
                stop -> stop.value().upper().compareTo(Rational.of(1, 1_000_000_000)) < 0));
    }

    @Test
    void aLargeValueIsRightWhenItIsRightInItsOwnSize() {
        // poles 1 and 1/5: the states are within 5e-7 and 5000 times that is more than 1e-5, but not of 36
        Chain valve = Chains.chain("1 0", "0.9941056 0.7941056", "0.0058944 0.2058944");
        Verdict verdict = verdict(valve, Chains.reading("0 5000"));
        assertEquals(List.of(Outcome.RIGHT, Outcome.RIGHT), verdict.habits().stream().map(Stop::outcome).toList());
        assertTrue(verdict.habits().stream().anyMatch(stop -> stop.value().middle().minus(Rational.of(36_84, 100)).abs()
                .compareTo(Rational.of(1, 100_000)) > 0), "no stop is off by more than 1e-5: nothing was told apart");
    }

    @Test
    void aQuickPoleIsNotBlamedForTheSizeOfAnOutput() {
        // poles 1 and 1/2, half of the time in each state; the two halves of the output cancel
        Chain switching = Chains.chain("1 0", "0.75 0.25", "0.25 0.75");
        Verdict verdict = verdict(switching, Chains.reading("1000000 -1000000"));
        assertTrue(verdict.habits().stream().anyMatch(stop -> stop.outcome() == Outcome.MISLED_BY_SIZE));
        assertTrue(verdict.habits().stream().noneMatch(stop -> stop.outcome() == Outcome.MISLED_BY_SLOW_POLE));
    }

    @Test
    void theStatesFromBelowHoldTheExactPowers() {
        Chain pumps = Chains.pumps();
        Output lost = Chains.state(pumps, 2);
        List<Rational> exact = ExactSteps.of(pumps, List.of(lost), 64).values().get(0);
        PowerSequence sequence = PowerSequence.of(pumps, 1, Rational.TWO.pow(-100));
        for (int m = 0; m <= 6; m++) {
            assertTrue(sequence.doubling().get(m).reading(lost).contains(exact.get(1 << m)));
        }
        for (int k = 0; k <= 64; k++) {
            assertTrue(sequence.steps().get(k).reading(lost).contains(exact.get(k)));
        }
    }

    private static Verdict verdict(Chain chain, int state) {
        return verdict(chain, Chains.state(chain, state));
    }

    private static Verdict verdict(Chain chain, Output output) {
        LongRun longRun = Chains.longRun(chain, output);
        return HighPowers.of(chain, LongRunValues.of(longRun).size()).against(longRun, output).orElseThrow();
    }
}
