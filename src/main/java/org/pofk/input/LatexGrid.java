package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * What LaTeX writes as a matrix, a column, a row or a list, cut into the texts of its cells. Before each stand as many
 * spaces as there is text, so that its characters keep their places.
 */
final class LatexGrid {
    private static final Pattern MATRIX =
            Pattern.compile("(?s)\\s*\\\\begin\\s*\\{([pbvBV]?matrix)\\}(.*)\\\\end\\s*\\{\\1\\}\\s*");
    private static final Pattern POINT = Pattern.compile("\\.|\\{\\s*,\\s*\\}");

    private final String text;
    private final List<List<String>> rows = new ArrayList<>();
    private List<String> row = new ArrayList<>();
    private int start;

    private LatexGrid(String text, int start) {
        this.text = text;
        this.start = start;
    }

    /** The rows of what stands between {@code \begin{pmatrix}} and its end; empty where the text is something else. */
    static Optional<List<List<String>>> matrix(String text) {
        Matcher matrix = MATRIX.matcher(text);
        return matrix.matches() ? Optional.of(new LatexGrid(text, matrix.start(2)).rows(matrix.end(2))) : Optional.empty();
    }

    /** The entries of a vector or of a list with commas or semicolons; the text alone where it has none. */
    static List<String> list(String text) {
        return matrix(text).map(rows -> rows.stream().flatMap(List::stream).toList())
                .orElseGet(() -> new LatexGrid(text, 0).entries());
    }

    private List<List<String>> rows(int end) {
        for (int at = start; at < end; at++) {
            if (text.startsWith("\\\\", at)) {
                cell(at, at + 2);
                endRow();
                at++;
            } else if (text.charAt(at) == '\\') {
                at++;
            } else if (text.charAt(at) == '&') {
                cell(at, at + 1);
            }
        }
        if (!row.isEmpty() || !text.substring(start, end).isBlank()) {
            cell(end, end);
            endRow();
        }
        return rows;
    }

    private List<String> entries() {
        boolean hasPoints = POINT.matcher(text).find();
        int depth = 0;
        for (int at = 0; at < text.length(); at++) {
            char c = text.charAt(at);
            if (c == '\\') {
                at++;
            } else if ("{([".indexOf(c) >= 0) {
                depth++;
            } else if ("})]".indexOf(c) >= 0) {
                depth--;
            } else if (depth == 0 && (c == ';' || c == ',' && (hasPoints || !isBeforeDigit(at)))) {
                cell(at, at + 1);
            }
        }
        cell(text.length(), text.length());
        return row;
    }

    /** Where no number has a point, a comma between digits may be one. */
    private boolean isBeforeDigit(int comma) {
        return comma + 1 < text.length() && Character.isDigit(text.charAt(comma + 1));
    }

    private void cell(int end, int next) {
        row.add(" ".repeat(start) + text.substring(start, end));
        start = next;
    }

    private void endRow() {
        rows.add(row);
        row = new ArrayList<>();
    }
}
