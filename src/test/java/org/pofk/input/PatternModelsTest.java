package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.pofk.chain.ChainCheck;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Adjustment;
import org.pofk.chain.Model.Adjustment.Reason;
import org.pofk.exact.Rational;
import org.pofk.text.RefusedException;

/** The models that come with the program are read. */
class PatternModelsTest {
    private static final Path MODELS = Path.of("test-data/models");

    static List<Path> models() throws IOException {
        try (Stream<Path> files = Files.list(MODELS)) {
            return files.filter(file -> file.toString().endsWith(".yaml")).sorted().toList();
        }
    }

    @Test
    void everyModelIsReadAndIsSound() throws Exception {
        int read = 0;
        for (Path file : models()) {
            Model model = ModelReader.read(file, Overrides.NONE);
            assertEquals(List.of(), ChainCheck.violations(model.chain()), file.toString());
            read++;
        }
        assertTrue(read >= 16, read + " models");
    }

    @Test
    void thePumpPairHasTheNumbersOfItsFile() throws RefusedException {
        Model model = ModelReader.read(MODELS.resolve("pump-pair.yaml"), Overrides.NONE);
        assertEquals(List.of("both", "one", "none"), model.chain().states());
        assertEquals(Rational.of(361, 400), model.chain().matrix().at(0, 0));
        assertEquals(Rational.of(19, 200), model.chain().matrix().at(1, 0));
        assertEquals(Rational.of(2, 5), model.chain().matrix().at(2, 2));
        assertEquals(List.of(Rational.ONE, Rational.ZERO, Rational.ZERO), model.chain().outputs().get(1).coefficients());
        assertTrue(model.changes().contains(new Adjustment(Reason.REST_OF_MOVES,
                "from 'both' to 'both': rest came to 361/400")), model.changes().toString());
    }
}
