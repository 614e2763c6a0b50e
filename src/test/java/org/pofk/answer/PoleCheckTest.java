package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

class PoleCheckTest {

    @Test
    void polesOfRandomChainsAreEigenvaluesOfDoubles() {
        RandomChains chains = new RandomChains(17);
        int poles = 0;
        for (int round = 0; round < 60; round++) {
            Chain chain = chains.next();
            PoleCheck check = PoleCheck.of(chain, Chains.closedForm(chain, chains.output(chain)));
            // multiple eigenvalues are known to a fraction of the digits only
            assertTrue(check.largestDistance().orElseThrow() < 0.01, "seed 17, round " + round + ", " + check);
            poles += check.poles();
        }
        assertTrue(poles > 150, "poles " + poles);
    }

    @Test
    void simplePolesAgreeToNearlyAllDigits() {
        PoleCheck check = PoleCheck.of(Chains.pumps(),
                Chains.closedForm(Chains.pumps(), Chains.state(Chains.pumps(), 2)));
        assertEquals(3, check.poles());
        assertTrue(check.largestDistance().orElseThrow() < 1e-14);
        assertEquals(Optional.empty(), check.reason());
    }

    @Test
    void thePolesOfAnotherChainLieApart() {
        Chain seasonal = Chains.chain("1 0 0", "1/2 1/2 1/4", "1/4 0 1/4", "1/4 1/2 1/2");
        PoleCheck check = PoleCheck.of(seasonal, Chains.closedForm(Chains.pumps(), Chains.state(Chains.pumps(), 2)));
        assertTrue(check.largestDistance().orElseThrow() > 0.01);
    }

    @Test
    void theConstantOfAnOutputCountsAsAnEigenvalue() {
        Chain halving = Chains.recursion("1", "1/2");
        Output shifted = new Output("shifted", List.of(Rational.ONE), Rational.of(3), "s0 + 3");
        PoleCheck check = PoleCheck.of(halving, Chains.closedForm(halving, shifted));
        assertEquals(2, check.poles());
        assertEquals(Optional.of(0.0), check.largestDistance());
    }
}
