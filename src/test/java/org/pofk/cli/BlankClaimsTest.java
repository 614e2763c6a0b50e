package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.claim.Claim;
import org.pofk.claim.Claims;
import org.pofk.input.ClaimsReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;

/** The claims file that somebody fills in. */
class BlankClaimsTest {
    private static final Path MODELS = Path.of("test-data/models");

    @TempDir
    Path folder;

    static List<String> patterns() {
        return Patterns.names();
    }

    private static String blank(String pattern) {
        Run run = Run.of("check", "--blank", MODELS.resolve(pattern + ".yaml").toString());
        assertEquals(0, run.exitCode(), run.notes());
        return run.answer();
    }

    private static Claims read(String text) throws Exception {
        return ClaimsReader.read(Source.ofText("blank", text), Optional.of(Path.of("")), Overrides.NONE);
    }

    /** Takes the comment sign off and fills each gap. */
    private static String filled(String line) {
        return line.replaceFirst("^  # ", "  ").replace("\u2026", line.contains("polynomial") ? "z^2 - 1" : "1/2");
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void asItIsWrittenItHoldsNoClaims(String pattern) throws Exception {
        assertEquals(List.of(), read(blank(pattern)).claims());
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void withEveryStepFilledInItIsReadWithoutFault(String pattern) throws Exception {
        String text = blank(pattern).lines().map(BlankClaimsTest::filled).collect(Collectors.joining("\n"));
        Claims claims = read(text);
        Chain chain = claims.model().chain();
        int outputs = chain.outputs().isEmpty() && chain.size() > 12 ? 1 : Outputs.byDefault(chain).size();
        int passages = chain.kind() == Chain.Kind.CHAIN ? 1 : 0;
        long given = Outputs.byDefault(chain).stream().limit(outputs).filter(output -> varies(chain, output)).count();
        assertEquals((chain.size() <= 12 ? 7 : 6) + passages + 13 * outputs + given, claims.claims().size());
        assertEquals((chain.size() <= 12 ? 18 : 17) + passages, claims.claims().stream().map(Claim::kind).distinct().count());
        assertEquals(Optional.of("1/2"), claims.review().document());
        assertTrue(claims.review().carried().isPresent() && claims.review().convention().isPresent());
    }

    /** Whether there is a set within which an output isn't the same in every state. */
    private static boolean varies(Chain chain, Output output) {
        return chain.sets().values().stream().anyMatch(set -> set.stream().anyMatch(state ->
                !output.coefficients().get(state).equals(output.coefficients().get(set.get(0)))));
    }

    @Test
    void savedInAnotherFolderItNamesTheModelFromThere() throws Exception {
        Path saved = folder.resolve("claims.yaml");
        Path model = Files.copy(MODELS.resolve("pump-pair.yaml"), folder.resolve("pumps.yaml"));
        assertEquals(0, Run.of("check", "--blank", model.toString(), "--save", saved.toString()).exitCode());
        assertTrue(Files.readString(saved).contains("\nmodel: pumps.yaml\n"));
        assertEquals(List.of(), ClaimsReader.read(saved, Overrides.NONE).claims());
    }
}
