package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Gauss;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

/** When, asked of every output of every pattern: against plain stepping, and far out against bounds of its own. */
class EveryConditionTest {
    private int farOut;

    /** Bounds that the output crosses, or touches exactly; of a hundred states one that it crosses. */
    @Test
    void atLeastAndAtMost() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.all()) {
            for (Output output : pattern.outputs()) {
                List<Rational> p = pattern.values(output);
                Rational between = pattern.isLarge() ? Rational.of(1, 100)
                        : p.get(0).plus(p.get(9)).dividedBy(Rational.TWO);
                JsonNode least = pattern.ask("when", "--of", output.name(), "--at-least", between.toString());
                assertMet(pattern, output, least, k -> p.get(k).compareTo(between) >= 0, between, 1);
                asked++;
                if (pattern.isLarge()) {
                    continue;
                }
                Rational touched = p.get(5);
                JsonNode most = pattern.ask("when", "--of", output.name(), "--at-most", touched.toString());
                assertMet(pattern, output, most, k -> p.get(k).compareTo(touched) <= 0, touched, -1);
                asked++;
            }
        }
        assertEquals(61, asked);
    }

    /** Within a distance, and within a part of the limit; of a hundred states within a distance. */
    @Test
    void settlesWithinADistanceAndAPart() {
        int asked = 0;
        int zero = 0;
        for (AskedPattern pattern : AskedPattern.all()) {
            for (Output output : pattern.outputs()) {
                for (String within : pattern.isLarge() ? List.of("1/1000") : List.of("1/1000", "1%")) {
                    JsonNode found = pattern.ask("when", "--of", output.name(), "--settles-within", within);
                    List<Rational> limits = limits(pattern, output, found.get("longRun"));
                    Rational largest = limits.stream().map(Rational::abs).reduce(Rational.ZERO, Rational::max);
                    Rational bound = within.equals("1%") ? largest.dividedBy(Rational.of(100)) : Rational.of(1, 1000);
                    zero += bound.isZero() ? 1 : 0;
                    assertEquals(bound, AskedPattern.number(found.at("/condition/bound")).abs());
                    assertSettled(pattern, output, found, limits, bound);
                    asked++;
                }
            }
        }
        assertEquals(61, asked);
        assertTrue(zero > 2 && farOut > 2, zero + " of zero, " + farOut + " far out");
    }

    private static List<Rational> limits(AskedPattern pattern, Output output, JsonNode longRun) {
        if (longRun.get("kind").asText().equals("none")) {
            assertEquals("maintenance-backlog", pattern.name());
            return List.of();
        }
        List<Rational> told = new ArrayList<>();
        if (longRun.get("kind").asText().equals("limit")) {
            told.add(AskedPattern.number(longRun.get("value")));
        } else {
            longRun.get("values").forEach(value -> told.add(AskedPattern.number(value)));
        }
        if (pattern.chain().kind() == Chain.Kind.CHAIN && !pattern.isLarge()) {
            assertEquals(pattern.plain().limits(told.size()).stream().map(output::of).toList(), told, pattern.name());
        }
        return told;
    }

    private void assertSettled(AskedPattern pattern, Output output, JsonNode found, List<Rational> limits,
            Rational bound) {
        if (limits.isEmpty()) {
            assertEquals("no long run", found.get("reason").asText());
            return;
        }
        List<Rational> p = pattern.values(output);
        IntPredicate met = k -> p.get(k).minus(limits.get(k % limits.size())).abs().compareTo(bound) <= 0;
        assertWithin(pattern.steps(), found, met, pattern.name() + " " + output.name());
        Optional<Long> from = step(found, "forEverFrom").filter(k -> k > pattern.steps());
        if (from.isPresent()) {
            List<Rational> before = distance(pattern, output, from.get() - 1, limits);
            List<Rational> there = distance(pattern, output, from.get(), limits);
            assertTrue(before.get(0).compareTo(bound) > 0 && there.get(1).compareTo(bound) <= 0,
                    pattern.name() + " from " + from.get());
            farOut++;
        }
    }

    /** How far p(k) is from its limit at least and at most, where both ends of its bounds lie on one side. */
    private static List<Rational> distance(AskedPattern pattern, Output output, long k, List<Rational> limits) {
        Rational limit = limits.get((int) (k % limits.size())).minus(output.constant());
        List<Rational> ends = PlainBounds.of(pattern.plain(), k, output.coefficients()).stream()
                .map(end -> end.minus(limit).abs()).sorted().toList();
        return ends;
    }

    /** @param side 1 where at least the bound is wanted, −1 where at most */
    private void assertMet(AskedPattern pattern, Output output, JsonNode found, IntPredicate met, Rational bound,
            int side) {
        String what = pattern.name() + " " + output.name() + " " + bound;
        if (found.get("reason").asText().equals("no long run")) {
            assertEquals("maintenance-backlog", pattern.name());
            assertEquals(leastMet(pattern.steps(), met), step(found, "first").map(Long::intValue), what);
            return;
        }
        assertWithin(pattern.steps(), found, met, what);
        for (String field : List.of("first", "forEverFrom")) {
            Optional<Long> step = step(found, field).filter(k -> k > pattern.steps());
            if (step.isPresent()) {
                Rational less = bound.minus(output.constant());
                List<Rational> before = PlainBounds.of(pattern.plain(), step.get() - 1, output.coefficients());
                List<Rational> there = PlainBounds.of(pattern.plain(), step.get(), output.coefficients());
                assertTrue(before.stream().allMatch(end -> end.compareTo(less) * side < 0)
                        && there.stream().allMatch(end -> end.compareTo(less) * side >= 0), what + " at " + step.get());
                farOut++;
            }
        }
    }

    private static Optional<Integer> leastMet(int last, IntPredicate met) {
        return IntStream.rangeClosed(0, last).filter(met).boxed().findFirst();
    }

    static Optional<Long> step(JsonNode found, String field) {
        return Optional.of(found.get(field)).filter(JsonNode::isNumber).map(JsonNode::asLong);
    }

    /** First, for ever from, and each residue, as far as the steps seen tell. */
    static void assertWithin(int last, JsonNode found, IntPredicate met, String what) {
        assertEquals("exact", found.get("word").asText(), what);
        Optional<Integer> least = leastMet(last, met);
        assertEquals(least, step(found, "first").filter(k -> k <= last).map(Long::intValue), what);
        step(found, "forEverFrom").filter(k -> k <= last).map(Long::intValue).ifPresent(from -> {
            assertTrue(IntStream.rangeClosed(from, last).allMatch(met), what + " from " + from);
            assertTrue(from == 0 || !met.test(from - 1), what + " before " + from);
        });
        assertEquals(found.get("reason").asText().equals("never"), step(found, "first").isEmpty(), what);
        for (JsonNode each : found.get("classes")) {
            int modulus = each.get("modulus").asInt();
            IntPredicate own = k -> k % modulus == each.get("residue").asInt();
            assertEquals(IntStream.rangeClosed(0, last).filter(own.and(met)).boxed().findFirst(),
                    step(each, "first").filter(k -> k <= last).map(Long::intValue), what + each);
            step(each, "forEverFrom").filter(k -> k <= last).map(Long::intValue).ifPresent(from -> {
                assertTrue(IntStream.rangeClosed(from, last).filter(own).allMatch(met), what + each);
                assertTrue(from < modulus || !met.test(from - modulus), what + each);
            });
        }
    }

    /**
     * Given that the chain is in a group of states at k: a quotient, by Bayes. The pattern of a hundred states has no
     * such group.
     */
    @Test
    void atLeastGivenWhatIsKnown() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.small()) {
            Output group = pattern.group();
            for (Output output : pattern.outputs()) {
                List<Optional<Rational>> quotients = quotients(pattern.states(), output, group);
                Rational bound = quotients.stream().flatMap(Optional::stream).skip(3).findFirst().orElse(Rational.HALF);
                JsonNode found = pattern.ask("when", "--of", output.name(), "--given", group.name(), "--at-least",
                        bound.toString());
                String what = pattern.name() + " " + output.name() + " given " + group.name();
                assertGiven(pattern, found, quotients, bound, what);
                asked++;
            }
        }
        assertEquals(27, asked);
    }

    private static void assertGiven(AskedPattern pattern, JsonNode found, List<Optional<Rational>> quotients,
            Rational bound, String what) {
        IntPredicate met = k -> quotients.get(k).filter(value -> value.compareTo(bound) >= 0).isPresent();
        Optional<Integer> least = leastMet(pattern.steps(), met);
        assertEquals(least, step(found, "first").filter(k -> k <= pattern.steps()).map(Long::intValue), what);
        step(found, "forEverFrom").filter(k -> k <= pattern.steps()).map(Long::intValue).ifPresent(from -> assertTrue(
                IntStream.rangeClosed(from, pattern.steps()).allMatch(k -> met.test(k) || quotients.get(k).isEmpty()),
                what));
    }

    /** What an output comes to at each step given that the chain is in a set then; empty where it can't be. */
    static List<Optional<Rational>> quotients(List<List<Rational>> states, Output output, Output group) {
        List<Rational> weights = IntStream.range(0, group.coefficients().size()).mapToObj(i -> group.coefficients()
                .get(i).times(output.coefficients().get(i).plus(output.constant()))).toList();
        return states.stream().map(state -> Optional.of(Gauss.dot(group.coefficients(), state))
                .filter(below -> !below.isZero()).map(below -> Gauss.dot(weights, state).dividedBy(below))).toList();
    }
}
