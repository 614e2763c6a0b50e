package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Items;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Relation;
import org.pofk.report.Document.Table;
import org.pofk.text.Alphabet;
import org.pofk.text.Columns;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class TextWriterTest {
    private static final TextWriter UNICODE = TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8);
    private static final TextWriter PLAIN = TextWriter.of(Alphabet.ASCII, StandardCharsets.US_ASCII);

    private static Formula formula(String text) throws RefusedException {
        return FormulaParser.parse(text, new Position("test", 1, 1)).formula();
    }

    private static String written(TextWriter writer, Block... blocks) {
        return writer.write(new Document(List.of(blocks)));
    }

    private static Document pumps() throws RefusedException {
        return new Document(List.of(
                new Heading(1, Prose.of("Output ").andName("both down")),
                new Paragraph(Prose.of("The output ").andName("both down").and(" settles at ")
                        .andFormula(formula("20/2447"))
                        .and("; its formula is right to 6 places — for every k ≥ 0 — and its modes decay as ")
                        .andFormula(formula("sqrt(3)*0.4508^k - 5*cos(2 pi k/3)")).and(".")),
                new Labelled("long run", Prose.formula(formula("20/2447")).and(" ≈ 0.00817327")),
                new Labelled("holds", "for every k from 0 on, proved by comparing the first 6 steps with exact powers"),
                new Labelled("a label that is far too long for its column", "text"),
                new Display(Prose.of("p(k)"), Relation.ROUNDED, formula("0.008176 - 0.01726*0.4508^k"
                        + " + 0.009084*0.2317^k - 0.01726*0.1508^k + 0.00984*0.117^k"), Prose.of("k ≥ 2")),
                new Items(List.of(Prose.of("short"), Prose.of("an item that is so long that it has to go on in a second"
                        + " line, which begins below its first word"))),
                Table.ofText("Values", List.of("k", "exact", "decimal", "remark"), List.of(
                        List.of("0", "0", "0", "start"), List.of("1", "20/241", "0.00095", ""),
                        List.of("10", "7/8", "7.281e-4", "rounded"), List.of("100", "1/3", "12.5", "—"))),
                new Heading(2, "Checks")));
    }

    @Test
    void documentsReadWellInEightyColumns() throws RefusedException {
        assertEquals("""
                Output both down
                ════════════════
                The output both down settles at 20/2447; its formula is right to 6 places — for
                every k ≥ 0 — and its modes decay as √3·0.4508^k − 5·cos(2π·k/3).

                  long run  20/2447 ≈ 0.00817327
                  holds     for every k from 0 on, proved by comparing the first 6 steps with
                            exact powers
                  a label that is far too long for its column
                            text

                  p(k) ≈ 0.008176 − 0.01726·0.4508^k + 0.009084·0.2317^k − 0.01726·0.1508^k
                         + 0.00984·0.117^k    k ≥ 2

                  • short
                  • an item that is so long that it has to go on in a second line, which begins
                    below its first word

                Values
                    k   exact    decimal  remark
                  ───  ──────  ─────────  ───────
                    0       0   0         start
                    1  20/241   0.00095
                   10     7/8   7.281e-4  rounded
                  100     1/3  12.5       —

                Checks
                ──────
                """, UNICODE.write(pumps()));
    }

    @Test
    void plainDocumentsSayTheSameInAscii() throws RefusedException {
        assertEquals("""
                Output both down
                ================
                The output both down settles at 20/2447; its formula is right to 6 places -- for
                every k >= 0 -- and its modes decay as sqrt(3)*0.4508^k - 5*cos(2*pi*k/3).

                  long run  20/2447 ~ 0.00817327
                  holds     for every k from 0 on, proved by comparing the first 6 steps with
                            exact powers
                  a label that is far too long for its column
                            text

                  p(k) ~ 0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k - 0.01726*0.1508^k
                         + 0.00984*0.117^k    k >= 2

                  * short
                  * an item that is so long that it has to go on in a second line, which begins
                    below its first word

                Values
                    k   exact    decimal  remark
                  ---  ------  ---------  -------
                    0       0   0         start
                    1  20/241   0.00095
                   10     7/8   7.281e-4  rounded
                  100     1/3  12.5       --

                Checks
                ------
                """, PLAIN.write(pumps()));
    }

    @Test
    void namesStayAsTheirAuthorsWroteThem() {
        Prose prose = Prose.of("λ → ").andName("λ × Überlauf — α").and(" − π");
        assertEquals("lambda -> λ × Überlauf — α - pi\n",
                written(TextWriter.of(Alphabet.ASCII, StandardCharsets.UTF_8), new Paragraph(prose)));
        assertEquals("lambda -> \\u{3bb} \u00d7 \u00dcberlauf \\u{2014} \\u{3b1} - pi\n",
                written(TextWriter.of(Alphabet.ASCII, StandardCharsets.ISO_8859_1), new Paragraph(prose)));
        assertTrue(StandardCharsets.US_ASCII.newEncoder().canEncode(written(PLAIN, new Paragraph(prose))));
    }

    @Test
    void namesCannotCommandTheScreen() {
        assertEquals("a\\u{1b}[31mb\\u{202e}c\\u{7}\n",
                written(UNICODE, new Paragraph(Prose.name("a\u001b[31mb\u202ec\u0007"))));
        assertEquals("a b\n", written(UNICODE, new Paragraph(Prose.name("a\nb"))));
        assertEquals("'a\\u{1b}'\n", written(UNICODE, new Paragraph(Prose.formula(new Formula.Symbol("a\u001b")))));
    }

    @Test
    void namesAndFormulasBreakOnlyWhereTheyMay() throws RefusedException {
        TextWriter narrow = new TextWriter(Alphabet.UNICODE, StandardCharsets.UTF_8, 12);
        assertEquals("in the state\nboth down\nforever\n",
                written(narrow, new Paragraph(Prose.of("in the state ").andName("both down").and(" forever"))));
        assertEquals("that is a\n+ b − 2c + d\n− e\n",
                written(narrow, new Paragraph(Prose.of("that is ").andFormula(formula("a + b - 2*c + d - e")))));
    }

    @Test
    void widthIsThatOfTheScreen() {
        assertEquals("泵一\n════\n", written(UNICODE, new Heading(1, Prose.name("泵一"))));
        assertEquals("cafe\u0301\n────\n", written(UNICODE, new Heading(2, Prose.name("cafe\u0301"))));
        assertEquals("""
                  state    p
                  ─────  ───
                  泵一   1/2
                  one    1/2
                """, written(UNICODE, new Table(Prose.EMPTY, List.of(Prose.of("state"), Prose.of("p")),
                List.of(List.of(Prose.name("泵一"), Prose.of("1/2")), List.of(Prose.name("one"), Prose.of("1/2"))))));
    }

    @Test
    void longTextColumnsBreakIntoLines() {
        assertEquals("""
                  k  what happened
                  ─  ─────────────────────────
                  1  a long story that does
                     not fit into one line
                  2  nothing
                """, written(new TextWriter(Alphabet.UNICODE, StandardCharsets.UTF_8, 30),
                Table.ofText("", List.of("k", "what happened"), List.of(
                        List.of("1", "a long story that does not fit into one line"), List.of("2", "nothing")))));
    }

    @Test
    void wideTablesAreFoldedAndEveryPartNamesItsRows() {
        List<String> header = new ArrayList<>(List.of("to \\ from"));
        List<String> row = new ArrayList<>(List.of("both down"));
        IntStream.range(0, 9).forEach(j -> {
            header.add("state " + j);
            row.add("0.12345" + j);
        });
        assertEquals("""
                A: from across, to down
                  to \\ from   state 0   state 1   state 2   state 3   state 4   state 5
                  ─────────  ────────  ────────  ────────  ────────  ────────  ────────
                  both down  0.123450  0.123451  0.123452  0.123453  0.123454  0.123455

                  to \\ from   state 6   state 7   state 8
                  ─────────  ────────  ────────  ────────
                  both down  0.123456  0.123457  0.123458
                """, written(UNICODE, Table.ofText("A: from across, to down", header, List.of(row))));
    }

    @Test
    void tablesNeverExceedTheWidthAndLoseNothing() {
        Random random = new Random(20269);
        for (int i = 0; i < 300; i++) {
            int columns = 1 + random.nextInt(12);
            List<String> header = cells(columns, random);
            List<List<String>> rows = new ArrayList<>();
            for (int j = random.nextInt(5); j > 0; j--) {
                rows.add(cells(columns, random));
            }
            String text = written(UNICODE, Table.ofText("", header, rows));
            assertTrue(text.lines().allMatch(line -> Columns.width(line) <= 80), text);
            long parts = text.lines().filter(line -> line.startsWith("  ─")).count();
            long inFirst = parts * (count(header.get(0)) + rows.stream().mapToLong(row -> count(row.get(0))).sum());
            long inOthers = count(String.join("", header.subList(1, columns)))
                    + rows.stream().mapToLong(row -> count(String.join("", row.subList(1, columns)))).sum();
            assertEquals(inFirst + inOthers, count(text), text);
        }
    }

    private static long count(String text) {
        return text.chars().filter(Character::isLetterOrDigit).count();
    }

    private static List<String> cells(int columns, Random random) {
        List<String> cells = new ArrayList<>();
        for (int j = 0; j < columns; j++) {
            cells.add(switch (random.nextInt(5)) {
                case 0 -> "";
                case 1 -> "" + random.nextInt();
                case 2 -> "0." + "123456789".repeat(random.nextInt(14) + 1);
                case 3 -> "words and words ".repeat(random.nextInt(8));
                default -> random.nextInt(99) + "/" + (1 + random.nextInt(999));
            });
        }
        return cells;
    }

    @Test
    void aTableWithoutRowsShowsItsHeader() {
        assertEquals("  k  p\n  ─  ─\n", written(UNICODE, Table.ofText("", List.of("k", "p"), List.of())));
        assertThrows(IllegalArgumentException.class,
                () -> Table.ofText("", List.of("k", "p"), List.of(List.of("1"))), "a row too short is our own bug");
    }

    @Test
    void aDisplayWithALongLeftSideStartsBelowIt() throws RefusedException {
        assertEquals("""
                  P(in one of the states both, one or none after k steps) =
                    1 − k
                """, written(UNICODE, new Display(Prose.of("P(in one of the states both, one or none after k steps)"),
                Relation.EQUAL, formula("1 - k"))));
        assertEquals("  1 − k\n", written(UNICODE, new Display(Prose.EMPTY, Relation.EQUAL, formula("1 - k"))));
    }
}
