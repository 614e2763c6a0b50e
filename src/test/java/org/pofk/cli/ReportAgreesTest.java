package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.StreamSupport;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** A report says in every format what {@code derive} says as data: formulas, long runs, values. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class ReportAgreesTest {
    private static final String AT = "0..6,50";
    /** The numbers in LaTeX: broken lines have more signs than unbroken ones, and the same numbers in their order. */
    private static final Pattern NUMBER = Pattern.compile("[0-9]+(\\.[0-9]+)?");

    private int compared;

    /** The large one is a pattern for the time it takes. */
    static List<String> patterns() throws IOException {
        return Files.readAllLines(Path.of("test-data/models/index.txt")).stream().map(String::strip)
                .filter(name -> !name.isEmpty() && !name.equals("cable-route")).toList();
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void everyFormatSaysWhatDeriveSaysAsData(String pattern) throws IOException {
        String text = report(pattern, "text").replaceAll("\\s", "");
        String page = report(pattern, "html");
        String latex = report(pattern, "latex").replaceAll("\\\\allowbreak\\{}", "");
        int before = compared;
        for (JsonNode output : derived(pattern).path("outputs")) {
            says(text, output.path("formula").path("text").asText().replaceAll("\\s", ""));
            says(page, output.path("formula").path("latex").asText().replace("&", "&amp;") + "\"");
            says(numbersOf(latex), numbersOf(output.path("formula").path("latex").asText()));
            for (String number : numbers(output)) {
                says(text, number);
                says(page, number);
                says(latex, number);
            }
        }
        assertTrue(compared - before >= 12, pattern + ": " + (compared - before));
    }

    @Test
    void theSameRunWritesTheSameBytes() {
        assertEquals(report("kiln-campaign", "html"), report("kiln-campaign", "html"));
    }

    private void says(String report, String said) {
        assertTrue(!said.isEmpty() && report.contains(said), said);
        compared++;
    }

    private static String numbersOf(String latex) {
        return NUMBER.matcher(latex).results().map(MatchResult::group).collect(Collectors.joining(" ", " ", " "));
    }

    /** The values, but for those told by what they lack to one; and the long run, as a fraction where that is short. */
    private static List<String> numbers(JsonNode output) {
        List<String> numbers = new ArrayList<>();
        output.path("values").forEach(value -> {
            double near = value.path("decimal").asDouble();
            if (near <= 0.999 || near >= 1) {
                numbers.add(value.path("decimal").asText());
            }
        });
        JsonNode longRun = output.path("longRun");
        if (longRun.path("kind").asText().equals("limit")) {
            numbers.add(shown(longRun.path("value").asText()));
        } else if (longRun.path("kind").asText().equals("cycle")) {
            StreamSupport.stream(longRun.path("values").spliterator(), false).map(JsonNode::asText)
                    .map(ReportAgreesTest::shown).forEach(numbers::add);
        }
        return numbers.stream().filter(number -> number.length() <= 40).toList();
    }

    /** A fraction that is a short decimal is shown as that. */
    private static String shown(String fraction) {
        String[] parts = fraction.split("/");
        try {
            String decimal = new BigDecimal(parts[0]).divide(new BigDecimal(parts.length == 1 ? "1" : parts[1]))
                    .toPlainString();
            return decimal.length() <= fraction.length() ? decimal : fraction;
        } catch (ArithmeticException goesOn) {
            return fraction;
        }
    }

    private static JsonNode derived(String pattern) throws IOException {
        Run run = Run.of("derive", "test-data/models/" + pattern + ".yaml", "--at", AT, "--as", "json");
        assertEquals(0, run.exitCode(), run.notes());
        return new ObjectMapper().readTree(run.answer());
    }

    private static String report(String pattern, String format) {
        List<String> arguments = new ArrayList<>(List.of("report", "test-data/models/" + pattern + ".yaml", "--at", AT,
                "--show", "brief", "--as", format));
        if (format.equals("text")) {
            arguments.add("--plain");
        }
        Run run = Run.of(arguments);
        assertEquals(0, run.exitCode(), run.notes());
        return run.answer();
    }
}
