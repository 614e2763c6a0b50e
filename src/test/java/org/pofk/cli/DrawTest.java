package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DrawTest {
    private static final String KILN = "test-data/models/kiln-campaign.yaml";

    @TempDir
    Path folder;

    @Test
    void theFigureOfTheReadmeIsWhatTheToolDraws() throws IOException {
        assertTrue(Files.readString(Path.of("README.md")).contains("(src/docs/kiln-campaign.svg)"));
        assertEquals(Files.readString(Path.of("src/docs/kiln-campaign.svg")), Run.of("draw", KILN).answer());
    }

    @Test
    void aSavedFigureIsTheOneThatGoesToTheScreen() throws IOException {
        for (String what : List.of("course", "poles", "states")) {
            Path file = folder.resolve(what + ".svg");
            Run run = Run.of("draw", KILN, "--what", what, "--save", file.toString());
            assertEquals(0, run.exitCode(), run.notes());
            assertEquals("", run.answer());
            assertEquals(Run.of("draw", KILN, "--what", what).answer(), Files.readString(file));
        }
        assertEquals(3, files());
    }

    @Test
    void pixelsAreAsManyAsAskedAndTheSameTwice() throws IOException {
        Path file = folder.resolve("a.PNG");
        assertEquals(0, Run.of("draw", KILN, "--save", file.toString(), "--width", "640").exitCode());
        byte[] first = Files.readAllBytes(file);
        assertEquals(640, ImageIO.read(file.toFile()).getWidth());
        assertEquals(0, Run.of("draw", KILN, "--save", file.toString(), "--width", "640", "--replace").exitCode());
        assertTrue(Arrays.equals(first, Files.readAllBytes(file)));
        assertEquals(1, files());
    }

    @Test
    void anExistingFigureStaysAndNothingIsWrittenForWhatIsRefused() throws IOException {
        Path file = Files.writeString(folder.resolve("a.svg"), "mine");
        assertEquals(2, Run.of("draw", KILN, "--save", file.toString()).exitCode());
        assertEquals("mine", Files.readString(file));
        Path other = folder.resolve("b.svg");
        assertEquals(2, Run.of("draw", "test-data/models/cable-route.yaml", "--what", "states", "--save", other.toString())
                .exitCode());
        assertEquals(3, Run.of("draw", "test-data/refused/many-in-transitions.yaml", "--save", other.toString()).exitCode());
        assertFalse(Files.exists(other));
        assertEquals(1, files());
    }

    @Test
    void theStepsAskedForAreThoseThatAreDrawn() {
        String svg = Run.of("draw", KILN, "--of", "running", "--at", "2..4,9").answer();
        assertEquals(List.of("running(2)", "running(3)", "running(4)", "running(9)"),
                Pattern.compile("running\\(\\d+\\)").matcher(svg).results().map(found -> found.group())
                        .toList());
        assertEquals(0, Run.of("draw", KILN, "--at", "7").exitCode());
    }

    private long files() throws IOException {
        try (Stream<Path> found = Files.list(folder)) {
            return found.count();
        }
    }
}
