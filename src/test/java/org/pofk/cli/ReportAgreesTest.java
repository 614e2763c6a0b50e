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
import java.util.Map;
import java.util.TreeMap;
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

    private static final Pattern RULED = Pattern.compile(" +-+( +-+)+");
    private static final Pattern RULE = Pattern.compile("-+");
    private static final Pattern SIGN = Pattern.compile("^-");
    private static final int FEWEST_DIGITS = 4;

    private int compared;

    /** The large one is a pattern for the time it takes. */
    static List<String> patterns() throws IOException {
        return Files.readAllLines(Path.of("test-data/models/index.txt")).stream().map(String::strip)
                .filter(name -> !name.isEmpty() && !name.equals("cable-route")).toList();
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void everyFormatSaysWhatDeriveSaysAsData(String pattern) throws IOException {
        String written = report(pattern, "text", "full");
        String text = written.replaceAll("\\s", "");
        Map<Integer, List<String>> cells = cells(written);
        String page = report(pattern, "html", "brief");
        String latex = report(pattern, "latex", "brief").replaceAll("\\\\allowbreak\\{}", "");
        int before = compared;
        int place = 0;
        for (JsonNode output : derived(pattern).path("outputs")) {
            standInTheirCells(output.path("values"), cells, place++);
            says(text, output.path("formula").path("text").asText().replaceAll("\\s", ""));
            says(page, output.path("formula").path("latex").asText().replace("&", "&amp;") + "\"");
            says(numbersOf(latex), numbersOf(output.path("formula").path("latex").asText()));
            for (String number : numbers(output)) {
                says(text, number);
                says(page, SIGN.matcher(number).replaceFirst("−"));
                says(latex, SIGN.matcher(number).replaceFirst("\\\\ensuremath{-}"));
            }
        }
        assertTrue(compared - before >= 20, pattern + ": " + (compared - before));
    }

    @Test
    void theSameRunWritesTheSameBytes() {
        assertEquals(report("kiln-campaign", "html", "brief"), report("kiln-campaign", "html", "brief"));
    }

    /** Each at its step and in the column of its output; one told by what it lacks to one is the same number. */
    private void standInTheirCells(JsonNode values, Map<Integer, List<String>> cells, int place) {
        for (JsonNode value : values) {
            String cell = cells.get(value.path("k").asInt()).get(place);
            BigDecimal shown = cell.startsWith("1 - ")
                    ? BigDecimal.ONE.subtract(new BigDecimal(cell.substring("1 - ".length()))) : new BigDecimal(cell);
            assertEquals(0, shown.compareTo(new BigDecimal(value.path("decimal").asText())), cell + " for " + value);
            compared++;
        }
    }

    /** The table of values by step, its columns in their order wherever it is folded. */
    private static Map<Integer, List<String>> cells(String report) {
        List<String> lines = report.lines().dropWhile(line -> !line.equals("Values at the end of step k")).toList();
        Map<Integer, List<String>> cells = new TreeMap<>();
        for (int i = 0; i < lines.size() && !lines.get(i).equals("What was modelled"); i++) {
            List<MatchResult> columns = RULED.matcher(lines.get(i)).matches()
                    ? RULE.matcher(lines.get(i)).results().toList() : List.of();
            for (int j = i + 1; !columns.isEmpty() && j < lines.size() && !lines.get(j).isBlank(); j++) {
                String row = lines.get(j);
                List<String> found = columns.stream().map(column -> row.substring(Math.min(row.length(), column.start()),
                        Math.min(row.length(), column.end())).strip()).toList();
                cells.computeIfAbsent(Integer.valueOf(found.get(0)), none -> new ArrayList<>())
                        .addAll(found.subList(1, found.size()));
            }
        }
        return cells;
    }

    private void says(String report, String said) {
        assertTrue(!said.isEmpty() && report.contains(said), said);
        compared++;
    }

    private static String numbersOf(String latex) {
        return NUMBER.matcher(latex).results().map(MatchResult::group).collect(Collectors.joining(" ", " ", " "));
    }

    /**
     * What can't stand in a report by chance: values of at least four digits, but for those told by what they lack to
     * one; and the long run, as a fraction where that is short.
     */
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
        return numbers.stream().filter(number -> number.length() <= 40
                && number.chars().filter(Character::isDigit).count() >= FEWEST_DIGITS).toList();
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

    private static String report(String pattern, String format, String depth) {
        List<String> arguments = new ArrayList<>(List.of("report", "test-data/models/" + pattern + ".yaml", "--at", AT,
                "--show", depth, "--as", format));
        if (format.equals("text")) {
            arguments.add("--plain");
        }
        Run run = Run.of(arguments);
        assertEquals(0, run.exitCode(), run.notes());
        return run.answer();
    }
}
