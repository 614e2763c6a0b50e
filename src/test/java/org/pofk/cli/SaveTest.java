package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermission;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
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

    private Run saved(String formats, String... more) {
        List<String> arguments = new ArrayList<>(List.of("derive", "test-data/models/pump-pair.yaml", "--as", formats,
                "--save-in", folder.toString()));
        arguments.addAll(List.of(more));
        return Run.of(arguments);
    }

    @Test
    void severalFormatsAreFilesNamedAfterModelAndCommand() throws IOException {
        Run run = saved("html,latex,json");
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals(Set.of("pump-pair-derive.html", "pump-pair-derive.tex", "pump-pair-derive.json"), names());
        for (String format : List.of("html", "latex", "json")) {
            String ending = format.equals("latex") ? "tex" : format;
            assertEquals(Run.of("derive", "test-data/models/pump-pair.yaml", "--as", format).answer(),
                    Files.readString(folder.resolve("pump-pair-derive." + ending)));
        }
    }

    @Test
    void whereOneFileExistsNoneIsWritten() throws IOException {
        Path mine = Files.writeString(folder.resolve("pump-pair-derive.json"), "mine");
        assertEquals(2, saved("html,json").exitCode());
        assertEquals(Set.of("pump-pair-derive.json"), names());
        assertEquals("mine", Files.readString(mine));
        assertEquals(0, saved("html,json", "--replace").exitCode());
        assertTrue(Files.readString(mine).startsWith("{"));
    }

    @Test
    void whereOneFormatCannotBeWrittenNoneIs() throws IOException {
        Path model = Files.writeString(folder.resolve("model.yaml"),
                "pofk: 1\nstates: [泵, b]\nstart: 泵\ntransitions:\n  泵: {b: 1/2, 泵: rest}\n  b: {b: 1}\n");
        assertEquals(3, Run.of("derive", model.toString(), "--as", "html,latex", "--save-in", folder.toString())
                .exitCode());
        assertEquals(Set.of("model.yaml"), names());
    }

    @Test
    void aMoveThatFailsTakesBackThoseBeforeIt() throws IOException {
        Path mine = Files.writeString(folder.resolve("a"), "mine");
        Path taken = Files.createDirectories(folder.resolve("c/full")).getParent();
        Map<Path, byte[]> files = new LinkedHashMap<>();
        for (Path each : List.of(mine, folder.resolve("b"), taken)) {
            files.put(each, new byte[] {'x'});
        }
        assertThrows(WritingException.class, () -> WholeFiles.write(files));
        assertEquals("mine", Files.readString(mine));
        assertEquals(Set.of("a", "c"), names());
    }

    /** Whatever those are here: as of any other file. */
    @Test
    @EnabledOnOs(OS.LINUX)
    void aSavedFileHasTheUsualPermissionsAndAReplacedOneItsOwn() throws IOException {
        Set<PosixFilePermission> usual =
                Files.getPosixFilePermissions(Files.writeString(folder.resolve("any"), ""));
        Path file = folder.resolve("pumps.yaml");
        Run.of("new", "pump-pair", "--save", file.toString());
        assertEquals(usual, Files.getPosixFilePermissions(file));
        Set<PosixFilePermission> mine = PosixFilePermissions.fromString("rw-r-----");
        Files.setPosixFilePermissions(file, mine);
        Run.of("new", "pump-pair", "--save", file.toString(), "--replace");
        assertEquals(mine, Files.getPosixFilePermissions(file));
    }

    private Set<String> names() throws IOException {
        return files().stream().map(file -> file.getFileName().toString()).collect(Collectors.toSet());
    }

    private List<Path> files() throws IOException {
        try (Stream<Path> found = Files.list(folder)) {
            return found.toList();
        }
    }
}
