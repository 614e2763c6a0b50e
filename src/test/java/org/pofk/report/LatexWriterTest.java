package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.answer.DerivedModel;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.page.Installed;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Excerpt;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Relation;
import org.pofk.report.Document.Table;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class LatexWriterTest {
    private static final LatexLayout INSIDE = new LatexLayout("a test", LatexLayout.Figures.INSIDE);
    private static final Pattern OVERFULL = Pattern.compile("Overfull .hbox \\(([0-9]+)\\.");
    private static final String HARD = "50% & rising_#1 {x} \\~^$ \"θ\" Überlauf ⟨α⟩ --flag [1] <<a>>";

    @TempDir
    private Path folder;

    private static Formula formula(String text) throws RefusedException {
        return FormulaParser.parse(text, new Position("test", 1, 1)).formula();
    }

    private static Document everything() throws RefusedException {
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < 120; i++) {
            rows.add(List.of(HARD, i + ".25", "-1/7", "a long remark on how this came to be, row " + i));
        }
        Prose name = Prose.name(HARD);
        return new Document(List.of(new Heading(1, name), new Heading(3, Prose.of("x").andName(HARD)),
                new Paragraph(Prose.of("Up to 3 % of ").and(name).and(" as ").andFormula(formula("1/2 - 'a_b'^k"))),
                new Labelled(name, name), new Labelled("long run", "20/2447"),
                new Items(List.of(name, Prose.of("[2] second"))),
                new Display(Prose.of("Y(z)"), Relation.EQUAL, formula("z*(" + "0.0025*z^9 + ".repeat(20) + "1)/((z-1)*("
                        + "0.25*z + ".repeat(30) + "2))"), Prose.of("k ≥ 2")),
                new Display(name.and("(k)"), Relation.ROUNDED, formula("0.5^k + ".repeat(60) + "1")),
                new Display(Prose.EMPTY, Relation.EQUAL, formula("9".repeat(300) + " + {1 for k = 0; 2 for k >= 1}")),
                new Excerpt("  is: '0.5^k' # " + HARD, 6, 13), new Excerpt("x".repeat(300), 100, 200),
                Table.ofText("numbers", List.of("name", "x", "y", "remark"), rows)));
    }

    private void assertCompiles(Document document) throws RefusedException, IOException, InterruptedException {
        Installed.require("pdflatex", "documents as LaTeX aren't compiled");
        Files.writeString(folder.resolve("a.tex"), LatexWriter.article(document, INSIDE), StandardCharsets.UTF_8);
        String log = "";
        for (int run = 0; run < 2; run++) {
            Process process = new ProcessBuilder("pdflatex", "-interaction=nonstopmode", "-halt-on-error", "a.tex")
                    .directory(folder.toFile()).redirectErrorStream(true).start();
            log = new String(process.getInputStream().readAllBytes(), StandardCharsets.ISO_8859_1);
            assertEquals(0, process.waitFor(), log);
        }
        assertTrue(OVERFULL.matcher(log).results().allMatch(found -> Integer.parseInt(found.group(1)) < 5), log);
        assertFalse(log.contains("undefined"), log);
    }

    @Test
    void everyBlockWithAnyNameCompiles() throws Exception {
        assertCompiles(everything());
    }

    @Test
    void everyBlockCompilesWithARuleInTheMargin() throws Exception {
        Document document = everything();
        assertCompiles(document.withChanged(IntStream.range(0, document.blocks().size())
                .filter(i -> !(document.blocks().get(i) instanceof Heading)).boxed().collect(Collectors.toSet())));
    }

    @Test
    void figuresCompileWithAnyName() throws Exception {
        List<Document.Block> figures = new ArrayList<>();
        for (DerivedModel each : List.of(PatternCharts.hard(), PatternCharts.derived("tandem-presses"),
                PatternCharts.derived("standby-trio"), PatternCharts.derived("level-controller"),
                PatternCharts.derived("storage-cavern"))) {
            PatternCharts.charts(each).forEach(chart -> figures.add(new Document.Figure(chart.title(), chart)));
        }
        assertEquals(15, figures.size());
        assertCompiles(new Document(figures));
        assertTrue(LatexWriter.fragment(new Document(figures), INSIDE).startsWith("% To be put into a document by \\input; needs"
                + " \\usepackage[T1]{fontenc} and the packages amsmath, array, booktabs, longtable, tikz.\n"));
    }

    @Test
    void aPartForAnotherDocumentSaysWhatItNeeds() throws RefusedException {
        String part = LatexWriter.fragment(everything(), INSIDE);
        assertTrue(part.startsWith("% To be put into a document by \\input; needs \\usepackage[T1]{fontenc} and the"
                + " packages amsmath, array, booktabs, longtable.\n"), part);
        assertFalse(part.contains("\\begin{document}"));
        assertTrue(LatexWriter.article(everything(), INSIDE).contains(part.substring(part.indexOf('\n') + 1)));
        assertEquals(part, LatexWriter.fragment(everything(), INSIDE));
    }

    @Test
    void whatCannotBeSetIsRefusedWithItsCharacters() {
        Document document = new Document(List.of(new Paragraph(Prose.name("泵一 and 泵\u0007"))));
        assertEquals("LaTeX: these characters can't be set: '泵' U+6CF5, '一' U+4E00, U+0007; rename what holds them, or"
                + " write another format", assertThrows(RefusedException.class, () -> LatexWriter.article(document, INSIDE))
                .getMessage());
    }
}
