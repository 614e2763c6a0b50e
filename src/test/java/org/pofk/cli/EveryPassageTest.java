package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.pofk.answer.Gauss;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;

/** Passages, asked of every pattern: laws by stepping, moments by the fundamental matrix, returns by 1/π. */
class EveryPassageTest {
    private static final String[] SHARES = {"--percentile", "1%", "--percentile", "50%", "--percentile", "99%"};

    @Test
    void intoTheLastState() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.all(Chain.Kind.CHAIN)) {
            int last = pattern.chain().size() - 1;
            JsonNode found = pattern.ask("passage", with("--into", pattern.lastState()));
            assertPassage(pattern, pattern.plain(), Set.of(last), Set.of(), found);
            asked++;
        }
        assertEquals(14, asked);
        assertEquals(2, AskedPattern.assertNeedsAChain("passage", "--into", "open"));
    }

    /** Of few states, from the first, one in the middle and the last but one, avoiding the second. */
    @Test
    void fromAnotherStateAvoidingOne() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.all(Chain.Kind.CHAIN)) {
            int size = pattern.chain().size();
            for (int from : size <= 2 || size > 8 ? Set.<Integer>of() : new TreeSet<>(List.of(0, size / 2, size - 2))) {
                JsonNode found = pattern.ask("passage", with("--into", pattern.lastState(), "--avoiding",
                        pattern.chain().states().get(1), "--from", pattern.chain().states().get(from)));
                assertPassage(pattern, pattern.plain().from(from), Set.of(size - 1), Set.of(1), found);
                asked++;
            }
        }
        assertEquals(28, asked);
    }

    private static String[] with(String... options) {
        List<String> all = new ArrayList<>(List.of("--at", AskedPattern.AT));
        all.addAll(List.of(options));
        all.addAll(List.of(SHARES));
        return all.toArray(String[]::new);
    }

    private static void assertPassage(AskedPattern pattern, PlainChain plain, Set<Integer> into, Set<Integer> avoiding,
            JsonNode found) {
        String what = pattern.name() + " into " + into + " avoiding " + avoiding;
        List<Rational> law = plain.law(into, avoiding, pattern.steps());
        List<Rational> distribution = AskedPattern.sums(law);
        AskedPattern.assertIs(law, found.get("law"), what);
        AskedPattern.assertIs(distribution, found.get("distribution"), what);
        AskedPattern.assertIs(distribution.stream().map(Rational.ONE::minus).toList(), found.get("survival"), what);
        assertFirstSteps(plain, into, avoiding, found.get("fromEach"), what);
        for (JsonNode share : found.get("percentiles")) {
            Rational p = AskedPattern.number(share.get("p"));
            int k = share.get("k").isNull() ? Integer.MAX_VALUE : share.get("k").asInt();
            assertTrue(k > pattern.steps() ? distribution.get(pattern.steps()).compareTo(p) < 0
                    : distribution.get(k).compareTo(p) >= 0 && (k == 0 || distribution.get(k - 1).compareTo(p) < 0),
                    what + share);
        }
        for (JsonNode hazard : found.get("hazards")) {
            int k = hazard.get("k").asInt();
            Rational before = k == 0 ? Rational.ONE : Rational.ONE.minus(distribution.get(k - 1));
            assertEquals(before.isZero(), hazard.get("exact").isNull(), what + hazard);
            assertTrue(before.isZero() || law.get(k).dividedBy(before).equals(AskedPattern.number(hazard.get("exact"))),
                    what + hazard);
        }
        if (!pattern.isLarge()) {
            assertMoments(plain, plain.moments(into, avoiding), found, what);
        }
    }

    private static void assertMoments(PlainChain plain, PlainChain.Moments moments, JsonNode found, String what) {
        Rational ever = Gauss.dot(plain.start(), moments.ever());
        assertEquals(ever, AskedPattern.number(found.get("probability")), what);
        assertEquals(ever.isOne(), found.get("mean").isTextual(), what);
        assertEquals(ever.isOne() ? "null" : ever.isZero() ? "never" : "infinite", found.get("reason").asText(), what);
        if (ever.isZero()) {
            assertTrue(found.at("/givenThatItHappens/mean").isMissingNode()
                    || found.at("/givenThatItHappens/mean").isNull(), what);
            return;
        }
        Rational mean = Gauss.dot(plain.start(), moments.first()).dividedBy(ever);
        Rational square = Gauss.dot(plain.start(), moments.second()).dividedBy(ever);
        assertEquals(mean, AskedPattern.number(found.at("/givenThatItHappens/mean")), what);
        assertEquals(square.minus(mean.times(mean)),
                AskedPattern.number(found.at("/givenThatItHappens/variance")), what);
        if (ever.isOne()) {
            assertEquals(mean, AskedPattern.number(found.get("mean")), what);
            assertEquals(square.minus(mean.times(mean)), AskedPattern.number(found.get("variance")), what);
        }
    }

    /** h = P h and u = P u + h outside the set, for every state of the table. */
    private static void assertFirstSteps(PlainChain plain, Set<Integer> into, Set<Integer> avoiding, JsonNode table,
            String what) {
        List<Rational> ever = new ArrayList<>();
        List<Rational> steps = new ArrayList<>();
        for (JsonNode row : table) {
            Rational probability = AskedPattern.number(row.get("probability"));
            ever.add(probability);
            steps.add(row.get("mean").isNull() ? Rational.ZERO
                    : AskedPattern.number(row.get("mean")).times(probability));
        }
        assertEquals(plain.size(), ever.size(), what);
        for (int i = 0; i < plain.size(); i++) {
            if (into.contains(i) || avoiding.contains(i)) {
                assertEquals(into.contains(i) ? Rational.ONE : Rational.ZERO, ever.get(i), what);
                assertEquals(Rational.ZERO, steps.get(i), what);
            } else {
                Rational next = Rational.ZERO;
                Rational further = ever.get(i);
                for (int j = 0; j < plain.size(); j++) {
                    Rational move = plain.rows().get(j).get(i);
                    if (!move.isZero()) {
                        next = next.plus(move.times(ever.get(j)));
                        further = further.plus(move.times(steps.get(j)));
                    }
                }
                assertEquals(next, ever.get(i), what);
                assertEquals(further, steps.get(i), what);
            }
        }
    }

    /** Every state of every pattern of few states: the mean return is 1/π where the chain comes back for certain. */
    @Test
    void returns() {
        int certain = 0;
        int uncertain = 0;
        for (AskedPattern pattern : AskedPattern.all(Chain.Kind.CHAIN)) {
            for (int state = 0; state < pattern.chain().size() && pattern.chain().size() <= 8; state++) {
                String word = pattern.chain().states().get(state);
                int own = state;
                JsonNode found = pattern.ask("passage", "--into", word, "--start", word).get("return");
                PlainChain.Moments moments = pattern.plain().moments(Set.of(state), Set.of());
                List<Rational> next = pattern.plain().stepped(pattern.plain().indicator(Set.of(state)));
                Rational back = Gauss.dot(next, moments.ever());
                assertEquals(back, AskedPattern.number(found.get("probability")), pattern.name() + word);
                if (back.isOne()) {
                    List<Integer> members = pattern.plain().closed().values().stream()
                            .filter(each -> each.contains(own)).findFirst().map(List::copyOf).orElseThrow();
                    assertEquals(pattern.plain().stationary(members).get(members.indexOf(state)).inverse(),
                            AskedPattern.number(found.get("mean")), pattern.name() + word);
                    certain++;
                } else {
                    uncertain++;
                }
            }
        }
        assertEquals(List.of(40, 17), List.of(certain, uncertain));
    }

    /** The law given that of two ends it is one, as the law into that one over its probability. */
    @Test
    void givenWhereItEndsAndGivenAtAStep() {
        int asked = 0;
        for (AskedPattern pattern : AskedPattern.small()) {
            int last = pattern.chain().size() - 1;
            if (last < 2) {
                continue;
            }
            List<Rational> law = pattern.plain().law(Set.of(last), Set.of(1), pattern.steps());
            Rational ever = Gauss.dot(pattern.plain().start(), pattern.plain().moments(Set.of(last), Set.of(1)).ever());
            JsonNode ends = pattern.ask("passage", "--into", pattern.lastState(), "--into",
                    pattern.chain().states().get(1), "--given", pattern.lastState(), "--at", AskedPattern.AT);
            assertEquals(ever, AskedPattern.number(ends.get("probability")), pattern.name());
            if (!ever.isZero() && !ever.isOne()) {
                AskedPattern.assertIs(law.stream().map(f -> f.dividedBy(ever)).toList(),
                        ends.at("/givenThatItHappens/law"), pattern.name());
            }
            List<Rational> left = pattern.plain().without(Set.of(last), 4).get(4);
            Rational known = left.stream().reduce(Rational.ZERO, Rational::plus);
            if (!known.isZero()) {
                JsonNode later = pattern.ask("passage", with("--into", pattern.lastState(), "--given-never",
                        pattern.lastState(), "--given-at", "4"));
                assertPassage(pattern, pattern.plain().from(left.stream().map(x -> x.dividedBy(known)).toList()),
                        Set.of(last), Set.of(), later);
                asked++;
            }
            asked++;
        }
        assertEquals(23, asked);
    }
}
