package org.pofk.patterns;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;

/** Every pattern shows the features it declares, and every feature has a pattern. */
class PatternFeaturesTest {
    private static final Path FOLDER = Path.of("test-data", "models");
    private static final String DECLARED = "  features: [";

    static List<String> names() throws IOException {
        return Files.readAllLines(FOLDER.resolve("index.txt"));
    }

    private static String text(String name) throws IOException {
        return Files.readString(FOLDER.resolve(name + ".yaml"));
    }

    private static Set<String> declared(String text) {
        String line = text.lines().filter(each -> each.startsWith(DECLARED)).findFirst().orElseThrow();
        return new TreeSet<>(List.of(line.substring(DECLARED.length(), line.length() - 1).split(", ")));
    }

    @Test
    void theIndexNamesEveryPatternOnce() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            List<String> found = files.map(file -> file.getFileName().toString())
                    .filter(name -> name.endsWith(".yaml")).map(name -> name.replace(".yaml", "")).sorted().toList();
            assertEquals(found, names().stream().sorted().toList());
        }
    }

    @Test
    void everyPatternIsMarkedAsInvented() throws IOException {
        for (String name : names()) {
            assertTrue(text(name).lines().anyMatch(line -> line.startsWith("title:") && line.endsWith("(invented)")),
                    name);
        }
    }

    @ParameterizedTest
    @MethodSource("names")
    void aPatternShowsWhatItDeclares(String name) throws Exception {
        String text = text(name);
        Features features = Features.of(text, ModelReader.read(FOLDER.resolve(name + ".yaml"), Overrides.NONE));
        for (String feature : declared(text)) {
            assertTrue(Features.BY_NAME.containsKey(feature), () -> "unknown feature: " + feature);
            assertTrue(Features.BY_NAME.get(feature).test(features), () -> name + " has lost: " + feature);
        }
    }

    @Test
    void everyFeatureHasAPattern() throws IOException {
        Set<String> shown = new TreeSet<>();
        for (String name : names()) {
            shown.addAll(declared(text(name)));
        }
        assertEquals(new TreeSet<>(Features.BY_NAME.keySet()), shown);
    }
}
