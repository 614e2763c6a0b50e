package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.pofk.text.RefusedException;

class FileKindTest {

    private static FileKind of(String name, String text) {
        return FileKind.of(Source.ofText(name, text));
    }

    @Test
    void everyModelIsAModel() throws Exception {
        for (Path file : PatternModelsTest.models()) {
            assertEquals(FileKind.MODEL, FileKind.of(Source.read(file)), file.toString());
        }
    }

    @Test
    void aFileIsKnownByItsTopKeys() {
        assertEquals(FileKind.MODEL, of("a", "# pumps\ntitle: x\npofk: 1\n"));
        assertEquals(FileKind.MODEL, of("a", "title: x\ntransitions:\n"));
        assertEquals(FileKind.MODEL, of("a.json", "{\"pofk\": 1}"));
        assertEquals(FileKind.CLAIMS, of("a", "pofk-claims: 1\nmodel: pumps.yaml\n"));
        assertEquals(FileKind.CLAIMS, of("a", "{\"pofk-claims\": 1}"));
        assertEquals(FileKind.RESULT, of("a.json", "{\"format\": \"pofk-result\", \"version\": 1}"));
        assertEquals(FileKind.RESULT, of("a.json", "{\n  \"version\": 1,\n  \"format\": \"pofk-when\"\n}"));
        assertEquals(FileKind.MATRIX, of("a.csv", "up;down\n"));
        assertEquals(FileKind.MATRIX, of("a.txt", "0.9,0.1\n0.2,0.8\n"));
    }

    @Test
    void anythingElseIsNone() {
        assertEquals(FileKind.OTHER, of("a.txt", ""));
        assertEquals(FileKind.OTHER, of("a.txt", "Dear all, the pumps are fine.\n"));
        assertEquals(FileKind.OTHER, of("a.json", "{\"name\": \"x\", \"version\": 2}"));
        assertEquals(FileKind.OTHER, of("a.yaml", "plan:\n  pofk: 1\n"));
    }

    @Test
    void aFileOfTheWantedKindPasses() throws RefusedException {
        Source source = Source.ofText("a", "pofk: 1\n");
        FileKind.of(source).require(FileKind.MODEL, source);
    }
}
