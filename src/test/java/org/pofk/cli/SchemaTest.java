package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.InputFormat;
import com.networknt.schema.JsonSchema;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SpecVersion;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.pofk.Pofk;
import org.pofk.chain.Chain;
import org.pofk.chain.Outputs;

/** What is written as JSON is what the schemas say. */
class SchemaTest {
    /** Its state modes are a hundred vectors of a hundred algebraic numbers each: minutes. */
    private static final String LARGE = "cable-route";
    private static final ObjectMapper MAPPER = new ObjectMapper();

    static List<String> patterns() {
        return Patterns.names();
    }

    static List<String> smallPatterns() {
        return Patterns.names().stream().filter(name -> !name.equals(LARGE)).toList();
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void derivationsKeepTheirSchema(String pattern) throws Exception {
        String part = pattern.equals(LARGE) ? "result" : "derivation";
        Run run = Run.of("derive", "test-data/models/" + pattern + ".yaml", "--as", "json", "--at", "0..3,40",
                "--show", part);
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals(Set.of(), schema("result").validate(MAPPER.readTree(run.answer())));
    }

    @ParameterizedTest
    @MethodSource("smallPatterns")
    void inspectionsKeepTheirSchema(String pattern) throws Exception {
        Run run = Run.of("inspect", "test-data/models/" + pattern + ".yaml", "--as", "json");
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals(Set.of(), schema("structure").validate(MAPPER.readTree(run.answer())));
    }

    @Test
    void aStructureShownInPlaceOfTooManyFormulasKeepsItsSchema() throws Exception {
        Run run = Run.of("derive", "test-data/tables/conveyor.csv", "--orientation", "rows", "--start", "bay 1",
                "--as", "json");
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals(Set.of(), schema("structure").validate(MAPPER.readTree(run.answer())));
    }

    @Test
    void simulationsKeepTheirSchema() throws Exception {
        Run run = Run.of("simulate", "test-data/models/pump-pair.yaml", "--as", "json", "--runs", "200");
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals(Set.of(), schema("simulation").validate(MAPPER.readTree(run.answer())));
    }

    @ParameterizedTest
    @ValueSource(strings = {"pump-pair", "valve-rotation", "kiln-campaign", "relined-main", "level-controller"})
    void answersToWhenAndPassageKeepTheirSchema(String pattern) throws Exception {
        Path file = Path.of("test-data", "models", pattern + ".yaml");
        Chain chain = Pofk.read(file).chain();
        List<List<String>> conditions = List.of(List.of("--at-least", "0.99"), List.of("--at-most", "1/1000"),
                List.of("--settles-within", "1e-6"), List.of("--at-least", "9"));
        for (List<String> condition : conditions) {
            Run run = Run.of("when", file.toString(), "--of", Outputs.byDefault(chain).get(0).name(),
                    condition.get(0), condition.get(1), "--as", "json");
            assertTrue(List.of(0, 4).contains(run.exitCode()), run.notes());
            assertEquals(Set.of(), schema("when").validate(MAPPER.readTree(run.answer())));
        }
        Run passage = Run.of("passage", file.toString(), "--into", chain.states().get(chain.size() - 1), "--at",
                "0..3", "--as", "json");
        assertEquals(chain.kind() == Chain.Kind.CHAIN ? 0 : 2, passage.exitCode(), passage.notes());
        if (passage.exitCode() == 0) {
            assertEquals(Set.of(), schema("passage").validate(MAPPER.readTree(passage.answer())));
        }
    }

    /** By what is known: at k itself with the quotient's own schema, at a step with that of the question. */
    @ParameterizedTest
    @ValueSource(strings = {"pump-pair", "valve-rotation", "kiln-campaign", "relined-main"})
    void answersGivenWhatIsKnownKeepTheirSchema(String pattern) throws Exception {
        Path file = Path.of("test-data", "models", pattern + ".yaml");
        Chain chain = Pofk.read(file).chain();
        String last = chain.states().get(chain.size() - 1);
        String output = Outputs.byDefault(chain).get(0).name();
        for (String option : List.of("--given", "--given-never")) {
            assertKeeps("conditional", "derive", file, "--of", output, option, last, "--at", "0..3,1000000");
        }
        assertKeeps("conditional", "derive", file, "--of", output, "--given", last, "--given-never", last,
                "--given-at", "4");
        assertKeeps("result", "derive", file, "--of", output, "--given-at", "2", "--given-never", last);
        assertKeeps("when", "when", file, "--of", output, "--given-at", "2", "--given-never", last, "--at-least", "9");
        assertKeeps("when", "when", file, "--of", output, "--given", last, "--settles-within", "1e-3");
        assertKeeps("passage", "passage", file, "--into", last, "--given-at", "2", "--given-never", last);
    }

    private static void assertKeeps(String schema, String command, Path file, String... options) throws Exception {
        List<String> arguments = new ArrayList<>(List.of(command, file.toString(), "--as", "json"));
        arguments.addAll(List.of(options));
        Run run = Run.of(arguments.toArray(String[]::new));
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals(Set.of(), schema(schema).validate(MAPPER.readTree(run.answer())), () -> arguments + "");
    }

    @ParameterizedTest
    @ValueSource(strings = {"pump-pair", "valve-rotation", "relined-main"})
    void formulasFromEachStateKeepTheirSchema(String pattern) throws Exception {
        Path file = Path.of("test-data", "models", pattern + ".yaml");
        assertKeeps("powers", "derive", file, "--start", "each", "--at", "0,7");
    }

    @ParameterizedTest
    @ValueSource(strings = {"models/pump-pair", "models/valve-rotation", "models/relined-main",
        "models/level-controller", "costs/burst-error-link"})
    void totalsKeepTheirSchema(String model) throws Exception {
        Run run = Run.of("total", "test-data/" + model + ".yaml", "--to", "0,7", "--as", "json");
        assertEquals(0, run.exitCode(), run.notes());
        assertEquals(Set.of(), schema("total").validate(MAPPER.readTree(run.answer())));
    }

    @ParameterizedTest
    @ValueSource(strings = {"tested-valve", "bridge-deck", "staggered-pumps"})
    void answersAboutSchedulesKeepTheirSchema(String model) throws Exception {
        Path file = Path.of("test-data", "scheduled", model + ".yaml");
        assertKeeps("schedule", "derive", file, "--at", "0..3,100");
        String last = Pofk.read(file).chain().states().get(Pofk.read(file).chain().size() - 1);
        assertKeeps("when", "when", file, "--of", last, "--at-least", "0.01");
        assertKeeps("schedule-total", "total", file, "--of", last, "--to", "0..3,100");
        assertKeeps("schedule-total", "total", file, "--of", last, "--entries");
        assertKeeps("schedule-passage", "passage", file, "--into", last, "--at", "0..3,100");
        assertKeeps("when", "when", file, "--of", last, "--settles-within", "1e-3");
        String first = Pofk.read(file).chain().states().get(0);
        for (String option : List.of("--given", "--given-never")) {
            assertKeeps("schedule-conditional", "derive", file, option, last, "--at", "0..3,100");
            assertKeeps("when", "when", file, "--of", first, option, last, "--at-least", "0.01");
        }
        assertKeeps("schedule-passage", "passage", file, "--into", first, "--into", last, "--given", last);
        assertKeeps("schedule", "derive", file, "--given", first, "--given-at", "5", "--at", "0..3");
        assertKeeps("when", "when", file, "--of", last, "--given", first, "--given-at", "5", "--at-least", "0.01");
        assertKeeps("schedule-passage", "passage", file, "--into", last, "--given", first, "--given-at", "5");
        assertKeeps("conditional", "derive", file, "--given", first, "--given-never", first, "--given-at", "5");
    }

    @ParameterizedTest
    @ValueSource(strings = {"pump-pair", "right"})
    void verdictsKeepTheirSchema(String claims) throws Exception {
        Run run = Run.of("check", "test-data/claims/" + claims + ".yaml", "--as", "json");
        assertEquals(claims.equals("right") ? 0 : 1, run.exitCode(), run.notes());
        assertEquals(Set.of(), schema("verdicts").validate(MAPPER.readTree(run.answer())));
    }

    @Test
    void aResultWithAFieldMoreOrLessOrOfAnotherKindIsRefused() throws Exception {
        JsonNode result = MAPPER.readTree(Run.of("derive", "test-data/models/pump-pair.yaml", "--as", "json").answer());
        ObjectNode more = result.deepCopy();
        more.put("surplus", 1);
        ObjectNode less = result.deepCopy();
        less.remove("step");
        ObjectNode other = result.deepCopy();
        ((ObjectNode) other.at("/outputs/0/transform")).putArray("numerator").add(0.5);
        for (ObjectNode wrong : List.of(more, less, other)) {
            assertFalse(schema("result").validate(wrong).isEmpty());
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"result", "structure", "simulation", "verdicts", "conditional", "total", "powers",
        "schedule-total", "schedule-passage"})
    void schemasAreSchemas(String name) throws Exception {
        JsonSchema metaschema = JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012)
                .getSchema(com.networknt.schema.SchemaLocation.of(com.networknt.schema.SchemaId.V202012));
        assertEquals(Set.of(), metaschema.validate(new String(stream(name).readAllBytes(),
                java.nio.charset.StandardCharsets.UTF_8), InputFormat.JSON));
    }

    private static JsonSchema schema(String name) throws Exception {
        try (InputStream stream = stream(name)) {
            return JsonSchemaFactory.getInstance(SpecVersion.VersionFlag.V202012).getSchema(stream);
        }
    }

    private static InputStream stream(String name) {
        return SchemaTest.class.getResourceAsStream("/org/pofk/schema/" + name + ".schema.json");
    }
}
