package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.RealValue;
import org.pofk.steps.StepValue;

class ConditionalTest {
    private static final long SEED = 20_261_203;
    private static final int CHAINS = 50;
    private static final int STEPS = 30;
    private static final int WHEN_CHAINS = 120;
    private static final int WHEN_STEPS = 120;
    /** Classes left with probability 10^−8 a step have died out by then, and a double pole's 1/k is small. */
    private static final int FAR = 2_000_000_000;
    private static final Rational NEAR = Rational.of(1, 10_000);

    /** Random chains and sets, stepped by hand with what is excluded taken out; the limit against a far step. */
    @Test
    void valuesAreThoseOfSteppingAndTheLimitIsWhereTheyGo() {
        RandomChains chains = new RandomChains(SEED);
        Random random = new Random(SEED);
        int compared = 0;
        int undefined = 0;
        int limits = 0;
        int cycles = 0;
        for (int i = 0; i < CHAINS; i++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            Set<Integer> in = subset(random, chain.size());
            Set<Integer> never = random.nextInt(2) == 0 ? subset(random, chain.size()) : Set.of();
            Given given = new Given(List.of("in"), in, List.of(), never);
            ConditionalModel found = ConditionalModel.of(model(chain), given, List.of(output), steps(), each -> { });
            List<Optional<Rational>> stepped = stepped(chain, output, given, STEPS + 1);
            List<Conditional.At> values = found.outputs().get(0).values();
            for (int k = 0; k <= STEPS; k++) {
                assertEquals(stepped.get(k), values.get(k).value().map(value -> value.exact().orElseThrow()),
                        () -> chain + " " + given);
                assertEquals(stepped.get(k).isPresent(), found.possible().orElseThrow().at(k), () -> chain + " " + given);
                compared++;
                undefined += stepped.get(k).isEmpty() ? 1 : 0;
            }
            ConditionalLongRun longRun = found.outputs().get(0).longRun().orElseThrow();
            assertGoesThere(longRun, values.subList(STEPS + 1, values.size()), chain + " " + given + " " + longRun);
            limits += longRun.kind() == ConditionalLongRun.Kind.LIMIT ? 1 : 0;
            cycles += longRun.kind() == ConditionalLongRun.Kind.CYCLE ? 1 : 0;
        }
        assertTrue(compared == CHAINS * (STEPS + 1) && undefined > 300 && limits > 20 && cycles > 8,
                compared + " values, " + undefined + " undefined, " + limits + " limits, " + cycles + " cycles");
    }

    /** Random chains, sets and bounds, each step's value by hand in fractions; the limit from the far answer above. */
    @Test
    void whenIsThatOfSteppingInFractions() {
        RandomChains chains = new RandomChains(SEED + 1);
        Random random = new Random(SEED + 1);
        int compared = 0;
        int forEver = 0;
        int inClasses = 0;
        int settled = 0;
        for (int i = 0; i < WHEN_CHAINS; i++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            Set<Integer> never = random.nextInt(2) == 0 ? subset(random, chain.size()) : Set.of();
            Given given = new Given(List.of("in"), subset(random, chain.size()), List.of(), never);
            List<Optional<Rational>> values = stepped(chain, output, given, WHEN_STEPS);
            When.Condition.Kind kind = When.Condition.Kind.values()[random.nextInt(3)];
            Rational bound = kind == When.Condition.Kind.SETTLED ? Rational.of(10).pow(-1 - random.nextInt(4))
                    : values.get(random.nextInt(8)).map(value -> value.plus(Rational.of(random.nextInt(3) - 1, 97)))
                            .orElse(Rational.HALF);
            ConditionalWhen.Answer answer = ConditionalWhen.of(model(chain), given, List.of(output),
                    new WhenModel.Asked(kind, bound, false), each -> { }).answers().get(0);
            assertTrue(answer.when().decided(), () -> chain + " " + given + " " + answer);
            for (int k = 0; k < WHEN_STEPS; k++) {
                assertHolds(answer.when(), k, holds(answer, values.get(k), k), chain + " " + given + " " + answer);
                compared++;
            }
            forEver += answer.when().forEverFrom().isPresent() ? 1 : 0;
            inClasses += answer.when().reason() == When.Reason.ONLY_IN_SOME_CLASSES ? 1 : 0;
            settled += kind == When.Condition.Kind.SETTLED ? 1 : 0;
        }
        assertTrue(compared == WHEN_CHAINS * WHEN_STEPS && forEver > 40 && inClasses > 8 && settled > 25, compared
                + " steps, " + forEver + " for ever, " + inClasses + " in classes, " + settled + " settled");
    }

    private static boolean holds(ConditionalWhen.Answer answer, Optional<Rational> value, int k) {
        Rational bound = answer.when().condition().bound();
        return value.isPresent() && switch (answer.when().condition().kind()) {
            case AT_LEAST -> value.get().compareTo(bound) >= 0;
            case AT_MOST -> value.get().compareTo(bound) <= 0;
            case SETTLED -> {
                List<Optional<RealValue>> limits = answer.longRun().values();
                yield !limits.isEmpty() && limits.get(k % limits.size()).isPresent() && value.get()
                        .minus(limits.get(k % limits.size()).get().enclosure().enclose(400).middle()).abs()
                        .compareTo(bound) <= 0;
            }
        };
    }

    private static void assertHolds(When when, long k, boolean holds, String message) {
        assertTrue(!holds || when.first().stream().anyMatch(first -> first <= k), () -> message + " at " + k);
        assertTrue(holds || when.first().stream().noneMatch(first -> first == k), () -> message + " at " + k);
        assertTrue(holds || when.forEverFrom().stream().noneMatch(from -> from <= k), () -> message + " at " + k);
        assertTrue(!holds || when.forEverFrom().stream().noneMatch(from -> from == k + 1), () -> message + " at " + k);
        when.classes().stream().filter(each -> k % each.modulus() == each.residue()).forEach(each ->
                assertTrue(holds || each.forEverFrom().stream().noneMatch(from -> from <= k), message + " at " + k));
    }

    private static List<Integer> steps() {
        List<Integer> steps = new ArrayList<>();
        for (int k = 0; k <= STEPS; k++) {
            steps.add(k);
        }
        for (int k = FAR; k < FAR + 12; k++) {
            steps.add(k);
        }
        return steps;
    }

    private static Set<Integer> subset(Random random, int size) {
        Set<Integer> subset = new TreeSet<>(Set.of(random.nextInt(size)));
        for (int i = 0; i < size; i++) {
            if (random.nextInt(4) == 0) {
                subset.add(i);
            }
        }
        return subset;
    }

    private static List<Optional<Rational>> stepped(Chain chain, Output output, Given given, int count) {
        List<Optional<Rational>> values = new ArrayList<>();
        List<Rational> state = new ArrayList<>(chain.start());
        for (int k = 0; k < count; k++) {
            given.never().forEach(each -> state.set(each, Rational.ZERO));
            Rational above = Rational.ZERO;
            Rational below = Rational.ZERO;
            for (int i : given.in()) {
                above = above.plus(state.get(i).times(output.coefficients().get(i)));
                below = below.plus(state.get(i));
            }
            values.add(below.isZero() ? Optional.empty() : Optional.of(above.dividedBy(below)));
            List<Rational> next = chain.matrix().times(state);
            for (int i = 0; i < chain.size(); i++) {
                state.set(i, next.get(i));
            }
        }
        return values;
    }

    private static void assertGoesThere(ConditionalLongRun longRun, List<Conditional.At> far, String message) {
        for (Conditional.At at : far) {
            Optional<RealValue> limit = longRun.values().isEmpty() ? Optional.empty()
                    : longRun.values().get(at.k() % longRun.values().size());
            assertEquals(limit.isPresent(), at.value().isPresent(), message);
            if (limit.isPresent()) {
                Rational distance = limit.get().enclosure().enclose(64)
                        .minus(at.value().orElseThrow().enclosure().enclose(64)).abs().upper();
                assertTrue(distance.compareTo(NEAR) < 0, () -> message + " at " + at.k() + ": off by " + distance);
            }
        }
    }

    /** Two units without repair: given that not both have failed, one has in the end, for it fails later. */
    @Test
    void whatIsLeftInTheEndIsTheStateThatIsLeftLast() {
        Rational half = Rational.HALF;
        Chain chain = new Chain(Chain.Kind.CHAIN, List.of("two", "one", "none"), SparseMatrix.ofRows(List.of(
                List.of(Rational.of(1, 4), Rational.ZERO, Rational.ZERO),
                List.of(half, half, Rational.ZERO),
                List.of(Rational.of(1, 4), half, Rational.ONE))),
                List.of(Rational.ONE, Rational.ZERO, Rational.ZERO), Map.of(), List.of());
        Given given = new Given(List.of(), Set.of(0, 1, 2), List.of("none"), Set.of(2));
        ConditionalModel found = ConditionalModel.of(model(chain), given,
                List.of(output(Rational.ONE, Rational.ZERO), output(Rational.ZERO, Rational.ONE)), List.of(1),
                each -> { });
        assertEquals(Optional.of(Rational.ZERO), limit(found, 0));
        assertEquals(Optional.of(Rational.ONE), limit(found, 1));
        assertEquals(Optional.of(Rational.of(2, 3)),
                found.outputs().get(1).values().get(0).value().flatMap(StepValue::exact));
    }

    /** Up, worn and out: of what isn't out yet the share still up is no fraction. */
    @Test
    void anIrrationalLimitIsGivenInRoots() {
        Chain chain = new Chain(Chain.Kind.CHAIN, List.of("up", "worn", "out"), SparseMatrix.ofRows(List.of(
                List.of(Rational.HALF, Rational.HALF, Rational.ZERO),
                List.of(Rational.HALF, Rational.ZERO, Rational.ZERO),
                List.of(Rational.ZERO, Rational.HALF, Rational.ONE))),
                List.of(Rational.ONE, Rational.ZERO, Rational.ZERO), Map.of(), List.of());
        ConditionalModel found = ConditionalModel.of(model(chain),
                new Given(List.of("in service"), Set.of(0, 1), List.of(), Set.of()),
                List.of(output(Rational.ONE, Rational.ZERO)), List.of(), each -> { });
        // λ² = λ/2 + 1/4, and up : worn = λ : 1/2, so that the share of up is the golden ratio's (√5 − 1)/2
        RealValue limit = found.outputs().get(0).longRun().orElseThrow().values().get(0).orElseThrow();
        assertEquals("-1/2 + sqrt(5)/2", org.pofk.formula.PlainText.ASCII.write(limit.exact().orElseThrow()));
    }

    private static Output output(Rational two, Rational one) {
        return new Output("y", List.of(two, one, Rational.ZERO), Rational.ZERO, "y");
    }

    private static Optional<Rational> limit(ConditionalModel found, int output) {
        return found.outputs().get(output).longRun().orElseThrow().values().get(0).orElseThrow().rational();
    }

    private static Model model(Chain chain) {
        return new Model("random", new Model.Step("1 step", Optional.empty(), Optional.empty()),
                Model.Convention.COLUMNS, Model.About.NOTHING, chain, Optional.empty(), Optional.empty(), List.of(), List.of(),
                List.of(), List.of(), new Model.Origin("none", "0"), List.of());
    }

    @Test
    void theNumberNearALargeLimitIsAsNearAsThatOfASmallOne() {
        for (int digits = 0; digits <= 60; digits += 20) {
            Enclosed root = Enclosed.of(Rational.TWO.times(Rational.of(10).pow(digits))).map(Ball::sqrt);
            Rational near = ConditionalLongRun.near(new RealValue(Optional.empty(), root));
            Rational off = root.enclose(1_000).middle().minus(near).abs();
            assertTrue(off.compareTo(ConditionalLongRun.NEAR_WITHIN) < 0, digits + ": " + off.signum());
        }
    }
}
