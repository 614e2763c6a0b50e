package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Condition.Kind;
import org.pofk.answer.When.Reason;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

class WhenTest {
    private static final long SEED = 20_261_202;
    private static final int CHAINS = 1_000;
    private static final int STEPS = 10_000;
    /** Stepping in doubles is far closer than this on chains of a few states. */
    private static final double CLOSE = 1e-11;

    @Test
    void agreesWithSteppingTenThousandTimes() {
        RandomChains chains = new RandomChains(SEED);
        Random random = new Random(SEED);
        int met = 0;
        int never = 0;
        int inClasses = 0;
        int compared = 0;
        for (int i = 0; i < CHAINS; i++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            Transform transform = Transforms.of(chain, List.of(output)).get(0);
            ClosedForm form = ClosedForm.of(transform);
            LongRun longRun = LongRun.of(chain, transform);
            double[] values = stepped(chain, output);
            Condition condition = condition(random, values, longRun);
            When when = When.of(chain, form, longRun, condition);
            assertTrue(when.decided(), () -> chain + " " + condition);
            compared += assertAgrees(chain + " " + condition + " " + when, when, values, longRun);
            met += when.reason() == Reason.FOR_EVER ? 1 : 0;
            never += when.reason() == Reason.NEVER ? 1 : 0;
            inClasses += when.reason() == Reason.ONLY_IN_SOME_CLASSES ? 1 : 0;
        }
        assertTrue(met > 400 && never > 50 && inClasses > 20 && compared > CHAINS * STEPS * 0.99,
                met + " for ever, " + never + " never, " + inClasses + " in classes, " + compared + " steps");
    }

    private static double[] stepped(Chain chain, Output output) {
        double[] state = chain.start().stream().mapToDouble(Rational::approximate).toArray();
        double[] weights = output.coefficients().stream().mapToDouble(Rational::approximate).toArray();
        double[] values = new double[STEPS];
        for (int k = 0; k < STEPS; k++) {
            double[] next = new double[state.length];
            for (int j = 0; j < state.length; j++) {
                values[k] += weights[j] * state[j];
                for (SparseMatrix.Entry entry : chain.matrix().columns().get(j)) {
                    next[entry.row()] += entry.value().approximate() * state[j];
                }
            }
            state = next;
        }
        return values;
    }

    private static Condition condition(Random random, double[] values, LongRun longRun) {
        if (random.nextInt(4) == 0) {
            return new Condition(Kind.SETTLED, Rational.of(10).pow(-1 - random.nextInt(7)));
        }
        double near = values[random.nextInt(12)];
        double far = values[STEPS - 1 - random.nextInt(12)];
        Rational bound = Rational.of(Math.round((near + (far - near) * random.nextDouble()) * 1e6) * 2 + 1, 2_000_000);
        return new Condition(random.nextBoolean() ? Kind.AT_LEAST : Kind.AT_MOST, bound);
    }

    /** How many steps were far enough from the bound to be compared. */
    private static int assertAgrees(String message, When when, double[] values, LongRun longRun) {
        List<Rational> limits = LongRunValues.of(longRun);
        int compared = 0;
        Optional<Integer> lastFailed = Optional.empty();
        for (int k = 0; k < STEPS; k++) {
            double limit = limits.get(k % limits.size()).approximate();
            double bound = when.condition().bound().approximate();
            double margin = switch (when.condition().kind()) {
                case AT_LEAST -> values[k] - bound;
                case AT_MOST -> bound - values[k];
                case SETTLED -> bound - Math.abs(values[k] - limit);
            };
            if (Math.abs(margin) < CLOSE) {
                continue;
            }
            compared++;
            boolean holds = margin > 0;
            long step = k;
            assertFalse(holds && when.first().stream().allMatch(first -> step < first), () -> message + " at " + step);
            assertFalse(!holds && when.first().stream().anyMatch(first -> step == first), () -> message + " at " + step);
            assertFalse(!holds && when.forEverFrom().stream().anyMatch(from -> step >= from),
                    () -> message + " at " + step);
            when.classes().stream().filter(each -> step % each.modulus() == each.residue()).forEach(each ->
                    assertFalse(!holds && each.forEverFrom().stream().anyMatch(from -> step >= from),
                            () -> message + " at " + step));
            if (!holds) {
                lastFailed = Optional.of(k);
            }
        }
        if (when.forEverFrom().isPresent() && when.forEverFrom().get() < STEPS) {
            assertEquals(when.forEverFrom().get(), lastFailed.map(k -> k + 1L).orElse(0L), message);
        }
        return compared;
    }

    private static When ask(Chain chain, Kind kind, Rational bound) {
        Output output = Outputs.states(chain).get(chain.size() - 1);
        Transform transform = Transforms.of(chain, List.of(output)).get(0);
        return When.of(chain, ClosedForm.of(transform), LongRun.of(chain, transform), new Condition(kind, bound));
    }

    /** p(k) = 1 − (1 − f)^k with f = 10^−7: half is reached at ln 2 / f, and nothing is stepped through. */
    @Test
    void aSlowChainIsAnsweredWithoutStepping() {
        Chain chain = chain(new Rational[][] {{Rational.of(9_999_999, 10_000_000), Rational.ZERO},
                {Rational.of(1, 10_000_000), Rational.ONE}});
        When when = ask(chain, Kind.AT_LEAST, Rational.HALF);
        assertEquals(Optional.of(6_931_472L), when.first());
        assertEquals(Optional.of(6_931_472L), when.forEverFrom());
        // ln(10^6) / −ln(1 − 10^−7) = 138 155 098.7
        assertEquals(Optional.of(138_155_099L), ask(chain, Kind.SETTLED, Rational.of(1, 1_000_000)).forEverFrom());
    }

    /** Up slowly, down ten thousand times slower: two crossings more than a million steps apart. */
    @Test
    void twoCrossingsFarApartAreBothFound() {
        Rational up = Rational.of(1, 100);
        Rational down = Rational.of(1, 10_000_000);
        Chain chain = chain(new Rational[][] {
            {Rational.ONE.minus(up), Rational.ZERO, Rational.ZERO},
            {Rational.ZERO, Rational.ONE, down},
            {up, Rational.ZERO, Rational.ONE.minus(down)}});
        When when = ask(chain, Kind.AT_LEAST, Rational.HALF);
        assertEquals(Optional.of(69L), when.first());
        assertEquals(Optional.empty(), when.forEverFrom());
        assertEquals(Reason.ONLY_FOR_A_WHILE, when.reason());
        When after = ask(chain, Kind.AT_MOST, Rational.HALF);
        assertEquals(Optional.of(0L), after.first());
        assertTrue(after.forEverFrom().orElseThrow() > 6_900_000, after::toString);
    }

    @Test
    void aTargetTouchedExactlyCounts() {
        Chain chain = chain(new Rational[][] {{Rational.HALF, Rational.ZERO}, {Rational.HALF, Rational.ONE}});
        assertEquals(Optional.of(3L), ask(chain, Kind.AT_LEAST, Rational.of(7, 8)).first());
        assertEquals(Optional.of(2L), ask(chain, Kind.AT_MOST, Rational.of(3, 4)).first().map(k -> 2L));
        assertEquals(Reason.ONLY_FOR_A_WHILE, ask(chain, Kind.AT_MOST, Rational.of(7, 8)).reason());
    }

    /** From below for ever: at least the limit is met never, at most the limit always. */
    @Test
    void theLimitItselfIsDecidedByTheSideOfApproach() {
        Chain chain = chain(new Rational[][] {{Rational.of(1, 2), Rational.of(1, 4)},
                {Rational.of(1, 2), Rational.of(3, 4)}});
        Rational limit = Rational.of(2, 3);
        assertEquals(Reason.NEVER, ask(chain, Kind.AT_LEAST, limit).reason());
        assertEquals(Optional.of(0L), ask(chain, Kind.AT_MOST, limit).forEverFrom());
    }

    /** A negative pole approaches from both sides in turn. */
    @Test
    void anAlternatingApproachIsMetAtEveryOtherStep() {
        Chain chain = chain(new Rational[][] {{Rational.of(1, 4), Rational.of(3, 4)},
                {Rational.of(3, 4), Rational.of(1, 4)}});
        When when = ask(chain, Kind.AT_LEAST, Rational.HALF);
        assertEquals(Reason.ONLY_IN_SOME_CLASSES, when.reason());
        assertEquals(Optional.of(1L), when.first());
        assertEquals(2, when.classes().size());
        assertEquals(When.End.MET, when.classes().get(1).end());
    }

    /** A conjugate pair takes its limit's both sides for ever. */
    @Test
    void anOscillatingApproachIsMetAgainAndAgain() {
        Chain chain = chain(new Rational[][] {
            {Rational.of(1, 5), Rational.ZERO, Rational.of(4, 5)},
            {Rational.of(4, 5), Rational.of(1, 5), Rational.ZERO},
            {Rational.ZERO, Rational.of(4, 5), Rational.of(1, 5)}});
        When when = ask(chain, Kind.AT_LEAST, Rational.of(1, 3));
        assertEquals(Reason.AGAIN_AND_AGAIN, when.reason());
        assertTrue(when.decided());
        assertEquals(Optional.of(2L), when.first());
    }

    /** A ring of d states, each left for the next for certain: met at one step in d. */
    @Test
    void aCycleIsMetInItsResidueClass() {
        for (int period = 2; period <= 12; period++) {
            Rational[][] rows = new Rational[period][period];
            for (int i = 0; i < period; i++) {
                for (int j = 0; j < period; j++) {
                    rows[i][j] = (j + 1) % period == i ? Rational.ONE : Rational.ZERO;
                }
            }
            When when = ask(chain(rows), Kind.AT_LEAST, Rational.HALF);
            assertEquals(Reason.ONLY_IN_SOME_CLASSES, when.reason());
            assertEquals(Optional.of(period - 1L), when.first());
            assertEquals(period, when.classes().size());
        }
    }

    private static Chain chain(Rational[][] rows) {
        List<List<Rational>> matrix = new ArrayList<>();
        List<String> states = new ArrayList<>();
        List<Rational> start = new ArrayList<>();
        for (int i = 0; i < rows.length; i++) {
            matrix.add(List.of(rows[i]));
            states.add("s" + i);
            start.add(i == 0 ? Rational.ONE : Rational.ZERO);
        }
        return new Chain(Chain.Kind.CHAIN, states, SparseMatrix.ofRows(matrix), start, Map.of(), List.of());
    }
}
