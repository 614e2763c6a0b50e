package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

class CsvWriterTest {
    private static final List<String> NAMES = List.of("a", "50% & rising_#1", "a,b", "say \"no\"", "two\nlines", "Überlauf θ",
            "=1+1", "'=1+1", "''=1+1", "+x", "-", "@SUM(A1)", "\tx", "＝x", "'", "a=b", "", " x ");

    private static String written(Prose... cells) {
        return CsvWriter.write(new Document.Table(Prose.EMPTY, List.of(cells), List.of()));
    }

    /** Reads one record as RFC 4180 says. */
    private static List<String> read(String line) {
        List<String> fields = new ArrayList<>();
        StringBuilder field = new StringBuilder();
        boolean isQuoted = false;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (isQuoted && c == '"' && line.charAt(i + 1) == '"') {
                field.append(line.charAt(++i));
            } else if (c == '"') {
                isQuoted = !isQuoted;
            } else if (!isQuoted && (c == ',' || c == '\n')) {
                fields.add(field.toString());
                field.setLength(0);
            } else {
                field.append(c);
            }
        }
        return fields;
    }

    @Test
    void aReaderOfTheStandardGetsEveryNameApart() {
        Prose[] cells = NAMES.stream().map(Prose::name).toArray(Prose[]::new);
        List<String> fields = read(written(cells));
        assertEquals(NAMES.size(), fields.size());
        Set<String> apart = new HashSet<>(fields);
        assertEquals(NAMES.size(), apart.size());
        for (int i = 0; i < NAMES.size(); i++) {
            assertEquals(NAMES.get(i), fields.get(i).equals(NAMES.get(i)) ? NAMES.get(i) : fields.get(i).substring(1));
        }
    }

    @Test
    void noNameIsTakenForAFormula() {
        for (String name : NAMES) {
            String field = read(written(Prose.name(name))).get(0);
            assertFalse(field.matches("(?s)[=+\\-@\\t＝].*"), field);
        }
    }

    @Test
    void ourOwnNumbersStayPlain() {
        assertEquals("-0.5,-1/7,2.5e-7\n", written(Prose.of("-0.5"), Prose.of("-1/7"), Prose.of("2.5e-7")));
        assertEquals("-1/2\n", written(Prose.formula(new Formula.Number(Rational.of(-1, 2)))));
    }

    @Test
    void whatHoldsCommasQuotesOrLineEndsIsQuoted() {
        assertEquals("a,\"a,b\",\"say \"\"no\"\"\",\"two\nlines\",'=x\n", written(Prose.name("a"), Prose.name("a,b"),
                Prose.name("say \"no\""), Prose.name("two\nlines"), Prose.name("=x")));
    }
}
