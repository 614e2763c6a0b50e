package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

class PatternsTest {

    @Test
    void everyModelFileIsAPatternWithASummaryAndMarkedAsInvented() {
        List<String> files = List.of(Path.of("test-data/models").toFile().list((folder, name) -> name.endsWith(".yaml")))
                .stream().map(name -> name.replace(".yaml", "")).sorted().toList();
        assertEquals(files, Patterns.names().stream().sorted().toList());
        for (String name : Patterns.names()) {
            String model = Patterns.model(name).orElseThrow();
            assertFalse(Patterns.summary(model).isBlank(), name);
            assertTrue(model.contains("invented"), name);
        }
    }

    @Test
    void aNameOutsideTheIndexIsNoPattern() {
        assertTrue(Patterns.model("../cli/words").isEmpty());
        assertTrue(Patterns.model("index.txt").isEmpty());
    }
}
