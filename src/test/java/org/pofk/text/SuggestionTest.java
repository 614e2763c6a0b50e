package org.pofk.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SuggestionTest {
    private static final List<String> STATES = List.of("both", "one", "none", "running", "both down");

    @ParameterizedTest
    @CsvSource({
        "bth, both", "boht, both", "bothh, both", "Both, both", "BOTH, both", "runing, running", "rnunning, running",
        "both dwon, both down", "non, none", "noen, none", "bot, both", "oen, one"
    })
    void aSlipOfTheFingersIsRecognized(String word, String meant) {
        assertEquals(Optional.of(meant), Suggestion.among(STATES, word));
    }

    @Test
    void somethingElseIsNotASlip() {
        for (String word : List.of("", "x", "spare", "broth house", "bh", "gnignur", "b".repeat(1_000_000))) {
            assertEquals(Optional.empty(), Suggestion.among(STATES, word), word);
        }
        assertEquals(Optional.empty(), Suggestion.among(List.of(), "both"));
    }

    @Test
    void amongEquallyNearTheFirstIsSuggested() {
        assertEquals(Optional.of("pump1"), Suggestion.among(List.of("pump1", "pump2"), "pump"));
        assertEquals(Optional.of("pump2"), Suggestion.among(List.of("pump2", "pump1"), "pump"));
        assertEquals("; did you mean 'pump1'?", Suggestion.didYouMean(List.of("pump1", "pump2"), "pumb1"));
        assertEquals("", Suggestion.didYouMean(STATES, "spare"));
    }

    /** Optimal string alignment by its recursive definition, without a table and without a bound. */
    private static int distanceByDefinition(String a, String b) {
        if (a.isEmpty() || b.isEmpty()) {
            return a.length() + b.length();
        }
        String shorterA = a.substring(0, a.length() - 1);
        String shorterB = b.substring(0, b.length() - 1);
        boolean same = a.charAt(a.length() - 1) == b.charAt(b.length() - 1);
        int distance = Math.min(distanceByDefinition(shorterA, shorterB) + (same ? 0 : 1),
                1 + Math.min(distanceByDefinition(shorterA, b), distanceByDefinition(a, shorterB)));
        boolean swapped = a.length() > 1 && b.length() > 1 && a.charAt(a.length() - 1) == b.charAt(b.length() - 2)
                && a.charAt(a.length() - 2) == b.charAt(b.length() - 1);
        return swapped ? Math.min(distance, 1 + distanceByDefinition(a.substring(0, a.length() - 2),
                b.substring(0, b.length() - 2))) : distance;
    }

    @Test
    void distanceIsThatOfItsDefinition() {
        Random random = new Random(20270);
        for (int i = 0; i < 500; i++) {
            String a = word(random);
            String b = word(random);
            assertEquals(distanceByDefinition(a, b), Suggestion.distance(a, b, 100), a + " to " + b);
            assertEquals(Math.min(2, distanceByDefinition(a, b)), Suggestion.distance(a, b, 2), a + " to " + b);
        }
    }

    private static String word(Random random) {
        List<String> letters = new ArrayList<>();
        for (int i = random.nextInt(6); i > 0; i--) {
            letters.add(String.valueOf("abc".charAt(random.nextInt(3))));
        }
        return String.join("", letters);
    }
}
