package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.page.Installed;

/** LaTeX with its figures beside it: for pdflatex, and for pandoc, which makes a document of a word processor of it. */
class FigureFilesTest {
    private static final Pattern DISPLAY = Pattern.compile("(?s)\\\\begin\\{align\\*}.*?\\\\tag\\{(\\d+)}.*?\\\\end\\{align\\*}");
    private static final Pattern NUMBER = Pattern.compile("[0-9]+(?:\\.[0-9]+)?");

    @TempDir
    private Path folder;

    private Path report(String pattern, String depth, String... asked) {
        Installed.require("pdflatex", "figures of LaTeX aren't made files");
        Path article = folder.resolve("A report_1.tex");
        Run run = Run.of(Stream.concat(Stream.of("report", "test-data/models/" + pattern + ".yaml", "--show", depth,
                "--save", article.toString(), "--figures", "files"), Stream.of(asked)).toList());
        assertEquals(0, run.exitCode(), run.notes());
        return article;
    }

    private Set<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).collect(Collectors.toSet());
        }
    }

    private String run(String... command) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true).start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(0, process.waitFor(), said);
        return said;
    }

    @Test
    void everyFigureIsThereTwiceAndLatexTakesThePdf() throws Exception {
        Path article = report("pump-pair", "brief");
        String latex = Files.readString(article);
        long figures = Pattern.compile("\\\\includegraphics").matcher(latex).results().count();
        assertTrue(figures > 0);
        assertEquals(1 + 2 * figures, names().size());
        assertFalse(latex.contains("tikzpicture"));
        String said = run("pdflatex", "-interaction=nonstopmode", "-halt-on-error", article.getFileName().toString());
        for (int i = 1; i <= figures; i++) {
            assertTrue(names().containsAll(Set.of("a-report-1-figure-" + i + ".png", "a-report-1-figure-" + i + ".pdf")));
            assertTrue(said.contains("<./a-report-1-figure-" + i + ".pdf>"), said);
        }
        Run again = Run.of("report", "test-data/models/pump-pair.yaml", "--save", folder.resolve("a-report-1.tex")
                .toString(), "--figures", "files");
        assertEquals(2, again.exitCode());
        assertTrue(again.notes().contains("a-report-1-figure-1.png' exists"), again.notes());
    }

    @ParameterizedTest
    @CsvSource({"pump-pair, ''", "tandem-presses, ''",
        "pump-pair, --of none --into none --at-most 0.01 --percentile 90% --given running --total none",
        "deck-condition, --into 5 --given-never 4", "../scheduled/tested-valve, --of stuck"})
    void aConverterMakesEveryEquationOneThatCanBeEditedWithItsNumberAndTakesTheFiguresAlong(String pattern, String asked)
            throws Exception {
        Installed.require("pandoc", "LaTeX isn't made a document of a word processor");
        Path article = report(pattern, asked.isEmpty() ? "full" : "brief", asked.isEmpty() ? new String[0] : asked.split(" "));
        String latex = Files.readString(article);
        assertEquals("", run("pandoc", article.getFileName().toString(), "-o", "report.docx"));
        run("pandoc", "report.docx", "-t", "json", "-o", "report.json", "--extract-media=media");
        String read = Files.readString(folder.resolve("report.json"));
        List<MatchResult> displays = DISPLAY.matcher(latex).results().toList();
        assertFalse(displays.isEmpty());
        assertEquals(displays.size(), count(read, "\"DisplayMath\""));
        for (MatchResult display : displays) {
            assertTrue(read.contains("(" + display.group(1) + ")"), display.group());
            NUMBER.matcher(display.group().replaceAll("\\\\(tag|label)\\{[^}]*}", "")).results().forEach(number ->
                    assertTrue(read.contains(number.group()), number.group() + " of " + display.group()));
        }
        assertEquals(count(latex, "\\includegraphics"), count(read, "\"Image\""));
        assertEquals(count(latex, "\\endhead"), count(read, "\"Table\""));
    }

    private static int count(String text, String part) {
        return text.split(Pattern.quote(part), -1).length - 1;
    }

    @Test
    void figuresInFilesNeedAFileTheyAreBeside() {
        for (List<String> where : List.of(List.of("--as", "latex"), List.of("--save", folder + "/a.html"))) {
            Run run = Run.of(Stream.concat(Stream.of("report", "test-data/models/pump-pair.yaml", "--figures", "files"),
                    where.stream()).toList());
            assertEquals(2, run.exitCode());
            assertTrue(run.notes().contains("--figures files stand beside a LaTeX document"), run.notes());
        }
    }
}
