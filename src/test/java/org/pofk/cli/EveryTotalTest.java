package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.answer.Gauss;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

/**
 * Totals, entries, costs, what is given and starts, asked of every pattern: added up and divided step by step. Of the
 * pattern of a hundred states, whose powers would take minutes, only the total is asked.
 */
class EveryTotalTest {

    @Test
    void stepsAndValues() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.all()) {
            for (Output output : pattern.outputs()) {
                JsonNode found = pattern.ask("total", "--of", output.name(), "--to", AskedPattern.AT)
                        .get("totals").get(0);
                List<Rational> sums = AskedPattern.sums(pattern.values(output));
                String what = "total of " + output.name() + " in " + pattern.name();
                AskedPattern.assertIs(pattern.values(output), found.get("step"), what);
                AskedPattern.assertIs(sums, found.get("total"), what);
                AskedPattern.assertListed(IntStream.range(0, sums.size()).mapToObj(k ->
                        sums.get(k).dividedBy(Rational.of(k + 1))).toList(), found.get("averages"), what);
                if (pattern.chain().kind() == Chain.Kind.CHAIN && !pattern.isLarge()) {
                    assertEquals(output.of(pattern.plain().average()),
                            AskedPattern.number(found.at("/growth/perStep")), what);
                }
                asked++;
            }
        }
        assertEquals(31, asked);
    }

    @Test
    void entries() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.small()) {
            Set<Integer> into = AskedPattern.members(pattern.group());
            List<Rational> entering = new ArrayList<>(List.of(Rational.ZERO));
            for (int k = 1; k <= pattern.steps(); k++) {
                List<Rational> outside = new ArrayList<>(pattern.states().get(k - 1));
                into.forEach(state -> outside.set(state, Rational.ZERO));
                entering.add(Gauss.dot(pattern.plain().indicator(into), pattern.plain().stepped(outside)));
            }
            JsonNode found = pattern.ask("total", "--of", pattern.group().name(), "--entries", "--to", AskedPattern.AT)
                    .get("totals").get(0);
            AskedPattern.assertIs(AskedPattern.sums(entering), found.get("total"), pattern.name());
            asked++;
        }
        assertEquals(13, asked);
        assertEquals(2, AskedPattern.assertNeedsAChain("total", "--entries"));
    }

    /** Every pattern with amounts for its first state, its last and a move, and a discount. */
    @Test
    void costs(@TempDir Path folder) throws Exception {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.small()) {
            int last = pattern.chain().size() - 1;
            List<Integer> move = move(pattern.plain());
            List<String> states = pattern.chain().states();
            Path file = folder.resolve(pattern.name() + ".yaml");
            Files.writeString(file, Files.readString(pattern.file()) + "\ncosts:\n  unit: EUR\n  each step in: {'"
                    + states.get(0) + "': -2, '" + states.get(last) + "': 7/2}\n  each move: {'"
                    + states.get(move.get(0)) + "': {'" + states.get(move.get(1)) + "': 3}}\n  at start: 5\n"
                    + "  discount: 25%\n");
            List<Rational> costs = new ArrayList<>();
            for (int k = 0; k <= pattern.steps(); k++) {
                List<Rational> state = pattern.states().get(k);
                Rational moved = k == 0 ? Rational.of(5) : Rational.of(3).times(pattern.plain().rows().get(move.get(1))
                        .get(move.get(0))).times(pattern.states().get(k - 1).get(move.get(0)));
                costs.add(moved.plus(Rational.of(-2).times(state.get(0)))
                        .plus(Rational.of(7, 2).times(state.get(last))));
            }
            JsonNode totals = AskedPattern.ask(file, "total", "--to", AskedPattern.AT).get("totals");
            List<Rational> discounted = IntStream.range(0, costs.size()).mapToObj(k ->
                    costs.get(k).times(Rational.of(4, 5).pow(k))).toList();
            for (int i = 0; i < 2; i++) {
                List<Rational> each = i == 0 ? costs : discounted;
                AskedPattern.assertIs(each, totals.get(i).get("step"), pattern.name());
                AskedPattern.assertIs(AskedPattern.sums(each), totals.get(i).get("total"), pattern.name());
                asked++;
            }
        }
        assertEquals(26, asked);
    }

    private static List<Integer> move(PlainChain plain) {
        for (int from = 0; from < plain.size(); from++) {
            for (int to = 0; to < plain.size(); to++) {
                if (from != to && !plain.rows().get(to).get(from).isZero()) {
                    return List.of(from, to);
                }
            }
        }
        throw new AssertionError("nothing moves");
    }

    /** Given a group at k, given that the last state was never entered up to k, and given the group at a step. */
    @Test
    void given() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.small()) {
            Output output = pattern.outputs().get(0);
            Output group = pattern.group();
            assertQuotients(pattern, output, group, pattern.states(), "--given", group.name());
            int last = pattern.chain().size() - 1;
            List<Rational> all = pattern.plain().start().stream().map(each -> Rational.ONE).toList();
            assertQuotients(pattern, output, new Output("any", all, Rational.ZERO, "any"),
                    pattern.plain().without(Set.of(last), pattern.steps()), "--given-never", pattern.lastState());
            asked += 2 + givenAtAStep(pattern, output, group);
        }
        assertEquals(38, asked);
        assertEquals(2, AskedPattern.assertNeedsAChain("derive", "--given", "open"));
    }

    private static void assertQuotients(AskedPattern pattern, Output output, Output group,
            List<List<Rational>> states, String option, String name) {
        JsonNode found = pattern.ask("derive", "--of", output.name(), option, name, "--at", AskedPattern.AT);
        String what = output.name() + " in " + pattern.name() + option + name;
        AskedPattern.assertIs(states.stream().map(group::of).toList(), found.get("event"), what);
        var expected = EveryConditionTest.quotients(states, output, group);
        JsonNode told = found.get("outputs").get(0);
        for (JsonNode value : told.get("values")) {
            assertEquals(expected.get(value.get("k").asInt()).map(Rational::toString).orElse("null"),
                    value.get("exact").asText(), what + value);
        }
    }

    private static int givenAtAStep(AskedPattern pattern, Output output, Output group) {
        List<Rational> there = IntStream.range(0, pattern.chain().size()).mapToObj(i -> group.coefficients().get(i)
                .times(pattern.states().get(3).get(i))).toList();
        Rational known = there.stream().reduce(Rational.ZERO, Rational::plus);
        if (known.isZero()) {
            return 0;
        }
        List<Rational> expected = pattern.plain().from(there.stream().map(x -> x.dividedBy(known)).toList())
                .states(pattern.steps()).stream().map(output::of).toList();
        JsonNode found = pattern.ask("derive", "--of", output.name(), "--given", group.name(), "--given-at", "3",
                "--at", AskedPattern.AT);
        assertEquals(known, AskedPattern.number(found.at("/given/probability")), pattern.name());
        AskedPattern.assertIs(expected, found.get("outputs").get(0), pattern.name() + " given at 3");
        return 1;
    }

    /** In the long run, which stays; and from each state, which are the powers of A. */
    @Test
    void starts() {
        int stayed = 0;
        int powers = 0;
        for (AskedPattern pattern : AskedPattern.small()) {
            for (Set<Integer> closed : pattern.plain().closed().values()) {
                List<Integer> members = List.copyOf(closed);
                List<Rational> stationary = pattern.plain().stationary(members);
                JsonNode found = pattern.ask("derive", "--start", "long run of " + pattern.chain().states()
                        .get(members.get(0)), "--of", "all", "--at", AskedPattern.AT).get("outputs");
                for (int i = 0; i < found.size(); i++) {
                    Rational share = members.contains(i) ? stationary.get(members.indexOf(i)) : Rational.ZERO;
                    AskedPattern.assertIs(Collections.nCopies(20, share), found.get(i), pattern.name());
                    stayed++;
                }
            }
            JsonNode starts = pattern.ask("derive", "--start", "each", "--of", pattern.lastState(), "--at",
                    AskedPattern.AT).get("starts");
            for (int from = 0; from < starts.size(); from++) {
                List<Rational> expected = pattern.plain().from(from).states(30).stream()
                        .map(state -> state.get(pattern.chain().size() - 1)).toList();
                AskedPattern.assertIs(expected, starts.get(from).get("outputs").get(0), pattern.name());
                powers++;
            }
        }
        assertEquals(List.of(75, 69), List.of(stayed, powers));
    }
}
