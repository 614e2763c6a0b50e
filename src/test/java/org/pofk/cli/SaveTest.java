package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

class SaveTest {
    @TempDir
    Path folder;

    @Test
    void aSavedPatternIsThePatternAndNothingElseIsLeft() throws IOException {
        Path file = folder.resolve("pumps.yaml");
        Run run = Run.of("new", "pump-pair", "--save", file.toString());
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals("", run.answer());
        assertEquals(Patterns.model("pump-pair").orElseThrow(), Files.readString(file));
        assertEquals(List.of(file), files());
    }

    @Test
    void anExistingFileStaysUnlessItsReplacementIsAskedFor() throws IOException {
        Path file = Files.writeString(folder.resolve("pumps.yaml"), "mine");
        Run refused = Run.of("new", "pump-pair", "--save", file.toString());
        assertEquals(2, refused.exitCode());
        assertTrue(refused.notes().contains("--replace"), refused.notes());
        assertEquals("mine", Files.readString(file));
        assertEquals(0, Run.of("new", "pump-pair", "--save", file.toString(), "--replace").exitCode());
        assertTrue(Files.readString(file).startsWith("pofk: 1"));
        assertEquals(List.of(file), files());
    }

    @Test
    void aFolderThatIsNotThereIsAFailureToWrite() {
        Run run = Run.of("new", "pump-pair", "--save", folder.resolve("none/pumps.yaml").toString());
        assertEquals(5, run.exitCode());
        assertTrue(run.notes().contains("no such folder"), run.notes());
    }

    @Test
    @EnabledOnOs(OS.LINUX)
    void aFolderThatTakesNoFilesIsNotSaidToBeMissing() {
        Run run = Run.of("new", "pump-pair", "--save", "/proc/pumps.yaml");
        assertEquals(5, run.exitCode());
        assertTrue(run.notes().contains("the system takes no new file in the folder '/proc'"), run.notes());
    }

    private List<Path> files() throws IOException {
        try (Stream<Path> found = Files.list(folder)) {
            return found.toList();
        }
    }
}
