package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import org.pofk.text.Alphabet;

/**
 * A table as HTML, its first column heading the rows. In a column of decimals the points stand below each other: each
 * number is moved in by the digits that the longest has more before its point. Other columns of numbers end at the
 * right.
 */
final class HtmlTable {
    private static final Pattern DECIMAL = Pattern.compile("[<>≤≥≈~]?[-−]?[0-9]+(\\.[0-9]*)?([eE][-−+]?[0-9]+)?%?");
    private static final Pattern FRACTION = Pattern.compile("[-−]?[0-9]+/[0-9]+");
    /** The style has rules for moving in by up to so many digits. */
    static final int MOST_MOVED = 12;

    /** Words up to so many characters stand in one line. */
    private static final int SHORT = 18;

    private final Document.Table table;
    private final String id;

    private HtmlTable(Document.Table table, String id) {
        this.table = table;
        this.id = id;
    }

    static String of(Document.Table table, String id) {
        return new HtmlTable(table, id).written();
    }

    private String written() {
        List<List<String>> classes = IntStream.range(0, table.header().size()).mapToObj(this::classes).toList();
        StringBuilder html = new StringBuilder("<div class=\"wide\" role=\"region\" tabindex=\"0\" "
                + (table.caption().isEmpty() ? "aria-label=\"Table\"" : "aria-labelledby=\"" + id + "\"") + "><table>");
        if (!table.caption().isEmpty()) {
            html.append("<caption id=\"").append(id).append("\">").append(HtmlSpelling.of(table.caption()))
                    .append("</caption>");
        }
        html.append("\n<thead><tr>");
        for (int j = 0; j < table.header().size(); j++) {
            boolean isRight = classes.get(j).stream().anyMatch(" class=\"number right\""::equals);
            html.append("<th scope=\"col\"").append(isRight ? " class=\"right\"" : "").append(">")
                    .append(HtmlSpelling.of(table.header().get(j))).append("</th>");
        }
        html.append("</tr></thead>\n<tbody>\n");
        for (int i = 0; i < table.rows().size(); i++) {
            html.append("<tr>");
            for (int j = 0; j < table.header().size(); j++) {
                String cell = HtmlSpelling.of(table.rows().get(i).get(j));
                html.append(j == 0 ? "<th scope=\"row\"" : "<td").append(classes.get(j).get(i)).append(">").append(cell)
                        .append(j == 0 ? "</th>" : "</td>");
            }
            html.append("</tr>\n");
        }
        return html.append("</tbody></table></div>").toString();
    }

    /** The class attribute of each cell of a column. */
    private List<String> classes(int column) {
        Spelling spelling = new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8);
        List<String> texts = table.rows().stream().map(row -> spelling.of(row.get(column)).strip()).toList();
        boolean isOfDecimals = texts.stream().allMatch(text -> text.isEmpty() || DECIMAL.matcher(text).matches());
        boolean isOfNumbers = texts.stream().allMatch(text -> text.isEmpty() || DECIMAL.matcher(text).matches()
                || FRACTION.matcher(text).matches());
        int longest = texts.stream().mapToInt(HtmlTable::beforePoint).max().orElse(0);
        List<String> classes = new ArrayList<>();
        for (String text : texts) {
            int moved = Math.min(MOST_MOVED, longest - beforePoint(text));
            classes.add(isOfDecimals ? " class=\"number" + (moved > 0 ? " in" + moved : "") + "\""
                    : isOfNumbers ? " class=\"number right\"" : text.length() <= SHORT ? " class=\"short\"" : "");
        }
        return classes;
    }

    private static int beforePoint(String number) {
        int digits = 0;
        while (digits < number.length() && ".eE%".indexOf(number.charAt(digits)) < 0) {
            digits++;
        }
        return digits;
    }
}
