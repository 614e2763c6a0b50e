package org.pofk.answer;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** The models that come with the program, for tests of what is answered about them. */
final class PatternFiles {
    private PatternFiles() {
    }

    static List<Path> all() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("test-data/models"))) {
            return files.filter(file -> file.toString().endsWith(".yaml")).sorted().toList();
        }
    }
}
