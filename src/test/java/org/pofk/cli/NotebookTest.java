package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.page.Installed;

/**
 * Notebooks written are the ones kept in {@code notebooks-export}, follow nbformat, run, and fail where one number of
 * them is changed. {@code mvn test -Dtest=NotebookTest -Dpofk.notebooks=write} writes the ones kept again.
 */
class NotebookTest {
    private static final Path KEPT = Path.of("notebooks-export");
    private static final Path DRIVER = Path.of("src", "test", "resources", "notebook", "run_all.py");
    private static final boolean WRITES = "write".equals(System.getProperty("pofk.notebooks"));
    /** A hundred states: long to derive, and a third of a megabyte. */
    private static final String LARGE = "cable-route";

    private static final String AWKWARD = """
            pofk: 1
            title: "1. <b>$x$</b> `code` [a](b) | 100% \\\\(y\\\\)"
            step: 1 *shift*
            states: ["a|b", "$c$", "'\\"\\\\n", "_d_"]
            start: "a|b"
            transitions:
              "a|b": {"$c$": 1/3, "_d_": rest}
              "$c$": {"'\\"\\\\n": 1}
              "'\\"\\\\n": {"a|b": 1/2, "_d_": rest}
              "_d_": stays
            """;

    @TempDir
    private Path folder;

    static List<String> patterns() {
        return Patterns.names().stream().filter(name -> !name.equals(LARGE)).toList();
    }

    private static String written(String... arguments) {
        List<String> all = new ArrayList<>(List.of("derive"));
        all.addAll(List.of(arguments));
        all.addAll(List.of("--as", "notebook"));
        Run run = Run.of(all);
        assertEquals(0, run.exitCode(), run.notes());
        return run.answer();
    }

    private static String model(String pattern) {
        return "test-data/models/" + pattern + ".yaml";
    }

    private static NotebookFile kept(String pattern) throws IOException {
        return NotebookFile.of(Files.readString(KEPT.resolve(pattern + ".ipynb")));
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void everyPatternIsWrittenAsItIsKept(String pattern) throws IOException {
        String written = written(model(pattern));
        if (WRITES) {
            Files.writeString(KEPT.resolve(pattern + ".ipynb"), written);
        }
        assertEquals(Files.readString(KEPT.resolve(pattern + ".ipynb")), written);
        NotebookFile.of(written).assertFollowsTheFormat();
    }

    @Test
    void noneIsKeptThatHasNoPattern() throws IOException {
        try (Stream<Path> files = Files.list(KEPT)) {
            assertEquals(patterns().stream().sorted().toList(), files.map(file -> file.getFileName().toString())
                    .filter(name -> name.endsWith(".ipynb")).map(name -> name.replace(".ipynb", "")).sorted().toList());
        }
    }

    @Test
    void everyNotebookRuns() throws Exception {
        Map<String, String> programs = new LinkedHashMap<>();
        for (String pattern : patterns()) {
            programs.put(pattern, kept(pattern).program());
        }
        Path awkward = Files.writeString(folder.resolve("awkward.yaml"), AWKWARD);
        List<List<String>> others = List.of(List.of(awkward.toString()),
                List.of(model("tandem-presses"), "--convention", "rows"),
                List.of("test-data/published/fibonacci.yaml"), List.of("test-data/published/n-times-2-power.yaml"),
                List.of("test-data/published/gaussian-one-plus-i.yaml"), List.of("test-data/published/cube-walk.yaml"));
        for (List<String> arguments : others) {
            NotebookFile notebook = NotebookFile.of(written(arguments.toArray(String[]::new)));
            notebook.assertFollowsTheFormat();
            programs.put("other" + programs.size(), notebook.program());
        }
        List<String> outcomes = run(programs);
        assertEquals(patterns().size() + others.size(), outcomes.size());
        assertEquals(List.of(), outcomes.stream().filter(line -> !line.contains(" ended ")).toList());
    }

    @Test
    void oneNumberChangedAndTheRunFails() throws Exception {
        Map<String, String> programs = new LinkedHashMap<>();
        for (String pattern : patterns()) {
            String program = kept(pattern).program();
            for (Tampering tampering : Tampering.values()) {
                tampering.of(program).forEach(changed -> programs.put(pattern + "-" + tampering, changed));
            }
            Tampering.ofSumsKept(program).forEach(changed -> programs.put(pattern + "-sums-kept", changed));
        }
        List<String> outcomes = run(programs);
        assertTrue(outcomes.size() >= 100, () -> outcomes.size() + " tamperings");
        assertEquals(List.of(), outcomes.stream().filter(line -> !line.contains(" failed AssertionError ")).toList());
    }

    private static String report(String pattern, String depth, String format) {
        Run run = Run.of(List.of("report", model(pattern), "--show", depth, "--as", format));
        assertEquals(0, run.exitCode(), run.notes());
        return run.answer();
    }

    /** Lines that are underlined as sections are. */
    private static List<String> sections(String text) {
        List<String> lines = text.lines().toList();
        return IntStream.range(1, lines.size()).filter(i -> lines.get(i).matches("─+"))
                .mapToObj(i -> lines.get(i - 1)).toList();
    }

    @Test
    void theNotebookOfAReportHasItsSectionsAndRuns() throws Exception {
        Map<String, String> programs = new LinkedHashMap<>();
        for (String pattern : List.of("relined-main", "valve-rotation")) {
            for (String depth : List.of("brief", "full")) {
                NotebookFile notebook = NotebookFile.of(report(pattern, depth, "notebook"));
                notebook.assertFollowsTheFormat();
                List<String> told = notebook.sources("markdown").stream().flatMap(String::lines)
                        .filter(line -> line.startsWith("## ")).map(line -> line.substring(3))
                        .filter(line -> !line.equals("How the formulas are proved again")).toList();
                assertEquals(sections(report(pattern, depth, "text")), told);
                programs.put(pattern + "-" + depth, notebook.program());
            }
        }
        assertEquals(List.of(), run(programs).stream().filter(line -> !line.contains(" ended ")).toList());
        assertEquals(programs.get("relined-main-brief"), programs.get("relined-main-full"));
    }

    @Test
    void onlyTheNotebookOfAFullReportTellsTheWayAndTheChecks() {
        String brief = report("relined-main", "brief", "notebook");
        String full = report("relined-main", "full", "notebook");
        for (String told : List.of("How it was checked", "second opinion", "From Y(z) to a formula in k")) {
            assertTrue(full.contains(told) && !brief.contains(told), told);
        }
        for (String told : List.of("Why it holds for every k", "to be repeated by hand")) {
            assertTrue(full.contains(told) && brief.contains(told), told);
        }
    }

    /** One line for each program: its name, whether it ended or failed, and the error. */
    private List<String> run(Map<String, String> programs) throws IOException, InterruptedException {
        Installed.require("python3", "notebooks aren't run");
        List<String> command = new ArrayList<>(List.of("python3", DRIVER.toAbsolutePath().toString()));
        for (Map.Entry<String, String> each : programs.entrySet()) {
            Files.writeString(folder.resolve(each.getKey() + ".py"), each.getValue());
            command.add(each.getKey() + ".py");
        }
        Process process = new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true).start();
        List<String> lines = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).lines().toList();
        assertEquals(0, process.waitFor(), () -> String.join("\n", lines));
        assertEquals(programs.size(), lines.size(), () -> String.join("\n", lines));
        return lines;
    }

    @Test
    void jupyterRunsIt() throws Exception {
        Installed.require("jupyter-nbconvert", "no notebook is run as one");
        String notebook = Files.readString(KEPT.resolve("kiln-campaign.ipynb"));
        assertEquals(0, converted("right", notebook));
        assertTrue(Files.readString(folder.resolve("right-executed.ipynb")).contains("image/svg+xml"));
    }

    private int converted(String name, String notebook) throws IOException, InterruptedException {
        Files.writeString(folder.resolve(name + ".ipynb"), notebook);
        Process process = new ProcessBuilder("jupyter-nbconvert", "--to", "notebook", "--execute", "--output",
                name + "-executed.ipynb", name + ".ipynb").directory(folder.toFile()).redirectErrorStream(true).start();
        process.getInputStream().readAllBytes();
        return process.waitFor();
    }

    @Test
    void onlyDerivationsOfWhatWasAskedForAreNotebooks() throws IOException {
        Run inspected = Run.of("inspect", model("pump-pair"), "--as", "notebook");
        assertEquals(2, inspected.exitCode());
        assertEquals("", inspected.answer());
        Path ring = Files.writeString(folder.resolve("ring.yaml"), "pofk: 1\nstep: 1 hour\nstart: s0\ntransitions:\n"
                + IntStream.range(0, 13).mapToObj(i -> "  s" + i + ": {s" + (i + 1) % 13 + ": 1}\n")
                .collect(Collectors.joining()));
        Run unasked = Run.of("derive", ring.toString(), "--as", "notebook");
        assertEquals(2, unasked.exitCode(), unasked.notes());
        assertTrue(unasked.notes().contains("--of"), unasked.notes());
    }

    @Test
    void whatANameHoldsIsNotObeyed() throws IOException {
        Path awkward = Files.writeString(folder.resolve("awkward.yaml"), AWKWARD);
        String prose = String.join("\n", NotebookFile.of(written(awkward.toString())).sources("markdown"));
        assertTrue(prose.startsWith("# 1&#46; &#60;b&#62;<span>&#36;</span>x<span>&#36;</span>"), prose);
        for (String obeyed : List.of("<b>", "`", "[a]", "a|b", "$c$", "\\(y", "_d_", "*shift*")) {
            assertTrue(!prose.contains(obeyed), obeyed);
        }
    }
}
