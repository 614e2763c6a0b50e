package org.pofk.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;

/** The models to start from that come with the program, in the order of their index. */
final class Patterns {
    private static final String FOLDER = "/org/pofk/patterns/";
    private static final String SUMMARY = "  summary: ";

    private Patterns() {
    }

    static List<String> names() {
        return text("index.txt").orElseThrow().lines().map(String::strip).filter(name -> !name.isEmpty()).toList();
    }

    /** The model file of a pattern, as it stands. */
    static Optional<String> model(String name) {
        return names().contains(name) ? text(name + ".yaml") : Optional.empty();
    }

    /** What a pattern is about, in its own words. */
    static String summary(String model) {
        return model.lines().filter(line -> line.startsWith(SUMMARY)).map(line -> line.substring(SUMMARY.length()))
                .findFirst().orElse("");
    }

    private static Optional<String> text(String name) {
        try (InputStream stream = Patterns.class.getResourceAsStream(FOLDER + name)) {
            return stream == null
                    ? Optional.empty()
                    : Optional.of(new String(stream.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
    }
}
