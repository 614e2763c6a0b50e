package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.DynamicTest.dynamicTest;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Whole runs, each in a folder: arguments (one a line), expected output, expected errors, exit code. */
class RunsTest {
    private static final Path RUNS = Path.of("src/test/resources/runs");

    @TestFactory
    Stream<DynamicTest> runsAnswerAsTheirFolderSays() throws IOException {
        return folders().stream().map(folder -> dynamicTest(folder.getFileName().toString(), () -> holds(folder)));
    }

    @Test
    void thereAreRuns() throws IOException {
        assertTrue(folders().size() >= 5);
    }

    private static void holds(Path folder) throws IOException {
        Run run = Run.of(Files.readAllLines(folder.resolve("arguments")));
        assertEquals(Files.readString(folder.resolve("expected-errors")), run.notes());
        assertEquals(Files.readString(folder.resolve("expected-output")), run.answer());
        assertEquals(Files.readString(folder.resolve("exit-code")).strip(), String.valueOf(run.exitCode()));
    }

    private static List<Path> folders() throws IOException {
        try (Stream<Path> found = Files.list(RUNS)) {
            return found.sorted().toList();
        }
    }
}
