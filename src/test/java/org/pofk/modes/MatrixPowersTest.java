package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.transform.StateTransform;

/** Expansions against the chain stepped in exact rationals, and against the law of total probability. */
class MatrixPowersTest {
    private int repeatedPairs;
    private int nilpotent;
    private int irrational;

    @Test
    void expansionsAreTheMatrixPowersOfRandomChains() {
        Random random = new Random(2_024);
        for (int run = 0; run < 1_000; run++) {
            assertPowers(Samples.randomChain(random, 2 + random.nextInt(3)));
        }
        assertTrue(irrational > 100, "irrational: " + irrational);
    }

    @Test
    void expansionsAreTheMatrixPowersOfRandomRecursions() {
        Random random = new Random(2_025);
        for (int run = 0; run < 1_000; run++) {
            assertPowers(Samples.randomRecursion(random));
        }
        assertTrue(repeatedPairs > 100, "repeated pairs: " + repeatedPairs);
        assertTrue(nilpotent > 500, "nilpotent: " + nilpotent);
    }

    private void assertPowers(Chain chain) {
        List<Expansion<Rational>> states = expansions(chain);
        List<Rational> x = chain.start();
        for (int k = 0; k <= 4; k++) {
            long step = k;
            assertEquals(x, states.stream().map(state -> state.valueAt(step)).toList(), () -> chain + " at " + step);
            x = chain.matrix().times(x);
        }
        for (Expansion.Part<Rational> part : states.get(0).parts()) {
            irrational += part.factor().polynomial().degree() > 1 ? 1 : 0;
            repeatedPairs += part.factor().polynomial().degree() == 2 && part.factor().multiplicity() > 1 ? 1 : 0;
        }
        nilpotent += states.stream().anyMatch(state -> !state.impulses().isEmpty()) ? 1 : 0;
    }

    /** As identities: every coefficient sums to zero over the states, but for the pole 1, where the sum is one. */
    @Test
    void probabilitiesSumToOneIdentically() {
        Random random = new Random(11);
        int parts = 0;
        for (int run = 0; run < 300; run++) {
            List<Expansion<Rational>> states = expansions(Samples.randomChain(random, 2 + random.nextInt(5)));
            for (int i = 0; i < states.get(0).parts().size(); i++) {
                Expansion.Part<Rational> part = states.get(0).parts().get(i);
                boolean isOne = part.factor().polynomial().equals(Polynomial.ofIntegers(-1, 1));
                for (int power = 0; power < part.coefficients().size(); power++) {
                    Polynomial<Rational> sum = Polynomial.zero(RationalField.Q);
                    for (Expansion<Rational> state : states) {
                        sum = sum.plus(state.parts().get(i).coefficients().get(power).numerator());
                    }
                    assertEquals(isOne && power == 0 ? Polynomial.ofIntegers(1) : Polynomial.ofIntegers(), sum);
                    parts++;
                }
            }
            Polynomial<Rational> impulses = Polynomial.zero(RationalField.Q);
            for (Expansion<Rational> state : states) {
                impulses = impulses.plus(Polynomial.ofRationals(state.impulses()));
            }
            assertTrue(impulses.isZero());
        }
        assertTrue(parts > 500, "coefficients: " + parts);
    }

    private static List<Expansion<Rational>> expansions(Chain chain) {
        StateTransform transform = StateTransform.of(chain);
        return PartialFractions.ofEach(transform.numerators(), transform.recurrence(), transform.factors());
    }
}
