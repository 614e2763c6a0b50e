package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.pofk.page.Installed;

/** A notebook of a schedule follows the format, steps its cycles again in Python alone, and fails on another number. */
class ScheduledNotebookTest {
    @TempDir
    private Path folder;

    @ParameterizedTest
    @ValueSource(strings = {"tested-valve", "bridge-deck", "staggered-pumps", "checked-relay"})
    void theFirstCycleAndTheLongRunAreSteppedAgain(String model) throws Exception {
        String program = program("derive", "test-data/scheduled/" + model + ".yaml");
        String shown = python(program, 0);
        assertTrue(shown.contains("in the first cycle: average, highest and lowest value"), shown);
        assertTrue(shown.contains("in the long run: average, highest and lowest value"), shown);
    }

    @Test
    void anAlteredActionIsCaught() throws Exception {
        String program = program("report", "test-data/scheduled/tested-valve.yaml");
        python(program, 0);
        String altered = program.replace("(2, 0, Fraction(\"9/10\"))", "(2, 0, Fraction(\"4/5\"))")
                .replace("(2, 2, Fraction(\"1/10\"))", "(2, 2, Fraction(\"1/5\"))");
        assertNotEquals(program, altered);
        python(altered, 1);
    }

    @Test
    void anAlteredValueOfTheLongRunIsCaught() throws Exception {
        String program = program("derive", "test-data/scheduled/bridge-deck.yaml");
        int at = program.lastIndexOf("holds(\"\"\"\n") + "holds(\"\"\"\n".length();
        String shown = python(program.substring(0, at) + "1" + program.substring(at), 1);
        assertTrue(shown.contains("doesn't hold: closed in the long run: average"), shown);
    }

    @Test
    void formulasAreProvedAgainAndAnAlteredOneIsCaught() throws Exception {
        String program = program("derive", "test-data/scheduled/sluice-gate.yaml", "--of", "open");
        String shown = python(program, 0);
        assertTrue(shown.contains("open(j) in the first cycle: the formula is what is stepped"), shown);
        assertTrue(shown.contains("mean of open over cycle m: the closed form equals y(m)"), shown);
        assertTrue(shown.contains("open(3 m + j): the formula is what is stepped at every j"), shown);
        int joint = program.indexOf("joint = []");
        python(program.substring(0, joint) + program.substring(joint).replaceFirst("impulses = numbers\\(\"-1/2",
                "impulses = numbers(\"-1/3"), 1);
        python(program.replaceFirst("numerator = numbers\\(\"0 1/3", "numerator = numbers(\"0 1/4"), 1);
    }

    @Test
    void aPassageIsProvedAgainAndAnAlteredPercentileIsCaught() throws Exception {
        String program = program("passage", "test-data/scheduled/tested-valve.yaml", "--into", "stuck", "--at", "6");
        String shown = python(program, 0);
        assertTrue(shown.contains("probability, and mean and variance where it happens"), shown);
        assertTrue(shown.contains("9/10 by k = 387, not before"), shown);
        assertTrue(shown.contains("P(T ≤ 12 m + 6): the closed form equals y(m)"), shown);
        python(program.replace("(387, Fraction(\"9/10\"))", "(388, Fraction(\"9/10\"))"), 1);
    }

    @Test
    void aPassageThatMayNeverHappenHasItsMomentsWorkedOutAgain() throws Exception {
        String shown = python(program("passage", "test-data/scheduled/staggered-pumps.yaml", "--into", "none",
                "--avoiding", "first failed"), 0);
        assertTrue(shown.contains("probability and mean from each state"), shown);
    }

    @Test
    void aPassageWithoutScheduleIsProvedAgainAndAnAlteredMoveIsCaught() throws Exception {
        String program = program("passage", "test-data/models/pump-pair.yaml", "--into", "failed");
        String shown = python(program, 0);
        for (String name : new String[] {"law", "distribution", "survival"}) {
            assertTrue(shown.contains(name + ": the closed form equals y(k)"), name + " in " + shown);
        }
        python(program.replaceFirst("factors\\[0\\]\\[0\\], \\[numbers\\(\"", "$01"), 1);
    }

    @Test
    void totalsAreProvedAgainAndAnAlteredCostIsCaught() throws Exception {
        String program = program("total", "test-data/scheduled/tested-valve-costs.yaml", "--costs", "--of", "leaking",
                "--to", "12");
        String shown = python(program, 0);
        for (String name : new String[] {"steps in leaking", "total cost"}) {
            assertTrue(shown.contains(name + ": the values listed, as stepped"), shown);
            assertTrue(shown.contains(name + "(12 m): the closed form equals y(m)"), shown);
            assertTrue(shown.contains(name + ", added by cycle m: the closed form equals y(m)"), shown);
        }
        python(program.replace("Fraction(\"14\")", "Fraction(\"15\")"), 1);
    }

    private static String program(String... arguments) throws Exception {
        Run run = Run.of(Stream.concat(Stream.of(arguments), Stream.of("--as", "notebook")).toArray(String[]::new));
        assertEquals(0, run.exitCode(), run.notes());
        NotebookFile notebook = NotebookFile.of(run.answer());
        notebook.assertFollowsTheFormat();
        return notebook.program();
    }

    private String python(String program, int expected) throws IOException, InterruptedException {
        Installed.require("python3", "notebooks aren't run");
        Path file = folder.resolve("schedule.py");
        Files.writeString(file, program);
        Process process = new ProcessBuilder("python3", file.toString()).redirectErrorStream(true).start();
        String shown = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(expected, process.waitFor(), shown);
        return shown;
    }
}
