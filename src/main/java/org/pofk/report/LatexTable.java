package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.pofk.text.Alphabet;

/**
 * A table in LaTeX: a short one in one piece, a long one over pages with its header repeated. Numbers are aligned as in
 * text; a table that is too wide has its widest column of text broken into lines, and else its columns dealt to several
 * tables, each beginning with the first column.
 */
final class LatexTable {
    /** Characters on a line of a table. */
    private static final int WIDTH = 80;
    private static final int GAP = 3;
    private static final int SLACK = 2;
    /** Parting such a table on a page would leave its header alone on the one before. */
    private static final int ONE_PIECE_UP_TO = 8;
    private static final int NARROWEST_TEXT = 24;

    private record Column(TextColumn plain, int room, String header, List<String> cells) {
        boolean isBroken() {
            return room < plain.width();
        }

        String kind() {
            return isBroken() ? ">{\\raggedright\\arraybackslash{}}" + wide(room / (double) WIDTH) : plain.isNumeric()
                    ? "r" : "l";
        }

        /** Converters know raggedness in a cell alone; there it makes an empty line in what LaTeX sets. */
        String cell(String text, LatexLayout layout) {
            return isBroken() && layout.figures() == LatexLayout.Figures.IN_FILES ? "{\\raggedright " + text + "\\par}"
                    : text;
        }

        private static String wide(double share) {
            return String.format(Locale.ROOT, "p{%.3f\\linewidth}", share);
        }

        /** With a share of the line whether it is broken or not, and some room in the letters of others. */
        String wideKind(List<Column> line) {
            return (plain.isNumeric() ? ">{\\raggedleft\\arraybackslash{}}" : "")
                    + wide((room + SLACK) / (double) (total(line) + SLACK * line.size()));
        }
    }

    private LatexTable() {
    }

    static List<String> lines(Document.Table table, LatexLayout layout) {
        Spelling spelling = new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8);
        List<Column> columns = new ArrayList<>();
        for (int j = 0; j < table.header().size(); j++) {
            int column = j;
            TextColumn plain = TextColumn.of(spelling.of(table.header().get(j)),
                    table.rows().stream().map(row -> spelling.of(row.get(column))).toList());
            List<String> cells = new ArrayList<>();
            for (int i = 0; i < table.rows().size(); i++) {
                cells.add(LatexSpelling.of(table.rows().get(i).get(j)) + padding(plain, plain.texts().get(i)));
            }
            columns.add(new Column(plain, plain.width(), LatexSpelling.of(table.header().get(j)), cells));
        }
        return folded(fitted(columns), table.rows().size(), layout);
    }

    /** What brings a number's point below the others' points: room for the digits that it hasn't. */
    private static String padding(TextColumn column, String text) {
        int missing = text.length() - text.stripTrailing().length();
        if (!column.isNumeric() || missing == 0) {
            return "";
        }
        return "\\phantom{" + (text.contains(".") ? "0" : ".") + "0".repeat(missing - 1) + "}";
    }

    private static List<Column> fitted(List<Column> columns) {
        List<Column> fitted = new ArrayList<>(columns);
        int widest = -1;
        for (int j = 0; j < columns.size(); j++) {
            boolean isWider = widest < 0 || columns.get(j).room > columns.get(widest).room;
            widest = !columns.get(j).plain.isNumeric() && isWider ? j : widest;
        }
        int excess = total(columns) - WIDTH;
        if (excess > 0 && widest >= 0) {
            fitted.set(widest, narrowed(columns.get(widest),
                    Math.max(NARROWEST_TEXT, columns.get(widest).room - excess)));
        }
        if (total(fitted) > WIDTH && fitted.size() > 1) {
            fitted.set(0, narrowed(fitted.get(0), WIDTH / 2 - GAP));
        }
        for (int j = 0; j < fitted.size(); j++) {
            fitted.set(j, narrowed(fitted.get(j), j == 0 ? WIDTH : WIDTH - fitted.get(0).room - GAP));
        }
        return fitted;
    }

    private static Column narrowed(Column column, int most) {
        return column.room <= most ? column : new Column(column.plain, most, column.header, column.cells);
    }

    private static int total(List<Column> columns) {
        return columns.stream().mapToInt(Column::room).sum() + GAP * (columns.size() - 1);
    }

    private static List<String> folded(List<Column> columns, int rows, LatexLayout layout) {
        List<String> lines = new ArrayList<>();
        List<Column> group = new ArrayList<>(List.of(columns.get(0)));
        for (Column column : columns.subList(1, columns.size())) {
            if (group.size() > 1 && total(group) + GAP + column.room > WIDTH) {
                lines.addAll(part(group, rows, layout));
                group = new ArrayList<>(List.of(columns.get(0)));
            }
            group.add(column);
        }
        lines.addAll(part(group, rows, layout));
        return lines;
    }

    private static List<String> part(List<Column> group, int rows, LatexLayout layout) {
        List<String> lines = new ArrayList<>();
        boolean isSetAsItIs = layout.figures() == LatexLayout.Figures.INSIDE;
        boolean isOnePiece = isSetAsItIs && rows <= ONE_PIECE_UP_TO;
        lines.add("{\\small\\renewcommand{\\arraystretch}{1.25}" + (isOnePiece ? "\\centering\\vspace{6pt}" : ""));
        lines.add("\\begin{" + (isOnePiece ? "tabular" : "longtable") + "}{@{}" + kinds(group, layout) + "@{}}");
        lines.add("\\toprule");
        lines.add(row(group.stream().map(column -> column.cell(column.header, layout)).toList()));
        lines.add("\\midrule");
        if (!isOnePiece) {
            lines.add("\\endhead");
            lines.add("\\bottomrule");
            lines.add("\\endfoot{}%"); // a converter takes a number that follows for a part of the command
        }
        for (int i = 0; i < rows; i++) {
            int row = i;
            lines.add(row(group.stream().map(column -> column.cell(column.cells.get(row), layout)).toList())
                    + (isKept(row, rows) && isSetAsItIs && !isOnePiece ? "*" : ""));
        }
        lines.addAll(isOnePiece ? List.of("\\bottomrule", "\\end{tabular}\\par\\vspace{12pt}}")
                : List.of("\\end{longtable}}"));
        return lines;
    }

    /** Whether no page ends behind a row, since it or the one behind it would be alone. */
    private static boolean isKept(int row, int rows) {
        return row < rows - 1 && (row == 0 || row == rows - 2);
    }

    /** A converter takes widths for all columns or for none. */
    private static String kinds(List<Column> group, LatexLayout layout) {
        boolean areAllWide = layout.figures() == LatexLayout.Figures.IN_FILES
                && group.stream().anyMatch(Column::isBroken);
        return group.stream().map(column -> areAllWide ? column.wideKind(group) : column.kind())
                .collect(Collectors.joining());
    }

    private static String row(List<String> cells) {
        return String.join(" & ", cells.stream().map(cell -> cell.startsWith("[") ? "{" + cell + "}" : cell).toList())
                + " \\\\";
    }
}
