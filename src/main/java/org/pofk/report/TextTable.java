package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.text.Columns;

/**
 * Lays a table out in columns: text from the left, numbers by their decimal points. Where it is too wide, its widest
 * column of text is broken into lines; where that isn't enough, the columns are dealt to several tables below each
 * other, each beginning with the first column.
 */
final class TextTable {
    private static final int GAP = 2;
    private static final int NARROWEST_TEXT = 24;

    private final List<TextColumn> columns;
    private final int rows;
    private final String rule;

    private TextTable(List<TextColumn> columns, int rows, String rule) {
        this.columns = columns;
        this.rows = rows;
        this.rule = rule;
    }

    static List<String> lines(List<String> header, List<List<String>> rows, int width, String rule) {
        List<TextColumn> columns = new ArrayList<>();
        for (int j = 0; j < header.size(); j++) {
            int column = j;
            columns.add(TextColumn.of(header.get(j), rows.stream().map(row -> row.get(column)).toList()));
        }
        return new TextTable(fitted(columns, width), rows.size(), rule).folded(width);
    }

    /** The columns, the widest one of text narrowed where that makes them fit, and none wider than fits at all. */
    private static List<TextColumn> fitted(List<TextColumn> columns, int width) {
        List<TextColumn> fitted = new ArrayList<>(columns);
        int excess = total(columns) - width;
        int widest = IntStream.range(0, columns.size()).filter(j -> !columns.get(j).isNumeric()).boxed()
                .max((a, b) -> Integer.compare(columns.get(a).width(), columns.get(b).width())).orElse(-1);
        if (excess > 0 && widest >= 0 && columns.get(widest).width() - excess >= NARROWEST_TEXT) {
            fitted.set(widest, columns.get(widest).narrowed(columns.get(widest).width() - excess));
        }
        if (total(fitted) > width && fitted.size() > 1) {
            fitted.set(0, fitted.get(0).narrowed(Math.max(1, width / 2 - GAP)));
        }
        for (int j = 0; j < fitted.size(); j++) {
            int room = j == 0 ? width : width - fitted.get(0).width() - GAP;
            fitted.set(j, fitted.get(j).narrowed(room));
        }
        return fitted;
    }

    private static int total(List<TextColumn> columns) {
        return columns.stream().mapToInt(TextColumn::width).sum() + GAP * (columns.size() - 1);
    }

    private List<String> folded(int width) {
        List<String> lines = new ArrayList<>();
        List<TextColumn> group = new ArrayList<>(List.of(columns.get(0)));
        for (TextColumn column : columns.subList(1, columns.size())) {
            if (group.size() > 1 && total(group) + GAP + column.width() > width) {
                lines.addAll(part(group));
                lines.add("");
                group = new ArrayList<>(List.of(columns.get(0)));
            }
            group.add(column);
        }
        lines.addAll(part(group));
        return lines;
    }

    /** One table of some of the columns: its header, a rule, its rows. */
    private List<String> part(List<TextColumn> group) {
        List<String> lines = new ArrayList<>(row(group.stream().map(TextColumn::header).toList()));
        lines.add(String.join(" ".repeat(GAP), group.stream().map(column -> rule.repeat(column.width())).toList()));
        for (int i = 0; i < rows; i++) {
            int row = i;
            lines.addAll(row(group.stream().map(column -> column.cell(row)).toList()));
        }
        return lines;
    }

    /** Cells of several lines side by side; every line of a cell has its column's width. */
    private static List<String> row(List<List<String>> cells) {
        int height = cells.stream().mapToInt(List::size).max().orElse(0);
        List<String> lines = new ArrayList<>();
        for (int i = 0; i < height; i++) {
            int line = i;
            lines.add(String.join(" ".repeat(GAP), cells.stream().map(cell -> line < cell.size()
                    ? cell.get(line) : " ".repeat(Columns.width(cell.get(0)))).toList()));
        }
        return lines;
    }
}
