package org.pofk.published;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.pofk.exact.Rational;

/**
 * One case from the published literature: a model file and, beside it, what its source prints.
 *
 * @param record the JSON beside the model: source, provenance, samples of its parameters, expected values
 */
record PublishedCase(String id, Path model, JsonNode record) {
    private static final Path FOLDER = Path.of("test-data", "published");

    static List<PublishedCase> all() {
        try (Stream<Path> files = Files.list(FOLDER)) {
            return files.filter(file -> file.toString().endsWith(".json")).sorted().map(PublishedCase::read).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static PublishedCase read(Path file) {
        String id = file.getFileName().toString().replaceFirst("\\.json$", "");
        try {
            return new PublishedCase(id, file.resolveSibling(id + ".yaml"), new ObjectMapper().readTree(file.toFile()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    JsonNode expected() {
        return record.get("expected");
    }

    /** Author, title, year, section and provenance, for the message of a check that fails. */
    String source() {
        JsonNode source = record.get("source");
        return id + " [" + source.get("author").asText() + ", " + source.get("title").asText() + ", "
                + source.get("year").asText() + ", " + source.get("section").asText() + "; "
                + record.get("provenance").asText() + "]";
    }

    /** Every combination of the samples given for the parameters; one empty combination without parameters. */
    List<Map<String, Rational>> samples() {
        List<Map<String, Rational>> combinations = List.of(Map.of());
        for (Map.Entry<String, JsonNode> parameter : record.get("samples").properties()) {
            List<Map<String, Rational>> longer = new ArrayList<>();
            for (Map<String, Rational> combination : combinations) {
                for (JsonNode value : parameter.getValue()) {
                    Map<String, Rational> extended = new LinkedHashMap<>(combination);
                    extended.put(parameter.getKey(), Rational.parse(value.asText()));
                    longer.add(extended);
                }
            }
            combinations = longer;
        }
        return combinations;
    }
}
