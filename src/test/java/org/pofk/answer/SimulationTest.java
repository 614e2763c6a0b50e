package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Simulation.Method;
import org.pofk.answer.Simulation.Sample;
import org.pofk.answer.Simulation.Verdict;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;

class SimulationTest {
    private static final List<Integer> STEPS = List.of(0, 1, 2, 5, 10, 20);

    @Test
    void clopperPearsonIntervalsArePublishedOnes() {
        // Newcombe 1998, Statistics in Medicine 17, table I, method 5 (95 %, from memory)
        assertInterval(81, 263, 0.2527, 0.3676);
        assertInterval(15, 148, 0.0578, 0.1617);
        assertInterval(0, 20, 0.0000, 0.1684);
        assertInterval(1, 29, 0.0009, 0.1776);
    }

    @Test
    void withoutAHitTheUpperEndIsARoot() {
        // (1 − p)^n = α/2 solved for p
        assertEquals(1 - Math.pow(0.0005, 1.0 / 50), BinomialInterval.of(0, 50, 0.999).upper(), 1e-9);
        assertEquals(Math.pow(0.0005, 1.0 / 50), BinomialInterval.of(50, 50, 0.999).lower(), 1e-9);
        assertEquals(0, BinomialInterval.of(0, 50, 0.999).lower());
        assertEquals(1, BinomialInterval.of(50, 50, 0.999).upper());
    }

    /** In doubles 1/3 is less than 1/3: as the upper end of an interval it would leave its own value out. */
    @Test
    void aSureReadingLiesInItsInterval() {
        Simulation.Series sure = Simulation.of(Chains.pumps(), List.of(Chains.reading("1/3 1/3 1/3")), STEPS, 100, 1)
                .series().get(0);
        assertEquals(Method.HOEFFDING, sure.method());
        assertEquals(STEPS.size(), sure.inside());
    }

    @Test
    void intervalsKeepTheirConfidenceInExactNumbers() {
        // P(hits or more | lower) ≤ α/2 and P(hits or fewer | upper) ≤ α/2
        Rational tail = Rational.of(1, 2_000);
        for (int runs : new int[] {10, 37, 60}) {
            for (int hits = 1; hits < runs; hits += 3) {
                BinomialInterval interval = BinomialInterval.of(hits, runs, 0.999);
                Rational lower = Rational.of(new BigDecimal(interval.lower()));
                Rational upper = Rational.of(new BigDecimal(interval.upper()));
                assertTrue(chance(runs, hits, runs, lower).compareTo(tail) <= 0, hits + " of " + runs);
                assertTrue(chance(runs, 0, hits, upper).compareTo(tail) <= 0, hits + " of " + runs);
            }
        }
    }

    private static Rational chance(int runs, int from, int to, Rational p) {
        Rational sum = Rational.ZERO;
        Rational binomial = Rational.ONE;
        for (int hits = 0; hits <= to; hits++) {
            if (hits >= from) {
                sum = sum.plus(binomial.times(p.pow(hits)).times(Rational.ONE.minus(p).pow(runs - hits)));
            }
            binomial = binomial.times(Rational.of(runs - hits, hits + 1));
        }
        return sum;
    }

    @Test
    void exactValuesLieInTheIntervalsOfRandomRuns() {
        long checked = 0;
        long inside = 0;
        for (int seed = 1; seed <= 20; seed++) {
            Simulation simulation = Simulation.of(Chains.pumps(), List.of(Chains.state(Chains.pumps(), 0),
                    Chains.state(Chains.pumps(), 1), Chains.reading("1/2 1 0")), STEPS, 2_000, seed);
            for (Simulation.Series series : simulation.series()) {
                checked += series.checked();
                inside += series.inside();
            }
        }
        assertEquals(20 * (6 + 5 + 6), checked);
        assertTrue(checked - inside <= 2, "outside " + (checked - inside));
    }

    @Test
    void fewerThanTenExpectedHitsTellNothing() {
        Simulation.Series lost = Simulation.of(Chains.pumps(), List.of(Chains.state(Chains.pumps(), 2)), STEPS, 2_000, 1)
                .series().get(0);
        // p(1) = 1/400 makes 5 expected hits, p(2) = 113/20000 makes 11.3
        assertEquals(List.of(Verdict.CANT_TELL, Verdict.CANT_TELL, Verdict.INSIDE),
                lost.samples().stream().limit(3).map(Sample::verdict).toList());
        assertEquals(4, lost.checked());
    }

    @Test
    void aWrongChainIsFoundOut() {
        Chain other = Chains.chain("1 0 0", "0.85 0.6 0", "0.1475 0.38 0.6", "1/400 0.02 0.4");
        Simulation simulation = Simulation.of(other, List.of(Chains.state(other, 1)), List.of(5), 10_000, 1);
        Simulation right = Simulation.of(Chains.pumps(), List.of(Chains.state(other, 1)), List.of(5), 10_000, 1);
        double estimate = simulation.series().get(0).samples().get(0).estimate();
        assertTrue(estimate > right.series().get(0).samples().get(0).interval().upper());
    }

    @Test
    void theSameSeedGivesTheSameRunsAndAnotherSeedOthers() {
        List<Sample> first = lost(3);
        assertEquals(first, lost(3));
        assertTrue(!first.equals(lost(4)));
    }

    @Test
    void aSetIsCountedAndAWeightedReadingAveraged() {
        List<Simulation.Series> series = Simulation.of(Chains.pumps(),
                List.of(Chains.reading("1 1 0"), Chains.reading("1/2 1 0")), List.of(3), 1_000, 1).series();
        assertEquals(List.of(Method.CLOPPER_PEARSON, Method.HOEFFDING),
                series.stream().map(Simulation.Series::method).toList());
        assertEquals(series.get(0).samples().get(0).hits(), series.get(1).samples().get(0).hits());
    }

    private static List<Sample> lost(long seed) {
        return Simulation.of(Chains.pumps(), List.of(Chains.state(Chains.pumps(), 1)), STEPS, 500, seed).series().get(0)
                .samples();
    }

    private static void assertInterval(long hits, long runs, double lower, double upper) {
        BinomialInterval interval = BinomialInterval.of(hits, runs, 0.95);
        assertEquals(lower, interval.lower(), 0.00005001);
        assertEquals(upper, interval.upper(), 0.00005001);
    }
}
