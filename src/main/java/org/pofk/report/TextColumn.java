package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.pofk.text.Columns;

/**
 * A column of a table, every cell as lines of the column's width. A column of numbers (at least half of what isn't
 * blank) is aligned at the decimal point, or at the right where there are fractions; others at the left.
 */
record TextColumn(boolean isNumeric, int width, String title, List<String> texts) {
    private static final Pattern DECIMAL = Pattern.compile("(?:[<>≤≥≈~] ?)?[-−]?[0-9]+(\\.[0-9]*)?([eE][-−+]?[0-9]+)?%?");
    private static final Pattern FRACTION = Pattern.compile("(?:≈ )?[-−]?[0-9]+/[0-9]+");

    static TextColumn of(String title, List<String> cells) {
        List<String> texts = cells.stream().map(String::strip).toList();
        long filled = texts.stream().filter(text -> !text.isEmpty()).count();
        long decimals = texts.stream().filter(text -> DECIMAL.matcher(text).matches()).count();
        long fractions = texts.stream().filter(text -> FRACTION.matcher(text).matches()).count();
        boolean isNumeric = filled > 0 && 2 * (decimals + fractions) >= filled;
        List<String> aligned = isNumeric && fractions == 0 ? atPoint(texts) : texts;
        int width = aligned.stream().mapToInt(Columns::width).max().orElse(0);
        return new TextColumn(isNumeric, Math.max(Columns.width(title), width), title, aligned);
    }

    /** The numbers with blanks behind them such that their points stand below each other when their ends do. */
    private static List<String> atPoint(List<String> texts) {
        int longest = texts.stream().filter(text -> DECIMAL.matcher(text).matches())
                .mapToInt(text -> text.length() - pointIn(text)).max().orElse(0);
        List<String> aligned = new ArrayList<>();
        for (String text : texts) {
            boolean isNumber = DECIMAL.matcher(text).matches();
            aligned.add(isNumber ? Columns.left(text, pointIn(text) + longest) : text);
        }
        return aligned;
    }

    /** Where the point is or would be. */
    private static int pointIn(String number) {
        int digits = 0;
        while (digits < number.length() && ".eE%".indexOf(number.charAt(digits)) < 0) {
            digits++;
        }
        return digits;
    }

    TextColumn narrowed(int most) {
        return width <= most ? this : new TextColumn(isNumeric, most, title, texts);
    }

    List<String> header() {
        return lines(title);
    }

    List<String> cell(int row) {
        return lines(texts.get(row));
    }

    private List<String> lines(String text) {
        if (Columns.width(text) <= width) {
            return List.of(aligned(text.replace(Spelling.NO_BREAK, ' ')));
        }
        return Wrapping.cutLines(text.replace(Spelling.NO_BREAK, ' '), width).stream().map(this::aligned).toList();
    }

    private String aligned(String line) {
        return isNumeric ? Columns.right(line, width) : Columns.left(line, width);
    }
}
