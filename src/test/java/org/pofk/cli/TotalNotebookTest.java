package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.page.Installed;

/** A notebook of totals follows the format, proves every total again in Python alone, and fails on another number. */
class TotalNotebookTest {
    @TempDir
    private Path folder;

    @Test
    void theTotalsAreProvedAgainAndAnAlteredAmountIsCaught() throws Exception {
        Run run = Run.of("total", "test-data/costs/burst-error-link.yaml", "--costs", "--of", "fading", "--as",
                "notebook");
        assertEquals(0, run.exitCode(), run.notes());
        NotebookFile notebook = NotebookFile.of(run.answer());
        notebook.assertFollowsTheFormat();
        String program = notebook.program();
        String shown = python(program, 0);
        for (String name : new String[] {"steps in fading", "cost", "total cost", "total discounted cost"}) {
            assertTrue(shown.contains(name + ": the closed form equals y(k)"), name + " in " + shown);
        }
        python(program.replaceFirst("1 0 500 0 0", "1 0 501 0 0"), 1);
    }

    private String python(String program, int expected) throws IOException, InterruptedException {
        Installed.require("python3", "notebooks aren't run");
        Path file = folder.resolve("totals.py");
        Files.writeString(file, program);
        Process process = new ProcessBuilder("python3", file.toString()).redirectErrorStream(true).start();
        String shown = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(expected, process.waitFor(), shown);
        return shown;
    }
}
