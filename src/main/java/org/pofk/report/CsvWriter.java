package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.pofk.text.Alphabet;

/**
 * Writes a table as comma-separated values: RFC 4180's quoting, a header row, UTF-8 without a mark, lines that end with
 * a line feed. A name that a spreadsheet would take for a formula begins with an apostrophe here, and so does one that
 * begins with an apostrophe itself, so that names stay apart; our own numbers, {@code -0.5} too, stay as they are.
 */
public final class CsvWriter {
    private static final Pattern QUOTED = Pattern.compile("[\",\\r\\n]|^\\s|\\s$");
    private static final Pattern TAKEN_FOR_FORMULA = Pattern.compile("^[=+\\-@\\t\\r＝＋－＠']");
    private static final Spelling SPELLING = new Spelling(Alphabet.ASCII, StandardCharsets.UTF_8);

    private CsvWriter() {
    }

    public static String write(Document.Table table) {
        return Stream.concat(Stream.of(table.header()), table.rows().stream()).map(CsvWriter::line)
                .collect(Collectors.joining("\n", "", "\n"));
    }

    private static String line(List<Prose> cells) {
        return cells.stream().map(CsvWriter::cell).collect(Collectors.joining(","));
    }

    private static String cell(Prose prose) {
        boolean beginsWithName = !prose.isEmpty() && prose.parts().get(0) instanceof Prose.Name;
        String text = prose.parts().stream().map(part -> part.accept(new Parts())).collect(Collectors.joining());
        String safe = beginsWithName && TAKEN_FOR_FORMULA.matcher(text).find() ? "'" + text : text;
        return QUOTED.matcher(safe).find() ? "\"" + safe.replace("\"", "\"\"") + "\"" : safe;
    }

    /** Names as they are, every blank a blank. */
    private static final class Parts implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            return words.text();
        }

        @Override
        public String name(Prose.Name name) {
            return name.text();
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            return SPELLING.of(mathematics.formula());
        }
    }
}
