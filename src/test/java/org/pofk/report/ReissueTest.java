package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.KeyFigures;
import org.pofk.chain.Model;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.text.Alphabet;
import org.pofk.text.RefusedException;

/** Reports issued again. */
class ReissueTest {
    private static final LatexLayout LAYOUT = new LatexLayout("report", LatexLayout.Figures.INSIDE);
    private static final Style STYLE = new Style(6, Style.Angles.RADIANS);
    private static final Path ISSUES = Path.of("test-data/issues");

    private static Report report(DerivedModel derived) {
        List<KeyFigures> figures = derived.outputs().stream()
                .map(output -> KeyFigures.of(derived.model().chain(), output)).toList();
        return new Report(derived, figures, CourseCharts.of(derived, figures), List.of(), new Provenance("pofk",
                "pofk report", List.of(derived.model().origin())));
    }

    private static Report report(String issue) throws RefusedException {
        return report(PatternCharts.derived(Pofk.read(ISSUES.resolve(issue + ".yaml"))));
    }

    private static Document document(Report report) {
        return ReportDocument.of(report, Report.Depth.FULL, STYLE, Model.Convention.COLUMNS);
    }

    /** Twice from the start, so that nothing is the same because it is the same object. */
    @Test
    void aModelAgainstItselfHasNoChangeAndNoMark() throws Exception {
        for (String pattern : List.of("pump-pair", "burner-start", "deck-condition", "kiln-campaign")) {
            Path file = Path.of("test-data/models", pattern + ".yaml");
            Report earlier = report(PatternCharts.derived(Pofk.read(file)));
            Document document = document(report(PatternCharts.derived(Pofk.read(file))).since(earlier));
            assertEquals(List.of(), document.changed().stream().map(document.blocks()::get).toList(), pattern);
            String text = TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8).write(document);
            assertTrue(text.contains("Nothing has changed in the input: the files are the same."), pattern);
            assertFalse(text.contains("Results that moved") || text.contains("the formula has"), pattern);
            String names = String.join(", ", earlier.derived().outputs().stream().map(each -> each.output().name()).toList());
            assertTrue(said(document.blocks()).contains(List.of("the formula is the same", names)), pattern);
            assertTrue(said(document.blocks()).contains(List.of("as before", names)), pattern);
        }
    }

    @Test
    void whatIsNotMarkedStoodInTheEarlierReportAndWhatStoodThereIsNotMarked() throws Exception {
        Report earlier = report("booster-station-a");
        Report later = report("booster-station-b");
        List<Block> before = document(earlier.asMadeLike(later)).blocks();
        Document document = document(later.since(earlier));
        Set<Block> old = new HashSet<>(before);
        Set<Block> ofSections = new HashSet<>(section(document.blocks()));
        ofSections.addAll(section(document.blocks(), "Changes since"));
        ofSections.removeAll(old);
        int marked = 0;
        for (int i = 0; i < document.blocks().size(); i++) {
            Block block = document.blocks().get(i);
            boolean isOfSection = ofSections.contains(block);
            if (!isOfSection && !(block instanceof Heading) && !(block instanceof Document.Figure) && !document.isChanged(i)) {
                assertTrue(old.contains(block), block.toString());
            }
            assertFalse(document.isChanged(i) && (block instanceof Heading || isOfSection), block.toString());
            marked += document.isChanged(i) ? 1 : 0;
        }
        assertTrue(marked > 20 && marked < document.blocks().size() - 20, marked + " marks");
    }

    /** The whole of what has changed. */
    private static List<Block> section(List<Block> blocks) {
        return section(blocks, "What has changed since");
    }

    private static List<Block> section(List<Block> blocks, String title) {
        int start = (int) blocks.stream().takeWhile(block -> !(block instanceof Heading heading
                && TextWidth.text(heading.text()).startsWith(title))).count();
        List<Block> section = new ArrayList<>(List.of(blocks.get(start)));
        blocks.subList(start + 1, blocks.size()).stream()
                .takeWhile(block -> !(block instanceof Heading heading && heading.level() <= 2)).forEach(section::add);
        return section;
    }

    /** Its sections stand under other headings, with the same formulas and all that is said of them. */
    @Test
    void anOutputWrittenInAnotherWayIsSaidAndNothingIsMarked() throws Exception {
        String text = Files.readString(Path.of("test-data/models/pump-pair.yaml"));
        List<Report> reports = new ArrayList<>();
        for (String lost : List.of("lost: none", "lost: 1 - both - one")) {
            reports.add(report(PatternCharts.derived(ModelReader.read(Source.ofText("pumps.yaml",
                    text.replace("lost: none", lost)), Optional.empty(), Overrides.NONE))));
        }
        Document document = document(reports.get(1).since(reports.get(0)));
        assertEquals(List.of(), document.changed().stream().map(document.blocks()::get).toList());
        assertTrue(said(section(document.blocks())).contains(List.of("output lost", "none", "1 - both - one")));
    }

    @Test
    void aFileThatIsLaidOutOtherwiseAloneIsSaidToBeThat() throws Exception {
        String text = Files.readString(Path.of("test-data/models/pump-pair.yaml"));
        List<Report> reports = new ArrayList<>();
        for (String written : List.of(text, "# checked\n" + text.replace("0.095", "9.5%"))) {
            reports.add(report(PatternCharts.derived(ModelReader.read(Source.ofText("pumps.yaml", written),
                    Optional.empty(), Overrides.NONE))));
        }
        Document document = document(reports.get(1).since(reports.get(0)));
        assertTrue(said(document.blocks()).contains(List.of("input",
                "nothing has changed: the files differ in wording or layout only")));
        assertTrue(section(document.blocks()).stream().anyMatch(block -> block.equals(new Document.Paragraph(
                "Nothing has changed in the input: the files differ in wording or layout only."))));
    }

    /** The source in the file is that of another number. */
    @Test
    void aValueFromTheCommandLineIsSaidOnTheFirstPageAndBearsNoSourceOfTheFile() throws Exception {
        Overrides overrides = new Overrides(Map.of("f", "1/10"), Optional.of("one up"));
        List<Report> reports = new ArrayList<>();
        for (String issue : List.of("a", "b")) {
            reports.add(report(PatternCharts.derived(ModelReader.read(ISSUES.resolve("booster-station-" + issue + ".yaml"),
                    overrides))));
        }
        Document document = document(reports.get(1).since(reports.get(0)));
        Set<List<String>> said = said(document.blocks());
        assertTrue(said.contains(List.of("parameter f", "1/10, set for this report; the file says 0.035")));
        assertTrue(said.contains(List.of("start", "one up, set for this report; the file says both up")));
        assertTrue(said.contains(List.of("f", "1/10", "a pump fails in a shift",
                "set for this report; the file says 0.035")));
        assertTrue(said.contains(List.of("before", "the earlier file with f = 1/10 and the start one up as well, which the"
                + " command line sets for both")));
        List<Block> modelled = section(document.blocks(), "What was modelled");
        assertFalse(TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8).write(new Document(modelled))
                .contains("shift log"));
    }

    @Test
    void theOtherWayAroundBeforeAndNowChangePlaces() throws Exception {
        Report a = report("booster-station-a");
        Report b = report("booster-station-b");
        Set<List<String>> there = said(section(document(b.since(a)).blocks()));
        Set<List<String>> back = said(section(document(a.since(b)).blocks()));
        Set<List<String>> turned = new HashSet<>();
        for (List<String> line : back) {
            turned.add(turned(line));
        }
        assertEquals(there, turned);
        assertTrue(there.size() > 20, there.size() + " lines");
    }

    private static List<String> turned(List<String> line) {
        List<String> turned = new ArrayList<>(line);
        if (line.size() == 2) {
            String label = line.get(0);
            turned.set(0, label.equals("as before") ? label : label.endsWith("before") ? label.replaceAll("before$", "now")
                    : label.endsWith("now") ? label.replaceAll("now$", "before")
                    : label.endsWith(", new") ? label.replaceAll("new$", "gone") : label.replaceAll("gone$", "new"));
        } else {
            turned.set(1, line.get(2));
            turned.set(2, line.get(1));
        }
        if (line.size() == 4 && !line.get(3).equals("none")) {
            turned.set(3, line.get(3).startsWith("+") ? "−" + line.get(3).substring(1)
                    : line.get(3).startsWith("−") ? "+" + line.get(3).substring(1) : line.get(3));
        }
        return turned;
    }

    /** The rows of tables and the labelled lines; a state that was renamed goes by one name. */
    private static Set<List<String>> said(List<Block> section) {
        Set<List<String>> said = new HashSet<>();
        for (Block block : section) {
            if (block instanceof Table table) {
                table.rows().forEach(row -> said.add(row.stream().map(ReissueTest::plain).toList()));
            } else if (block instanceof Labelled labelled) {
                said.add(List.of(plain(labelled.label()), plain(labelled.text())));
            }
        }
        return said;
    }

    private static String plain(Prose prose) {
        return TextWidth.text(prose).replace(Spelling.NO_BREAK, ' ');
    }

    @Test
    void everyFormatHasItsMark() throws Exception {
        Document document = document(report("booster-station-b").since(report("booster-station-a")));
        String text = TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8).write(document);
        assertTrue(text.lines().filter(line -> line.startsWith("| ")).count() > 50);
        assertTrue(text.lines().allMatch(line -> line.isEmpty() || line.startsWith("| ") || line.startsWith("  ")));
        assertEquals(document.changed().size(), HtmlWriter.write(document).split("class=\"changed\"", -1).length - 1);
        String latex = LatexWriter.article(document, LAYOUT);
        assertTrue(latex.contains("\\begin{pofkchanged}") && latex.contains("\\@namedef{pofkchanged}"));
        assertEquals(latex.split("\\\\begin\\{pofkchanged}", -1).length, latex.split("\\\\end\\{pofkchanged}", -1).length);
        String unmarked = LatexWriter.article(document(report("booster-station-b")), LAYOUT);
        assertFalse(unmarked.contains("pofkchanged"));
    }

    /**
     * Blocks and sections taken out, put in and changed at random: under each heading what is left of the earlier blocks
     * is never marked, in any order; under a new one, what is left of the first section that is gone.
     */
    @Test
    void theMarksAreThoseOutsideALongestCommonSubsequenceUnderEachHeading() {
        Random random = new Random(20311);
        int marks = 0;
        int taken = 0;
        for (int round = 0; round < 600; round++) {
            int level = 2 + round % 2;
            Map<String, List<Integer>> before = sections(random);
            Map<String, List<Integer>> after = sections(random);
            List<String> gone = new ArrayList<>(before.keySet());
            gone.removeAll(after.keySet());
            Document marked = DocumentDifference.marked(document(before, level), document(after, level));
            int place = level - 1;
            for (String heading : after.keySet()) {
                boolean isTaken = !before.containsKey(heading) && !gone.isEmpty();
                List<Integer> was = isTaken ? before.get(gone.remove(0)) : before.getOrDefault(heading, List.of());
                List<Integer> is = after.get(heading);
                assertFalse(marked.isChanged(place), "a heading is marked");
                int first = place + 1;
                List<Integer> kept = IntStream.range(0, is.size()).filter(i -> !marked.isChanged(first + i))
                        .mapToObj(is::get).toList();
                assertTrue(isWithin(kept, was), before + " " + after + " " + heading + " " + kept);
                assertEquals(longest(was, is), kept.size(), before + " " + after + " " + heading);
                marks += is.size() - kept.size();
                taken += isTaken ? 1 : 0;
                place = first + is.size();
            }
        }
        assertTrue(marks > 600 && taken > 100, marks + " marks, " + taken + " sections under another heading");
    }

    /** Some of four sections in their order, none of them empty. */
    private static Map<String, List<Integer>> sections(Random random) {
        Map<String, List<Integer>> sections = new LinkedHashMap<>();
        for (String heading : List.of("a", "b", "c", "d")) {
            if (random.nextInt(3) > 0) {
                sections.put(heading, random.ints(1 + random.nextInt(7), 0, 4).boxed().toList());
            }
        }
        return sections;
    }

    /** With the sections at a level, below one heading of each level above. */
    private static Document document(Map<String, List<Integer>> sections, int level) {
        List<Block> blocks = new ArrayList<>();
        IntStream.range(1, level).forEach(above -> blocks.add(new Heading(above, "above")));
        sections.forEach((heading, numbers) -> {
            blocks.add(new Heading(level, heading));
            numbers.forEach(i -> blocks.add(new Document.Paragraph("paragraph " + i)));
        });
        return new Document(blocks);
    }

    private static boolean isWithin(List<Integer> part, List<Integer> whole) {
        int found = 0;
        for (int number : whole) {
            found += found < part.size() && part.get(found) == number ? 1 : 0;
        }
        return found == part.size();
    }

    /** By trying every part of the shorter one. */
    private static int longest(List<Integer> one, List<Integer> other) {
        int longest = 0;
        for (int chosen = 0; chosen < 1 << one.size(); chosen++) {
            int which = chosen;
            List<Integer> part = IntStream.range(0, one.size()).filter(i -> (which >> i & 1) == 1).mapToObj(one::get)
                    .toList();
            longest = isWithin(part, other) ? Math.max(longest, part.size()) : longest;
        }
        return longest;
    }
}
