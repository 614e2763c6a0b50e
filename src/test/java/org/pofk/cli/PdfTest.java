package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.page.Installed;

/** PDFs by way of the machine's pdflatex. */
class PdfTest {
    private static final String PUMPS = "test-data/models/pump-pair.yaml";

    @TempDir
    private Path folder;

    private static Pdflatex pdflatex() {
        Installed.require("pdflatex", "PDFs aren't made and looked at");
        return Pdflatex.installed().orElseThrow();
    }

    @Test
    void aPdfIsSavedWholeAndIsTheSameTwice() throws IOException {
        pdflatex();
        Path first = folder.resolve("a.pdf");
        Path second = folder.resolve("b.pdf");
        for (Path file : List.of(first, second)) {
            Run run = Run.of("derive", PUMPS, "--of", "lost", "--save", file.toString());
            assertEquals(0, run.exitCode(), run.notes());
        }
        assertTrue(Files.readString(first, StandardCharsets.ISO_8859_1).startsWith("%PDF-"));
        assertTrue(Files.readString(first, StandardCharsets.ISO_8859_1).contains("/Title <FEFF"));
        assertArrayEquals(Files.readAllBytes(first), Files.readAllBytes(second));
        try (Stream<Path> files = Files.list(folder)) {
            assertEquals(2, files.count());
        }
    }

    @Test
    void anArticleThatDoesNotCompileIsAFailureToWriteInOneSentence() {
        Pdflatex pdflatex = pdflatex();
        WritingException wrong = assertThrows(WritingException.class, () -> pdflatex.pdf(
                "\\documentclass{article}\n\\begin{document}\n\\nosuchcommand\n\\end{document}\n"));
        assertEquals("pdflatex made no PDF: Undefined control sequence. (line 3)\nNothing is written; --save FILE.tex"
                + " writes the LaTeX itself", wrong.getMessage());
        WritingException missing = assertThrows(WritingException.class, () -> pdflatex.pdf(
                "\\documentclass{article}\n\\usepackage{nosuchpackage}\n\\begin{document}\nx\n\\end{document}\n"));
        assertTrue(missing.getMessage().contains("`nosuchpackage.sty' not found"), missing.getMessage());
        assertTrue(missing.getMessage().contains("has to be installed"), missing.getMessage());
    }

    @Test
    void anArticleRunsNoOtherProgramAndWritesNowhereElse() throws IOException {
        Pdflatex pdflatex = pdflatex();
        Path mark = folder.resolve("mark");
        String article = "\\documentclass{article}\n\\begin{document}\nx\\immediate\\write18{touch %s}%s\n\\end{document}\n";
        assertTrue(written(pdflatex, String.format(article, mark, "")));
        assertTrue(!written(pdflatex, String.format(article, mark, "\\newwrite\\w\\immediate\\openout\\w=" + mark + " ")));
        assertTrue(Files.notExists(mark));
    }

    private static boolean written(Pdflatex pdflatex, String article) {
        try {
            return pdflatex.pdf(article).length > 0;
        } catch (WritingException refused) {
            return false;
        }
    }

    @Test
    void aPdfIsForAFile() {
        Run run = Run.of("derive", PUMPS, "--as", "pdf");
        assertEquals(2, run.exitCode());
        assertEquals("pofk: a PDF goes to a file: --save FILE.pdf\n", run.notes());
    }

    @Test
    void onlyWhatCanBeRunIsFound() throws IOException {
        assertEquals(Optional.empty(), Pdflatex.among(""));
        Files.writeString(folder.resolve("pdflatex"), "no program");
        assertEquals(Optional.empty(), Pdflatex.among(folder.toString()));
    }

    /** In a process of its own, whose path holds no programs. */
    @Test
    @EnabledOnOs(OS.LINUX)
    void withoutPdflatexTheArticleIsWrittenAndWhatToRunIsSaid() throws Exception {
        ProcessBuilder builder = new ProcessBuilder(Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp", System.getProperty("java.class.path"), "org.pofk.cli.Main", "derive", PUMPS, "--of", "lost",
                "--save", folder.resolve("pumps.pdf").toString()).redirectErrorStream(true);
        builder.environment().put("PATH", folder.toString());
        Process process = builder.start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(5, process.waitFor(), said);
        Path article = folder.resolve("pumps.tex");
        assertEquals("written: " + article + "\npofk: pdflatex isn't installed, so there is no PDF; the article for it is '"
                + article + "'. Where it is installed:  pdflatex pumps.tex  , twice\n", said);
        Path same = Files.createDirectory(folder.resolve("same")).resolve("pumps.tex");
        Run.of("derive", PUMPS, "--of", "lost", "--save", same.toString());
        assertEquals(Files.readString(same), Files.readString(article));
        assertTrue(Files.notExists(folder.resolve("pumps.pdf")));
    }
}
