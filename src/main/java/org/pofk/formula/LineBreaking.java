package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import org.pofk.text.Columns;

/**
 * Breaks a formula's text before its signs, the outermost first: plus and minus outside all parentheses, then products
 * outside them, then plus and minus one parenthesis further in, and so on. Numbers and names are never broken, so a
 * line is longer than asked for where a single one of them is.
 */
final class LineBreaking {
    private static final int LAST_RANK = 9;

    /** A place where a line may end; a small rank is to be preferred. */
    private record Break(int offset, int rank) {
    }

    private final String text;
    private final int room;
    private final List<Break> breaks;
    private final List<String> lines = new ArrayList<>();

    private LineBreaking(String text, int room) {
        this.text = text;
        this.room = room;
        this.breaks = breaks(text);
    }

    /** Lines of at most {@code width} columns, the first without the indent that it is to have room for. */
    static List<String> lines(String text, int width, int indent) {
        LineBreaking breaking = new LineBreaking(text, Math.max(1, width - indent));
        breaking.fill(0, text.length(), 0);
        List<String> lines = new ArrayList<>();
        for (String line : breaking.lines) {
            lines.add(lines.isEmpty() ? line : " ".repeat(indent) + line);
        }
        return List.copyOf(lines);
    }

    private static List<Break> breaks(String text) {
        List<Break> breaks = new ArrayList<>();
        int parentheses = 0;
        boolean quoted = false;
        for (int i = 1; i < text.length(); i++) {
            char c = text.charAt(i);
            char before = text.charAt(i - 1);
            quoted ^= before == '\'';
            if (!quoted) {
                parentheses += before == '(' || before == '[' ? 1 : before == ')' || before == ']' ? -1 : 0;
                if ("+-−".indexOf(c) >= 0 && before == ' ') {
                    breaks.add(new Break(i, 2 * parentheses));
                } else if ("·*".indexOf(c) >= 0 || c == '/' && before == ')' || before == ' ' && text.charAt(i - 2) == ']') {
                    breaks.add(new Break(i, 2 * parentheses + 1));
                }
            }
        }
        return breaks;
    }

    /** Adds the text between two offsets, broken at places of a rank, and of higher ranks only where it must be. */
    private void fill(int from, int to, int rank) {
        if (rank > LAST_RANK || isShort(from, to)) {
            lines.add(text.substring(from, to).strip());
            return;
        }
        int lineStart = from;
        int lineEnd = from;
        for (int next : ends(from, to, rank)) {
            if (lineEnd > lineStart && !isShort(lineStart, next)) {
                fill(lineStart, lineEnd, rank + 1);
                lineStart = lineEnd;
            }
            lineEnd = next;
        }
        fill(lineStart, to, rank + 1);
    }

    private List<Integer> ends(int from, int to, int rank) {
        List<Integer> ends = new ArrayList<>();
        for (Break one : breaks) {
            if (one.rank == rank && one.offset > from && one.offset < to) {
                ends.add(one.offset);
            }
        }
        ends.add(to);
        return ends;
    }

    private boolean isShort(int from, int to) {
        return Columns.width(text.substring(from, to).strip()) <= room;
    }
}
