package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
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

    private static String program(String... arguments) throws Exception {
        Run run = Run.of(arguments[0], arguments[1], "--as", "notebook");
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
