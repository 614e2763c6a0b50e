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
    /** The environment by name, perhaps in brackets and right of an equals sign. */
    private static final Pattern MATRIX = Pattern.compile("(?s)(?:[^=&]*=)?\\s*(?:\\\\left\\s*[(\\[]|[(\\[])?\\s*"
            + "\\\\begin\\s*\\{(?:([pbB]?matrix)\\}|(array)\\}\\s*\\{[^{}]*\\})(.*)\\\\end\\s*\\{(?:\\1|\\2)\\}"
            + "\\s*(?:\\\\right\\s*[)\\]]|[)\\]])?\\s*");
    private static final Pattern BRACKETS =
            Pattern.compile("(?s)\\s*(?:\\\\left\\s*)?(?:\\(|\\[|\\\\\\{)(.*?)(?:\\\\right\\s*)?(?:\\)|\\]|\\\\\\})\\s*");
    private static final Pattern TRANSPOSED =
            Pattern.compile("\\^\\s*\\{?\\s*(?:T|\\\\top|\\\\(?:mathrm|mathsf|text)\\s*\\{?\\s*T\\s*\\}?)\\s*\\}?\\s*$");
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
        return matrix.matches() ? Optional.of(new LatexGrid(text, matrix.start(3)).rows(matrix.end(3)))
                : Optional.empty();
    }

    /** The entries of a vector or of a list with commas or semicolons; the text alone where it has none. */
    static List<String> list(String text) {
        Optional<List<List<String>>> vector = matrix(TRANSPOSED.matcher(text).replaceFirst(""));
        if (vector.isPresent()) {
            return vector.get().stream().flatMap(List::stream).toList();
        }
        Matcher brackets = BRACKETS.matcher(TRANSPOSED.matcher(text).replaceFirst(""));
        List<String> within = brackets.matches()
                ? new LatexGrid(text, brackets.start(1)).entries(brackets.end(1)) : List.of();
        List<String> entries = within.size() > 1 ? within : new LatexGrid(text, 0).entries(text.length());
        return entries.size() > 1 ? entries : List.of(text);
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

    /** Those up to an end; none where a bracket closes that doesn't open here. */
    private List<String> entries(int end) {
        boolean hasPoints = POINT.matcher(text).find();
        int depth = 0;
        for (int at = start; at < end; at++) {
            char c = text.charAt(at);
            if (c == '\\') {
                at++;
            } else if ("{([".indexOf(c) >= 0) {
                depth++;
            } else if ("})]".indexOf(c) >= 0) {
                if (--depth < 0) {
                    return List.of();
                }
            } else if (depth == 0 && (c == ';' || c == ',' && (hasPoints || !isBeforeDigit(at)))) {
                cell(at, at + 1);
            }
        }
        cell(end, end);
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
