package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
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
        "passage test-data/models/pump-pair.yaml --into none"})
    void everyCommandThatShowsADocumentWritesItInEveryFormat(String command) {
        Run page = run(command, "--as", "html");
        assertTrue(page.answer().startsWith("<!DOCTYPE html>") && page.answer().endsWith("</html>\n"), page.notes());
        Run article = run(command, "--as", "latex");
        assertTrue(article.answer().startsWith("\\documentclass"), article.notes());
        Run fragment = run(command, "--as", "latex", "--fragment");
        assertTrue(fragment.answer().startsWith("% ") && !fragment.answer().contains("\\documentclass"));
        assertEquals(page.exitCode(), article.exitCode());
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
