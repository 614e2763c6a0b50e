package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.steps.ModeValues;

class PassageTest {
    private static final long SEED = 20_261_201;
    private static final int CHAINS = 150;
    private static final int STEPS = 40;
    private static final List<Rational> PARTS =
            List.of(Rational.of(1, 10), Rational.HALF, Rational.of(9, 10), Rational.of(99, 100));

    /** Random chains, sets and states to avoid, stepped by hand with the mass that arrives taken out. */
    @Test
    void theLawIsThatOfSteppingWithWhatArrivesTakenOut() {
        RandomChains chains = new RandomChains(SEED);
        Random random = new Random(SEED);
        int certain = 0;
        int uncertain = 0;
        int percentiles = 0;
        for (int i = 0; i < CHAINS; i++) {
            Chain chain = chains.next();
            Set<Integer> into = subset(random, chain.size(), Set.of());
            into.add(random.nextInt(chain.size()));
            Set<Integer> avoiding = random.nextInt(3) == 0 ? subset(random, chain.size(), into) : Set.of();
            Passage passage = Passage.of(chain, into, avoiding, PARTS, List.of(0, 1, 2, 7));
            List<Rational> law = stepped(chain, into, avoiding);
            Rational sum = Rational.ZERO;
            for (int k = 0; k <= STEPS; k++) {
                sum = sum.plus(law.get(k));
                assertEquals(law.get(k), valueAt(passage.law(), k), () -> "law " + chain + into + avoiding);
                assertEquals(sum, valueAt(passage.distribution(), k), () -> "distribution " + chain);
                assertEquals(Rational.ONE.minus(sum), valueAt(passage.survival(), k), () -> "survival " + chain);
                percentiles += reachedAt(passage, law, k);
            }
            assertFromEach(chain, passage);
            certain += passage.moments().isCertain() ? 1 : 0;
            uncertain += passage.moments().isCertain() ? 0 : 1;
        }
        assertTrue(certain > 30 && uncertain > 30 && percentiles > 150,
                certain + " certain, " + uncertain + " not, " + percentiles + " percentiles");
    }

    private static Set<Integer> subset(Random random, int size, Set<Integer> without) {
        Set<Integer> subset = new TreeSet<>();
        for (int i = 0; i < size; i++) {
            if (!without.contains(i) && random.nextInt(4) == 0) {
                subset.add(i);
            }
        }
        return subset;
    }

    private static List<Rational> stepped(Chain chain, Set<Integer> into, Set<Integer> avoiding) {
        List<Rational> law = new ArrayList<>();
        List<Rational> state = new ArrayList<>(chain.start());
        for (int k = 0; k <= STEPS; k++) {
            Rational arrived = Rational.ZERO;
            for (int s : into) {
                arrived = arrived.plus(state.get(s));
                state.set(s, Rational.ZERO);
            }
            avoiding.forEach(s -> state.set(s, Rational.ZERO));
            law.add(arrived);
            List<Rational> next = chain.matrix().times(state);
            for (int s = 0; s < chain.size(); s++) {
                state.set(s, next.get(s));
            }
        }
        return law;
    }

    private static Rational valueAt(DerivedOutput output, int k) {
        return output.closedForm().orElseThrow().expansion().valueAt(k);
    }

    /** How many percentiles are at k; each of them is the first step at which the sum is large enough. */
    private static int reachedAt(Passage passage, List<Rational> law, int k) {
        Rational before = law.subList(0, k).stream().reduce(Rational.ZERO, Rational::plus);
        int count = 0;
        for (Percentile percentile : passage.percentiles()) {
            boolean here = before.compareTo(percentile.p()) < 0
                    && before.plus(law.get(k)).compareTo(percentile.p()) >= 0;
            assertEquals(here, percentile.k().equals(OptionalInt.of(k)), () -> percentile + " at " + k);
            count += here ? 1 : 0;
        }
        return count;
    }

    /** Two ways: the transform at one, and first-step analysis weighed by the start. */
    private static void assertFromEach(Chain chain, Passage passage) {
        Rational probability = Rational.ZERO;
        Rational steps = Rational.ZERO;
        for (int i = 0; i < chain.size(); i++) {
            Rational reached = chain.start().get(i).times(passage.fromEach().probabilities().get(i));
            probability = probability.plus(reached);
            steps = steps.plus(reached.times(passage.fromEach().means().get(i).orElse(Rational.ZERO)));
        }
        assertEquals(probability, passage.moments().probability(), chain::toString);
        assertEquals(probability.isZero() ? Optional.empty() : Optional.of(steps.dividedBy(probability)),
                passage.moments().mean(), chain::toString);
    }

    /** Runs of the stopped chain with seeds of their own; 99.9 % intervals, of which two in a thousand may be missed. */
    @Test
    void randomRunsStayInsideTheirIntervals() {
        RandomChains chains = new RandomChains(SEED + 2);
        Random random = new Random(SEED + 2);
        long checked = 0;
        long inside = 0;
        for (int i = 0; i < 25; i++) {
            Chain chain = chains.next();
            Set<Integer> into = subset(random, chain.size(), Set.of());
            into.add(random.nextInt(chain.size()));
            StoppedChain stopped = StoppedChain.of(chain, into, Set.of());
            Passage passage = Passage.of(chain, into, Set.of(), List.of(), List.of());
            Simulation simulation = Simulation.of(stopped.chain(), List.of(stopped.distribution()),
                    List.of(1, 3, 10, 40), 5_000, SEED + i);
            Simulation.Series series = Comparison.of(stopped.chain(),
                    List.of(passage.distribution().closedForm().orElseThrow()), STEPS, Optional.of(simulation))
                    .get(0).random().orElseThrow();
            checked += series.checked();
            inside += series.inside();
        }
        assertTrue(checked > 50 && inside == checked, inside + " of " + checked + " inside");
    }

    /** A hundred states of which none is alike: the roots of degree 99 are found, and two ways to the mean agree. */
    @Test
    void aHundredStatesAreAnswered() throws Exception {
        Chain chain = org.pofk.Pofk.read(java.nio.file.Path.of("test-data", "models", "cable-route.yaml")).chain();
        Passage passage = Passage.of(chain, Set.of(99), Set.of(), List.of(Rational.HALF), List.of());
        assertEquals(99, passage.law().closedForm().orElseThrow().roots().get(0).all().size());
        assertFromEach(chain, passage);
        int half = passage.percentiles().get(0).k().orElseThrow();
        List<Rational> bounds = List.of(distributionAt(passage, half - 1), distributionAt(passage, half));
        assertTrue(bounds.get(0).compareTo(Rational.HALF) < 0 && bounds.get(1).compareTo(Rational.HALF) > 0,
                bounds::toString);
    }

    private static Rational distributionAt(Passage passage, int k) {
        return ModeValues.of(passage.distribution().closedForm().orElseThrow()).at(k).enclose(64).middle();
    }

    @Test
    void aStartInsideTheSetGivesZeroAndAReturn() {
        Chain chain = twoStates(Rational.of(1, 4), Rational.of(1, 3));
        Passage passage = Passage.of(chain, Set.of(0), Set.of(), List.of(Rational.ONE), List.of(0));
        assertEquals(Optional.of(Rational.ZERO), passage.moments().mean());
        assertEquals(OptionalInt.of(0), passage.percentiles().get(0).k());
        // 1/π for π = (1/3)/(1/4 + 1/3)
        assertEquals(Optional.of(Rational.of(7, 4)), passage.returns().orElseThrow().mean());
        assertEquals(Optional.empty(), passage.visits());
    }

    @Test
    void theHazardOfAConstantExitIsConstant() {
        Chain chain = twoStates(Rational.of(1, 4), Rational.ZERO);
        Passage passage = Passage.of(chain, Set.of(1), Set.of(), List.of(Rational.ONE, Rational.of(3, 4)),
                List.of(1, 2, 10));
        passage.hazards().forEach(hazard -> assertEquals(Optional.of(Rational.of(1, 4)), hazard.value()));
        assertEquals(Optional.of(Percentile.Reason.NEVER), passage.percentiles().get(0).reason());
        // 1 − (3/4)^5 = 781/1024 is the first above 3/4
        assertEquals(OptionalInt.of(5), passage.percentiles().get(1).k());
        assertEquals(Optional.of(Rational.of(12)), passage.moments().variance());
    }

    @Test
    void aPercentileOfARareEventIsFoundWithoutStepping() {
        Chain chain = twoStates(Rational.of(1, 100_000_000), Rational.ZERO);
        Passage passage = Passage.of(chain, Set.of(1), Set.of(), List.of(Rational.HALF), List.of());
        // ln 2 / −ln(1 − 10^−8) = 69 314 717.7
        assertEquals(OptionalInt.of(69_314_718), passage.percentiles().get(0).k());
    }

    private static Chain twoStates(Rational out, Rational back) {
        return new Chain(Chain.Kind.CHAIN, List.of("up", "down"), SparseMatrix.ofRows(List.of(
                List.of(Rational.ONE.minus(out), back), List.of(out, Rational.ONE.minus(back)))),
                List.of(Rational.ONE, Rational.ZERO), Map.of(), List.of());
    }
}
