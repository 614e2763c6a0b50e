package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ModelHeadTest {
    private static final String TITLE = "Two brine pumps of the northern line with one common suction filter that"
            + " clogs from time to time (invented)";

    @TempDir
    Path folder;

    @Test
    void aLongTitleGoesOnInASecondLineAndAStepSaysHowLongItLasts() throws IOException {
        Path file = Files.writeString(folder.resolve("pumps.yaml"), "pofk: 1\ntitle: " + TITLE + """

                step: {is: proof test, lasts: 6 months}
                states: [up, down]
                start: up
                transitions:
                  up: {down: 1/10, up: rest}
                  down: {up: 1/2, down: rest}
                """);
        Run run = Run.of("inspect", file.toString());
        assertEquals(0, run.exitCode(), run.notes());
        int underline = run.answer().indexOf("\n═");
        String shown = run.answer().substring(0, underline);
        assertEquals(TITLE, shown.replace("\n", " "));
        assertTrue(shown.lines().allMatch(line -> line.length() <= 80), shown);
        String inOneLine = run.answer().replaceAll("\\s+", " ");
        assertTrue(inOneLine.contains("one step is proof test (lasts 6 months)"), inOneLine);
    }
}
