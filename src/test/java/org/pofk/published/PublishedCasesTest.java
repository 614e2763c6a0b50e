package org.pofk.published;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.exact.Rational;

/**
 * What the literature prints, against what the tool derives from the model file beside it. Every key of every case is
 * compared or named with the reason why not; an unknown key fails; how often each key was compared is asserted.
 */
class PublishedCasesTest {
    private static final long SEED = 20_260_115L;

    /** Keys that ask what the tool doesn't answer yet, by the question they ask. */
    private static final Map<String, String> NOT_ASKED_YET = notAskedYet();

    /** Keys of single cases that hold irrational data; what runs is their rational instance. */
    private static final Map<String, List<String>> IRRATIONAL =
            Map.of("zt-damped-cosine-sine", List.of("closed_form", "transfer", "poles"));

    /** How many cases each key is compared in. */
    private static final Map<String, Integer> COMPARED = Map.ofEntries(
            Map.entry("PFDavg_exact_T_steps", 1), Map.entry("PFDavg_approximation", 1),
            Map.entry("small_exact", 1), Map.entry("standard_row", 1),
            Map.entry("from_start", 4), Map.entry("from_9", 1), Map.entry("table", 1),
            Map.entry("table_half_chance_one_trial_per_second", 1), Map.entry("pmf_formula", 1),
            Map.entry("numeric_MTTF", 1), Map.entry("no_repair_MTTF", 1), Map.entry("mean_weather_cycle", 1),
            Map.entry("MTTF", 2), Map.entry("MTTF_1oo3", 1), Map.entry("MTTF_2oo3", 1), Map.entry("MTTF_3oo3", 1),
            Map.entry("absorption", 13), Map.entry("first_passage_geometric", 1), Map.entry("first_passage_to_0", 3),
            Map.entry("first_passage_to_3", 1), Map.entry("first_passage_to_4", 2),
            Map.entry("mean_burst_length", 1), Map.entry("mean_dry_spell", 1), Map.entry("mean_first_passage", 2),
            Map.entry("mean_first_passage_row_convention", 1), Map.entry("mean_first_passage_to_0", 1),
            Map.entry("mean_gap_length", 1), Map.entry("mean_recurrence", 6),
            Map.entry("mean_time_to_failure", 1), Map.entry("mean_time_to_repair", 1),
            Map.entry("mean_wet_spell", 1), Map.entry("one_packet", 1), Map.entry("pmf", 1),
            Map.entry("three_packets", 1), Map.entry("variance", 1), Map.entry("variance_1oo3", 1),
            Map.entry("variance_burst_length", 1), Map.entry("variance_first_passage_to_0", 1),
            Map.entry("A_power", 4), Map.entry("at_x_3_5", 1),
            Map.entry("char_poly", 1), Map.entry("closed_form", 39),
            Map.entry("cohort_10000", 1), Map.entry("conditional_loss_after_loss", 1),
            Map.entry("delta", 1), Map.entry("dominant_root_approx", 3),
            Map.entry("eigenvalues", 18), Map.entry("long_run", 28),
            Map.entry("long_run_kind", 28), Map.entry("loss_rate", 1),
            Map.entry("modes", 3), Map.entry("numeric", 1),
            Map.entry("p_k", 62), Map.entry("period", 5),
            Map.entry("poles", 61), Map.entry("published_transform", 5),
            Map.entry("quality_adjusted_cycles", 1), Map.entry("total_reward", 1),
            Map.entry("fundamental_Z_row_convention", 1), Map.entry("kemeny_constant_trace_Z", 1),
            Map.entry("rational_instance", 1), Map.entry("second_eigenvalue", 2),
            Map.entry("start_state2", 1), Map.entry("transfer", 62));

    private static Map<String, String> notAskedYet() {
        Map<String, String> reasons = new TreeMap<>();
        for (String key : List.of("sensitivity", "wet_probability", "availability_one_repairer",
                "availability_two_repairers", "lag_k_autocorrelation", "dispersion_coefficient",
                "capacity_bits_per_unit_time", "continuous_time_parent", "note")) {
            reasons.put(key, "formulas in parameters");
        }
        for (String key : List.of("mle_row_convention", "row_totals", "standard_error_squared_row_convention",
                "pearson_chi2_independence", "likelihood_ratio_G2_independence", "vowel_fraction_direct")) {
            reasons.put(key, "fitting a chain to records");
        }
        return reasons;
    }

    static Stream<PublishedCase> cases() {
        return PublishedCase.all().stream();
    }

    @Test
    void thereAreSixtyThreeCases() {
        assertEquals(63, PublishedCase.all().size());
    }

    @ParameterizedTest
    @MethodSource("cases")
    void whatIsPrintedIsDerived(PublishedCase published) {
        for (Map<String, Rational> sample : published.samples()) {
            Derived derived = new Derived(published, sample);
            compared(published).forEach(key ->
                    Comparisons.BY_KEY.get(key).accept(derived, published.expected().get(key)));
        }
    }

    /** One value altered a key: the comparison that doesn't notice could not fail. */
    @ParameterizedTest
    @MethodSource("cases")
    void anAlteredValueIsCaught(PublishedCase published) {
        Derived derived = new Derived(published, published.samples().get(0));
        for (String key : compared(published)) {
            ObjectNode altered = published.expected().deepCopy();
            alterOneLeaf(altered, key, new Random(SEED ^ (published.id() + key).hashCode()));
            assertThrows(AssertionError.class, () -> Comparisons.BY_KEY.get(key).accept(derived, altered.get(key)),
                    () -> published.id() + ": " + key + " altered to " + altered.get(key));
        }
    }

    @Test
    void everyKeyIsComparedOrNamed() {
        Map<String, Integer> counts = new TreeMap<>();
        for (PublishedCase published : PublishedCase.all()) {
            for (Map.Entry<String, JsonNode> key : published.expected().properties()) {
                assertTrue(Comparisons.BY_KEY.containsKey(key.getKey()) != NOT_ASKED_YET.containsKey(key.getKey()),
                        () -> published.id() + ": " + key.getKey());
            }
            compared(published).forEach(key -> counts.merge(key, 1, Integer::sum));
        }
        assertEquals(new TreeMap<>(COMPARED), counts);
    }

    private static List<String> compared(PublishedCase published) {
        List<String> keys = new ArrayList<>();
        published.expected().fieldNames().forEachRemaining(keys::add);
        keys.removeAll(NOT_ASKED_YET.keySet());
        keys.removeAll(IRRATIONAL.getOrDefault(published.id(), List.of()));
        return keys;
    }

    private static void alterOneLeaf(ObjectNode root, String key, Random random) {
        List<Runnable> alterations = new ArrayList<>();
        collect(root, key, alterations);
        alterations.get(random.nextInt(alterations.size())).run();
    }

    /** Every way to alter one value below {@code parent.key}; words that aren't values are left alone. */
    private static void collect(ObjectNode parent, String key, List<Runnable> alterations) {
        JsonNode node = parent.get(key);
        if (List.of("valid_from", "form", "l", "mu", "A", "x0", "transient_order", "absorbing_order", "note").contains(key)) {
            return;
        }
        if (node instanceof ObjectNode object) {
            object.fieldNames().forEachRemaining(name -> collect(object, name, alterations));
        } else if (node instanceof ArrayNode array) {
            for (int i = 0; i < array.size(); i++) {
                collectElement(array, i, alterations);
            }
        } else if (node.isNumber()) {
            alterations.add(() -> parent.put(key, node.asInt() + 1));
        } else {
            alterations.add(() -> parent.put(key, altered(key, node.asText())));
        }
    }

    private static void collectElement(ArrayNode array, int i, List<Runnable> alterations) {
        JsonNode node = array.get(i);
        if (node instanceof ObjectNode object) {
            object.fieldNames().forEachRemaining(name -> collect(object, name, alterations));
        } else if (node instanceof ArrayNode inner) {
            for (int j = 0; j < inner.size(); j++) {
                collectElement(inner, j, alterations);
            }
        } else {
            alterations.add(() -> array.set(i, altered("", node.asText())));
        }
    }

    private static String altered(String key, String text) {
        if (key.equals("long_run_kind")) {
            return text.startsWith("limit") ? "cesaro (period 2)" : "limit";
        }
        if (key.equals("dominant_root_approx")) {
            return text.substring(0, text.length() - 1) + (text.endsWith("1") ? "2" : "1");
        }
        return "(" + text + ")+1/7";
    }
}
