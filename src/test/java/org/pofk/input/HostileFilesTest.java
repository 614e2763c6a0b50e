package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.chain.Model;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/** Files that are too large, too deep or no files at all end at once with one fault. */
class HostileFilesTest {
    @TempDir
    private Path folder;

    private String refusal(Path file) {
        List<Fault> faults = assertThrows(RefusedException.class, () -> ModelReader.read(file, Overrides.NONE)).faults();
        assertEquals(1, faults.size());
        return faults.get(0).code() + " " + faults.get(0).toString().replace(folder + "/", "");
    }

    private static String refusalOf(String text) {
        RefusedException refused = assertThrows(RefusedException.class,
                () -> ModelReader.read(Source.ofText("m", text), Optional.empty(), Overrides.NONE));
        assertEquals(1, refused.faults().size(), refused.getMessage());
        return refused.faults().get(0).code() + " " + refused.getMessage();
    }

    @Test
    void aMissingFile() {
        assertEquals("missing-file nowhere.yaml: there is no such file", refusal(folder.resolve("nowhere.yaml")));
    }

    @Test
    void aFolder() {
        assertEquals("folder " + folder + ": this is a folder, not a file; name the file in it", refusal(folder));
    }

    @Test
    void aFileOfAHundredMegabytes() throws IOException {
        Path file = folder.resolve("large.yaml");
        try (RandomAccessFile sparse = new RandomAccessFile(file.toFile(), "rw")) {
            sparse.setLength(100_000_000);
        }
        assertEquals("file-too-large large.yaml: the file is larger than 16 MiB, the most that is read", refusal(file));
    }

    @Test
    void oneByteAboveSixteenMebibytesIsTooMuchAndSixteenAreNot() throws IOException, RefusedException {
        String model = "pofk: 1\nstart: up\ntransitions:\n  up: stays\n";
        Path file = folder.resolve("padded.yaml");
        Files.writeString(file, model + "#".repeat(Source.LARGEST - model.length()), StandardCharsets.US_ASCII);
        assertEquals(List.of("up"), ModelReader.read(file, Overrides.NONE).chain().states());
        Files.writeString(file, model + "#".repeat(Source.LARGEST + 1 - model.length()), StandardCharsets.US_ASCII);
        assertEquals("file-too-large padded.yaml: the file is larger than 16 MiB, the most that is read", refusal(file));
    }

    @Test
    void aHundredThousandLevels() {
        String tooDeep = "values are nested more than 50 levels deep here, the most that is read";
        assertEquals("too-deep m:2:57: " + tooDeep, refusalOf("pofk: 1\nstart: " + "[".repeat(100_000)));
        assertEquals("too-deep m:2:204: " + tooDeep, refusalOf("pofk: 1\nstart: " + "{a: ".repeat(100_000)));
        assertEquals("too-deep m:1:101: " + tooDeep, refusalOf("- ".repeat(100_000)));
    }

    @Test
    void aValueOfMegabytes() {
        String tooLong = "this value is longer than 64 KiB, the most that is read as one value";
        assertEquals("scalar-too-long m:2:8: " + tooLong, refusalOf("pofk: 1\ntitle: " + "x".repeat(4_000_000)));
        assertEquals("scalar-too-long m:2:8: " + tooLong, refusalOf("pofk: 1\ntitle: '" + "x,".repeat(2_000_000) + "'"));
        assertEquals("scalar-too-long m:2:8: " + tooLong, refusalOf("pofk: 1\ntitle: |\n" + "  x\n".repeat(100_000)));
    }

    @Test
    void definitionsThroughThousandsOfOthers() {
        StringBuilder text = new StringBuilder("pofk: 1\nstart: up\ntransitions: {up: stays}\nparameters:\n");
        for (int i = 0; i < 3_000; i++) {
            text.append("  p").append(i).append(": p").append(i + 1).append('\n');
        }
        text.append("  p3000: 1\n");
        RefusedException refused = assertThrows(RefusedException.class,
                () -> ModelReader.read(Source.ofText("m", text.toString()), Optional.empty(), Overrides.NONE));
        assertEquals("definition-too-long", refused.faults().get(0).code());
    }

    @Test
    void aMatrixOfManyThousandEntriesIsRead() throws RefusedException {
        int n = 150;
        String row = "    - [" + "0.003, ".repeat(n - 1) + "rest]\n";
        Model model = ModelReader.read(Source.ofText("m", "pofk: 1\nstart: '1'\nmatrix:\n  orientation: rows\n"
                + "  entries:\n" + row.repeat(n)), Optional.empty(), Overrides.NONE);
        assertEquals(n, model.chain().size());
        assertEquals("553/1000", model.chain().matrix().at(n - 1, 0).toString());
    }

    @Test
    void anUnknownNameOnEveryOneOfManyLinesEndsAllTheSame() {
        StringBuilder text = new StringBuilder("pofk: 1\nstart: s0\ntransitions:\n");
        for (int i = 0; i < 2_000; i++) {
            text.append("  s").append(i).append(": {t").append(i).append(": 1/2, s").append(i).append(": rest}\n");
        }
        RefusedException refused = assertThrows(RefusedException.class,
                () -> ModelReader.read(Source.ofText("m", text.toString()), Optional.empty(), Overrides.NONE));
        assertEquals(2_000, refused.faults().size());
    }
}
