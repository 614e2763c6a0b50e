package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Structure;
import org.pofk.exact.Rational;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

class LongRunTest {

    @Test
    void threeWaysAgreeOnTwoThousandRandomChainsOfEveryStructure() {
        RandomChains chains = new RandomChains(7);
        int limits = 0;
        int cycles = 0;
        int misled = 0;
        for (int round = 0; round < 2_000; round++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            String which = "seed 7, round " + round + ", " + chain;
            Transform transform = Transforms.of(chain, List.of(output)).get(0);
            LongRun byPoles = LongRun.of(chain, transform);
            LongRun byClasses = ClosedClassLongRun.of(chain, Structure.of(chain)).orElseThrow().of(output);
            assertEquals(byClasses, byPoles, which);
            int period = LongRunValues.of(byPoles).size();
            HighPowers.Verdict verdict = HighPowers.of(chain, period).against(byPoles, output).orElseThrow();
            assertTrue(verdict.within().compareTo(Rational.of(1, 1_000_000_000)) <= 0, which);
            limits += period == 1 ? 1 : 0;
            cycles += period > 1 ? 1 : 0;
            misled += verdict.habitMisleads() ? 1 : 0;
        }
        assertEquals(2_000, limits + cycles);
        assertTrue(cycles > 200 && misled > 100, "cycles " + cycles + ", misled " + misled);
    }
}
