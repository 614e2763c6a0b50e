package org.pofk.longrun;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Chains;
import org.pofk.answer.RandomChains;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Structure;
import org.pofk.exact.Rational;
import org.pofk.steps.FixedPointState;
import org.pofk.transform.Transform;

class LongRunTest {

    @Test
    void polesAndClosedClassesAgreeExactlyOnTwoThousandRandomChainsAndHighPowersWithThem() {
        RandomChains chains = new RandomChains(7);
        int limits = 0;
        int cycles = 0;
        int powers = 0;
        int misled = 0;
        for (int round = 0; round < 2_000; round++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            String which = "seed 7, round " + round + ", " + chain;
            LongRun byPoles = Chains.longRun(chain, output);
            assertEquals(ClosedClassLongRun.of(chain, Structure.of(chain)).orElseThrow().of(output), byPoles, which);
            int period = LongRunValues.of(byPoles).size();
            limits += period == 1 ? 1 : 0;
            cycles += period > 1 ? 1 : 0;
            if (round % 4 == 0) {
                HighPowers.Verdict verdict = HighPowers.of(chain, period).against(byPoles, output).orElseThrow();
                assertTrue(verdict.within().compareTo(Rational.of(1, 1_000_000_000)) <= 0, which);
                powers++;
                misled += verdict.habitMisleads() ? 1 : 0;
            }
        }
        assertEquals(2_000, limits + cycles);
        assertEquals(500, powers);
        assertTrue(cycles > 200 && misled > 50, "cycles " + cycles + ", misled " + misled);
    }

    @Test
    void publishedLimitsOfChains() {
        // Grinstead and Snell, Introduction to Probability, 1997, example 11.19: 2/5, 1/5, 2/5
        Chain seasonal = Chains.chain("1 0 0", "1/2 1/2 1/4", "1/4 0 1/4", "1/4 1/2 1/2");
        assertLimits(seasonal, "2/5 1/5 2/5");
        // Grinstead and Snell, example 11.13: absorbed at either end with 1/2 from the middle
        Chain walk = Chains.chain("0 0 1 0 0",
                "1 1/2 0 0 0", "0 0 1/2 0 0", "0 1/2 0 1/2 0", "0 0 1/2 0 0", "0 0 0 1/2 1");
        assertLimits(walk, "1/2 0 0 0 1/2");
        // Norris, Markov Chains, 1997, example 1.1.6 (from memory): 1/5, 2/5, 2/5
        assertLimits(Chains.chain("1 0 0", "0 0 1/2", "1 1/2 0", "0 1/2 1/2"), "1/5 2/5 2/5");
        // Howard, Dynamic Programming and Markov Processes, 1960, chapter 1 (from memory): 4/9, 5/9
        assertLimits(Chains.chain("1 0", "1/2 2/5", "1/2 3/5"), "4/9 5/9");
    }

    @Test
    void aWalkBetweenReflectingEndsAlternatesAndAveragesToItsStationaryDistribution() {
        // Feller, An Introduction to Probability Theory, 1968, chapter XV (from memory): 1/8, 1/4, 1/4, 1/4, 1/8
        Chain walk = Chains.chain("1 0 0 0 0",
                "0 1/2 0 0 0", "1 0 1/2 0 0", "0 1/2 0 1/2 0", "0 0 1/2 0 1", "0 0 0 1/2 0");
        List<Rational> averages = Chains.numbers("1/8 1/4 1/4 1/4 1/8");
        for (int state = 0; state < 5; state++) {
            Rational twice = averages.get(state).times(Rational.TWO);
            LongRun.Cycle expected = new LongRun.Cycle(state % 2 == 0
                    ? List.of(twice, Rational.ZERO)
                    : List.of(Rational.ZERO, twice));
            assertEquals(expected, Chains.longRun(walk, Chains.state(walk, state)));
            assertEquals(averages.get(state), expected.average());
        }
    }

    @Test
    void theCycleOfAnOutputMayBeShorterThanThatOfItsChain() {
        Chain ring = Chains.chain("1 0 0 0", "0 0 0 1", "1 0 0 0", "0 1 0 0", "0 0 1 0");
        LongRunChecks.Ground ground = LongRunChecks.Ground.of(ring);
        LongRunChecks alternating = LongRunChecks.of(ground, Chains.transform(ring, Chains.reading("1 0 1 0")));
        assertEquals(new LongRun.Cycle(List.of(Rational.ONE, Rational.ZERO)), alternating.byPoles());
        assertEquals(4, alternating.chainPeriod().intValueExact());
        LongRunChecks all = LongRunChecks.of(ground, Chains.transform(ring, Chains.reading("1 1 1 1")));
        assertEquals(new LongRun.Limit(Rational.ONE), all.byPoles());
    }

    @Test
    void aCycleEnteredAtRandomMixesItsPhases() {
        // entered at step k with chance 2^-k, so phase 1, 2, 0 with 4/7, 2/7, 1/7
        LongRun longRun = Chains.longRun(Chains.rotation(), Chains.state(Chains.rotation(), 1));
        assertEquals(new LongRun.Cycle(Chains.numbers("1/7 4/7 2/7")), longRun);
    }

    @Test
    void theAverageOfACycleIsTheAverageOfManyExactSteps() {
        RandomChains chains = new RandomChains(11);
        int compared = 0;
        for (int round = 0; round < 60; round++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            List<Rational> values = LongRunValues.of(Chains.longRun(chain, output));
            Rational average = values.stream().reduce(Rational.ZERO, Rational::plus)
                    .dividedBy(Rational.of(values.size()));
            boolean isQuick = chain.matrix().columns().stream().flatMap(List::stream)
                    .allMatch(entry -> entry.value().compareTo(Rational.of(1, 1_000)) > 0);
            if (isQuick) {
                int window = 12 * 20;
                List<Integer> late = IntStream.range(2_000, 2_000 + window).boxed().toList();
                Rational sum = FixedPointState.at(chain, late).stream().map(state -> state.reading(output).middle())
                        .reduce(Rational.ZERO, Rational::plus);
                Rational difference = sum.dividedBy(Rational.of(window)).minus(average).abs();
                assertTrue(difference.compareTo(Rational.of(1, 1_000_000_000)) < 0, "seed 11, round " + round);
                compared++;
            }
        }
        assertTrue(compared >= 20, "compared " + compared);
    }

    @Test
    void aRecursionGrowsRecursOrSettlesAsItsPolesSay() {
        assertGrows("grows like 1.61803^k", "1 0", "1 1", "1 0");
        assertGrows("grows like k", "1 0", "2 -1", "1 0");
        assertGrows("grows like k", "1 0", "-2 -1", "1 0");
        assertGrows("grows like 3^k", "1 1", "-3 0", "0 1/2");
        assertGrows("grows like k * 2^k", "1 0", "4 -4", "1 0");
        assertGrows("grows like k^2", "1 0 0", "3 -3 1", "1 0 0", "0 1 0");
        assertEquals(new LongRun.Cycle(Chains.numbers("1 0 -1 0")), last("0 1", "0 -1", "1 0"));
        assertEquals(new LongRun.Limit(Rational.ZERO), last("1 0", "1/2 -1/4", "1 0"));
        assertEquals(new LongRun.None(LongRun.Reason.RECURS_WITHOUT_PERIOD, Optional.of(Rational.ZERO),
                "recurs without a period: poles on the unit circle that are no roots of unity"),
                last("1 0", "6/5 -1", "1 0"));
    }

    @Test
    void whatRecursWithoutPeriodStillHasAnAverage() {
        Chain rotating = Chains.recursion("1 0 1", "6/5 -1 0", "1 0 0", "0 0 1");
        LongRun longRun = Chains.longRun(rotating, Chains.reading("1 0 5/7"));
        assertEquals(Optional.of(Rational.of(5, 7)), ((LongRun.None) longRun).average());
    }

    @Test
    void theConstantOfARecursionsOutputIsPartOfItsLimit() {
        Chain halving = Chains.recursion("1", "1/2");
        Output output = new Output("shifted", List.of(Rational.ONE), Rational.of(3), "s0 + 3");
        assertEquals(new LongRun.Limit(Rational.of(3)), Chains.longRun(halving, output));
    }

    @Test
    void highPowersOfARecursionComeAsCloseAsItsPolesLet() {
        Chain halving = Chains.recursion("1 0", "-1/2 0", "0 1");
        LongRunChecks checks = LongRunChecks.of(LongRunChecks.Ground.of(halving),
                Chains.transform(halving, Chains.state(halving, 0)));
        assertEquals(Rational.TWO.pow(-256), checks.highPowers().orElseThrow().within());
        assertEquals(Optional.empty(), checks.byClasses());
    }

    private static LongRun last(String start, String... rows) {
        Chain recursion = Chains.recursion(start, rows);
        return Chains.longRun(recursion, Chains.state(recursion, recursion.size() - 1));
    }

    private static void assertGrows(String words, String start, String... rows) {
        Chain recursion = Chains.recursion(start, rows);
        assertEquals(new LongRun.None(LongRun.Reason.GROWS, Optional.empty(), words),
                Chains.longRun(recursion, Chains.state(recursion, 0)));
    }

    private static void assertLimits(Chain chain, String values) {
        LongRunChecks.Ground ground = LongRunChecks.Ground.of(chain);
        List<Rational> limits = Chains.numbers(values);
        for (int state = 0; state < chain.size(); state++) {
            Transform transform = Chains.transform(chain, Chains.state(chain, state));
            LongRunChecks checks = LongRunChecks.of(ground, transform);
            assertEquals(new LongRun.Limit(limits.get(state)), checks.byPoles());
            assertEquals(Optional.of(checks.byPoles()), checks.byClasses());
            assertTrue(checks.highPowers().orElseThrow().within().compareTo(Rational.TWO.pow(-80)) < 0);
        }
    }
}
