package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.Pofk;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.chain.Structure;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.report.Document.Block;
import org.pofk.text.Alphabet;
import org.pofk.text.RefusedException;

/** What a report says of the model itself. */
class ModelBlocksTest {
    private static final String MOVES = "start: up\ntransitions:\n  up: {down: 1/10, up: rest}\n";

    @Test
    void aNumberWithoutASourceIsListedAndWhatFollowsFromOthersIsNot() throws RefusedException {
        assertEquals("from up: to down 1/10", open(MOVES + "  down: {up: 1}\n"));
        assertEquals("from up: to down 1/10; from down: to up 0.5",
                open(MOVES + "  down: {up: 0.5, down: rest}\n"));
        assertEquals("parameter f = 1/10", open("parameters: {f: 1/10}\nstart: up\ntransitions:\n"
                + "  up: {down: f/2, up: rest}\n  down: {up: 1}\n"));
    }

    @Test
    void aSourceStandsForAllThatItIsWrittenOn() throws RefusedException {
        assertEquals("", open("source: log book\n" + MOVES + "  down: {up: 1/2, down: rest}\n"));
        assertEquals("", open(MOVES + "  down: {up: 1/2, down: rest}\n  source: log book\n"));
        assertEquals("from up: to down 1/10", open(MOVES + "  down: {up: 1/2, down: rest, source: log book}\n"));
        assertEquals("from up: to down 1/10",
                open(MOVES + "  down: {up: {value: 1/2, source: log book}, down: rest}\n"));
        assertEquals("", open("parameters: {f: {value: 1/10, source: log book}, g: 2*f}\nstart: up\ntransitions:\n"
                + "  up: {down: g, up: rest}\n  down: {up: 1}\n"));
    }

    @Test
    void eachMoveStandsBesideWhatItsAuthorWrote() throws RefusedException {
        String text = text(MoveBlocks.of(model("parameters: {f: 1/20}\nstart: up\ntransitions:\n"
                + "  up: {down: 2*f, up: rest}\n  down: stays\n")));
        assertTrue(text.contains("  up    up           9/10  rest\n"), text);
        assertTrue(text.contains("  up    down         1/10  2*f\n"), text);
        assertTrue(text.contains("  down  down            1  stays\n"), text);
    }

    @Test
    void theRestOfAMatrixIsSeenToo() throws RefusedException {
        String text = text(MoveBlocks.of(model("start: '1'\nmatrix: {orientation: rows, entries: [[0.9, rest],"
                + " [1, 0]]}\n")));
        assertTrue(text.contains("     1   2         1/10        rest\n"), text);
    }

    @Test
    void aTableThatIsNamedIsAmongTheFilesRead(@TempDir Path folder) throws IOException, RefusedException {
        Files.writeString(folder.resolve("deck.csv"), "up,down\n0.9,0.1\n0.5,0.5\n");
        Path file = Files.writeString(folder.resolve("deck.yaml"),
                "pofk: 1\nstart: up\nmatrix: {orientation: rows, file: deck.csv}\n");
        List<Model.Origin> tables = Pofk.read(file).tables();
        assertEquals(1, tables.size());
        assertEquals(Source.read(folder.resolve("deck.csv")).sha256(), tables.get(0).sha256());
        assertTrue(tables.get(0).file().endsWith("deck.csv"));
    }

    @Test
    void everyPatternSaysItsAssumptionsAndSourcesOrThatThereAreNone() throws IOException, RefusedException {
        for (String pattern : PatternCharts.names()) {
            Model model = Pofk.read(Path.of("test-data/models", pattern + ".yaml"));
            String text = text(ModelBlocks.of(model, Outputs.byDefault(model.chain()),
                    Structure.of(model.chain())));
            assertEquals(model.about().assumptions().isEmpty(), text.contains("The model file states none."), pattern);
            assertTrue(text.contains("Numbers without a source"), pattern);
            assertFalse(text.contains("too many"), pattern);
        }
    }

    /** The list, its lines joined; empty where every number has one. */
    private static String open(String contents) throws RefusedException {
        List<Block> blocks = SourceBlocks.of(model(contents));
        assertEquals(2, blocks.size());
        return blocks.get(1) instanceof Document.Items items ? String.join("; ", items.items().stream()
                .map(item -> new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8).of(item)).toList()) : "";
    }

    private static String text(List<Block> blocks) {
        return TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8).write(new Document(blocks));
    }

    private static Model model(String contents) throws RefusedException {
        return ModelReader.read(Source.ofText("invented.yaml", "pofk: 1\n" + contents), Optional.empty(),
                Overrides.NONE);
    }
}
