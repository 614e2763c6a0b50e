package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** A notebook as it is read, held to the structure of nbformat 4.5. */
record NotebookFile(JsonNode json) {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final Set<String> OF_CODE =
            Set.of("cell_type", "execution_count", "id", "metadata", "outputs", "source");
    private static final Set<String> OF_MARKDOWN = Set.of("cell_type", "id", "metadata", "source");

    static NotebookFile of(String text) throws JsonProcessingException {
        return new NotebookFile(MAPPER.readTree(text));
    }

    /** One source a cell, joined as a notebook joins it. */
    List<String> sources(String kind) {
        List<String> sources = new ArrayList<>();
        for (JsonNode cell : json.get("cells")) {
            if (cell.get("cell_type").asText().equals(kind)) {
                StringBuilder source = new StringBuilder();
                cell.get("source").forEach(line -> source.append(line.asText()));
                sources.add(source.toString());
            }
        }
        return sources;
    }

    /** All cells of code as one program. */
    String program() {
        return sources("code").stream().collect(Collectors.joining("\n\n\n", "", "\n"));
    }

    /** The fields nbformat 4.5 requires and no other, ids unlike each other, nothing run. */
    void assertFollowsTheFormat() {
        assertEquals(Set.of("cells", "metadata", "nbformat", "nbformat_minor"), names(json));
        assertEquals(4, json.get("nbformat").asInt());
        assertEquals(5, json.get("nbformat_minor").asInt());
        assertEquals(Set.of("kernelspec", "language_info"), names(json.get("metadata")));
        assertEquals(Set.of("display_name", "language", "name"), names(json.at("/metadata/kernelspec")));
        assertEquals(Set.of("name"), names(json.at("/metadata/language_info")));
        Set<String> ids = new HashSet<>();
        for (JsonNode cell : json.get("cells")) {
            boolean isCode = cell.get("cell_type").asText().equals("code");
            assertTrue(isCode || cell.get("cell_type").asText().equals("markdown"));
            assertEquals(isCode ? OF_CODE : OF_MARKDOWN, names(cell));
            assertTrue(cell.get("id").asText().matches("[a-zA-Z0-9_-]{1,64}"));
            assertTrue(ids.add(cell.get("id").asText()), () -> "two cells with the id of " + cell);
            assertTrue(cell.get("metadata").isObject() && cell.get("metadata").isEmpty());
            assertTrue(!isCode || cell.get("execution_count").isNull() && cell.get("outputs").isArray()
                    && cell.get("outputs").isEmpty());
            assertSource(cell.get("source"));
        }
    }

    private static void assertSource(JsonNode source) {
        assertTrue(source.isArray() && !source.isEmpty());
        for (int i = 0; i < source.size(); i++) {
            assertTrue(source.get(i).isTextual());
            assertEquals(i + 1 < source.size(), source.get(i).asText().endsWith("\n"));
        }
    }

    private static Set<String> names(JsonNode object) {
        assertTrue(object.isObject());
        Set<String> names = new HashSet<>();
        object.fieldNames().forEachRemaining(names::add);
        return names;
    }
}
