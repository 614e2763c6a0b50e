package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FormatsTest {
    @TempDir
    private Path folder;

    @ParameterizedTest
    @ValueSource(strings = {"derive test-data/models/pump-pair.yaml", "inspect test-data/models/pump-pair.yaml",
        "simulate test-data/models/pump-pair.yaml --runs 100", "check test-data/claims/pump-pair.yaml",
        "when test-data/models/pump-pair.yaml --of lost --at-least 0.005",
        "passage test-data/models/pump-pair.yaml --into none",
        "total test-data/costs/burst-error-link.yaml --to 0,7",
        "derive test-data/models/burst-error-link.yaml --start each"})
    void everyCommandThatShowsADocumentWritesItInEveryFormat(String command) {
        Run page = run(command, "--as", "html");
        assertTrue(page.answer().startsWith("<!DOCTYPE html>") && page.answer().endsWith("</html>\n"), page.notes());
        Run article = run(command, "--as", "latex");
        assertTrue(article.answer().startsWith("\\documentclass"), article.notes());
        Run fragment = run(command, "--as", "latex", "--fragment");
        assertTrue(fragment.answer().startsWith("% ") && !fragment.answer().contains("\\documentclass"));
        assertEquals(page.exitCode(), article.exitCode());
        Run table = run(command, "--as", "csv");
        List<String> lines = table.answer().lines().toList();
        assertTrue(lines.size() > 1, table.notes());
        assertEquals(Set.of(fields(lines.get(0))), lines.stream().map(FormatsTest::fields).collect(Collectors.toSet()));
        assertEquals(page.exitCode(), table.exitCode());
    }

    /** How many there are in a record whose quoted fields hold no quotes. */
    private static int fields(String line) {
        return line.replaceAll("\"[^\"]*\"", "").split(",", -1).length;
    }

    @ParameterizedTest
    @ValueSource(strings = {"pump-pair", "level-controller", "valve-rotation", "relined-main"})
    void theTableHoldsTheSameValuesAsTheResult(String pattern) throws IOException {
        String command = "derive test-data/models/" + pattern + ".yaml --at 0..9,60";
        List<String> inResult = new ArrayList<>();
        for (JsonNode output : new ObjectMapper().readTree(run(command, "--as", "json").answer()).get("outputs")) {
            output.get("values").forEach(value -> inResult.add(output.get("name").asText() + "," + value.get("k")
                    + "," + value.get("exact").asText() + "," + value.get("decimal").asText()));
        }
        List<String> inTable = run(command, "--as", "csv").answer().lines().skip(1)
                .map(line -> pattern.equals("relined-main") ? line.replaceFirst("(,[0-9]+),[0-9]+,", "$1,") : line)
                .toList();
        assertTrue(inTable.size() >= 11);
        assertEquals(inResult, inTable);
    }

    @Test
    void withoutStepsTheTableIsOfTheFirstOnesAndAskedStepsStay() {
        assertEquals(1 + 21, run("derive test-data/models/pump-pair.yaml", "--of", "lost", "--as", "csv").answer()
                .lines().count());
        assertEquals(1 + 1, run("derive test-data/models/pump-pair.yaml", "--of", "lost", "--as", "csv", "--at", "7")
                .answer().lines().count());
    }

    private static Run run(String command, String... options) {
        List<String> arguments = new ArrayList<>(List.of(command.split(" ")));
        arguments.addAll(List.of(options));
        return Run.of(arguments);
    }

    @Test
    void theNameOfTheFileTellsTheFormat() throws IOException {
        Path page = folder.resolve("pumps.html");
        assertEquals(0, run("derive test-data/models/pump-pair.yaml", "--save", page.toString()).exitCode());
        assertTrue(Files.readString(page).startsWith("<!DOCTYPE html>"));
        Path article = folder.resolve("pumps.tex");
        assertEquals(0, run("derive test-data/models/pump-pair.yaml", "--save", article.toString()).exitCode());
        assertTrue(Files.readString(article).startsWith("\\documentclass"));
    }

    @Test
    void whatLatexCannotSetIsRefusedAndNothingIsWritten() throws IOException {
        Path model = Files.writeString(folder.resolve("model.yaml"),
                "pofk: 1\nstates: [泵, b]\nstart: 泵\ntransitions:\n  泵: {b: 1/2, 泵: rest}\n  b: {b: 1}\n");
        Path article = folder.resolve("model.tex");
        Run run = Run.of("derive", model.toString(), "--save", article.toString());
        assertEquals(3, run.exitCode(), run.notes());
        assertTrue(run.notes().contains("U+6CF5"), run.notes());
        assertTrue(Files.notExists(article));
        assertTrue(Run.of("derive", model.toString(), "--as", "html").answer().contains("<bdi>泵</bdi>"));
    }
}
