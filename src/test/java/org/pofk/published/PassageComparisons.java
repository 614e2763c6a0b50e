package org.pofk.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.BiConsumer;
import org.pofk.answer.Passage;
import org.pofk.chain.Structure;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;

/** How published first passages, recurrences and absorptions are compared with what the tool answers. */
final class PassageComparisons {
    static final Map<String, BiConsumer<Derived, JsonNode>> BY_KEY = new LinkedHashMap<>();

    static {
        BY_KEY.put("absorption", PassageComparisons::absorption);
        BY_KEY.put("mean_recurrence", PassageComparisons::recurrences);
        BY_KEY.put("mean_first_passage_row_convention", PassageComparisons::table);
        BY_KEY.put("mean_first_passage", PassageComparisons::byPair);
        BY_KEY.put("mean_first_passage_to_0", (derived, byStart) -> means(derived, "0", byStart));
        BY_KEY.put("variance_first_passage_to_0", (derived, byStart) -> variances(derived, "0", byStart));
        for (String target : List.of("0", "3", "4")) {
            BY_KEY.put("first_passage_to_" + target, (derived, node) -> moments(derived, target, node));
        }
        BY_KEY.put("first_passage_geometric", PassageComparisons::geometric);
        BY_KEY.put("pmf", PassageComparisons::law);
        BY_KEY.put("MTTF", (derived, value) -> meanFromStart(derived, value));
        BY_KEY.put("MTTF_1oo3", (derived, value) -> meanFromStart(derived, value));
        BY_KEY.put("MTTF_2oo3", (derived, value) -> meanInto(derived, "3", Set.of("1", "0"), value));
        BY_KEY.put("MTTF_3oo3", (derived, value) -> meanInto(derived, "3", Set.of("2", "1", "0"), value));
        BY_KEY.put("variance", PassageComparisons::varianceFromStart);
        BY_KEY.put("variance_1oo3", PassageComparisons::varianceFromStart);
        BY_KEY.put("mean_time_to_failure", (derived, value) -> meanInto(derived, "up", Set.of("down"), value));
        BY_KEY.put("mean_time_to_repair", (derived, value) -> meanInto(derived, "down", Set.of("up"), value));
        BY_KEY.put("mean_burst_length", (derived, value) -> meanInto(derived, "bad", Set.of("good"), value));
        BY_KEY.put("variance_burst_length", (derived, value) ->
                assertEquals(Optional.of(derived.value(value.asText())),
                        passage(derived, "bad", Set.of("good")).moments().variance(), derived::toString));
        BY_KEY.put("mean_gap_length", (derived, value) -> meanInto(derived, "good", Set.of("bad"), value));
        BY_KEY.put("mean_wet_spell", (derived, value) -> meanInto(derived, "wet", Set.of("dry"), value));
        BY_KEY.put("mean_dry_spell", (derived, value) -> meanInto(derived, "dry", Set.of("wet"), value));
        BY_KEY.put("from_start", PassageComparisons::fromStartOf);
        BY_KEY.put("from_9", PassageComparisons::fromStartOf);
        BY_KEY.put("table", PublishedTables::walks);
        BY_KEY.put("table_half_chance_one_trial_per_second", PublishedTables::runs);
        BY_KEY.put("pmf_formula", PassageComparisons::lawAsFormula);
        BY_KEY.put("numeric_MTTF", PassageComparisons::meanOfOneSample);
        BY_KEY.put("no_repair_MTTF", (derived, value) -> meanFromStart(derived.with("mu", Rational.ZERO), value));
        BY_KEY.put("mean_weather_cycle", (derived, value) -> assertValue(derived, value, Optional.of(
                mean(derived, "dry", "wet").plus(mean(derived, "wet", "dry")))));
        BY_KEY.put("three_packets", (derived, node) -> momentsFrom(derived, "3", "0", node));
        BY_KEY.put("one_packet", (derived, node) -> momentsFrom(derived, "1", "0", node));
    }

    private PassageComparisons() {
    }

    private static Passage passage(Derived derived, String from, Set<String> into) {
        return passage(derived, from, into, Set.of(), List.of());
    }

    private static Passage passage(Derived derived, String from, Set<String> into, Set<String> avoiding,
            List<Integer> steps) {
        List<String> states = derived.chain().states();
        return Passage.of(derived.startedIn(states.indexOf(from)).chain(), places(states, into),
                places(states, avoiding), List.of(), steps);
    }

    private static Set<Integer> places(List<String> states, Set<String> names) {
        Set<Integer> places = new TreeSet<>();
        names.forEach(name -> places.add(states.indexOf(name)));
        return places;
    }

    private static void assertValue(Derived derived, JsonNode expected, Optional<Rational> found) {
        assertEquals(Optional.of(derived.value(expected.asText())), found, derived::toString);
    }

    /** Mean, variance, the absorption probabilities B and the visits N of the fundamental matrix, row by row. */
    private static void absorption(Derived derived, JsonNode node) {
        List<String> from = texts(node.get("transient_order"));
        List<String> into = texts(node.get("absorbing_order"));
        for (int i = 0; i < from.size(); i++) {
            Passage all = passage(derived, from.get(i), Set.copyOf(into));
            assertValue(derived, node.get("mean_steps").get(i), all.moments().mean());
            assertValue(derived, node.get("variance_steps").get(i), all.moments().variance());
            for (int j = 0; node.has("B_row_convention") && j < into.size(); j++) {
                Set<String> others = new TreeSet<>(into);
                others.remove(into.get(j));
                Passage one = passage(derived, from.get(i), Set.of(into.get(j)), others, List.of());
                assertValue(derived, node.get("B_row_convention").get(i).get(j),
                        Optional.of(one.moments().probability()));
                assertEquals(one.moments().probability(), one.fromEach().probabilities()
                        .get(derived.chain().states().indexOf(from.get(i))), derived::toString);
            }
            for (int j = 0; node.has("N_row_convention") && j < from.size(); j++) {
                assertValue(derived, node.get("N_row_convention").get(i).get(j),
                        passage(derived, from.get(i), Set.of(from.get(j))).visits());
            }
        }
    }

    private static List<String> texts(JsonNode list) {
        List<String> texts = new ArrayList<>();
        list.forEach(each -> texts.add(each.asText()));
        return texts;
    }

    private static void recurrences(Derived derived, JsonNode list) {
        List<String> states = derived.chain().states();
        for (int i = 0; i < list.size(); i++) {
            Passage passage = passage(derived, states.get(i), Set.of(states.get(i)));
            assertValue(derived, list.get(i), passage.returns().orElseThrow().mean());
        }
    }

    private static void table(Derived derived, JsonNode rows) {
        List<String> states = derived.chain().states();
        for (int i = 0; i < states.size(); i++) {
            for (int j = 0; j < states.size(); j++) {
                assertValue(derived, rows.get(i).get(j),
                        passage(derived, states.get(i), Set.of(states.get(j))).moments().mean());
            }
        }
    }

    /** {@code {"a->b": mean}} or {@code {"to_b": {"a": mean}}}. */
    private static void byPair(Derived derived, JsonNode node) {
        node.properties().forEach(each -> {
            if (each.getKey().startsWith("to_")) {
                means(derived, each.getKey().substring("to_".length()), each.getValue());
            } else {
                String[] pair = each.getKey().split("->");
                meanInto(derived, pair[0], Set.of(pair[1]), each.getValue());
            }
        });
    }

    private static void means(Derived derived, String target, JsonNode byStart) {
        byStart.properties().forEach(each -> meanInto(derived, each.getKey(), Set.of(target), each.getValue()));
    }

    private static void variances(Derived derived, String target, JsonNode byStart) {
        byStart.properties().forEach(each -> assertValue(derived, each.getValue(),
                passage(derived, each.getKey(), Set.of(target)).moments().variance()));
    }

    private static void moments(Derived derived, String target, JsonNode node) {
        means(derived, target, node.get("mean"));
        if (node.has("variance")) {
            variances(derived, target, node.get("variance"));
        }
    }

    private static void momentsFrom(Derived derived, String from, String into, JsonNode node) {
        Passage passage = passage(derived, from, Set.of(into));
        assertValue(derived, node.get("mean"), passage.moments().mean());
        assertValue(derived, node.get("variance"), passage.moments().variance());
    }

    private static void meanInto(Derived derived, String from, Set<String> into, JsonNode value) {
        Passage passage = passage(derived, from, into);
        assertValue(derived, value, passage.moments().mean());
        assertEquals(passage.moments().mean(),
                passage.fromEach().means().get(derived.chain().states().indexOf(from)), derived::toString);
    }

    private static void geometric(Derived derived, JsonNode node) {
        List<String> states = derived.chain().states();
        Passage passage = passage(derived, states.get(0), Set.of(states.get(1)));
        assertValue(derived, node.get("mean_0_to_1"), passage.moments().mean());
        assertValue(derived, node.get("variance_0_to_1"), passage.moments().variance());
        assertValue(derived, node.get("mean_recurrence_0"),
                passage(derived, states.get(0), Set.of(states.get(0))).returns().orElseThrow().mean());
    }

    /** P(T = k) of the passage from the model's start into its absorbing states. */
    private static void law(Derived derived, JsonNode byStep) {
        Passage passage = fromStart(derived);
        byStep.properties().forEach(step -> assertValue(derived, step.getValue(), Optional.of(passage.law()
                .closedForm().orElseThrow().expansion().valueAt(Long.parseLong(step.getKey())))));
    }

    private static Passage fromStart(Derived derived) {
        return Passage.of(derived.chain(), Set.copyOf(
                Structure.of(derived.chain()).absorbing()), Set.of(), List.of(), List.of());
    }

    private static void meanFromStart(Derived derived, JsonNode value) {
        assertValue(derived, value, fromStart(derived).moments().mean());
    }

    private static void varianceFromStart(Derived derived, JsonNode value) {
        assertValue(derived, value, fromStart(derived).moments().variance());
    }

    private static Rational mean(Derived derived, String from, String into) {
        return passage(derived, from, Set.of(into)).moments().mean().orElseThrow();
    }

    /** Into all absorbing states, or the one named by the key before all others; as value and as formula. */
    private static void fromStartOf(Derived derived, JsonNode node) {
        node.properties().forEach(each -> {
            Passage all = fromStart(derived);
            assertValue(derived, each.getValue(), switch (each.getKey()) {
                case "mean", "mean_formula" -> all.moments().mean();
                case "variance", "variance_formula" -> all.moments().variance();
                case "success_run_first" -> Optional.of(first(derived, "S3", "F2"));
                case "ruin" -> Optional.of(first(derived, "0", "10"));
                default -> throw new AssertionError(derived + ": " + each.getKey());
            });
        });
    }

    private static Rational first(Derived derived, String into, String before) {
        List<String> states = derived.chain().states();
        return Passage.of(derived.chain(), places(states, Set.of(into)), places(states, Set.of(before)), List.of(),
                List.of()).moments().probability();
    }

    /** {@code P(T=k)=…} for k ≥ 3, its one binomial coefficient written out. */
    private static void lawAsFormula(Derived derived, JsonNode text) {
        String[] sides = text.asText().split("=", 3);
        assertEquals(List.of("P(T", "k)"), List.of(sides[0], sides[1]), derived::toString);
        Passage passage = fromStart(derived);
        String law = sides[2].replace(" ", "*").replace("binomial(k-1,2)", "((k-1)*(k-2)/2)");
        for (int k = 3; k <= 20; k++) {
            ComplexBall expected = CertifiedValue.of(derived.parse(law), derived.valuesAt(k), 200);
            Rational found = passage.law().closedForm().orElseThrow().expansion().valueAt(k);
            assertTrue(expected.real().contains(found), () -> derived + ": " + text + " is " + found);
        }
    }

    /** Given for one choice of parameters, which the key names. */
    private static void meanOfOneSample(Derived derived, JsonNode bySample) {
        bySample.properties().forEach(each -> {
            Derived sample = derived;
            for (String setting : each.getKey().split(",")) {
                sample = sample.with(setting.split("=")[0], Rational.parse(setting.split("=")[1]));
            }
            meanFromStart(sample, each.getValue());
        });
    }
}
