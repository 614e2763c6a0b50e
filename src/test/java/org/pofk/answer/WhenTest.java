package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.function.Supplier;
import org.junit.jupiter.api.Test;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Condition.Kind;
import org.pofk.answer.When.Reason;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.modes.ClosedForm;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

class WhenTest {
    private static final long SEED = 20_261_202;
    private static final int CHAINS = 1_000;
    private static final int STEPS = 10_000;

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
            Stepped values = Stepped.of(chain, output);
            Condition condition = condition(random, values);
            When when = When.of(chain, form, longRun, condition);
            assertTrue(when.decided(), () -> chain + " " + condition);
            compared += assertAgrees(() -> chain + " " + condition + " " + when, when, values, longRun);
            met += when.reason() == Reason.FOR_EVER ? 1 : 0;
            never += when.reason() == Reason.NEVER ? 1 : 0;
            inClasses += when.reason() == Reason.ONLY_IN_SOME_CLASSES ? 1 : 0;
        }
        assertTrue(met > 400 && never > 50 && inClasses > 20 && compared > CHAINS * STEPS * 0.99,
                met + " for ever, " + never + " never, " + inClasses + " in classes, " + compared + " steps");
    }

    /** Twice an output's values in units of 2^−60, from below in each state, and by how much each may be off. Certified. */
    private record Stepped(long[] values, long[] off) {
        static final int BITS = 60;
        private static final long ONE = 1L << BITS;

        /** For coefficients that are multiples of a half and at most two. */
        static Stepped of(Chain chain, Output output) {
            int[][] rows = chain.matrix().columns().stream().map(column -> column.stream()
                    .mapToInt(SparseMatrix.Entry::row).toArray()).toArray(int[][]::new);
            long[][] shares = chain.matrix().columns().stream().map(column -> column.stream()
                    .mapToLong(entry -> units(entry.value(), BITS)).toArray()).toArray(long[][]::new);
            long[] twice = output.coefficients().stream().mapToLong(weight -> units(weight, 1)).toArray();
            long[] state = chain.start().stream().mapToLong(share -> units(share, BITS)).toArray();
            Stepped stepped = new Stepped(new long[STEPS], new long[STEPS]);
            for (int k = 0; k < STEPS; k++) {
                long missing = ONE;
                long[] next = new long[state.length];
                for (int j = 0; j < state.length; j++) {
                    stepped.values[k] += twice[j] * state[j];
                    missing -= state[j];
                    for (int i = 0; i < rows[j].length; i++) {
                        next[rows[j][i]] += Math.multiplyHigh(state[j] << 2, shares[j][i] << 2);
                    }
                }
                stepped.off[k] = 4 * missing + 8;
                state = next;
            }
            return stepped;
        }

        /** The largest whole number of units that is not above a number. */
        static long units(Rational value, int bits) {
            return value.times(Rational.TWO.pow(bits)).floor().longValueExact();
        }
    }

    private static Condition condition(Random random, Stepped stepped) {
        if (random.nextInt(4) == 0) {
            return new Condition(Kind.SETTLED, Rational.of(10).pow(-1 - random.nextInt(7)));
        }
        double near = stepped.values[random.nextInt(12)] / (2.0 * Stepped.ONE);
        double far = stepped.values[STEPS - 1 - random.nextInt(12)] / (2.0 * Stepped.ONE);
        Rational bound = Rational.of(Math.round((near + (far - near) * random.nextDouble()) * 1e6) * 2 + 1, 2_000_000);
        return new Condition(random.nextBoolean() ? Kind.AT_LEAST : Kind.AT_MOST, bound);
    }

    /** How many steps were far enough from the bound to be compared. */
    private static int assertAgrees(Supplier<String> message, When when, Stepped stepped, LongRun longRun) {
        long[] limits = LongRunValues.of(longRun).stream().mapToLong(limit -> Stepped.units(limit, Stepped.BITS + 1))
                .toArray();
        long bound = Stepped.units(when.condition().bound(), Stepped.BITS + 1);
        int compared = 0;
        Optional<Integer> lastFailed = Optional.empty();
        for (int k = 0; k < STEPS; k++) {
            long limit = limits[k % limits.length];
            long margin = switch (when.condition().kind()) {
                case AT_LEAST -> stepped.values[k] - bound;
                case AT_MOST -> bound - stepped.values[k];
                case SETTLED -> bound - Math.abs(stepped.values[k] - limit);
            };
            if (Math.abs(margin) <= stepped.off[k]) {
                continue;
            }
            compared++;
            boolean holds = margin > 0;
            long step = k;
            assertFalse(holds && when.first().stream().allMatch(first -> step < first), () -> message.get() + " at " + step);
            assertFalse(!holds && when.first().stream().anyMatch(first -> step == first), () -> message.get() + " at " + step);
            assertFalse(!holds && when.forEverFrom().stream().anyMatch(from -> step >= from),
                    () -> message.get() + " at " + step);
            when.classes().stream().filter(each -> step % each.modulus() == each.residue()).forEach(each ->
                    assertFalse(!holds && each.forEverFrom().stream().anyMatch(from -> step >= from),
                            () -> message.get() + " at " + step));
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
        assertEquals(Optional.of(0L), ask(chain, Kind.AT_MOST, Rational.of(7, 8)).first());
        // 1 − 2^−k is 7/8 at k = 3, and 7/8 is still met there and not at k = 4
        assertEquals(Optional.of(4L), ask(chain, Kind.AT_LEAST, Rational.of(15, 16)).forEverFrom());
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
