package org.pofk.longrun;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Chains;
import org.pofk.answer.RandomChains;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.FixedPointState;

class SettlingTest {

    @Test
    void theBoundHoldsAtEveryLaterStepOfRandomChains() {
        RandomChains chains = new RandomChains(5);
        int compared = 0;
        for (int round = 0; round < 80; round++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            LongRun longRun = Chains.longRun(chain, output);
            Settling settling = Settling.of(Chains.closedForm(chain, output), longRun, 6).orElseThrow();
            if (settling.from().bitLength() < 10) {
                int from = settling.from().intValueExact();
                List<Rational> values = LongRunValues.of(longRun);
                List<FixedPointState> states = FixedPointState.at(chain, List.of(from, from + 1, from + 2, from + 7));
                for (int i = 0; i < 4; i++) {
                    int k = i < 3 ? from + i : from + 7;
                    Rational distance = states.get(i).reading(output).middle().minus(values.get(k % values.size()))
                            .abs();
                    assertTrue(distance.compareTo(Rational.of(1, 1_000_000)) <= 0, "seed 5, round " + round);
                }
                compared++;
            }
        }
        assertTrue(compared >= 50, "compared " + compared);
    }

    @Test
    void theSlowestModeOfThePumpsIsTheLargerOfTheirTwoSmallPoles() {
        // 0.2317... and 0.4508... are the roots of z^2 - (273/400) z + 2089/20000
        Settling settling = settling(Chains.pumps(), 2, 6);
        Rational slowest = settling.slowest().orElseThrow().enclose(60).middle();
        Rational polynomial = slowest.times(slowest).minus(Rational.of(273, 400).times(slowest))
                .plus(Rational.of(2089, 20_000));
        assertTrue(polynomial.abs().compareTo(Rational.TWO.pow(-50)) < 0 && slowest.compareTo(Rational.of(2, 5)) > 0);
        assertEquals(1, settling.tied());
        assertTrue(settling.from().intValueExact() <= 20);
    }

    @Test
    void modesOfEqualModulusAreTied() {
        // Grinstead and Snell, example 11.1: eigenvalues 1, 1/4, -1/4
        Chain seasonal = Chains.chain("1 0 0", "1/2 1/2 1/4", "1/4 0 1/4", "1/4 1/2 1/2");
        assertEquals(2, settling(seasonal, 0, 6).tied());
    }

    @Test
    void aNearlyReducibleChainSettlesAfterManyBillionsOfSteps() {
        Settling settling = settling(Chains.nearlyReducible(), 2, 6);
        assertTrue(settling.from().compareTo(BigInteger.TEN.pow(11)) > 0, settling.toString());
        assertTrue(settling.from().compareTo(BigInteger.TEN.pow(12)) < 0, settling.toString());
    }

    @Test
    void repeatedSlowPolesAreBoundedFromWhereTheyFall() {
        Chain stages = Chains.chain("1 0 0", "9/10 0 0", "1/10 9/10 0", "0 1/10 1");
        int from = settling(stages, 1, 6).from().intValueExact();
        List<Rational> exact = ExactSteps.of(stages, List.of(Chains.state(stages, 1)), from + 1).values().get(0);
        assertTrue(exact.get(from).compareTo(Rational.of(1, 1_000_000)) <= 0);
        assertTrue(from < 2 * firstBelow(exact), "from " + from);
    }

    @Test
    void withoutDecayingModesTheLongRunIsThereAfterTheImpulses() {
        Chain turns = Chains.chain("1 0 0", "0 0 0", "1 0 1", "0 1 0");
        assertEquals(new Settling(Optional.empty(), Optional.empty(), 0, 0, Optional.empty(), 6, BigInteger.ONE), settling(turns, 0, 6));
    }

    @Test
    void aRepeatedSlowestPoleDecaysWithAPowerOfK() {
        Chain stages = Chains.chain("1 0 0", "1/2 0 0", "1/2 1/2 0", "0 1/2 1");
        assertEquals(0, settling(stages, 0, 6).power());
        assertEquals(1, settling(stages, 1, 6).power());
    }

    /** −1/2: half as large a step later, and back on its side after two; 1/2 turns never. */
    @Test
    void aNegativeSlowestPoleTurnsRoundInTwoSteps() {
        Settling settling = settling(Chains.chain("1 0", "1/4 3/4", "3/4 1/4"), 0, 6);
        assertEquals("1.00000", Decimals.of(settling.halfLife().orElseThrow(), 6).text());
        assertEquals("2", Decimals.of(settling.period().orElseThrow(), 6).text());
        assertTrue(settling(Chains.chain("1 0", "3/4 1/4", "1/4 3/4"), 0, 6).period().isEmpty());
    }

    /** 1/5 + 4/5 ω for ω³ = 1: −1/5 ± 2√3/5 i, of modulus √13/5 and angle π − arctan 2√3. */
    @Test
    void aSlowestPairTurnsRoundInItsAngle() {
        Settling settling = settling(Chains.chain("1 0 0", "1/5 0 4/5", "4/5 1/5 0", "0 4/5 1/5"), 0, 6);
        double angle = Math.PI - Math.atan(2 * Math.sqrt(3));
        assertEquals(2 * Math.PI / angle, settling.period().orElseThrow().enclose(60).middle().approximate(), 1e-12);
        assertEquals(Math.log(2) / -Math.log(Math.sqrt(13) / 5),
                settling.halfLife().orElseThrow().enclose(60).middle().approximate(), 1e-12);
    }

    @Test
    void aSmallLongRunIsReachedToWithinAThousandthOfIt() {
        assertEquals(6, Settling.digitsFor(new LongRun.Limit(Rational.ZERO), 6));
        assertEquals(6, Settling.digitsFor(new LongRun.Limit(Rational.of(1, 1000)), 6));
        assertEquals(10, Settling.digitsFor(new LongRun.Limit(Rational.of(3, 10_000_000)), 6));
        assertEquals(8, Settling.digitsFor(new LongRun.Cycle(List.of(Rational.ONE, Rational.of(1, 100_000))), 6));
    }

    @Test
    void whatGrowsDoesNotSettle() {
        Chain growing = Chains.recursion("1", "2");
        Output output = Chains.state(growing, 0);
        assertEquals(Optional.empty(),
                Settling.of(Chains.closedForm(growing, output), Chains.longRun(growing, output), 6));
    }

    private static int firstBelow(List<Rational> values) {
        int k = values.size() - 1;
        while (values.get(k - 1).compareTo(Rational.of(1, 1_000_000)) <= 0) {
            k--;
        }
        return k;
    }

    private static Settling settling(Chain chain, int state, int digits) {
        Output output = Chains.state(chain, state);
        return Settling.of(Chains.closedForm(chain, output), Chains.longRun(chain, output), digits).orElseThrow();
    }
}
