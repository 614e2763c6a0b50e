package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion;

class ComparisonTest {

    @Test
    void closedFormsOfRandomChainsEqualTheirExactPowers() {
        RandomChains chains = new RandomChains(13);
        int partialFractions = 0;
        for (int round = 0; round < 80; round++) {
            Chain chain = chains.next();
            Comparison comparison = compare(chain, chains.output(chain), 30);
            assertEquals(Rational.ZERO, comparison.exactPowers().largestDifference(), "seed 13, round " + round);
            assertTrue(comparison.exactPowers().modesWithin().compareTo(Rational.TWO.pow(-60)) < 0);
            assertTrue(comparison.doubleStepping().largestDifference().compareTo(Rational.of(1, 1L << 40)) < 0);
            partialFractions += comparison.exactPowers().how() == Comparison.How.PARTIAL_FRACTIONS ? 1 : 0;
        }
        assertTrue(partialFractions > 60);
    }

    @Test
    void aWrongCoefficientIsFarFromTheExactPowers() {
        Chain pumps = Chains.pumps();
        ClosedForm right = Chains.closedForm(pumps, Chains.state(pumps, 2));
        Expansion.Part<Rational> part = right.expansion().parts().get(0);
        Expansion.Coefficient<Rational> doubled = new Expansion.Coefficient<>(
                part.coefficients().get(0).numerator().times(Rational.TWO), part.coefficients().get(0).denominator());
        List<Expansion.Part<Rational>> parts = new ArrayList<>(right.expansion().parts());
        parts.set(0, new Expansion.Part<>(part.factor(), List.of(doubled)));
        ClosedForm wrong = new ClosedForm(right.transform(),
                new Expansion<>(right.expansion().field(), right.expansion().impulses(), parts), right.roots(),
                right.modes().subList(1, right.modes().size()));
        Comparison.ExactPowers powers = Comparison.of(pumps, List.of(wrong), 20, Optional.empty()).get(0).exactPowers();
        assertEquals(Rational.of(23, 2813), powers.largestDifference());
        assertTrue(powers.modesWithin().compareTo(Rational.of(1, 1_000)) > 0);
    }

    @Test
    void steppingInDoublesStopsWhereItOverflows() {
        Chain growing = Chains.recursion("1", "1" + "0".repeat(100));
        assertEquals(3, compare(growing, Chains.state(growing, 0), 10).doubleStepping().last());
    }

    @Test
    void doublesDriftFromExactPowersByTheirRounding() {
        Chain pumps = Chains.pumps();
        Comparison.DoubleStepping doubles = compare(pumps, Chains.state(pumps, 2), 200).doubleStepping();
        assertEquals(200, doubles.last());
        assertTrue(doubles.largestDifference().signum() > 0);
    }

    private static Comparison compare(Chain chain, Output output, int last) {
        return Comparison.of(chain, List.of(Chains.closedForm(chain, output)), last, Optional.empty()).get(0);
    }
}
